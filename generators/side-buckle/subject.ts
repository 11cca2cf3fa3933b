import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { squeezeTravel } from './layout';
import {
  type BuckleForces,
  type BuckleStrain,
  barStrain,
  buckleForces,
  buckleStrain,
  type Holding,
  holding,
} from './mechanics';
import type { Values } from './schema';

/** Everything the figures of one check are made from. */
export interface Subject {
  readonly p: Values;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  readonly strain: BuckleStrain;
  readonly forces: BuckleForces | null;
  readonly hold: Holding | null;
  readonly bar: number | null;
  /** why strains and forces of the arms do not hold for these values; null where they do */
  readonly trouble: string | null;
}

const LEAST_SLENDERNESS = 4;
/** The guide's formulas are not used past this movement over length. */
export const GUIDE_RANGE = 0.3;
/** Fillets for which the concentration is known, over the root thickness. */
const FILLETS = [0.1, 1] as const;

function troubleOf(p: Values): string | null {
  if (p.armLength < LEAST_SLENDERNESS * p.rootThickness) {
    return `the arm is shorter than ${LEAST_SLENDERNESS} thicknesses`;
  }
  const fillet = p.rootFillet / p.rootThickness;
  if (fillet < FILLETS[0] || fillet > FILLETS[1]) {
    return `the root fillet must be ${FILLETS[0]} to ${FILLETS[1]} of the root thickness`;
  }
  return null;
}

export const inGuideRange = (p: Values): boolean => squeezeTravel(p) <= GUIDE_RANGE * p.armLength;

export function subjectOf(p: Values, material: Material, use: Use): Subject {
  const strain = buckleStrain(p, material.poisson.value);
  const allowable = allowableStrain(material, use);
  const warm = allowable.factors.some(({ id, value }) => id === 'temperature' && value === null);
  return {
    p,
    material,
    allowable,
    strain,
    forces: buckleForces(p, strain, material),
    hold: warm ? null : holding(p, material),
    bar: barStrain(p, material),
    trouble: troubleOf(p),
  };
}
