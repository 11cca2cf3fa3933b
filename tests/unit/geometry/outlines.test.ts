import { beforeAll, describe, expect, it } from 'vitest';
import { createKernelHost } from '@/lib/geometry/host';
import { type Outlines, type Profile, QUALITY, type Vec2 } from '@/lib/geometry/kernel';
import { profileArea, profileFault } from '@/lib/geometry/loops';
import { inscribedArea } from '@/lib/geometry/outline';
import { square } from '@/tests/support/kernel-fixtures';

let outlines: Outlines;
beforeAll(async () => {
  const host = await createKernelHost();
  host.build((kernel) => {
    outlines = kernel.outlines;
    return [{ name: 'any', solid: kernel.box([1, 1, 1]) }];
  }, QUALITY.export);
});

/** The area, once the profile is seen to be sound. */
function area(profile: Profile): number {
  expect(profileFault(profile)).toBeNull();
  return profileArea(profile);
}

function extent({ loops }: Profile): [number, number, number, number] {
  const points = loops.flat();
  const [x, y] = [points.map((point) => point[0]), points.map((point) => point[1])];
  return [Math.min(...x), Math.min(...y), Math.max(...x), Math.max(...y)];
}

describe('shapes', () => {
  it('have the area of their closed form, as faceted', () => {
    expect(area(outlines.rectangle(8, 3, { center: [5, 5] }))).toBeCloseTo(24, 9);
    expect(area(outlines.circle(4))).toBeCloseTo(inscribedArea(4, 96), 9);
    expect(area(outlines.circle(4, { segments: 7 }))).toBeCloseTo(inscribedArea(4, 7), 9);
    const rounded = outlines.rectangle(8, 6, { cornerRadius: 2 });
    expect(area(rounded)).toBeCloseTo(48 - 16 + inscribedArea(2, 64), 9);
    expect(extent(rounded)).toEqual([-4, -3, 4, 3]);
  });

  it('become slots where the corner radius is half a side, and circles where it is half of both', () => {
    const slot = outlines.rectangle(10, 4, { cornerRadius: 2, center: [1, 0] });
    expect(area(slot)).toBeCloseTo(6 * 4 + inscribedArea(2, 64), 9);
    const upright = outlines.rectangle(4, 10, { cornerRadius: 2 });
    expect(extent(upright)).toEqual([-2, -5, 2, 5].map((value) => expect.closeTo(value, 9)));
    expect(area(outlines.rectangle(4, 4, { cornerRadius: 2 }))).toBeCloseTo(inscribedArea(2, 64), 9);
  });

  it('are counter-clockwise whichever way their points are given', () => {
    expect(area(outlines.polygon(square(3)))).toBe(9);
    expect(area(outlines.polygon([...square(3)].reverse()))).toBe(9);
  });

  it('are refused with a radius too large, no size, or a polygon that crosses itself', () => {
    expect(() => outlines.rectangle(8, 3, { cornerRadius: 1.6 })).toThrow('larger than half a side');
    expect(() => outlines.rectangle(8, 0)).toThrow('must be positive');
    expect(() => outlines.circle(-1)).toThrow('the radius must be positive');
    const bowTie: Vec2[] = [
      [0, 0],
      [10, 0],
      [0, 10],
      [12, 10],
    ];
    expect(() => outlines.polygon(bowTie)).toThrow('crosses or touches itself');
  });
});

