import type { TriMesh, Vec3 } from '../kernel';

/** Where the part is looked at from: turned about +Z from the -Y side, then raised above the floor. Radians. */
export interface Direction {
  readonly turn: number;
  readonly rise: number;
}

export interface Camera {
  readonly right: Vec3;
  readonly up: Vec3;
  /** towards the eye */
  readonly toward: Vec3;
}

/** Parallel projection: no vanishing points, so that equal lengths stay equal. */
export function cameraOf({ turn, rise }: Direction): Camera {
  const [c, s] = [Math.cos(turn), Math.sin(turn)];
  const [cr, sr] = [Math.cos(rise), Math.sin(rise)];
  return { right: [c, s, 0], up: [-s * sr, c * sr, cr], toward: [s * cr, -c * cr, sr] };
}

/** Right, up and towards the eye of every vertex, one triple each, in mm. */
export function seen(mesh: TriMesh, { right, up, toward }: Camera): Float32Array {
  const { positions } = mesh;
  const points = new Float32Array(positions.length);
  for (let at = 0; at < positions.length; at += 3) {
    const [x, y, z] = [positions[at]!, positions[at + 1]!, positions[at + 2]!];
    points[at] = right[0] * x + right[1] * y + right[2] * z;
    points[at + 1] = up[0] * x + up[1] * y + up[2] * z;
    points[at + 2] = toward[0] * x + toward[1] * y + toward[2] * z;
  }
  return points;
}

export interface Size {
  readonly width: number;
  readonly height: number;
}

/** Least and greatest right and up over all points, mm. */
function frameOf(parts: readonly Float32Array[]) {
  let [left, right, bottom, top] = [Infinity, -Infinity, Infinity, -Infinity];
  for (const points of parts) {
    for (let at = 0; at < points.length; at += 3) {
      left = Math.min(left, points[at]!);
      right = Math.max(right, points[at]!);
      bottom = Math.min(bottom, points[at + 1]!);
      top = Math.max(top, points[at + 1]!);
    }
  }
  return { left, right, bottom, top };
}

/**
 * Scales seen points in place to pixels, the part centred with `margin` (share of the edge) round it; x to the right,
 * y down, depth towards the eye on the same scale.
 */
export function fitTo(parts: readonly Float32Array[], { width, height }: Size, margin: number): void {
  const { left, right, bottom, top } = frameOf(parts);
  const room = 1 - 2 * margin;
  const scale = Math.min((width * room) / (right - left), (height * room) / (top - bottom));
  const [middleX, middleY] = [(left + right) / 2, (bottom + top) / 2];
  for (const points of parts) {
    for (let at = 0; at < points.length; at += 3) {
      points[at] = width / 2 + (points[at]! - middleX) * scale;
      points[at + 1] = height / 2 - (points[at + 1]! - middleY) * scale;
      points[at + 2] = points[at + 2]! * scale;
    }
  }
}
