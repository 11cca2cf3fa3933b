import { secantModulus } from '@/lib/materials/secant';
import type { Material } from '@/lib/materials/types';
import {
  bridgeStrain,
  closingTwist,
  latticeFault,
  linkLength,
  pullGive,
  pullStrain,
  twistLink,
} from '@/lib/mechanics/lattice';
import { equivalentStrain, shearModulus } from '@/lib/mechanics/torsion';
import { radians } from '@/lib/units';
import { latticeOf, linksInLine, overlapOf, rowPitch, type Values } from './schema';

/** Past this twist of one link the linear theory of torsion is not used, rad. */
const MOST_TWIST = radians(20);

export const bendAngleOf = (p: Values): number => radians(p.bendAngle);
/** Twist of one link, rad. */
export const twistOf = (p: Values): number => bendAngleOf(p) / linksInLine(p);
/** Links side by side in one strip: two for each slit. */
const linksAbreast = (p: Values): number => 2 * p.columns;

function faultOf(p: Values): string | null {
  if (twistOf(p) > MOST_TWIST) return 'a link would twist by more than 20°: use more rows';
  return latticeFault(latticeOf(p));
}

export interface LatticeStrain {
  /** why the corrected figures do not hold; null where they do */
  readonly fault: string | null;
  readonly shear: number;
  /** tensile strain that stands for the shear of a link */
  readonly link: number;
  readonly handbook: number;
  /** nominal, bending of a bridge */
  readonly bridge: number;
  readonly peak: number;
}

/** Strains at the bend angle. They follow from the shape and Poisson's ratio alone. */
export function latticeStrain(p: Values, poisson: number): LatticeStrain {
  const lattice = latticeOf(p);
  const twist = twistLink(lattice, twistOf(p), linkLength(lattice));
  const plain = twistLink(lattice, twistOf(p), overlapOf(p));
  const link = equivalentStrain(twist.shear, poisson);
  const bridge = bridgeStrain(lattice, twist.torque, poisson);
  return {
    fault: faultOf(p),
    shear: twist.shear,
    link,
    handbook: equivalentStrain(plain.shear, poisson),
    bridge,
    peak: Math.max(link, bridge),
  };
}

/** Radius of the middle of the sheet, mm. */
export const bendRadius = (p: Values): number => rowPitch(p) / twistOf(p);

/** Bend angle at which the strain meets a limit, rad: strain is in proportion to it. */
export const angleAt = (p: Values, strain: LatticeStrain, limit: number): number =>
  (bendAngleOf(p) * limit) / strain.peak;

/** Bend angle at which slits close on the inner face, rad. */
export const closingAngle = (p: Values): number => closingTwist(latticeOf(p)) * linksInLine(p);

export interface BendMoment {
  /** N mm */
  readonly value: number;
  readonly handbook: number;
  readonly inRange: boolean;
}

/** Moment that holds the bend; null where modulus or shape are not covered. */
export function bendMoment(p: Values, material: Material): BendMoment | null {
  const poisson = material.poisson.value;
  const strain = latticeStrain(p, poisson);
  const secant = secantModulus(material, strain.peak);
  if (!secant || strain.fault) return null;
  const lattice = latticeOf(p);
  const stiff = linksAbreast(p) * shearModulus(secant.value, poisson);
  return {
    value: stiff * twistLink(lattice, twistOf(p), linkLength(lattice)).torque,
    handbook: stiff * twistLink(lattice, twistOf(p), overlapOf(p)).torque,
    inRange: secant.inRange,
  };
}

export interface Pull {
  /** N/mm */
  readonly stiffness: number;
  /** N at the allowable strain, panel flat */
  readonly force: number;
}

/** Pull across the slits, the panel flat: links bend in the plane of the sheet. */
export function pullAcross(p: Values, material: Material, limit: number): Pull | null {
  const secant = secantModulus(material, limit);
  if (!secant) return null;
  const lattice = latticeOf(p);
  const oneLink = secant.value / pullGive(lattice);
  const travel = limit / pullStrain(lattice, 1);
  return {
    stiffness: (linksAbreast(p) * oneLink) / linksInLine(p),
    force: linksAbreast(p) * oneLink * travel,
  };
}
