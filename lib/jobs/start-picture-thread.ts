import 'server-only';
import { Worker } from 'node:worker_threads';

/** As start-build-thread: the bundler compiles the thread's code from this very expression. */
export const startPictureThread = (): Worker => new Worker(new URL('./picture.worker.ts', import.meta.url));
