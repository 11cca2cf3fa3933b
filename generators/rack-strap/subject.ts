import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import type { BentFlushArm } from '@/lib/mechanics/flush-arm';
import {
  type Holding,
  holding,
  pawlLifted,
  type RackForces,
  rackForces,
  type Wrap,
  wrapOn,
} from './mechanics';
import type { Values } from './schema';

/** Everything the figures of one check are made from. */
export interface Subject {
  readonly p: Values;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  readonly pawl: BentFlushArm;
  readonly wrap: Wrap;
  readonly forces: RackForces | null;
  readonly hold: Holding | null;
  /** why strain and forces of the pawl do not hold for these values; null where they do */
  readonly trouble: string | null;
}

const LEAST_SLENDERNESS = 5;
const FILLETS = [0.1, 1] as const;

function troubleOf(p: Values): string | null {
  if (p.pawlLength < LEAST_SLENDERNESS * p.pawlThickness) {
    return `the pawl is shorter than ${LEAST_SLENDERNESS} thicknesses`;
  }
  const fillet = p.pawlFillet / p.pawlThickness;
  if (fillet < FILLETS[0] || fillet > FILLETS[1]) {
    return `the root fillet of the pawl must be ${FILLETS[0]} to ${FILLETS[1]} of its thickness`;
  }
  return null;
}

export function subjectOf(p: Values, material: Material, use: Use): Subject {
  const pawl = pawlLifted(p, material.poisson.value);
  const allowable = allowableStrain(material, use);
  const warm = allowable.factors.some(({ id, value }) => id === 'temperature' && value === null);
  return {
    p,
    material,
    allowable,
    pawl,
    wrap: wrapOn(p, p.smallestBundle),
    forces: rackForces(p, pawl, material),
    hold: warm ? null : holding(p, material),
    trouble: troubleOf(p),
  };
}
