import { describe, expect, it } from 'vitest';
import { type Moved, momentAt, readMoment } from '@/lib/fea/preview/between';
import { locate } from '@/lib/fea/preview/locate';
import { outline } from '@/lib/fea/profile/outline';
import { arc } from '@/lib/fea/profile/segment';
import { webModel } from '@/lib/fea/shapes/web';
import { NON_LINEAR } from '@/lib/fea/solve/options';
import { solveBending } from '@/lib/fea/solve/solve-bending';
import { meshed, REFERENCE, sampled, solved } from '@/tests/support/plane-models';

const mesh = meshed({
  loops: [
    outline([
      { at: [0, 0], tag: 'low' },
      { at: [12, 0], tag: 'right' },
      { at: [12, 6], radius: 2, tag: 'high' },
      { at: [0, 6], tag: 'left' },
    ]),
    [arc([5, 3], 1.5, 0, -2 * Math.PI, 'hole')],
  ],
});

/** Points on a lattice over the plate, some of them in the hole and outside. */
const points = Float32Array.from(
  Array.from({ length: 400 }, (_, i) => [(i % 20) * 0.7 - 0.5, Math.floor(i / 20) * 0.35 - 0.3]).flat(),
);

const still: Moved = { x: 0, y: 0, strain: 0 };

describe('points located in a mesh', () => {
  const anchors = locate(mesh, points);

  it('are carried exactly by a turn of the whole part, inside and outside', () => {
    const [c, s] = [Math.cos(0.8), Math.sin(0.8)];
    const displacement = sampled(mesh, (x, y) => [c * x - s * y - x + 1, s * x + c * y - y - 2]);
    const moment = { displacement, strain: new Float32Array(mesh.nodeCount) };
    for (let i = 0; i < points.length / 2; i++) {
      const moved = { ...still };
      readMoment(mesh, moment, anchors, i, moved);
      const [x, y] = [points[2 * i]!, points[2 * i + 1]!];
      expect(moved.x).toBeCloseTo(c * x - s * y - x + 1, 4);
      expect(moved.y).toBeCloseTo(s * x + c * y - y - 2, 4);
    }
  });

  it('read a field that is quadratic over the plate to float precision where they lie inside', () => {
    const strain = Float32Array.from(
      { length: mesh.nodeCount },
      (_, n) => 0.01 * mesh.nodes[2 * n]! - 0.002 * mesh.nodes[2 * n + 1]!,
    );
    const moment = { displacement: new Float64Array(2 * mesh.nodeCount), strain };
    for (let i = 0; i < points.length / 2; i++) {
      if (Math.hypot(anchors.offsets[2 * i]!, anchors.offsets[2 * i + 1]!) > 1e-5) continue;
      const moved = { ...still };
      readMoment(mesh, moment, anchors, i, moved);
      expect(moved.strain).toBeCloseTo(0.01 * points[2 * i]! - 0.002 * points[2 * i + 1]!, 5);
    }
  });
});

describe('moments of a solved motion', () => {
  const solution = solved(
    solveBending(
      webModel({
        length: 3,
        thickness: 0.4,
        leaf: 2,
        leafLength: 4,
        fillet: 0.3,
        relief: 0,
        angle: Math.PI / 2,
        width: 10,
      }),
      REFERENCE,
      NON_LINEAR,
    ),
  );

  it('are rest at 0 and the full deflection at 1', () => {
    expect(Math.max(...momentAt(solution, 0).displacement.map(Math.abs))).toBe(0);
    expect(momentAt(solution, 1).displacement).toEqual(solution.steps.at(-1)!.displacement);
  });

  it('pass through every stored step', () => {
    const { steps } = solution;
    const share = steps[1]!.deflection / steps.at(-1)!.deflection;
    const moment = momentAt(solution, share);
    moment.displacement.forEach((value, i) => {
      expect(value).toBeCloseTo(steps[1]!.displacement[i]!, 9);
    });
  });

  it('carry points of a leaf beyond the model along as a rigid body', () => {
    const far = Float32Array.of(20, 0, 20, 2);
    const anchors = locate(solution.mesh, far);
    const ends = [0, 1].map((i) => {
      const moved = { ...still };
      readMoment(solution.mesh, momentAt(solution, 1), anchors, i, moved);
      return [far[2 * i]! + moved.x, far[2 * i + 1]! + moved.y] as const;
    });
    const [a, b] = ends as [readonly [number, number], readonly [number, number]];
    // the leaf gives a little where the couple is let in
    expect(Math.hypot(b[0] - a[0], b[1] - a[1])).toBeCloseTo(2, 1);
    // half of the fold: the leaf's face, upright at rest, leans by 45 degrees
    expect(Math.atan2(b[1] - a[1], b[0] - a[0])).toBeCloseTo(Math.PI / 2 + Math.PI / 4, 1);
  });
});
