import { beforeAll, describe, expect, it } from 'vitest';
import { createKernelHost, type KernelHost } from '@/lib/geometry/host';
import { type Loop, QUALITY, type Vec3 } from '@/lib/geometry/kernel';
import { loopArea } from '@/lib/geometry/loops';
import { meshFaults, meshVolume } from '@/lib/geometry/mesh-check';
import { arcPoints, roundedPolygon } from '@/lib/geometry/outline';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import { framesAlong, sweep } from '@/lib/geometry/sweep';
import { triangulate } from '@/lib/geometry/triangulate';

let host: KernelHost;
beforeAll(async () => {
  host = await createKernelHost();
});

const section: Loop = roundedPolygon(
  [
    { at: [-3, -1], radius: 0.5 },
    { at: [3, -1] },
    { at: [3, 1], radius: 0.5 },
    { at: [0, 1] },
    { at: [-3, 1] },
  ],
  8,
);
const straight = Array.from({ length: 11 }, (_, at) => translation([0, 0, at]));
const UP: Vec3 = [0, 0, 1];

describe('triangles of a section', () => {
  it('cover it and use every point, also those on a straight run', () => {
    const loop: Loop = [
      [0, 0],
      [2, 0],
      [4, 0],
      [4, 3],
      [3, 3],
      [3, 1],
      [1, 1],
      [1, 3],
      [0, 3],
    ];
    const triangles = triangulate(loop);
    expect(triangles).toHaveLength((loop.length - 2) * 3);
    expect(new Set(triangles).size).toBe(loop.length);
    let area = 0;
    for (let at = 0; at < triangles.length; at += 3) {
      const part = loopArea(triangles.slice(at, at + 3).map((index) => loop[index]!));
      expect(part).toBeGreaterThan(0);
      area += part;
    }
    expect(area).toBeCloseTo(loopArea(loop), 12);
  });

  it('cannot be found for a clockwise loop', () => {
    expect(() =>
      triangulate([
        [0, 0],
        [0, 1],
        [1, 0],
      ]),
    ).toThrow('not simple and counter-clockwise');
  });
});

describe('swept bars', () => {
  it('have the volume of section times length when straight', () => {
    const mesh = sweep(section, straight);
    expect(meshFaults(mesh)).toEqual([]);
    expect(meshVolume(mesh)).toBeCloseTo(loopArea(section) * 10, 4);
  });

  it('keep that volume within 1 % under a slow twist of a half turn', () => {
    const frames = Array.from({ length: 121 }, (_, at) =>
      compose(translation([0, 0, at / 3]), rotation('z', (Math.PI * at) / 120)),
    );
    const mesh = sweep(section, frames);
    expect(meshFaults(mesh)).toEqual([]);
    expect(Math.abs(meshVolume(mesh) / (loopArea(section) * 40) - 1)).toBeLessThan(0.01);
  });

  it('follow Pappus: section area times the way of its centroid for a closed ring', () => {
    const square: Loop = [
      [-1, -1],
      [1, -1],
      [1, 1],
      [-1, 1],
    ];
    const path = arcPoints([0, 0], 20, 0, 2 * Math.PI, 256)
      .slice(0, -1)
      .map(([x, y]): Vec3 => [x, y, 5]);
    const mesh = sweep(square, framesAlong(path, UP, { closed: true }), { closed: true });
    expect(meshFaults(mesh)).toEqual([]);
    expect(meshVolume(mesh) / (4 * 2 * Math.PI * 20)).toBeCloseTo(1, 3);
  });

  it('may change section along the way', () => {
    const sections = (at: number): Loop => {
      const half = 2 - at / 10;
      return [
        [-half, -half],
        [half, -half],
        [half, half],
        [-half, half],
      ];
    };
    const mesh = sweep(sections, straight);
    expect(meshFaults(mesh)).toEqual([]);
    expect(meshVolume(mesh)).toBeCloseTo((10 / 3) * (16 + 4 + 8), 4);
  });

  it('join with other solids in the kernel', () => {
    const path = arcPoints([0, 0], 12, 0, Math.PI, 64).map(([x, y]): Vec3 => [x, y, 0]);
    const bodies = host.build((kernel) => {
      const bow = kernel.fromMesh(sweep(section, framesAlong(path, UP)));
      return [{ name: 'bow', solid: kernel.union([bow, kernel.box([8, 6, 4], [12, -2.5, 0])]) }];
    }, QUALITY.export);
    expect(meshFaults(bodies[0]!.mesh)).toEqual([]);
  });
});

describe('what a sweep refuses', () => {
  it('one frame, or two in a closed loop', () => {
    expect(() => sweep(section, straight.slice(0, 1))).toThrow('sweep: too few frames');
    expect(() => sweep(section, straight.slice(0, 2), { closed: true })).toThrow('sweep: too few frames');
  });

  it('a clockwise section', () => {
    expect(() => sweep([...section].reverse(), straight)).toThrow('sweep: the first loop runs clockwise');
  });

  it('sections of different point counts', () => {
    expect(() => sweep((at) => (at === 3 ? section.slice(1) : section), straight)).toThrow(
      'sweep: the sections differ in their number of points',
    );
  });

  it('a frame that scales', () => {
    const scaled = [2, 0, 0, 0, 0, 2, 0, 0, 0, 0, 2, 0, 0, 0, 0, 1];
    expect(() => sweep(section, [straight[0]!, scaled])).toThrow('sweep: a frame is not a rotation');
  });

  it('a path along `up`', () => {
    expect(() =>
      framesAlong(
        [
          [0, 0, 0],
          [0, 0, 1],
        ],
        UP,
      ),
    ).toThrow('framesAlong: the path stops or runs along');
  });
});
