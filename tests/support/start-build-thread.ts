import { Worker } from 'node:worker_threads';

/** Stands in for lib/jobs/start-build-thread: runs the thread from its TypeScript source. */
export const startBuildThread = (): Worker =>
  new Worker(new URL('../../lib/jobs/build.worker.ts', import.meta.url), {
    execArgv: ['--import', new URL('./run-sources.mjs', import.meta.url).href],
  });
