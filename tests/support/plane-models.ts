import { assemble, newKernel } from '@/lib/fea/element/kernel';
import type { Law } from '@/lib/fea/element/law';
import type { Plane } from '@/lib/fea/element/plane';
import { gaussPoints } from '@/lib/fea/element/points';
import { type Mesh, meshProfile } from '@/lib/fea/mesh/mesh';
import { type MeshOptions, RECOMMENDED_MESH } from '@/lib/fea/mesh/options';
import type { Profile } from '@/lib/fea/profile/profile';
import type { Solution, Solved } from '@/lib/fea/solve/solution';
import { factorise } from '@/lib/fea/solver/factor';
import { multiply } from '@/lib/fea/solver/multiply';
import { structureOf } from '@/lib/fea/solver/structure';
import { substitute } from '@/lib/fea/solver/substitute';

/** Elastic numbers of the reference cases. */
export const REFERENCE = { modulus: 1500, poisson: 0.35, layers: null } as const;

export function meshed(profile: Profile, options: Partial<MeshOptions> = {}): Mesh {
  const result = meshProfile(profile, { ...RECOMMENDED_MESH, ...options });
  if (!result.ok) throw new Error(result.reason);
  return result.mesh;
}

export function solved(solution: Solution): Solved {
  if (!solution.ok) throw new Error(solution.reason);
  return solution;
}

export interface LinearProblem {
  readonly stiffness: Float64Array;
  /** solution for given nodal forces, displacement prescribed where `held` is 1 */
  solve(force: Float64Array, held: Uint8Array, prescribed: Float64Array): Float64Array;
}

/** A linear problem with forces and displacements of one's own, for checks below the level of a model. */
export function linearProblem(mesh: Mesh, plane: Plane, law: Law, width = 1): LinearProblem {
  const points = gaussPoints(mesh, plane, () => width);
  if (!points) throw new Error('an element is folded');
  const stiffness = new Float64Array(144 * mesh.elementCount);
  assemble(newKernel(mesh, points, law), null, null, stiffness, new Float64Array(2 * mesh.nodeCount));
  return {
    stiffness,
    solve(force, held, prescribed) {
      const known = prescribed.map((value, i) => (held[i] ? value : 0));
      const pull = multiply(mesh, stiffness, known);
      const right = force.map((f, i) => (held[i] ? 0 : f - pull[i]!));
      const free = substitute(factorise(structureOf(mesh, held), stiffness), right);
      return free.map((value, i) => (held[i] ? known[i]! : value));
    },
  };
}

/** 1 at both unknowns of every node on the boundary. */
export function heldBoundary(mesh: Mesh): Uint8Array {
  const held = new Uint8Array(2 * mesh.nodeCount);
  for (let e = 0; e < mesh.edgeCount; e++) {
    for (let k = 0; k < 3; k++) {
      const node = mesh.edges[4 * e + k]!;
      held[2 * node] = 1;
      held[2 * node + 1] = 1;
    }
  }
  return held;
}

/** Nodal values of a displacement field. */
export function sampled(
  mesh: Mesh,
  field: (x: number, y: number) => readonly [number, number],
): Float64Array {
  const u = new Float64Array(2 * mesh.nodeCount);
  for (let node = 0; node < mesh.nodeCount; node++) {
    u.set(field(mesh.nodes[2 * node]!, mesh.nodes[2 * node + 1]!), 2 * node);
  }
  return u;
}
