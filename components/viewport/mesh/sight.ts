import type { TriMesh, Vec3 } from '@/lib/geometry/kernel';
import type { Section } from '../scene-props';
import { AXES } from './slice';

type Points = Float32Array;

const at = (p: Points, vertex: number): Vec3 => [p[3 * vertex]!, p[3 * vertex + 1]!, p[3 * vertex + 2]!];

/** True for points on the side of a cut that is left standing: the one away from the eye. `eye`: unit vector to it. */
export function keptBy(section: Section | null, eye: Vec3): (point: Vec3) => boolean {
  if (!section) return () => true;
  const axis = AXES.indexOf(section.axis);
  const side = eye[axis]! > 0 ? -1 : 1;
  return (point) => side * (point[axis]! - section.at) >= 0;
}

/**
 * Distance along a ray at which it meets a triangle, in lengths of the direction; null where it passes by.
 * Method: Möller and Trumbore, Fast, minimum storage ray-triangle intersection, J. Graphics Tools 2 (1997), from memory.
 */
function meets(p: Points, a: number, b: number, c: number, from: Vec3, [dx, dy, dz]: Vec3): number | null {
  const [ax, ay, az] = [p[3 * a]!, p[3 * a + 1]!, p[3 * a + 2]!];
  const [ux, uy, uz] = [p[3 * b]! - ax, p[3 * b + 1]! - ay, p[3 * b + 2]! - az];
  const [vx, vy, vz] = [p[3 * c]! - ax, p[3 * c + 1]! - ay, p[3 * c + 2]! - az];
  const [hx, hy, hz] = [dy * vz - dz * vy, dz * vx - dx * vz, dx * vy - dy * vx];
  const det = ux * hx + uy * hy + uz * hz;
  if (Math.abs(det) < 1e-12) return null;
  const [sx, sy, sz] = [from[0] - ax, from[1] - ay, from[2] - az];
  const u = (sx * hx + sy * hy + sz * hz) / det;
  if (u < 0 || u > 1) return null;
  const [qx, qy, qz] = [sy * uz - sz * uy, sz * ux - sx * uz, sx * uy - sy * ux];
  const v = (dx * qx + dy * qy + dz * qz) / det;
  if (v < 0 || u + v > 1) return null;
  return (vx * qx + vy * qy + vz * qz) / det;
}

export interface Sight {
  /** the bodies that cannot be seen through */
  readonly solids: readonly TriMesh[];
  /** unit vector to the eye */
  readonly eye: Vec3;
  readonly section: Section | null;
  /** mm; what lies nearer before a point than this is its own surface */
  readonly skin: number;
}

/** Walls of a closed body between a point and the eye: those left standing, and those that were cut away. */
function walls({ positions, indices }: TriMesh, point: Vec3, { eye, section, skin }: Sight) {
  const kept = keptBy(section, eye);
  const count = { standing: 0, cut: 0 };
  for (let side = 0; side < indices.length; side += 3) {
    const far = meets(positions, indices[side]!, indices[side + 1]!, indices[side + 2]!, point, eye);
    if (far === null || far <= skin) continue;
    const wall: Vec3 = [point[0] + far * eye[0], point[1] + far * eye[1], point[2] + far * eye[2]];
    if (kept(wall)) count.standing += 1;
    else count.cut += 1;
  }
  return count;
}

/**
 * True where nothing solid that is left standing lies between a point and the eye. An odd number of walls past the
 * cut means that the cut goes through solid there, and its face hides the point.
 */
export function isSeen(point: Vec3, sight: Sight): boolean {
  return sight.solids.every((solid) => {
    const { standing, cut } = walls(solid, point, sight);
    return standing === 0 && cut % 2 === 0;
  });
}

/** A place wider than this, in shares of the size of the part, is marked patch by patch. */
const PATCH = 0.2;
/** Vertices tried in a patch, and as many outside it. */
const TRIES = 8;

const along = (p: Vec3, q: Vec3): number => p[0] * q[0] + p[1] * q[1] + p[2] * q[2];
const apart = (p: Vec3, q: Vec3): number => Math.hypot(p[0] - q[0], p[1] - q[1], p[2] - q[2]);

function thinned<T>(list: readonly T[], most: number): T[] {
  const step = Math.max(1, list.length / most);
  return Array.from({ length: Math.min(most, list.length) }, (_, k) => list[Math.floor(k * step)]!);
}

/** Points to try: the patch nearest to the eye from its middle outwards, then the others from near to far. */
function tries(points: readonly Vec3[], eye: Vec3, size: number): Vec3[] {
  const near = [...points].sort((p, q) => along(q, eye) - along(p, eye));
  const patch = near.filter((point) => apart(point, near[0]!) <= PATCH * size);
  const sum = patch.reduce<Vec3>((all, p) => [all[0] + p[0], all[1] + p[1], all[2] + p[2]], [0, 0, 0]);
  const middle = sum.map((value) => value / patch.length) as unknown as Vec3;
  patch.sort((p, q) => apart(p, middle) - apart(q, middle));
  const others = near.filter((point) => apart(point, near[0]!) > PATCH * size);
  return [...thinned(patch, TRIES), ...thinned(others, TRIES)];
}

export interface Place {
  readonly point: Vec3;
  /** false where the part itself stands before it */
  readonly seen: boolean;
}

/** Where to mark a place that is spread over vertices; null where all of it is cut away. */
export function markOf(p: Points, vertices: readonly number[], size: number, sight: Sight): Place | null {
  const kept = keptBy(sight.section, sight.eye);
  const points = vertices.map((vertex) => at(p, vertex)).filter(kept);
  if (points.length === 0) return null;
  const candidates = tries(points, sight.eye, size);
  const point = candidates.find((one) => isSeen(one, sight));
  return { point: point ?? candidates[0]!, seen: point !== undefined };
}
