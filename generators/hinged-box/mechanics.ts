import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import { secantModulus } from '@/lib/materials/secant';
import type { LayerDirection, Material, Use } from '@/lib/materials/types';
import { type Arm, guideForce, guideStrain } from '@/lib/mechanics/beam';
import { wedgeFactor } from '@/lib/mechanics/friction';
import { armFault, armOnBlock, type PushedArm, pushArm } from '@/lib/mechanics/standing-arm';
import type { Fold } from '@/lib/mechanics/web-fold';
import { degrees } from '@/lib/units';
import { armFace, axisHeight, keeperEdge, tabWidth } from './layout';
import type { Values } from './schema';

/** The web folds by half a turn and is pressed until the rims stand apart by their gap. */
export const foldOf = (p: Values): Fold => ({
  web: {
    length: p.webLength,
    thickness: p.webThickness,
    leafThickness: p.wall,
    relief: p.webRecess,
    fillet: p.webFillet,
    foldTowards: 'flat-face',
  },
  angle: Math.PI,
  pressedTo: p.rimGap,
});

export const armOf = (p: Values): Arm => ({
  length: p.armLength,
  rootThickness: p.armThickness,
  tipThickness: p.armThickness,
  rootWidth: p.armWidth,
  tipWidth: p.armWidth,
});

/** The arm stands up where the web lies flat: layers along the one run across the other. */
export const catchLayers = (layers: LayerDirection): LayerDirection =>
  layers === 'along' ? 'across' : 'along';

export const catchAllowable = (material: Material, use: Use): AllowableStrain =>
  allowableStrain(material, { ...use, layers: catchLayers(use.layers) });

/**
 * The lid turns, so its catch comes in on an arc: the direction of its last travel leans against the arm by the drop
 * of the keeper below the axis over its distance from it, degrees. Closing is steeper by it, opening easier.
 */
export const arcLean = (p: Values): number => degrees(Math.atan2(axisHeight(p) - keeperEdge(p), armFace(p)));

export interface Catch {
  /** why the corrected figures do not hold; null where they do */
  readonly fault: string | null;
  readonly pushed: PushedArm;
  readonly handbook: number;
}

export function catchOf(p: Values, poisson: number): Catch {
  const arm = armOf(p);
  return {
    fault: armFault(arm, p.undercut),
    pushed: pushArm(armOnBlock(arm, p.armFillet, tabWidth(p), poisson), p.undercut),
    handbook: guideStrain(arm, p.undercut),
  };
}

interface Spread {
  readonly value: number;
  readonly low: number;
  readonly high: number;
  /** at the angle as drawn, rigid root */
  readonly handbook: number;
}

export interface CatchForces {
  readonly deflection: number;
  readonly handbook: number;
  readonly close: Spread;
  readonly open: Spread;
  readonly inRange: boolean;
}

/** Forces at the catch with the secant modulus at the nominal strain; null where modulus or shape are not covered. */
export function catchForces(p: Values, material: Material): CatchForces | null {
  const { fault, pushed, handbook: strain } = catchOf(p, material.poisson.value);
  const secant = secantModulus(material, pushed.nominal);
  const plain = secantModulus(material, strain);
  if (fault || !secant || !plain) return null;
  const deflection = secant.value * pushed.forcePerModulus;
  const handbook = guideForce(armOf(p), strain, plain.value);
  const { friction } = material;
  const along = (drawn: number, angle: number): Spread => ({
    value: deflection * wedgeFactor(friction.value, angle),
    low: deflection * wedgeFactor(friction.low, angle),
    high: deflection * wedgeFactor(friction.high, angle),
    handbook: handbook * wedgeFactor(friction.value, drawn),
  });
  return {
    deflection,
    handbook,
    close: along(p.leadInAngle, p.leadInAngle + arcLean(p)),
    open: along(p.returnAngle, Math.max(0, p.returnAngle - arcLean(p))),
    inRange: secant.inRange,
  };
}
