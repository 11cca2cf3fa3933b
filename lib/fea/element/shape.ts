/**
 * Six-node triangle in area coordinates a, b (third: 1 - a - b). Node order as in Mesh.
 * Three-point Gauss rule at the interior points: exact to degree 2, and the element stays of full rank.
 * Source: Zienkiewicz and Taylor, The Finite Element Method (from memory).
 */
export const POINTS_PER_ELEMENT = 3;

export const GAUSS_POINTS: readonly (readonly [number, number])[] = [
  [1 / 6, 1 / 6],
  [2 / 3, 1 / 6],
  [1 / 6, 2 / 3],
];

/** Weight of each point on the reference triangle of area 1/2. */
export const GAUSS_WEIGHT = 1 / 6;

/** Values of the six shape functions. */
export function shapeValues(a: number, b: number): readonly number[] {
  const c = 1 - a - b;
  return [c * (2 * c - 1), a * (2 * a - 1), b * (2 * b - 1), 4 * c * a, 4 * a * b, 4 * b * c];
}

/** Derivatives of the six shape functions: six with respect to a, then six to b. */
export function shapeSlopes(a: number, b: number): readonly number[] {
  const c = 1 - a - b;
  return [
    1 - 4 * c,
    4 * a - 1,
    0,
    4 * (c - a),
    4 * b,
    -4 * b,
    1 - 4 * c,
    0,
    4 * b - 1,
    -4 * a,
    4 * a,
    4 * (c - b),
  ];
}

/** Values of the three functions of an edge (start, middle, end) at s from -1 to 1. */
export const edgeValues = (s: number): readonly [number, number, number] => [
  (s * (s - 1)) / 2,
  1 - s * s,
  (s * (s + 1)) / 2,
];

export const edgeSlopes = (s: number): readonly [number, number, number] => [s - 0.5, -2 * s, s + 0.5];
