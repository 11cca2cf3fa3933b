import { profileFault } from '../profile/faults';
import { allSegments, type Profile, profileArea } from '../profile/profile';
import { sampleBoundary } from './boundary';
import { fillInside } from './front';
import type { MeshOptions } from './options';
import { quadratic } from './quadratic';
import { sizeField } from './size-field';
import { triangulate } from './triangulate';

/**
 * Six-node triangles. Element nodes: three corners counter-clockwise, then the middles of edges 0-1, 1-2, 2-0.
 * Flat arrays, so that a mesh crosses to and from a worker without copying.
 */
export interface Mesh {
  /** x, y per node, mm; corner nodes first */
  readonly nodes: Float64Array;
  readonly nodeCount: number;
  readonly cornerCount: number;
  /** six nodes per element */
  readonly elements: Int32Array;
  readonly elementCount: number;
  /** start, middle, end node and segment of each boundary edge, material on the left */
  readonly edges: Int32Array;
  readonly edgeCount: number;
  /** tag of each segment of the profile */
  readonly tags: readonly string[];
}

export type Meshed =
  | { readonly ok: true; readonly mesh: Mesh }
  | { readonly ok: false; readonly reason: string };

const refuse = (reason: string): Meshed => ({ ok: false, reason });

/** Share by which the mesh's area may miss the profile's before the mesh counts as wrong. */
const AREA_SLACK = 1e-4;

/**
 * Meshes a profile. Same profile and options, same bytes. A profile that is open, crossed, too fine for the cap or
 * cannot be followed is a reason, not an exception.
 */
export function meshProfile(profile: Profile, options: MeshOptions): Meshed {
  const fault = profileFault(profile);
  if (fault) return refuse(fault);
  const size = sizeField(profile, options);
  const boundary = sampleBoundary(profile, size);
  const points = fillInside(boundary, size);
  if (!points) return refuse('the shape needs more elements than the limit');
  const segments = allSegments(profile);
  const triangles = triangulate(points, boundary.pieces, segments, options.smoothing);
  if (!triangles) return refuse('the triangles cannot follow the outline');
  const mesh = quadratic(triangles, segments);
  const area = profileArea(profile);
  if (!(Math.abs(meshArea(mesh) - area) <= AREA_SLACK * area))
    return refuse('the mesh misses part of the shape');
  return { ok: true, mesh };
}

/** Area in mm2 inside the curved outline of the mesh: chords plus the parabolic caps of the quadratic edges. */
export function meshArea({ edges, edgeCount, nodes }: Mesh): number {
  let area = 0;
  for (let e = 0; e < edgeCount; e++) {
    const [a, m, b] = [2 * edges[4 * e]!, 2 * edges[4 * e + 1]!, 2 * edges[4 * e + 2]!];
    const [ax, ay, bx, by] = [nodes[a]!, nodes[a + 1]!, nodes[b]!, nodes[b + 1]!];
    const bulgeX = nodes[m]! - (ax + bx) / 2;
    const bulgeY = nodes[m + 1]! - (ay + by) / 2;
    area += (ax * by - bx * ay) / 2 + (2 / 3) * (bulgeX * (by - ay) - bulgeY * (bx - ax));
  }
  return area;
}
