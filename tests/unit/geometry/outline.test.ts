import { describe, expect, it } from 'vitest';
import type { Vec2 } from '@/lib/geometry/kernel';
import { loopArea, profileFault } from '@/lib/geometry/loops';
import {
  arcPoints,
  boreRadius,
  chordError,
  filletPoints,
  inscribedArea,
  mirrored,
  moved,
  roundedPolygon,
  symmetric,
  turned,
} from '@/lib/geometry/outline';

const distance = (a: Vec2, b: Vec2) => Math.hypot(a[0] - b[0], a[1] - b[1]);

describe('facets', () => {
  it('leave the chord error R(1 - cos(pi/N)): 67, 17 and 7.5 um at R 14 mm', () => {
    expect(chordError(14, 32) * 1000).toBeCloseTo(67.4, 1);
    expect(chordError(14, 64) * 1000).toBeCloseTo(16.9, 1);
    expect(chordError(14, 96) * 1000).toBeCloseTo(7.5, 1);
  });

  it('of a bore touch the nominal circle in the middle of each flat', () => {
    const [a, b] = arcPoints([0, 0], boreRadius(5, 32), 0, (2 * Math.PI) / 32, 32);
    expect(Math.hypot((a![0] + b![0]) / 2, (a![1] + b![1]) / 2)).toBeCloseTo(5, 12);
  });
});

describe('arcs', () => {
  it('keep both ends and lie on the circle', () => {
    const points = arcPoints([2, 1], 3, 0, -Math.PI / 2, 32);
    expect(points).toHaveLength(9);
    expect(points[0]).toEqual([5, 1]);
    expect(distance(points.at(-1)!, [2, -2])).toBeLessThan(1e-12);
    for (const point of points) expect(distance(point, [2, 1])).toBeCloseTo(3, 12);
  });
});

describe('fillets', () => {
  it('are tangent to both lines at the setback r tan(bend/2)', () => {
    const points = filletPoints([-10, 0], [0, 0], [0, 10], 2, 8);
    expect(points).toHaveLength(9);
    expect(distance(points[0]!, [-2, 0])).toBeLessThan(1e-12);
    expect(distance(points.at(-1)!, [0, 2])).toBeLessThan(1e-12);
    for (const point of points) expect(distance(point, [-2, 2])).toBeCloseTo(2, 12);
  });

  it('turn the other way in an inside corner', () => {
    const points = filletPoints([-10, 0], [0, 0], [0, -10], 2, 8);
    for (const point of points) expect(distance(point, [-2, -2])).toBeCloseTo(2, 12);
  });

  it('leave a corner without radius, and one that runs straight on', () => {
    expect(filletPoints([0, 0], [1, 0], [1, 1], 0, 8)).toEqual([[1, 0]]);
    expect(filletPoints([0, 0], [1, 0], [2, 0], 3, 8)).toEqual([[1, 0]]);
  });
});

describe('rounded polygons', () => {
  const corners = (radius: number) =>
    (
      [
        [0, 0],
        [10, 0],
        [10, 6],
        [0, 6],
      ] as Vec2[]
    ).map((at) => ({ at, radius }));

  it('have the area of the rectangle less its corners, as faceted', () => {
    const loop = roundedPolygon(corners(2), 16);
    expect(profileFault({ loops: [loop] })).toBeNull();
    expect(loopArea(loop)).toBeCloseTo(60 - (16 - inscribedArea(2, 64)), 9);
  });

  it('close to a slot when the roundings just meet', () => {
    const loop = roundedPolygon(corners(3), 16);
    expect(profileFault({ loops: [loop] })).toBeNull();
    expect(loopArea(loop)).toBeCloseTo(4 * 6 + inscribedArea(3, 64), 9);
  });

  it('refuse roundings that run into each other', () => {
    expect(() => roundedPolygon(corners(3.01), 16)).toThrow('the roundings of corners 1 and 2 overlap');
  });
});

describe('mirror images', () => {
  it('keep the direction of the loop', () => {
    const loop: Vec2[] = [
      [1, 0],
      [4, 0],
      [4, 2],
    ];
    expect(loopArea(mirrored(loop, 'x'))).toBe(loopArea(loop));
    expect(mirrored(loop, 'x')).toEqual([
      [-4, 2],
      [-4, 0],
      [-1, 0],
    ]);
  });

  it('complete a half outline without doubling the points on the line', () => {
    const loop = symmetric(
      [
        [0, -2],
        [5, -2],
        [5, 2],
        [0, 2],
      ],
      'x',
    );
    expect(loop).toHaveLength(6);
    expect(loopArea(loop)).toBe(40);
    expect(profileFault({ loops: [loop] })).toBeNull();
  });

  it('move and turn with area kept', () => {
    const loop: Vec2[] = [
      [0, 0],
      [4, 0],
      [4, 2],
    ];
    expect(loopArea(turned(moved(loop, [3, -1]), 0.8))).toBeCloseTo(4, 12);
  });
});
