import 'server-only';
import type { SolveRequest } from '@/lib/fea/solve/request';
import type { Solution } from '@/lib/fea/solve/solution';
import { startSolveThread } from '@/lib/jobs/start-solve-thread';
import type { FromSolver } from './solve.types';
import { type PoolLimits, ThreadPool, type ThreadPort } from './thread-pool';

const LIMITS: PoolLimits = { threads: 1, waiting: 24, time: 8_000 };

export type SolvePool = ThreadPool<SolveRequest, Solution, FromSolver>;

export const createSolvePool = (
  limits: PoolLimits = LIMITS,
  start: () => ThreadPort = startSolveThread,
): SolvePool =>
  new ThreadPool(limits, {
    start,
    words: {
      many: 'solves',
      slow: (seconds) => `The part took longer than ${seconds} s to solve`,
      thread: 'The solver thread',
    },
    settle(message, job) {
      if ('solution' in message) job.resolve(message.solution);
      else job.reject(new Error(message.fault));
    },
  });

/** Kept on the global object, so that reloading this module in development leaves no thread behind. */
const KEPT = Symbol.for('bendwell.solve-pool');
const kept = globalThis as { [KEPT]?: SolvePool };

function pool(): SolvePool {
  kept[KEPT] ??= createSolvePool();
  return kept[KEPT];
}

/** Solves off the event loop. Rejects with Unavailable where too many wait or it takes too long. */
export const solveInThread = (request: SolveRequest): Promise<Solution> => pool().run(request);

export const closeSolvePool = (): Promise<void> => pool().close();
