import { classNames } from '@/components/ui/class-names';
import type { Figure } from '@/generators/report';
import { formatQuantity } from '@/lib/units';
import { placeOn, type Scale, scaleOver, shown, tickText } from '../scale';
import { VERDICT_FILL } from '../verdict';
import { FigureSign } from './figures';

/** Room past the largest mark, so that the forbidden part is seen. */
const PAST_LIMIT = 1.34;
const PAST_VALUE = 1.06;

const known = (value: number | null): value is number => value !== null && Number.isFinite(value);

export function bandScale({ value, handbook, limit, unit }: Figure): Scale {
  const mark = (one: number | null, room: number) => (known(one) ? shown(one, unit) * room : null);
  return scaleOver([mark(limit, PAST_LIMIT), mark(value, PAST_VALUE), mark(handbook, PAST_VALUE)], 8);
}

interface Places {
  readonly value: number | null;
  readonly handbook: number | null;
  readonly limit: number | null;
}

const placeOf = (one: number | null, { unit }: Figure, scale: Scale): number | null =>
  known(one) ? placeOn(scale, shown(one, unit)) : null;

function placesOf(figure: Figure, scale: Scale): Places {
  const { value, handbook, limit } = figure;
  const place = (one: number | null) => placeOf(one, figure, scale);
  return { value: place(value), handbook: place(handbook), limit: place(limit) };
}

/** The part of the scale the figure may not enter: past a highest limit, short of a least one. */
function Forbidden({ limit, kind }: { limit: number; kind: Figure['limitKind'] }) {
  const span = kind === 'max' ? { left: `${limit}%`, right: 0 } : { left: 0, width: `${limit}%` };
  return <div className="hatched absolute inset-y-0" style={span} />;
}

function Fill({ figure, places }: { figure: Figure; places: Places }) {
  const { value, limit } = places;
  if (value === null) return null;
  const over = figure.verdict === 'over-limit' && figure.limitKind === 'max' && limit !== null;
  const calm = over ? limit : value;
  return (
    <>
      <div
        className={classNames(
          'absolute inset-y-0 left-0 transition-[width] duration-150',
          over ? 'bg-petrol' : VERDICT_FILL[figure.verdict ?? 'not-known'],
        )}
        style={{ width: `${calm}%` }}
      />
      {over && (
        <div
          className="absolute inset-y-0 bg-over transition-[width] duration-150"
          style={{ left: `${limit}%`, width: `${value - limit}%` }}
        />
      )}
    </>
  );
}

function Ruler({ scale, unit }: { scale: Scale; unit: Figure['unit'] }) {
  const symbol = formatQuantity(1, unit).replace(/^[\d.,\s]+/u, '');
  return (
    <div className="relative h-9 border-ink border-t-2">
      {scale.minors.map((tick) => (
        <i
          key={tick}
          className="absolute top-0 h-1.5 w-px bg-edge"
          style={{ left: `${placeOn(scale, tick)}%` }}
        />
      ))}
      {scale.majors.map((tick) => (
        <span key={tick} className="absolute top-0" style={{ left: `${placeOn(scale, tick)}%` }}>
          <i className="absolute top-0 h-2.5 w-px bg-ink" />
          <span
            className={classNames(
              'absolute top-3 whitespace-nowrap font-mono text-muted text-xs',
              tick > 0 && '-translate-x-1/2',
            )}
          >
            {tickText(tick, scale.major)}
          </span>
        </span>
      ))}
      <span className="absolute top-3 right-0 translate-x-full pl-1.5 font-mono text-muted text-xs">
        {symbol}
      </span>
    </div>
  );
}

function LimitMarker({ place, figure }: { place: number; figure: Figure }) {
  const left = place > 70;
  return (
    <div className="absolute top-0 bottom-[1.6rem] border-over border-l-2" style={{ left: `${place}%` }}>
      <span
        className={classNames(
          'absolute -top-0.5 whitespace-nowrap font-semibold text-over text-sm',
          left ? 'right-2' : 'left-2',
        )}
      >
        {figure.limitKind === 'max' ? 'allowed' : 'at least'} {formatQuantity(figure.limit, figure.unit)}
      </span>
    </div>
  );
}

/** Where another figure than the one that bears the verdict lies on the scale. */
function Marker({ place, name }: { place: number | null; name: 'handbook' | 'corrected' }) {
  if (place === null) return null;
  return (
    <span className="absolute top-3.5 -translate-x-1/2 text-ink" style={{ left: `${place}%` }}>
      <FigureSign name={name} />
    </span>
  );
}

/**
 * One scale from zero past the limit: what is present filled, what is forbidden hatched. A picture; words stand beside
 * it. `corrected` is the formula's figure where the one shown was computed.
 */
export function BandScale({ figure, corrected }: { figure: Figure; corrected: number | null }) {
  const scale = bandScale(figure);
  const places = placesOf(figure, scale);
  return (
    <div aria-hidden="true" className="relative -mt-1 pt-7 pr-5">
      <div className="relative">
        <div className="relative h-8 overflow-hidden bg-tint">
          {places.limit !== null && <Forbidden limit={places.limit} kind={figure.limitKind} />}
          <Fill figure={figure} places={places} />
        </div>
        <Ruler scale={scale} unit={figure.unit} />
      </div>
      <div className="pointer-events-none absolute inset-y-0 right-5 left-0">
        <Marker name="handbook" place={places.handbook} />
        <Marker name="corrected" place={placeOf(corrected, figure, scale)} />
        {places.limit !== null && <LimitMarker place={places.limit} figure={figure} />}
      </div>
    </div>
  );
}

/** The scale as a thin strip, for the bar that stays in sight. */
export function BandStripScale({ figure }: { figure: Figure }) {
  const places = placesOf(figure, bandScale(figure));
  return (
    <div aria-hidden="true" className="relative h-6 flex-1 border-ink border-b-2">
      <div className="absolute inset-x-0 bottom-0 h-3.5 overflow-hidden bg-tint">
        {places.limit !== null && <Forbidden limit={places.limit} kind={figure.limitKind} />}
        <Fill figure={figure} places={places} />
      </div>
      {places.limit !== null && (
        <i className="absolute inset-y-0 border-over border-l-2" style={{ left: `${places.limit}%` }} />
      )}
    </div>
  );
}
