import 'server-only';
import sharp, { type Metadata } from 'sharp';
import { InvalidInput } from '@/lib/errors';

export interface StoredImage {
  readonly bytes: Uint8Array<ArrayBuffer>;
  readonly width: number;
  readonly height: number;
}

const FORMATS: readonly string[] = ['jpeg', 'png', 'webp'];
/** Of an upload: some 48 megapixels, more than a telephone takes. */
export const MOST_PIXELS = 48_000_000;
/** Bytes of an upload. */
export const MOST_PHOTO_BYTES = 12 * 1024 * 1024;
/** Longest edge of a kept photo, pixels. */
const LONGEST = 1600;
const SECONDS = 10;

const refuse = (message: string): never => {
  throw new InvalidInput([{ field: 'photo', message }]);
};

const open = (bytes: Uint8Array) =>
  sharp(bytes, { limitInputPixels: MOST_PIXELS, failOn: 'error', animated: false }).timeout({
    seconds: SECONDS,
  });

const NO_PHOTO = 'The photo must be a JPEG, PNG or WebP picture';

async function headOf(bytes: Uint8Array): Promise<Metadata> {
  if (bytes.length === 0) refuse(NO_PHOTO);
  const head = await open(bytes)
    .metadata()
    .catch(() => refuse(NO_PHOTO));
  if (!FORMATS.includes(head.format)) refuse(NO_PHOTO);
  const pixels = head.width * head.height;
  if (pixels > MOST_PIXELS) {
    const [has, most] = [pixels, MOST_PIXELS].map((count) => `${Math.round(count / 1e6)} megapixels`);
    refuse(`The photo has ${has}; at most ${most} are taken`);
  }
  return head;
}

/**
 * A photo as we keep it, whatever came: judged by its content and not by its name, turned upright, at most 1600 pixels
 * long, encoded afresh without place, camera or any other data beside the picture.
 */
export async function readPhoto(bytes: Uint8Array): Promise<StoredImage> {
  await headOf(bytes);
  const image = open(bytes)
    .rotate()
    .resize(LONGEST, LONGEST, { fit: 'inside', withoutEnlargement: true })
    .webp({ quality: 82 });
  const { data, info } = await image
    .toBuffer({ resolveWithObject: true })
    .catch(() => refuse('The photo is damaged and cannot be read'));
  return { bytes: new Uint8Array(data), width: info.width, height: info.height };
}

interface Drawing {
  readonly pixels: Uint8ClampedArray;
  readonly width: number;
  readonly height: number;
}

/** A drawing as WebP, at half the size it was drawn: the edges become smooth. */
export async function encodeDrawing({ pixels, width, height }: Drawing): Promise<Uint8Array<ArrayBuffer>> {
  const image = sharp(pixels, { raw: { width, height, channels: 4 } })
    .resize(Math.round(width / 2), Math.round(height / 2))
    .webp({ quality: 84, alphaQuality: 90 });
  return new Uint8Array(await image.toBuffer());
}
