import { secantModulus } from '@/lib/materials/secant';
import type { Material } from '@/lib/materials/types';
import { annularForce, hoopStrain, tubeFactor } from '@/lib/mechanics/annular';
import { wedgeFactor } from '@/lib/mechanics/friction';
import { decayLength, type LoadedTube, tubePeakStrain, tubeRadialForce } from '@/lib/mechanics/ring';
import { beadHeight, lidBore, skirtLength, type Values } from './schema';

/** The ring formula was held against finite elements up to this wall over bore radius. */
const THICKEST = 0.25;
/** and for tubes that reach this many decay lengths past the load. */
const REACH = 4;

const tubes = (p: Values, modulus: number, poisson: number): { lid: LoadedTube; pot: LoadedTube } => ({
  lid: { bore: lidBore(p), wall: p.lidWall, modulus, poisson, fromEnd: p.lip / 2 },
  pot: { bore: p.tubeDiameter / 2 - p.tubeWall, wall: p.tubeWall, modulus, poisson, fromEnd: p.fromRim },
});

/** Why the ring formula does not cover this shape; null where it does. */
function ringFault(p: Values, poisson: number): string | null {
  const { lid, pot } = tubes(p, 1, poisson);
  const thick = [lid, pot].some(({ wall, bore }) => wall > THICKEST * bore);
  if (thick) return `a wall is thicker than ${THICKEST} of its bore radius`;
  const skirt = REACH * decayLength(lid);
  const body = REACH * decayLength(pot);
  if (skirtLength(p) - p.lip / 2 < skirt) {
    return `the skirt must reach ${skirt.toFixed(1)} mm past the lip, or the plate stiffens it: set the bead lower`;
  }
  if (p.potHeight - p.fromRim - p.floor < body) {
    return `the pot must reach ${body.toFixed(1)} mm below the bead, or its floor stiffens it`;
  }
  return null;
}

/** Arc of a finger stands out of its chord by this much, mm. */
const sagitta = (p: Values): number => lidBore(p) * (1 - Math.cos(Math.PI / p.slots));

function fingerFault(p: Values): string | null {
  if (sagitta(p) > p.lidWall / 2) {
    return 'the fingers are so wide that they are arched and stiffer than flat ones: use more slots';
  }
  return skirtLength(p) < 3 * p.lidWall ? 'the fingers are shorter than three wall thicknesses' : null;
}

export interface LidMechanics {
  /** why the figures are not known; null where they are */
  readonly fault: string | null;
  /** give on the radius, mm */
  readonly lidGives: number;
  readonly potGives: number;
  readonly lidStrain: number;
  readonly potStrain: number;
  readonly handbookStrain: number;
  /** radial force in N for a modulus of 1 MPa */
  readonly radialShare: number;
}

/** Both rings give; they share the undercut so that both press alike. */
function closedRing(p: Values, poisson: number): LidMechanics {
  const { lid, pot } = tubes(p, 1, poisson);
  const [stiffLid, stiffPot] = [tubeRadialForce(lid, 1), tubeRadialForce(pot, 1)];
  const radialShare = p.undercut / 2 / (1 / stiffLid + 1 / stiffPot);
  const [lidGives, potGives] = [radialShare / stiffLid, radialShare / stiffPot];
  return {
    fault: ringFault(p, poisson),
    lidGives,
    potGives,
    lidStrain: tubePeakStrain(lid, lidGives),
    potStrain: tubePeakStrain(pot, potGives),
    handbookStrain: hoopStrain(p.undercut, p.tubeDiameter),
    radialShare,
  };
}

/** Fingers as flat cantilevers loaded at the lip, the pot taken as rigid: eps = 1.5 t u / L^2, P = E b t^3 u / (4 L^3). */
function fingers(p: Values): LidMechanics {
  const length = skirtLength(p) - p.lip / 2;
  const width = (2 * Math.PI * lidBore(p)) / p.slots - p.slotWidth;
  const give = p.undercut / 2;
  const strain = (1.5 * p.lidWall * give) / length ** 2;
  return {
    fault: fingerFault(p),
    lidGives: give,
    potGives: 0,
    lidStrain: strain,
    potStrain: 0,
    handbookStrain: strain,
    radialShare: (p.slots * width * p.lidWall ** 3 * give) / (4 * length ** 3),
  };
}

export const lidMechanics = (p: Values, poisson: number): LidMechanics =>
  p.skirt === 'closed' ? closedRing(p, poisson) : fingers(p);

interface Spread {
  readonly low: number;
  readonly value: number;
  readonly high: number;
  readonly handbook: number | null;
}

export interface LidForces {
  readonly radial: number;
  readonly handbookRadial: number | null;
  readonly push: Spread;
  readonly pull: Spread;
  readonly inRange: boolean;
}

/** Forces with the secant modulus at the peak strain; null where the modulus is not known or the shape not covered. */
export function lidForces(p: Values, material: Material): LidForces | null {
  const poisson = material.poisson.value;
  const mechanics = lidMechanics(p, poisson);
  const secant = secantModulus(material, Math.max(mechanics.lidStrain, mechanics.potStrain));
  if (!secant || mechanics.fault) return null;
  const radial = secant.value * mechanics.radialShare;
  const d = 2 * lidBore(p);
  const factor = tubeFactor(d, d + 2 * p.lidWall, poisson);
  const handbookRadial = p.skirt === 'closed' ? annularForce(p.undercut, d, secant.value, factor) : null;
  const { low, value, high } = material.friction;
  const along = (angle: number): Spread => ({
    low: radial * wedgeFactor(low, angle),
    value: radial * wedgeFactor(value, angle),
    high: radial * wedgeFactor(high, angle),
    handbook: handbookRadial === null ? null : handbookRadial * wedgeFactor(value, angle),
  });
  return {
    radial,
    handbookRadial,
    push: along(p.leadAngle),
    pull: along(p.returnAngle),
    inRange: secant.inRange,
  };
}

/** Depth of the groove over the bead's flanks, for the motion: lift at which the lip rides on the crest, mm. */
export const lipOnCrest = (p: Values): number =>
  beadHeight(p) / Math.tan((p.returnAngle * Math.PI) / 180) + p.clearance + p.lip / 2;
