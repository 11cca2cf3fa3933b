/**
 * A narrow strip closed on itself with one half turn: the shape of least bending and twisting energy among those
 * that never bend the strip edgewise. One shape for all straps, scaled by the loop's length L.
 *
 * Curvature (about the strip's width) and twist in units of 2 pi/L at u = 2 pi (s/L - 1/2), s from the joint:
 *   curvature = sum a_i sin((2i + 1) u/2),  twist = sum b_i cos(i u).
 * Derived here: minimum of the integral of curvature^2 + 1.43 twist^2 (1.43 = 2/(1 + nu), nu = 0.4), under the
 * condition that the loop closes and the two ends lie flat on each other. The loop is symmetric about the line
 * through joint and mid-length. Validity: strip narrower than WIDEST_HALF_TURN of the loop; wider ones fold.
 */
const CURVATURE = [1.41049721, 0.85920752, 0.1066] as const;
const TWIST = [0.40504131, 0.88975402, 0.1589] as const;

/**
 * What lifts the eye off the peg along the peg's axis, the two ends still flat and parallel, per unit of lift 2 pi/L:
 * curvature a cos(u/2) + b cos(3u/2), twist c sin(u). First order in the lift; within lift/3 mm for lift < 0.05 L.
 */
const LIFT_CURVATURE = [-0.1876, 0.237] as const;
const LIFT_TWIST = 0.0981;

/** Widest strip, as a share of the loop, for which the narrow-strip theory is used. */
export const WIDEST_HALF_TURN = 0.12;

/** Clear width of the loop of an infinitely narrow strip, in units of L/(2 pi); a plain ring has 2. */
const CLEAR = 1.512;

const phase = (share: number): number => 2 * Math.PI * (share - 0.5);

/**
 * Curvature in 1/mm at a share of the loop (0 at the peg, 1 at the eye), positive towards the strip's upper face; it
 * changes sign at mid-length. `lift` mm between peg end and eye end, along the peg.
 */
export function halfTurnCurvature(share: number, length: number, lift = 0): number {
  const u = phase(share);
  const unit = (2 * Math.PI) / length;
  const [a, b, c] = CURVATURE;
  const [d, e] = LIFT_CURVATURE;
  const closed = a * Math.sin(u / 2) + b * Math.sin(1.5 * u) + c * Math.sin(2.5 * u);
  return unit * (closed + lift * unit * (d * Math.cos(u / 2) + e * Math.cos(1.5 * u)));
}

/** Twist in radians per mm at a share of the loop; largest at mid-length, 2.9 times the even twist pi/L. */
export function halfTurnTwist(share: number, length: number, lift = 0): number {
  const u = phase(share);
  const unit = (2 * Math.PI) / length;
  const [a, b, c] = TWIST;
  const closed = a + b * Math.cos(u) + c * Math.cos(2 * u);
  return unit * (closed + lift * unit * LIFT_TWIST * Math.sin(u));
}

/**
 * Loop length in mm that leaves room for a round bundle: at mid-length the strip stands on edge and half its width,
 * and at the joint half its thickness, stand into the loop.
 */
export const halfTurnLength = (bundle: number, width: number, thickness: number): number =>
  (2 * Math.PI * (bundle + (width + thickness) / 2)) / CLEAR;

/** Bundle diameter in mm that a loop of a given length leaves room for. */
export const halfTurnBundle = (length: number, width: number, thickness: number): number =>
  (CLEAR * length) / (2 * Math.PI) - (width + thickness) / 2;

/** Where in the section to read the strain: the two faces at mid-width, or the edges. */
export interface TwistStrain {
  /** stretch along the strip at its edges, and at mid-width, from twist alone (their mean is zero) */
  readonly edge: number;
  readonly middle: number;
  /** shear strain at the faces, mid-width */
  readonly shear: number;
}

/**
 * Strain of a thin twisted strip, twist in rad/mm. Shear of the faces twist t (Saint-Venant, thin rectangle); the
 * edges are longer than the axis by twist^2 y^2/2, less the mean that leaves no pull: twist^2 b^2/12 at the edge,
 * -twist^2 b^2/24 on the axis. Source: Timoshenko & Goodier, Theory of Elasticity, torsion of bars (from memory).
 */
export const twistStrain = (twist: number, width: number, thickness: number): TwistStrain => ({
  edge: (twist * width) ** 2 / 12,
  middle: -((twist * width) ** 2) / 24,
  shear: twist * thickness,
});

/** Largest principal strain of a fibre with stretch `along` and shear strain, free sideways (uniaxial stress). */
export const principalStrain = (along: number, shear: number, poisson: number): number =>
  (along * (1 - poisson)) / 2 + Math.hypot((along * (1 + poisson)) / 2, shear / 2);

/** Samples along the half loop; the strain is smooth, 48 find the peak within 0.1 %. */
const SAMPLES = 48;

export interface HalfTurnStrain {
  /** largest bending strain of the faces, largest edge stretch, largest face shear, as fractions */
  readonly bending: number;
  readonly edge: number;
  readonly shear: number;
  /** largest principal strain with bending and twist together, at the edges or on the inner face */
  readonly peak: number;
}

/** Strain of a strip closed with a half turn; null where the strip is too wide for the theory. */
export function halfTurnStrain(
  length: number,
  width: number,
  thickness: number,
  poisson: number,
): HalfTurnStrain | null {
  if (width > WIDEST_HALF_TURN * length) return null;
  const worst = { bending: 0, edge: 0, shear: 0, peak: 0 };
  for (let at = 0; at <= SAMPLES; at += 1) {
    const share = (0.5 * at) / SAMPLES;
    const bending = (Math.abs(halfTurnCurvature(share, length)) * thickness) / 2;
    const { edge, middle, shear } = twistStrain(halfTurnTwist(share, length), width, thickness);
    worst.bending = Math.max(worst.bending, bending);
    worst.edge = Math.max(worst.edge, edge);
    worst.shear = Math.max(worst.shear, Math.abs(shear));
    const inside = principalStrain(bending - middle, shear, poisson);
    worst.peak = Math.max(worst.peak, bending + edge, inside);
  }
  return worst;
}
