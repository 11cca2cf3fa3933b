import type { Motion, Posed } from '@/generators/contract';
import type { BuiltBody, TriMesh } from '@/lib/geometry/kernel';
import { boxOf, diagonalOf } from './bounds';
import { bentBy, posedLike, REFINE_LIMITS, type Refined, refine, unrefined } from './refine';
import { type Shading, shadingOf } from './shading';

/** A body ready to be drawn and moved. `mesh` is at rest, fine enough to bend where the motion bends it. */
export interface PreparedBody {
  readonly name: string;
  readonly mesh: TriMesh;
  readonly shading: Shading;
}

/** Off-chord error allowed in a bent part, as a share of its size there: about a pixel on a large screen. */
const SAG_SHARE = 0.0009;
/** Strain error allowed between vertices, as a share of the peak. */
const STRAIN_SHARE = 0.05;

/** The smaller of the sizes at both ends of the motion: a strap is looked at flat, and closed from nearer by. */
function sizeOf({ name, mesh }: BuiltBody, motion: Motion): number {
  const moved = posedLike(mesh.positions);
  motion.pose(name, mesh.positions, 1, moved);
  const sizes = [mesh.positions, moved.positions].map((points) => diagonalOf(boxOf([{ points }])));
  return Math.min(...sizes);
}

function fineEnough(body: BuiltBody, motion: Motion | null, maxTriangles: number): Refined {
  if (!motion) return unrefined(body.mesh);
  const strainStep = Math.max(motion.peakStrain * STRAIN_SHARE, 1e-6);
  const rule = bentBy(motion, body.name, sizeOf(body, motion) * SAG_SHARE, strainStep);
  return refine(body.mesh, rule, { ...REFINE_LIMITS, maxTriangles });
}

/** Pass the motion where the part will be moved; without it the mesh is drawn as built. */
export function prepare(
  body: BuiltBody,
  motion: Motion | null,
  maxTriangles = REFINE_LIMITS.maxTriangles,
): PreparedBody {
  const refined = fineEnough(body, motion, maxTriangles);
  return { name: body.name, mesh: refined.mesh, shading: shadingOf(refined, body.mesh) };
}

/** The body at a moment of the motion; at rest without one. */
export function posed(body: PreparedBody, motion: Motion | null, t: number): Posed {
  const out = posedLike(body.mesh.positions);
  if (motion) motion.pose(body.name, body.mesh.positions, t, out);
  else out.positions.set(body.mesh.positions);
  return out;
}

export interface Peak {
  /** signed, as a fraction */
  readonly strain: number;
  /** index of the body */
  readonly body: number;
  /** its vertices strained as much, within a fiftieth */
  readonly vertices: readonly number[];
}

const AS_MUCH = 0.98;

/**
 * The largest absolute strain over all bodies, or the largest of one sign, and where it is; null where nothing strains
 * so.
 */
export function peakOf(moments: readonly Pick<Posed, 'strain'>[], sign: 1 | -1 | 0 = 0): Peak | null {
  const counts = (one: number) => (sign === 0 ? Math.abs(one) : Math.max(0, sign * one));
  const largest = ({ strain }: Pick<Posed, 'strain'>) =>
    strain.reduce((peak, one) => (counts(one) > counts(peak) ? one : peak), 0);
  const peaks = moments.map(largest);
  const body = peaks.reduce((best, one, k) => (Math.abs(one) > Math.abs(peaks[best]!) ? k : best), 0);
  const peak = peaks[body] ?? 0;
  if (Math.abs(peak) < 1e-9) return null;
  const vertices: number[] = [];
  moments[body]!.strain.forEach((one, vertex) => {
    if (one / peak >= AS_MUCH) vertices.push(vertex);
  });
  return { strain: peak, body, vertices };
}
