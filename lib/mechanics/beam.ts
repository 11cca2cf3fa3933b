/**
 * Cantilever arm of rectangular section whose thickness and width run in straight lines from root to tip,
 * after the design guides: rigid root, small deflection, no fillet.
 *
 * x is measured from the root, mm; the transverse force acts at x = length. Strain is positive in tension.
 * Source: Snap-Fit Joints for Plastics - A Design Guide (as quoted), Table 1; other tapers by integration.
 */
export interface Arm {
  /** root to the point where the catch is pushed, mm */
  readonly length: number;
  /** in the direction of bending, mm */
  readonly rootThickness: number;
  readonly tipThickness: number;
  readonly rootWidth: number;
  readonly tipWidth: number;
}

const between = (root: number, tip: number, share: number) => root + (tip - root) * share;

export const thicknessAt = (arm: Arm, x: number): number =>
  between(arm.rootThickness, arm.tipThickness, x / arm.length);

export const widthAt = (arm: Arm, x: number): number => between(arm.rootWidth, arm.tipWidth, x / arm.length);

/** Second moment of area at x, mm4. */
export const inertiaAt = (arm: Arm, x: number): number => (widthAt(arm, x) * thicknessAt(arm, x) ** 3) / 12;

/** Outer-fibre strain at x for a moment (N mm) over modulus (MPa): M c / (E I), with M/E in mm3. */
export const fibreStrain = (arm: Arm, x: number, momentPerModulus: number): number =>
  (6 * momentPerModulus) / (widthAt(arm, x) * thicknessAt(arm, x) ** 2);

export const thicknessRatio = (arm: Arm): number => arm.tipThickness / arm.rootThickness;
export const widthRatio = (arm: Arm): number => arm.tipWidth / arm.rootWidth;

const PANELS = 64;

/**
 * C in y = C eps l^2 / h, for tip fractions k of thickness and q of width, eps at the root:
 * C = 2 Int_0^1 u^2 / [(q + (1-q) u) (k + (1-k) u)^3] du, u from tip to root, by Simpson's rule.
 * 2/3 for a constant section, 1.0904 for k = 1/2, 0.8552 for q = 1/4 (printed as 0.67, 1.09, 0.86).
 * Valid for k, q >= 0.1. Source: the guide's Table 1; derived here for other tapers.
 */
export function undercutCoefficient(k: number, q: number): number {
  const at = (u: number) => u ** 2 / ((q + (1 - q) * u) * (k + (1 - k) * u) ** 3);
  let sum = at(0) + at(1);
  for (let i = 1; i < PANELS; i += 1) sum += (i % 2 === 1 ? 4 : 2) * at(i / PANELS);
  return (2 * sum) / (3 * PANELS);
}

export interface StrainPeak {
  /** distance from the tip over the arm length; 1 is the root */
  readonly fromTip: number;
  /** highest strain over root strain */
  readonly factor: number;
}

/**
 * Where along the arm the outer-fibre strain u / [(q + (1-q) u) (k + (1-k) u)^2] is highest: at the root unless
 * q < 2 (1-k), else where 2 (1-k)(1-q) u^2 + q (1-k) u = q k. At constant width u = k/(1-k), factor 1/(4k(1-k)).
 * Derived here.
 */
export function strainPeak(k: number, q: number): StrainPeak {
  if (q >= 2 * (1 - k)) return { fromTip: 1, factor: 1 };
  const a = 2 * (1 - k) * (1 - q);
  const b = q * (1 - k);
  const fromTip = (2 * q * k) / (b + Math.sqrt(b * b + 4 * a * q * k));
  const factor = fromTip / ((q + (1 - q) * fromTip) * (k + (1 - k) * fromTip) ** 2);
  return { fromTip, factor };
}

const coefficientOf = (arm: Arm) => undercutCoefficient(thicknessRatio(arm), widthRatio(arm));

/** Strain at the root for a tip deflection y in mm: eps = y h / (C l^2). */
export const guideRootStrain = (arm: Arm, deflection: number): number =>
  (deflection * arm.rootThickness) / (coefficientOf(arm) * arm.length ** 2);

/** Highest nominal strain on the arm for a tip deflection in mm, wherever along the arm it falls. */
export const guideStrain = (arm: Arm, deflection: number): number =>
  guideRootStrain(arm, deflection) * strainPeak(thicknessRatio(arm), widthRatio(arm)).factor;

/** Tip deflection in mm at which the highest nominal strain reaches `strain`. */
export const guideUndercut = (arm: Arm, strain: number): number => strain / guideStrain(arm, 1);

/** Deflection force in N: P = (b h^2 / 6) Es eps / l with root section, root strain and secant modulus in MPa. */
export const guideForce = (arm: Arm, rootStrain: number, secantModulus: number): number =>
  ((arm.rootWidth * arm.rootThickness ** 2) / 6) * ((secantModulus * rootStrain) / arm.length);
