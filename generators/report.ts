import type { AllowableStrain } from '@/lib/materials/allowable';
import type { Source } from '@/lib/materials/types';
import type { Unit } from '@/lib/units';

export type Verdict = 'within-limit' | 'close-to-limit' | 'over-limit' | 'not-known';

/**
 * One figure of a check. `value` is the corrected figure the verdict stands on, `handbook` the closed form as
 * printed. Null means not known. `verdict` is null for a figure that has no limit to be judged by.
 */
export interface Figure {
  readonly id: string;
  readonly label: string;
  readonly unit: Unit;
  readonly value: number | null;
  readonly handbook: number | null;
  /** band, e.g. from the friction band */
  readonly low: number | null;
  readonly high: number | null;
  readonly limit: number | null;
  /** `max`: value must stay at or under the limit; `min`: at or over it */
  readonly limitKind: 'max' | 'min';
  readonly verdict: Verdict | null;
  /** one plain sentence: why the value is what it is, what it rests on, what to do */
  readonly because: string;
  readonly source: Source;
}

export interface Curve {
  readonly id: string;
  readonly label: string;
  readonly x: { readonly label: string; readonly unit: Unit };
  readonly y: { readonly label: string; readonly unit: Unit };
  readonly points: readonly (readonly [number, number])[];
  /** lower and upper y for each point, where friction gives a band */
  readonly band?: readonly (readonly [number, number])[];
}

/** What a family's check returns. `governing` is the figure shown on the strain band. */
export interface Report {
  readonly verdict: Verdict;
  readonly governing: string;
  /** ids of up to three figures shown large beside the band, e.g. forces */
  readonly headline: readonly string[];
  readonly figures: readonly Figure[];
  readonly curves: readonly Curve[];
  readonly allowable: AllowableStrain;
}

/** Over this share of the limit a figure counts as close to it. */
export const CLOSE = 0.85;

export function judge(value: number | null, limit: number | null, kind: 'max' | 'min' = 'max'): Verdict {
  if (value === null || limit === null || Number.isNaN(value) || Number.isNaN(limit)) return 'not-known';
  const share = kind === 'max' ? (limit === 0 ? (value <= 0 ? 0 : Infinity) : value / limit) : limit / value;
  if (share > 1) return 'over-limit';
  return share > CLOSE ? 'close-to-limit' : 'within-limit';
}

/** A figure as a check gives it; what it leaves out is not known. */
export type GivenFigure = Pick<Figure, 'id' | 'label' | 'unit' | 'because' | 'source'> & Partial<Figure>;

/** A figure without a limit. Non-finite values become "not known". */
export function plainFigure(given: GivenFigure): Figure {
  return {
    value: null,
    handbook: null,
    low: null,
    high: null,
    limit: null,
    limitKind: 'max',
    verdict: null,
    ...given,
  };
}

/** A figure judged against its limit; the verdict may be forced, for example outside the validity range. */
export function judgedFigure(given: GivenFigure): Figure {
  const plain = plainFigure(given);
  return { ...plain, verdict: given.verdict ?? judge(plain.value, plain.limit, plain.limitKind) };
}

const RANK: Readonly<Record<Verdict, number>> = {
  'within-limit': 0,
  'close-to-limit': 1,
  'not-known': 2,
  'over-limit': 3,
};

/** The worst verdict among the figures that have one; over limit outranks not known. */
export function worstVerdict(figures: readonly Figure[]): Verdict {
  const verdicts = figures.flatMap((figure) => (figure.verdict ? [figure.verdict] : []));
  return verdicts.reduce<Verdict>((worst, next) => (RANK[next] > RANK[worst] ? next : worst), 'within-limit');
}

/** Units of figures that stand on a modulus. */
const STIFF: ReadonlySet<Unit> = new Set<Unit>(['N', 'N/mm', 'Nmm', 'Nm', 'Hz']);

const isStiff = ({ unit }: { readonly unit: Unit }): boolean => STIFF.has(unit);

/** A force worked out with the moduli of 23 °C, as far as it stands at the temperature of use. */
function atTemperature(figure: Figure, { stiffness }: AllowableStrain): Figure {
  if (stiffness === 'as-given' || !isStiff(figure) || figure.value === null) return figure;
  if (stiffness === 'softer') {
    const note = ' Worked out for 23 °C: warm plastic is softer.';
    const because = figure.because.endsWith(note) ? figure.because : figure.because + note;
    return { ...figure, because };
  }
  const because = 'Not known: only the modulus at 23 °C is known, and it does not hold at this temperature.';
  const verdict = figure.verdict && 'not-known';
  return { ...figure, value: null, handbook: null, low: null, high: null, verdict, because };
}

/**
 * Completes a report: the verdict is the worst of its figures. Where the plastic's stiffness at the temperature of
 * use is not known, neither are its forces.
 */
export function report(parts: Omit<Report, 'verdict'>): Report {
  const { allowable } = parts;
  const figures = parts.figures.map((figure) => atTemperature(figure, allowable));
  const curves =
    allowable.stiffness === 'not-known' ? parts.curves.filter(({ y }) => !isStiff(y)) : parts.curves;
  return { ...parts, figures, curves, verdict: worstVerdict(figures) };
}

export const VERDICT_WORDS: Readonly<Record<Verdict, string>> = {
  'within-limit': 'within limit',
  'close-to-limit': 'close to limit',
  'over-limit': 'over limit',
  'not-known': 'not known',
};
