import type { Mesh } from '../mesh/mesh';
import { engineering, strainAlong } from './nodal';
import type { Peak } from './peak';
import type { SurfaceStrain } from './surface';

/** Largest jump of the surface strain at the ends of the edges that hold the node. */
function jumpAround(mesh: Mesh, surface: SurfaceStrain, node: number): number {
  const touching = surface.edges.filter((e) => mesh.edges.subarray(4 * e, 4 * e + 3).includes(node));
  const nodes = touching.flatMap((e) => [mesh.edges[4 * e]!, mesh.edges[4 * e + 2]!]);
  return nodes.reduce((most, end) => Math.max(most, surface.jump[end]!), 0);
}

/** Strain from inside the elements at the peak, in the direction of the peak. */
function insideAt(
  { node, direction }: Peak,
  surface: SurfaceStrain,
  nodal: Float64Array,
  finite: boolean,
): number {
  if (direction === 'round') return engineering(nodal[4 * node + 3]!, finite);
  return strainAlong(nodal, node, [surface.tangent[2 * node]!, surface.tangent[2 * node + 1]!], finite);
}

/**
 * Estimated error of the peak from the mesh, as a fraction of it: the larger of the difference between the surface
 * strain and the strain extrapolated from inside, and the jump of the surface strain between neighbouring edges.
 * Both vanish as the mesh gets finer. An indication, not a bound; a refined solve (see refined()) is the proof.
 * Method: recovery-type estimate after Zienkiewicz and Zhu, Int. J. Numer. Meth. Engrg. 24 (1987), from memory.
 */
export function peakError(
  mesh: Mesh,
  peak: Peak,
  surface: SurfaceStrain,
  nodal: Float64Array,
  finite: boolean,
): number {
  if (peak.strain === 0) return 0;
  const difference = Math.abs(insideAt(peak, surface, nodal, finite) - peak.strain);
  const jump = peak.direction === 'along' ? jumpAround(mesh, surface, peak.node) : 0;
  return Math.max(difference, jump) / Math.abs(peak.strain);
}
