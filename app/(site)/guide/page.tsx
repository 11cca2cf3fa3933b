import type { Metadata } from 'next';
import Link from 'next/link';
import { GuideIndex } from '@/components/site/guide-index';
import { FAMILIES } from '@/generators';

const title = 'Guide: how printed parts bend, and how they break';
const description =
  'Part by part: what it is for, how it fails, the formulas with their sources, how to print it, and cautions.';

export const metadata: Metadata = {
  title: 'Guide',
  description,
  openGraph: { title, description, type: 'website', siteName: 'Bendwell' },
};

export default async function GuideIndexPage() {
  const entries = await Promise.all(
    FAMILIES.map(async ({ about, loadGuide }) => ({ about, guide: await loadGuide() })),
  );
  return (
    <main className="frame pt-8 pb-20">
      <h1 className="max-w-4xl font-extrabold text-[clamp(2.4rem,4.6vw,4.2rem)] leading-none tracking-[-0.03em]">
        How they bend, and how they break
      </h1>
      <p className="mt-4 mb-10 max-w-prose text-lg text-muted">
        A page for each part: what it is for, what fails first, every formula the check uses with its source
        and the range it holds in, and what to mind in printing.
      </p>
      <GuideIndex entries={entries} />
      <p className="mt-8 max-w-prose text-lg">
        Hooks, clips and hinges are also solved by finite elements while you change them.{' '}
        <Link href="/guide/verification" className="font-semibold underline underline-offset-4">
          How far the computed strain can be trusted
        </Link>
        , case by case.
      </p>
    </main>
  );
}
