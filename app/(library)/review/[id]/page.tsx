import type { Metadata } from 'next';
import { CompareTable } from '@/components/designs/compare-table';
import { changesBetween } from '@/components/designs/state-changes';
import { BackLink } from '@/components/layout/back-link';
import { DecideForms, RetireForm } from '@/components/library/decide-forms';
import { Drawing } from '@/components/library/drawing';
import { STATE_WORDS } from '@/components/library/handed-in';
import { PresetFacts } from '@/components/library/preset-facts';
import { PAD, Photos } from '@/components/library/preset-sheets';
import { ReviewFigures } from '@/components/library/review-figures';
import { VerdictMark } from '@/components/studio/verdict';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import { loadFamily } from '@/lib/access/families';
import { listMaterials } from '@/lib/access/materials';
import { getReview } from '@/lib/access/review';
import { readPage } from '@/lib/http/page';
import { againAction, publishAction, retireAction, sendBackAction } from '../actions';

export const metadata: Metadata = { title: 'Review a version' };

export default async function ReviewVersionPage({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  const review = await readPage(`/review/${id}`, (viewer) => getReview(viewer, id));
  const { version, before, report, reportBefore, slug, author, decision } = review;
  const family = await loadFamily(version.family);
  const names = new Map(listMaterials().map((one) => [one.id, one.shortName]));
  const nameOf = (material: string) => names.get(material) ?? material;
  return (
    <main className="frame grid gap-5 pt-8 pb-16">
      <div>
        <BackLink href={`/review?state=${version.state}`}>Review</BackLink>
        <h1 className="mt-1 font-bold text-4xl tracking-tight sm:text-5xl">{version.title}</h1>
        <p className="mt-2 text-muted">
          {STATE_WORDS[version.state]}: version {version.number} by {author}. When handed in:{' '}
          <VerdictMark verdict={version.verdict} />
        </p>
        {decision?.note && <p className="mt-2 border-marker border-l-4 pl-3">{decision.note}</p>}
      </div>
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-5 lg:grid-cols-[1.3fr_1fr]">
        <div className="grid gap-5">
          <Drawing
            src={`/api/v1/review/${id}/picture`}
            alt={`${version.title}, drawn from its own mesh`}
            eager
            className="rounded-sheet border border-hair"
          />
          <Photos version={version} />
          <Sheet labelledBy="text" className={PAD}>
            <SheetTitle id="text">What the author says</SheetTitle>
            <p className="mt-1 max-w-prose whitespace-pre-line">{version.purpose}</p>
            <h3 className="mt-4 font-bold">Printing it</h3>
            <p className="mt-1 max-w-prose whitespace-pre-line">{version.printingNotes || 'Nothing said.'}</p>
            <div className="mt-4">
              <PresetFacts version={version} family={family.about.name} material={nameOf(version.material)} />
            </div>
          </Sheet>
        </div>
        <div className="grid gap-5">
          <Sheet labelledBy="compare" className={PAD}>
            <SheetTitle id="compare">Against the version before</SheetTitle>
            {before && reportBefore ? (
              <CompareTable
                names={[`version ${before.number}`, `version ${version.number}`]}
                changes={changesBetween(family.parameters.fields, before, version, nameOf)}
                before={reportBefore}
                after={report}
              />
            ) : (
              <p className="mt-1 text-muted">The first version of this preset.</p>
            )}
          </Sheet>
          <Sheet labelledBy="figures" className={PAD}>
            <SheetTitle id="figures">The check today</SheetTitle>
            <ReviewFigures figures={report.figures} />
          </Sheet>
          <Sheet labelledBy="decide" className={PAD}>
            <SheetTitle id="decide">Decide</SheetTitle>
            <div className="mt-3">
              {version.state === 'waiting' && (
                <DecideForms id={id} again={againAction} publish={publishAction} sendBack={sendBackAction} />
              )}
              {version.state === 'published' && <RetireForm slug={slug} action={retireAction} />}
              {(version.state === 'sent-back' || version.state === 'retired') && (
                <p className="text-muted">Decided. Nothing is left to do here.</p>
              )}
            </div>
          </Sheet>
        </div>
      </div>
    </main>
  );
}
