import 'server-only';
import { Worker } from 'node:worker_threads';

/** As start-build-thread.ts: the expression is read by the bundler and must keep this form. */
export const startSolveThread = (): Worker => new Worker(new URL('./solve.worker.ts', import.meta.url));
