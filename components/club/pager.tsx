import Link from 'next/link';
import { buttonClass } from '@/components/ui/button';

type Query = Readonly<Record<string, string>>;

function addressOf(query: Query, page: number): string {
  const set = Object.entries(query).filter(([, value]) => value !== '');
  return `?${new URLSearchParams([...set, ['page', String(page)]])}`;
}

export function Pager({ page, pages, query }: { page: number; pages: number; query: Query }) {
  if (pages <= 1) return null;
  return (
    <nav aria-label="Pages" className="mt-4 flex items-center gap-4">
      {page > 1 && (
        <Link href={addressOf(query, page - 1)} rel="prev" className={buttonClass('line')}>
          Before
        </Link>
      )}
      <span className="text-muted">
        Page {page} of {pages}
      </span>
      {page < pages && (
        <Link href={addressOf(query, page + 1)} rel="next" className={buttonClass('line')}>
          Next
        </Link>
      )}
    </nav>
  );
}
