import { secantModulus } from '@/lib/materials/secant';
import type { Material } from '@/lib/materials/types';
import { type FoldShape, shutFold } from './fold';
import {
  bendingLength,
  type FoldMoment,
  filletFactor,
  foldMoment,
  insideDepth,
  meetingAngle,
  stripLength,
  stripStrain,
  type Web,
  type WebStrain,
  webStrain,
} from './web';

/** Strains a drawn polypropylene web works at; handbook practice for t theta / (2 L). */
export const DRAWN_RANGE = { low: 0.1, high: 0.35 } as const;

const EVEN: FoldShape = { middle: 1, exit: 1 };

/** A web with what is done to it. Lengths mm, angles rad. */
export interface Fold {
  readonly web: Web;
  readonly angle: number;
  /** distance the faces are pressed to at half a turn; null where the leaves stand as the web likes */
  readonly pressedTo: number | null;
}

export interface FoldedWeb {
  /** t theta / (2 L) */
  readonly nominal: number;
  /** null where the faces cannot be brought so near without the web touching itself or tearing */
  readonly strain: WebStrain | null;
  readonly shape: FoldShape | null;
  readonly filletFactor: number;
  readonly bendingLength: number;
  /** separation of the web exits, faces pressed together, over web length */
  readonly separation: number;
  /** rad, where the leaf edges meet in an even bend */
  readonly meetingAngle: number;
}

/** Everything about the bend that does not need a material. */
export function foldWeb({ web, angle, pressedTo }: Fold): FoldedWeb {
  const separation = (2 * insideDepth(web) + (pressedTo ?? 0)) / web.length;
  const shape = pressedTo === null ? EVEN : shutFold(separation);
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
export function elasticLength({ web, angle }: Fold, limit: number): { corrected: number; handbook: number } {
  const handbook = stripLength(web.thickness, angle, limit);
  const added = bendingLength(web) - web.length;
  const concentration = Math.max(1, filletFactor(web));
  return { corrected: Math.max(0, handbook * concentration * (1 + 0.08 * limit) - added), handbook };
}

/** Moment to hold the fold over a width in mm, N mm: null where the modulus is not known. */
export function holdingMoment(
  { web, angle }: Fold,
  width: number,
  material: Material,
): (FoldMoment & { handbook: number; inRange: boolean }) | null {
  const nominal = stripStrain(web.thickness, web.length, angle);
  const modulus = secantModulus(material, nominal);
  if (!modulus) return null;
  const yieldStress = material.tensileStrength?.value ?? null;
  const elastic = { modulus: modulus.value, poisson: material.poisson.value, yieldStress };
  const handbook = (modulus.value * width * web.thickness ** 3 * angle) / (12 * web.length);
  return { ...foldMoment(web, angle, width, elastic), handbook, inRange: modulus.inRange };
}

/**
 * What judges a web: one that draws has no elastic verdict, and an elastic one is never drawn. `allowable` as a
 * fraction, null where it is not known.
 */
export function foldRegime(
  { nominal, strain }: FoldedWeb,
  material: Material,
  allowable: number | null,
): 'elastic' | 'drawn' {
  if (!material.drawsWhenFolded) return 'elastic';
  const peak = strain?.peak ?? nominal;
  return allowable !== null && peak <= allowable ? 'elastic' : 'drawn';
}
