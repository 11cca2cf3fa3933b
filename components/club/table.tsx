import type { ReactNode } from 'react';
import { classNames } from '@/components/ui/class-names';

/** A table on a sheet. On a narrow screen each row becomes a block with the name of each column before its value. */
export function Table({
  label,
  heads,
  children,
}: {
  label: string;
  heads: readonly string[];
  children: ReactNode;
}) {
  return (
    <div className="rounded-sheet border border-hair bg-sheet shadow-lift">
      <table aria-label={label} className="block w-full text-left md:table">
        <thead className="sr-only md:not-sr-only md:table-header-group">
          <tr className="border-hair md:border-b">
            {heads.map((head) => (
              <th key={head} scope="col" className="px-4 py-2.5 font-semibold text-petrol text-sm">
                {head}
              </th>
            ))}
          </tr>
        </thead>
        <tbody className="block divide-y divide-hair md:table-row-group">{children}</tbody>
      </table>
    </div>
  );
}

export const Row = ({ children }: { children: ReactNode }) => (
  <tr className="grid gap-1.5 px-4 py-3 md:table-row md:px-0 md:py-0">{children}</tr>
);

export function Cell({
  head,
  children,
  className,
}: {
  /** name of the column, shown on narrow screens; left out where the value speaks for itself */
  head?: string;
  children: ReactNode;
  className?: string;
}) {
  return (
    <td
      className={classNames('flex flex-wrap gap-x-3 md:table-cell md:px-4 md:py-2.5 md:align-top', className)}
    >
      {head && (
        <span aria-hidden="true" className="min-w-24 text-muted text-sm md:hidden">
          {head}
        </span>
      )}
      {children}
    </td>
  );
}

export const EmptyRow = ({ columns, children }: { columns: number; children: ReactNode }) => (
  <tr className="block md:table-row">
    <td colSpan={columns} className="block px-4 py-8 text-muted md:table-cell">
      {children}
    </td>
  </tr>
);
