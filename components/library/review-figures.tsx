import { marginWords, VerdictMark } from '@/components/studio/verdict';
import type { Figure } from '@/generators/report';
import { formatQuantity } from '@/lib/units';

/** Every judged figure of a check with its limit. */
export function ReviewFigures({ figures }: { figures: readonly Figure[] }) {
  return (
    <ul className="mt-2">
      {figures
        .filter(({ verdict }) => verdict !== null)
        .map((figure) => (
          <li
            key={figure.id}
            className="flex flex-wrap items-center justify-between gap-x-4 gap-y-1 border-hair border-t py-2"
          >
            <span>
              {figure.label}
              <span className="block font-mono text-muted text-sm">
                {formatQuantity(figure.value, figure.unit)} of {formatQuantity(figure.limit, figure.unit)}
              </span>
            </span>
            <VerdictMark verdict={figure.verdict!} more={marginWords(figure)} />
          </li>
        ))}
    </ul>
  );
}
