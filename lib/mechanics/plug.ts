/**
 * A plug squeezed all round by a rigid bore. Radii and lengths in mm, moduli and pressures in MPa, forces in N.
 * Interference is on the RADIUS, compression is given as a positive number.
 */
export interface SqueezedPlug {
  /** contact radius */
  readonly outer: number;
  /** radius of the cavity, 0 for a solid plug */
  readonly inner: number;
  readonly interference: number;
  readonly modulus: number;
  readonly poisson: number;
}

/**
 * Inward give of the outside over p a/E: (a^2 + b^2)/(a^2 - b^2) - nu, which is 1 - nu for a solid plug. Lame, plane
 * stress. Source: Timoshenko, Strength of Materials II, thick cylinders (from memory).
 */
export const squeezeCompliance = (outer: number, inner: number, poisson: number): number =>
  (outer ** 2 + inner ** 2) / (outer ** 2 - inner ** 2) - poisson;

/** Pressure in MPa on a disc cut free at its faces (Lame). */
export const squeezePressure = ({ outer, inner, interference, modulus, poisson }: SqueezedPlug): number =>
  (modulus * interference) / (outer * squeezeCompliance(outer, inner, poisson));

/** Greatest hoop compression as a fraction: at the cavity of a hollow plug, alike everywhere in a solid one (Lame). */
export function squeezeStrain({
  outer,
  inner,
  interference,
  poisson,
}: Omit<SqueezedPlug, 'modulus'>): number {
  const contact = interference / outer;
  if (inner === 0) return contact;
  const inside = (2 * outer ** 2) / (outer ** 2 - inner ** 2);
  return (contact * inside) / squeezeCompliance(outer, inner, poisson);
}

/**
 * Radial force in N on ribs of `length` mm altogether that is never reached from below: the ribs as discs cut free
 * of the body between them (minimum of strain energy: taking material away only softens).
 */
export const ribForceLow = (plug: SqueezedPlug, length: number): number =>
  squeezePressure(plug) * 2 * Math.PI * plug.outer * length;

/**
 * Radial force in N that is never exceeded: the whole body of `volume` mm3 shrunk alike, 2 E eps V / ((1 - nu) a)
 * with eps = interference / a (minimum of strain energy: forcing a displacement only stiffens). Equals Lame for a
 * solid disc touched over its whole depth. Derived here.
 */
export const ribForceHigh = (plug: Omit<SqueezedPlug, 'inner'>, volume: number): number =>
  (2 * plug.modulus * plug.interference * volume) / ((1 - plug.poisson) * plug.outer ** 2);

/**
 * Reach in mm to either side of a narrow band over which the wall helps to bear it: 1/lambda of the beam on an elastic
 * foundation, sqrt(R s) / (3 (1 - nu^2))^(1/4), mean radius R, wall s. Source: Hetenyi, Beams on Elastic Foundation
 * (from memory). Valid for walls up to a quarter of the inner radius; an estimate for thicker ones.
 */
export const bandReach = (outer: number, inner: number, poisson: number): number =>
  Math.sqrt(((outer + inner) / 2) * (outer - inner)) / (3 * (1 - poisson ** 2)) ** 0.25;

/**
 * Strain at which a long free ring under even pressure would dimple: s^2 / (4 (1 - nu^2) R^2). A bore that holds the
 * ring round and a closed end put it off. Source: Timoshenko, Theory of Elastic Stability (from memory).
 */
export const dimpleStrain = (wall: number, meanRadius: number, poisson: number): number =>
  (wall / meanRadius) ** 2 / (4 * (1 - poisson ** 2));
