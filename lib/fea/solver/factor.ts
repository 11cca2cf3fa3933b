import { eliminate } from './eliminate';
import type { Child, Front, Structure } from './structure';

/** LDL^T of a structure's matrix: for each front its eliminated columns, D on their diagonal. */
export interface Factor {
  readonly structure: Structure;
  readonly columns: Float64Array;
  /** pivots that are not positive */
  readonly notPositive: number;
}

export const newColumns = (structure: Structure): Float64Array => new Float64Array(structure.factorSize);

/** Adds the element stiffnesses (12 x 12, lower triangle) of a leaf. */
function addElements(front: Front, places: Int32Array, stiffness: Float64Array, block: Float64Array): void {
  const { size } = front;
  for (const element of front.elements) {
    for (let i = 0; i < 12; i++) {
      const row = places[12 * element + i]!;
      if (row < 0) continue;
      for (let j = 0; j <= i; j++) {
        const column = places[12 * element + j]!;
        if (column < 0) continue;
        const at = row >= column ? column * size + row : row * size + column;
        block[at]! += stiffness[144 * element + 12 * i + j]!;
      }
    }
  }
}

/** Adds what a front below passed up: its Schur complement, packed by columns. */
function addChild({ places }: Child, schur: Float64Array, size: number, block: Float64Array): void {
  let at = 0;
  for (let j = 0; j < places.length; j++) {
    const column = places[j]!;
    for (let i = j; i < places.length; i++, at++) {
      const row = places[i]!;
      block[row >= column ? column * size + row : row * size + column]! += schur[at]!;
    }
  }
}

/** Copies the lower triangle behind the pivots, packed by columns. */
function packSchur(block: Float64Array, { size, pivots }: Front): Float64Array {
  const rest = size - pivots;
  const packed = new Float64Array((rest * (rest + 1)) / 2);
  let at = 0;
  for (let j = pivots; j < size; j++) {
    packed.set(block.subarray(j * size + j, (j + 1) * size), at);
    at += size - j;
  }
  return packed;
}

/**
 * Factor of the matrix made of the element stiffnesses, without ever assembling it: each front gathers its elements
 * or the remainders of the two fronts below, eliminates its own unknowns and passes the rest up.
 * Method: element multifrontal LDL^T (Duff and Reid, ACM Trans. Math. Softw. 9, 1983), from memory.
 * `columns` may be given to be written again.
 */
export function factorise(
  structure: Structure,
  stiffness: Float64Array,
  columns = newColumns(structure),
): Factor {
  const { fronts, largestFront, places } = structure;
  const block = new Float64Array(largestFront * largestFront);
  const waiting = new Map<number, Float64Array>();
  let notPositive = 0;
  fronts.forEach((front, number) => {
    const { size, pivots, at } = front;
    block.fill(0, 0, size * size);
    addElements(front, places, stiffness, block);
    for (const child of front.children) {
      addChild(child, waiting.get(child.front)!, size, block);
      waiting.delete(child.front);
    }
    notPositive += eliminate(block, size, pivots);
    columns.set(block.subarray(0, size * pivots), at);
    waiting.set(number, packSchur(block, front));
  });
  return { structure, columns, notPositive };
}
