import { ArmPath, type Elastic, type Station, solveArm } from './curved-beam';

/**
 * Open ring on a stem, spread at its lips by a rod: half of it is a curved arm from the stem to one lip.
 *
 * Handbook: whole half arc from the back, thin bar, delta = P R^3 f(beta) / (E I),
 * f = beta (1/2 + cos^2 beta) - 0.75 sin 2 beta, eps = delta h (1 - cos beta) / (2 R^2 f) (Castigliano, derived).
 * Corrected: thick curved bar (curved-beam.ts) from the edge of the stem, asin(w / ro), whose root turns by
 * theta = k M / (E b h^2). k = 10.5, near twice that of a bar on a half plane because both arms pull on one stem; fitted
 * on plane-stress finite elements of 16 clips (bore 6 to 40 mm, wall 1.2 to 3, stem 3 to 10 mm, fillet 0.3 to 2):
 * force within 5 %, tension on the bore within 5 %. The squeezed outside at the stem's fillet sees up to 1.45 times
 * that strain in compression. Opening up to 0.6 of the radius (large-deflection error of force 8 %, strain 4 %).
 *
 * Lengths mm, forces N, angles rad measured from the back, strain as a fraction, tension positive.
 */
export interface OpenRing {
  readonly bore: number;
  readonly wall: number;
  /** wall at the lip; equal to `wall` without taper */
  readonly tipWall: number;
  /** from the back to the lip */
  readonly halfArc: number;
  /** half the width of the stem; 0 for a ring clamped at its back only */
  readonly stemHalfWidth: number;
}

const ROOT_ROTATION = 10.5;

/** f(beta) of the thin bar. */
export const thinRingFactor = (halfArc: number): number =>
  halfArc * (0.5 + Math.cos(halfArc) ** 2) - 0.75 * Math.sin(2 * halfArc);

/** Angle from the back at which the arm leaves the stem. */
export const rootAngle = (ring: OpenRing): number =>
  Math.asin(Math.min(1, ring.stemHalfWidth / (ring.bore / 2 + ring.wall)));

export const meanRadius = (ring: OpenRing): number => (ring.bore + ring.wall) / 2;

export interface RingArm {
  readonly stations: readonly Station[];
  readonly rootAngle: number;
}

/** The arm of one side: heading 0 at the root, the lip pulled outward at -rootAngle. */
export function ringArm(ring: OpenRing): RingArm & { tip: { x: number; y: number } } {
  const start = rootAngle(ring);
  const radius = meanRadius(ring);
  const length = (ring.halfArc - start) * radius;
  const wallAt = (travelled: number) => ring.wall + ((ring.tipWall - ring.wall) * travelled) / length;
  const { stations, tip } = new ArmPath(0, 0, 0, wallAt).turn(ring.halfArc - start, radius, 96).build();
  return { stations, tip, rootAngle: start };
}

export interface RingOpening {
  /** force at each lip */
  readonly force: number;
  /** largest tension, on the bore */
  readonly strain: number;
  /** angle of that place from the back */
  readonly at: number;
}

/** Opens each lip by `spread` mm. */
export function openRing(ring: OpenRing, spread: number, elastic: Elastic): RingOpening {
  const arm = ringArm(ring);
  const solved = solveArm(arm.stations, arm.tip, -arm.rootAngle, elastic);
  const stem = ring.stemHalfWidth > 0 ? ROOT_ROTATION : 0;
  const root = (stem * solved.rootMoment ** 2) / (elastic.modulus * elastic.width * ring.wall ** 2);
  const force = spread / (solved.compliance + root);
  const bore = solved.strain.map(({ left }) => left);
  const index = bore.reduce((best, strain, i) => (Math.abs(strain) > Math.abs(bore[best]!) ? i : best), 0);
  const share = (index + 0.5) / bore.length;
  return {
    force,
    strain: Math.abs(bore[index]!) * force,
    at: arm.rootAngle + share * (ring.halfArc - arm.rootAngle),
  };
}

/** The handbook's thin ring, clamped at its back, for the same spread of each lip. */
export function thinRing(
  ring: OpenRing,
  spread: number,
  elastic: Elastic,
): { force: number; strain: number } {
  const radius = meanRadius(ring);
  const factor = thinRingFactor(ring.halfArc);
  const inertia = (elastic.width * ring.wall ** 3) / 12;
  return {
    force: (spread * elastic.modulus * inertia) / (radius ** 3 * factor),
    strain: (spread * ring.wall * (1 - Math.cos(ring.halfArc))) / (2 * radius ** 2 * factor),
  };
}

export interface RingShape {
  /** rotation of the section at each station, rad per mm of spread, outward positive */
  readonly rotation: Float64Array;
  /** movement of the centre line at each station per mm of spread: outward x and away from the stem z */
  readonly x: Float64Array;
  readonly z: Float64Array;
  /** surface strain per mm of spread */
  readonly inner: Float64Array;
  readonly outer: Float64Array;
  readonly from: number;
  readonly to: number;
}

/** How the whole arm moves for a lip spread of 1 mm, for drawing; small deflection. */
export function ringShape(ring: OpenRing): RingShape {
  const elastic: Elastic = { modulus: 1, poisson: 0.35, width: 1 };
  const { stations, tip, rootAngle: from } = ringArm(ring);
  const { force } = openRing(ring, 1, elastic);
  const solved = solveArm(stations, tip, -from, elastic);
  const n = stations.length;
  const [rotation, x, z] = [new Float64Array(n), new Float64Array(n), new Float64Array(n)];
  let turn = ring.stemHalfWidth > 0 ? (ROOT_ROTATION * -solved.rootMoment * force) / ring.wall ** 2 : 0;
  let [px, pz] = [0, 0];
  stations.forEach((station, i) => {
    const moment = -((tip.x - station.x) * Math.sin(-from) - (tip.y - station.y) * Math.cos(from)) * force;
    const heading = from + station.heading;
    turn += ((12 * moment) / station.thickness ** 3) * station.ds;
    px += turn * Math.sin(heading) * station.ds;
    pz -= turn * Math.cos(heading) * station.ds;
    rotation[i] = turn;
    x[i] = px;
    z[i] = pz;
  });
  return {
    rotation,
    x,
    z,
    inner: Float64Array.from(solved.strain, ({ left }) => left * force),
    outer: Float64Array.from(solved.strain, ({ right }) => right * force),
    from,
    to: ring.halfArc,
  };
}
