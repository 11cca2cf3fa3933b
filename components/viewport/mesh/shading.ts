import type { TriMesh } from '@/lib/geometry/kernel';
import { edgesOf, nextCorner } from './edges';
import type { Refined } from './refine';

/**
 * How a welded mesh is shaded: corners that meet across a smooth edge share a drawn vertex, corners across a crease
 * do not. `edges` are the creases, as pairs of welded vertices.
 */
export interface Shading {
  readonly indices: Uint32Array;
  /** welded vertex of each drawn vertex */
  readonly source: Uint32Array;
  readonly edges: Uint32Array;
  /** the triangles on both sides of each crease, -1 where there is none */
  readonly beside: Int32Array;
}

/** Edges that turn by more than this are drawn as creases; thread flanks are, facets of a cylinder are not. */
export const CREASE_ANGLE = (28 * Math.PI) / 180;

/** Unit normal of each triangle, zero for one without area. */
export function faceNormals({ positions: p, indices }: TriMesh): Float32Array {
  const normals = new Float32Array(indices.length);
  for (let side = 0; side < indices.length; side += 3) {
    const a = 3 * indices[side]!;
    const b = 3 * indices[side + 1]!;
    const c = 3 * indices[side + 2]!;
    const [ux, uy, uz] = [p[b]! - p[a]!, p[b + 1]! - p[a + 1]!, p[b + 2]! - p[a + 2]!];
    const [vx, vy, vz] = [p[c]! - p[a]!, p[c + 1]! - p[a + 1]!, p[c + 2]! - p[a + 2]!];
    const [x, y, z] = [uy * vz - uz * vy, uz * vx - ux * vz, ux * vy - uy * vx];
    const size = Math.hypot(x, y, z) || 1;
    normals[side] = x / size;
    normals[side + 1] = y / size;
    normals[side + 2] = z / size;
  }
  return normals;
}

class CornerSets {
  private readonly parent: Uint32Array;

  constructor(size: number) {
    this.parent = Uint32Array.from({ length: size }, (_, k) => k);
  }

  root(corner: number): number {
    let at = corner;
    while (this.parent[at] !== at) {
      this.parent[at] = this.parent[this.parent[at]!]!;
      at = this.parent[at]!;
    }
    return at;
  }

  join(a: number, b: number): void {
    this.parent[this.root(a)] = this.root(b);
  }
}

/**
 * Creases are judged by the triangles the mesh was refined from: the pieces of one are flat, however thin, and their
 * own normals would be noise.
 */
export function shadingOf({ mesh, parent }: Refined, coarse: TriMesh, creaseAngle = CREASE_ANGLE): Shading {
  const { indices } = mesh;
  const edges = edgesOf(indices);
  const normals = faceNormals(coarse);
  const sets = new CornerSets(indices.length);
  const smooth = Math.cos(creaseAngle);
  const creases: number[] = [];
  const beside: number[] = [];
  const parentOf = (side: number) => parent[Math.floor(side / 3)]!;
  for (let edge = 0; edge < edges.count; edge += 1) {
    const one = edges.sides[2 * edge]!;
    const other = edges.sides[2 * edge + 1]!;
    if (other >= 0 && cosineBetween(normals, parentOf(one), parentOf(other)) >= smooth) {
      sets.join(one, nextCorner(other));
      sets.join(nextCorner(one), other);
    } else {
      creases.push(edges.ends[2 * edge]!, edges.ends[2 * edge + 1]!);
      beside.push(Math.floor(one / 3), other < 0 ? -1 : Math.floor(other / 3));
    }
  }
  return { ...numbered(indices, sets), edges: Uint32Array.from(creases), beside: Int32Array.from(beside) };
}

/** A triangle without area has no direction and never makes a crease. */
function cosineBetween(normals: Float32Array, one: number, other: number): number {
  if (one === other) return 1;
  const a = 3 * one;
  const b = 3 * other;
  const dot =
    normals[a]! * normals[b]! + normals[a + 1]! * normals[b + 1]! + normals[a + 2]! * normals[b + 2]!;
  return dot === 0 && (isZero(normals, a) || isZero(normals, b)) ? 1 : dot;
}

const isZero = (n: Float32Array, at: number): boolean => n[at] === 0 && n[at + 1] === 0 && n[at + 2] === 0;

function numbered(indices: Uint32Array, sets: CornerSets): Pick<Shading, 'indices' | 'source'> {
  const number = new Int32Array(indices.length).fill(-1);
  const drawn = new Uint32Array(indices.length);
  const source: number[] = [];
  for (let corner = 0; corner < indices.length; corner += 1) {
    const root = sets.root(corner);
    if (number[root]! < 0) {
      number[root] = source.length;
      source.push(indices[corner]!);
    }
    drawn[corner] = number[root]!;
  }
  return { indices: drawn, source: Uint32Array.from(source) };
}

/**
 * Writes positions and unit normals of the drawn vertices from welded positions. Normals are means of the faces of
 * the same smooth patch, weighted by area.
 */
export function writeDrawn(
  welded: Float32Array,
  { indices, source }: Shading,
  positions: Float32Array,
  normals: Float32Array,
): void {
  for (let k = 0; k < source.length; k += 1) {
    const from = 3 * source[k]!;
    positions[3 * k] = welded[from]!;
    positions[3 * k + 1] = welded[from + 1]!;
    positions[3 * k + 2] = welded[from + 2]!;
  }
  normals.fill(0);
  for (let side = 0; side < indices.length; side += 3) addFace(positions, normals, indices, side);
  for (let k = 0; k < normals.length; k += 3) {
    const size = Math.hypot(normals[k]!, normals[k + 1]!, normals[k + 2]!) || 1;
    normals[k]! /= size;
    normals[k + 1]! /= size;
    normals[k + 2]! /= size;
  }
}

function addFace(p: Float32Array, normals: Float32Array, indices: Uint32Array, side: number): void {
  const a = 3 * indices[side]!;
  const b = 3 * indices[side + 1]!;
  const c = 3 * indices[side + 2]!;
  const ux = p[b]! - p[a]!;
  const uy = p[b + 1]! - p[a + 1]!;
  const uz = p[b + 2]! - p[a + 2]!;
  const vx = p[c]! - p[a]!;
  const vy = p[c + 1]! - p[a + 1]!;
  const vz = p[c + 2]! - p[a + 2]!;
  for (const at of [a, b, c]) {
    normals[at]! += uy * vz - uz * vy;
    normals[at + 1]! += uz * vx - ux * vz;
    normals[at + 2]! += ux * vy - uy * vx;
  }
}
