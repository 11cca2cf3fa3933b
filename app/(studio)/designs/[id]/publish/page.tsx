import type { Metadata } from 'next';
import { BackLink } from '@/components/layout/back-link';
import { HandedIn } from '@/components/library/handed-in';
import { PublishForm } from '@/components/library/publish-form';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import { getDesign } from '@/lib/access/designs';
import { handedInOf } from '@/lib/access/hand-in';
import { readPage } from '@/lib/http/page';
import { handInAction } from './actions';

export const metadata: Metadata = { title: 'Publish to the library' };

const PAD = 'px-5 py-4 sm:px-7';

export default async function PublishPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  const { design, slug, versions } = await readPage(`/designs/${id}/publish`, (viewer) => ({
    design: getDesign(viewer, id),
    ...handedInOf(viewer, id),
  }));
  const last = versions[0];
  const first = last ?? {
    title: design.name,
    purpose: '',
    printingNotes: '',
    tags: [],
    licence: 'CC-BY-4.0',
  };
  return (
    <main className="frame grid gap-5 pt-8 pb-16">
      <div>
        <BackLink href={`/designs/${id}`}>{design.name}</BackLink>
        <h1 className="mt-1 font-bold text-4xl tracking-tight sm:text-5xl">Publish to the library</h1>
      </div>
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-5 lg:grid-cols-[1.4fr_1fr]">
        <Sheet labelledBy="words" className={PAD}>
          <SheetTitle id="words">{last ? 'The next version' : 'What others need to know'}</SheetTitle>
          {last?.state === 'waiting' ? (
            <p className="mt-2 max-w-prose text-muted">
              Version {last.number} is with the librarians. When they have decided, the next one can be handed
              in here.
            </p>
          ) : (
            <div className="mt-4">
              <PublishForm action={handInAction} designId={id} first={first} />
            </div>
          )}
        </Sheet>
        {versions.length > 0 && (
          <Sheet labelledBy="handed-in" className={PAD}>
            <SheetTitle id="handed-in">Handed in</SheetTitle>
            <HandedIn slug={slug} versions={versions} />
          </Sheet>
        )}
      </div>
    </main>
  );
}
