import type { Motion, Posed } from '@/generators/contract';
import type { TriMesh } from '@/lib/geometry/kernel';
import { type Edges, edgesOf } from './edges';
import { type Coplanar, type FlatTriangles, relaxed } from './flips';
import { faceNormals } from './shading';

/** A mesh with split edges, and for each of its triangles the one it was cut from. */
export interface Refined {
  readonly mesh: TriMesh;
  readonly parent: Uint32Array;
}

/** What a splitting rule sees: all vertices, the edges in question and the middle of each (xyz). */
export interface EdgeView {
  readonly positions: Float32Array;
  readonly edges: Edges;
  readonly middles: Float32Array;
}

/**
 * One number an edge: error over the error allowed. Above 1 the edge is to be split, the worst first. The same edge
 * always scores the same.
 */
export type SplitRule = (view: EdgeView) => Float32Array;

export interface RefineLimits {
  readonly maxTriangles: number;
  readonly maxRounds: number;
}

export const REFINE_LIMITS: RefineLimits = { maxTriangles: 16_000, maxRounds: 10 };

/** Cosine above which two faces count as one plane: a fortieth of a degree. */
const FLAT = 1 - 1e-7;

/** Pieces an edge is cut into in one round at most. */
const MOST_PIECES = 8;

function distance(p: Float32Array, a: number, b: number): number {
  const x = p[3 * a]! - p[3 * b]!;
  const y = p[3 * a + 1]! - p[3 * b + 1]!;
  const z = p[3 * a + 2]! - p[3 * b + 2]!;
  return Math.sqrt(x * x + y * y + z * z);
}

/** Splits edges longer than `length` (mm); squared, as errors fall with the square of the length. */
export function longerThan(length: number): SplitRule {
  return ({ positions, edges: { count, ends } }) => {
    const scores = new Float32Array(count);
    for (let edge = 0; edge < count; edge += 1) {
      scores[edge] = (distance(positions, ends[2 * edge]!, ends[2 * edge + 1]!) / length) ** 2;
    }
    return scores;
  };
}

export const posedLike = (points: Float32Array): Posed => ({
  positions: new Float32Array(points.length),
  strain: new Float32Array(points.length / 3),
});

/** Where strain jumps no split would be enough: edges shorter than this many sags are left as they are. */
const SHORTEST = 12;

/**
 * Splits edges whose middle, at the last moment of the motion, lies off the chord by more than `sag` (mm), or whose
 * strain there differs from the mean of the ends by more than `strainStep`.
 */
export function bentBy(motion: Motion, body: string, sag: number, strainStep: number): SplitRule {
  const corners = posedOnce(motion, body);
  return ({ positions, edges: { count, ends }, middles }) => {
    const { positions: p, strain } = corners(positions);
    const halves = posedLike(middles);
    motion.pose(body, middles, 1, halves);
    const scores = new Float32Array(count);
    for (let edge = 0; edge < count; edge += 1) {
      const a = ends[2 * edge]!;
      const b = ends[2 * edge + 1]!;
      if (distance(positions, a, b) < SHORTEST * sag) continue;
      const step = Math.abs(halves.strain[edge]! - (strain[a]! + strain[b]!) / 2) / strainStep;
      scores[edge] = Math.max(offChord(p, a, b, halves.positions, edge) / sag, step);
    }
    return scores;
  };
}

/** Poses vertices at t = 1, each only once as the list of vertices grows. */
function posedOnce(motion: Motion, body: string): (positions: Float32Array) => Posed {
  let known: Posed = posedLike(new Float32Array(0));
  return (positions) => {
    const from = known.positions.length;
    const fresh = posedLike(positions.subarray(from));
    motion.pose(body, positions.slice(from), 1, fresh);
    const all = posedLike(positions);
    all.positions.set(known.positions);
    all.positions.set(fresh.positions, from);
    all.strain.set(known.strain);
    all.strain.set(fresh.strain, from / 3);
    known = all;
    return known;
  };
}

function offChord(p: Float32Array, a: number, b: number, middles: Float32Array, edge: number): number {
  const x = middles[3 * edge]! - (p[3 * a]! + p[3 * b]!) / 2;
  const y = middles[3 * edge + 1]! - (p[3 * a + 1]! + p[3 * b + 1]!) / 2;
  const z = middles[3 * edge + 2]! - (p[3 * a + 2]! + p[3 * b + 2]!) / 2;
  return Math.sqrt(x * x + y * y + z * z);
}

