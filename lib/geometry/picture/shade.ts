import type { Raster } from './raster';

export type Rgb = readonly [number, number, number];

/** Unit vector towards the lamp, in the picture: from the upper left, before the part. */
const LAMP: Rgb = [-0.48, -0.6, 0.64];
const SHADE = 0.58;
const INK: Rgb = [0.06, 0.165, 0.18];
/** Faces that meet at more than some 30 degrees are parted by a line. */
const CREASE = Math.cos((30 * Math.PI) / 180);
/** Depth in pixels by which one face must stand before another to be outlined. */
const STEP = 2.5;

function brightness({ normals }: Raster, face: number): number {
  const lit =
    normals[3 * face]! * LAMP[0] + normals[3 * face + 1]! * LAMP[1] + normals[3 * face + 2]! * LAMP[2];
  return SHADE + (1 - SHADE) * Math.max(0, lit);
}

const creased = ({ normals }: Raster, a: number, b: number): boolean =>
  normals[3 * a]! * normals[3 * b]! +
    normals[3 * a + 1]! * normals[3 * b + 1]! +
    normals[3 * a + 2]! * normals[3 * b + 2]! <
  CREASE;

/** How far the surface of the neighbour misses this one's plane, in pixels of depth, whichever plane fits better. */
function gap(raster: Raster, at: number, next: number, axis: 0 | 1): number {
  const { face, depth, slopes } = raster;
  const rise = depth[next]! - depth[at]!;
  const here = slopes[2 * face[at]! + axis]!;
  const there = slopes[2 * face[next]! + axis]!;
  return Math.min(Math.abs(rise - here), Math.abs(rise - there));
}

/** Whether a line runs between a pixel and the next one along an axis. */
function parted(raster: Raster, at: number, next: number, axis: 0 | 1): boolean {
  const { face, body } = raster;
  const here = face[at]!;
  const there = face[next]!;
  if (here === there) return false;
  if (here === 0 || there === 0 || body[here] !== body[there]) return true;
  return creased(raster, here, there) || gap(raster, at, next, axis) > STEP;
}

function inked(raster: Raster, x: number, y: number): boolean {
  const { width, height } = raster;
  const at = y * width + x;
  if (x + 1 < width && parted(raster, at, at + 1, 0)) return true;
  if (x > 0 && parted(raster, at - 1, at, 0)) return true;
  if (y + 1 < height && parted(raster, at, at + width, 1)) return true;
  return y > 0 && parted(raster, at - width, at, 1);
}

/** Colours the picture: RGBA bytes, the background left clear. Outlines and creases are drawn in ink. */
export function shade(raster: Raster, colours: readonly Rgb[]): Uint8ClampedArray<ArrayBuffer> {
  const { width, height, face, body } = raster;
  const pixels = new Uint8ClampedArray(4 * width * height);
  for (let y = 0; y < height; y += 1) {
    for (let x = 0; x < width; x += 1) {
      const at = y * width + x;
      const ink = inked(raster, x, y);
      const seen = face[at]!;
      if (seen === 0 && !ink) continue;
      const light = ink ? 1 : brightness(raster, seen);
      const colour = ink ? INK : colours[Math.min(body[seen]!, colours.length - 1)]!;
      for (let part = 0; part < 3; part += 1) pixels[4 * at + part] = 255 * light * colour[part]!;
      pixels[4 * at + 3] = 255;
    }
  }
  return pixels;
}
