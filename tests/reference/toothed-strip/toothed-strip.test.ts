import { describe, expect, it } from 'vitest';
import type { BendingModel } from '@/lib/fea/model';
import { type Corner, outline } from '@/lib/fea/profile/outline';
import { LINEAR } from '@/lib/fea/solve/options';
import { solveBending } from '@/lib/fea/solve/solve-bending';
import {
  type ToothedStrip,
  toothedStripInRange,
  toothedWrapFactor,
  toothRootFactor,
  valleyCurvature,
} from '@/lib/mechanics/toothed-strip';

const TEETH = 5;
const WIDTH = 5;

/** Strip with five saw teeth between plain ends, held at x = 0 and turned at its other end. */
function stripModel(strip: ToothedStrip, depth: number, turn: number): BendingModel {
  const { core: t, pitch: p, valley, rootRadius: radius } = strip;
  const corners: Corner[] = [
    { at: [0, 0], tag: 'inside' },
    { at: [(TEETH + 2) * p, 0], tag: 'end' },
    { at: [(TEETH + 2) * p, t], tag: 'top' },
  ];
  for (let i = TEETH - 1; i >= 0; i -= 1) {
    const x = (i + 1) * p;
    corners.push(
      { at: [x + p, t], radius, tag: 'steep', filletTag: 'root' },
      { at: [x + p, t + depth], tag: 'crest' },
      { at: [x + 0.88 * p, t + depth], tag: 'ramp' },
      { at: [x + valley, t], radius, tag: 'valley', filletTag: 'root' },
    );
  }
  corners.push({ at: [0, t], tag: 'held' });
  return {
    profile: { loops: [outline(corners)] },
    plane: 'plane-stress',
    width: { kind: 'even', width: WIDTH },
    mirrored: false,
    supports: [{ tag: 'held', fix: 'both' }],
    drive: { kind: 'rotation', tag: 'end', value: -turn },
    peakTags: ['root', 'valley'],
    factors: [],
  };
}

/** Computed strain at the tooth roots over the plain core's, for the same moment and for the same mean curvature. */
function computed(strip: ToothedStrip, depth: number) {
  const turn = 1e-3;
  const solution = solveBending(
    stripModel(strip, depth, turn),
    { modulus: 1, poisson: 0.38, layers: null },
    LINEAR,
  );
  if (!solution.ok) throw new Error(solution.reason);
  const moment = Math.abs(solution.steps.at(-1)!.force);
  const plain = moment / ((WIDTH * strip.core ** 3) / 12);
  const mean = (turn - 2 * strip.pitch * plain) / (TEETH * strip.pitch);
  const peak = solution.tension.strain / (strip.core / 2);
  return { atMoment: peak / plain, atCurvature: peak / mean };
}

const CASES: readonly (readonly [ToothedStrip, number])[] = [
  [{ core: 1, pitch: 3, valley: 1.2, rootRadius: 0.4 }, 1],
  [{ core: 1, pitch: 3, valley: 1.2, rootRadius: 0.1 }, 0.9],
  [{ core: 0.8, pitch: 3, valley: 1.2, rootRadius: 0.2 }, 0.9],
  [{ core: 1.6, pitch: 3, valley: 1.2, rootRadius: 0.2 }, 0.9],
  [{ core: 1, pitch: 4, valley: 1.6, rootRadius: 0.3 }, 1.2],
  [{ core: 2, pitch: 5, valley: 2, rootRadius: 0.4 }, 1.5],
  [{ core: 1, pitch: 3, valley: 1.8, rootRadius: 0.2 }, 0.9],
];

// Plane finite elements, six-node triangles; tests/reference/fea checks them against published solutions.
describe('toothed strip bent with its teeth outside', () => {
  it.each(CASES)(
    'agrees with finite elements at a moment and round a bundle: %j, %s mm deep',
    (strip, depth) => {
      const { atMoment, atCurvature } = computed(strip, depth);
      expect(toothedStripInRange(strip)).toBe(true);
      expect(Math.abs(toothRootFactor(strip) / atMoment - 1)).toBeLessThan(0.06);
      expect(Math.abs(toothedWrapFactor(strip) / atCurvature - 1)).toBeLessThan(0.08);
    },
  );

  it('bends like a plain strip where nothing but valley is left', () => {
    expect(valleyCurvature({ core: 1, pitch: 3, valley: 3, rootRadius: 0.3 })).toBeCloseTo(1, 9);
  });

  it('bends only in its valleys where the teeth are long against the core', () => {
    expect(valleyCurvature({ core: 0.01, pitch: 3, valley: 1.2, rootRadius: 0.003 })).toBeCloseTo(2.5, 2);
  });

  it('is out of range with sharp roots or long teeth', () => {
    expect(toothedStripInRange({ core: 2, pitch: 3, valley: 1.2, rootRadius: 0.1 })).toBe(false);
    expect(toothedStripInRange({ core: 0.6, pitch: 6, valley: 2.4, rootRadius: 0.2 })).toBe(false);
  });
});
