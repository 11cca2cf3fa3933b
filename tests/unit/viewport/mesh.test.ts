import { describe, expect, it } from 'vitest';
import { relaxed } from '@/components/viewport/mesh/flips';
import { bentBy, longerThan, refine, unrefined } from '@/components/viewport/mesh/refine';
import { faceNormals, shadingOf, writeDrawn } from '@/components/viewport/mesh/shading';
import { flatten, signedArea, slice } from '@/components/viewport/mesh/slice';
import type { Motion } from '@/generators/contract';
import type { TriMesh } from '@/lib/geometry/kernel';
import { boxMesh, openSides, tubeMesh, volumeOf } from './shapes';

/** A strip along x bent to a circle of radius r about y, as a motion; strain is z / r at t = 1. */
const rolled = (r: number): Motion => ({
  label: 'Roll',
  from: 'flat',
  to: 'rolled',
  peakStrain: 1 / r,
  pose(_, rest, t, out) {
    for (let k = 0; k < rest.length; k += 3) {
      const [x, y, z] = [rest[k]!, rest[k + 1]!, rest[k + 2]!];
      const angle = (t * x) / r;
      const radius = t === 0 ? Infinity : r / t - z;
      out.positions.set(
        t === 0 ? [x, y, z] : [radius * Math.sin(angle), y, r / t - radius * Math.cos(angle)],
        k,
      );
      out.strain[k / 3] = (-t * z) / r;
    }
  },
});

const totalLength = ({ positions: p, indices }: TriMesh) =>
  Array.from(indices, (a, side) => {
    const b = indices[side % 3 === 2 ? side - 2 : side + 1]!;
    return Math.hypot(...[0, 1, 2].map((k) => p[3 * a + k]! - p[3 * b + k]!));
  }).reduce((sum, one) => sum + one, 0);

const longestEdge = ({ positions: p, indices }: ReturnType<typeof boxMesh>) =>
  Math.max(
    ...Array.from(indices, (a, side) => {
      const b = indices[side % 3 === 2 ? side - 2 : side + 1]!;
      return Math.hypot(...[0, 1, 2].map((k) => p[3 * a + k]! - p[3 * b + k]!));
    }),
  );

describe('splitting long edges', () => {
  it('leaves no edge over the length, no crack and the same volume', () => {
    const { mesh: fine } = refine(boxMesh(40, 4, 2), longerThan(2));
    expect(longestEdge(fine)).toBeLessThanOrEqual(2);
    expect(openSides(fine)).toBe(0);
    expect(volumeOf(fine)).toBeCloseTo(320, 3);
  });

  it('leaves a mesh that is fine enough as it is', () => {
    const box = boxMesh(1, 1, 1);
    expect(refine(box, longerThan(5)).mesh).toBe(box);
  });

  it('stays within the count it is given and still without cracks', () => {
    const { mesh: fine } = refine(boxMesh(400, 4, 2), longerThan(0.5), { maxTriangles: 1500, maxRounds: 12 });
    expect(fine.indices.length / 3).toBeLessThanOrEqual(1500);
    expect(fine.indices.length / 3).toBeGreaterThan(1000);
    expect(openSides(fine)).toBe(0);
  });

  it('follows a strip rolled to a half circle within the sag allowed', () => {
    const radius = 40 / Math.PI;
    const motion = rolled(radius);
    const { mesh: fine } = refine(boxMesh(40, 4, 1), bentBy(motion, 'strip', 0.02, 1));
    const out = { positions: new Float32Array(fine.positions.length), strain: new Float32Array(1e5) };
    motion.pose('strip', fine.positions, 1, out);
    const bent = volumeOf({ positions: out.positions, indices: fine.indices });
    expect(openSides(fine)).toBe(0);
    const exact = (Math.PI / 2) * (radius ** 2 - (radius - 1) ** 2) * 4;
    expect(Math.abs(bent / exact - 1)).toBeLessThan(0.01);
  });

  it('does not split what only moves and turns', () => {
    const turned: Motion = {
      ...rolled(10),
      peakStrain: 0,
      pose(_, rest, t, out) {
        const [c, s] = [Math.cos(t), Math.sin(t)];
        for (let k = 0; k < rest.length; k += 3) {
          out.positions.set(
            [c * rest[k]! - s * rest[k + 1]!, s * rest[k]! + c * rest[k + 1]!, rest[k + 2]! + t],
            k,
          );
        }
        out.strain.fill(0);
      },
    };
    const box = boxMesh(40, 4, 2);
    expect(refine(box, bentBy(turned, 'box', 0.01, 1e-4)).mesh).toBe(box);
  });
});

const shaded = (mesh: TriMesh) => shadingOf(unrefined(mesh), mesh);

/** A plate whose top and back are fans from one corner to points along the rim. */
function fannedPlate(length: number, width: number, points: number): TriMesh {
  const { positions } = boxMesh(length, width, 1);
  const plate = boxMesh(length, width, 1);
  const middle = Array.from({ length: points }, (_, k) => [
    ((k + 1) * length) / (points + 1),
    width,
    1,
  ]).flat();
  const [low, high] = [4, 5];
  const rim = [6, ...Array.from({ length: points }, (_, k) => 8 + k), 7];
  const top = rim.slice(1).flatMap((vertex, k) => [low, vertex, rim[k]!]);
  const back = rim.slice(1).flatMap((vertex, k) => [2, rim[k]!, vertex]);
  const kept = [...plate.indices].slice(0, 6);
  const rest = [...plate.indices].slice(12, 18).concat([...plate.indices].slice(24));
  const indices = [...kept, ...top, low, high, 7, ...back, 2, 7, 3, ...rest];
  return { positions: new Float32Array([...positions, ...middle]), indices: Uint32Array.from(indices) };
}

