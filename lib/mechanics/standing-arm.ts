import type { Arm } from './beam';
import { filletConcentration, narrowingAtFillet } from './fillet';
import { bendArm, type FlexibleArm, highestStrain, strainAt } from './large-deflection';
import { heldStrain } from './poisson';
import { blockSprings, narrowingSlope, rootSection, widthStiffening } from './root';

/**
 * A straight arm that stands on a body and is pushed at its tip, composed of beam, root, fillet and width. Lengths mm,
 * strain as a fraction, tension positive. Validity and errors as its pieces tell; fillet 0.1 to 1 arm thickness.
 */

/** The corrected figures hold to this deflection over length, and from this slenderness on. */
export const MOST_DEFLECTION = 0.5;
export const LEAST_SLENDERNESS = 2;

/** Why an arm is outside the range of the corrected figures; null where it is inside. */
export function armFault({ length, rootThickness }: Arm, deflection: number): string | null {
  if (deflection > MOST_DEFLECTION * length) return 'the arm bends by more than half its length';
  return length < LEAST_SLENDERNESS * rootThickness ? 'the arm is shorter than twice its thickness' : null;
}

/** Peak over nominal strain where the root fillet ends; infinite where there is none. */
export const standingConcentration = (arm: Arm, fillet: number, poisson: number): number =>
  narrowingAtFillet(narrowingSlope(arm)) *
  heldStrain(poisson, arm.rootWidth / arm.rootThickness) *
  filletConcentration(fillet / arm.rootThickness);

/** The arm on a block as wide as `bodyWidth` along its width. */
export const armOnBlock = (arm: Arm, fillet: number, bodyWidth: number, poisson: number): FlexibleArm => ({
  arm,
  fillet,
  springs: blockSprings(bodyWidth, rootSection(arm, fillet, poisson)),
  poisson,
  stiffening: widthStiffening(arm, poisson),
});

export interface PushedArm {
  /** transverse force over modulus, mm2 */
  readonly forcePerModulus: number;
  /** outer-fibre strain where the fillet ends, without concentration: sets the working modulus */
  readonly nominal: number;
  /** highest on the arm, at the fillet or further along */
  readonly peak: number;
}

/** The arm pushed at its tip by `deflection` mm, up to half its length. */
export function pushArm(flexible: FlexibleArm, deflection: number): PushedArm {
  const bent = bendArm(flexible, deflection);
  const nominal = strainAt(flexible, bent, flexible.fillet);
  const atFillet = standingConcentration(flexible.arm, flexible.fillet, flexible.poisson) * nominal;
  const peak = Math.max(atFillet, highestStrain(flexible, bent, flexible.fillet));
  return { forcePerModulus: bent.forcePerModulus, nominal, peak };
}
