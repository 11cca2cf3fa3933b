import { edgesWith } from '../element/edge-load';
import type { Plane } from '../element/plane';
import { edgeSlopes } from '../element/shape';
import type { Mesh } from '../mesh/mesh';

/** Places of the two Gauss points of an edge, where the strain of a quadratic element is most accurate. */
const BARLOW = 1 / Math.sqrt(3);

/** Change of length of an edge at s, as a fraction: the stretch less 1, or its linear part. */
function stretchAt(mesh: Mesh, edge: number, s: number, u: Float64Array, finite: boolean): number {
  const slopes = edgeSlopes(s);
  let x = 0;
  let y = 0;
  let ux = 0;
  let uy = 0;
  for (let k = 0; k < 3; k++) {
    const node = mesh.edges[4 * edge + k]!;
    x += slopes[k]! * mesh.nodes[2 * node]!;
    y += slopes[k]! * mesh.nodes[2 * node + 1]!;
    ux += slopes[k]! * u[2 * node]!;
    uy += slopes[k]! * u[2 * node + 1]!;
  }
  const square = x * x + y * y;
  if (!finite) return (x * ux + y * uy) / square;
  return Math.sqrt(((x + ux) ** 2 + (y + uy) ** 2) / square) - 1;
}

/** Strain on the surface at nodes, and the direction of the surface there. NaN where it was not asked for. */
export interface SurfaceStrain {
  /** along the surface, as a fraction, tension positive */
  readonly along: Float64Array;
  /** round the axis, axisymmetric only; otherwise zero */
  readonly round: Float64Array;
  /** unit tangent, xy per node */
  readonly tangent: Float64Array;
}

/**
 * Strain along the edges with the given tags: the stretch of each edge at its two Gauss points, carried linearly to
 * its three nodes, the mean of two edges where they meet. At a free surface it is the principal strain that matters.
 * Method: superconvergent points (Barlow, Int. J. Numer. Meth. Engrg. 10, 1976), from memory. Converges faster than
 * strain extrapolated from inside, and moves little when the mesh changes.
 */
export function surfaceStrain(
  mesh: Mesh,
  plane: Plane,
  tags: readonly string[],
  u: Float64Array,
  finite: boolean,
): SurfaceStrain {
  const along = new Float64Array(mesh.nodeCount).fill(Number.NaN);
  const tangent = new Float64Array(2 * mesh.nodeCount);
  const count = new Uint8Array(mesh.nodeCount);
  for (const edge of tags.flatMap((tag) => edgesWith(mesh, tag))) {
    const before = stretchAt(mesh, edge, -BARLOW, u, finite);
    const after = stretchAt(mesh, edge, BARLOW, u, finite);
    const middle = (before + after) / 2;
    const slope = (after - before) / (2 * BARLOW);
    [-1, 0, 1].forEach((s, k) => {
      const node = mesh.edges[4 * edge + k]!;
      const sum = count[node] ? along[node]! : 0;
      along[node] = sum + middle + slope * s;
      count[node]! += 1;
      addTangent(mesh, edge, s, node, tangent);
    });
  }
  for (let node = 0; node < mesh.nodeCount; node++) if (count[node]) along[node]! /= count[node]!;
  return { along, round: roundStrain(mesh, plane, u), tangent: unitVectors(tangent) };
}

function addTangent(mesh: Mesh, edge: number, s: number, node: number, into: Float64Array): void {
  const slopes = edgeSlopes(s);
  for (let k = 0; k < 3; k++) {
    const at = mesh.edges[4 * edge + k]!;
    into[2 * node]! += slopes[k]! * mesh.nodes[2 * at]!;
    into[2 * node + 1]! += slopes[k]! * mesh.nodes[2 * at + 1]!;
  }
}

function unitVectors(xy: Float64Array): Float64Array {
  return xy.map((value, i) => {
    const other = xy[i ^ 1]!;
    const length = Math.sqrt(value * value + other * other);
    return length > 0 ? value / length : 0;
  });
}

function roundStrain(mesh: Mesh, plane: Plane, u: Float64Array): Float64Array {
  const round = new Float64Array(mesh.nodeCount);
  if (plane !== 'axisymmetric') return round;
  return round.map((_, node) => (mesh.nodes[2 * node]! > 0 ? u[2 * node]! / mesh.nodes[2 * node]! : 0));
}
