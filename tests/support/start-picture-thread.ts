import { Worker } from 'node:worker_threads';

/** Stands in for lib/jobs/start-picture-thread: runs the thread from its TypeScript source. */
export const startPictureThread = (): Worker =>
  new Worker(new URL('../../lib/jobs/picture.worker.ts', import.meta.url), {
    execArgv: ['--import', new URL('./run-sources.mjs', import.meta.url).href],
  });
