import type { Mesh } from '../mesh/mesh';
import type { Plane } from './plane';
import { GAUSS_POINTS, GAUSS_WEIGHT, POINTS_PER_ELEMENT, shapeSlopes, shapeValues } from './shape';

/** Width of the part out of the plane, mm, at a point of it. */
export type WidthAt = (x: number, y: number) => number;

/** What the elements need to know of their Gauss points, computed once per mesh. Point = 3 element + number. */
export interface GaussPoints {
  readonly plane: Plane;
  /** slopes of the shape functions, x then y for each of the six nodes: 12 per point, 1/mm */
  readonly slopes: Float64Array;
  /** volume of material that each point stands for, mm3 (axisymmetric: the whole turn) */
  readonly volume: Float64Array;
  /** 1 / radius per point, axisymmetric only; empty otherwise */
  readonly perRadius: Float64Array;
}

const SLOPES = GAUSS_POINTS.map(([a, b]) => Float64Array.from(shapeSlopes(a, b)));
export const POINT_VALUES = GAUSS_POINTS.map(([a, b]) => Float64Array.from(shapeValues(a, b)));

/** Position of a Gauss point. */
function place(mesh: Mesh, element: number, point: number): readonly [number, number] {
  const values = POINT_VALUES[point]!;
  let x = 0;
  let y = 0;
  for (let k = 0; k < 6; k++) {
    const node = mesh.elements[6 * element + k]!;
    x += values[k]! * mesh.nodes[2 * node]!;
    y += values[k]! * mesh.nodes[2 * node + 1]!;
  }
  return [x, y];
}

/** Writes the slopes at a Gauss point and returns the Jacobian, which is twice the area per reference area. */
function writeSlopes(mesh: Mesh, element: number, point: number, out: Float64Array, offset: number): number {
  const slopes = SLOPES[point]!;
  let xa = 0;
  let ya = 0;
  let xb = 0;
  let yb = 0;
  for (let k = 0; k < 6; k++) {
    const node = mesh.elements[6 * element + k]!;
    const x = mesh.nodes[2 * node]!;
    const y = mesh.nodes[2 * node + 1]!;
    xa += slopes[k]! * x;
    ya += slopes[k]! * y;
    xb += slopes[6 + k]! * x;
    yb += slopes[6 + k]! * y;
  }
  const jacobian = xa * yb - ya * xb;
  for (let k = 0; k < 6; k++) {
    out[offset + 2 * k] = (yb * slopes[k]! - ya * slopes[6 + k]!) / jacobian;
    out[offset + 2 * k + 1] = (xa * slopes[6 + k]! - xb * slopes[k]!) / jacobian;
  }
  return jacobian;
}

/**
 * Slopes, volumes and radii of all Gauss points; null when an element is folded (Jacobian not positive).
 * An axisymmetric profile must lie at positive x.
 */
export function gaussPoints(mesh: Mesh, plane: Plane, widthAt: WidthAt): GaussPoints | null {
  const count = POINTS_PER_ELEMENT * mesh.elementCount;
  const slopes = new Float64Array(12 * count);
  const volume = new Float64Array(count);
  const perRadius = new Float64Array(plane === 'axisymmetric' ? count : 0);
  for (let i = 0; i < count; i++) {
    const element = Math.floor(i / POINTS_PER_ELEMENT);
    const point = i % POINTS_PER_ELEMENT;
    const jacobian = writeSlopes(mesh, element, point, slopes, 12 * i);
    if (!(jacobian > 0)) return null;
    const [x, y] = place(mesh, element, point);
    const depth = plane === 'axisymmetric' ? 2 * Math.PI * x : widthAt(x, y);
    if (!(depth > 0)) return null;
    volume[i] = jacobian * GAUSS_WEIGHT * depth;
    if (plane === 'axisymmetric') perRadius[i] = 1 / x;
  }
  return { plane, slopes, volume, perRadius };
}
