import type { ReactNode } from 'react';
import { percent } from '../describe';
import { PAINT_INK, strainGradient } from '../drawing/ramp';

interface LegendProps {
  /** strain at the end of the scale, as a fraction */
  readonly scaleEnd: number;
  readonly allowable: number | null;
  /** largest absolute strain shown, as a fraction */
  readonly peak: number;
  /** what shape and strain come from */
  readonly by: string;
}

const HATCH = `repeating-linear-gradient(135deg, ${PAINT_INK}80 0 1px, transparent 1px 6px)`;

/** The scale of the strain colours, always beside the painted part: allowable above, largest strain below. */
export function StrainLegend({ scaleEnd, allowable, peak, by }: LegendProps) {
  const share = (strain: number) => Math.min(1, strain / scaleEnd);
  const limit = allowable === null ? 'not known' : percent(allowable);
  return (
    <figure
      aria-label={`Strain by ${by}: scale from 0 to ${percent(scaleEnd)}, pulled in warm colours, squeezed in hatched blue. Allowed ${limit}, largest now ${percent(peak)}.`}
      className="pointer-events-none m-0 rounded-sheet border border-hair bg-sheet/90 px-2.5 py-2 text-[12px] leading-none text-ink"
    >
      <div aria-hidden="true" className="grid grid-cols-[auto_12rem] gap-x-2">
        <span />
        <div className="relative h-4">
          {allowable === null ? (
            <span className="text-muted">limit not known</span>
          ) : (
            <Mark share={share(allowable)} className="top-0 font-semibold text-over">
              allowed {percent(allowable)}
            </Mark>
          )}
        </div>
        <Bar name="pulled" gradient={strainGradient(1, 'to right')} limit={allowable && share(allowable)} />
        <Bar
          name="squeezed"
          gradient={`${HATCH}, ${strainGradient(-1, 'to right')}`}
          limit={allowable && share(allowable)}
        />
        <span className="self-end text-right text-muted">0</span>
        <div className="relative h-4">
          {peak > 0 && (
            <>
              <span
                className="absolute top-0 -translate-x-1/2 border-x-[5px] border-b-[6px] border-x-transparent border-b-ink"
                style={{ left: `${100 * share(peak)}%` }}
              />
              <Mark share={share(peak)} className="bottom-0 pl-2 font-semibold">
                {percent(peak)}
              </Mark>
            </>
          )}
        </div>
      </div>
      <p aria-hidden="true" className="mt-1.5 text-muted">
        strain by {by}
      </p>
    </figure>
  );
}

function Bar({ name, gradient, limit }: { name: string; gradient: string; limit: number | null }) {
  return (
    <>
      <span className="self-center text-right">{name}</span>
      <div className="relative h-3.5" style={{ background: gradient }}>
        {limit !== null && (
          <span className="absolute inset-y-0 border-l-2 border-over" style={{ left: `${100 * limit}%` }} />
        )}
      </div>
    </>
  );
}

/** A text at its place along the scale, on the side of it that has room. */
function Mark({ share, className, children }: { share: number; className: string; children: ReactNode }) {
  const shift = share > 0.5 ? '-100%' : '0';
  return (
    <span
      className={`absolute whitespace-nowrap px-1.5 ${className}`}
      style={{ left: `${100 * share}%`, transform: `translateX(${shift})` }}
    >
      {children}
    </span>
  );
}
