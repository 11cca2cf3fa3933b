import type { Motion, Posed } from '@/generators/contract';
import type { BuiltBody, TriMesh } from '@/lib/geometry/kernel';
import { bentBy, posedLike, REFINE_LIMITS, type Refined, refine, unrefined } from './refine';
import { type Shading, shadingOf } from './shading';

/** A body ready to be drawn and moved. `mesh` is at rest, fine enough to bend where the motion bends it. */
export interface PreparedBody {
  readonly name: string;
  readonly mesh: TriMesh;
  readonly shading: Shading;
}

/** Off-chord error allowed in a bent part, as a share of its size: about a pixel on a large screen. */
const SAG_SHARE = 0.0012;
/** Strain error allowed between vertices, as a share of the peak. */
const STRAIN_SHARE = 0.05;

const sizeOf = ({ bounds: b }: BuiltBody): number => Math.hypot(b[3] - b[0], b[4] - b[1], b[5] - b[2]);

function fineEnough(body: BuiltBody, motion: Motion | null, maxTriangles: number): Refined {
  if (!motion) return unrefined(body.mesh);
  const strainStep = Math.max(motion.peakStrain * STRAIN_SHARE, 1e-6);
  const rule = bentBy(motion, body.name, sizeOf(body) * SAG_SHARE, strainStep);
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
  readonly body: number;
  readonly vertex: number;
}

/** The vertex of largest absolute strain over all bodies; null where nothing strains. */
export function peakOf(moments: readonly Posed[]): Peak | null {
  let peak: Peak | null = null;
  moments.forEach(({ strain }, body) => {
    for (let vertex = 0; vertex < strain.length; vertex += 1) {
      if (Math.abs(strain[vertex]!) > Math.abs(peak?.strain ?? 1e-9)) {
        peak = { strain: strain[vertex]!, body, vertex };
      }
    }
  });
  return peak;
}
