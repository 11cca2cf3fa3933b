import type { SolveRequest } from '@/lib/fea/solve/request';
import type { Solution } from '@/lib/fea/solve/solution';

export interface ToSolver {
  readonly job: number;
  readonly request: SolveRequest;
}

/** A shape that cannot be solved is a solution with the reason; a fault is an error of the program. */
export type FromSolver =
  | { readonly job: number; readonly solution: Solution }
  | { readonly job: number; readonly fault: string };
