import { percent } from '../describe';
import { strainGradient } from '../drawing/ramp';

interface LegendProps {
  readonly scaleEnd: number;
  readonly allowable: number | null;
  /** largest absolute strain shown, as a fraction */
  readonly peak: number;
}

const HATCH = 'repeating-linear-gradient(135deg, rgb(15 42 46 / 0.5) 0 1px, transparent 1px 6px)';

/** The scale of the strain colours. Always beside the painted part. */
export function StrainLegend({ scaleEnd, allowable, peak }: LegendProps) {
  const at = (strain: number) => `${100 * Math.min(1, strain / scaleEnd)}%`;
  return (
    <figure
      className="pointer-events-none absolute top-3 right-3 m-0 grid grid-cols-[auto_auto_auto] gap-x-1.5 rounded-sheet border border-hair bg-sheet/90 p-2 text-[11px] leading-none text-ink"
      aria-label={`Strain scale from 0 to ${percent(scaleEnd)}. Allowable ${
        allowable === null ? 'not known' : percent(allowable)
      }, largest now ${percent(peak)}.`}
    >
      <figcaption className="col-span-3 mb-2 font-semibold">Strain</figcaption>
      <Bar gradient={strainGradient(-1, 'to top')} hatch name="squeezed" />
      <Bar gradient={strainGradient(1, 'to top')} name="pulled" />
      <div aria-hidden="true" className="relative h-36 w-20 font-mono tabular-nums">
        <Tick at="0%" text="0" />
        {allowable !== null && allowable < scaleEnd && (
          <Tick at={at(allowable)} text={`${percent(allowable)} max`} className="font-semibold text-over" />
        )}
        {peak > 0 && <Tick at={at(peak)} text={`${percent(peak)}`} mark />}
        {allowable === null && <span className="absolute top-0 font-text text-muted">limit not known</span>}
      </div>
    </figure>
  );
}

function Bar({ gradient, hatch = false, name }: { gradient: string; hatch?: boolean; name: string }) {
  return (
    <div aria-hidden="true" className="relative h-36 w-5 border border-edge" style={{ background: gradient }}>
      {hatch && <div className="absolute inset-0" style={{ background: HATCH }} />}
      <span className="absolute bottom-1 left-1/2 origin-left -rotate-90 whitespace-nowrap text-[10px] text-[#0f2a2e]">
        {name}
      </span>
    </div>
  );
}

interface TickProps {
  readonly at: string;
  readonly text: string;
  readonly mark?: boolean;
  readonly className?: string;
}

function Tick({ at, text, mark = false, className = '' }: TickProps) {
  return (
    <span
      className={`absolute left-0 flex translate-y-1/2 items-center gap-1 whitespace-nowrap ${className}`}
      style={{ bottom: at }}
    >
      {mark ? (
        <span className="border-y-[5px] border-r-[7px] border-y-transparent border-r-ink" />
      ) : (
        <span className="w-[7px] border-t-2 border-current" />
      )}
      {text}
    </span>
  );
}
