import type { Metadata } from 'next';
import { CheckIn } from '@/components/library/check-in';
import { LivePart } from '@/components/library/live-part';
import { PresetFacts } from '@/components/library/preset-facts';
import { PresetHead } from '@/components/library/preset-head';
import { Files, PAD, Photos, Versions } from '@/components/library/preset-sheets';
import { ReportForm } from '@/components/library/report-form';
import { Reports } from '@/components/library/reports';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import { familyEntry } from '@/generators';
import type { Design as Part } from '@/generators/url-state';
import { designLink } from '@/lib/access/design-link';
import { getMaterial, listMaterials } from '@/lib/access/materials';
import { may } from '@/lib/access/policy';
import { getPreset } from '@/lib/access/presets';
import { currentViewer } from '@/lib/auth/session';
import { readPage } from '@/lib/http/page';
import { readVersion } from '@/lib/http/v1/library-words';
import { reportAction, startAction } from './actions';

interface Props {
  readonly params: Promise<{ slug: string }>;
  readonly searchParams: Promise<{ version?: string | string[] }>;
}

const CAUTIONS =
  'Estimates for a first print, and other people’s parts: prove it by test on your printer, in your plastic. Not for lifting, climbing, life support, child safety or any load that can hurt someone if it lets go. Local codes and licensed practice come first.';

async function presetOf({ params, searchParams }: Props) {
  const { slug } = await params;
  const number = readVersion((await searchParams).version);
  return readPage(`/library/${slug}`, (viewer) => getPreset(viewer, slug, number));
}

export async function generateMetadata(props: Props): Promise<Metadata> {
  const { version } = await presetOf(props);
  return { title: version.title, description: version.purpose };
}

export default async function PresetPage(props: Props) {
  const preset = await presetOf(props);
  const { slug, version } = preset;
  const viewer = await currentViewer();
  const material = getMaterial(version.material);
  const plastics = listMaterials()
    .filter(({ process }) => process === 'printed')
    .map(({ id, shortName }) => ({ value: id, label: shortName }));
  const link = await designLink(version);
  const { family, parameters, use } = version;
  return (
    <main className="frame grid gap-5 pt-8 pb-16">
      <PresetHead
        preset={preset}
        link={`/design/${family}?${link}`}
        member={may(viewer, 'design.own')}
        start={startAction}
      />
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-5 lg:grid-cols-[1.2fr_1fr]">
        <div className="grid gap-5">
          <LivePart
            family={family}
            values={parameters as Part['values']}
            material={material}
            picture={`/api/v1/presets/${slug}/picture?version=${version.number}`}
            title={version.title}
          />
          <Photos version={version} />
          <Sheet labelledBy="purpose" className={PAD}>
            <SheetTitle id="purpose">What for</SheetTitle>
            <p className="mt-1 max-w-prose whitespace-pre-line">{version.purpose}</p>
            {version.printingNotes && (
              <>
                <h3 className="mt-4 font-bold">Printing it</h3>
                <p className="mt-1 max-w-prose whitespace-pre-line">{version.printingNotes}</p>
              </>
            )}
          </Sheet>
        </div>
        <div className="grid gap-5">
          <Sheet labelledBy="check" className={PAD}>
            <SheetTitle id="check">Will it hold</SheetTitle>
            <CheckIn part={{ family, parameters, use }} own={version.material} materials={plastics} />
          </Sheet>
          <Sheet labelledBy="facts" className={PAD}>
            <SheetTitle id="facts">Facts</SheetTitle>
            <PresetFacts
              version={version}
              family={familyEntry(family)?.about.name ?? family}
              material={material.shortName}
            />
          </Sheet>
          <Files version={version} link={link} />
          <Versions preset={preset} />
        </div>
      </div>
      <Sheet labelledBy="reports" className={PAD}>
        <SheetTitle id="reports">How it went for others</SheetTitle>
        <div className="grid gap-x-10 gap-y-6 lg:grid-cols-2">
          <Reports reports={preset.reports} />
          {may(viewer, 'preset.report') && (
            <ReportForm
              action={reportAction}
              slug={slug}
              version={version.number}
              material={version.material}
              materials={plastics}
            />
          )}
        </div>
      </Sheet>
      <p className="max-w-prose text-muted text-sm">{CAUTIONS}</p>
    </main>
  );
}
