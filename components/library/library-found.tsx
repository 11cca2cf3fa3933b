import Link from 'next/link';
import { buttonClass } from '@/components/ui/button';
import type { LibraryPage } from '@/lib/access/library';

const grouped = (count: number): string => count.toLocaleString('en-GB').replaceAll(',', '\u202f');

/** How many presets fit, and what to do when none does. */
export function LibraryFound({ page }: { page: LibraryPage }) {
  const { found, more, sortedAmong } = page;
  if (found === 0) {
    return (
      <p role="status" className="mt-8 max-w-prose text-lg text-muted">
        Nothing in the library fits that. Try fewer words or filters, or{' '}
        <Link href="/design" className="text-ink underline underline-offset-4">
          design it yourself
        </Link>
        .
      </p>
    );
  }
  return (
    <p role="status" className="mt-6 text-muted text-sm">
      {more ? `More than ${grouped(found)}` : grouped(found)} {found === 1 ? 'preset' : 'presets'}
      {sortedAmong !== null && `, sorted among the newest ${grouped(sortedAmong)}`}
    </p>
  );
}

export function NextPage({ next, query }: { next: string | null; query: string }) {
  const words = new URLSearchParams(query);
  const begun = words.has('after');
  words.delete('after');
  const first = `?${words}`;
  if (next !== null) words.set('after', next);
  if (next === null && !begun) return null;
  return (
    <nav aria-label="Pages" className="mt-6 flex justify-center gap-3">
      {begun && (
        <Link href={first} className={buttonClass('quiet')}>
          To the first
        </Link>
      )}
      {next !== null && (
        <Link href={`?${words}`} className={buttonClass('line')} rel="next">
          More presets
        </Link>
      )}
    </nav>
  );
}
