/**
 * Edges of a triangle list. Side `3 t + k` runs from corner k to corner k + 1 of triangle t; the two sides of an
 * edge of a closed mesh run against each other.
 */
export interface Edges {
  readonly count: number;
  /** two vertices per edge */
  readonly ends: Uint32Array;
  /** edge of each side */
  readonly ofSide: Uint32Array;
  /** the two sides of each edge, -1 where there is no second one */
  readonly sides: Int32Array;
}

export const nextCorner = (side: number): number => (side % 3 === 2 ? side - 2 : side + 1);

/** Pairs sides by an open-addressing table, several times faster here than a Map. */
export function edgesOf(indices: Uint32Array): Edges {
  const slots = 2 ** Math.ceil(Math.log2(Math.max(8, indices.length * 2)));
  const table = new Int32Array(slots).fill(-1);
  const ends = new Uint32Array(indices.length * 2);
  const sides = new Int32Array(indices.length * 2).fill(-1);
  const ofSide = new Uint32Array(indices.length);
  let count = 0;
  for (let side = 0; side < indices.length; side += 1) {
    const a = indices[side]!;
    const b = indices[nextCorner(side)]!;
    const low = Math.min(a, b);
    const high = Math.max(a, b);
    let slot = (Math.imul(low, 0x9e3779b1) ^ Math.imul(high, 0x85ebca6b)) & (slots - 1);
    let edge = table[slot]!;
    while (edge >= 0 && (ends[2 * edge] !== low || ends[2 * edge + 1] !== high)) {
      slot = (slot + 1) & (slots - 1);
      edge = table[slot]!;
    }
    if (edge < 0) {
      edge = count;
      count += 1;
      table[slot] = edge;
      ends[2 * edge] = low;
      ends[2 * edge + 1] = high;
      sides[2 * edge] = side;
    } else {
      sides[2 * edge + 1] = side;
    }
    ofSide[side] = edge;
  }
  return { count, ends: ends.subarray(0, 2 * count), ofSide, sides: sides.subarray(0, 2 * count) };
}
