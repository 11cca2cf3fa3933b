import Link from 'next/link';
import { buttonClass } from '@/components/ui/button';

const withPage = (query: string, page: number): string => {
  const words = new URLSearchParams(query);
  words.set('page', String(page));
  return `?${words}`;
};

export function Pager({ page, pages, query }: { page: number; pages: number; query: string }) {
  if (pages <= 1) return null;
  return (
    <nav aria-label="Pages" className="mt-5 flex items-center justify-center gap-4">
      {page > 1 && (
        <Link href={withPage(query, page - 1)} className={buttonClass('line')} rel="prev">
          Before
        </Link>
      )}
      <span className="text-muted">
        Page {page} of {pages}
      </span>
      {page < pages && (
        <Link href={withPage(query, page + 1)} className={buttonClass('line')} rel="next">
          Next
        </Link>
      )}
    </nav>
  );
}
