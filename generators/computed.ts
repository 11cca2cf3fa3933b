import type { Solved } from '@/lib/fea/solve/solution';
import type { Peak } from '@/lib/fea/strain/peak';
import type { Vec3 } from '@/lib/geometry/kernel';
import { movePoint } from '@/lib/geometry/placement';
import { degrees, formatQuantity } from '@/lib/units';
import type { BendingPlane } from './contract';
import { type Curve, type Figure, judge, type Report, report } from './report';

/** What the finite elements found, beside the figures they stand for. */
export interface Computed {
  readonly method: 'linear' | 'non-linear';
  /** why the answer is linear although large displacement was asked for */
  readonly fellBack: string | null;
  /** peak strain as a fraction, without sign, and where it is on the body at rest */
  readonly strain: number;
  readonly kind: 'tension' | 'compression';
  readonly body: string;
  readonly place: Vec3;
  /** N or N mm; null where the plastic's modulus is not known, or not at this temperature */
  readonly force: number | null;
  /** the corrected formula's peak; null where it has none */
  readonly formula: number | null;
  /** computed over formula less 1; null where there is nothing to compare */
  readonly difference: number | null;
  /** the likely reason of a difference over a tenth; null below */
  readonly likely: string | null;
  readonly unstable: boolean;
  /** estimated error of the peak from the mesh, fraction of it */
  readonly errorEstimate: number;
  readonly elements: number;
  readonly unknowns: number;
}

export interface ComputedReport extends Report {
  readonly computed: Computed;
}

/** Difference between computed and formula from which it is pointed out. */
export const WORTH_SAYING = 0.1;

const SOURCE = {
  text: 'Finite elements on the outline of the part (six-node triangles, checked against published solutions)',
  mark: 'computed',
} as const;

const figureOf = (given: Report, id: string): Figure | undefined =>
  given.figures.find((one) => one.id === id);

function likelyReason(solution: Solved, plane: BendingPlane): string {
  if (solution.fellBack)
    return 'the large movement could not be followed, so the computed figure is for small ones';
  if (solution.unstable) return 'the part snaps through on the way';
  if (plane.apart) return plane.apart;
  if (plane.model.factors.length > 0) return plane.model.factors.map((factor) => factor.because).join('; ');
  return 'the formula simplifies the outline that is computed here';
}

function forceOf(solution: Solved, plane: BendingPlane): number | null {
  return plane.modulus === null ? null : Math.abs(solution.steps.at(-1)!.force);
}

/** The peak that the family's figure counts. */
export function countedPeak({ tension, compression }: Solved, { counts }: BendingPlane): Peak {
  return counts === 'either' && -compression.strain > tension.strain ? compression : tension;
}

function computedOf(given: Report, plane: BendingPlane, solution: Solved): Computed {
  const { strain: signed, place } = countedPeak(solution, plane);
  const strain = Math.abs(signed);
  const formula = figureOf(given, plane.strainFigure)?.value ?? null;
  const isBeside = plane.beside !== null && plane.beside.strain > strain;
  const difference = formula === null || formula === 0 || isBeside ? null : strain / formula - 1;
  const tells = difference !== null && Math.abs(difference) > WORTH_SAYING;
  return {
    method: solution.method,
    fellBack: solution.fellBack,
    strain,
    kind: signed < 0 ? 'compression' : 'tension',
    body: plane.body,
    place: movePoint(plane.placements[0], [place[0], place[1], 0]),
    force: given.allowable.stiffness === 'not-known' ? null : forceOf(solution, plane),
    formula,
    difference,
    likely: tells ? likelyReason(solution, plane) : null,
    unstable: solution.unstable,
    errorEstimate: solution.errorEstimate,
    elements: solution.elements,
    unknowns: solution.unknowns,
  };
}

function strainReason({ kind, formula, difference, likely }: Computed, solution: Solved): string {
  const how = solution.method === 'linear' ? 'small movement' : 'large movement';
  const against =
    formula === null
      ? 'the formula has no figure here'
      : `the formula gives ${formatQuantity(formula, 'strain')}${difference !== null && likely ? `, ${Math.round(100 * difference)} % apart: ${likely}` : ''}`;
  const layers = solution.layers
    ? ` Judged where the layers are worst, at ${formatQuantity(degrees(solution.layers.angle), 'deg')} to their normal.`
    : '';
  return `Computed on the outline (${kind}, ${how}); ${against}.${layers}`;
}

function strainFigure(
  figure: Figure,
  computed: Computed,
  solution: Solved,
  beside: BendingPlane['beside'],
): Figure {
  if (beside && beside.strain > computed.strain) {
    const because = `${beside.because} That place comes from the formula; on the outline ${formatQuantity(computed.strain, 'strain')} is computed.`;
    return { ...figure, value: beside.strain, because };
  }
  const value = solution.layers?.strain ?? computed.strain;
  const limit = solution.layers?.allowable ?? figure.limit;
  const verdict = figure.verdict === null ? null : judge(value, limit, figure.limitKind);
  return { ...figure, value, limit, verdict, because: strainReason(computed, solution), source: SOURCE };
}

/** A force follows the computed one in proportion; a figure that is not known stays so. */
function scaled(figure: Figure, ratio: number): Figure {
  const times = (value: number | null) => (value === null ? null : value * ratio);
  return {
    ...figure,
    value: times(figure.value),
    low: times(figure.low),
    high: times(figure.high),
    source: SOURCE,
  };
}

/** A curve of force or strain drawn to end at the computed figure; its course stays the formula's. */
function drawnTo(curve: Curve, ratio: number | null): Curve {
  if (ratio === null) return curve;
  const { points, band } = curve;
  return {
    ...curve,
    points: points.map(([x, y]) => [x, y * ratio]),
    ...(band && { band: band.map(([low, high]) => [low * ratio, high * ratio] as const) }),
  };
}

/** How far the figure is from the formula's; null where nothing of it was computed. */
function ratioOf(figures: readonly Figure[], given: Report, id: string | undefined): number | null {
  const formula = figureOf(given, id ?? '')?.value;
  const value = figures.find((one) => one.id === id)?.value;
  return formula && value ? value / formula : null;
}

function curvesOf(given: Report, figures: readonly Figure[], plane: BendingPlane): readonly Curve[] {
  const ratios = {
    N: ratioOf(figures, given, plane.forceFigures[0]),
    strain: ratioOf(figures, given, plane.strainFigure),
  };
  return given.curves.map((curve) => {
    const { unit } = curve.y;
    return unit === 'N' || unit === 'strain' ? drawnTo(curve, ratios[unit]) : curve;
  });
}

/**
 * The report with the computed figures in place of the formula's: the verdict then stands on them. Handbook figures
 * stay as they are; what the formula gave is kept in `computed`. Where the large movement could not be followed the
 * figures stay the formula's, and `computed` says why.
 */
export function withComputed(given: Report, plane: BendingPlane, solution: Solved): ComputedReport {
  const computed = computedOf(given, plane, solution);
  if (solution.fellBack !== null) return { ...given, computed };
  const [main] = plane.forceFigures;
  const formula = main === undefined ? null : (figureOf(given, main)?.value ?? null);
  const ratio = formula && computed.force !== null ? computed.force / formula : null;
  const figures = given.figures.map((figure) => {
    if (figure.id === plane.strainFigure) return strainFigure(figure, computed, solution, plane.beside);
    if (ratio !== null && plane.forceFigures.includes(figure.id)) return scaled(figure, ratio);
    return figure;
  });
  return { ...report({ ...given, figures, curves: curvesOf(given, figures, plane) }), computed };
}
