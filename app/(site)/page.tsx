import type { Metadata } from 'next';
import Link from 'next/link';
import { AnswerList } from '@/components/site/answer-list';
import { answers } from '@/components/site/answers';
import { Bend } from '@/components/site/bend';
import { firstBend, loadSample, sampleLink } from '@/components/site/first-bend';
import { Headline } from '@/components/site/headline';
import { once } from '@/components/site/once';
import { PartTiles } from '@/components/site/part-tiles';
import { FAMILIES } from '@/generators';

const title = 'Bendwell: printed parts that bend and do not break';
const description =
  'Work out straps, clips, screw caps and hinges before you print them: pull on the part, watch the strain, choose the plastic, take the file.';

export const metadata: Metadata = {
  title: { absolute: title },
  description,
  openGraph: { title, description, type: 'website', siteName: 'Bendwell' },
};

/** The same for everyone, so worked out once by each server. */
const content = once(async () => {
  const [bend, href, sample] = await Promise.all([firstBend(), sampleLink(), loadSample()]);
  return { bend, href, answers: answers(sample) };
});

export default async function HomePage() {
  const { bend, href, answers: sampleAnswers } = await content();
  return (
    <main className="frame grid gap-16 pb-20 sm:gap-24">
      <div>
        <Bend {...bend}>
          <Headline sampleHref={href} />
        </Bend>
      </div>
      <section aria-labelledby="answers">
        <h2 id="answers" className="mb-6 max-w-3xl font-bold text-4xl tracking-tight">
          What it tells you of that hook, in PETG, pulled all the way
        </h2>
        <AnswerList answers={sampleAnswers} />
      </section>
      <section aria-labelledby="parts">
        <h2 id="parts" className="mb-6 font-bold text-4xl tracking-tight">
          What must it hold?
        </h2>
        <PartTiles families={FAMILIES.map(({ about }) => about)} />
      </section>
      <p className="max-w-4xl font-heading text-2xl leading-snug tracking-tight sm:text-3xl">
        Every figure says where it comes from. Read <GuideLink href="/guide">how each part works</GuideLink>,{' '}
        <GuideLink href="/materials">what each plastic stands</GuideLink>, and{' '}
        <GuideLink href="/about">what the figures mean</GuideLink> before you trust one.
      </p>
    </main>
  );
}

const GuideLink = ({ href, children }: { href: string; children: string }) => (
  <Link href={href} className="marked font-bold">
    {children}
  </Link>
);
