export interface ScrewContact {
  /** mm */
  readonly pitchDiameter: number;
  /** mm of travel a turn */
  readonly lead: number;
  /** flank angle of the loaded flank from the plane square to the axis, rad */
  readonly flank: number;
  readonly friction: number;
  /** mean radius in mm where the closed cap rubs on the rim, and the friction there */
  readonly collarRadius: number;
  readonly collarFriction: number;
}

/**
 * Torque in N mm for an axial load of one newton: thread and collar. Closing pulls the load up the thread:
 * (d2/2) (l + pi mu d2 sec b)/(pi d2 - mu l sec b) + mu_c r_c; opening:
 * (d2/2) (pi mu d2 sec b - l)/(pi d2 + mu l sec b) + mu_c r_c. Infinity where the thread can no longer be driven.
 * Source: Shigley, Mechanical Engineering Design, power screws (from memory, recomputed).
 */
export function torquePerLoad(contact: ScrewContact, way: 'closing' | 'opening'): number {
  const { pitchDiameter: d2, lead } = contact;
  const drag = contact.friction / Math.cos(contact.flank);
  const round = Math.PI * d2;
  const collar = contact.collarFriction * contact.collarRadius;
  if (way === 'opening') return ((d2 / 2) * (drag * round - lead)) / (round + drag * lead) + collar;
  const rest = round - drag * lead;
  return rest <= 0 ? Number.POSITIVE_INFINITY : ((d2 / 2) * (lead + drag * round)) / rest + collar;
}

/** Share of the closing work that lifts the load: lead / (2 pi torque per newton). */
export const screwEfficiency = (contact: ScrewContact): number =>
  contact.lead / (2 * Math.PI * torquePerLoad(contact, 'closing'));

/** How far friction outweighs the lead: mu sec b pi d2 / lead; self-locking above 1. */
export const lockingRatio = (contact: ScrewContact): number =>
  ((contact.friction / Math.cos(contact.flank)) * Math.PI * contact.pitchDiameter) / contact.lead;

/** Nut factor K of T = K F d for printed plastic caps; common practice, no source. */
export const PRINTED_NUT_FACTOR = 0.3;

/** T = K F d in N mm, load in N, diameter in mm. */
export const nutFactorTorque = (nutFactor: number, load: number, diameter: number): number =>
  nutFactor * load * diameter;

export interface TorqueRange {
  /** N mm */
  readonly low: number;
  readonly high: number;
  /** false where the table does not reach and the range is scaled with the diameter */
  readonly tabled: boolean;
}

/** Closing torque by closure size, [size mm, low N m, high N m]. Source: closure torque guideline tables. */
const HAND_TORQUE: readonly (readonly [number, number, number])[] = [
  [18, 0.79, 1.1],
  [20, 0.9, 1.4],
  [24, 1.1, 2.0],
  [28, 1.4, 2.4],
  [33, 1.7, 2.8],
  [38, 1.9, 2.9],
  [48, 2.1, 3.4],
  [58, 2.6, 4.5],
  [70, 3.2, 5.6],
  [89, 4.5, 7.9],
  [100, 5.1, 7.9],
  [110, 5.1, 7.9],
];

/**
 * Typical hand closing torque in N mm for a closure size in mm, interpolated from the table between 18 and 110 mm.
 * Below 18 mm in proportion to the diameter, as the rule "inch-pounds = radius in mm" does. Null above 110 mm.
 */
export function handTorque(size: number): TorqueRange | null {
  const first = HAND_TORQUE[0]!;
  if (size < first[0]) {
    const share = (size / first[0]) * 1000;
    return { low: first[1] * share, high: first[2] * share, tabled: false };
  }
  const upper = HAND_TORQUE.findIndex((row) => row[0] >= size);
  if (upper < 0) return null;
  const [s1, low1, high1] = HAND_TORQUE[upper]!;
  const [s0, low0, high0] = HAND_TORQUE[Math.max(0, upper - 1)]!;
  const share = s1 === s0 ? 1 : (size - s0) / (s1 - s0);
  const between = (a: number, b: number) => 1000 * (a + (b - a) * share);
  return { low: between(low0, low1), high: between(high0, high1), tabled: true };
}
