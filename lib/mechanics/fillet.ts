/**
 * Root fillets: how far they raise the strain locally and how far they stiffen the arm. R radius, h arm thickness.
 */

/**
 * Peak over nominal strain at the end of the fillet, 1 + 0.173 (R/h)^-0.766; the nominal strain is taken at the
 * fillet's tangent point. Valid 0.1 <= R/h <= 1, arm on a block or wall. Fitted to finite elements, within 1.5 %.
 */
export const filletConcentration = (ratio: number): number => 1 + 0.1732 * ratio ** -0.7656;

/**
 * Arms that narrow from root to tip load the middle of their root: strain there over that of an even arm, 1 + 0.3 m^2
 * for sides that close in by m on each side per unit of length. With a root fillet, m up to 0.3; fitted, within 2 %.
 */
export const narrowingAtFillet = (slope: number): number => 1 + 0.3 * slope ** 2;

/** The arm bends as one that begins this share of R above the surface it stands on. Fitted, R/h 0.1 to 1. */
export const FILLET_STIFFENING = 0.65;

const ROARK_BLUNT = [
  [1.007, 1.0, -0.031],
  [-0.27, -2.404, 0.749],
  [0.677, 1.133, -0.904],
  [-0.414, 0.271, 0.186],
] as const;
const ROARK_SHARP = [
  [1.042, 0.982, -0.036],
  [-3.599, 1.619, -0.431],
  [6.084, -5.607, 1.158],
  [-2.527, 3.006, -0.691],
] as const;

/**
 * Kt of a flat bar with a square shoulder and fillet in in-plane bending, nominal stress in the narrow part `h`;
 * `shoulder` is the step on each side. Valid 0.1 <= shoulder/R <= 20.
 * Source: Roark's Formulas for Stress and Strain, Table 17.1.
 */
export function shoulderConcentration(h: number, shoulder: number, radius: number): number {
  const q = shoulder / radius;
  const x = (2 * shoulder) / (h + 2 * shoulder);
  const table = q <= 2 ? ROARK_BLUNT : ROARK_SHARP;
  return table.reduce((sum, [a, b, c], power) => sum + (a + b * Math.sqrt(q) + c * q) * x ** power, 0);
}
