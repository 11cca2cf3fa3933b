import type { Curve } from '@/generators/report';
import { UNIT_SYMBOL } from '@/lib/units';
import { placeOn, type Scale, scaleOver, shown, tickText } from '../scale';

interface Axes {
  readonly x: Scale;
  readonly y: Scale;
}

type Points = Curve['points'];

function axesOf({ points, band, x, y }: Curve, beside: Points): Axes {
  const highs = [...points, ...beside, ...(band ?? [])].map(([, high]) => high);
  return {
    x: scaleOver(
      points.map(([value]) => shown(value, x.unit)),
      6,
    ),
    y: scaleOver(
      highs.map((value) => shown(value, y.unit) * 1.04),
      4,
    ),
  };
}

const at = (axes: Axes, curve: Curve, x: number, y: number): string =>
  `${placeOn(axes.x, shown(x, curve.x.unit)).toFixed(2)} ${(100 - placeOn(axes.y, shown(y, curve.y.unit))).toFixed(2)}`;

function linePath(axes: Axes, curve: Curve, points: Points = curve.points): string {
  return `M${points.map(([x, y]) => at(axes, curve, x, y)).join('L')}`;
}

function bandPath(axes: Axes, curve: Curve): string | null {
  const { band, points } = curve;
  if (!band || band.length !== points.length) return null;
  const upper = points.map(([x], n) => at(axes, curve, x, band[n]![1]));
  const lower = points.map(([x], n) => at(axes, curve, x, band[n]![0])).reverse();
  return `M${[...upper, ...lower].join('L')}Z`;
}

const named = ({ label, unit }: Curve['x']): string =>
  UNIT_SYMBOL[unit] ? `${label}, ${UNIT_SYMBOL[unit]}` : label;

/**
 * A curve with its band, drawn to the width there is; labels are text, so they never shrink with the drawing. `beside`
 * is a thin line for comparison.
 */
export function CurvePlot({ curve, beside = [] }: { curve: Curve; beside?: Points }) {
  const axes = axesOf(curve, beside);
  const band = bandPath(axes, curve);
  return (
    <figure className="grid grid-cols-[2.75rem_1fr] gap-x-2">
      <figcaption className="col-start-2 mb-2 text-muted text-xs">{named(curve.y)}</figcaption>
      <div aria-hidden="true" className="relative col-start-1 h-56">
        {axes.y.majors.map((tick) => (
          <span
            key={tick}
            className="absolute right-0 -translate-y-1/2 font-mono text-muted text-xs"
            style={{ top: `${100 - placeOn(axes.y, tick)}%` }}
          >
            {tickText(tick, axes.y.major)}
          </span>
        ))}
      </div>
      <svg
        aria-hidden="true"
        viewBox="0 0 100 100"
        preserveAspectRatio="none"
        className="h-56 w-full overflow-visible [&_*]:[vector-effect:non-scaling-stroke]"
        fill="none"
      >
        {axes.y.majors.map((tick) => (
          <path
            key={tick}
            d={`M0 ${100 - placeOn(axes.y, tick)}H100`}
            stroke={tick === 0 ? 'var(--ink)' : 'var(--hair)'}
            strokeWidth={tick === 0 ? 2 : 1}
          />
        ))}
        {axes.x.majors.map((tick) => (
          <path key={tick} d={`M${placeOn(axes.x, tick)} 100v2.5`} stroke="var(--ink)" />
        ))}
        {band && <path d={band} fill="var(--petrol-soft)" />}
        {beside.length > 0 && (
          <path
            d={linePath(axes, curve, beside)}
            stroke="var(--ink)"
            strokeWidth="1.5"
            strokeDasharray="5 4"
          />
        )}
        <path
          d={linePath(axes, curve)}
          stroke="var(--petrol)"
          strokeWidth="3"
          strokeLinejoin="round"
          strokeLinecap="round"
        />
      </svg>
      <div aria-hidden="true" className="relative col-start-2 mt-2 h-5">
        {axes.x.majors.map((tick) => (
          <span
            key={tick}
            className="absolute -translate-x-1/2 font-mono text-muted text-xs"
            style={{ left: `${placeOn(axes.x, tick)}%` }}
          >
            {tickText(tick, axes.x.major)}
          </span>
        ))}
      </div>
      <p aria-hidden="true" className="col-start-2 text-right text-muted text-xs">
        {named(curve.x)}
      </p>
    </figure>
  );
}
