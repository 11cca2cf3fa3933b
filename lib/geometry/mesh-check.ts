import type { Bounds, MeshFault, TriMesh } from './kernel';

/** A facet whose height over its longest edge is below this (mm) has no direction in float32. */
export const MIN_FACET_HEIGHT = 1e-6;

const tableSize = (entries: number) => 2 ** Math.ceil(Math.log2(Math.max(8, entries * 2)));

/** Mixes three 32-bit words to a table slot. */
function slotOf(a: number, b: number, c: number, mask: number): number {
  let h = Math.imul(a, 0x9e3779b1) ^ Math.imul(b, 0x85ebca6b) ^ Math.imul(c, 0xc2b2ae35);
  h = Math.imul(h ^ (h >>> 15), 0x2c1b3c6d);
  return (h ^ (h >>> 13)) & mask;
}

/**
 * Merges vertices of equal float32 position, turns -0 into 0 and drops triangles that lost a corner by it. Dropping
 * such a triangle removes an edge and its opposite together, so a closed mesh stays closed.
 */
export function weld(positions: ArrayLike<number>, indices: ArrayLike<number>): TriMesh {
  const points = Float32Array.from(positions);
  for (let at = 0; at < points.length; at += 1) points[at] = points[at]! + 0;
  const words = new Uint32Array(points.buffer);
  const count = points.length / 3;
  const mask = tableSize(count) - 1;
  const table = new Int32Array(mask + 1).fill(-1);
  const renumbered = new Uint32Array(count);
  let kept = 0;
  for (let vertex = 0; vertex < count; vertex += 1) {
    const [x, y, z] = [words[vertex * 3]!, words[vertex * 3 + 1]!, words[vertex * 3 + 2]!];
    let slot = slotOf(x, y, z, mask);
    while (table[slot]! >= 0) {
      const at = table[slot]! * 3;
      if (words[at] === x && words[at + 1] === y && words[at + 2] === z) break;
      slot = (slot + 1) & mask;
    }
    if (table[slot]! < 0) {
      table[slot] = kept;
      points.copyWithin(kept * 3, vertex * 3, vertex * 3 + 3);
      kept += 1;
    }
    renumbered[vertex] = table[slot]!;
  }
  return { positions: points.slice(0, kept * 3), indices: renumber(indices, renumbered) };
}

function renumber(indices: ArrayLike<number>, renumbered: Uint32Array): Uint32Array {
  const out = new Uint32Array(indices.length);
  let used = 0;
  for (let at = 0; at + 2 < indices.length; at += 3) {
    const a = renumbered[indices[at]!]!;
    const b = renumbered[indices[at + 1]!]!;
    const c = renumbered[indices[at + 2]!]!;
    if (a === b || b === c || c === a) continue;
    out[used] = a;
    out[used + 1] = b;
    out[used + 2] = c;
    used += 3;
  }
  return out.slice(0, used);
}

/** Counts edges that lack their opposite, and edges that more than two triangles (or two of one direction) use. */
function edgeFaults(indices: Uint32Array): { open: number; overused: number } {
  const mask = tableSize(indices.length) - 1;
  const low = new Uint32Array(mask + 1);
  const high = new Uint32Array(mask + 1);
  const uses = new Uint32Array(mask + 1);
  for (let at = 0; at < indices.length; at += 1) {
    const from = indices[at]!;
    const to = indices[at % 3 === 2 ? at - 2 : at + 1]!;
    const [a, b] = from < to ? [from, to] : [to, from];
    let slot = slotOf(a, b, 0, mask);
    while (uses[slot] !== 0 && (low[slot] !== a || high[slot] !== b)) slot = (slot + 1) & mask;
    low[slot] = a;
    high[slot] = b;
    uses[slot] = uses[slot]! + (from < to ? 1 : 0x10000);
  }
  let open = 0;
  let overused = 0;
  for (const use of uses) {
    if (use === 0 || use === 0x10001) continue;
    if (use === 1 || use === 0x10000) open += 1;
    else overused += 1;
  }
  return { open, overused };
}

