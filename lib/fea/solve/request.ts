import type { BendingModel, ElasticNumbers } from '../model';
import type { LayerAllowable } from '../strain/layers';
import type { SolveOptions } from './options';
import type { Solution } from './solution';
import { solveBending } from './solve-bending';

/** Everything a solve needs, as plain data: what is sent to a worker. */
export interface SolveRequest {
  readonly model: BendingModel;
  readonly numbers: ElasticNumbers;
  readonly options: SolveOptions;
  readonly allowable: LayerAllowable | null;
}

export const solveRequested = ({ model, numbers, options, allowable }: SolveRequest): Solution =>
  solveBending(model, numbers, options, allowable);

/** The arrays of a solution that may be handed over to another thread without copying. */
export function buffersOf(solution: Solution): ArrayBuffer[] {
  if (!solution.ok) return [];
  const { nodes, elements, edges } = solution.mesh;
  const arrays = [
    nodes,
    elements,
    edges,
    ...solution.steps.flatMap(({ displacement, strain }) => [displacement, strain]),
  ];
  return arrays.map((array) => array.buffer as ArrayBuffer);
}
