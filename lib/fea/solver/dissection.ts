import type { Mesh } from '../mesh/mesh';

/** A part of the mesh: elements order[first .. last), halved into `left` and `right`, or a leaf (-1). */
export interface Part {
  readonly first: number;
  readonly last: number;
  readonly left: number;
  readonly right: number;
}

/** Elements in dissection order and the parts, children before parents, the whole last. */
export interface Dissection {
  readonly order: Int32Array;
  readonly parts: readonly Part[];
}

/** Most elements of a leaf, which is assembled in one dense block. */
const LEAF = 10;
/** From this many leaves on both cuts are tried and the one that severs fewer nodes is taken. */
const WORTH_TWO_CUTS = 4 * LEAF;

interface Work {
  readonly elements: Int32Array;
  readonly order: Int32Array;
  readonly x: Float64Array;
  readonly y: Float64Array;
  /** last mark seen at each node, for counting severed nodes */
  readonly mark: Int32Array;
  marks: number;
  readonly parts: Part[];
}

/** Rearranges order[first .. last) so that element `middle` is in its sorted place by key (Hoare's selection). */
function select(order: Int32Array, key: Float64Array, first: number, last: number, middle: number): void {
  let low = first;
  let high = last - 1;
  while (low < high) {
    const pivot = key[order[(low + high) >> 1]!]!;
    let i = low;
    let j = high;
    while (i <= j) {
      while (key[order[i]!]! < pivot) i++;
      while (key[order[j]!]! > pivot) j--;
      if (i > j) break;
      const kept = order[i]!;
      order[i++] = order[j]!;
      order[j--] = kept;
    }
    if (middle <= j) high = j;
    else if (middle >= i) low = i;
    else return;
  }
}

/** Nodes shared by the elements before and after `middle`. */
function severed(work: Work, first: number, middle: number, last: number): number {
  const { elements, order, mark } = work;
  const [before, counted] = [work.marks + 1, work.marks + 2];
  work.marks += 2;
  for (let i = 6 * first; i < 6 * middle; i++) mark[nodeAt(elements, order, i)] = before;
  let count = 0;
  for (let i = 6 * middle; i < 6 * last; i++) {
    const node = nodeAt(elements, order, i);
    if (mark[node] !== before) continue;
    mark[node] = counted;
    count++;
  }
  return count;
}

const nodeAt = (elements: Int32Array, order: Int32Array, i: number): number =>
  elements[6 * order[Math.floor(i / 6)]! + (i % 6)]!;

function spread(order: Int32Array, key: Float64Array, first: number, last: number): number {
  let low = Infinity;
  let high = -Infinity;
  for (let i = first; i < last; i++) {
    const value = key[order[i]!]!;
    if (value < low) low = value;
    if (value > high) high = value;
  }
  return high - low;
}

/** Halves order[first .. last) across its longer side, or across the other if that severs fewer nodes. */
function halve(work: Work, first: number, middle: number, last: number): void {
  const { order, x, y } = work;
  const wide = spread(order, x, first, last) >= spread(order, y, first, last);
  const [usual, other] = wide ? [x, y] : [y, x];
  select(order, usual, first, last, middle);
  if (last - first <= WORTH_TWO_CUTS) return;
  const cost = severed(work, first, middle, last);
  select(order, other, first, last, middle);
  if (severed(work, first, middle, last) >= cost) select(order, usual, first, last, middle);
}

function divide(work: Work, first: number, last: number): number {
  if (last - first <= LEAF) return work.parts.push({ first, last, left: -1, right: -1 }) - 1;
  const middle = (first + last) >> 1;
  halve(work, first, middle, last);
  const left = divide(work, first, middle);
  const right = divide(work, middle, last);
  return work.parts.push({ first, last, left, right }) - 1;
}

/** Sums of the corner coordinates: order by them is order by centroid. */
function centroids(mesh: Mesh, axis: 0 | 1): Float64Array {
  const sums = new Float64Array(mesh.elementCount);
  for (let e = 0; e < mesh.elementCount; e++) {
    for (let k = 0; k < 3; k++) sums[e]! += mesh.nodes[2 * mesh.elements[6 * e + k]! + axis]!;
  }
  return sums;
}

/**
 * Recursive halving of the elements by coordinates: the nodes between two halves are eliminated after both.
 * Method: nested dissection (George, SIAM J. Numer. Anal. 10, 1973) on recursive coordinate bisection, from memory.
 * Fill grows as n log n on plane meshes.
 */
export function dissect(mesh: Mesh): Dissection {
  const work: Work = {
    elements: mesh.elements,
    order: Int32Array.from({ length: mesh.elementCount }, (_, e) => e),
    x: centroids(mesh, 0),
    y: centroids(mesh, 1),
    mark: new Int32Array(mesh.nodeCount),
    marks: 0,
    parts: [],
  };
  divide(work, 0, mesh.elementCount);
  return { order: work.order, parts: work.parts };
}
