import { eliminate } from './eliminate';
import { type Child, type Front, remainderSize, type Structure } from './structure';

/** LDL^T of a structure's matrix: for each front its eliminated columns, D on their diagonal. */
export interface Factor {
  readonly structure: Structure;
  readonly columns: Float64Array;
  /** pivots that are not positive */
  readonly notPositive: number;
}

/** Arrays that every factorisation of a structure writes again. A factor is valid until the next one. */
export interface Workspace {
  readonly columns: Float64Array;
  readonly block: Float64Array;
  readonly stack: Float64Array;
}

export const newWorkspace = (structure: Structure): Workspace => ({
  columns: new Float64Array(structure.factorSize),
  block: new Float64Array(structure.largestFront ** 2),
  stack: new Float64Array(structure.stackSize),
});

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

/** Adds what a front below passed up: its Schur complement, packed by columns from `at` on. */
function addChild(
  { places }: Child,
  stack: Float64Array,
  at: number,
  size: number,
  block: Float64Array,
): void {
  let next = at;
  for (let j = 0; j < places.length; j++) {
    const column = places[j]!;
    for (let i = j; i < places.length; i++, next++) {
      const row = places[i]!;
      block[row >= column ? column * size + row : row * size + column]! += stack[next]!;
    }
  }
}

/** Copies the lower triangle behind the pivots, packed by columns. Returns where the copy ends. */
function packRemainder(
  block: Float64Array,
  { size, pivots }: Front,
  stack: Float64Array,
  at: number,
): number {
  let next = at;
  for (let j = pivots; j < size; j++) {
    for (let i = j; i < size; i++) stack[next++] = block[j * size + i]!;
  }
  return next;
}

/** Gathers the two fronts below, the last pushed first. Returns the stack's new height. */
function gather(fronts: readonly Front[], front: Front, { stack, block }: Workspace, height: number): number {
  let top = height;
  for (let c = front.children.length - 1; c >= 0; c--) {
    const child = front.children[c]!;
    top -= remainderSize(fronts[child.front]!);
    addChild(child, stack, top, front.size, block);
  }
  return top;
}

/**
 * Factor of the matrix made of the element stiffnesses, without ever assembling it: each front gathers its elements
 * or the remainders of the two fronts below, eliminates its own unknowns and passes the rest up.
 * Method: element multifrontal LDL^T (Duff and Reid, ACM Trans. Math. Softw. 9, 1983), from memory.
 */
export function factorise(
  structure: Structure,
  stiffness: Float64Array,
  workspace = newWorkspace(structure),
): Factor {
  const { fronts, places } = structure;
  const { block, columns, stack } = workspace;
  let notPositive = 0;
  let height = 0;
  for (const front of fronts) {
    const { size, pivots, at } = front;
    block.fill(0, 0, size * size);
    addElements(front, places, stiffness, block);
    height = gather(fronts, front, workspace, height);
    notPositive += eliminate(block, size, pivots);
    columns.set(block.subarray(0, size * pivots), at);
    height = packRemainder(block, front, stack, height);
  }
  return { structure, columns, notPositive };
}

/**
 * Smallest pivot over the largest; negative or near the round-off of the machine (1e-16 times the size) where the
 * matrix is indefinite or singular, as for a part that nothing holds.
 */
export function pivotRatio({ structure, columns }: Factor): number {
  let smallest = Infinity;
  let largest = 0;
  for (const { pivots, size, at } of structure.fronts) {
    for (let k = 0; k < pivots; k++) {
      const pivot = columns[at + k * size + k]!;
      smallest = Math.min(smallest, pivot);
      largest = Math.max(largest, pivot);
    }
  }
  return smallest / largest;
}
