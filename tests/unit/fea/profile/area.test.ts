import { describe, expect, it } from 'vitest';
import { outline } from '@/lib/fea/profile/outline';
import { extent, profileArea, taggedLength } from '@/lib/fea/profile/profile';
import { arc, type Point } from '@/lib/fea/profile/segment';

const square = (side: number, radius = 0) =>
  outline(
    (
      [
        [0, 0],
        [side, 0],
        [side, side],
        [0, side],
      ] as Point[]
    ).map((at) => ({ at, radius, tag: 'side' })),
  );

describe('area of a profile', () => {
  it('is the square less its rounded corners', () => {
    expect(profileArea({ loops: [square(10, 2)] })).toBeCloseTo(100 - (4 - Math.PI) * 4, 12);
  });

  it('is that of a ring when the hole runs clockwise', () => {
    const ring = { loops: [[arc([1, 2], 5, 0, 2 * Math.PI)], [arc([1, 2], 3, 0, -2 * Math.PI)]] };
    expect(profileArea(ring)).toBeCloseTo(Math.PI * 16, 12);
  });

  it('takes a bite out where an arc runs against the loop', () => {
    const bitten = [
      ...outline([
        { at: [0, 0], tag: 'side' },
        { at: [10, 0], tag: 'side' },
        { at: [10, 6], tag: 'side' },
        { at: [0, 6], tag: 'bite' },
      ]),
    ];
    const loop = bitten.map((s) => (s.tag === 'bite' ? arc([0, 3], 3, Math.PI / 2, -Math.PI, 'bite') : s));
    expect(profileArea({ loops: [loop] })).toBeCloseTo(60 - (Math.PI * 9) / 2, 12);
  });

  it('gives the length of what carries a tag', () => {
    expect(taggedLength({ loops: [square(10, 2)] }, 'side')).toBeCloseTo(24, 12);
    expect(taggedLength({ loops: [square(10, 2)] }, 'fillet')).toBeCloseTo(4 * Math.PI, 12);
  });

  it('has the longer side as its extent', () => {
    expect(extent({ loops: [square(7)] })).toBe(7);
  });
});
