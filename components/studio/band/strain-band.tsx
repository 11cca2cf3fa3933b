'use client';

import { useEffect, useRef, useState } from 'react';
import { type Figure, type Report, VERDICT_WORDS } from '@/generators/report';
import { figureOf } from '@/generators/sensitivity';
import { formatQuantity } from '@/lib/units';
import { BasisLine } from '../computed/basis-line';
import { formulaBeside, type Standing } from '../computed/standing';
import { useSolving } from '../computed/standing-context';
import { useReading } from '../session-context';
import { SourceNote } from '../source-note';
import { marginWords, VerdictIcon, VerdictMark } from '../verdict';
import { BandScale, BandStripScale } from './band-scale';
import { BigFigure } from './big-figure';
import { Factors } from './factors';
import { Figures } from './figures';

function whyUnknown(report: Report, figure: Figure): string | undefined {
  if (figure.verdict !== 'not-known') return undefined;
  if (figure.value === null) return figure.because;
  return figure.unit === 'strain' && report.allowable.value === null
    ? report.allowable.because
    : figure.because;
}

function Governing({ figure, report }: { figure: Figure; report: Report }) {
  const why = whyUnknown(report, figure);
  return (
    <div className="grid content-start gap-2">
      <p className="text-muted">{figure.label}</p>
      <p>
        <BigFigure value={figure.value} unit={figure.unit} size="text-[4rem] sm:text-[4.75rem]" />
      </p>
      <p>
        <VerdictMark verdict={figure.verdict ?? 'not-known'} more={marginWords(figure)} />
      </p>
      {why && <p className="max-w-64 text-sm">{why}</p>}
    </div>
  );
}

function Headline({ figure }: { figure: Figure }) {
  const banded = figure.low !== null && figure.high !== null && figure.low !== figure.high;
  return (
    <div>
      <dt className="mb-1.5 xl:max-w-36 text-muted text-sm leading-tight">{figure.label}</dt>
      <dd>
        <BigFigure value={figure.value} unit={figure.unit} size="text-[2.1rem]" />
        {banded && (
          <span className="mt-1 block text-muted text-xs tabular-nums">
            {formatQuantity(figure.low, figure.unit)} to {formatQuantity(figure.high, figure.unit)}
          </span>
        )}
      </dd>
    </div>
  );
}

/** The factors where the limit is their product, else why the limit is what it is. */
function Basis({ figure, report }: { figure: Figure; report: Report }) {
  if (figure.unit === 'strain' && figure.limit === report.allowable.value)
    return <Factors allowable={report.allowable} />;
  return (
    <div className="max-w-prose text-sm">
      {figure.because} <SourceNote source={figure.source} of={figure.label} />
    </div>
  );
}

/** True while the element is out of sight above or below. */
function useOutOfSight() {
  const element = useRef<HTMLElement>(null);
  const [out, setOut] = useState(false);
  useEffect(() => {
    const watch = new IntersectionObserver(([entry]) => setOut(!entry!.isIntersecting));
    watch.observe(element.current!);
    return () => watch.disconnect();
  }, []);
  return [element, out] as const;
}

/** The band once more, thin, while the full one is out of sight. The full one carries the words for readers. */
function Strip({ figure }: { figure: Figure }) {
  const verdict = figure.verdict ?? 'not-known';
  return (
    <div
      data-strip=""
      aria-hidden="true"
      className="fixed inset-x-0 top-0 z-40 border-ink border-b-2 bg-sheet shadow-lift"
    >
      <div className="frame flex h-14 items-center gap-3">
        <span className="hidden text-muted text-sm sm:inline">{figure.label}</span>
        <BigFigure value={figure.value} unit={figure.unit} size="text-3xl" />
        <BandStripScale figure={figure} />
        <VerdictIcon verdict={verdict} size={22} />
        <span className="font-semibold text-sm">
          <span className="hidden sm:inline">{VERDICT_WORDS[verdict]}, </span>
          {formatQuantity(figure.limit, figure.unit)} <span className="hidden sm:inline">allowed</span>
        </span>
      </div>
    </div>
  );
}

function spoken(figure: Figure): string {
  const limit =
    figure.limit === null ? 'limit not known' : `limit ${formatQuantity(figure.limit, figure.unit)}`;
  const verdict = VERDICT_WORDS[figure.verdict ?? 'not-known'];
  return `${figure.label} ${formatQuantity(figure.value, figure.unit)}, ${limit}, ${verdict}`;
}

/** What goes into the part: mass and price of the plastic, as if printed solid; `volume` null while it is not known. */
function Stuff({ volume }: { volume: number | null }) {
  const material = useReading((reading) => reading.material);
  if (!material.density) return null;
  const mass = volume === null ? null : (volume / 1000) * material.density.value;
  const price = material.price;
  return (
    <div>
      <dt className="mb-1.5 xl:max-w-36 text-muted text-sm leading-tight">Mass, printed solid</dt>
      <dd>
        {mass === null ? (
          <>
            <span aria-hidden="true" className="font-bold text-[2.1rem] leading-none">
              …
            </span>
            <span className="sr-only">not known yet</span>
          </>
        ) : (
          <BigFigure value={mass} unit="g" size="text-[2.1rem]" />
        )}
        {price && mass !== null && (
          <span className="mt-1 block text-muted text-xs tabular-nums">
            {((mass / 1000) * price.perKg).toFixed(2)} {price.currency}, price of {price.asOf}
          </span>
        )}
      </dd>
    </div>
  );
}

/** For whoever watches the page from outside: what the verdict stands on, and whether that is final. */
function basisName({ basis }: Standing): string {
  return basis.kind === 'computed' && basis.pending ? 'computed-small' : basis.kind;
}

/** `volume` of all bodies in mm3, null until the solid is made. */
export function StrainBand({ volume = null }: { volume?: number | null }) {
  const { standing, took, firstAnswer } = useSolving();
  const { report } = standing;
  const [element, out] = useOutOfSight();
  const figure = figureOf(report, report.governing);
  if (!figure) return null;
  const headlines = report.headline.flatMap((id) => figureOf(report, id) ?? []);
  return (
    <>
      <section
        ref={element}
        aria-label="Verdict"
        data-basis={basisName(standing)}
        data-solve-small-ms={took.small?.toFixed(1)}
        data-solve-ms={took.large?.toFixed(1)}
        data-first-answer-ms={firstAnswer?.toFixed(0)}
        className="rounded-sheet border border-hair bg-sheet shadow-lift"
      >
        <div className="grid gap-x-10 gap-y-5 px-5 pt-5 pb-4 sm:px-7 lg:grid-cols-[auto_1fr_auto]">
          <Governing figure={figure} report={report} />
          <div className="grid content-start gap-3">
            <Figures figure={figure} standing={standing} />
            <BandScale figure={figure} corrected={formulaBeside(standing, figure.id)} />
            <BasisLine figure={figure.id} />
            <Basis figure={figure} report={report} />
          </div>
          <dl className="flex flex-wrap content-start gap-x-8 gap-y-4 border-hair border-t pt-4 lg:max-w-56 lg:border-t-0 lg:border-l lg:pt-0 lg:pl-7 xl:grid xl:max-w-none xl:grid-cols-2">
            {headlines.map((one) => (
              <Headline key={one.id} figure={one} />
            ))}
            <Stuff volume={volume} />
          </dl>
        </div>
        <p role="status" className="sr-only">
          {spoken(figure)}
        </p>
      </section>
      {out && <Strip figure={figure} />}
    </>
  );
}
