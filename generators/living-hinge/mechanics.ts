import type { AllowableStrain } from '@/lib/materials/allowable';
import { secantModulus } from '@/lib/materials/secant';
import type { Material } from '@/lib/materials/types';
import { type FoldShape, shutFold } from '@/lib/mechanics/fold';
import {
  bendingLength,
  type FoldMoment,
  filletFactor,
  foldMoment,
  insideDepth,
  meetingAngle,
  stripLength,
  stripStrain,
  type WebStrain,
  webStrain,
} from '@/lib/mechanics/web';
import type { Values } from './schema';
import { foldAngleOf, pressedShut, webOf } from './web';

/** Strains a drawn polypropylene web works at; handbook practice for t theta / (2 L). */
export const DRAWN_RANGE = { low: 0.1, high: 0.35 } as const;

const EVEN: FoldShape = { middle: 1, exit: 1 };

export interface HingeMechanics {
  /** t theta / (2 L) */
  readonly nominal: number;
  /** null where the leaves cannot be pressed together without the web touching itself */
  readonly strain: WebStrain | null;
  readonly shape: FoldShape | null;
  readonly filletFactor: number;
  readonly bendingLength: number;
  /** separation of the web exits, leaves pressed shut, over web length */
  readonly separation: number;
  /** rad, where the leaf edges meet in an even bend */
  readonly meetingAngle: number;
}

/** Everything about the bend that does not need a material. */
export function hingeMechanics(p: Values): HingeMechanics {
  const web = webOf(p);
  const angle = foldAngleOf(p);
  const separation = (2 * insideDepth(web)) / web.length;
  const shape = pressedShut(p) ? shutFold(separation) : EVEN;
  return {
    nominal: stripStrain(web.thickness, web.length, angle),
    strain: shape && webStrain(web, angle, shape.middle, shape.exit),
    shape,
    filletFactor: filletFactor(web),
    bendingLength: bendingLength(web),
    separation,
    meetingAngle: meetingAngle(web),
  };
}

/** Web length at which the peak strain of an even bend just meets a limit; handbook strip beside it. mm */
export function elasticWebLength(p: Values, limit: number): { corrected: number; handbook: number } {
  const web = webOf(p);
  const angle = foldAngleOf(p);
  const handbook = stripLength(web.thickness, angle, limit);
  const added = bendingLength(web) - web.length;
  const concentration = Math.max(1, filletFactor(web));
  return { corrected: Math.max(0, handbook * concentration * (1 + 0.08 * limit) - added), handbook };
}

/** Moment to hold the fold, N mm: null where the modulus is not known. */
export function holdingMoment(
  p: Values,
  material: Material,
): (FoldMoment & { handbook: number; inRange: boolean }) | null {
  const web = webOf(p);
  const angle = foldAngleOf(p);
  const nominal = stripStrain(web.thickness, web.length, angle);
  const modulus = secantModulus(material, nominal);
  if (!modulus) return null;
  const yieldStress = material.tensileStrength?.value ?? null;
  const elastic = { modulus: modulus.value, poisson: material.poisson.value, yieldStress };
  const handbook = (modulus.value * p.leafWidth * web.thickness ** 3 * angle) / (12 * web.length);
  return { ...foldMoment(web, angle, p.leafWidth, elastic), handbook, inRange: modulus.inRange };
}

/** What judges this hinge: a drawn web has no elastic verdict, and an elastic one is never drawn. */
export function regime(p: Values, material: Material, allowable: AllowableStrain): 'elastic' | 'drawn' {
  const { nominal, strain } = hingeMechanics(p);
  if (!material.drawsWhenFolded) return 'elastic';
  const peak = strain?.peak ?? nominal;
  return allowable.value !== null && peak <= allowable.value ? 'elastic' : 'drawn';
}
