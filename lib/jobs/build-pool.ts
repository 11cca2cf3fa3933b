import 'server-only';
import type { Worker } from 'node:worker_threads';
import { InvalidInput, NotFound, TooLarge, Unavailable } from '@/lib/errors';
import { KernelError } from '@/lib/geometry/kernel';
import { startBuildThread } from '@/lib/jobs/start-build-thread';
import type { ExportedPart, ExportRequest, FromExporter, PackedError } from './export.types';

export type { ExportedPart, ExportRequest } from './export.types';

export interface PoolLimits {
  readonly threads: number;
  /** jobs that may wait */
  readonly waiting: number;
  /** ms a job may take, the start of a fresh thread included */
  readonly time: number;
}

const LIMITS: PoolLimits = { threads: 1, waiting: 24, time: 20_000 };

interface Job {
  readonly id: number;
  readonly request: ExportRequest;
  readonly resolve: (part: ExportedPart) => void;
  readonly reject: (error: Error) => void;
}

/** What is used of a Worker. */
export type ThreadPort = Pick<Worker, 'on' | 'postMessage' | 'ref' | 'unref' | 'terminate'>;

/** The error as it was thrown in the thread, so that callers can tell a bad input from a fault. */
function unpack(packed: PackedError): Error {
  const { name, message, issues, what, operation, status } = packed;
  if (name === 'InvalidInput') return new InvalidInput(issues as InvalidInput['issues']);
  if (name === 'NotFound') return new NotFound(String(what));
  if (name === 'TooLarge') return new TooLarge(message);
  if (name === 'KernelError') return new KernelError(String(operation), String(status));
  return new Error(message);
}

/** One thread with at most one job. A thread that hangs or dies is dropped; the next job starts a fresh one. */
class Thread {
  private worker: ThreadPort | null = null;
  private job: Job | null = null;
  private timer: NodeJS.Timeout | undefined;

  constructor(
    private readonly timeLimit: number,
    private readonly startThread: () => ThreadPort,
    private readonly onIdle: () => void,
  ) {}

  get idle(): boolean {
    return this.job === null;
  }

  run(job: Job): void {
    this.job = job;
    this.timer = setTimeout(() => {
      this.drop(new Unavailable(`The part took longer than ${this.timeLimit / 1000} s to build`));
    }, this.timeLimit);
    this.worker ??= this.start();
    this.worker.ref();
    this.worker.postMessage({ job: job.id, request: job.request });
  }

  async stop(): Promise<void> {
    const worker = this.worker;
    this.drop(new Unavailable('The server is closing'));
    await worker?.terminate();
  }

  private start(): ThreadPort {
    const worker = this.startThread();
    const lost = (because: string) => {
      if (worker === this.worker) this.drop(new Error(`The build thread ended: ${because}`));
    };
    worker.on('message', (reply: FromExporter) => this.settle(reply));
    worker.on('error', (error) => lost(error.message));
    worker.on('exit', (code) => lost(`exit code ${code}`));
    return worker;
  }

  private settle(reply: FromExporter): void {
    const job = this.job;
    if (job?.id !== reply.job) return;
    clearTimeout(this.timer);
    this.job = null;
    this.worker?.unref();
    if ('part' in reply) job.resolve(reply.part);
    else job.reject(unpack(reply.error));
    this.onIdle();
  }

  private drop(because: Error): void {
    clearTimeout(this.timer);
    const { worker, job } = this;
    this.worker = null;
    this.job = null;
    void worker?.terminate();
    job?.reject(because);
    this.onIdle();
  }
}

export class BuildPool {
  private readonly threads: readonly Thread[];
  private readonly queue: Job[] = [];
  private jobs = 0;

  constructor(
    private readonly limits: PoolLimits = LIMITS,
    startThread: () => ThreadPort = startBuildThread,
  ) {
    const thread = () => new Thread(limits.time, startThread, () => this.next());
    this.threads = Array.from({ length: limits.threads }, thread);
  }

  /**
   * The file of a part, built off the event loop. Rejects with InvalidInput, NotFound, KernelError, TooLarge, or
   * Unavailable where too many wait or it takes too long.
   */
  exportPart(request: ExportRequest): Promise<ExportedPart> {
    if (this.queue.length >= this.limits.waiting) {
      return Promise.reject(new Unavailable(`${this.queue.length} exports are waiting already`));
    }
    return new Promise((resolve, reject) => {
      this.jobs += 1;
      this.queue.push({ id: this.jobs, request, resolve, reject });
      this.next();
    });
  }

  /** Ends the threads and refuses the jobs under way; a later job starts afresh. */
  async close(): Promise<void> {
    for (const job of this.queue.splice(0)) job.reject(new Unavailable('The server is closing'));
    await Promise.all(this.threads.map((thread) => thread.stop()));
  }

  private next(): void {
    const thread = this.threads.find((one) => one.idle);
    const job = thread && this.queue.shift();
    if (job) thread.run(job);
  }
}

/** Kept on the global object, so that reloading this module in development leaves no thread behind. */
const KEPT = Symbol.for('bendwell.build-pool');
const kept = globalThis as { [KEPT]?: BuildPool };

function pool(): BuildPool {
  kept[KEPT] ??= new BuildPool();
  return kept[KEPT];
}

export const exportPart = (request: ExportRequest): Promise<ExportedPart> => pool().exportPart(request);

export const closeBuildPool = (): Promise<void> => pool().close();
