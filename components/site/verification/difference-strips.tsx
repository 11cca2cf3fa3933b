import { significant } from '@/lib/units';
import { type Case, differences, groups, type Quantity, spreadOf } from './record';

/** Percent at both ends of a strip. */
const REACH = 3;

const ROWS = [
  { quantity: 'force', name: 'force', dot: 'bg-petrol' },
  { quantity: 'strain', name: 'peak strain', dot: 'bg-clay' },
] as const;

const place = (percent: number): string =>
  `${(100 * (Math.max(-REACH, Math.min(REACH, percent)) + REACH)) / (2 * REACH)}%`;

function Strip({ cases, quantity, dot }: { cases: readonly Case[]; quantity: Quantity; dot: string }) {
  return (
    <span aria-hidden="true" className="relative block h-5 bg-tint">
      <i className="absolute inset-y-0 left-1/2 w-px bg-ink" />
      {differences(cases, quantity).map((percent, at) => (
        <i
          // biome-ignore lint/suspicious/noArrayIndexKey: the dots of a record that never changes
          key={at}
          className={`absolute top-1/2 size-2.5 -translate-x-1/2 -translate-y-1/2 rounded-full opacity-60 ${dot}`}
          style={{ left: place(percent) }}
        />
      ))}
    </span>
  );
}

function spreadWords(cases: readonly Case[], quantity: Quantity): string {
  const spread = spreadOf(cases, quantity);
  if (spread) return `${spread.count}, at most ${significant(spread.largest, 2)} %`;
  return cases.some((one) => one.exception !== null && one[quantity]) ? 'exception' : 'no reference';
}

/** One dot a case: how far computed and reference are apart, by what the case is about. */
export function DifferenceStrips() {
  return (
    <ul className="rounded-sheet border border-hair bg-sheet px-4 shadow-lift sm:px-6">
      {groups().map(([name, cases]) => (
        <li
          key={name}
          className="grid gap-x-6 gap-y-1 border-hair border-t py-3 first:border-t-0 md:grid-cols-[16rem_1fr] md:items-center"
        >
          <h3 className="font-semibold leading-tight">{name}</h3>
          <div className="grid gap-1">
            {ROWS.map(({ quantity, name: label, dot }) => (
              <div
                key={quantity}
                className="grid grid-cols-[5.5rem_1fr] items-center gap-x-3 text-sm sm:grid-cols-[5.5rem_1fr_9.5rem]"
              >
                <span>{label}</span>
                <Strip cases={cases} quantity={quantity} dot={dot} />
                <span className="col-start-2 text-muted sm:col-start-3">{spreadWords(cases, quantity)}</span>
              </div>
            ))}
          </div>
        </li>
      ))}
      <li aria-hidden="true" className="hidden py-2 md:grid md:grid-cols-[16rem_1fr] md:gap-x-6">
        <span />
        <span className="grid grid-cols-[5.5rem_1fr_9.5rem] gap-x-3">
          <span />
          <span className="flex justify-between font-mono text-muted text-xs">
            <span>−{REACH} %</span>
            <span>0</span>
            <span>+{REACH} %</span>
          </span>
        </span>
      </li>
    </ul>
  );
}
