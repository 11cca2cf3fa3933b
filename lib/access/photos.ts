import 'server-only';
import { database } from '@/db/client';
import * as queries from '@/db/queries/presets';
import { Conflict, InvalidInput, NotFound } from '@/lib/errors';
import { readStored, removeStored, store } from '@/lib/storage/files';
import { readPhoto } from '@/lib/storage/images';
import { may, permit, type Viewer } from './policy';

export interface Photo {
  readonly id: string;
  readonly alt: string;
  readonly width: number;
  readonly height: number;
}

export const MOST_PHOTOS_EACH = 6;
/** Of one member, on the server. */
const QUOTA = { photos: 200, bytes: 64 * 1024 * 1024 };
/** How long an uploaded photo waits to be handed in, ms. */
const LOOSE_KEPT = 24 * 3_600_000;

export const photoOf = ({ id, alt, width, height }: queries.PhotoRow): Photo => ({ id, alt, width, height });

function checkQuota(ownerId: string, more: number): void {
  const { photos, bytes } = queries.photoUse(database(), ownerId);
  if (photos < QUOTA.photos && bytes + more <= QUOTA.bytes) return;
  const message = `Your photos fill what an account may hold: ${QUOTA.photos} photos, ${QUOTA.bytes / 2 ** 20} MB`;
  throw new InvalidInput([{ field: 'photo', message, bound: QUOTA.photos }]);
}

let uploads = 0;
const MOST_UPLOADS = 3;

/** Few at a time: unfolding a large picture takes memory. */
async function oneOfFew<T>(work: () => Promise<T>): Promise<T> {
  if (uploads >= MOST_UPLOADS) throw new Conflict('Other photos are being read; try again in a moment');
  uploads += 1;
  try {
    return await work();
  } finally {
    uploads -= 1;
  }
}

/** Keeps an uploaded photo for the preset its owner is about to hand in. */
export async function uploadPhoto(viewer: Viewer, bytes: Uint8Array): Promise<Photo> {
  const owner = permit(viewer, 'preset.hand-in');
  const now = new Date();
  const stale = queries.forgetLoosePhotos(database(), owner.id, new Date(now.getTime() - LOOSE_KEPT));
  await Promise.all(stale.map((file) => removeStored('photos', file)));
  checkQuota(owner.id, 0);
  const image = await oneOfFew(() => readPhoto(bytes));
  checkQuota(owner.id, image.bytes.byteLength);
  const file = `${crypto.randomUUID()}.webp`;
  await store('photos', file, image.bytes);
  const { width, height } = image;
  const given = {
    ownerId: owner.id,
    file,
    alt: '',
    width,
    height,
    bytes: image.bytes.byteLength,
    position: 0,
  };
  return photoOf(queries.insertPhoto(database(), { ...given, createdAt: now }));
}

/** Takes an uploaded photo back before it is handed in. */
export async function removePhoto(viewer: Viewer, id: string): Promise<void> {
  const owner = permit(viewer, 'preset.hand-in');
  const file = queries.removeLoosePhoto(database(), owner.id, id);
  if (file === undefined) throw new NotFound('The photo');
  await removeStored('photos', file);
}

/** Photos of what was published are open to anyone; others to their owner and the librarians. */
export async function photoFile(
  viewer: Viewer,
  id: string,
): Promise<{ bytes: Uint8Array<ArrayBuffer>; etag: string; open: boolean }> {
  const found = queries.findPhoto(database(), id);
  const open = found?.state === 'published' || found?.state === 'retired';
  const mayRead =
    found &&
    (open || found.photo.ownerId === viewer?.id || (found.state !== null && may(viewer, 'preset.review')));
  const bytes = mayRead ? await readStored('photos', found.photo.file) : null;
  if (!found || !bytes) throw new NotFound('The photo');
  return { bytes, etag: `"${found.photo.id}"`, open };
}
