import { describe, expect, it } from 'vitest';
import type { TriMesh } from '@/lib/geometry/kernel';
import { cameraOf } from '@/lib/geometry/picture/camera';
import { drawMeshes, PART_COLOURS } from '@/lib/geometry/picture/draw';

const CORNERS = [0, 1, 2, 3, 4, 5, 6, 7].map((n) => [n & 1, (n >> 1) & 1, (n >> 2) & 1] as const);
const BOX_FACES = [
  [0, 2, 3, 1],
  [4, 5, 7, 6],
  [0, 1, 5, 4],
  [2, 6, 7, 3],
  [0, 4, 6, 2],
  [1, 3, 7, 5],
] as const;

/** A box with one corner at `at`, its faces looking outward. */
function box(
  size: readonly [number, number, number],
  at: readonly [number, number, number] = [0, 0, 0],
): TriMesh {
  const positions = CORNERS.flatMap((corner) => corner.map((n, axis) => at[axis]! + n * size[axis]!));
  const indices = BOX_FACES.flatMap(([a, b, c, d]) => [a, b, c, a, c, d]);
  return { positions: Float32Array.from(positions), indices: Uint32Array.from(indices) };
}

const SIZE = { width: 300, height: 200 };
const alphaAt = (pixels: Uint8ClampedArray, x: number, y: number) => pixels[4 * (y * SIZE.width + x) + 3]!;
const covered = (pixels: Uint8ClampedArray) => {
  let count = 0;
  for (let at = 3; at < pixels.length; at += 4) if (pixels[at]! > 0) count += 1;
  return count;
};

describe('the picture of a part', () => {
  it('looks along three directions at right angles, whatever way it is turned', () => {
    for (const [turn, rise] of [
      [0, 0],
      [0.6, 0.5],
      [-2, 1.2],
    ]) {
      const { right, up, toward } = cameraOf({ turn: turn!, rise: rise! });
      const dot = (a: readonly number[], b: readonly number[]) =>
        a.reduce((sum, v, at) => sum + v * b[at]!, 0);
      expect(dot(right, up)).toBeCloseTo(0);
      expect(dot(up, toward)).toBeCloseTo(0);
      expect(dot(right, toward)).toBeCloseTo(0);
      for (const axis of [right, up, toward]) expect(dot(axis, axis)).toBeCloseTo(1);
      const cross = right[0] * up[1] - right[1] * up[0];
      expect(cross).toBeCloseTo(toward[2]);
    }
  });

  it('covers the area that a box shows from there: the sum of its faces by their slant', () => {
    const view = { turn: 0.6, rise: 0.5 };
    const [a, b, c] = [30, 20, 12];
    const { right, up, toward } = cameraOf(view);
    const shadow = a * b * Math.abs(toward[2]) + b * c * Math.abs(toward[0]) + a * c * Math.abs(toward[1]);
    const wide = a * Math.abs(right[0]) + b * Math.abs(right[1]);
    const high = a * Math.abs(up[0]) + b * Math.abs(up[1]) + c * Math.abs(up[2]);
    const scale = Math.min(SIZE.width / wide, SIZE.height / high) * 0.9;
    const { pixels } = drawMeshes([box([a, b, c])], SIZE, view, 0.05);
    expect(covered(pixels) / (shadow * scale ** 2)).toBeCloseTo(1, 1);
  });

  it('hides what stands behind, in whatever order bodies come', () => {
    const front = box([10, 1, 10], [0, -5, 0]);
    const behind = box([10, 1, 10], [0, 5, 0]);
    const straight = { turn: 0, rise: 0 };
    const colourOf = (meshes: TriMesh[]) => {
      const { pixels } = drawMeshes(meshes, SIZE, straight);
      return [...pixels.slice(4 * (100 * SIZE.width + 150), 4 * (100 * SIZE.width + 150) + 3)];
    };
    const [first, second] = [colourOf([front, behind]), colourOf([behind, front])];
    const ratio = (colour: number[]) => colour[2]! / colour[0]!;
    expect(ratio(first)).toBeCloseTo(PART_COLOURS[0]![2] / PART_COLOURS[0]![0], 1);
    expect(ratio(second)).toBeCloseTo(PART_COLOURS[1]![2] / PART_COLOURS[1]![0], 1);
  });

  it('leaves the background clear, and outlines the part in ink', () => {
    const { pixels } = drawMeshes([box([10, 10, 10])], SIZE, { turn: 0, rise: 0 }, 0.1);
    expect(alphaAt(pixels, 2, 2)).toBe(0);
    expect(alphaAt(pixels, 150, 100)).toBe(255);
    const row = 100 * SIZE.width;
    const first = Array.from({ length: SIZE.width }, (_, x) => x).find(
      (x) => pixels[4 * (row + x) + 3]! > 0,
    )!;
    expect(pixels[4 * (row + first)]!).toBeLessThan(40);
  });
});
