import type { Mesh } from '../mesh/mesh';

/** K u from the element stiffnesses (12 x 12, lower triangle), for residuals and prescribed displacements. */
export function multiply(mesh: Mesh, stiffness: Float64Array, u: Float64Array): Float64Array {
  const out = new Float64Array(2 * mesh.nodeCount);
  for (let element = 0; element < mesh.elementCount; element++) {
    const unknown = (k: number) => 2 * mesh.elements[6 * element + (k >> 1)]! + (k & 1);
    for (let i = 0; i < 12; i++) {
      for (let j = 0; j <= i; j++) {
        const k = stiffness[144 * element + 12 * i + j]!;
        out[unknown(i)]! += k * u[unknown(j)]!;
        if (i !== j) out[unknown(j)]! += k * u[unknown(i)]!;
      }
    }
  }
  return out;
}
