import 'server-only';
import type { Worker } from 'node:worker_threads';
import { Unavailable } from '@/lib/errors';

export interface PoolLimits {
  readonly threads: number;
  /** jobs that may wait */
  readonly waiting: number;
  /** ms a job may take, the start of a fresh thread included */
  readonly time: number;
}

/** What a pool says of its jobs in errors: "exports", "The part took longer than 20 s to build". */
export interface PoolWords {
  readonly many: string;
  readonly slow: (seconds: number) => string;
  readonly thread: string;
}

/** What is used of a Worker. */
export type ThreadPort = Pick<Worker, 'on' | 'postMessage' | 'ref' | 'unref' | 'terminate'>;

/** A thread's message is the answer to job `job`, read by `settle`, which calls one of the two. */
export interface Protocol<Request, Answer, Message extends { readonly job: number }> {
  readonly words: PoolWords;
  readonly start: () => ThreadPort;
  readonly settle: (message: Message, job: Job<Request, Answer>) => void;
}

export interface Job<Request, Answer> {
  readonly id: number;
  readonly request: Request;
  readonly resolve: (answer: Answer) => void;
  readonly reject: (error: Error) => void;
}

/** One thread with at most one job. A thread that hangs or dies is dropped; the next job starts a fresh one. */
class Thread<Request, Answer, Message extends { readonly job: number }> {
  private worker: ThreadPort | null = null;
  private job: Job<Request, Answer> | null = null;
  private timer: NodeJS.Timeout | undefined;

  constructor(
    private readonly timeLimit: number,
    private readonly protocol: Protocol<Request, Answer, Message>,
    private readonly onIdle: () => void,
  ) {}

  get idle(): boolean {
    return this.job === null;
  }

  run(job: Job<Request, Answer>): void {
    this.job = job;
    this.timer = setTimeout(() => {
      this.drop(new Unavailable(this.protocol.words.slow(this.timeLimit / 1000)));
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
    const worker = this.protocol.start();
    const lost = (because: string) => {
      if (worker === this.worker) this.drop(new Error(`${this.protocol.words.thread} ended: ${because}`));
    };
    worker.on('message', (message: Message) => this.settle(message));
    worker.on('error', (error) => lost(error.message));
    worker.on('exit', (code) => lost(`exit code ${code}`));
    return worker;
  }

  private settle(message: Message): void {
    const job = this.job;
    if (job?.id !== message.job) return;
    clearTimeout(this.timer);
    this.job = null;
    this.worker?.unref();
    this.protocol.settle(message, job);
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

/** Threads that take jobs in the order asked; a job too many is refused with Unavailable. */
export class ThreadPool<Request, Answer, Message extends { readonly job: number }> {
  private readonly threads: readonly Thread<Request, Answer, Message>[];
  private readonly queue: Job<Request, Answer>[] = [];
  private jobs = 0;

  constructor(
    private readonly limits: PoolLimits,
    private readonly protocol: Protocol<Request, Answer, Message>,
  ) {
    const thread = () => new Thread(limits.time, protocol, () => this.next());
    this.threads = Array.from({ length: limits.threads }, thread);
  }

  run(request: Request): Promise<Answer> {
    if (this.queue.length >= this.limits.waiting) {
      const { many } = this.protocol.words;
      return Promise.reject(new Unavailable(`${this.queue.length} ${many} are waiting already`));
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
