import type { Motion, Posed } from '@/generators/contract';
import type { TriMesh } from '@/lib/geometry/kernel';
import { type Edges, edgesOf } from './edges';

/** A mesh with split edges, and for each of its triangles the one it was cut from. */
export interface Refined {
  readonly mesh: TriMesh;
  readonly parent: Uint32Array;
}

/** What a splitting rule sees: the mesh, its edges and the middle of each edge (xyz). */
export interface EdgeView {
  readonly mesh: TriMesh;
  readonly edges: Edges;
  readonly middles: Float32Array;
}

/** One number an edge: above 1 it is to be split, the largest first. */
export type SplitRule = (view: EdgeView) => Float32Array;

export interface RefineLimits {
  readonly maxTriangles: number;
  readonly maxRounds: number;
}

export const REFINE_LIMITS: RefineLimits = { maxTriangles: 24_000, maxRounds: 9 };

function distance(p: Float32Array, a: number, b: number): number {
  const apart = (axis: number) => p[3 * a + axis]! - p[3 * b + axis]!;
  return Math.hypot(apart(0), apart(1), apart(2));
}

/** Splits edges longer than `length` (mm). */
export function longerThan(length: number): SplitRule {
  return ({ mesh: { positions: p }, edges: { count, ends } }) => {
    const scores = new Float32Array(count);
    for (let edge = 0; edge < count; edge += 1) {
      scores[edge] = distance(p, ends[2 * edge]!, ends[2 * edge + 1]!) / length;
    }
    return scores;
  };
}

export const posedLike = (points: Float32Array): Posed => ({
  positions: new Float32Array(points.length),
  strain: new Float32Array(points.length / 3),
});

const SHORTEST = 12;

/**
 * Splits edges whose middle, in the moved part, lies off the chord by more than `sag` (mm), or whose strain there
 * differs from the mean of the ends by more than `strainStep`. Looks at the half-way and the last moment. Edges are
 * not split below `SHORTEST` times the sag: where strain jumps, no split would be enough.
 */
export function bentBy(motion: Motion, body: string, sag: number, strainStep: number): SplitRule {
  return ({ mesh, edges: { count, ends }, middles }) => {
    const scores = new Float32Array(count);
    const corners = posedLike(mesh.positions);
    const halves = posedLike(middles);
    for (const t of [0.5, 1]) {
      motion.pose(body, mesh.positions, t, corners);
      motion.pose(body, middles, t, halves);
      for (let edge = 0; edge < count; edge += 1) {
        const a = ends[2 * edge]!;
        const b = ends[2 * edge + 1]!;
        if (distance(mesh.positions, a, b) < SHORTEST * sag) continue;
        const off = offChord(corners.positions, a, b, halves.positions, edge) / sag;
        const step =
          Math.abs(halves.strain[edge]! - (corners.strain[a]! + corners.strain[b]!) / 2) / strainStep;
        scores[edge] = Math.max(scores[edge]!, off, step);
      }
    }
    return scores;
  };
}

function offChord(p: Float32Array, a: number, b: number, middles: Float32Array, edge: number): number {
  const off = (axis: number) => middles[3 * edge + axis]! - (p[3 * a + axis]! + p[3 * b + axis]!) / 2;
  return Math.hypot(off(0), off(1), off(2));
}

function middlesOf(p: Float32Array, { count, ends }: Edges): Float32Array {
  const middles = new Float32Array(3 * count);
  for (let edge = 0; edge < count; edge += 1) {
    for (let axis = 0; axis < 3; axis += 1) {
      middles[3 * edge + axis] = (p[3 * ends[2 * edge]! + axis]! + p[3 * ends[2 * edge + 1]! + axis]!) / 2;
    }
  }
  return middles;
}

/** Edges to split: score above 1, the worst first where the budget of new triangles does not cover all. */
function chosen(scores: Float32Array, budget: number): number[] {
  const wanted: number[] = [];
  for (let edge = 0; edge < scores.length; edge += 1) if (scores[edge]! > 1) wanted.push(edge);
  const affordable = Math.max(0, Math.floor(budget / 2));
  if (wanted.length <= affordable) return wanted;
  return wanted.sort((a, b) => scores[b]! - scores[a]! || a - b).slice(0, affordable);
}

/** Cuts one triangle at the new vertices m on its sides (-1: none) and appends the pieces, orientation kept. */
function cut(corner: readonly number[], m: readonly number[], out: number[]): void {
  const first = m.findIndex((middle) => middle >= 0);
  if (first < 0) {
    out.push(corner[0]!, corner[1]!, corner[2]!);
    return;
  }
  const count = m.filter((middle) => middle >= 0).length;
  const turn = count === 2 ? (m.findIndex((middle) => middle < 0) + 1) % 3 : first;
  const [a, b, c] = [0, 1, 2].map((k) => corner[(turn + k) % 3]!) as [number, number, number];
  const [ab, bc, ca] = [0, 1, 2].map((k) => m[(turn + k) % 3]!) as [number, number, number];
  if (count === 1) out.push(a, ab, c, ab, b, c);
  else if (count === 2) out.push(ab, b, bc, a, ab, bc, a, bc, c);
  else out.push(a, ab, ca, ab, b, bc, ca, bc, c, ab, bc, ca);
}

function splitOnce(
  { mesh, parent }: Refined,
  edges: Edges,
  middles: Float32Array,
  split: readonly number[],
): Refined {
  const vertices = mesh.positions.length / 3;
  const positions = new Float32Array(mesh.positions.length + 3 * split.length);
  positions.set(mesh.positions);
  const middleOf = new Int32Array(edges.count).fill(-1);
  split.forEach((edge, k) => {
    middleOf[edge] = vertices + k;
    positions.set(middles.subarray(3 * edge, 3 * edge + 3), 3 * (vertices + k));
  });
  const out: number[] = [];
  const parents: number[] = [];
  for (let side = 0; side < mesh.indices.length; side += 3) {
    const sides = [side, side + 1, side + 2];
    cut(
      sides.map((s) => mesh.indices[s]!),
      sides.map((s) => middleOf[edges.ofSide[s]!]!),
      out,
    );
    while (parents.length < out.length / 3) parents.push(parent[side / 3]!);
  }
  return { mesh: { positions, indices: Uint32Array.from(out) }, parent: Uint32Array.from(parents) };
}

export const unrefined = (mesh: TriMesh): Refined => ({
  mesh,
  parent: Uint32Array.from({ length: mesh.indices.length / 3 }, (_, triangle) => triangle),
});

/**
 * Splits edges at their middles, round by round, until the rule asks for no more or a limit is met. An edge is split
 * for both its triangles at once, so a closed mesh stays closed, without cracks; the surface at rest is the same.
 */
export function refine(mesh: TriMesh, rule: SplitRule, limits: RefineLimits = REFINE_LIMITS): Refined {
  let current = unrefined(mesh);
  for (let round = 0; round < limits.maxRounds; round += 1) {
    const edges = edgesOf(current.mesh.indices);
    const middles = middlesOf(current.mesh.positions, edges);
    const scores = rule({ mesh: current.mesh, edges, middles });
    const split = chosen(scores, limits.maxTriangles - current.parent.length);
    if (split.length === 0) break;
    current = splitOnce(current, edges, middles, split);
  }
  return current;
}
