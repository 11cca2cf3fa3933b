import type { TriMesh } from '@/lib/geometry/kernel';

export type Axis = 'x' | 'y' | 'z';
export const AXES: readonly Axis[] = ['x', 'y', 'z'];

/** A closed outline in the section plane, xyz per point. */
export type Outline = Float32Array;

/**
 * Outlines where a closed mesh meets the plane `axis = at` (mm). Points lie on mesh edges and are chained by those
 * edges, so no tolerance is needed; a vertex in the plane counts as above it. Seen from the positive axis, outer
 * outlines run counter-clockwise and holes clockwise.
 */
export function slice({ positions, indices }: TriMesh, axis: Axis, at: number): Outline[] {
  const along = AXES.indexOf(axis);
  const vertices = positions.length / 3;
  const height = (vertex: number) => positions[3 * vertex + along]! - at;
  const following = new Map<number, number>();
  for (let side = 0; side < indices.length; side += 3) {
    const segment = crossing(indices, side, height, vertices);
    if (segment) following.set(segment[0], segment[1]);
  }
  return chains(following).map((edges) => {
    const outline = new Float32Array(3 * edges.length);
    edges.forEach((edge, k) => {
      outline.set(pointOn(positions, Math.floor(edge / vertices), edge % vertices, height, along, at), 3 * k);
    });
    return outline;
  });
}

/** The mesh edges where a triangle leaves and enters the upper side, in this order, each as one number, or null. */
function crossing(
  indices: Uint32Array,
  side: number,
  height: (vertex: number) => number,
  vertices: number,
): [number, number] | null {
  let down = -1;
  let up = -1;
  for (let k = 0; k < 3; k += 1) {
    const a = indices[side + k]!;
    const b = indices[side + ((k + 1) % 3)]!;
    const aUp = height(a) >= 0;
    if (aUp === height(b) >= 0) continue;
    const edge = Math.min(a, b) * vertices + Math.max(a, b);
    if (aUp) down = edge;
    else up = edge;
  }
  return down < 0 ? null : [down, up];
}

function chains(following: Map<number, number>): number[][] {
  const loops: number[][] = [];
  for (const start of following.keys()) {
    const loop: number[] = [];
    let at: number | undefined = start;
    while (at !== undefined && following.has(at)) {
      const next: number | undefined = following.get(at);
      following.delete(at);
      loop.push(at);
      at = next;
    }
    if (loop.length > 2) loops.push(loop);
  }
  return loops;
}

function pointOn(
  p: Float32Array,
  a: number,
  b: number,
  height: (vertex: number) => number,
  along: number,
  at: number,
): [number, number, number] {
  const share = height(a) / (height(a) - height(b));
  const point = [0, 1, 2].map((axis) => p[3 * a + axis]! + share * (p[3 * b + axis]! - p[3 * a + axis]!));
  point[along] = at;
  return point as [number, number, number];
}

/** Outline seen from the positive axis, as pairs. */
export function flatten(outline: Outline, axis: Axis): [number, number][] {
  const [u, v] = { x: [1, 2], y: [2, 0], z: [0, 1] }[axis] as [number, number];
  return Array.from({ length: outline.length / 3 }, (_, k) => [outline[3 * k + u]!, outline[3 * k + v]!]);
}

/** Enclosed area in mm2, counter-clockwise positive. */
export function signedArea(points: readonly (readonly [number, number])[]): number {
  return points.reduce((sum, [x, y], k) => {
    const [nx, ny] = points[(k + 1) % points.length]!;
    return sum + (x * ny - nx * y) / 2;
  }, 0);
}
