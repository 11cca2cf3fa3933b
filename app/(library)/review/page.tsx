import type { Metadata } from 'next';
import { z } from 'zod';
import { Pager } from '@/components/designs/pager';
import { ReviewList, ReviewTabs } from '@/components/library/review-list';
import { listReview } from '@/lib/access/review';
import { readPage } from '@/lib/http/page';
import { type PageWords, queryOf } from '@/lib/http/page-words';

export const metadata: Metadata = { title: 'Review' };

const words = z.object({
  state: z.enum(['waiting', 'sent-back', 'published', 'retired']).catch('waiting'),
  page: z.coerce.number().int().min(1).max(10_000).catch(1),
});

export default async function ReviewPage({ searchParams }: { searchParams: Promise<PageWords> }) {
  const given = await searchParams;
  const { state, page } = words.parse(given);
  const { items, counts, pages } = await readPage('/review', (viewer) => listReview(viewer, state, page));
  return (
    <main className="frame pt-8 pb-16">
      <h1 className="font-bold text-4xl tracking-tight sm:text-5xl">Review</h1>
      <ReviewTabs now={state} counts={counts} />
      <ReviewList items={items} />
      <Pager page={page} pages={pages} query={queryOf(given)} />
    </main>
  );
}