describe('turning edges inside flat faces', () => {
  const plate = fannedPlate(60, 4, 9);
  const triangles = { indices: plate.indices, parent: unrefined(plate).parent };
  const inOnePlane = (one: number, other: number) => {
    const n = faceNormals(plate);
    return [0, 1, 2].reduce((sum, k) => sum + n[3 * one + k]! * n[3 * other + k]!, 0) > 1 - 1e-6;
  };

  it('starts here from a closed plate with a long fan across it', () => {
    expect(openSides(plate)).toBe(0);
    expect(volumeOf(plate)).toBeCloseTo(240, 3);
  });

  it('keeps the plate closed and its volume, and shortens the fan', () => {
    const { indices } = relaxed(plate.positions, triangles, inOnePlane);
    const turned = { positions: plate.positions, indices };
    expect(openSides(turned)).toBe(0);
    expect(volumeOf(turned)).toBeCloseTo(240, 3);
    expect(totalLength(turned)).toBeLessThan(totalLength(plate) - 1);
  });

  it('leaves edges between faces that are not in one plane', () => {
    const { indices } = relaxed(plate.positions, triangles, () => false);
    expect([...indices]).toEqual([...plate.indices]);
  });

  it('makes a long thin plate fine with few triangles', () => {
    const { mesh } = refine(plate, longerThan(3));
    expect(openSides(mesh)).toBe(0);
    expect(volumeOf(mesh)).toBeCloseTo(240, 3);
    expect(mesh.indices.length / 3).toBeLessThan(700);
  });
});

describe('shading', () => {
  it('gives a box its 24 corners of flat faces and 12 creases', () => {
    const shading = shaded(boxMesh(3, 2, 1));
    expect(shading.source.length).toBe(24);
    expect(shading.edges.length / 2).toBe(12);
  });

  it('rounds a tube and keeps its four rims sharp', () => {
    const facets = 32;
    const shading = shaded(tubeMesh(5, 4, 10, facets));
    expect(shading.edges.length / 2).toBe(4 * facets);
    expect(shading.source.length).toBe(8 * facets);
  });

  it('gives a tube wall normals that point away from its axis', () => {
    const tube = tubeMesh(5, 4, 10, 32);
    const shading = shaded(tube);
    const positions = new Float32Array(3 * shading.source.length);
    const normals = new Float32Array(3 * shading.source.length);
    writeDrawn(tube.positions, shading, positions, normals);
    const walls = [...shading.source.keys()].filter(
      (k) =>
        Math.abs(normals[3 * k + 2]!) < 0.5 && Math.hypot(positions[3 * k]!, positions[3 * k + 1]!) > 4.5,
    );
    expect(walls.length).toBe(64);
    for (const k of walls) {
      const outward = (positions[3 * k]! * normals[3 * k]! + positions[3 * k + 1]! * normals[3 * k + 1]!) / 5;
      expect(outward).toBeGreaterThan(0.99);
    }
  });

  it('finds no crease within a face, however finely it is split', () => {
    const box = boxMesh(30, 2, 1);
    const refined = refine(box, longerThan(0.7));
    const { edges } = shadingOf(refined, box);
    const length = Array.from({ length: edges.length / 2 }, (_, k) => {
      const [a, b] = [3 * edges[2 * k]!, 3 * edges[2 * k + 1]!];
      return Math.hypot(
        ...[0, 1, 2].map((axis) => refined.mesh.positions[a + axis]! - refined.mesh.positions[b + axis]!),
      );
    }).reduce((sum, one) => sum + one, 0);
    expect(length).toBeCloseTo(4 * (30 + 2 + 1), 3);
  });

  it('gives unit normals that look outward', () => {
    const normals = faceNormals(boxMesh(3, 2, 1));
    expect([...normals.subarray(0, 3)]).toEqual([0, 0, -1].map((v) => expect.closeTo(v)));
  });
});

describe('slicing', () => {
  it.each([
    ['x', 2 * 1],
    ['y', 3 * 1],
    ['z', 3 * 2],
  ] as const)('finds the section of a box across %s', (axis, area) => {
    const outlines = slice(boxMesh(3, 2, 1), axis, 0.5);
    expect(outlines.length).toBe(1);
    expect(signedArea(flatten(outlines[0]!, axis))).toBeCloseTo(area, 5);
  });

  it('finds the ring of a tube as an outline and a hole', () => {
    const areas = slice(tubeMesh(5, 4, 10, 64), 'z', 3).map((one) => signedArea(flatten(one, 'z')));
    const facetedCircle = (r: number) => 32 * r * r * Math.sin(Math.PI / 32);
    expect(areas.sort((a, b) => b - a)).toEqual([
      expect.closeTo(facetedCircle(5), 3),
      expect.closeTo(-facetedCircle(4), 3),
    ]);
  });

  it('cuts through corners without losing the outline', () => {
    const total = (at: number) =>
      slice(tubeMesh(5, 4, 10, 64), 'y', at).reduce((sum, one) => sum + signedArea(flatten(one, 'y')), 0);
    expect(total(0)).toBeCloseTo(2 * 1 * 10, 3);
  });

  it('finds nothing beside the part', () => {
    expect(slice(boxMesh(3, 2, 1), 'x', 3.5)).toEqual([]);
    expect(slice(boxMesh(3, 2, 1), 'x', -1)).toEqual([]);
  });
});
