/**
 * Pin of a hinge, round and solid, held in fixed knuckles on either side of every turning one; the pull is shared
 * evenly. Lengths mm, forces N, stresses MPa, all positive.
 *
 * Shear: V / A in each plane, its peak 4/3 of that at the axis (round section). Bending: each turning knuckle loads
 * the pin evenly between fixed ends, M = w L^2 / 12; real contact gathers near the ends and bends less, so this is
 * on the safe side. Knuckle: mean stress in the two walls beside the bore, no concentration.
 * Source: Timoshenko, Strength of Materials I (from memory); beam tables.
 */
export interface PinJoint {
  readonly pinDiameter: number;
  /** number of turning knuckles */
  readonly knuckles: number;
  /** length of one, along the pin */
  readonly knuckleLength: number;
  /** between neighbouring knuckles */
  readonly sideGap: number;
  /** wall of a turning knuckle beside its bore */
  readonly wall: number;
}

export const ROUND_SHEAR_PEAK = 4 / 3;

/** Mean shear stress in the pin, two planes a turning knuckle. */
export const meanPinShear = ({ pinDiameter, knuckles }: PinJoint, pull: number): number =>
  pull / (2 * knuckles) / ((Math.PI * pinDiameter ** 2) / 4);

/** Greatest bending stress of the pin, at the fixed knuckles. */
export function pinBending(joint: PinJoint, pull: number): number {
  const span = joint.knuckleLength + 2 * joint.sideGap;
  const moment = ((pull / joint.knuckles) * span) / 12;
  return moment / ((Math.PI * joint.pinDiameter ** 3) / 32);
}

/** Mean tension in the walls beside the bore. */
export const knuckleTension = ({ knuckles, knuckleLength, wall }: PinJoint, pull: number): number =>
  pull / knuckles / (2 * wall * knuckleLength);

/** Turn of a loose leaf on its pin, each way, rad: the bore is wider than the pin by twice the gap. */
export const pinTilt = (gap: number, span: number): number => (2 * gap) / span;
