import type { ReactNode } from 'react';
import { classNames } from './class-names';

/** A white sheet on the bench. */
export function Sheet({
  children,
  className,
  labelledBy,
}: {
  children: ReactNode;
  className?: string;
  labelledBy?: string;
}) {
  return (
    <section
      aria-labelledby={labelledBy}
      className={classNames('rounded-sheet border border-hair bg-sheet shadow-lift', className)}
    >
      {children}
    </section>
  );
}

export function SheetTitle({ id, children, aside }: { id: string; children: ReactNode; aside?: ReactNode }) {
  return (
    <div className="flex flex-wrap items-baseline justify-between gap-x-4 gap-y-1">
      <h2 id={id} className="font-bold text-lg">
        {children}
      </h2>
      {aside}
    </div>
  );
}