describe('unions and cuts', () => {
  it('add areas that abut, and count an overlap once', () => {
    const [a, b, c] = [square(4), square(4, [4, 0]), square(4, [2, 0])].map((points) =>
      outlines.polygon(points),
    );
    expect(area(outlines.union([a!, b!]))).toBeCloseTo(32, 9);
    expect(area(outlines.union([a!, c!]))).toBeCloseTo(24, 9);
  });

  it('keep shapes that lie apart as outlines of one profile', () => {
    const both = outlines.union([outlines.circle(2), outlines.circle(3, { center: [20, 0] })]);
    expect(both.loops).toHaveLength(2);
    expect(area(both)).toBeCloseTo(inscribedArea(2, 96) + inscribedArea(3, 96), 6);
  });

  it('make holes that run clockwise', () => {
    const holes = [-5, 0, 5].map((x) => outlines.circle(1.5, { center: [x, 0] }));
    const plate = outlines.subtract(outlines.rectangle(20, 8), holes);
    expect(plate.loops).toHaveLength(4);
    expect(area(plate)).toBeCloseTo(160 - 3 * inscribedArea(1.5, 96), 6);
  });

  it('do not move a corner by more than a nanometre', () => {
    const union = outlines.union([outlines.circle(50.123456), outlines.rectangle(101.234567, 2)]);
    const outer = union.loops[0]!.map(([x, y]) => Math.hypot(x, y)).filter((radius) => radius < 50.2);
    const corners = outer.filter((radius) => Math.abs(radius - 50.123456) < 1e-6);
    expect(corners.length).toBeGreaterThan(85);
    expect(Math.max(...union.loops.flat().map(([x]) => x))).toBeCloseTo(101.234567 / 2, 6);
  });

  it('are refused where nothing is left', () => {
    expect(() => outlines.subtract(outlines.circle(1), [outlines.circle(2)])).toThrow('nothing is left');
    expect(() => outlines.union([])).toThrow('nothing is left');
  });
});

describe('offsets', () => {
  it('grow with round corners: s2 + 4 s d + pi d2', () => {
    const grown = outlines.offset(outlines.polygon(square(10)), 2);
    expect(area(grown) / (100 + 80 + Math.PI * 4)).toBeCloseTo(1, 3);
    expect(extent(grown)).toEqual([-2, -2, 12, 12].map((value) => expect.closeTo(value, 6)));
  });

  it('shrink with sharp corners, and close holes while the outline grows', () => {
    expect(area(outlines.offset(outlines.polygon(square(10)), -2))).toBeCloseTo(36, 6);
    const ring = outlines.subtract(outlines.circle(10), [outlines.circle(4)]);
    const thick = outlines.offset(ring, 1);
    expect(area(thick) / (Math.PI * (121 - 9))).toBeCloseTo(1, 2);
    expect(outlines.offset(ring, 4.5).loops).toHaveLength(1);
  });

  it('part a dumb-bell at its neck instead of crossing', () => {
    const ends = [-8, 8].map((x) => outlines.circle(5, { center: [x, 0] }));
    const bell = outlines.union([...ends, outlines.rectangle(16, 2)]);
    const parted = outlines.offset(bell, -1.5);
    expect(parted.loops).toHaveLength(2);
    expect(area(parted) / (2 * Math.PI * 3.5 ** 2)).toBeCloseTo(1, 2);
  });

  it('are refused where the profile vanishes', () => {
    expect(() => outlines.offset(outlines.circle(1), -1.2)).toThrow('nothing is left');
  });
});

describe('hulls', () => {
  it('wrap two circles to a belt: two halves and the strip between', () => {
    const ends = [0, 10].map((x) => outlines.circle(2, { center: [x, 0] }));
    expect(area(outlines.hull(ends))).toBeCloseTo(inscribedArea(2, 96) + 40, 9);
  });

  it('are refused without anything to wrap', () => {
    expect(() => outlines.hull([])).toThrow('nothing to wrap');
  });
});

describe('letters', () => {
  it('stand on y = 0, start at x = 0 and are as high as asked, ink included', () => {
    const [left, bottom, , top] = extent(outlines.text('HE', { height: 7, stroke: 0.8 }));
    expect([left, bottom, top]).toEqual([0, 0, 7].map((value) => expect.closeTo(value, 6)));
  });

  it('have the area of their strokes: a bar of the letter I with two round ends', () => {
    const text = outlines.text('I', { height: 10, stroke: 2 });
    expect(area(text)).toBeCloseTo(8 * 2 + inscribedArea(1, 12), 6);
  });

  it('are sound for every printable character', () => {
    const all = Array.from({ length: 94 }, (_, at) => String.fromCharCode(33 + at));
    const faulty = all.filter(
      (letter) => profileFault(outlines.text(letter, { height: 6, stroke: 0.7 })) !== null,
    );
    expect(faulty).toEqual([]);
  });

  it('are refused outside the printable characters, when blank, or lower than their stroke', () => {
    expect(() => outlines.text('5 µm', { height: 5, stroke: 1 })).toThrow('plain printable characters');
    expect(() => outlines.text('   ', { height: 5, stroke: 1 })).toThrow('plain printable characters');
    expect(() => outlines.text('A', { height: 1, stroke: 1 })).toThrow('higher than their stroke');
  });
});
