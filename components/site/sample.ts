import type { Family } from '@/generators/contract';
import type { Verdict } from '@/generators/report';
import type { Material, Use } from '@/lib/materials/types';

/** The hook of the first page: long enough to see it bend, and to break one plastic after the other. */
export const SAMPLE_FAMILY = 'cantilever-hook';

export const SAMPLE_VALUES = {
  armLength: 32,
  rootThickness: 3,
  tipThickness: 1.8,
  rootWidth: 12,
  tipWidth: 12,
  rootFillet: 1.5,
  undercut: 6,
  leadInAngle: 35,
  landLength: 1.5,
  baseLength: 22,
  baseWidth: 18,
  baseThickness: 6,
  receiver: false,
} as const;

export const SAMPLE_USE: Use = { opening: 'often', layers: 'along', temperature: 23 };
export const SAMPLE_PLASTICS = ['pla', 'asa', 'petg', 'pp', 'tpu-95a'] as const;
export const SAMPLE_MATERIAL = 'petg';

/** Pull on the catch in mm: the most, and where the picture starts. */
export const MOST_PULL = SAMPLE_VALUES.undercut;
export const FIRST_PULL = 2.4;

/** End of the strain scale of the first page, as a fraction. */
export const SCALE_END = 0.025;

export const sampleValues = (family: Family): Record<string, unknown> => ({
  ...family.parameters.defaults,
  ...SAMPLE_VALUES,
});

/** What one plastic says to the bend. Strains as fractions, null where not known. */
export interface Reading {
  readonly id: string;
  readonly name: string;
  readonly strain: number | null;
  readonly allowed: number | null;
  readonly verdict: Verdict;
}

/** The family's own check, with the catch pulled back by so many mm, in each plastic. */
export function readings(family: Family, plastics: readonly Material[], pull: number): Reading[] {
  return plastics.map((material) => {
    const report = family.check({ ...sampleValues(family), undercut: pull }, material, SAMPLE_USE);
    const figure = report.figures.find(({ id }) => id === report.governing);
    return {
      id: material.id,
      name: material.shortName,
      strain: figure?.value ?? null,
      allowed: figure?.limit ?? null,
      verdict: figure?.verdict ?? 'not-known',
    };
  });
}
