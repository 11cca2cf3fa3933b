import { describe, expect, it } from 'vitest';
import strap from '@/generators/peg-strap';
import { headRadius, stripLayout } from '@/generators/peg-strap/layout';
import { type PegStrap, parameters } from '@/generators/peg-strap/schema';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';

const tpu = materialById('tpu-95a')!;
const straight: PegStrap = parameters.defaults;
const turned: PegStrap = {
  ...straight,
  halfTurn: true,
  strapWidth: 10,
  strapThickness: 1.2,
  eyeDiameter: 4,
  pegDiameter: 3,
  pegFillet: 0.4,
  headDiameter: 4.3,
  cornerRadius: 5,
};
const BOTH = [
  ['straight', straight],
  ['with a half turn', turned],
] as const;

type Point = readonly [number, number, number];

function posed(values: PegStrap, t: number, points: readonly Point[]) {
  const rest = Float32Array.from(points.flat());
  const out = { positions: new Float32Array(rest.length), strain: new Float32Array(points.length) };
  strap.motion(values, tpu).pose('strap', rest, t, out);
  const moved = points.map((_, i) => Array.from(out.positions.subarray(3 * i, 3 * i + 3)));
  return { moved, strain: Array.from(out.strain) };
}
/** The same, seen from the peg. */
function fromPeg(values: PegStrap, t: number, points: readonly Point[]) {
  const { moved, strain } = posed(values, t, [[0, 0, 3 * values.strapThickness], ...points]);
  const [peg, ...others] = moved;
  const origin = [peg![0]!, peg![1]!, peg![2]! - 3 * values.strapThickness];
  return {
    moved: others.map((point) => point.map((value, i) => value - origin[i]!)),
    strain: strain.slice(1),
  };
}
const distance = (a: readonly number[], b: readonly number[]) =>
  Math.hypot(...a.map((value, i) => value - b[i]!));
const spaced = (count: number, from: number, to: number) =>
  Array.from({ length: count + 1 }, (_, i) => from + ((to - from) * i) / count);

/** The middle of the strip from end to end; the eye's own stretch is looked at apart. */
function middleLine(values: PegStrap): Point[] {
  const { from, to } = stripLayout(values);
  return spaced(2000, from, to).map((x) => [x, 0, values.strapThickness / 2]);
}
const lengthOf = (points: readonly (readonly number[])[]) =>
  points.slice(1).reduce((sum, point, i) => sum + distance(point, points[i]!), 0);

