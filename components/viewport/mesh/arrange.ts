import type { Motion } from '@/generators/contract';
import type { Placement, TriMesh } from '@/lib/geometry/kernel';
import { type PreparedBody, posed } from './prepare';

/** A body where it is drawn: posed, then placed. */
export interface Moved {
  readonly body: PreparedBody;
  readonly positions: Float32Array;
  /** signed surface strain per vertex, as a fraction */
  readonly strain: Float32Array;
}

function place(points: Float32Array, m: Placement): void {
  for (let k = 0; k < points.length; k += 3) {
    const [x, y, z] = [points[k]!, points[k + 1]!, points[k + 2]!];
    points[k] = m[0]! * x + m[4]! * y + m[8]! * z + m[12]!;
    points[k + 1] = m[1]! * x + m[5]! * y + m[9]! * z + m[13]!;
    points[k + 2] = m[2]! * x + m[6]! * y + m[10]! * z + m[14]!;
  }
}

export function arrange(
  bodies: readonly PreparedBody[],
  motion: Motion | null,
  t: number,
  placements: Readonly<Record<string, Placement>> = {},
): Moved[] {
  return bodies.map((body) => {
    const { positions, strain } = posed(body, motion, t);
    const at = placements[body.name];
    if (at) place(positions, at);
    return { body, positions, strain };
  });
}

export const meshOf = ({ body, positions }: Moved): TriMesh => ({ positions, indices: body.mesh.indices });
