import { type Arm, guideStrain } from './beam';
import { filletConcentration } from './fillet';
import { type BentArm, bendArm, type FlexibleArm, highestStrain, strainAt } from './large-deflection';
import { blockSprings, rootSection, widthStiffening } from './root';

/** The fillet stands on one side only, the other face runs on: it stiffens the root about half as much. */
const ONE_SIDED = 0.5;

/**
 * Arm at the edge of the body it grows from, as wide as that: one face runs on into the body, the other meets it in a
 * fillet. Radius 0.1 to 1 of the thickness. Against plane finite elements of arms from 8 thicknesses on: strain
 * within 8 %, force 5 to 16 % high, as a body gives more at its edge.
 */
export function flushArm(arm: Arm, rootFillet: number, poisson: number): FlexibleArm {
  const fillet = ONE_SIDED * rootFillet;
  const springs = blockSprings(arm.rootWidth, rootSection(arm, fillet, poisson));
  return { arm, fillet, springs, poisson, stiffening: widthStiffening(arm, poisson) };
}

export interface BentFlushArm {
  readonly flexible: FlexibleArm;
  readonly bent: BentArm;
  /** movement of the pushed place, mm */
  readonly deflection: number;
  /** where the fillet ends, without its concentration: sets the working modulus */
  readonly nominal: number;
  readonly peak: number;
  /** the guide's plain figure: rigid root, no fillet */
  readonly handbook: number;
}

/** The arm pushed at its end by `deflection` mm; strains as fractions. */
export function bendFlushArm(
  arm: Arm,
  rootFillet: number,
  deflection: number,
  poisson: number,
): BentFlushArm {
  const flexible = flushArm(arm, rootFillet, poisson);
  const bent = bendArm(flexible, deflection);
  const nominal = strainAt(flexible, bent, rootFillet);
  const atFillet = nominal * filletConcentration(Math.min(1, rootFillet / arm.rootThickness));
  const peak = Math.max(atFillet, highestStrain(flexible, bent, rootFillet));
  return { flexible, bent, deflection, nominal, peak, handbook: guideStrain(arm, deflection) };
}
