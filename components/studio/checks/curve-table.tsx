import type { Curve } from '@/generators/report';
import { formatQuantity, significant, UNIT_SYMBOL } from '@/lib/units';
import { shown } from '../scale';

const MOST_ROWS = 21;

const head = ({ label, unit }: Curve['x']): string =>
  UNIT_SYMBOL[unit] ? `${label}, ${UNIT_SYMBOL[unit]}` : label;

interface Row {
  /** place in the curve */
  readonly at: number;
  readonly x: number;
  readonly y: number;
  readonly low?: number;
  readonly high?: number;
}

/** Rows spread over the curve, first and last kept. */
export function rowsOf({ points, band }: Curve): readonly Row[] {
  const count = Math.min(points.length, MOST_ROWS);
  return Array.from({ length: count }, (_, n) => {
    const at = count === 1 ? 0 : Math.round((n * (points.length - 1)) / (count - 1));
    const [x, y] = points[at]!;
    const [low, high] = band?.[at] ?? [];
    return { at, x, y, ...(low !== undefined && high !== undefined && { low, high }) };
  });
}

/** The curve as numbers. */
export function CurveTable({ curve }: { curve: Curve }) {
  const rows = rowsOf(curve);
  const plain = (value: number, unit: Curve['x']['unit']) => significant(shown(value, unit), 3);
  return (
    <table className="w-full max-w-md border-collapse text-right font-mono text-sm">
      <caption className="sr-only">{curve.label}</caption>
      <thead>
        <tr className="border-ink border-b-2">
          <th className="py-1 font-semibold">{head(curve.x)}</th>
          <th className="py-1 font-semibold">{head(curve.y)}</th>
          {curve.band && <th className="py-1 font-semibold">from, to</th>}
        </tr>
      </thead>
      <tbody>
        {rows.map(({ at, x, y, low, high }) => (
          <tr key={at} className="border-hair border-b">
            <td className="py-0.5">{plain(x, curve.x.unit)}</td>
            <td>{plain(y, curve.y.unit)}</td>
            {curve.band && (
              <td className="text-muted">
                {low !== undefined && high !== undefined
                  ? `${plain(low, curve.y.unit)}, ${plain(high, curve.y.unit)}`
                  : formatQuantity(null, curve.y.unit)}
              </td>
            )}
          </tr>
        ))}
      </tbody>
    </table>
  );
}
