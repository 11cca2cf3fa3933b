import 'server-only';
import type { Content } from '@/db/queries/designs';
import type { Family } from '@/generators/contract';
import type { Figure, Report } from '@/generators/report';
import { DEFAULT_USE, type Material, type Use } from '@/lib/materials/types';
import { loadFamily, readParameters } from './families';
import { getMaterial } from './materials';

/** A design as it is sent: parameters left out take their defaults. */
export interface GivenContent {
  readonly family: string;
  readonly material: string;
  readonly use?: Partial<Use> | undefined;
  readonly parameters?: Readonly<Record<string, unknown>> | undefined;
}

export interface CheckedContent {
  readonly content: Content;
  readonly family: Family;
  readonly material: Material;
  readonly report: Report;
}

/** Reads and checks a design before it is kept: the verdict is ours, never the sender's. */
export async function readContent(given: GivenContent): Promise<CheckedContent> {
  const family = await loadFamily(given.family);
  const material = getMaterial(given.material);
  const values = readParameters(family, given.parameters);
  const use = { ...DEFAULT_USE, ...given.use };
  const report = family.check(values, material, use);
  const content = { family: given.family, material: material.id, use, values, verdict: report.verdict };
  return { content, family, material, report };
}

export const governingFigure = (report: Report): Figure | undefined =>
  report.figures.find(({ id }) => id === report.governing);

/** How much of its limit the governing figure uses; null where either is not known. */
export function limitShare(report: Report): number | null {
  const figure = governingFigure(report);
  if (!figure || figure.value === null || !figure.limit || figure.value <= 0) return null;
  const share = figure.limitKind === 'max' ? figure.value / figure.limit : figure.limit / figure.value;
  return Number.isFinite(share) ? share : null;
}
