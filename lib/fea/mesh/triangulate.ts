import Delaunator from 'delaunator';
import { pointAt, type Segment } from '../profile/segment';
import type { Piece } from './boundary';
import type { Points } from './front';
import { repairThin } from './repair';

/** Rounds of splitting before the recovery of the boundary is given up. */
const MOST_ROUNDS = 12;
/** Passes over thin triangles; each ends in a new triangulation. */
const MOST_REPAIRS = 2;

/** Straight triangles over the points; `inside` marks those within the profile. */
export interface Triangulation {
  readonly x: number[];
  readonly y: number[];
  readonly pieces: Piece[];
  /** three corners each, clockwise seen with y up */
  readonly corners: Uint32Array;
  /** for each half-edge its twin in the neighbouring triangle, -1 on the hull */
  readonly twins: Int32Array;
  /** for each half-edge the boundary piece it lies on, -1 if none */
  readonly pieceAt: Int32Array;
  readonly inside: Uint8Array;
  readonly isBoundary: readonly boolean[];
}

interface Growing {
  readonly x: number[];
  readonly y: number[];
  readonly isBoundary: boolean[];
  readonly pieces: Piece[];
}

/** Next half-edge round the same triangle. */
export const following = (edge: number): number => (edge % 3 === 2 ? edge - 2 : edge + 1);

function delaunay(x: readonly number[], y: readonly number[]): Delaunator<Float64Array> {
  const xy = new Float64Array(2 * x.length);
  for (let i = 0; i < x.length; i++) {
    xy[2 * i] = x[i]!;
    xy[2 * i + 1] = y[i]!;
  }
  return new Delaunator(xy);
}

/** Which boundary piece each half-edge lies on; pieces run either way. */
function locatePieces(corners: Uint32Array, grown: Growing): Int32Array {
  const span = grown.x.length;
  const byEnds = new Map<number, number>();
  grown.pieces.forEach(({ from, to }, piece) => {
    byEnds.set(from * span + to, piece);
  });
  const pieceAt = new Int32Array(corners.length).fill(-1);
  for (let edge = 0; edge < corners.length; edge++) {
    const a = corners[edge]!;
    const b = corners[following(edge)]!;
    if (!grown.isBoundary[a] || !grown.isBoundary[b]) continue;
    pieceAt[edge] = byEnds.get(a * span + b) ?? byEnds.get(b * span + a) ?? -1;
  }
  return pieceAt;
}

/** Splits at mid-share every piece that is not an edge of the triangulation. Returns how many there were. */
function splitMissing(grown: Growing, pieceAt: Int32Array, segments: readonly Segment[]): number {
  const seen = new Uint8Array(grown.pieces.length);
  for (const piece of pieceAt) if (piece >= 0) seen[piece] = 1;
  let missing = 0;
  seen.forEach((found, piece) => {
    if (found) return;
    split(grown, piece, segments);
    missing++;
  });
  return missing;
}

function split(grown: Growing, index: number, segments: readonly Segment[]): void {
  const piece = grown.pieces[index]!;
  const middle = (piece.t0 + piece.t1) / 2;
  const [x, y] = pointAt(segments[piece.segment]!, middle);
  const point = grown.x.length;
  grown.x.push(x);
  grown.y.push(y);
  grown.isBoundary.push(true);
  grown.pieces[index] = { ...piece, to: point, t1: middle };
  grown.pieces.push({ ...piece, from: point, t0: middle });
}

/**
 * Marks the triangles within the profile: those with a boundary piece on their edge, seen from the material's side,
 * and all that are reached from them without crossing a piece.
 */
function markInside(
  corners: Uint32Array,
  twins: Int32Array,
  pieceAt: Int32Array,
  pieces: Piece[],
): Uint8Array {
  const inside = new Uint8Array(corners.length / 3);
  const waiting: number[] = [];
  const take = (triangle: number) => {
    if (inside[triangle]) return;
    inside[triangle] = 1;
    waiting.push(triangle);
  };
  pieceAt.forEach((piece, edge) => {
    if (piece >= 0 && pieces[piece]!.to === corners[edge]) take(Math.floor(edge / 3));
  });
  while (waiting.length > 0) {
    const triangle = waiting.pop()!;
    for (let edge = 3 * triangle; edge < 3 * triangle + 3; edge++) {
      if (pieceAt[edge]! < 0 && twins[edge]! >= 0) take(Math.floor(twins[edge]! / 3));
    }
  }
  return inside;
}

/** Delaunay triangulation in which every boundary piece is an edge, or null if splitting does not end. */
function conforming(grown: Growing, segments: readonly Segment[]): Triangulation | null {
  for (let round = 0; round < MOST_ROUNDS; round++) {
    const { triangles: corners, halfedges: twins } = delaunay(grown.x, grown.y);
    const pieceAt = locatePieces(corners, grown);
    if (splitMissing(grown, pieceAt, segments) > 0) continue;
    return { ...grown, corners, twins, pieceAt, inside: markInside(corners, twins, pieceAt, grown.pieces) };
  }
  return null;
}

/** Moves each inner point to the mean of the centroids of the triangles round it (Laplace smoothing by centroids). */
function smooth({ x, y, isBoundary, corners, inside }: Triangulation): void {
  const sums = new Float64Array(3 * x.length);
  inside.forEach((within, triangle) => {
    if (!within) return;
    const a = corners[3 * triangle]!;
    const b = corners[3 * triangle + 1]!;
    const c = corners[3 * triangle + 2]!;
    for (let edge = 3 * triangle; edge < 3 * triangle + 3; edge++) {
      const point = corners[edge]!;
      sums[3 * point]! += (x[a]! + x[b]! + x[c]!) / 3;
      sums[3 * point + 1]! += (y[a]! + y[b]! + y[c]!) / 3;
      sums[3 * point + 2]! += 1;
    }
  });
  for (let i = 0; i < x.length; i++) {
    const count = sums[3 * i + 2]!;
    if (isBoundary[i] || count === 0) continue;
    x[i] = sums[3 * i]! / count;
    y[i] = sums[3 * i + 1]! / count;
  }
}

/**
 * Triangles over the points that keep to the profile's boundary.
 * Method: Delaunay (delaunator); boundary pieces that are missing are split and the triangulation repeated
 * (conforming Delaunay, after Shewchuk, Delaunay Refinement Mesh Generation, 1997, from memory); inside by flood
 * fill from the boundary; smoothing between repeats, repair of thin triangles last. Null when the boundary cannot be recovered.
 */
export function triangulate(
  points: Points,
  pieces: readonly Piece[],
  segments: readonly Segment[],
  smoothing: number,
): Triangulation | null {
  const isBoundary = points.x.map((_, i) => i < points.onBoundary);
  const grown: Growing = { x: [...points.x], y: [...points.y], isBoundary, pieces: [...pieces] };
  let current = conforming(grown, segments);
  for (let pass = 0; pass < smoothing && current; pass++) {
    smooth(current);
    current = conforming(grown, segments);
  }
  for (let pass = 0; pass < MOST_REPAIRS && current && repairThin(current); pass++) {
    current = conforming(grown, segments);
  }
  return current;
}
