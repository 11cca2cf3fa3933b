import type { Mesh } from '../mesh/mesh';
import type { LayerVerdict } from '../strain/layers';
import type { Peak } from '../strain/peak';

/** The part at one moment of the motion. */
export interface SolvedStep {
  /** mm, or rad for a rotation; of the whole part where the model is mirrored */
  readonly deflection: number;
  /** N, or N mm for a rotation, factors of the model included */
  readonly force: number;
  /** x, y per node, mm */
  readonly displacement: Float64Array;
  /** signed strain per node as a fraction: the principal strain of largest size, factors included */
  readonly strain: Float32Array;
}

export interface Solved {
  readonly ok: true;
  readonly mesh: Mesh;
  readonly method: 'linear' | 'non-linear';
  /** why the answer is linear although large displacement was asked for; null otherwise */
  readonly fellBack: string | null;
  /** an equilibrium on the way is unstable: the part would snap through */
  readonly unstable: boolean;
  /** in rising order of deflection, the last is the full one */
  readonly steps: readonly SolvedStep[];
  /** largest tension: what the verdict stands on */
  readonly tension: Peak;
  readonly compression: Peak;
  /** worst tension against the allowable in its direction; null where layers do not matter or data is missing */
  readonly layers: LayerVerdict | null;
  /** estimated error of the peak from the mesh, as a fraction of it */
  readonly errorEstimate: number;
  readonly unknowns: number;
  readonly elements: number;
  readonly factorisations: number;
}

export interface Unsolved {
  readonly ok: false;
  readonly reason: string;
}

export type Solution = Solved | Unsolved;
