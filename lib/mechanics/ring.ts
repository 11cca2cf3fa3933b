/**
 * Closed rings: the flat ring stretched from inside (plane stress, alike through its depth), the long tube loaded on
 * a short band of its bore, and the thin ring pinched in its plane. Radii mm, moduli MPa, displacements mm on the RADIUS, outward positive.
 */

/** Flat ring: bore radius, outer radius, mm. */
export interface Ring {
  readonly inner: number;
  readonly outer: number;
}

const thickness = ({ inner, outer }: Ring): number => (outer ** 2 + inner ** 2) / (outer ** 2 - inner ** 2);

/**
 * Lame, plane stress: radial growth of the bore under a pressure p inside is u = p a/E ((b^2+a^2)/(b^2-a^2) + nu).
 * Returns u/(p a/E). Source: Timoshenko, Strength of Materials II, thick cylinders (from memory).
 */
export const boreCompliance = (ring: Ring, poisson: number): number => thickness(ring) + poisson;

/** Pressure in MPa that grows the bore by `growth` mm (Lame, plane stress). */
export const borePressure = (ring: Ring, growth: number, modulus: number, poisson: number): number =>
  (modulus * growth) / (ring.inner * boreCompliance(ring, poisson));

/** Hoop stress in MPa at a radius inside the ring wall, for a pressure in the bore (Lame). */
export const hoopStress = ({ inner, outer }: Ring, pressure: number, radius: number): number =>
  ((pressure * inner ** 2) / (outer ** 2 - inner ** 2)) * (1 + (outer / radius) ** 2);

/** Radial stress in MPa at a radius inside the ring wall, compression negative (Lame). */
export const radialStress = ({ inner, outer }: Ring, pressure: number, radius: number): number =>
  ((pressure * inner ** 2) / (outer ** 2 - inner ** 2)) * (1 - (outer / radius) ** 2);

/**
 * Share of the interference that the ring takes when a solid disc of the same plastic is pressed in; the disc
 * shrinks by the rest. Lame for both, plane stress; the disc's compliance is 1 - nu.
 */
export function ringShare(ring: Ring, poisson: number): number {
  const own = boreCompliance(ring, poisson);
  return own / (own + 1 - poisson);
}

/** Radius of the mean line, thickness in the ring's plane, width across it, mm. */
export interface ThinRing {
  readonly radius: number;
  readonly thickness: number;
  readonly width: number;
}

/**
 * Changes in mm of the two diameters of a closed thin ring pinched by two opposed forces in N, shortening negative:
 * along the forces (pi/4 - 2/pi) P R^3/(E I), across them (2/pi - 1/2) P R^3/(E I). Inextensional.
 * Source: Timoshenko & Young; Roark's Formulas for Stress and Strain.
 */
export function pinchedRing(
  ring: ThinRing,
  modulus: number,
  force: number,
): { along: number; across: number } {
  const inertia = (ring.width * ring.thickness ** 3) / 12;
  const scale = (force * ring.radius ** 3) / (modulus * inertia);
  return { along: (2 / Math.PI - Math.PI / 4) * scale, across: (2 / Math.PI - 0.5) * scale };
}

/** A tube with a short band of load on its bore. mm, MPa. */
export interface LoadedTube {
  readonly bore: number;
  readonly wall: number;
  readonly modulus: number;
  readonly poisson: number;
  /** middle of the load from the end of the tube, mm */
  readonly fromEnd: number;
}

/** Local give of the wall under the band, in units of Q/E: fitted to the finite elements, load on a quarter wall. */
const LOCAL_GIVE = 2.1;
/** The middle of the band yields this much more than the band on average, as a share of the local give (fitted). */
const LOCAL_CROWN = 0.072;
/** A band whose middle lies within this share of the wall from the end counts as an end load. */
const END_SHARE = 0.25;

interface Foundation {
  readonly mean: number;
  /** 1/mm */
  readonly lambda: number;
  /** end deflection of the tube under a unit load at its end, before the material: lambda R^2/(2 E s) */
  readonly unit: number;
  readonly atEnd: boolean;
  readonly d: number;
  readonly c: number;
}

function foundation({ bore, wall, modulus, poisson, fromEnd }: LoadedTube): Foundation {
  const mean = bore + wall / 2;
  const lambda = (3 * (1 - poisson ** 2)) ** 0.25 / Math.sqrt(mean * wall);
  const atEnd = fromEnd <= END_SHARE * wall;
  const phase = lambda * (atEnd ? 0 : fromEnd);
  const fade = Math.exp(-phase);
  return {
    mean,
    lambda,
    unit: (lambda * mean ** 2) / (2 * modulus * wall),
    atEnd,
    d: fade * Math.cos(phase),
    c: fade * (Math.cos(phase) - Math.sin(phase)),
  };
}

/** Length in mm over which a disturbance of the tube dies out: 1/lambda. */
export const decayLength = (tube: LoadedTube): number => 1 / foundation(tube).lambda;

/** Radial growth in mm for one N of radial load per mm of the mean circumference. */
function tubeCompliance(tube: LoadedTube): number {
  const { unit, d, c, atEnd } = foundation(tube);
  return unit * (1 + 2 * d ** 2 + c ** 2) + (atEnd ? 0 : LOCAL_GIVE / tube.modulus);
}

/**
 * Total radial force in N that grows the bore by `growth` mm under a band of load, as a beam on an elastic
 * foundation (Hetenyi, semi-infinite) plus the local give of the wall. Validity: wall up to a quarter of the bore
 * radius, tube longer than 4/lambda past the load, linear. Within 5 % of the finite elements.
 */
export const tubeRadialForce = (tube: LoadedTube, growth: number): number =>
  (growth / tubeCompliance(tube)) * 2 * Math.PI * foundation(tube).mean;

/**
 * Largest hoop strain as a fraction: under an end load with the wall's own bending; else the larger of the strain
 * under the middle of the band and at the free edge. Within 5 % of the finite elements, same validity.
 */
export function tubePeakStrain(tube: LoadedTube, growth: number): number {
  const { unit, d, atEnd } = foundation(tube);
  const { bore, wall, modulus } = tube;
  const mean = growth / bore;
  if (atEnd) return mean * (1 + 0.17 * Math.sqrt(wall / bore));
  const compliance = tubeCompliance(tube);
  const crown = 1 + (LOCAL_CROWN * LOCAL_GIVE) / (modulus * compliance);
  const freeEdge = (4 * unit * d) / compliance;
  return mean * Math.max(crown, freeEdge);
}
