import { describe, expect, it } from 'vitest';
import { dot, fitBox, frameOf, parallel, VIEWS, viewNamed } from '@/components/viewport/drawing/views';
import { cornersOf } from '@/components/viewport/mesh/bounds';

const SIZE = { width: 800, height: 500 };
const NONE = { top: 0, bottom: 0 };
const BOX = { min: [0, 0, 0], max: [40, 10, 5] } as const;

describe('standard views', () => {
  it.each(VIEWS)('$name is a right-handed set of unit axes', (view) => {
    const { right, up, eye } = frameOf(view);
    for (const axis of [right, up, eye]) expect(dot(axis, axis)).toBeCloseTo(1);
    expect(dot(right, up)).toBeCloseTo(0);
    const cross = [
      right[1] * up[2] - right[2] * up[1],
      right[2] * up[0] - right[0] * up[2],
      right[0] * up[1] - right[1] * up[0],
    ];
    expect(cross).toEqual(eye.map((v) => expect.closeTo(v)));
  });

  it('front shows +x to the right and +z upwards', () => {
    const project = parallel(frameOf(viewNamed('front')), [0, 0, 0], 10, SIZE);
    expect(project([1, 0, 2])).toMatchObject({ x: 410, y: 230 });
  });

  it('top shows +x to the right and +y upwards', () => {
    const { x, y } = parallel(frameOf(viewNamed('top')), [0, 0, 0], 10, SIZE)([1, 2, 0]);
    expect([x, y]).toEqual([expect.closeTo(410), expect.closeTo(230)]);
  });
});

describe('fitting', () => {
  it.each(VIEWS)('brings the whole part into the picture from the $name', (view) => {
    const frame = frameOf(view);
    const insets = { top: 90, bottom: 60 };
    const { target, scale } = fitBox(BOX, frame, SIZE, insets);
    const pixels = cornersOf(BOX).map(parallel(frame, target, scale, SIZE));
    expect(Math.min(...pixels.map(({ x }) => x))).toBeGreaterThan(0);
    expect(Math.max(...pixels.map(({ x }) => x))).toBeLessThan(SIZE.width);
    expect(Math.min(...pixels.map(({ y }) => y))).toBeGreaterThan(insets.top);
    expect(Math.max(...pixels.map(({ y }) => y))).toBeLessThan(SIZE.height - insets.bottom);
  });

  it('has a finite scale for a part without extent', () => {
    const point = { min: [1, 1, 1], max: [1, 1, 1] } as const;
    expect(fitBox(point, frameOf(viewNamed('top')), SIZE, NONE).scale).toBeLessThan(Infinity);
  });
});
