import { ArmPath, type Elastic, type Station, solveArm } from './curved-beam';
import { FILLET_STIFFENING } from './fillet';
import { blockSprings } from './root';

/**
 * S-shaped strip between two plates that stay parallel: up from the lower plate, a quarter turn, a leg, half a turn,
 * back across, half a turn, a leg, a quarter turn, up to the upper plate. The shape is its own image turned by half a turn,
 * so the moment in its middle is nil and each half is an arm with a force at its tip (curved-beam.ts: thick curved bar,
 * Castigliano and Winkler-Bach) on a plate that gives under its foot (root.ts). Two such strips, mirrored, keep the upper plate from shifting as it sinks.
 * Against plane finite elements (tests/reference/s-spring): stiffness within 5 % upright and 2 % sideways, strain within 3 %
 * upright. Lengths mm, modulus MPa, forces N. Small deflection; legs must not touch; radius at least the thickness.
 */
export interface SSpring {
  /** of the centre line */
  readonly radius: number;
  /** straight between the quarter turn and the half turn */
  readonly leg: number;
  readonly thickness: number;
  /** straight at either plate, with a fillet of the same size */
  readonly foot: number;
}

/** Between the plates. */
export const springHeight = ({ radius, foot }: SSpring): number => 6 * radius + 2 * foot;

/** From the middle to the outermost face. */
export const springReach = ({ radius, leg, thickness }: SSpring): number => 2 * radius + leg + thickness / 2;

/** Free space between two legs, and between a leg and its plate. */
export const legGap = ({ radius, thickness }: SSpring): number => 2 * radius - thickness;

interface HalfSpring {
  readonly stations: readonly Station[];
  readonly tip: { readonly x: number; readonly y: number };
}

/** Centre line from the lower plate to the middle. The fillet keeps its foot stiff. */
export function halfSpring({ radius, leg, thickness, foot }: SSpring): HalfSpring {
  const skipped = FILLET_STIFFENING * foot;
  return new ArmPath(0, skipped, Math.PI / 2, () => thickness)
    .straight(foot - skipped, 4)
    .turn(-Math.PI / 2, radius, 24)
    .straight(leg, leg > 0 ? 12 : 1)
    .turn(Math.PI, radius, 48)
    .straight(radius + leg, 16)
    .build();
}

export interface SpringStiffness {
  /** N/mm of one strip */
  readonly axial: number;
  readonly sway: number;
  /** greatest surface strain per mm it sinks */
  readonly axialStrain: number;
}

interface Flexible {
  readonly half: HalfSpring;
  readonly elastic: Elastic;
  /** turn of the foot per N mm, rad, and its pivot below the plate's face, mm */
  readonly footTurn: number;
  readonly behind: number;
}

function flexible(spring: SSpring, elastic: Elastic): Flexible {
  const { thickness, foot } = spring;
  const { width, poisson, modulus } = elastic;
  const [root] = blockSprings(width, { thickness, width, fillet: foot, poisson });
  return { half: halfSpring(spring), elastic, footTurn: root!.turn / modulus, behind: root!.behind };
}

/** Moment at the pivot under the foot of a tip force, N mm per N. */
const footMoment = ({ half: { tip }, behind }: Flexible, fx: number, fy: number): number =>
  tip.x * fy - (tip.y + behind) * fx;

/** Compliance of a whole strip between parallel plates, mm/N: twice that of its half. */
function complianceOf(spring: Flexible): { xx: number; yy: number; xy: number } {
  const { half, elastic, footTurn } = spring;
  const at = (direction: number) => {
    const foot = footMoment(spring, Math.cos(direction), Math.sin(direction));
    return 2 * (solveArm(half.stations, half.tip, direction, elastic).compliance + footTurn * foot ** 2);
  };
  const [xx, yy] = [at(0), at(Math.PI / 2)];
  return { xx, yy, xy: at(Math.PI / 4) - (xx + yy) / 2 };
}

/** Force on the upper plate that moves it by (dx, dy) without turning it. */
function forceFor(spring: Flexible, dx: number, dy: number): readonly [number, number] {
  const { xx, yy, xy } = complianceOf(spring);
  const whole = xx * yy - xy ** 2;
  return [(yy * dx - xy * dy) / whole, (xx * dy - xy * dx) / whole];
}

/** Stiffness of one strip whose upper plate sinks, or shifts along x, and neither turns nor does the other. */
export function springStiffness(given: SSpring, elastic: Elastic): SpringStiffness {
  const spring = flexible(given, elastic);
  const { stations, tip } = spring.half;
  const [fx, fy] = forceFor(spring, 0, 1);
  const { peak } = solveArm(stations, tip, Math.atan2(fy, fx), elastic);
  const [sway] = forceFor(spring, 1, 0);
  return { axial: fy, sway, axialStrain: Math.hypot(fx, fy) * peak.perNewton };
}

/** Movement of the lower half of a strip: at each station of its centre line, and the strain of its faces. */
export interface SpringShape {
  readonly stations: readonly Station[];
  /** mm */
  readonly x: Float64Array;
  readonly y: Float64Array;
  /** rad */
  readonly turn: Float64Array;
  readonly left: Float64Array;
  readonly right: Float64Array;
}

/** Rigid-body integration of the bend along the path: each station turns and carries along all that follows. */
function integrate(stations: readonly Station[], foot: number, bend: (station: Station) => number) {
  const turn = new Float64Array(stations.length).fill(foot);
  const x = new Float64Array(stations.length);
  const y = new Float64Array(stations.length);
  for (let i = 1; i < stations.length; i += 1) {
    const [a, b] = [stations[i - 1]!, stations[i]!];
    const within = turn[i - 1]! + (bend(a) * a.ds) / 2;
    x[i] = x[i - 1]! - within * (b.y - a.y);
    y[i] = y[i - 1]! + within * (b.x - a.x);
    turn[i] = within + (bend(b) * b.ds) / 2;
  }
  return { turn, x, y };
}

/**
 * How the lower half moves when the upper plate moves by (dx, dy) without turning; its middle goes half-way. The upper
 * half is the same, turned by half a turn and seen from the upper plate. For a picture: bending and the foot's turn alone.
 */
export function springShape(
  given: SSpring,
  poisson: number,
  [dx, dy]: readonly [number, number],
): SpringShape {
  const elastic: Elastic = { modulus: 1, poisson, width: 1 };
  const spring = flexible(given, elastic);
  const { stations, tip } = spring.half;
  const [fx, fy] = forceFor(spring, dx, dy);
  const inertia = given.thickness ** 3 / 12;
  const foot = spring.footTurn * footMoment(spring, fx, fy);
  const moved = integrate(
    stations,
    foot,
    (station) => ((tip.x - station.x) * fy - (tip.y - station.y) * fx) / inertia,
  );
  const { strain } = solveArm(stations, tip, Math.atan2(fy, fx), elastic);
  const force = Math.hypot(fx, fy);
  return {
    stations,
    ...moved,
    left: Float64Array.from(strain, (one) => one.left * force),
    right: Float64Array.from(strain, (one) => one.right * force),
  };
}
