import type { ReactNode } from 'react';
import { VerdictIcon } from '@/components/studio/verdict';
import { strainGradient } from '@/components/viewport/drawing/ramp';
import { VERDICT_WORDS } from '@/generators/report';
import { formatQuantity } from '@/lib/units';
import { type Reading, SCALE_END } from './sample';

const share = (strain: number): number => Math.min(100, (100 * strain) / SCALE_END);
const percent = (strain: number | null): string => formatQuantity(strain, 'strain', 2);

/** The same bend in several plastics: one strain, a limit for each. */
export function PlasticBands({
  rows,
  pull,
  children,
}: {
  rows: readonly Reading[];
  pull: number;
  /** what the bend is set with */
  children: ReactNode;
}) {
  const strain = rows[0]?.strain ?? null;
  return (
    <section
      aria-labelledby="bands"
      className="relative rounded-sheet border border-hair bg-sheet px-4 pt-4 pb-3 shadow-lift sm:px-6"
    >
      <div className="flex flex-wrap items-center justify-between gap-x-6">
        <h2 id="bands" className="font-bold text-lg">
          One bend, five plastics
        </h2>
        {children}
      </div>
      <p className="sr-only" aria-live="polite">
        {`Pulled ${pull.toFixed(1)} mm, strain ${percent(strain)}. `}
        {rows.map(({ name, verdict }) => `${name} ${VERDICT_WORDS[verdict]}`).join(', ')}
      </p>
      <ul className="mt-1 grid gap-y-2.5 md:gap-y-1.5">
        {rows.map((row) => (
          <Band key={row.id} row={row} />
        ))}
      </ul>
      <div
        aria-hidden="true"
        className="relative mt-1 h-5 font-mono text-muted text-xs md:mr-[13.5rem] md:ml-[6.5rem]"
      >
        {[0, 0.5, 1, 1.5, 2, 2.5].map((tick) => (
          <span
            key={tick}
            className="absolute whitespace-nowrap first:translate-x-0 last:-translate-x-full -translate-x-1/2"
            style={{ left: `${share(tick / 100)}%` }}
          >
            {tick === 2.5 ? '2.5 % strain' : tick}
          </span>
        ))}
      </div>
      <p className="mt-1 text-muted text-sm">
        Opened often, layers along the arm, at 23 °C. Red marks what each plastic is allowed; the hatched part
        is forbidden.
      </p>
    </section>
  );
}

function Band({ row: { name, strain, allowed, verdict } }: { row: Reading }) {
  const limit = allowed === null ? null : share(allowed);
  const within = limit !== null && limit < 100;
  return (
    <li className="grid grid-cols-[1fr_auto] items-center gap-x-3 md:grid-cols-[5.75rem_1fr_12.75rem]">
      <span className="font-bold font-heading text-lg leading-tight">{name}</span>
      <div className="relative col-span-2 row-start-2 h-7 overflow-hidden bg-tint md:col-span-1 md:row-start-auto md:h-8">
        {strain !== null && (
          <div
            className="absolute inset-0"
            style={{
              background: strainGradient(1, 'to right'),
              clipPath: `inset(0 ${100 - share(strain)}% 0 0)`,
            }}
          />
        )}
        {within && <div className="hatched absolute inset-y-0 right-0" style={{ left: `${limit}%` }} />}
        {strain !== null && (
          <i className="absolute inset-y-0 border-ink border-r-2" style={{ left: `${share(strain)}%` }} />
        )}
        {within && (
          <i
            className="absolute inset-y-0 border-over border-l-[3px] shadow-[0_0_0_1px_var(--sheet)]"
            style={{ left: `${limit}%` }}
          />
        )}
      </div>
      <span className="flex items-center justify-end gap-2 text-sm md:justify-start">
        <VerdictIcon verdict={verdict} />
        <span>
          <b className="font-semibold">{VERDICT_WORDS[verdict]}</b>
          <span className="text-muted">, allowed {percent(allowed)}</span>
        </span>
      </span>
    </li>
  );
}
