import 'server-only';
import { startBuildThread } from '@/lib/jobs/start-build-thread';
import type { ExportedPart, ExportRequest, FromExporter } from './export.types';
import { type PoolLimits, ThreadPool, type ThreadPort } from './thread-pool';
import { unpack } from './unpack';

export type { ExportedPart, ExportRequest } from './export.types';
export type { PoolLimits, ThreadPort } from './thread-pool';

const LIMITS: PoolLimits = { threads: 1, waiting: 24, time: 20_000 };

export class BuildPool {
  private readonly pool: ThreadPool<ExportRequest, ExportedPart, FromExporter>;

  constructor(limits: PoolLimits = LIMITS, start: () => ThreadPort = startBuildThread) {
    this.pool = new ThreadPool(limits, {
      start,
      words: {
        many: 'exports',
        slow: (seconds) => `The part took longer than ${seconds} s to build`,
        thread: 'The build thread',
      },
      settle(message, job) {
        if ('part' in message) job.resolve(message.part);
        else job.reject(unpack(message.error));
      },
    });
  }

  /**
   * The file of a part, built off the event loop. Rejects with InvalidInput, NotFound, KernelError, TooLarge, or
   * Unavailable where too many wait or it takes too long.
   */
  exportPart(request: ExportRequest): Promise<ExportedPart> {
    return this.pool.run(request);
  }

  /** Ends the threads and refuses the jobs under way; a later job starts afresh. */
  close(): Promise<void> {
    return this.pool.close();
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
