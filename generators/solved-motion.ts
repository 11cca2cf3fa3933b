import { type Moment, type Moved, momentAt, readMoment } from '@/lib/fea/preview/between';
import { type Anchors, locate } from '@/lib/fea/preview/locate';
import type { Solved } from '@/lib/fea/solve/solution';
import type { Placement } from '@/lib/geometry/kernel';
import type { BendingPlane, Motion, Posed } from './contract';

/** Coordinates of the body's points in the plane: xy each, folded to x >= 0 where the part is its own mirror image. */
function intoPlane(at: Placement, rest: Float32Array, mirrored: boolean): Float32Array {
  const points = new Float32Array((2 * rest.length) / 3);
  for (let i = 0; i < rest.length / 3; i++) {
    const [dx, dy, dz] = [0, 1, 2].map((k) => rest[3 * i + k]! - at[12 + k]!) as [number, number, number];
    const x = at[0]! * dx + at[1]! * dy + at[2]! * dz;
    points[2 * i] = mirrored ? Math.abs(x) : x;
    points[2 * i + 1] = at[4]! * dx + at[5]! * dy + at[6]! * dz;
  }
  return points;
}

/** -1 for points on the far side of a mirrored part. */
function sideOf(at: Placement, rest: Float32Array, i: number): 1 | -1 {
  const x = [0, 1, 2].reduce((sum, k) => sum + at[k]! * (rest[3 * i + k]! - at[12 + k]!), 0);
  return x < 0 ? -1 : 1;
}

function poseBody(
  plane: BendingPlane,
  solution: Solved,
  moment: Moment,
  anchors: Anchors,
  rest: Float32Array,
  out: Posed,
): void {
  const at = plane.placement;
  const moved: Moved = { x: 0, y: 0, strain: 0 };
  for (let i = 0; i < rest.length / 3; i++) {
    readMoment(solution.mesh, moment, anchors, i, moved);
    const x = plane.model.mirrored ? sideOf(at, rest, i) * moved.x : moved.x;
    for (let k = 0; k < 3; k++) {
      out.positions[3 * i + k] = rest[3 * i + k]! + at[k]! * x + at[4 + k]! * moved.y;
    }
    out.strain[i] = moved.strain;
  }
}

/**
 * The motion of a part as it was solved, at true scale: the body that bends takes the shape and the strain of the
 * finite elements, other bodies move as the family says. Points are found in the mesh once for each set of points.
 */
export function solvedMotion(family: Motion, plane: BendingPlane, solution: Solved): Motion {
  const known = new WeakMap<Float32Array, Anchors>();
  const anchorsOf = (rest: Float32Array): Anchors => {
    const anchors =
      known.get(rest) ?? locate(solution.mesh, intoPlane(plane.placement, rest, plane.model.mirrored));
    known.set(rest, anchors);
    return anchors;
  };
  return {
    ...family,
    peakStrain: Math.max(solution.tension.strain, -solution.compression.strain),
    pose(body, rest, t, out) {
      if (body !== plane.body) family.pose(body, rest, t, out);
      else poseBody(plane, solution, momentAt(solution, t), anchorsOf(rest), rest, out);
    },
  };
}
