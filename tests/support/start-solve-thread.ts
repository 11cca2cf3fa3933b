import { Worker } from 'node:worker_threads';

/** Stands in for lib/jobs/start-solve-thread: runs the thread from its TypeScript source. */
export const startSolveThread = (): Worker =>
  new Worker(new URL('../../lib/jobs/solve.worker.ts', import.meta.url), {
    execArgv: ['--import', new URL('./run-sources.mjs', import.meta.url).href],
  });
