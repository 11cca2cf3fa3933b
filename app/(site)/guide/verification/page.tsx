import type { Metadata } from 'next';
import Link from 'next/link';
import { ConvergenceKey, ConvergencePlot } from '@/components/site/verification/convergence-plot';
import { DifferenceStrips } from '@/components/site/verification/difference-strips';
import { CASES, CONVERGENCE, spreadOf } from '@/components/site/verification/record';
import { ReferenceTable } from '@/components/site/verification/reference-table';
import { LIMITS, PUBLISHED } from '@/components/site/verification/text';
import { significant } from '@/lib/units';

const title = 'How far the computed strain can be trusted';
const description =
  'The plane finite elements against outside references: differences case by case, convergence, and what they leave out.';

export const metadata: Metadata = {
  title,
  description,
  openGraph: { title, description, type: 'article', siteName: 'Bendwell' },
};

const Heading = ({ id, children }: { id: string; children: string }) => (
  <h2 id={id} className="mb-4 scroll-mt-6 border-ink border-t-2 pt-4 font-bold text-3xl tracking-tight">
    {children}
  </h2>
);

const Points = ({ points }: { points: readonly string[] }) => (
  <ul className="grid max-w-[68ch] gap-3">
    {points.map((point) => (
      <li
        key={point}
        className="relative pl-7 before:absolute before:top-[0.6em] before:left-0 before:h-[3px] before:w-4 before:bg-marker"
      >
        {point}
      </li>
    ))}
  </ul>
);

function Figure({ value, words }: { value: string; words: string }) {
  return (
    <div className="min-w-40">
      <dt className="mt-1 max-w-48 text-muted text-sm">{words}</dt>
      <dd className="font-bold font-heading text-5xl tracking-tight">{value}</dd>
    </div>
  );
}

function Summary() {
  const [force, strain] = [spreadOf(CASES, 'force'), spreadOf(CASES, 'strain')];
  const exceptions = CASES.filter(({ exception }) => exception !== null).length;
  const text = (percent: number) => `${significant(percent, 2)} %`;
  return (
    <dl className="mt-8 mb-14 flex flex-wrap gap-x-12 gap-y-6 [&>div]:flex [&>div]:flex-col-reverse [&>div]:justify-end">
      <Figure value={String(CASES.length)} words="cases solved outside, each solved here again" />
      {force && <Figure value={text(force.largest)} words={`largest difference of ${force.count} forces`} />}
      {strain && (
        <Figure value={text(strain.largest)} words={`largest difference of ${strain.count} peak strains`} />
      )}
      {strain && (
        <Figure value={text(strain.median)} words="difference that half of the strains stay under" />
      )}
      <Figure value={String(exceptions)} words="exception, listed with its cause and not counted before" />
    </dl>
  );
}

export default function VerificationPage() {
  return (
    <main className="frame pt-8 pb-20">
      <p className="text-muted">
        <Link href="/guide" className="underline decoration-hair underline-offset-4 hover:decoration-ink">
          Guide
        </Link>
      </p>
      <h1 className="mt-2 max-w-4xl font-extrabold text-[clamp(2.4rem,4.6vw,4.2rem)] leading-none tracking-[-0.03em]">
        {title}
      </h1>
      <p className="mt-4 max-w-prose text-lg text-muted">
        Wherever a part bends as a flat outline the verdict stands on finite elements, solved in your browser
        while you type. This page holds them against figures that were found elsewhere. It is written by a
        script from real runs of the same solver, with the same mesh.
      </p>
      <Summary />
      <div className="grid grid-cols-[minmax(0,1fr)] gap-14">
        <section aria-labelledby="differences">
          <Heading id="differences">Against the references</Heading>
          <p className="mb-5 max-w-[68ch]">
            The references were solved with CalculiX 2.20 on fine meshes from gmsh 4.8, with a mesh error of
            0.4 to 3 % of their own. One dot is one case; left of the middle the figure here is the smaller
            one.
          </p>
          <DifferenceStrips />
        </section>
        <section aria-labelledby="convergence">
          <Heading id="convergence">As the mesh gets finer</Heading>
          <p className="mb-5 max-w-[68ch]">
            The third dot from the left is the mesh that every check uses; the finest, which the others are
            compared with, has edges a quarter as long.
          </p>
          <ConvergenceKey />
          <div className="mt-6 grid gap-x-10 gap-y-10 md:grid-cols-2 xl:grid-cols-4">
            {CONVERGENCE.map((run) => (
              <ConvergencePlot key={run.id} run={run} />
            ))}
          </div>
        </section>
        <section aria-labelledby="published">
          <Heading id="published">Against published solutions</Heading>
          <p className="mb-5 max-w-[68ch]">Checked anew whenever the code is tested:</p>
          <Points points={PUBLISHED} />
        </section>
        <section aria-labelledby="limits">
          <Heading id="limits">What it leaves out</Heading>
          <Points points={LIMITS} />
        </section>
        <section aria-labelledby="table">
          <Heading id="table">Case by case</Heading>
          <p className="mb-5 max-w-[68ch]">
            The estimate is what the page tells beside a computed peak: from the mesh alone, without knowing
            the reference.{' '}
            <a
              href="/verification/finite-elements.json"
              className="font-semibold underline underline-offset-4"
              download
            >
              The record as a file
            </a>
          </p>
          <ReferenceTable />
        </section>
      </div>
    </main>
  );
}
