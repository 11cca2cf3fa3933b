import { readdirSync } from 'node:fs';
import sharp from 'sharp';
import { afterAll, describe, expect, it } from 'vitest';
import { FAMILIES } from '@/generators';
import { measureShape, PICTURE_SIZE, pictureOf } from '@/lib/access/pictures';
import { env } from '@/lib/env';
import { closePicturePool } from '@/lib/jobs/picture-pool';
import { readStored, store } from '@/lib/storage/files';
import { MOST_PIXELS, readPhoto } from '@/lib/storage/images';
import { seededDatabase } from '../support/database';

seededDatabase();
afterAll(() => closePicturePool());

const shapeOf = async (id: string, given: Record<string, unknown> = {}) => {
  const family = await FAMILIES.find(({ about }) => about.id === id)!.load();
  return { family: id, values: { ...family.parameters.defaults, ...given } };
};

describe('a picture of a part', () => {
  it.each(FAMILIES.map(({ about }) => about.id))('of %s shows a part, not a blank', async (id) => {
    const { bytes } = await pictureOf(await shapeOf(id));
    const { data, info } = await sharp(bytes).raw().toBuffer({ resolveWithObject: true });
    expect(info).toMatchObject({ ...PICTURE_SIZE, channels: 4 });
    const alphas = Array.from({ length: info.width * info.height }, (_, at) => data[4 * at + 3]!);
    const share = alphas.filter((alpha) => alpha > 128).length / alphas.length;
    expect(share).toBeGreaterThan(0.03);
    expect(share).toBeLessThan(0.9);
    const shades = new Set(alphas.flatMap((alpha, at) => (alpha > 250 ? [data[4 * at]! >> 3] : [])));
    expect(shades.size).toBeGreaterThan(4);
  });

  it('is kept by what it shows: drawn once for a shape, afresh for another', async () => {
    const count = () =>
      readdirSync(env().FILES_PATH, { recursive: true }).filter((name) => /\.webp$/.test(String(name)))
        .length;
    const first = await pictureOf(await shapeOf('rod-clip'));
    const before = count();
    const { family, values } = await shapeOf('rod-clip');
    const reversed = Object.fromEntries(Object.entries(values).reverse());
    expect((await pictureOf({ family, values: reversed })).etag).toBe(first.etag);
    expect(count()).toBe(before);
    const wider = await pictureOf(await shapeOf('living-hinge', { leafWidth: 77 }));
    expect(wider.etag).not.toBe(first.etag);
    expect(count()).toBe(before + 1);
  });

  it('tells the size on the bed and the volume of a flat hinge', async () => {
    const shape = await shapeOf('living-hinge', { leafWidth: 50, leafThickness: 3 });
    const { size, volume } = await measureShape(shape);
    expect(size.map((edge) => Math.round(edge))).toContain(50);
    expect(Math.min(...size)).toBeCloseTo(3, 3);
    expect(volume).toBeGreaterThan(0);
    expect(volume).toBeLessThan(size[0] * size[1] * size[2]);
  });
});

describe('stored files', () => {
  it.each(['../../etc/passwd', 'a/b.webp', '..webp', 'x.svg', '', 'CON.webp'])(
    'have no name like %j',
    async (name) => {
      await expect(store('photos', name, new Uint8Array())).rejects.toThrow(RangeError);
      await expect(readStored('photos', name)).rejects.toThrow(RangeError);
    },
  );
});

const flat = (width: number, height: number) =>
  sharp({ create: { width, height, channels: 3, background: '#7a8' } });

describe('an uploaded photo', () => {
  it('is turned upright, made smaller and rid of what is not picture', async () => {
    const upload = await flat(2400, 1200)
      .withExif({ IFD0: { Copyright: 'somebody', ImageDescription: 'taken at home' } })
      .withMetadata({ orientation: 6 })
      .jpeg()
      .toBuffer();
    const { bytes, width, height } = await readPhoto(upload);
    expect([width, height]).toEqual([800, 1600]);
    const head = await sharp(bytes).metadata();
    expect(head.format).toBe('webp');
    expect(head.exif).toBeUndefined();
    expect(head.icc).toBeUndefined();
    expect(head.xmp).toBeUndefined();
  });

  it('is refused when it is no photo, whatever it is called', async () => {
    const svg = Buffer.from('<svg xmlns="http://www.w3.org/2000/svg" width="9" height="9"/>');
    const gif = await flat(9, 9).gif().toBuffer();
    for (const bytes of [svg, gif, Buffer.from('hello'), Buffer.alloc(0), Buffer.from('%PDF-1.7')]) {
      await expect(readPhoto(bytes)).rejects.toThrow(/must be a JPEG, PNG or WebP/);
    }
  });

  it('is refused when few bytes unfold to too many pixels', async () => {
    const side = Math.ceil(Math.sqrt(MOST_PIXELS)) + 200;
    const bomb = await flat(side, side).png({ compressionLevel: 9 }).toBuffer();
    expect(bomb.byteLength).toBeLessThan(1_000_000);
    await expect(readPhoto(bomb)).rejects.toThrow(/megapixels|must be a/);
  });

  it('is refused when it is cut short', async () => {
    const whole = await flat(600, 600).png().toBuffer();
    await expect(readPhoto(whole.subarray(0, whole.length / 2))).rejects.toThrow(/damaged|must be a/);
  });
});
