import 'server-only';
import { Worker } from 'node:worker_threads';

/**
 * The bundler compiles the thread's code from this very expression, and only while it has no second argument. Tests
 * have a double of this file that runs the sources.
 */
export const startBuildThread = (): Worker => new Worker(new URL('./build.worker.ts', import.meta.url));
