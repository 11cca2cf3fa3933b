import type { Mesh } from '../mesh/mesh';
import type { Plane } from './plane';
import { edgeSlopes, edgeValues } from './shape';

const ROOT = Math.sqrt(0.6);
/** Three-point Gauss rule on an edge: place from -1 to 1, weight. */
const RULE: readonly (readonly [number, number])[] = [
  [-ROOT, 5 / 9],
  [0, 8 / 9],
  [ROOT, 5 / 9],
];

/** Traction at a point of an edge, per mm2 of surface. */
export type Traction = (x: number, y: number) => readonly [number, number];

/** Numbers of the boundary edges with the tag. */
export function edgesWith(mesh: Mesh, tag: string): number[] {
  return Array.from({ length: mesh.edgeCount }, (_, e) => e).filter(
    (e) => mesh.tags[mesh.edges[4 * e + 3]!] === tag,
  );
}

interface EdgePoint {
  readonly x: number;
  readonly y: number;
  /** length that the point stands for, mm */
  readonly length: number;
}

function edgePoint(mesh: Mesh, edge: number, s: number, weight: number): EdgePoint {
  const values = edgeValues(s);
  const slopes = edgeSlopes(s);
  let [x, y, dx, dy] = [0, 0, 0, 0];
  for (let k = 0; k < 3; k++) {
    const node = mesh.edges[4 * edge + k]!;
    x += values[k]! * mesh.nodes[2 * node]!;
    y += values[k]! * mesh.nodes[2 * node + 1]!;
    dx += slopes[k]! * mesh.nodes[2 * node]!;
    dy += slopes[k]! * mesh.nodes[2 * node + 1]!;
  }
  return { x, y, length: Math.sqrt(dx * dx + dy * dy) * weight };
}

/** Adds the consistent nodal forces of a traction on the given edges, per mm of width (axisymmetric: whole turn). */
export function addTraction(
  mesh: Mesh,
  plane: Plane,
  edges: readonly number[],
  traction: Traction,
  into: Float64Array,
): void {
  for (const edge of edges) {
    for (const [s, weight] of RULE) {
      const { x, y, length } = edgePoint(mesh, edge, s, weight);
      const size = plane === 'axisymmetric' ? length * 2 * Math.PI * x : length;
      const [tx, ty] = traction(x, y);
      const values = edgeValues(s);
      for (let k = 0; k < 3; k++) {
        const node = mesh.edges[4 * edge + k]!;
        into[2 * node]! += values[k]! * tx * size;
        into[2 * node + 1]! += values[k]! * ty * size;
      }
    }
  }
}

/**
 * Weights that give the mean displacement of the tagged edges along a direction. As a load the same vector is a
 * force of 1 N spread evenly over them, so force and displacement belong together in the sense of work.
 */
export function meanDisplacement(
  mesh: Mesh,
  plane: Plane,
  tag: string,
  direction: readonly [number, number],
): Float64Array {
  const weights = new Float64Array(2 * mesh.nodeCount);
  addTraction(mesh, plane, edgesWith(mesh, tag), () => direction, weights);
  const measure = new Float64Array(2 * mesh.nodeCount);
  addTraction(mesh, plane, edgesWith(mesh, tag), () => [1, 0], measure);
  const whole = measure.reduce((sum, part) => sum + part, 0);
  return weights.map((weight) => weight / whole);
}
