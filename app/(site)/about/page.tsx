import type { Metadata } from 'next';
import { CAUTIONS, FIGURES, FONTS, KEEPING, MARKS, type Passage } from '@/components/site/about-text';
import { SourceMark } from '@/components/site/source-mark';

const title = 'What the figures mean';
const description =
  'How to read strain, limits, bands and verdicts, what the marks of sources say, cautions, and licences of the fonts.';

export const metadata: Metadata = {
  title,
  description,
  openGraph: { title, description, type: 'article', siteName: 'Bendwell' },
};

const Heading = ({ id, children }: { id: string; children: string }) => (
  <h2 id={id} className="mb-5 scroll-mt-6 border-ink border-t-2 pt-4 font-bold text-3xl tracking-tight">
    {children}
  </h2>
);

const Passages = ({ passages }: { passages: readonly Passage[] }) => (
  <dl className="grid gap-x-12 gap-y-7 md:grid-cols-2 xl:grid-cols-3">
    {passages.map(({ head, text }) => (
      <div key={head}>
        <dt className="font-bold font-heading text-xl tracking-tight">{head}</dt>
        <dd className="mt-1 max-w-[60ch]">{text}</dd>
      </div>
    ))}
  </dl>
);

export default function AboutPage() {
  return (
    <main className="frame pt-8 pb-20">
      <h1 className="max-w-4xl font-extrabold text-[clamp(2.4rem,4.6vw,4.2rem)] leading-none tracking-[-0.03em]">
        What the figures mean
      </h1>
      <p className="mt-4 mb-12 max-w-prose text-lg text-muted">
        A number without its source and its range is a rumour. Here is how to read the ones you meet.
      </p>
      <div className="grid gap-14">
        <section aria-labelledby="figures">
          <Heading id="figures">Reading a check</Heading>
          <Passages passages={FIGURES} />
        </section>
        <section aria-labelledby="marks">
          <Heading id="marks">Marks of sources</Heading>
          <dl className="rounded-sheet border border-hair bg-sheet px-5 shadow-lift sm:px-7">
            {MARKS.map(({ mark, text }) => (
              <div
                key={mark}
                className="grid items-center gap-x-6 gap-y-1 border-hair border-t py-3.5 first:border-t-0 sm:grid-cols-[17rem_1fr]"
              >
                <dt>
                  <SourceMark mark={mark} />
                </dt>
                <dd>{text}</dd>
              </div>
            ))}
          </dl>
        </section>
        <section aria-labelledby="keeping">
          <Heading id="keeping">What is kept, and passed on</Heading>
          <Passages passages={KEEPING} />
        </section>
        <section aria-labelledby="cautions">
          <Heading id="cautions">Cautions</Heading>
          <ul className="grid max-w-[80ch] gap-3 text-lg">
            {CAUTIONS.map((caution) => (
              <li
                key={caution}
                className="relative pl-7 before:absolute before:top-[0.62em] before:left-0 before:h-[3px] before:w-4 before:bg-marker"
              >
                {caution}
              </li>
            ))}
          </ul>
        </section>
        <section aria-labelledby="fonts">
          <Heading id="fonts">Fonts</Heading>
          <p className="mb-3 max-w-prose">
            The fonts come with the site and are used under the SIL Open Font License, Version 1.1.
          </p>
          <ul className="grid gap-1.5">
            {FONTS.map(({ head, text }) => (
              <li key={head}>
                <b className="font-semibold">{head}</b> <span className="text-muted">{text}</span>
              </li>
            ))}
          </ul>
        </section>
      </div>
    </main>
  );
}