/** Twice the area of the triangle at `at`, mm2. */
function doubleArea({ positions: p, indices }: TriMesh, at: number): number {
  const [a, b, c] = [indices[at]! * 3, indices[at + 1]! * 3, indices[at + 2]! * 3];
  const [ux, uy, uz] = [p[b]! - p[a]!, p[b + 1]! - p[a + 1]!, p[b + 2]! - p[a + 2]!];
  const [vx, vy, vz] = [p[c]! - p[a]!, p[c + 1]! - p[a + 1]!, p[c + 2]! - p[a + 2]!];
  const x = uy * vz - uz * vy;
  const y = uz * vx - ux * vz;
  const z = ux * vy - uy * vx;
  return Math.sqrt(x * x + y * y + z * z);
}

function edgeSquared(p: Float32Array, a: number, b: number): number {
  const [x, y, z] = [p[b]! - p[a]!, p[b + 1]! - p[a + 1]!, p[b + 2]! - p[a + 2]!];
  return x * x + y * y + z * z;
}

function degenerateFacets(mesh: TriMesh): number {
  const { positions: p, indices } = mesh;
  let count = 0;
  for (let at = 0; at < indices.length; at += 3) {
    const [a, b, c] = [indices[at]! * 3, indices[at + 1]! * 3, indices[at + 2]! * 3];
    const longest = Math.sqrt(Math.max(edgeSquared(p, a, b), edgeSquared(p, b, c), edgeSquared(p, c, a)));
    if (!(doubleArea(mesh, at) > longest * MIN_FACET_HEIGHT)) count += 1;
  }
  return count;
}

/** Volume in mm3 by the divergence theorem; negative where triangles look inward. */
export function meshVolume(mesh: TriMesh): number {
  const { positions: p, indices } = mesh;
  let six = 0;
  for (let at = 0; at < indices.length; at += 3) {
    const a = indices[at]! * 3;
    const b = indices[at + 1]! * 3;
    const c = indices[at + 2]! * 3;
    const x = p[b + 1]! * p[c + 2]! - p[b + 2]! * p[c + 1]!;
    const y = p[b + 2]! * p[c]! - p[b]! * p[c + 2]!;
    const z = p[b]! * p[c + 1]! - p[b + 1]! * p[c]!;
    six += p[a]! * x + p[a + 1]! * y + p[a + 2]! * z;
  }
  return six / 6;
}

/** Surface area in mm2. */
export function meshArea(mesh: TriMesh): number {
  let double = 0;
  for (let at = 0; at < mesh.indices.length; at += 3) double += doubleArea(mesh, at);
  return double / 2;
}

/** Least and greatest x, y, z of the positions (xyz per vertex), mm. */
export function boundsOf(positions: ArrayLike<number>): Bounds {
  const least = [Infinity, Infinity, Infinity];
  const most = [-Infinity, -Infinity, -Infinity];
  for (let at = 0; at < positions.length; at += 1) {
    const axis = at % 3;
    least[axis] = Math.min(least[axis]!, positions[at]!);
    most[axis] = Math.max(most[axis]!, positions[at]!);
  }
  return [least[0]!, least[1]!, least[2]!, most[0]!, most[1]!, most[2]!];
}

/**
 * Everything that keeps a welded mesh from being the closed surface of a body: each directed edge must occur once
 * with its opposite once, no facet may be degenerate, all positions finite, the volume positive.
 */
export function meshFaults(mesh: TriMesh): readonly MeshFault[] {
  if (mesh.indices.length === 0) return [{ kind: 'empty', count: 1 }];
  const nonFinite = mesh.positions.reduce((sum, value) => sum + (Number.isFinite(value) ? 0 : 1), 0);
  const { open, overused } = edgeFaults(mesh.indices);
  const faults: MeshFault[] = [
    { kind: 'non-finite', count: nonFinite },
    { kind: 'open-edge', count: open },
    { kind: 'overused-edge', count: overused },
    { kind: 'degenerate', count: degenerateFacets(mesh) },
    { kind: 'flipped', count: meshVolume(mesh) > 0 ? 0 : 1 },
  ];
  return faults.filter((fault) => fault.count > 0);
}

export const describeFaults = (faults: readonly MeshFault[]): string =>
  faults.map((fault) => `${fault.count} ${fault.kind}`).join(', ');
