import { KernelError, type Loop, type Placement, type TriMesh, type Vec3 } from './kernel';
import { profileFault } from './loops';
import { weld } from './mesh-check';
import { isRigid, movePoint } from './placement';
import { triangulate } from './triangulate';

export interface SweepOptions {
  /** joins the last frame to the first; without it both ends are capped */
  readonly closed?: boolean;
}

/** The section at each frame; sections may differ in shape but not in the number of points. */
function sectionsOf(section: Loop | ((at: number) => Loop), frames: readonly Placement[]): Loop[] {
  const sections = frames.map((_, at) => (typeof section === 'function' ? section(at) : section));
  for (const one of new Set(sections)) {
    const fault = profileFault({ loops: [one] });
    if (fault) throw new KernelError('sweep', fault);
    if (one.length !== sections[0]!.length) {
      throw new KernelError('sweep', 'the sections differ in their number of points');
    }
  }
  return sections;
}

function walls(rings: number, points: number, closed: boolean): number[] {
  const triangles: number[] = [];
  for (let ring = 0; ring < (closed ? rings : rings - 1); ring += 1) {
    const here = ring * points;
    const there = ((ring + 1) % rings) * points;
    for (let at = 0; at < points; at += 1) {
      const next = (at + 1) % points;
      triangles.push(here + at, here + next, there + next, here + at, there + next, there + at);
    }
  }
  return triangles;
}

/**
 * Closed mesh of a plane section swept through frames. A frame carries the section's plane (x, y) into space; its z
 * looks along the path. The section is simple and counter-clockwise. The path must not bend more sharply, or come
 * nearer to itself, than the section is wide: overlaps are not seen here.
 */
export function sweep(
  section: Loop | ((at: number) => Loop),
  frames: readonly Placement[],
  { closed = false }: SweepOptions = {},
): TriMesh {
  if (frames.length < (closed ? 3 : 2)) throw new KernelError('sweep', 'too few frames');
  if (!frames.every(isRigid)) throw new KernelError('sweep', 'a frame is not a rotation and translation');
  const sections = sectionsOf(section, frames);
  const points = sections[0]!.length;
  const positions = frames.flatMap((frame, at) =>
    sections[at]!.flatMap(([x, y]) => movePoint(frame, [x, y, 0])),
  );
  const triangles = walls(frames.length, points, closed);
  if (!closed) {
    const last = (frames.length - 1) * points;
    triangles.push(...triangulate(sections[0]!).reverse());
    triangles.push(...triangulate(sections.at(-1)!).map((index) => index + last));
  }
  return weld(positions, triangles);
}

const less = (a: Vec3, b: Vec3): Vec3 => [a[0] - b[0], a[1] - b[1], a[2] - b[2]];
const cross = (a: Vec3, b: Vec3): Vec3 => [
  a[1] * b[2] - a[2] * b[1],
  a[2] * b[0] - a[0] * b[2],
  a[0] * b[1] - a[1] * b[0],
];
function unit(v: Vec3): Vec3 {
  const length = Math.hypot(...v);
  if (!(length > 1e-9)) throw new KernelError('framesAlong', 'the path stops or runs along `up`');
  return [v[0] / length, v[1] / length, v[2] / length];
}

/**
 * Frames along a path of points: z along the path (mean of the two pieces that meet), y as near to `up` as that
 * allows, x to the right of both. `up` must not be parallel to the path.
 */
export function framesAlong(
  path: readonly Vec3[],
  up: Vec3,
  { closed = false }: SweepOptions = {},
): Placement[] {
  const last = path.length - 1;
  const pointAt = (at: number) =>
    closed ? path[(at + path.length) % path.length]! : path[Math.min(last, Math.max(0, at))]!;
  return path.map((point, at) => {
    const z = unit(less(pointAt(at + 1), pointAt(at - 1)));
    const x = unit(cross(up, z));
    const y = cross(z, x);
    return [...x, 0, ...y, 0, ...z, 0, ...point, 1];
  });
}
