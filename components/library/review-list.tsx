import Link from 'next/link';
import { When } from '@/components/designs/when';
import { VerdictMark } from '@/components/studio/verdict';
import type { ReviewItem } from '@/lib/access/review';
import { STATE_WORDS } from './handed-in';

type State = ReviewItem['state'];
const STATES = Object.keys(STATE_WORDS) as State[];

export function ReviewTabs({
  now,
  counts,
}: {
  now: State;
  counts: Readonly<Partial<Record<State, number>>>;
}) {
  return (
    <nav aria-label="States" className="mt-6">
      <ul className="flex flex-wrap gap-x-6">
        {STATES.map((state) => (
          <li key={state}>
            <Link
              href={`/review?state=${state}`}
              aria-current={state === now ? 'page' : undefined}
              className="inline-flex min-h-11 items-center gap-1.5 text-muted hover:text-ink aria-[current]:font-semibold aria-[current]:text-ink"
            >
              <span className={state === now ? 'marked' : undefined}>{STATE_WORDS[state]}</span>
              <span>{counts[state] ?? 0}</span>
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}

function Line({ item }: { item: ReviewItem }) {
  return (
    <li className="relative grid gap-x-8 gap-y-1 border-hair border-t px-5 py-4 focus-within:bg-tint hover:bg-tint sm:px-7 lg:grid-cols-[1.4fr_1fr_auto] lg:items-center">
      <div>
        <h2 className="font-bold text-xl leading-tight">
          <Link
            href={`/review/${item.id}`}
            className="after:absolute after:inset-0 hover:underline"
            prefetch={false}
          >
            {item.title}
          </Link>
        </h2>
        <p className="text-muted text-sm">
          Version {item.number} by {item.authorName}, handed in <When iso={item.handedInAt} />
        </p>
      </div>
      <p className="line-clamp-2">{item.decisionNote ?? item.purpose}</p>
      <VerdictMark verdict={item.verdict} />
    </li>
  );
}

export function ReviewList({ items }: { items: readonly ReviewItem[] }) {
  if (items.length === 0) return <p className="mt-8 text-lg text-muted">Nothing here.</p>;
  return (
    <ul className="mt-4 rounded-sheet border border-hair bg-sheet shadow-lift [&>li:first-child]:border-t-0">
      {items.map((item) => (
        <Line key={item.id} item={item} />
      ))}
    </ul>
  );
}
