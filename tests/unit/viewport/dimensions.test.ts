import { describe, expect, it } from 'vitest';
import { drawDimensions, textOf } from '@/components/viewport/drawing/dimensions';
import { frameOf, parallel, viewNamed } from '@/components/viewport/drawing/views';
import hook from '@/generators/cantilever-hook';
import type { Callout } from '@/generators/contract';

const SIZE = { width: 900, height: 600 };
const corner = parallel(frameOf(viewNamed('corner')), [0, 0, 10], 16, SIZE);
const front = parallel(frameOf(viewNamed('front')), [0, 0, 10], 16, SIZE);

const across = (field: string, z: number, value = 20): Callout => ({
  field,
  kind: 'length',
  from: [-value / 2, 0, z],
  to: [value / 2, 0, z],
  offset: [0, 0, 4],
  value,
  unit: 'mm',
});

const overlapping = (labels: { x: number; y: number; width: number; height: number }[]) =>
  labels.flatMap((a, k) =>
    labels
      .slice(k + 1)
      .filter(
        (b) =>
          Math.abs(a.x - b.x) < (a.width + b.width) / 2 && Math.abs(a.y - b.y) < (a.height + b.height) / 2,
      ),
  );

describe('dimension lines', () => {
  it('state length, diameter, radius and angle as a drawing does', () => {
    const base = across('a', 0);
    expect(textOf({ ...base, value: 18 })).toBe('18\u202fmm');
    expect(textOf({ ...base, value: 1.2 })).toBe('1.2\u202fmm');
    expect(textOf({ ...base, value: 0.805, kind: 'diameter' })).toBe('⌀\u202f0.81\u202fmm');
    expect(textOf({ ...base, value: 1, kind: 'radius' })).toBe('R\u202f1\u202fmm');
    expect(textOf({ ...base, value: 30, kind: 'angle', unit: 'deg' })).toBe('30°');
  });

  it('stand at their offset from the part, with extension lines to it', () => {
    const [drawn] = drawDimensions([across('a', 10)], front, SIZE, null);
    expect(drawn!.line).toBe('M290 236L610 236');
    expect(drawn!.extensions).toEqual([
      { x1: 290, y1: 297, x2: 290, y2: 231 },
      { x1: 610, y1: 297, x2: 610, y2: 231 },
    ]);
    expect(drawn!.label.y).toBeLessThan(236);
  });

  it('leave out a length seen end on', () => {
    const side = parallel(frameOf(viewNamed('right')), [0, 0, 10], 16, SIZE);
    expect(drawDimensions([across('a', 10)], side, SIZE, null)).toEqual([]);
  });

  it('put arrows outside a short length, pointing in, and the text beyond them', () => {
    const [drawn] = drawDimensions([across('a', 10, 0.5)], front, SIZE, null);
    expect(drawn!.line).toBe('M430 236L470 236');
    expect(Math.abs(drawn!.label.x - 450)).toBeGreaterThan(20);
  });

  it('keep their texts apart', () => {
    const crowd = [0, 0.4, 0.8, 1.2, 1.6].map((z, k) => across(`field-${k}`, z));
    const labels = drawDimensions(crowd, front, SIZE, null).map(({ label }) => label);
    expect(labels.length).toBe(5);
    expect(overlapping(labels)).toEqual([]);
  });

  it.each(hook.presets)('keep their texts apart on the hook "$name"', ({ values }) => {
    const callouts = hook.callouts({ ...hook.parameters.defaults, ...values });
    const labels = drawDimensions(callouts, corner, SIZE, null).map(({ label }) => label);
    expect(labels.length).toBeGreaterThan(4);
    expect(overlapping(labels)).toEqual([]);
  });

  it('set the emphasised one first, in the best place', () => {
    const drawn = drawDimensions([across('a', 10), across('b', 10)], front, SIZE, 'b');
    expect(drawn[0]).toMatchObject({ field: 'b', emphasised: true });
    expect(drawn[0]!.label.x).toBe(450);
    expect(drawn[1]!.emphasised).toBe(false);
  });

  it('keep their texts inside the picture', () => {
    const wide = { ...across('a', 27), offset: [0, 0, 1] as const };
    const [drawn] = drawDimensions([wide], front, SIZE, null);
    expect(drawn!.label.y - drawn!.label.height / 2).toBeGreaterThanOrEqual(0);
  });
});