function middlesOf(p: Float32Array, { count, ends }: Edges): Float32Array {
  const middles = new Float32Array(3 * count);
  for (let edge = 0; edge < count; edge += 1) {
    const a = 3 * ends[2 * edge]!;
    const b = 3 * ends[2 * edge + 1]!;
    for (let axis = 0; axis < 3; axis += 1) middles[3 * edge + axis] = (p[a + axis]! + p[b + axis]!) / 2;
  }
  return middles;
}

/** Into how many pieces each edge is cut: errors fall with the square; the worst first where the budget is short. */
function piecesOf(scores: Float32Array, budget: number): Uint8Array {
  const pieces = new Uint8Array(scores.length).fill(1);
  const wanted: number[] = [];
  for (let edge = 0; edge < scores.length; edge += 1) if (scores[edge]! > 1) wanted.push(edge);
  wanted.sort((a, b) => scores[b]! - scores[a]! || a - b);
  let left = Math.floor(budget / 2);
  for (const edge of wanted) {
    const more = Math.min(MOST_PIECES, Math.ceil(Math.sqrt(scores[edge]!))) - 1;
    if (more > left) break;
    pieces[edge] = 1 + more;
    left -= more;
  }
  return pieces;
}

/** A list of triangles with the triangle each was cut from. */
class Triangles {
  readonly indices: number[] = [];
  readonly parent: number[] = [];

  add(a: number, b: number, c: number, parent: number): void {
    this.indices.push(a, b, c);
    this.parent.push(parent);
  }

  packed(): FlatTriangles {
    return { indices: Uint32Array.from(this.indices), parent: Uint32Array.from(this.parent) };
  }
}

/** Fills the strip between two chains of points that run beside each other, seen from outside `left` on the left. */
function zip(out: Triangles, left: readonly number[], right: readonly number[], parent: number): void {
  let [i, j] = [0, 0];
  while (i + 1 < left.length || j + 1 < right.length) {
    const advanceLeft = (i + 1) * (right.length - 1) <= (j + 1) * (left.length - 1);
    if (j + 1 >= right.length || (i + 1 < left.length && advanceLeft)) {
      out.add(left[i]!, right[j]!, left[i + 1]!, parent);
      i += 1;
    } else {
      out.add(left[i]!, right[j]!, right[j + 1]!, parent);
      j += 1;
    }
  }
}

/**
 * Cuts a triangle whose sides carry points (each side from its corner to the next, both included). Strips run from
 * the corner opposite the side with the fewest points, so that thin triangles are cut across.
 */
function cut(out: Triangles, sides: readonly (readonly number[])[], parent: number): void {
  const fewest = Math.min(...sides.map((side) => side.length));
  const base = sides.findIndex((side) => side.length === fewest);
  const floor = sides[base]!;
  const up = [...sides[(base + 2) % 3]!];
  const down = [...sides[(base + 1) % 3]!].reverse();
  if (fewest === 2) {
    wedge(out, up, down, parent);
    return;
  }
  wedge(out, up.slice(0, -1), down.slice(0, -1), parent);
  zip(out, [up.at(-2)!, down.at(-2)!], floor, parent);
}

/** The strip between two sides of a triangle that leave the same corner. */
function wedge(out: Triangles, right: readonly number[], left: readonly number[], parent: number): void {
  out.add(right[0]!, right[1]!, left[1]!, parent);
  zip(out, left.slice(1), right.slice(1), parent);
}

export const unrefined = (mesh: TriMesh): Refined => ({
  mesh,
  parent: Uint32Array.from({ length: mesh.indices.length / 3 }, (_, triangle) => triangle),
});

function joined(first: Float32Array, second: Float32Array): Float32Array {
  const both = new Float32Array(first.length + second.length);
  both.set(first);
  both.set(second, first.length);
  return both;
}

interface Points {
  /** first new vertex of each edge */
  readonly first: Uint32Array;
  readonly positions: Float32Array;
}

function joinedWhole(first: Uint32Array, second: Uint32Array): Uint32Array {
  const both = new Uint32Array(first.length + second.length);
  both.set(first);
  both.set(second, first.length);
  return both;
}

/** New vertices, evenly along each edge from its first end to its second. */
function pointsOn(p: Float32Array, { count, ends }: Edges, pieces: Uint8Array): Points {
  const first = new Uint32Array(count);
  const points: number[] = [];
  for (let edge = 0; edge < count; edge += 1) {
    const a = 3 * ends[2 * edge]!;
    const b = 3 * ends[2 * edge + 1]!;
    first[edge] = (p.length + points.length) / 3;
    for (let k = 1; k < pieces[edge]!; k += 1) {
      const share = k / pieces[edge]!;
      for (let axis = 0; axis < 3; axis += 1) {
        points.push(p[a + axis]! + share * (p[b + axis]! - p[a + axis]!));
      }
    }
  }
  return { first, positions: joined(p, Float32Array.from(points)) };
}

