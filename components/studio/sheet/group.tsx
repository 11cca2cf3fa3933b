import type { ReactNode } from 'react';

export function Group({
  id,
  title,
  aside,
  children,
}: {
  id: string;
  title: string;
  aside?: ReactNode;
  children: ReactNode;
}) {
  return (
    <fieldset className="min-w-0 border-hair border-b py-3 last:border-b-0" aria-labelledby={`group-${id}`}>
      <div className="flex items-baseline justify-between gap-3 px-4 pb-1 sm:px-5">
        <h3 id={`group-${id}`} className="font-bold text-petrol">
          {title}
        </h3>
        {aside && <span className="text-muted text-xs">{aside}</span>}
      </div>
      {children}
    </fieldset>
  );
}
