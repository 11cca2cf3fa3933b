import 'server-only';
import { startPictureThread } from '@/lib/jobs/start-picture-thread';
import type { FromPainter, PartPicture, PictureRequest } from './picture.types';
import { type PoolLimits, ThreadPool, type ThreadPort } from './thread-pool';
import { unpack } from './unpack';

export type { PartPicture, PictureRequest } from './picture.types';

/** A page of a list asks for two dozen pictures at once, and several may be open. */
const LIMITS: PoolLimits = { threads: 1, waiting: 240, time: 20_000 };

export type PicturePool = ThreadPool<PictureRequest, PartPicture, FromPainter>;

export const createPicturePool = (
  limits: PoolLimits = LIMITS,
  start: () => ThreadPort = startPictureThread,
): PicturePool =>
  new ThreadPool(limits, {
    start,
    words: {
      many: 'pictures',
      slow: (seconds) => `The part took longer than ${seconds} s to draw`,
      thread: 'The picture thread',
    },
    settle(message, job) {
      if ('picture' in message) job.resolve(message.picture);
      else job.reject(unpack(message.error));
    },
  });

/** Kept on the global object, so that reloading this module in development leaves no thread behind. */
const KEPT = Symbol.for('bendwell.picture-pool');
const kept = globalThis as { [KEPT]?: PicturePool };

function pool(): PicturePool {
  kept[KEPT] ??= createPicturePool();
  return kept[KEPT];
}

/** Builds and draws a part off the event loop. Rejects as an export does. */
export const paintPart = (request: PictureRequest): Promise<PartPicture> => pool().run(request);

export const closePicturePool = (): Promise<void> => pool().close();
