import { deform, gradientAt, type Kernel, loadElement } from './kernel';
import { POINTS_PER_ELEMENT } from './shape';

/**
 * Stress of the mixed-point iteration: S(E(u)) + D (B(u) du) at every Gauss point, four numbers each, into `mixed`.
 * Taken in the geometric stiffness of the next iteration it lets Newton's method take steps several times larger,
 * because the stress then follows the linearised path instead of the strongly curved strain.
 * Source: Magisano, Leonetti, Garcea, Comput. Methods Appl. Mech. Engrg. 313 (2017) (from memory).
 */
export function updateMixedStress(
  kernel: Kernel,
  u: Float64Array,
  du: Float64Array,
  mixed: Float64Array,
): void {
  const { mesh, points, law, scratch } = kernel;
  const change = new Float64Array(12);
  const gradient = new Float64Array(5);
  const rate = new Float64Array(4);
  for (let point = 0; point < POINTS_PER_ELEMENT * mesh.elementCount; point++) {
    if (point % POINTS_PER_ELEMENT === 0) {
      const element = point / POINTS_PER_ELEMENT;
      loadElement(kernel, element, u, scratch.u);
      loadElement(kernel, element, du, change);
    }
    deform(kernel, point);
    law.respond(scratch.strain, scratch.response);
    gradientAt(points, point, change, gradient);
    strainRate(scratch.f, gradient, rate);
    const { stress, tangent } = scratch.response;
    for (let a = 0; a < 4; a++) {
      let sum = stress[a]!;
      for (let b = 0; b < 4; b++) sum += tangent[4 * a + b]! * rate[b]!;
      mixed[4 * point + a] = sum;
    }
  }
}

/** Linearised change of Green-Lagrange strain: sym(F^T grad du), shear doubled; 33 is zero in the plane. */
function strainRate(f: Float64Array, g: Float64Array, out: Float64Array): void {
  const f11 = f[0]!;
  const f12 = f[1]!;
  const f21 = f[2]!;
  const f22 = f[3]!;
  const f33 = f[4]!;
  const g11 = g[0]!;
  const g12 = g[1]!;
  const g21 = g[2]!;
  const g22 = g[3]!;
  out[0] = f11 * g11 + f21 * g21;
  out[1] = f12 * g12 + f22 * g22;
  out[2] = f11 * g12 + f12 * g11 + f21 * g22 + f22 * g21;
  out[3] = f33 * g[4]!;
}
