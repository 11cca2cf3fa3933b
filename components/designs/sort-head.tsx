import { ArrowDown, ArrowUp } from 'lucide-react';
import Link from 'next/link';
import type { ReactNode } from 'react';
import { classNames } from '@/components/ui/class-names';

const usuallyDown = (sort: string) => sort === 'changed';

function state(query: string, sort: string) {
  const words = new URLSearchParams(query);
  const chosen = words.get('sort') ?? 'changed';
  const order = words.get('order') ?? (usuallyDown(chosen) ? 'down' : 'up');
  const here = chosen === sort;
  words.set('sort', sort);
  words.set('order', here ? (order === 'down' ? 'up' : 'down') : usuallyDown(sort) ? 'down' : 'up');
  words.delete('page');
  return { here, order, href: `?${words}` };
}

/** A column that can be sorted by; pressed again it turns round. */
export function SortHead({
  sort,
  query,
  className,
  children,
}: {
  sort: string;
  query: string;
  className?: string;
  children: ReactNode;
}) {
  const { here, order, href } = state(query, sort);
  const Arrow = order === 'down' ? ArrowDown : ArrowUp;
  return (
    <th
      scope="col"
      aria-sort={here ? (order === 'down' ? 'descending' : 'ascending') : undefined}
      className={classNames('px-3 sm:px-4', className)}
    >
      <Link
        href={href}
        scroll={false}
        className="inline-flex min-h-11 items-center gap-1 font-semibold text-muted hover:text-ink"
      >
        {children}
        {here && <Arrow aria-hidden="true" size={15} />}
      </Link>
    </th>
  );
}