describe('peg strap: motion', () => {
  it.each(BOTH)('lies as built when flat, free of strain (%s)', (_, values) => {
    const points: Point[] = [
      [0, 3, 0],
      [40, -4, 1],
      [1, 1, values.strapThickness + 3],
    ];
    const { moved, strain } = posed(values, 0, points);
    moved.forEach((point, i) => {
      expect(distance(point, points[i]!)).toBeLessThan(1e-4);
    });
    expect(strain.every((value) => value === 0)).toBe(true);
  });

  it.each(BOTH)('keeps its length and stays finite all the way (%s)', (_, values) => {
    const line = middleLine(values);
    for (const t of [0.1, 0.3, 0.5, 0.74, 0.85, 1]) {
      const { moved, strain } = posed(values, t, line);
      expect(moved.flat().every(Number.isFinite)).toBe(true);
      expect(strain.every(Number.isFinite)).toBe(true);
      expect(Math.abs(lengthOf(moved) / lengthOf(line) - 1), `t ${t}`).toBeLessThan(0.005);
    }
  });

  it.each(BOTH)('brings the first eye onto the peg, one thickness above the strip (%s)', (_, values) => {
    const eye: Point = [stripLayout(values).eyes[0]!, 0, values.strapThickness / 2];
    const { moved } = fromPeg(values, 1, [eye]);
    expect(distance(moved[0]!, [0, 0, 1.5 * values.strapThickness])).toBeLessThan(0.1);
  });

  it('turns the eye end over with a half turn and not without', () => {
    for (const [values, flips] of [
      [straight, 1],
      [turned, -1],
    ] as const) {
      const x = stripLayout(values).eyes[0]!;
      const { moved } = posed(values, 1, [
        [x + 3, 0, 0],
        [x + 3, 0, values.strapThickness],
        [x + 3, 1, 0],
      ]);
      expect(Math.sign(moved[1]![2]! - moved[0]![2]!)).toBe(flips);
      expect(Math.sign(moved[2]![1]! - moved[0]![1]!)).toBe(flips);
    }
  });

  it.each(BOTH)('comes down over the head without cutting it (%s)', (_, values) => {
    const x = stripLayout(values).eyes[0]!;
    const rim: Point[] = spaced(24, 0, 2 * Math.PI).flatMap((angle) =>
      [0, values.strapThickness].map(
        (z): Point => [
          x + (values.eyeDiameter / 2) * Math.cos(angle),
          (values.eyeDiameter / 2) * Math.sin(angle),
          z,
        ],
      ),
    );
    for (const t of [0.75, 0.8, 0.85, 0.9, 0.95, 1]) {
      const { moved } = fromPeg(values, t, rim);
      const depth = Math.max(
        ...moved.map(
          ([px, py, pz]) => headRadius(values, pz! - values.strapThickness) - Math.hypot(px!, py!),
        ),
      );
      expect(depth, `t ${t}`).toBeLessThan(0.1 * values.eyeDiameter);
    }
  });

  it('stretches the outer face and squeezes the inner one by the wrap strain', () => {
    const { strapThickness: t, bundleDiameter: d } = straight;
    const { strain } = posed(straight, 1, [
      [20, 0, t],
      [20, 0, 0],
    ]);
    expect(strain[0]! / (t / (d + t))).toBeGreaterThan(0.9);
    expect(strain[0]! / (t / (d + t))).toBeLessThanOrEqual(1);
    expect(strain[1]).toBeCloseTo(-strain[0]!, 6);
  });

  it('stretches the faces in truth by what it paints on them', () => {
    for (const [values, y, z] of [
      [straight, 0, straight.strapThickness],
      [turned, turned.strapWidth / 2, turned.strapThickness],
      [turned, -turned.strapWidth / 2, turned.strapThickness / 2],
    ] as const) {
      const to = stripLayout(values).eyes[0]! - 12;
      const rest: Point[] = spaced(400, 12, to).map((x) => [x, y, z]);
      const { moved, strain } = posed(values, 1, rest);
      const mean = strain.reduce((sum, value) => sum + value, 0) / strain.length;
      expect(Math.abs(lengthOf(moved) / lengthOf(rest) - 1 - mean)).toBeLessThan(0.012);
    }
  });

  it('keeps peg and head rigid, upright and free of strain', () => {
    const head: Point[] = [
      [2, 1, straight.strapThickness + 4],
      [-2, -1, 2 * straight.strapThickness + 1],
    ];
    for (const t of [0.4, 1]) {
      const { moved, strain } = fromPeg(straight, t, head);
      moved.forEach((point, i) => {
        expect(distance(point, head[i]!)).toBeLessThan(1e-4);
      });
      expect(strain).toEqual([0, 0]);
    }
  });

  it.each(BOTH)('ends standing over the bed, where the strip lay (%s)', (_, values) => {
    const { from, to } = stripLayout(values);
    const { moved } = posed(values, 1, middleLine(values));
    const along = moved.map(([x]) => x!);
    expect(Math.min(...moved.map(([, , z]) => z!))).toBeGreaterThan(0);
    expect(Math.min(...along)).toBeGreaterThan(from);
    expect(Math.max(...along)).toBeLessThan(to);
  });

  it('paints the side of an eye on the bundle with the strain that the verdict stands on', () => {
    const long = { ...straight, eyeCount: 3 };
    const [, second] = stripLayout(long).eyes;
    const { strain } = posed(long, 1, [[second!, long.eyeDiameter / 2, long.strapThickness]]);
    const report = strap.check(long, tpu, DEFAULT_USE);
    const told = report.figures.find(({ id }) => id === 'eye-bend-strain')!.value!;
    expect(strain[0]! / told).toBeGreaterThan(0.75);
    expect(strain[0]! / told).toBeLessThanOrEqual(1.001);
  });

  it('paints no more than its peak and reaches most of it', () => {
    for (const [, values] of BOTH) {
      const { peakStrain } = strap.motion(values, tpu);
      const { from, to } = stripLayout(values);
      const points: Point[] = spaced(200, from, to).flatMap((x) =>
        [-0.5, 0, 0.5].flatMap((side) =>
          [0, values.strapThickness].map((z): Point => [x, side * values.strapWidth, z]),
        ),
      );
      points.push(
        ...stripLayout(values).eyes.map((x): Point => [x, values.eyeDiameter / 2, values.strapThickness]),
      );
      const all = [0.5, 0.75, 0.88, 1].flatMap((t) => posed(values, t, points).strain.map(Math.abs));
      expect(Math.max(...all)).toBeLessThanOrEqual(peakStrain * 1.001);
      expect(Math.max(...all)).toBeGreaterThan(0.9 * peakStrain);
    }
  });
});
