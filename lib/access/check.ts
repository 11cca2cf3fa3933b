import 'server-only';
import { bendingOf, solveRequest } from '@/generators/bend';
import { type Computed, withComputed } from '@/generators/computed';
import type { Family } from '@/generators/contract';
import { warnings } from '@/generators/parameters';
import { type Curve, type Figure, type Report, worstVerdict } from '@/generators/report';
import { solveInThread } from '@/lib/jobs/solve-pool';
import { DEFAULT_USE, type Material, type Use } from '@/lib/materials/types';
import { loadFamily, readParameters } from './families';
import { chosenMaterial, type MaterialChoice } from './materials';

/**
 * What the verdict stands on. closed: the corrected formulas; both: the finite elements where the part has a plane
 * model, else the formulas; fe: the finite elements, "not known" where there are none.
 */
export type CheckMethod = 'closed' | 'fe' | 'both';

export interface CheckRequest {
  readonly method?: CheckMethod | undefined;
  readonly family: string;
  readonly parameters?: Readonly<Record<string, unknown>> | undefined;
  readonly material: MaterialChoice;
  readonly use?: Partial<Use> | undefined;
}

type Point = readonly [number | null, number | null];

export interface CheckResult extends Omit<Report, 'curves'> {
  readonly family: string;
  /** complete, defaults filled in */
  readonly parameters: Readonly<Record<string, unknown>>;
  readonly material: string;
  readonly use: Use;
  readonly curves: readonly (Omit<Curve, 'points' | 'band'> & {
    readonly points: readonly Point[];
    readonly band?: readonly Point[];
  })[];
  readonly method: CheckMethod;
  /** what was computed, or why nothing was; null where only the formulas were asked for */
  readonly computed: Computed | { readonly none: string } | null;
  readonly warnings: readonly { readonly id: string; readonly field: string; readonly message: string }[];
}

/** A figure without end, such as the force to pull a self-locking catch, has no number to send. */
const finite = (value: number | null): number | null =>
  value !== null && Number.isFinite(value) ? value : null;
const finitePoints = (points: Curve['points']): Point[] => points.map(([x, y]) => [finite(x), finite(y)]);

const figureOf = ({ id, label, unit, ...rest }: Figure): Figure => ({
  id,
  label,
  value: finite(rest.value),
  unit,
  handbook: finite(rest.handbook),
  low: finite(rest.low),
  high: finite(rest.high),
  limit: finite(rest.limit),
  limitKind: rest.limitKind,
  verdict: rest.verdict,
  because: rest.because,
  source: rest.source,
});

const curveOf = ({ points, band, ...curve }: Curve) => ({
  ...curve,
  points: finitePoints(points),
  ...(band && { band: finitePoints(band) }),
});

interface Checked {
  readonly report: Report;
  readonly computed: CheckResult['computed'];
}

/** The governing figure without a value, where only a computed one was wanted and there is none. */
function withoutValue(report: Report, none: string): Report {
  const figures = report.figures.map((figure) =>
    figure.id === report.governing
      ? { ...figure, value: null, verdict: 'not-known' as const, because: `Not known: ${none}` }
      : figure,
  );
  return { ...report, figures, verdict: worstVerdict(figures) };
}

/** The report on the finite elements, solved in a thread of its own. */
async function computedReport(
  family: Family,
  values: Readonly<Record<string, unknown>>,
  material: Material,
  use: Use,
  report: Report,
): Promise<Checked> {
  const plane = bendingOf(family, values, material, use);
  if ('none' in plane) return { report, computed: plane };
  const solution = await solveInThread(solveRequest(plane, material, use, 'large'));
  if (!solution.ok) return { report, computed: { none: `The solve failed: ${solution.reason}.` } };
  const { computed, ...standing } = withComputed(report, plane, solution);
  return { report: standing, computed };
}

/** Why no figure stands on the finite elements; null where some do. */
function whyNotComputed({ computed }: Checked): string | null {
  if (!computed) return null;
  return 'none' in computed ? computed.none : computed.fellBack;
}

async function checkBy(
  method: CheckMethod,
  family: Family,
  values: Readonly<Record<string, unknown>>,
  material: Material,
  use: Use,
): Promise<Checked> {
  const report = family.check(values, material, use);
  if (method === 'closed') return { report, computed: null };
  const checked = await computedReport(family, values, material, use, report);
  const none = whyNotComputed(checked);
  return method === 'fe' && none !== null ? { ...checked, report: withoutValue(report, none) } : checked;
}

/** Checks a part: open to anyone, stores nothing. */
export async function checkDesign(request: CheckRequest): Promise<CheckResult> {
  const family = await loadFamily(request.family);
  const material = chosenMaterial(request.material);
  const parameters = readParameters(family, request.parameters);
  const use: Use = { ...DEFAULT_USE, ...request.use };
  const method = request.method ?? 'closed';
  const { report, computed } = await checkBy(method, family, parameters, material, use);
  return {
    method,
    computed,
    verdict: report.verdict,
    governing: report.governing,
    headline: report.headline,
    figures: report.figures.map(figureOf),
    curves: report.curves.map(curveOf),
    allowable: report.allowable,
    warnings: warnings(family.parameters, parameters),
    family: request.family,
    parameters,
    material: material.id,
    use,
  };
}
