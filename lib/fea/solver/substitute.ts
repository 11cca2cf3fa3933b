import type { Factor } from './factor';
import type { Front } from './structure';

function forward({ unknowns, pivots, size, at }: Front, columns: Float64Array, x: Float64Array): void {
  for (let k = 0; k < pivots; k++) {
    const value = x[unknowns[k]!]!;
    if (value === 0) continue;
    const column = at + k * size;
    for (let i = k + 1; i < size; i++) x[unknowns[i]!]! -= columns[column + i]! * value;
  }
}

function backward(front: Front, columns: Float64Array, x: Float64Array, local: Float64Array): void {
  const { unknowns, pivots, size, at } = front;
  for (let i = 0; i < size; i++) local[i] = x[unknowns[i]!]!;
  for (let k = pivots - 1; k >= 0; k--) {
    const column = at + k * size;
    let value = local[k]!;
    for (let i = k + 1; i < size; i++) value -= columns[column + i]! * local[i]!;
    local[k] = value;
    x[unknowns[k]!] = value;
  }
}

/** Solution of K x = b for the factored K. Held unknowns keep their value in b, which should be zero. */
export function substitute({ structure, columns }: Factor, b: Float64Array): Float64Array {
  const { fronts, largestFront } = structure;
  const x = Float64Array.from(b);
  for (const front of fronts) forward(front, columns, x);
  for (const { unknowns, pivots, size, at } of fronts) {
    for (let k = 0; k < pivots; k++) x[unknowns[k]!]! /= columns[at + k * size + k]!;
  }
  const local = new Float64Array(largestFront);
  for (let number = fronts.length - 1; number >= 0; number--) backward(fronts[number]!, columns, x, local);
  return x;
}
