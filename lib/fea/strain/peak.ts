import type { Mesh } from '../mesh/mesh';
import type { Point } from '../profile/segment';
import type { SurfaceStrain } from './surface';

/** Largest strain of one sign on the searched edges. */
export interface Peak {
  /** fraction, tension positive */
  readonly strain: number;
  readonly node: number;
  readonly place: Point;
  /** `along` the surface in the plane, or `round` the axis */
  readonly direction: 'along' | 'round';
}

/** The larger of the two surface strains at a node, for the given sign. */
function strongest(strain: SurfaceStrain, node: number, sign: 1 | -1): number {
  return Math.max(sign * strain.along[node]!, sign * strain.round[node]!);
}

/** Largest tension (sign 1) or compression (sign -1); the strain is 0 where there is none of that sign. */
export function findPeak(mesh: Mesh, strain: SurfaceStrain, sign: 1 | -1): Peak {
  let node = -1;
  let most = Number.NEGATIVE_INFINITY;
  for (let n = 0; n < mesh.nodeCount; n++) {
    if (Number.isNaN(strain.along[n]!)) continue;
    const here = strongest(strain, n, sign);
    if (here > most) [node, most] = [n, here];
  }
  if (node < 0) throw new Error('the model names no edge to look for the peak on');
  return {
    strain: sign * Math.max(0, most),
    node,
    place: [mesh.nodes[2 * node]!, mesh.nodes[2 * node + 1]!],
    direction: sign * strain.along[node]! >= sign * strain.round[node]! ? 'along' : 'round',
  };
}