/**
 * Splits edges evenly, round by round, until the rule asks for no more or a limit is met. An edge is split for both
 * its triangles alike, so a closed mesh stays closed, without cracks; the surface at rest is the same. A triangle
 * none of whose edges is to be split is done and not looked at again.
 */
export function refine(mesh: TriMesh, rule: SplitRule, limits: RefineLimits = REFINE_LIMITS): Refined {
  const coplanar = coplanarIn(mesh);
  let { positions } = mesh;
  let active: FlatTriangles = { indices: mesh.indices, parent: unrefined(mesh).parent };
  const done = new Triangles();
  for (let round = 0; round < limits.maxRounds; round += 1) {
    const edges = edgesOf(active.indices);
    const scores = rule({ positions, edges, middles: middlesOf(positions, edges) });
    const budget = limits.maxTriangles - done.parent.length - active.parent.length;
    const pieces = piecesOf(ridgesFirst(scores, edges, active.parent, coplanar), budget);
    if (pieces.every((count) => count === 1)) break;
    const points = pointsOn(positions, edges, pieces);
    positions = points.positions;
    active = relaxed(
      positions,
      divide(active, { edges, scores, pieces, first: points.first }, done).packed(),
      coplanar,
    );
  }
  if (positions === mesh.positions) return unrefined(mesh);
  const { indices, parent } = done.packed();
  return {
    mesh: { positions, indices: joinedWhole(indices, active.indices) },
    parent: joinedWhole(parent, active.parent),
  };
}

function coplanarIn(mesh: TriMesh): Coplanar {
  const n = faceNormals(mesh);
  return (one, other) =>
    one === other ||
    n[3 * one]! * n[3 * other]! + n[3 * one + 1]! * n[3 * other + 1]! + n[3 * one + 2]! * n[3 * other + 2]! >
      FLAT;
}

/**
 * While an edge between faces that are not in one plane is to be split, edges inside flat faces wait: once the rim
 * of a face has its points, most of its long edges turn into short ones.
 */
function ridgesFirst(
  scores: Float32Array,
  { sides }: Edges,
  parent: Uint32Array,
  coplanar: Coplanar,
): Float32Array {
  const ridges = scores.map((score, edge) => {
    const [one, other] = [sides[2 * edge]!, sides[2 * edge + 1]!];
    const inside = other < 0 || coplanar(parent[Math.floor(one / 3)]!, parent[Math.floor(other / 3)]!);
    return inside ? 0 : score;
  });
  return ridges.some((score) => score > 1) ? ridges : scores;
}

interface Plan {
  readonly edges: Edges;
  readonly scores: Float32Array;
  readonly pieces: Uint8Array;
  readonly first: Uint32Array;
}

/** One round: cut triangles stay active, triangles whose edges all pass go to `done`. */
function divide(active: FlatTriangles, plan: Plan, done: Triangles): Triangles {
  const { ofSide } = plan.edges;
  const next = new Triangles();
  for (let corner = 0; corner < active.indices.length; corner += 3) {
    const sides = [corner, corner + 1, corner + 2];
    const parent = active.parent[corner / 3]!;
    const [a, b, c] = sides.map((side) => active.indices[side]!) as [number, number, number];
    if (sides.some((side) => plan.pieces[ofSide[side]!]! > 1)) {
      cut(
        next,
        [
          chain(plan, ofSide[corner]!, a),
          chain(plan, ofSide[corner + 1]!, b),
          chain(plan, ofSide[corner + 2]!, c),
        ],
        parent,
      );
    } else if (sides.some((side) => plan.scores[ofSide[side]!]! > 1)) {
      next.add(a, b, c, parent);
    } else {
      done.add(a, b, c, parent);
    }
  }
  return next;
}

/** Vertices along an edge as met when leaving `from`. */
function chain({ edges: { ends }, pieces, first }: Plan, edge: number, from: number): number[] {
  const between = Array.from({ length: pieces[edge]! - 1 }, (_, k) => first[edge]! + k);
  const forward = [ends[2 * edge]!, ...between, ends[2 * edge + 1]!];
  return forward[0] === from ? forward : forward.reverse();
}
