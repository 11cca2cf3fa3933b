import { secantModulus } from '@/lib/materials/secant';
import type { Material } from '@/lib/materials/types';
import { wedgeFactor } from '@/lib/mechanics/friction';
import { meanRadius, openRing, type RingOpening, thinRing } from '@/lib/mechanics/open-ring';
import { degrees } from '@/lib/units';
import { ringOf, spreadOf } from './ring';
import { boreOf, halfArcOf, type Values } from './schema';

/** Largest spread of a lip over the mean radius that the linear ring was compared up to. */
export const SPREAD_LIMIT = 0.6;

export interface ClipMechanics {
  /** per lip, mm */
  readonly spread: number;
  /** spread over mean radius */
  readonly opening: number;
  readonly strain: number;
  readonly handbookSpread: number;
  readonly handbookStrain: number;
  /** strain that stays while the rod is held, from an undersized bore */
  readonly residual: number;
  /** angle between the bore at the lip and the pull, degrees */
  readonly returnAngle: number;
}

const STRAIN_ONLY = { modulus: 1, poisson: 0.35, width: 1 };

/** What does not depend on the material; strain follows from shape alone (Poisson ratio matters below 0.1 %). */
export function clipMechanics(p: Values): ClipMechanics {
  const ring = ringOf(p);
  const spread = spreadOf(p);
  const handbookSpread = (p.rodDiameter - boreOf(p) * Math.sin(halfArcOf(p))) / 2;
  const radius = meanRadius(ring);
  const opened = Math.max(0, -p.play) / 2;
  return {
    spread,
    opening: spread / radius,
    strain: openRing(ring, spread, STRAIN_ONLY).strain,
    handbookSpread,
    handbookStrain: thinRing(ring, handbookSpread, STRAIN_ONLY).strain,
    residual: (p.wallThickness / 2) * (1 / radius - 1 / (radius + opened)),
    returnAngle: degrees(halfArcOf(p)) - 90,
  };
}

export interface ClipForces {
  /** at each lip, N */
  readonly lip: number;
  readonly handbookLip: number;
  readonly push: number;
  readonly pushLow: number;
  readonly pushHigh: number;
  readonly pull: number;
  readonly pullLow: number;
  readonly pullHigh: number;
  readonly handbookPush: number;
  readonly handbookPull: number;
  /** false where the strain is past the range of the secant modulus */
  readonly inRange: boolean;
}

/** Forces with the secant modulus at the peak strain and the friction band; null where the modulus is not known. */
export function clipForces(p: Values, material: Material): ClipForces | null {
  const { spread, strain, handbookSpread, returnAngle } = clipMechanics(p);
  const secant = secantModulus(material, strain);
  if (!secant) return null;
  const elastic = { modulus: secant.value, poisson: material.poisson.value, width: p.clipWidth };
  const opening: RingOpening = openRing(ringOf(p), spread, elastic);
  const handbookLip = thinRing(ringOf(p), handbookSpread, elastic).force;
  const along = (force: number, mu: number, angle: number) => 2 * force * wedgeFactor(mu, angle);
  const { value, low, high } = material.friction;
  return {
    lip: opening.force,
    handbookLip,
    push: along(opening.force, value, p.flareAngle),
    pushLow: along(opening.force, low, p.flareAngle),
    pushHigh: along(opening.force, high, p.flareAngle),
    pull: along(opening.force, value, returnAngle),
    pullLow: along(opening.force, low, returnAngle),
    pullHigh: along(opening.force, high, returnAngle),
    handbookPush: along(handbookLip, value, p.flareAngle),
    handbookPull: along(handbookLip, value, returnAngle),
    inRange: secant.inRange,
  };
}
