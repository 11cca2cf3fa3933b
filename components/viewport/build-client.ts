import type { BuiltBody } from '@/lib/geometry/kernel';
import type { BuildRequest, FromWorker, ToWorker } from './build.worker';

export type { BuildRequest } from './build.worker';

/** The part could not be built; the message is for the reader of the page. */
export class BuildFailed extends Error {
  constructor(because: string) {
    super(because);
    this.name = 'BuildFailed';
  }
}

export interface BuildClient {
  /** The bodies, or null where a later build or cancel() overtook this one. Rejects with BuildFailed. */
  build(request: BuildRequest): Promise<readonly BuiltBody[] | null>;
  /** Gives up the build under way and the one waiting. */
  cancel(): void;
  /** Loads the kernel, and the family's code where one is named, before the first build. */
  warmUp(family?: string): void;
  /** Ends the worker; later builds are refused. */
  dispose(): void;
}

/** What is used of a Worker. */
export interface WorkerPort {
  postMessage(message: ToWorker): void;
  addEventListener(type: 'message', listener: (event: MessageEvent<FromWorker>) => void): void;
  addEventListener(type: 'error', listener: (event: ErrorEvent) => void): void;
  terminate(): void;
}

export interface BuildClientOptions {
  readonly startWorker?: () => WorkerPort;
  /** ms after which a build is given up and its worker replaced */
  readonly timeLimit?: number;
}

const startBuildWorker = (): WorkerPort =>
  new Worker(new URL('./build.worker.ts', import.meta.url), { type: 'module' });

interface Job {
  readonly id: number;
  readonly request: BuildRequest;
  readonly resolve: (bodies: readonly BuiltBody[] | null) => void;
  readonly reject: (error: BuildFailed) => void;
}

/** One worker, one build at a time, one waiting: the latest. */
class LatestWins implements BuildClient {
  private worker: WorkerPort | null = null;
  private running: Job | null = null;
  private waiting: Job | null = null;
  private timer: ReturnType<typeof setTimeout> | undefined;
  private jobs = 0;
  private ended = false;

  constructor(
    private readonly startWorker: () => WorkerPort,
    private readonly timeLimit: number,
  ) {}

  build(request: BuildRequest): Promise<readonly BuiltBody[] | null> {
    if (this.ended) return Promise.reject(new BuildFailed('The view was closed.'));
    this.cancel();
    return new Promise((resolve, reject) => {
      this.jobs += 1;
      this.waiting = { id: this.jobs, request, resolve, reject };
      this.next();
    });
  }

  cancel(): void {
    this.running?.resolve(null);
    this.waiting?.resolve(null);
    this.waiting = null;
  }

  warmUp(family?: string): void {
    if (!this.ended) this.port().postMessage({ kind: 'warm-up', family });
  }

  dispose(): void {
    this.ended = true;
    this.cancel();
    this.stopWorker();
  }

  private port(): WorkerPort {
    if (this.worker) return this.worker;
    const worker = this.startWorker();
    worker.addEventListener('message', (event) => this.receive(event.data));
    worker.addEventListener('error', (event) => {
      if (worker !== this.worker) return;
      this.fail(`The geometry kernel could not be started (${event.message || 'no reason given'}).`);
    });
    this.worker = worker;
    return worker;
  }

  private next(): void {
    if (this.running || !this.waiting) return;
    this.running = this.waiting;
    this.waiting = null;
    const { id, request } = this.running;
    this.timer = setTimeout(() => {
      this.fail(`The part took longer than ${this.timeLimit / 1000} s to build and was given up.`);
    }, this.timeLimit);
    try {
      this.port().postMessage({ kind: 'build', job: id, request });
    } catch (error) {
      this.fail(`The geometry kernel could not be started (${String(error)}).`);
    }
  }

  private receive(message: FromWorker): void {
    const job = this.running;
    if (!job || job.id !== message.job) return;
    clearTimeout(this.timer);
    this.running = null;
    if (message.kind === 'built') job.resolve(message.bodies);
    else job.reject(new BuildFailed(message.because));
    this.next();
  }

  /** The worker is lost or stuck: a later build starts a fresh one. */
  private fail(because: string): void {
    this.running?.reject(new BuildFailed(because));
    this.stopWorker();
    this.next();
  }

  private stopWorker(): void {
    clearTimeout(this.timer);
    this.worker?.terminate();
    this.worker = null;
    this.running = null;
  }
}

/** Builds parts in a worker of the page. The latest build wins. */
export function createBuildClient({
  startWorker = startBuildWorker,
  timeLimit = 30_000,
}: BuildClientOptions = {}): BuildClient {
  return new LatestWins(startWorker, timeLimit);
}
