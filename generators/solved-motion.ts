import type { Mesh } from '@/lib/fea/mesh/mesh';
import { type Moment, type Moved, momentAt, readMoment } from '@/lib/fea/preview/between';
import { type Anchors, locate } from '@/lib/fea/preview/locate';
import type { Solved } from '@/lib/fea/solve/solution';
import type { Placement } from '@/lib/geometry/kernel';
import { countedPeak } from './computed';
import type { BendingPlane, Motion, Posed } from './contract';

type Axis = 0 | 1;

/** Coordinate of a point of the body along an axis of the plane. */
function along(at: Placement, axis: Axis, rest: Float32Array, i: number): number {
  let sum = 0;
  for (let k = 0; k < 3; k++) sum += at[4 * axis + k]! * (rest[3 * i + k]! - at[12 + k]!);
  return sum;
}

/** Where the body's points are in the plane, and which way its x points for each of them. */
interface Seen {
  readonly anchors: Anchors;
  /** -1 on the far side of a mirrored part */
  readonly sides: Int8Array;
}

/** The placement whose plane has the point nearest to its middle. */
function nearest(placements: readonly Placement[], rest: Float32Array, i: number): Placement {
  return placements.reduce((best, at) =>
    Math.abs(along(at, 0, rest, i)) < Math.abs(along(best, 0, rest, i)) ? at : best,
  );
}

function look({ placements, model }: BendingPlane, mesh: Mesh, rest: Float32Array): Seen {
  const count = rest.length / 3;
  const points = new Float32Array(2 * count);
  const sides = new Int8Array(count).fill(1);
  for (let i = 0; i < count; i++) {
    const at = nearest(placements, rest, i);
    const x = along(at, 0, rest, i);
    if (model.mirrored && x < 0) sides[i] = -1;
    points[2 * i] = sides[i]! * x;
    points[2 * i + 1] = along(at, 1, rest, i);
  }
  return { anchors: locate(mesh, points), sides };
}

/** Distance from the mesh, mm, past which a point belongs to what the plane leaves out, such as the foot of a clip. */
const OUTSIDE = 0.1;

const isOutside = ({ offsets }: Anchors, i: number): boolean =>
  Math.hypot(offsets[2 * i]!, offsets[2 * i + 1]!) > OUTSIDE;

/** Placements of one plane differ by shifts only, so the first gives the directions. */
function poseBody(
  { placements: [at] }: BendingPlane,
  { mesh }: Solved,
  moment: Moment,
  { anchors, sides }: Seen,
  rest: Float32Array,
  out: Posed,
): void {
  const moved: Moved = { x: 0, y: 0, strain: 0 };
  for (let i = 0; i < sides.length; i++) {
    readMoment(mesh, moment, anchors, i, moved);
    for (let k = 0; k < 3; k++) {
      out.positions[3 * i + k] = rest[3 * i + k]! + at[k]! * sides[i]! * moved.x + at[4 + k]! * moved.y;
    }
    out.strain[i] = isOutside(anchors, i) ? 0 : moved.strain;
  }
}

/**
 * The motion of a part as it was solved, at true scale: the body that bends takes the shape and the strain of the
 * finite elements, other bodies move as the family says, all of them where the plane leaves the motion to it. What the
 * plane leaves out of the body is carried along unstrained. Points are found in the mesh once for each set of points.
 */
export function solvedMotion(family: Motion, plane: BendingPlane, solution: Solved): Motion {
  if (plane.motion === 'family') return family;
  const known = new WeakMap<Float32Array, Seen>();
  const seen = (rest: Float32Array): Seen => {
    const found = known.get(rest) ?? look(plane, solution.mesh, rest);
    known.set(rest, found);
    return found;
  };
  const peak = countedPeak(solution, plane);
  return {
    ...family,
    by: 'finite elements',
    peakStrain: Math.max(solution.tension.strain, -solution.compression.strain),
    markedStrain: (t) => (t === 0 ? 0 : momentAt(solution, t).strain[peak.node]!),
    pose(body, rest, t, out) {
      if (body !== plane.body) family.pose(body, rest, t, out);
      else poseBody(plane, solution, momentAt(solution, t), seen(rest), rest, out);
    },
  };
}
