import { describe, expect, it } from 'vitest';
import { profileFault } from '@/lib/fea/profile/faults';
import { outline } from '@/lib/fea/profile/outline';
import { arc, line, type Point, type Segment } from '@/lib/fea/profile/segment';

const loopOf = (points: readonly Point[], tag = 'edge'): Segment[] =>
  outline(points.map((at, i) => ({ at, tag: `${tag}${i}` })));
const box = (x0: number, y0: number, x1: number, y1: number): Segment[] =>
  loopOf([
    [x0, y0],
    [x1, y0],
    [x1, y1],
    [x0, y1],
  ]);
const hole = (x: number, y: number, radius: number): Segment[] => [
  arc([x, y], radius, 0, -2 * Math.PI, 'hole'),
];

describe('fault of a profile', () => {
  it('is none for a box, with a rounded corner, or with a hole inside', () => {
    expect(profileFault({ loops: [box(0, 0, 4, 3)] })).toBeNull();
    expect(profileFault({ loops: [box(0, 0, 4, 3), hole(2, 1.5, 1)] })).toBeNull();
    const rounded = outline([{ at: [0, 0], radius: 1 }, { at: [4, 0], radius: 1 }, { at: [2, 3] }]);
    expect(profileFault({ loops: [rounded] })).toBeNull();
  });

  it('refuses an edge length that is no positive number, such as JSON leaves of an endless one', () => {
    for (const size of [null, 0, Number.NaN]) {
      const [first, ...others] = box(0, 0, 4, 3);
      const spoilt = { ...first!, size: size as number };
      expect(profileFault({ loops: [[spoilt, ...others]] })).toMatch(/"edge0" is not a positive number/);
    }
  });

  it('names the edges of a bow tie', () => {
    const bow = loopOf([
      [0, 0],
      [4, 3],
      [4, 0],
      [0, 4],
    ]);
    expect(profileFault({ loops: [bow] })).toMatch(/"edge0" and "edge2" cross/);
  });

  it('sees a hole that breaks through the outline', () => {
    expect(profileFault({ loops: [box(0, 0, 4, 3), hole(2, 1, 1.2)] })).toMatch(/cross/);
  });

  it('sees two holes that overlap', () => {
    expect(profileFault({ loops: [box(0, 0, 9, 5), hole(3, 2.5, 1), hole(4.5, 2.5, 1)] })).toMatch(/cross/);
  });

  it('sees an edge that lies on another', () => {
    const folded = loopOf([
      [0, 0],
      [4, 0],
      [4, 3],
      [1, 3],
      [3, 3],
      [0, 2],
    ]);
    expect(profileFault({ loops: [folded] })).toMatch(/cross/);
  });

  it('sees a corner that touches the opposite edge', () => {
    const touching = loopOf([
      [0, 0],
      [2, 2],
      [4, 0],
      [4, 2],
      [0, 2],
    ]);
    expect(profileFault({ loops: [touching] })).toMatch(/cross/);
  });

  it('sees a chain that does not close', () => {
    const open = [line([0, 0], [4, 0], 'a'), line([4, 0], [4, 3], 'b'), line([4, 3], [0, 0.1], 'c')];
    expect(profileFault({ loops: [open] })).toMatch(/open behind the edge "c"/);
  });

  it('sees a loop that runs the wrong way', () => {
    const clockwise = loopOf([
      [0, 0],
      [0, 3],
      [4, 3],
      [4, 0],
    ]);
    expect(profileFault({ loops: [clockwise] })).toMatch(/counter-clockwise/);
  });

  it('sees a number that is not finite and an edge without length', () => {
    const endless = [line([0, 0], [4, 0], 'a'), line([4, 0], [4, Infinity], 'b'), line([4, 3], [0, 0], 'c')];
    expect(profileFault({ loops: [endless] })).toMatch(/finite/);
    expect(profileFault({ loops: [[arc([0, 0], Number.NaN, 0, 2 * Math.PI)]] })).toMatch(/finite/);
    const speck = [line([0, 0], [4, 0], 'a'), line([4, 0], [4, 1e-7], 'b'), line([4, 1e-7], [0, 0], 'c')];
    expect(profileFault({ loops: [speck] })).toMatch(/"b" has no length/);
  });
});

describe('outline', () => {
  it('refuses roundings that overrun an edge and names it', () => {
    const corners = [
      { at: [0, 0] as Point, radius: 2, tag: 'short' },
      { at: [3, 0] as Point, radius: 2 },
      { at: [3, 9] as Point },
      { at: [0, 9] as Point },
    ];
    expect(() => outline(corners)).toThrow(/overrun the edge "short"/);
  });

  it('refuses a corner that is not a finite number', () => {
    expect(() => box(0, 0, Number.NaN, 3)).toThrow(/not a finite number/);
  });

  it('turns the arc of an inner corner the other way round', () => {
    const inner = outline([
      { at: [0, 0] },
      { at: [4, 0] },
      { at: [4, 4] },
      { at: [2, 4] },
      { at: [2, 2], radius: 0.5 },
      { at: [0, 2] },
    ]);
    const sweeps = inner.filter((s) => s.kind === 'arc').map((s) => s.sweep);
    expect(sweeps).toHaveLength(1);
    expect(sweeps[0]).toBeCloseTo(-Math.PI / 2, 12);
  });
});
