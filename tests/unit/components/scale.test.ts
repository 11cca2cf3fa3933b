import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { niceStep, placeOn, scaleOver, shown, tickText } from '@/components/studio/scale';

describe('a scale', () => {
  it('reaches past every mark with a readable number of ticks', () => {
    const mark = fc.double({ min: 1e-4, max: 1e6, noNaN: true });
    fc.assert(
      fc.property(fc.array(mark, { minLength: 1, maxLength: 3 }), (marks) => {
        const scale = scaleOver(marks, 8);
        expect(scale.end).toBeGreaterThanOrEqual(Math.max(...marks) * (1 - 1e-9));
        expect(scale.majors.length).toBeGreaterThan(3);
        expect(scale.majors.length).toBeLessThan(12);
        expect(scale.majors[0]).toBe(0);
        expect(scale.majors.at(-1)).toBeLessThanOrEqual(scale.end * (1 + 1e-9));
      }),
      { seed: 3 },
    );
  });

  it('has ticks of 1, 2 or 5 times a power of ten', () => {
    expect([0.03, 0.2, 0.21, 4.9, 5, 6].map(niceStep)).toEqual([0.05, 0.2, 0.5, 5, 5, 10]);
    expect(scaleOver([2.4], 6).majors).toEqual([0, 0.5, 1, 1.5, 2]);
  });

  it('runs from nought to one where nothing is known', () => {
    expect(scaleOver([null, 0, Number.NaN, Number.POSITIVE_INFINITY]).end).toBe(1);
  });

  it('keeps what lies beyond it at its ends', () => {
    const scale = scaleOver([10]);
    expect([placeOn(scale, -1), placeOn(scale, 5), placeOn(scale, 50)]).toEqual([0, 50, 100]);
  });

  it('writes ticks with the decimals of their step', () => {
    expect([tickText(0, 0.2), tickText(1, 0.05), tickText(20, 10)]).toEqual(['0.0', '1.00', '20']);
  });

  it('shows strain in percent and the rest as it is', () => {
    expect([shown(0.018, 'strain'), shown(18, 'mm')]).toEqual([1.7999999999999998, 18]);
  });
});
