import type { Metadata } from 'next';
import Link from 'next/link';
import { EntryCard } from '@/components/library/entry-card';
import { LibraryFilters } from '@/components/library/library-filters';
import { LibraryFound, NextPage } from '@/components/library/library-found';
import { buttonClass } from '@/components/ui/button';
import { familyEntry } from '@/generators';
import { searchLibrary } from '@/lib/access/library';
import { listMaterials } from '@/lib/access/materials';
import { may } from '@/lib/access/policy';
import { currentViewer } from '@/lib/auth/session';
import { readPage } from '@/lib/http/page';
import { type PageWords, queryOf } from '@/lib/http/page-words';
import { readLibraryWords } from '@/lib/http/v1/library-words';

export const metadata: Metadata = {
  title: 'Club library',
  description: 'Parts that worked for somebody in the club, to print as they are or to start from.',
};

export default async function LibraryPage({ searchParams }: { searchParams: Promise<PageWords> }) {
  const query = queryOf(await searchParams);
  const words = readLibraryWords(new URLSearchParams(query));
  const page = await readPage(`/library?${query}`, (viewer) => searchLibrary(viewer, words));
  const viewer = await currentViewer();
  const plastics = listMaterials().filter(({ process }) => process === 'printed');
  const names = new Map(plastics.map(({ id, shortName }) => [id, shortName]));
  const entries = page.entries.map((entry) => ({
    ...entry,
    familyName: familyEntry(entry.family)?.about.name ?? entry.family,
    materialName: names.get(entry.material) ?? entry.material,
  }));
  return (
    <main className="frame pt-8 pb-16">
      <div className="flex flex-wrap items-end justify-between gap-4">
        <h1 className="font-bold text-4xl tracking-tight sm:text-5xl">Club library</h1>
        {may(viewer, 'preset.review') && (
          <Link href="/review" className={buttonClass('line')}>
            Review
          </Link>
        )}
      </div>
      <LibraryFilters
        chosen={words}
        materials={plastics.map(({ id, shortName }) => ({ value: id, label: shortName }))}
        member={may(viewer, 'preset.favourite')}
      />
      <LibraryFound page={page} />
      <ul className="mt-3 grid gap-4 sm:grid-cols-2 lg:grid-cols-3 xl:grid-cols-4">
        {entries.map((entry) => (
          <EntryCard key={entry.slug} entry={entry} />
        ))}
      </ul>
      <NextPage next={page.next} query={query} />
    </main>
  );
}
