import { significant } from '@/lib/units';
import { type Case, caseName, groups, type Quantity } from './record';

const HEADS = ['reference', 'computed', '%'] as const;

function Cells({ one, quantity }: { one: Case; quantity: Quantity }) {
  const pair = one[quantity];
  if (!pair) {
    return (
      <td colSpan={HEADS.length} className="text-center text-muted">
        no reference
      </td>
    );
  }
  const text = (value: number) => significant(quantity === 'strain' ? 100 * value : value, 4);
  return (
    <>
      <td>{text(pair.reference)}</td>
      <td>{text(pair.computed)}</td>
      <td className="font-semibold">{pair.percent.toFixed(2)}</td>
    </>
  );
}

function Line({ one }: { one: Case }) {
  return (
    <>
      <tr className="border-hair border-t">
        <th scope="row" className="py-1 pr-4 text-left font-normal">
          {caseName(one)}
        </th>
        <Cells one={one} quantity="force" />
        <Cells one={one} quantity="strain" />
        <td>{one.estimate.toFixed(1)}</td>
        <td>{one.unknowns}</td>
      </tr>
      {one.exception && (
        <tr>
          <td colSpan={9} className="pb-2 text-left font-text text-muted">
            <b className="text-near">Exception.</b> {one.exception}
          </td>
        </tr>
      )}
    </>
  );
}

function Heads() {
  return (
    <thead className="text-right align-bottom">
      <tr>
        <td />
        <th scope="colgroup" colSpan={3} className="pb-1 text-center font-semibold">
          force, N or N mm
        </th>
        <th scope="colgroup" colSpan={3} className="pb-1 text-center font-semibold">
          peak strain, %
        </th>
        <td colSpan={2} />
      </tr>
      <tr className="border-ink border-b-2 text-xs">
        <th scope="col" className="py-1 text-left font-semibold">
          case
        </th>
        {['force', 'strain'].flatMap((quantity) =>
          HEADS.map((head) => (
            <th key={`${quantity} ${head}`} scope="col" className="py-1 font-semibold">
              {head}
            </th>
          )),
        )}
        <th scope="col" className="py-1 font-semibold">
          estimate, %
        </th>
        <th scope="col" className="py-1 font-semibold">
          unknowns
        </th>
      </tr>
    </thead>
  );
}

/** Every case with both figures, folded by group. */
export function ReferenceTable() {
  return (
    <div className="grid grid-cols-[minmax(0,1fr)] gap-2">
      {groups().map(([name, cases]) => (
        <details key={name} className="rounded-sheet border border-hair bg-sheet px-4 py-2 sm:px-6">
          <summary className="min-h-8 font-semibold">
            {name} <span className="font-normal text-muted text-sm">({cases.length})</span>
          </summary>
          <section
            aria-label={`${name}, table`}
            // biome-ignore lint/a11y/noNoninteractiveTabindex: what scrolls must be scrolled by keys too
            tabIndex={0}
            className="overflow-x-auto"
          >
            <table className="min-w-[46rem] text-right font-mono text-sm [&_td]:pl-4 [&_th]:pl-4">
              <caption className="sr-only">{name}: references and computed figures</caption>
              <Heads />
              <tbody>
                {cases.map((one) => (
                  <Line key={one.id} one={one} />
                ))}
              </tbody>
            </table>
          </section>
        </details>
      ))}
    </div>
  );
}
