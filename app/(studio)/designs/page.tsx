import type { Metadata } from 'next';
import Link from 'next/link';
import { DesignFilters } from '@/components/designs/design-filters';
import { DesignTable } from '@/components/designs/design-table';
import { MoveIn } from '@/components/designs/move-in';
import { NoDesigns } from '@/components/designs/no-designs';
import { Pager } from '@/components/designs/pager';
import { buttonClass } from '@/components/ui/button';
import { FAMILIES, familyEntry } from '@/generators';
import { listDesigns } from '@/lib/access/designs';
import { listMaterials } from '@/lib/access/materials';
import { readPage } from '@/lib/http/page';
import { type PageWords, queryOf } from '@/lib/http/page-words';
import { designFilter, readDesignWords } from '@/lib/http/v1/design-filter';

export const metadata: Metadata = { title: 'My designs' };

const NAMES = FAMILIES.map(({ about: { id, name } }) => ({ id, name }));
const OPTIONS = NAMES.map(({ id, name }) => ({ value: id, label: name }));

export default async function DesignsPage({ searchParams }: { searchParams: Promise<PageWords> }) {
  const query = queryOf(await searchParams);
  const words = readDesignWords(new URLSearchParams(query));
  const { designs, total, page, pages } = await readPage(`/designs?${query}`, (viewer) =>
    listDesigns(viewer, designFilter(words)),
  );
  const plastics = new Map(listMaterials().map(({ id, shortName }) => [id, shortName]));
  const rows = designs.map((design) => ({
    ...design,
    familyName: familyEntry(design.family)?.about.name ?? design.family,
    materialName: plastics.get(design.material) ?? design.material,
  }));
  const narrowed = Boolean(words.search || words.family || words.verdict || words.material);
  return (
    <main className="frame pt-8 pb-16">
      <div className="flex flex-wrap items-end justify-between gap-4">
        <h1 className="font-bold text-4xl tracking-tight sm:text-5xl">
          {words.deleted ? 'Deleted designs' : 'My designs'}
        </h1>
        <p className="flex flex-wrap items-center gap-2">
          <Link href={words.deleted ? '/designs' : '/designs?deleted=yes'} className={buttonClass('quiet')}>
            {words.deleted ? 'Back to my designs' : 'Deleted'}
          </Link>
          <Link href="/design" className={buttonClass('ink')}>
            New design
          </Link>
        </p>
      </div>
      <MoveIn families={NAMES} />
      {(total > 0 || narrowed) && <DesignFilters chosen={words} families={OPTIONS} />}
      <DesignTable rows={rows} deleted={words.deleted} query={query} />
      {total === 0 && <NoDesigns narrowed={narrowed} deleted={words.deleted} />}
      <Pager page={page} pages={pages} query={query} />
    </main>
  );
}
