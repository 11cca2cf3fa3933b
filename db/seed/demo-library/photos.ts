import { createHash } from 'node:crypto';
import { drawPart } from '@/generators/picture';
import type { KernelHost } from '@/lib/geometry/host';
import { store } from '@/lib/storage/files';
import { encodeDrawing } from '@/lib/storage/images';
import type { Db } from '../../client';
import { insertPhoto } from '../../queries/presets';
import type { DemoPart } from './parts';

const SIZE = { width: 880, height: 660 } as const;
const FROM_BEHIND = { turn: -2.4, rise: 0.6 } as const;

export interface DrawnPhoto {
  readonly file: string;
  readonly bytes: number;
  readonly width: number;
  readonly height: number;
}

/** A picture of the part from behind, drawn by us, in place of a photo. */
export async function drawPhoto(host: KernelHost, { family, values }: DemoPart): Promise<DrawnPhoto> {
  const bytes = await encodeDrawing(
    drawPart(host, family, { parameters: values, size: SIZE, view: FROM_BEHIND }),
  );
  const file = `demo-${createHash('sha256').update(bytes).digest('hex').slice(0, 32)}.webp`;
  await store('photos', file, bytes);
  return { file, bytes: bytes.byteLength, width: SIZE.width / 2, height: SIZE.height / 2 };
}

export const attachDemoPhoto = (
  db: Db,
  photo: DrawnPhoto,
  given: {
    readonly id: string;
    readonly versionId: string;
    readonly ownerId: string;
    readonly title: string;
    readonly at: Date;
  },
): void => {
  const { id, versionId, ownerId, title, at } = given;
  insertPhoto(db, {
    ...photo,
    id,
    versionId,
    ownerId,
    alt: `${title}, seen from behind`,
    position: 0,
    createdAt: at,
  });
};
