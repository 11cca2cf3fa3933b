import { parentPort } from 'node:worker_threads';
import { buffersOf, solveRequested } from '@/lib/fea/solve/request';
import type { FromSolver, ToSolver } from './solve.types';

function answer({ job, request }: ToSolver): FromSolver {
  try {
    return { job, solution: solveRequested(request) };
  } catch (error) {
    return { job, fault: error instanceof Error ? error.message : String(error) };
  }
}

const port = parentPort;
port?.on('message', (message: ToSolver) => {
  const reply = answer(message);
  port.postMessage(reply, 'solution' in reply ? buffersOf(reply.solution) : []);
});
