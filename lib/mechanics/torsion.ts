/**
 * Torsion of prismatic bars, Saint-Venant, with the stiffening of ends whose warping is held.
 *
 * Rectangle a >= b (series of Saint-Venant; Timoshenko & Goodier, Theory of Elasticity, from memory):
 *   J = a b^3 [1/3 - (64/pi^5) (b/a) sum_odd tanh(n pi a / (2 b)) / n^5]
 *   gamma_max = theta' b [1 - (8/pi^2) sum_odd 1 / (n^2 cosh(n pi a / (2 b)))], at the middle of the long side.
 * Round bar radius r: J = pi r^4 / 2, gamma_max = theta' r.
 * Held ends: the bar acts as if shorter, Leff = L - a 0.473 (1 - 1/(1 + (a / (2.165 b))^3.07)) (fit of finite elements,
 * torque within 1 %, shear strain within 3 % for L >= 2 a; at L = 1.3 a it comes out 13 % high, on the safe side).
 * Allowable shear strain from a tensile one: gamma = (1 + nu) eps (Snap-Fit Joints for Plastics - A Design Guide, as quoted).
 * Lengths mm, angles rad, moduli MPa, torque N mm.
 */

export type BarSection =
  | { readonly shape: 'round'; readonly diameter: number }
  | { readonly shape: 'rectangular'; readonly width: number; readonly thickness: number };

const ODD = [1, 3, 5, 7, 9, 11, 13, 15, 17, 19];

const sides = (section: { width: number; thickness: number }): { a: number; b: number } => ({
  a: Math.max(section.width, section.thickness),
  b: Math.min(section.width, section.thickness),
});

/** Torsion constant J, mm4. */
export function torsionConstant(section: BarSection): number {
  if (section.shape === 'round') return (Math.PI * (section.diameter / 2) ** 4) / 2;
  const { a, b } = sides(section);
  const sum = ODD.reduce((total, n) => total + Math.tanh((n * Math.PI * a) / (2 * b)) / n ** 5, 0);
  return a * b ** 3 * (1 / 3 - (64 / Math.PI ** 5) * (b / a) * sum);
}

/** Largest shear strain per twist rate (rad/mm), mm. */
export function shearPerRate(section: BarSection): number {
  if (section.shape === 'round') return section.diameter / 2;
  const { a, b } = sides(section);
  const sum = ODD.reduce((total, n) => total + 1 / (n ** 2 * Math.cosh((n * Math.PI * a) / (2 * b))), 0);
  return b * (1 - (8 / Math.PI ** 2) * sum);
}

/** Length the held ends take out of the twist, mm; round sections do not warp. */
function heldLength(section: BarSection): number {
  if (section.shape === 'round') return 0;
  const { a, b } = sides(section);
  return a * 0.473 * (1 - 1 / (1 + (a / (2.165 * b)) ** 3.07));
}

/** Length that twists when both ends are built in, mm. */
export const twistingLength = (section: BarSection, length: number): number => length - heldLength(section);

/** Share of the full twist rate reached at mid-length of a bar with held ends, 1 - 1/cosh(L / held length) (Vlasov). */
function middleShare(section: BarSection, length: number): number {
  const held = heldLength(section);
  return held === 0 ? 1 : 1 - 1 / Math.cosh(length / held);
}

export interface Twist {
  /** torque of one bar, N mm */
  readonly torque: number;
  /** largest shear strain */
  readonly shear: number;
}

/** One bar twisted by an angle; `ends` held is the built-in bar, free the handbook's. */
export function twistBar(
  section: BarSection,
  length: number,
  angle: number,
  shearModulus: number,
  ends: 'held' | 'free',
): Twist {
  const held = ends === 'held';
  const rate = angle / (held ? twistingLength(section, length) : length);
  const share = held ? middleShare(section, length) : 1;
  return {
    torque: shearModulus * torsionConstant(section) * rate,
    shear: shearPerRate(section) * rate * share,
  };
}

export const shearModulus = (modulus: number, poisson: number): number => modulus / (2 * (1 + poisson));

/** Tensile strain that stands for a shear strain, eps = gamma / (1 + nu). */
export const equivalentStrain = (shear: number, poisson: number): number => shear / (1 + poisson);
