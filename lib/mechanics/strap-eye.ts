import { borePressure, ringShare } from './ring';

/**
 * A round eye in the middle of a long strip, stretched by a round head or squeezed open from the strip's edges.
 * Plane stress. d eye diameter, b width, t thickness, mm; E in MPa; forces in N.
 * Validity: 0.2 <= d/b <= 0.7, the next end of the strip at least one width away, small strain, no friction. The
 * stretch factors tend to a hole in an endless plate below 0.2; the squeeze factors are not checked there.
 */
export interface Eye {
  readonly diameter: number;
  readonly width: number;
  readonly thickness: number;
}

/** Range of d/b that the finite elements behind the factors cover. */
export const NARROWEST_EYE = 0.2;
export const WIDEST_EYE = 0.7;

const ringOf = ({ diameter, width }: Eye) => ({ inner: diameter / 2, outer: width / 2 });

/** d^2/(b^2 - d^2), how far the eye crowds the strip. */
const crowding = ({ diameter, width }: Eye): number => diameter ** 2 / (width ** 2 - diameter ** 2);

/**
 * Radial force of the strip over that of a flat Lame ring as wide as the strip; fitted to plane-stress finite
 * elements within 1.5 % (tests/reference/strap).
 */
export function stripOverRing(eye: Eye): number {
  const q = crowding(eye);
  return 1 + q * (0.342 - 0.034 * q);
}

/**
 * Largest hoop strain at the bore over growth/radius: nearly even up to d/b = 0.6, then the webs beside the eye take
 * over. Fitted to the same finite elements within 2.5 %.
 */
export function eyePeakFactor({ diameter, width }: Eye): number {
  const past = Math.max(0, diameter / width - 0.6);
  return 1.03 + 0.6 * past + 6.9 * past ** 2;
}

export interface StretchedEye {
  /** hoop strain at the bore: mean (growth/diameter) and largest */
  readonly mean: number;
  readonly peak: number;
}

/** Strain at the bore of an eye stretched to `head` mm by a rigid round head. */
export function stretchedEye(eye: Eye, head: number): StretchedEye {
  const mean = (head - eye.diameter) / eye.diameter;
  return { mean, peak: mean * eyePeakFactor(eye) };
}

/**
 * Radial force all round, N, of a rigid head in the eye, over its full depth. `ring` is the flat Lame ring as wide as
 * the strip: a lower bound, for it leaves out the strip before and behind the eye.
 */
export function stretchForce(
  eye: Eye,
  head: number,
  modulus: number,
  poisson: number,
): { strip: number; ring: number } {
  const pressure = borePressure(ringOf(eye), (head - eye.diameter) / 2, modulus, poisson);
  const ring = pressure * Math.PI * eye.diameter * eye.thickness;
  return { ring, strip: ring * stripOverRing(eye) };
}

/** Share of the undercut that the eye takes where the head, of the same plastic, gives like a flat disc. */
export const eyeShare = (eye: Eye, poisson: number): number => ringShare(ringOf(eye), poisson);

/** Fingers or pliers: how wide the squeezing patch is, in eye diameters. */
export type Patch = 'narrow' | 'middle' | 'wide';

const GROWTH: Readonly<Record<Patch, (q: number) => number>> = {
  narrow: (q) => 3.28 + 1.13 * q,
  middle: (q) => 3.04 + 0.4 * q + 0.0065 / q,
  wide: (q) => 1.48 + 0.245 * q + 0.214 / (q + 0.115),
};

/**
 * Squeezing force in N on the edges of the strip beside an eye that makes it `growth` mm longer along the strip.
 * Patches: half, one and two eye diameters. Fitted to plane-stress finite elements within 1.5 %; flat, no folding.
 */
export function squeezeForce(eye: Eye, growth: number, modulus: number, patch: Patch): number {
  const q = crowding(eye);
  return (growth * modulus * eye.thickness) / (Math.sqrt(q) * GROWTH[patch](q));
}

/** How much narrower the squeezed eye gets across the strip for each mm it grows along it (middle patch). */
export const narrowingOfSqueeze = ({ diameter, width }: Eye): number => 1.9 + 1.67 * (diameter / width) ** 2;

/** Largest hoop strain at the bore, beside the fingers, of an eye squeezed `growth` mm longer (middle patch). */
export const squeezeStrain = ({ diameter, width }: Eye, growth: number): number =>
  (growth / diameter) * (1 + 0.73 * (diameter / width));

/**
 * Force in N at which the squeezed strip folds out of flat: Euler column across the strip, as broad as the strip is
 * wide (the load spreads at 45 degrees, the eye takes its own breadth out), pinned at the fingers and held in the
 * middle between head and bundle, so of length b/2. Derived here.
 */
export const foldingForce = ({ width, thickness }: Eye, modulus: number): number =>
  (Math.PI ** 2 * modulus * thickness ** 3) / (3 * width);
