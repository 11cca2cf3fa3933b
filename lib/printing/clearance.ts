import type { Material, Source } from '@/lib/materials/types';

/** How two printed parts shall sit in one another. */
export type Fit = 'press' | 'snug' | 'slip' | 'free';

/** Gaps in mm a side that one printer leaves with one plastic, found with a fit coupon. */
export interface FitProfile {
  readonly gaps: Readonly<Partial<Record<Fit, number>>>;
  readonly source: Source;
}

export interface Clearance {
  /** gap in mm a side; negative: parts overlap */
  readonly value: number;
  readonly source: Source;
}

const NOTES = 'Clearance notes for desktop printers (as quoted), gap a side';
const QUOTED: Source = { text: `${NOTES}: press -0.05, snug 0.10, slip 0.20, free 0.40 mm`, mark: 'quoted' };
const OF_PETG: Source = { text: `${NOTES}, PETG: press 0.05, snug 0.20, slip 0.30 mm`, mark: 'quoted' };

const GENERAL: Readonly<Record<Fit, number>> = { press: -0.05, snug: 0.1, slip: 0.2, free: 0.4 };

/** Plastics the notes name apart, by id. */
const NAMED: Readonly<Record<string, FitProfile>> = {
  petg: { gaps: { press: 0.05, snug: 0.2, slip: 0.3 }, source: OF_PETG },
};

/**
 * Gap a side for a fit: as measured where a profile is given, else the notes' figure for the plastic, else their
 * general one. Null for moulded plastics, which have no such table.
 */
export function clearanceFor(
  material: Pick<Material, 'id' | 'process'>,
  fit: Fit,
  measured?: FitProfile,
): Clearance | null {
  for (const profile of [measured, NAMED[material.id]]) {
    const value = profile?.gaps[fit];
    if (profile && value !== undefined) return { value, source: profile.source };
  }
  return material.process === 'printed' ? { value: GENERAL[fit], source: QUOTED } : null;
}
