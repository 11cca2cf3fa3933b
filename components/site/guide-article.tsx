import Link from 'next/link';
import type { ReactNode } from 'react';
import { buttonClass } from '@/components/ui/button';
import type { About, Guide } from '@/generators/contract';
import { FormulaCard } from './formula-card';
import { PartPicture } from './part-tiles';

const PARTS = [
  { id: 'fails', title: 'How it fails' },
  { id: 'formulas', title: 'What is computed' },
  { id: 'printing', title: 'Printing it' },
  { id: 'cautions', title: 'Cautions' },
] as const;

function Part({ id, title, children }: { id: string; title: string; children: ReactNode }) {
  return (
    <section aria-labelledby={id} className="scroll-mt-6 border-ink border-t-2 pt-4">
      <h2 id={id} className="mb-4 font-bold text-3xl tracking-tight">
        {title}
      </h2>
      {children}
    </section>
  );
}

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

/** One family explained: what for, how it fails, what is computed and on whose word, how to print it. */
export function GuideArticle({ about, guide }: { about: About; guide: Guide }) {
  return (
    <main className="frame pt-8 pb-20">
      <p className="text-muted">
        <Link href="/guide" className="underline decoration-hair underline-offset-4 hover:decoration-ink">
          Guide
        </Link>{' '}
        · bends by {about.bendsBy}
      </p>
      <div className="mt-2 grid items-center gap-x-12 gap-y-6 lg:grid-cols-[1fr_minmax(20rem,30rem)]">
        <div>
          <h1 className="font-extrabold text-[clamp(2.4rem,4.6vw,4.2rem)] leading-none tracking-[-0.03em]">
            {about.name}
          </h1>
          <div className="mt-5 grid max-w-[60ch] gap-3 text-lg">
            {guide.purpose.map((paragraph) => (
              <p key={paragraph}>{paragraph}</p>
            ))}
          </div>
          <Link href={`/design/${about.id}`} className={`${buttonClass('ink')} mt-6`}>
            Design one
          </Link>
        </div>
        <PartPicture
          about={about}
          className="h-auto w-full rounded-sheet border border-hair bg-[color-mix(in_oklab,var(--sheet),var(--edge)_18%)]"
        />
      </div>
      <div className="mt-8 grid gap-4 md:grid-cols-2">
        <p className="rounded-sheet border border-hair bg-sheet p-5">
          <b className="block text-ok">Right when</b>
          {about.rightWhen}
        </p>
        <p className="rounded-sheet border border-hair bg-sheet p-5">
          <b className="block text-over">Wrong when</b>
          {about.wrongWhen}
        </p>
      </div>
      <div className="mt-14 grid gap-x-12 gap-y-6 lg:grid-cols-[12rem_1fr]">
        <nav aria-label="On this page" className="lg:sticky lg:top-6 lg:self-start">
          <ul className="flex flex-wrap gap-x-5 lg:grid">
            {PARTS.map(({ id, title }) => (
              <li key={id}>
                <a
                  href={`#${id}`}
                  className="inline-flex min-h-9 items-center font-semibold underline decoration-hair underline-offset-4 hover:decoration-ink"
                >
                  {title}
                </a>
              </li>
            ))}
          </ul>
        </nav>
        <div className="grid min-w-0 gap-14">
          <Part id="fails" title="How it fails">
            <Points points={guide.howItFails} />
          </Part>
          <Part id="formulas" title="What is computed">
            <div className="rounded-sheet border border-hair bg-sheet px-5 shadow-lift sm:px-7">
              {guide.formulas.map((formula) => (
                <FormulaCard key={formula.name} formula={formula} />
              ))}
            </div>
            <p className="mt-4 max-w-[68ch] text-muted">
              Lengths in mm, forces in N, stresses in MPa, strains as fractions, angles inside formulas in
              radians. Where the part bends as a flat outline, the design page solves it by finite elements as
              well and lets them carry the verdict:{' '}
              <Link href="/guide/verification" className="underline underline-offset-4">
                how far these can be trusted
              </Link>
              .{' '}
              <Link href="/about#marks" className="underline underline-offset-4">
                What the marks of sources mean
              </Link>
              .
            </p>
          </Part>
          <Part id="printing" title="Printing it">
            <Points points={guide.printing} />
          </Part>
          <Part id="cautions" title="Cautions">
            <Points points={guide.cautions} />
          </Part>
        </div>
      </div>
    </main>
  );
}
