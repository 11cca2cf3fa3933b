import type { Report } from '@/generators/report';
import { formatQuantity } from '@/lib/units';
import type { Change } from './state-changes';

interface Row extends Change {
  readonly id: string;
}

/** Figures whose value or limit differ, in the words of the report. */
function figureRows(before: Report, after: Report): Row[] {
  return after.figures.flatMap(({ id, label, unit, value }) => {
    const was = before.figures.find((one) => one.id === id);
    const [from, to] = [formatQuantity(was?.value ?? null, unit), formatQuantity(value, unit)];
    return from === to ? [] : [{ id, label, before: from, after: to }];
  });
}

function Rows({ title, rows, none }: { title: string; rows: readonly Row[]; none: string }) {
  return (
    <>
      <tr>
        <th scope="colgroup" colSpan={3} className="pt-4 pb-1 text-left font-bold text-lg">
          {title}
        </th>
      </tr>
      {rows.length === 0 && (
        <tr>
          <td colSpan={3} className="py-1 text-muted">
            {none}
          </td>
        </tr>
      )}
      {rows.map(({ id, label, before, after }) => (
        <tr key={id} className="border-hair border-t">
          <th scope="row" className="py-1.5 pr-4 text-left font-normal">
            {label}
          </th>
          <td className="px-3 py-1.5 text-right font-mono text-muted text-sm">{before}</td>
          <td className="py-1.5 pl-3 text-right font-mono text-sm">
            <span className="marked">{after}</span>
          </td>
        </tr>
      ))}
    </>
  );
}

/** Two states of a part side by side: only what differs. */
export function CompareTable({
  names,
  changes,
  before,
  after,
}: {
  names: readonly [string, string];
  changes: readonly Change[];
  before: Report;
  after: Report;
}) {
  return (
    <table className="w-full">
      <caption className="sr-only">
        {names[0]} and {names[1]} compared
      </caption>
      <thead className="text-sm">
        <tr>
          <td />
          <th scope="col" className="px-3 text-right font-semibold text-muted">
            {names[0]}
          </th>
          <th scope="col" className="pl-3 text-right font-semibold">
            {names[1]}
          </th>
        </tr>
      </thead>
      <tbody>
        <Rows
          title="Dimensions, plastic and use"
          rows={changes.map((change) => ({ ...change, id: change.label }))}
          none="The same."
        />
        <Rows title="Figures" rows={figureRows(before, after)} none="The same." />
      </tbody>
    </table>
  );
}
