import { describe, expect, it } from 'vitest';
import type { TriMesh, Vec2 } from '@/lib/geometry/kernel';
import { boundsOf, meshFaults, meshVolume } from '@/lib/geometry/mesh-check';
import { FADE, type Ridge, ridgeHeight, ridgeMesh, ridgeVolume } from '@/lib/geometry/thread';

const OUTLINE: Vec2[] = [
  [12, -1.5],
  [13.2, -0.4],
  [13.2, 0.4],
  [12, 1.2],
];
const outward: Ridge = {
  outline: OUTLINE,
  facing: 'outward',
  lead: 4,
  starts: 1,
  turns: 1.25,
  base: 3,
  phase: 0,
};
const inward: Ridge = {
  ...outward,
  facing: 'inward',
  outline: OUTLINE.map(([radius, height]): Vec2 => [27 - radius, height]),
};
const point = (mesh: TriMesh, at: number) => mesh.positions.slice(at * 3, at * 3 + 3);
const radii = (mesh: TriMesh) =>
  Array.from({ length: mesh.positions.length / 3 }, (_, at) => {
    const [x, y] = point(mesh, at);
    return Math.hypot(x!, y!);
  });

/** Integral of the radius over a section. */
const firstMoment = (section: readonly Vec2[]): number =>
  section.reduce((sum, [r0, z0], at) => {
    const [r1, z1] = section[(at + 1) % section.length]!;
    return sum + ((r0 * r0 + r0 * r1 + r1 * r1) / 6) * (z1 - z0);
  }, 0);

describe('thread ridges', () => {
  it.each([
    ['outward', outward, 1],
    ['inward', inward, 1],
    ['outward, three starts', { ...outward, starts: 3, lead: 12 }, 3],
    ['inward, two starts', { ...inward, starts: 2, lead: 8, turns: 0.6 }, 2],
    ['outward, from a third of a turn', { ...outward, phase: 1 / 3 }, 1],
  ] as const)('are closed and look outward: %s', (_, ridge, shells) => {
    for (const segments of [32, 96]) {
      const mesh = ridgeMesh(ridge, segments);
      expect(meshFaults(mesh)).toEqual([]);
      const vertices = mesh.positions.length / 3;
      const edges = mesh.indices.length / 2;
      const faces = mesh.indices.length / 3;
      expect(vertices - edges + faces).toBe(2 * shells);
    }
  });

  it('keep an outward ridge inside its true crest and an inward one outside', () => {
    expect(Math.max(...radii(ridgeMesh(outward, 32)))).toBeCloseTo(13.2, 4);
    const crest = Math.min(...radii(ridgeMesh(inward, 32)));
    expect(crest * Math.cos(Math.PI / 32)).toBeCloseTo(27 - 13.2, 4);
  });

  it('climb by the lead in a turn, right-handed', () => {
    const mesh = ridgeMesh({ ...outward, turns: 3 }, 32);
    const ring = OUTLINE.length + 2;
    const here = point(mesh, 20 * ring + 1);
    const quarter = point(mesh, 28 * ring + 1);
    const turn = point(mesh, 52 * ring + 1);
    expect(turn[2]! - here[2]!).toBeCloseTo(4, 4);
    expect(quarter[2]! - here[2]!).toBeCloseTo(1, 4);
    expect(here[0]! * quarter[1]! - here[1]! * quarter[0]!).toBeGreaterThan(0);
  });

  it('reach from the fade below to the fade above', () => {
    const [, , low, , , high] = boundsOf(ridgeMesh(outward, 96).positions);
    expect(low).toBeCloseTo(3 - 4 * (FADE / 2) - 1.5, 4);
    expect(high).toBeCloseTo(3 + 4 * (1.25 + FADE / 2) + 1.2, 4);
  });

  it('begin and end inside the wall', () => {
    const mesh = ridgeMesh(outward, 96);
    const size = OUTLINE.length + 2;
    const all = radii(mesh);
    const ends = [...all.slice(0, size), ...all.slice(-size)];
    expect(Math.max(...ends)).toBeLessThan(12 * Math.cos(Math.PI / 96) - 0.15);
  });

  it('have half their height where the turns are counted from', () => {
    expect([-FADE / 2, 0, FADE / 2].map((at) => ridgeHeight(outward, at))).toEqual([0, 0.5, 1]);
    expect(ridgeHeight(outward, 1.25)).toBeCloseTo(0.5, 9);
  });

  it('refuse a ridge as wide as its pitch, whose turns would run through each other', () => {
    expect(() => ridgeMesh({ ...outward, lead: 2.7 }, 32)).toThrow('2.7 mm wide at its root');
    expect(() => ridgeMesh({ ...outward, lead: 5, starts: 2 }, 32)).toThrow(RangeError);
  });

  // Flanks split along one diagonal only leaned to one side: 0.1 % of the volume of a coarse neck was missing.
  it.each([32, 96])('lean to neither side of the true surface with %s facets', (segments) => {
    const steep: Ridge = { ...outward, lead: 40, turns: 1 };
    const volume = (turns: number) => meshVolume(ridgeMesh({ ...steep, turns }, segments));
    const foot = 12 * Math.cos(Math.PI / segments) - 0.5;
    const section: Vec2[] = [...OUTLINE, [foot, 1.2], [foot, -1.5]];
    const turn = segments * Math.sin((2 * Math.PI) / segments) * firstMoment(section);
    expect((volume(3) - volume(2)) / turn).toBeCloseTo(1, 5);
  });
});

describe('ridge volume', () => {
  it('tends to the volume of the smooth ridge by Pappus', () => {
    // no fades to speak of: ten turns, and the fades count as half a quarter turn each
    const long: Ridge = { ...outward, turns: 10 };
    const area = ((2.7 + 0.8) / 2) * 1.2;
    const centroid = 12 + (1.2 / 3) * ((2.7 + 2 * 0.8) / (2.7 + 0.8));
    expect(ridgeVolume(long, 360) / (10 * 2 * Math.PI * centroid * area)).toBeCloseTo(1, 2);
  });
});
