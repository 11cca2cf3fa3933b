import { gradientAt, greenStrain, type Kernel, loadElement } from '../element/kernel';
import { POINTS_PER_ELEMENT } from '../element/shape';

/** Four strains (11, 22, 2x12, 33) of a Gauss point from its displacement gradient; linear or Green-Lagrange. */
function pointStrain(gradient: Float64Array, finite: boolean, out: Float64Array): void {
  if (finite) {
    gradient[0]! += 1;
    gradient[3]! += 1;
    gradient[4]! += 1;
    greenStrain(gradient, out);
    return;
  }
  out[0] = gradient[0]!;
  out[1] = gradient[3]!;
  out[2] = gradient[1]! + gradient[2]!;
  out[3] = gradient[4]!;
}

/** Adds to each of the six nodes the plane through the three Gauss values of one strain component. */
function spreadToNodes(
  values: Float64Array,
  element: number,
  elements: Int32Array,
  sums: Float64Array,
): void {
  for (let c = 0; c < 4; c++) {
    const mean = (values[c]! + values[4 + c]! + values[8 + c]!) / 3;
    for (let k = 0; k < 3; k++) {
      const here = 2 * values[4 * k + c]! - mean;
      const next = 2 * values[4 * ((k + 1) % 3) + c]! - mean;
      sums[4 * elements[6 * element + k]! + c]! += here;
      sums[4 * elements[6 * element + 3 + k]! + c]! += (here + next) / 2;
    }
  }
}

/**
 * Strain at every node, four components each (11, 22, 2x12, 33): linear extrapolation from the Gauss points, mean
 * over the elements that meet there. Green-Lagrange when `finite`. For colouring the inside and as the second
 * opinion of the error estimate; less accurate at a surface than surfaceStrain.
 * Source: Hinton and Campbell, Int. J. Numer. Meth. Engrg. 8 (1974), local smoothing (from memory).
 */
export function nodalStrain(kernel: Kernel, u: Float64Array, finite: boolean): Float64Array {
  const { mesh, points, scratch } = kernel;
  const sums = new Float64Array(4 * mesh.nodeCount);
  const count = new Uint16Array(mesh.nodeCount);
  const gradient = new Float64Array(5);
  const values = new Float64Array(12);
  for (let element = 0; element < mesh.elementCount; element++) {
    loadElement(kernel, element, u, scratch.u);
    for (let p = 0; p < POINTS_PER_ELEMENT; p++) {
      gradientAt(points, POINTS_PER_ELEMENT * element + p, scratch.u, gradient);
      pointStrain(gradient, finite, scratch.strain);
      values.set(scratch.strain, 4 * p);
    }
    spreadToNodes(values, element, mesh.elements, sums);
    for (let k = 0; k < 6; k++) count[mesh.elements[6 * element + k]!]! += 1;
  }
  return sums.map((sum, i) => sum / count[i >> 2]!);
}

/** Engineering strain (stretch less 1) of a principal Green-Lagrange strain; the strain itself when linear. */
export const engineering = (strain: number, finite: boolean): number =>
  finite ? Math.sqrt(Math.max(0, 1 + 2 * strain)) - 1 : strain;

const largerOf = (a: number, b: number): number => (Math.abs(b) > Math.abs(a) ? b : a);

/** For each node the principal strain of largest size, with its sign: tension positive. */
export function dominantStrain(nodal: Float64Array, finite: boolean): Float32Array {
  return Float32Array.from({ length: nodal.length / 4 }, (_, node) => {
    const middle = (nodal[4 * node]! + nodal[4 * node + 1]!) / 2;
    const half = (nodal[4 * node]! - nodal[4 * node + 1]!) / 2;
    const radius = Math.sqrt(half * half + (nodal[4 * node + 2]! / 2) ** 2);
    const most = engineering(middle + radius, finite);
    const least = engineering(middle - radius, finite);
    return largerOf(largerOf(most, least), engineering(nodal[4 * node + 3]!, finite));
  });
}

/** Engineering strain at a node along a unit direction. */
export function strainAlong(
  nodal: Float64Array,
  node: number,
  [tx, ty]: readonly [number, number],
  finite: boolean,
): number {
  const [e11, e22, e12] = [nodal[4 * node]!, nodal[4 * node + 1]!, nodal[4 * node + 2]!];
  return engineering(e11 * tx * tx + e22 * ty * ty + e12 * tx * ty, finite);
}
