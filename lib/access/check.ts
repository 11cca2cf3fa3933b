import 'server-only';
import { warnings } from '@/generators/parameters';
import type { Curve, Figure, Report } from '@/generators/report';
import { DEFAULT_USE, type Use } from '@/lib/materials/types';
import { loadFamily, readParameters } from './families';
import { chosenMaterial, type MaterialChoice } from './materials';

export interface CheckRequest {
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

/** Checks a part: open to anyone, stores nothing. */
export async function checkDesign(request: CheckRequest): Promise<CheckResult> {
  const family = await loadFamily(request.family);
  const material = chosenMaterial(request.material);
  const parameters = readParameters(family, request.parameters);
  const use: Use = { ...DEFAULT_USE, ...request.use };
  const report = family.check(parameters, material, use);
  return {
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
