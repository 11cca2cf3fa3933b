import type { Mesh } from '@/lib/fea/mesh/mesh';

/**
 * Baseline for the multifrontal solver: a banded LDL^T on nodes numbered by reverse Cuthill-McKee, the usual direct
 * solver of finite-element textbooks (Zienkiewicz and Taylor, from memory).
 */
export interface Banded {
  readonly place: Int32Array;
  readonly order: number;
  readonly band: number;
}

function neighbours(mesh: Mesh): number[][] {
  const sets = Array.from({ length: mesh.nodeCount }, () => new Set<number>());
  for (let e = 0; e < mesh.elementCount; e++) {
    const nodes = mesh.elements.subarray(6 * e, 6 * e + 6);
    for (const a of nodes) for (const b of nodes) if (a !== b) sets[a]!.add(b);
  }
  return sets.map((set) => [...set]);
}

/** Breadth-first levels from a node; the last one found is far away. */
function breadthFirst(near: readonly number[][], start: number): number[] {
  const seen = new Uint8Array(near.length);
  const order = [start];
  seen[start] = 1;
  for (const node of order) {
    const next = near[node]!.filter((other) => !seen[other]).sort(
      (a, b) => near[a]!.length - near[b]!.length,
    );
    for (const other of next) seen[other] = 1;
    order.push(...next);
  }
  return order;
}

/** Numbers the free unknowns for a small band. */
export function bandedOrder(mesh: Mesh, held: Uint8Array): Banded {
  const near = neighbours(mesh);
  const far = breadthFirst(near, breadthFirst(near, 0).at(-1)!).reverse();
  const place = new Int32Array(2 * mesh.nodeCount).fill(-1);
  let order = 0;
  for (const node of far)
    for (const unknown of [2 * node, 2 * node + 1]) if (!held[unknown]) place[unknown] = order++;
  let band = 0;
  for (let e = 0; e < mesh.elementCount; e++) {
    const places = Array.from(
      { length: 12 },
      (_, k) => place[2 * mesh.elements[6 * e + (k >> 1)]! + (k & 1)]!,
    );
    const free = places.filter((p) => p >= 0);
    if (free.length > 0) band = Math.max(band, Math.max(...free) - Math.min(...free));
  }
  return { place, order, band };
}

/** Rows of the lower band, diagonal last. */
export function bandedMatrix(
  mesh: Mesh,
  stiffness: Float64Array,
  { place, order, band }: Banded,
): Float64Array {
  const width = band + 1;
  const rows = new Float64Array(order * width);
  for (let e = 0; e < mesh.elementCount; e++) {
    for (let i = 0; i < 12; i++) {
      for (let j = 0; j <= i; j++) {
        const a = place[2 * mesh.elements[6 * e + (i >> 1)]! + (i & 1)]!;
        const b = place[2 * mesh.elements[6 * e + (j >> 1)]! + (j & 1)]!;
        if (a < 0 || b < 0) continue;
        rows[Math.max(a, b) * width + band - Math.abs(a - b)]! += stiffness[144 * e + 12 * i + j]!;
      }
    }
  }
  return rows;
}

/** Cholesky factor in place of the band. */
export function factorBanded(rows: Float64Array, order: number, band: number): void {
  const width = band + 1;
  for (let i = 0; i < order; i++) {
    const first = Math.max(0, i - band);
    for (let j = first; j <= i; j++) {
      const from = Math.max(first, j - band);
      let sum = rows[i * width + band - i + j]!;
      const a = i * width + band - i;
      const b = j * width + band - j;
      for (let k = from; k < j; k++) sum -= rows[a + k]! * rows[b + k]!;
      rows[a + j] = i === j ? Math.sqrt(sum) : sum / rows[b + j]!;
    }
  }
}

/** Forward and back substitution with the banded factor. */
export function solveBanded(
  rows: Float64Array,
  order: number,
  band: number,
  right: Float64Array,
): Float64Array {
  const width = band + 1;
  const x = Float64Array.from(right);
  for (let i = 0; i < order; i++) {
    for (let k = Math.max(0, i - band); k < i; k++) x[i]! -= rows[i * width + band - i + k]! * x[k]!;
    x[i]! /= rows[i * width + band]!;
  }
  for (let i = order - 1; i >= 0; i--) {
    x[i]! /= rows[i * width + band]!;
    for (let k = Math.max(0, i - band); k < i; k++) x[k]! -= rows[i * width + band - i + k]! * x[i]!;
  }
  return x;
}
