import { paintPicture } from '@/components/viewport/drawing/painter';
import { PAINT_INK } from '@/components/viewport/drawing/ramp';
import { fitBox, frameOf, parallel } from '@/components/viewport/drawing/views';
import { boxOf } from '@/components/viewport/mesh/bounds';
import type { Family } from '@/generators/contract';
import { PICTURE_COLOURS, shownPart } from './built';

/** Twice the size it is shown at, so that whole units are fine enough. */
const SIZE = { width: 960, height: 720 } as const;
const FRAME = frameOf({ turn: 32, rise: 28 });

const whole = (path: string): string =>
  path.replace(/\d+\.\d+/g, (number) => String(Math.round(Number(number))));

/** A picture of the family's first part, as an SVG file. */
export async function partSvg(family: Family): Promise<string> {
  const moved = await shownPart(family);
  const box = boxOf(moved.map(({ positions }) => ({ points: positions })));
  const { target, scale } = fitBox(box, FRAME, SIZE, { top: 0, bottom: 0 });
  const painted = moved.map((one, index) => ({
    moved: one,
    colour: PICTURE_COLOURS[Math.min(index, PICTURE_COLOURS.length - 1)]!,
    seeThrough: false,
  }));
  const strokes = paintPicture(painted, FRAME, parallel(FRAME, target, scale, SIZE), null).map(
    ({ kind, path, fill }) =>
      kind === 'face'
        ? `<path d="${whole(path)}" fill="${fill}" stroke="${fill}" stroke-width="2"/>`
        : `<path d="${whole(path)}" class="c"/>`,
  );
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" viewBox="0 0 ${SIZE.width} ${SIZE.height}" stroke-linejoin="round">`,
    `<style>.c{fill:none;stroke:${PAINT_INK};stroke-width:2.2;stroke-linecap:round}</style>`,
    ...strokes,
    '</svg>',
  ].join('');
}
