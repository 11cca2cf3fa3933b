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
  /** half the difference between the two edges that meet at a node, 0 where only one is searched */
  readonly jump: Float64Array;
  /** numbers of the searched edges */
  readonly edges: readonly number[];
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
  const edges = tags.flatMap((tag) => edgesWith(mesh, tag));
  const first = new Float64Array(mesh.nodeCount).fill(Number.NaN);
  const second = new Float64Array(mesh.nodeCount).fill(Number.NaN);
  const tangent = new Float64Array(2 * mesh.nodeCount);
  for (const edge of edges) {
    const before = stretchAt(mesh, edge, -BARLOW, u, finite);
    const after = stretchAt(mesh, edge, BARLOW, u, finite);
    const slope = (after - before) / (2 * BARLOW);
    for (let k = 0; k < 3; k++) {
      const node = mesh.edges[4 * edge + k]!;
      const here = (before + after) / 2 + slope * (k - 1);
      (Number.isNaN(first[node]!) ? first : second)[node] = here;
      addTangent(mesh, edge, k - 1, node, tangent);
    }
  }
  const both = (node: number) => !Number.isNaN(second[node]!);
  return {
    along: first.map((one, node) => (both(node) ? (one + second[node]!) / 2 : one)),
    jump: first.map((one, node) => (both(node) ? Math.abs(one - second[node]!) / 2 : 0)),
    round: roundStrain(mesh, plane, u),
    tangent: unitVectors(tangent),
    edges,
  };
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
