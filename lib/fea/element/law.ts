import type { Plane } from './plane';

/**
 * Second Piola-Kirchhoff stress (11, 22, 12, 33; MPa) and tangent modulus dS/dE, 4 x 4 by rows, at one point.
 * Outside the axisymmetric case the components of row and column 33 are not used.
 */
export interface Response {
  readonly stress: Float64Array;
  readonly tangent: Float64Array;
}

/** Elastic law. `strain` is Green-Lagrange: E11, E22, 2 E12, E33. */
export interface Law {
  readonly plane: Plane;
  /** true where the tangent does not depend on the strain */
  readonly constant: boolean;
  respond(strain: Float64Array, out: Response): void;
}

export const newResponse = (): Response => ({
  stress: new Float64Array(4),
  tangent: new Float64Array(16),
});

/** Isotropic constants: modulus of elasticity in MPa, Poisson's ratio above -1 and under 0.5. */
export interface Isotropic {
  readonly modulus: number;
  readonly poisson: number;
}

/** Static condensation of the 33 component, for which the stress is zero: D - D_a3 D_3b / D_33. */
export function condenseThrough(tangent: Float64Array): void {
  for (let a = 0; a < 3; a++) {
    for (let b = 0; b < 3; b++) {
      tangent[4 * a + b]! -= (tangent[4 * a + 3]! * tangent[12 + b]!) / tangent[15]!;
    }
  }
}

/** S = D E with a constant 4 x 4 stiffness of the solid; condensed for plane stress. */
export function linearLaw(solid: Float64Array, plane: Plane): Law {
  const stiffness = Float64Array.from(solid);
  if (plane === 'plane-stress') condenseThrough(stiffness);
  const count = plane === 'axisymmetric' ? 4 : 3;
  return {
    plane,
    constant: true,
    respond(strain, out) {
      out.tangent.set(stiffness);
      for (let a = 0; a < count; a++) {
        let sum = 0;
        for (let b = 0; b < count; b++) sum += stiffness[4 * a + b]! * strain[b]!;
        out.stress[a] = sum;
      }
    },
  };
}

/** Stiffness of an isotropic solid for 11, 22, 12 (engineering shear), 33. */
export function isotropicStiffness({ modulus, poisson }: Isotropic): Float64Array {
  const shear = modulus / (2 * (1 + poisson));
  const lame = (modulus * poisson) / ((1 + poisson) * (1 - 2 * poisson));
  const direct = lame + 2 * shear;
  return Float64Array.of(
    ...[direct, lame, 0, lame],
    ...[lame, direct, 0, lame],
    ...[0, 0, shear, 0],
    ...[lame, lame, 0, direct],
  );
}

/**
 * St-Venant-Kirchhoff: linear between Green-Lagrange strain and second Piola-Kirchhoff stress; at small strain
 * Hooke's law. Limit: reads tension low, 2 % at 5 % strain, and fails in strong compression.
 * Source: Bonet and Wood, Nonlinear Continuum Mechanics for Finite Element Analysis (from memory).
 */
export const stVenant = (material: Isotropic, plane: Plane): Law =>
  linearLaw(isotropicStiffness(material), plane);
