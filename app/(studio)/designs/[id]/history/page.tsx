import type { Metadata } from 'next';
import { CompareTable } from '@/components/designs/compare-table';
import { changesBetween } from '@/components/designs/state-changes';
import { StateList } from '@/components/designs/state-list';
import { BackLink } from '@/components/layout/back-link';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import { getHistory } from '@/lib/access/design-history';
import { loadFamily } from '@/lib/access/families';
import { listMaterials } from '@/lib/access/materials';
import { readPage } from '@/lib/http/page';
import { readVersion } from '@/lib/http/v1/library-words';

export const metadata: Metadata = { title: 'History' };

interface Props {
  readonly params: Promise<{ id: string }>;
  readonly searchParams: Promise<{ state?: string | string[] }>;
}

const PAD = 'px-5 py-4 sm:px-7';

export default async function HistoryPage({ params, searchParams }: Props) {
  const { id } = await params;
  const state = readVersion((await searchParams).state);
  const { design, states, compared } = await readPage(`/designs/${id}/history`, (viewer) =>
    getHistory(viewer, id, state),
  );
  const { fields } = (await loadFamily(design.family)).parameters;
  const names = new Map(listMaterials().map((one) => [one.id, one.shortName]));
  const nameOf = (material: string) => names.get(material) ?? material;
  return (
    <main className="frame grid gap-5 pt-8 pb-16">
      <div>
        <BackLink href={`/designs/${id}`}>{design.name}</BackLink>
        <h1 className="mt-1 font-bold text-4xl tracking-tight sm:text-5xl">History</h1>
        <p className="mt-2 max-w-prose text-muted">
          A run of changes is one state. Restoring one makes it the newest; nothing that was saved is lost.
        </p>
      </div>
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-5 lg:grid-cols-2">
        <Sheet labelledBy="states" className={PAD}>
          <SheetTitle id="states">Saved states</SheetTitle>
          <StateList
            id={id}
            revision={design.revision}
            states={states}
            shown={compared?.after.revision ?? design.revision}
          />
        </Sheet>
        <Sheet labelledBy="changed" className={PAD}>
          <SheetTitle id="changed">What changed</SheetTitle>
          {compared ? (
            <CompareTable
              names={['before', 'after']}
              changes={changesBetween(fields, compared.before, compared.after, nameOf)}
              before={compared.reports[0]}
              after={compared.reports[1]}
            />
          ) : (
            <p className="mt-2 text-muted">
              One state so far. Change the design, and what changed will stand here.
            </p>
          )}
        </Sheet>
      </div>
    </main>
  );
}
