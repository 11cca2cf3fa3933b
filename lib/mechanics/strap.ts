/**
 * A strip closed round a bundle. t thickness, b width, d eye diameter, D bundle diameter, L length along the middle
 * of the strip from peg to eye, all mm. Strains as fractions, tension positive.
 */

/** Strain of the outer face of a strip wrapped on a bundle: t/(D + t), exact. The inner face has its negative. */
export const wrapStrain = (thickness: number, bundle: number): number => thickness / (bundle + thickness);

/** Smallest bundle diameter in mm for a wrap strain. */
export const smallestBundle = (thickness: number, strain: number): number =>
  (thickness * (1 - strain)) / strain;

/**
 * The closed strip is one turn of a logarithmic spiral: it starts on the bundle and ends one thickness higher, on
 * top of its own start, both ends parallel. `growth` is k in r = r0 exp(k angle).
 */
export interface Spiral {
  /** radius of the middle of the strip at the peg, mm */
  readonly start: number;
  readonly growth: number;
}

const turnGrowth = (start: number, pitch: number): number => Math.log1p(pitch / start) / (2 * Math.PI);

/** Length in mm of one turn that starts at a radius and ends a pitch further out. */
export function turnLength(start: number, pitch: number): number {
  const k = turnGrowth(start, pitch);
  return (pitch * Math.sqrt(1 + k * k)) / k;
}

/**
 * Spiral of one turn with a given length and pitch, by Newton; the length is nearly 2 pi (start + pitch/2).
 * Valid for length > 4 pitch.
 */
export function spiralOf(length: number, pitch: number): Spiral {
  let start = length / (2 * Math.PI) - pitch / 2;
  for (let round = 0; round < 20; round += 1) {
    const error = turnLength(start, pitch) - length;
    if (Math.abs(error) < 1e-12 * length) break;
    start = Math.max(start - error / (2 * Math.PI), 1e-3 * pitch);
  }
  return { start, growth: turnGrowth(start, pitch) };
}

/** Radius of curvature in mm of the spiral at arc length s from its start. */
export const spiralRadius = ({ start, growth }: Spiral, s: number): number =>
  start * Math.sqrt(1 + growth * growth) + growth * s;

/** Length from peg to eye, mm, of a strip lapped once round a bundle. */
export const loopLength = (bundle: number, thickness: number): number =>
  turnLength((bundle + thickness) / 2, thickness);

/** Bundle diameter in mm that a loop of a given length closes on. */
export const bundleOfLoop = (length: number, thickness: number): number =>
  2 * spiralOf(length, thickness).start - thickness;

/** Area in mm2 left beside an eye. */
export const netArea = (width: number, eye: number, thickness: number): number => (width - eye) * thickness;

/**
 * Stress at the edge of a hole in a pulled strip over the mean stress beside it: 2 + (1 - d/b)^3.
 * Source: Heywood, Designing by Photoelasticity (from memory).
 */
export const pulledHoleFactor = (eye: number, width: number): number => 2 + (1 - eye / width) ** 3;

/** d/b up to which the bending factor below was published; it is held at this ratio beyond. */
const BENT_HOLE_RATIO = 0.3;

/**
 * Strain at the edge of a hole in a strip bent flatwise over the strain of the plain strip of the same curvature.
 * Source: Roark's Formulas for Stress and Strain, plate with a central hole in simple bending (from memory); tends to
 * 3 for a deep hole and to (5 + 3 nu)/(3 + nu) = 1.79 (nu = 0.3) for a thin plate (Goodier).
 */
export function bentHoleFactor(eye: number, width: number, thickness: number): number {
  const depth = eye / thickness;
  const ratio = Math.min(eye / width, BENT_HOLE_RATIO);
  const hole = 1.79 + 0.25 / (0.39 + depth) + 0.81 / (1 + depth ** 2) - 0.26 / (1 + depth ** 3);
  return hole * (1 - 1.04 * ratio + 1.22 * ratio ** 2);
}
