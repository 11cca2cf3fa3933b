import { cantileverModel } from '@/lib/fea/shapes/cantilever';
import { LINEAR } from '@/lib/fea/solve/options';
import { buffersOf, type SolveRequest, solveRequested } from '@/lib/fea/solve/request';
import type { Solution } from '@/lib/fea/solve/solution';

export type ToSolver =
  | { readonly kind: 'warm-up' }
  | { readonly kind: 'solve'; readonly job: number; readonly request: SolveRequest };

export interface FromSolver {
  readonly job: number;
  readonly solution: Solution;
  /** time of the solve in the worker, ms */
  readonly took: number;
}

/** Times a small arm is solved, so that the engine has compiled the solver before the first part comes. */
const WARM_UPS = 6;

let asked = false;

/** One at a time, so that a part that comes meanwhile waits for one at most; none once a part has come. */
function warmUp(left: number): void {
  if (left === 0 || asked) return;
  solveRequested(smallArm());
  setTimeout(() => warmUp(left - 1));
}

function smallArm(): SolveRequest {
  const model = cantileverModel({
    length: 8,
    thickness: 2,
    tipThickness: 1.5,
    catch: null,
    root: { kind: 'base', thickness: 3, span: 10, bottom: true },
    fillets: { front: 1, back: 1 },
    width: { kind: 'even', width: 5 },
    deflection: 0.5,
  });
  const numbers = { modulus: 1500, poisson: 0.35, layers: null };
  return { model, numbers, options: LINEAR, allowable: null };
}

function solve(job: number, request: SolveRequest): void {
  const start = performance.now();
  let solution: Solution;
  try {
    solution = solveRequested(request);
  } catch (error) {
    solution = { ok: false, reason: error instanceof Error ? error.message : String(error) };
  }
  const answer: FromSolver = { job, solution, took: performance.now() - start };
  self.postMessage(answer, { transfer: buffersOf(solution) });
}

self.addEventListener('message', (event: MessageEvent<ToSolver>) => {
  if (event.data.kind === 'solve') {
    asked = true;
    solve(event.data.job, event.data.request);
  } else {
    // a part that was sent while the worker loaded comes first
    setTimeout(() => warmUp(WARM_UPS));
  }
});
