import 'server-only';
import { createHash } from 'node:crypto';
import { type PartPicture, paintPart } from '@/lib/jobs/picture-pool';
import { readStored, store } from '@/lib/storage/files';
import { encodeDrawing } from '@/lib/storage/images';

/** Rises when pictures come out differently, so that kept ones are drawn afresh. */
const DRAWN_BY = 1;
/** Drawn twice as large as it is kept. */
const SIZE = { width: 800, height: 600 } as const;
export const PICTURE_SIZE = { width: SIZE.width / 2, height: SIZE.height / 2 } as const;

/** What the shape depends on: the plastic and the use do not change it. */
export interface Shape {
  readonly family: string;
  readonly values: Readonly<Record<string, unknown>>;
}

export interface Picture {
  readonly bytes: Uint8Array<ArrayBuffer>;
  /** strong entity tag, quotes included; the same shape has the same */
  readonly etag: string;
}

function keyOf({ family, values }: Shape): string {
  const sorted = Object.entries(values).sort(([a], [b]) => (a < b ? -1 : 1));
  const content = JSON.stringify([DRAWN_BY, SIZE, family, sorted]);
  return createHash('sha256').update(content).digest('hex').slice(0, 40);
}

/** Tag of a picture that may not have been drawn yet. */
export const pictureTag = (shape: Shape): string => `"${keyOf(shape)}"`;

const fileOf = (shape: Shape): string => `${keyOf(shape)}.webp`;

async function paintAndStore(shape: Shape): Promise<{ part: PartPicture; bytes: Uint8Array<ArrayBuffer> }> {
  const part = await paintPart({ family: shape.family, parameters: shape.values, ...SIZE });
  const bytes = await encodeDrawing(part);
  await store('pictures', fileOf(shape), bytes);
  return { part, bytes };
}

const painting = new Map<string, ReturnType<typeof paintAndStore>>();

/** Two who ask for the same picture wait for the same drawing. */
function paintOnce(shape: Shape): ReturnType<typeof paintAndStore> {
  const key = keyOf(shape);
  const running = painting.get(key);
  if (running) return running;
  const started = paintAndStore(shape).finally(() => painting.delete(key));
  painting.set(key, started);
  return started;
}

/** The picture of a shape, drawn at the first time of asking. Who may see the shape is the caller's to decide. */
export async function pictureOf(shape: Shape): Promise<Picture> {
  const bytes = (await readStored('pictures', fileOf(shape))) ?? (await paintOnce(shape)).bytes;
  return { bytes, etag: pictureTag(shape) };
}

/** Builds a shape afresh for its size on the bed (mm) and volume (mm3), and keeps its picture by the way. */
export async function measureShape(shape: Shape): Promise<Pick<PartPicture, 'size' | 'volume'>> {
  const { part } = await paintOnce(shape);
  return { size: part.size, volume: part.volume };
}
