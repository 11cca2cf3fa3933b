import type { SolveRequest } from '@/lib/fea/solve/request';
import type { Solution } from '@/lib/fea/solve/solution';
import type { FromSolver, ToSolver } from './solve.worker';

export interface Solve {
  readonly solution: Solution;
  /** ms in the worker */
  readonly took: number;
}

export interface SolveClient {
  /** The solution, or null where a later request overtook this one. Never rejects: a lost worker is a reason. */
  solve(request: SolveRequest): Promise<Solve | null>;
  dispose(): void;
}

/** What is used of a Worker. */
export interface SolverPort {
  postMessage(message: ToSolver): void;
  addEventListener(type: 'message', listener: (event: MessageEvent<FromSolver>) => void): void;
  addEventListener(type: 'error', listener: (event: ErrorEvent) => void): void;
  terminate(): void;
}

const spawn = (): SolverPort => new Worker(new URL('./solve.worker.ts', import.meta.url), { type: 'module' });

/** Started before the page is alive, for the first client to take. */
let spare: SolverPort | null = null;

/** Has the worker load and the engine compile the solver while the page is still brought to life. */
export function prepareSolver(): void {
  if (typeof Worker === 'undefined' || spare) return;
  const started = spawn();
  started.addEventListener('error', () => {
    if (spare === started) spare = null;
  });
  started.postMessage({ kind: 'warm-up' });
  spare = started;
}

function startSolver(): SolverPort {
  const worker = spare ?? spawn();
  spare = null;
  return worker;
}

interface Job {
  readonly id: number;
  readonly request: SolveRequest;
  readonly resolve: (solve: Solve | null) => void;
}

/** One worker, one solve at a time, one waiting: the latest. A solve is bounded, so the one under way is let finish. */
class LatestSolve implements SolveClient {
  private worker: SolverPort | null = null;
  private running: Job | null = null;
  private waiting: Job | null = null;
  private jobs = 0;
  private ended = false;

  constructor(private readonly start: () => SolverPort) {}

  solve(request: SolveRequest): Promise<Solve | null> {
    if (this.ended) return Promise.resolve(null);
    this.overtake();
    return new Promise((resolve) => {
      this.jobs += 1;
      this.waiting = { id: this.jobs, request, resolve };
      this.next();
    });
  }

  dispose(): void {
    this.ended = true;
    this.overtake();
    this.running = null;
    this.worker?.terminate();
    this.worker = null;
  }

  private overtake(): void {
    this.running?.resolve(null);
    this.waiting?.resolve(null);
    this.waiting = null;
  }

  private port(): SolverPort {
    if (this.worker) return this.worker;
    const worker = this.start();
    worker.addEventListener('message', (event) => this.receive(event.data));
    worker.addEventListener('error', (event) => this.lose(worker, event.message));
    this.worker = worker;
    return worker;
  }

  private next(): void {
    if (this.running || !this.waiting) return;
    this.running = this.waiting;
    this.waiting = null;
    const { id, request } = this.running;
    try {
      this.port().postMessage({ kind: 'solve', job: id, request });
    } catch (error) {
      this.giveUp(error instanceof Error ? error.message : String(error));
    }
  }

  private receive({ job, solution, took }: FromSolver): void {
    if (this.running?.id !== job) return;
    this.running.resolve({ solution, took });
    this.running = null;
    this.next();
  }

  /** The worker could not start or died: its job is answered with the reason, a later one starts a fresh worker. */
  private lose(worker: SolverPort, message: string): void {
    if (worker !== this.worker) return;
    worker.terminate();
    this.worker = null;
    this.giveUp(message || 'no reason given');
  }

  private giveUp(because: string): void {
    const reason = `the solver could not be started (${because})`;
    this.running?.resolve({ solution: { ok: false, reason }, took: 0 });
    this.running = null;
    this.next();
  }
}

/** Solves bending models in a worker of the page. The latest request wins. */
export const createSolveClient = (start: () => SolverPort = startSolver): SolveClient =>
  new LatestSolve(start);
