import type { Placement } from '@/lib/geometry/kernel';
import { movePoint } from '@/lib/geometry/placement';

/** Axis-aligned box, mm. */
export interface Box {
  readonly min: readonly [number, number, number];
  readonly max: readonly [number, number, number];
}

export function boxOf(clouds: readonly { points: ArrayLike<number>; at?: Placement }[]): Box {
  const min: [number, number, number] = [Infinity, Infinity, Infinity];
  const max: [number, number, number] = [-Infinity, -Infinity, -Infinity];
  for (const { points, at } of clouds) {
    for (let k = 0; k < points.length; k += 3) {
      const raw = [points[k]!, points[k + 1]!, points[k + 2]!] as const;
      const point = at ? movePoint(at, raw) : raw;
      for (let axis = 0; axis < 3; axis += 1) {
        min[axis] = Math.min(min[axis]!, point[axis]!);
        max[axis] = Math.max(max[axis]!, point[axis]!);
      }
    }
  }
  return min[0] > max[0] ? { min: [-1, -1, -1], max: [1, 1, 1] } : { min, max };
}

export const joinBoxes = (boxes: readonly Box[]): Box =>
  boxOf(boxes.map(({ min, max }) => ({ points: [...min, ...max] })));

/** Side of the squares drawn on the bed, mm. */
export const BED_SQUARE = 10;

/** The bed drawn under parts: whole squares, half a square or more beyond them. */
export function bedUnder({ min, max }: Box): Box {
  const low = (value: number) => Math.floor(value / BED_SQUARE - 0.5) * BED_SQUARE;
  const high = (value: number) => Math.ceil(value / BED_SQUARE + 0.5) * BED_SQUARE;
  return { min: [low(min[0]), low(min[1]), 0], max: [high(max[0]), high(max[1]), 0] };
}

export const cornersOf = ({ min, max }: Box): [number, number, number][] =>
  [0, 1, 2, 3, 4, 5, 6, 7].map((k) => [
    k & 1 ? max[0] : min[0],
    k & 2 ? max[1] : min[1],
    k & 4 ? max[2] : min[2],
  ]);

export const centreOf = ({ min, max }: Box): [number, number, number] => [
  (min[0] + max[0]) / 2,
  (min[1] + max[1]) / 2,
  (min[2] + max[2]) / 2,
];

export const diagonalOf = ({ min, max }: Box): number =>
  Math.hypot(max[0] - min[0], max[1] - min[1], max[2] - min[2]);
