import { type ReactNode, useId } from 'react';
import { classNames } from './class-names';

/** A small label over its field, which gets the id it is given. */
export function Labelled({
  label,
  className,
  children,
}: {
  label: string;
  className?: string;
  children: (id: string) => ReactNode;
}) {
  const id = useId();
  return (
    <div className={classNames('grid gap-1 text-sm', className)}>
      <label htmlFor={id}>{label}</label>
      {children(id)}
    </div>
  );
}
