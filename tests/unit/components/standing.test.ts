import { describe, expect, it } from 'vitest';
import { calibrated } from '@/components/studio/computed/calibrated';
import { loadCurve } from '@/components/studio/computed/load-curve';
import { readingAt, readingWords, stepShares } from '@/components/studio/computed/reading';
import {
  formulaBeside,
  isComputedFor,
  type Standing,
  shapeOf,
  standingOf,
} from '@/components/studio/computed/standing';
import { atModulus, bendingOf, perModulus, solveRequest } from '@/generators/bend';
import hook from '@/generators/cantilever-hook';
import type { Bending, Family } from '@/generators/contract';
import hinge from '@/generators/living-hinge';
import { checkOf, figureOf, type Subject } from '@/generators/sensitivity';
import { solveRequested } from '@/lib/fea/solve/request';
import type { Solved } from '@/lib/fea/solve/solution';
import { DEFAULT_USE } from '@/lib/materials/types';
import { linearPlastic } from '@/tests/support/materials';
import { solved } from '@/tests/support/plane-models';

const PLASTIC = linearPlastic(1500);

interface Setting {
  readonly subject: Subject;
  readonly bending: Bending;
  readonly solution: Solved;
}

function setting(family: Family = hook, change: object = {}): Setting {
  const values = { ...family.parameters.defaults, ...change };
  const subject = { family, values, material: PLASTIC, use: DEFAULT_USE };
  const bending = bendingOf(family, values, PLASTIC, DEFAULT_USE);
  if ('none' in bending) throw new Error(bending.none);
  const request = perModulus(solveRequest(bending, PLASTIC, DEFAULT_USE, 'large'));
  return { subject, bending, solution: solved(solveRequested(request)) };
}

const HOOK = setting();
const FORMULA = checkOf(HOOK.subject);
const FINAL = { solution: HOOK.solution, pending: false, reason: null };
const value = ({ figures }: Standing['report'], id: string) => figures.find((one) => one.id === id)!.value!;

describe('what the verdict stands on', () => {
  it('is the formula at first, and says that the rest is under way', () => {
    const standing = standingOf(FORMULA, HOOK.bending, null);
    expect(standing.basis).toEqual({ kind: 'solving' });
    expect(standing.report).toBe(FORMULA);
    expect(isComputedFor(standing, 'peak-strain')).toBe(true);
    expect(isComputedFor(standing, 'tip-deflection')).toBe(false);
  });

  it('is the finite elements once they have answered', () => {
    const standing = standingOf(FORMULA, HOOK.bending, FINAL);
    expect(standing.basis).toMatchObject({ kind: 'computed', pending: false });
    expect(value(standing.report, 'peak-strain')).toBe(HOOK.solution.tension.strain);
    expect(formulaBeside(standing, 'peak-strain')).toBe(value(FORMULA, 'peak-strain'));
    expect(formulaBeside(standing, 'tip-deflection')).toBeNull();
    expect(shapeOf(standing)!.solution.method).toBe('non-linear');
  });

  it('is the answer for small movement meanwhile, which the picture does not bend to', () => {
    const small = { ...HOOK.solution, method: 'linear' as const };
    const standing = standingOf(FORMULA, HOOK.bending, { solution: small, pending: true, reason: null });
    expect(standing.basis).toMatchObject({ kind: 'computed', pending: true });
    expect(shapeOf(standing)).toBeNull();
  });

  it('is the finite elements for a part whose picture keeps its own motion', () => {
    const bending = { ...HOOK.bending, motion: 'family' } as Bending;
    const standing = standingOf(FORMULA, bending, FINAL);
    expect(standing.basis.kind).toBe('computed');
    expect(shapeOf(standing)).toBeNull();
  });

  it.each([
    [
      'nothing could be solved',
      { solution: null, pending: false, reason: 'an element is folded at rest' },
      /folded/,
    ],
    ['the large movement failed', { ...FINAL, reason: 'no balance' }, /large movement: no balance/],
    [
      'the solver fell back to the small one',
      {
        ...FINAL,
        solution: { ...HOOK.solution, method: 'linear', fellBack: 'no balance after 25 iterations' },
      },
      /large movement: no balance after 25/,
    ],
  ] as const)('is the formula, with the reason, when %s', (_, answer, reason) => {
    const standing = standingOf(FORMULA, HOOK.bending, answer);
    expect(standing.basis).toMatchObject({
      kind: 'formula',
      because: expect.stringMatching(reason) as string,
    });
    expect(standing.report).toBe(FORMULA);
    expect(shapeOf(standing)).toBeNull();
  });

  it('is the formula, with the family’s reason, for a part that is not plane', () => {
    const standing = standingOf(FORMULA, { none: 'It twists.' }, null);
    expect(standing.basis).toEqual({ kind: 'formula', because: 'It twists.' });
  });
});

describe('one solution for plastics that differ in modulus alone', () => {
  it('has the shape and strain of each and its force in proportion', () => {
    const { bending } = HOOK;
    if ('none' in bending) throw new Error(bending.none);
    const own = solved(solveRequested(solveRequest(bending, PLASTIC, DEFAULT_USE, 'large')));
    const shared = atModulus(HOOK.solution, bending.modulus!);
    expect(shared.tension.strain / own.tension.strain).toBeCloseTo(1, 8);
    expect(shared.steps.at(-1)!.force / own.steps.at(-1)!.force).toBeCloseTo(1, 8);
  });

  it('is asked for in the same words when only the modulus changes', () => {
    const asked = [1, 1.7].map((times) => {
      const { flexuralModulus } = PLASTIC;
      const stiffer = {
        ...PLASTIC,
        flexuralModulus: flexuralModulus && { ...flexuralModulus, value: times * flexuralModulus.value },
      };
      const bending = bendingOf(HOOK.subject.family, HOOK.subject.values, stiffer, DEFAULT_USE);
      if ('none' in bending) throw new Error(bending.none);
      return JSON.stringify(perModulus(solveRequest(bending, stiffer, DEFAULT_USE, 'large')));
    });
    expect(asked[0]).toBe(asked[1]);
  });
});

describe('the part calibrated on what was computed', () => {
  const standing = standingOf(FORMULA, HOOK.bending, FINAL);

  it('says of itself what was computed', () => {
    const report = checkOf(calibrated(HOOK.subject, standing));
    for (const id of ['peak-strain', 'deflection-force', 'mating-force']) {
      expect(value(report, id) / value(standing.report, id)).toBeCloseTo(1, 10);
    }
    expect(value(report, 'tip-deflection')).toBe(value(FORMULA, 'tip-deflection'));
  });

  it('keeps a share of the limit to spare, but never calls the present figure too much', () => {
    const spared = figureOf(checkOf(calibrated(HOOK.subject, standing, 0.04)), 'peak-strain')!;
    const { limit } = figureOf(standing.report, 'peak-strain')!;
    expect(spared.limit! / limit!).toBeCloseTo(0.96, 10);
    expect(spared.verdict).not.toBe('over-limit');
    const close = figureOf(checkOf(calibrated(HOOK.subject, standing, 0.99)), 'peak-strain')!;
    expect(close.limit).toBe(close.value);
  });

  it('is the part itself while nothing has been computed', () => {
    expect(calibrated(HOOK.subject, standingOf(FORMULA, HOOK.bending, null))).toBe(HOOK.subject);
  });
});

describe('force over deflection', () => {
  it('runs through the load steps beside the line of the formula', () => {
    const standing = standingOf(FORMULA, HOOK.bending, FINAL);
    const { curve, formula } = loadCurve(standing)!;
    expect(curve.points).toHaveLength(1 + HOOK.solution.steps.length);
    expect(curve.points[0]).toEqual([0, 0]);
    expect(curve.points.at(-1)![0]).toBeCloseTo(HOOK.subject.values.undercut as number, 9);
    expect(curve.points.at(-1)![1]).toBeCloseTo(value(standing.report, 'deflection-force'), 9);
    expect(formula!.at(-1)![1]).toBe(value(FORMULA, 'deflection-force'));
  });

  it('is moment over turn for a hinge', () => {
    const { bending, solution, subject } = setting(hinge, { foldAngle: 60 });
    const standing = standingOf(checkOf(subject), bending, { solution, pending: false, reason: null });
    const { curve } = loadCurve(standing)!;
    expect([curve.x.unit, curve.y.unit]).toEqual(['deg', 'Nmm']);
    expect(curve.points.at(-1)![0]).toBeCloseTo(60, 6);
  });

  it('is left out while the verdict stands on the formula', () => {
    expect(loadCurve(standingOf(FORMULA, HOOK.bending, null))).toBeNull();
  });
});

describe('reading the slide', () => {
  const { plane, solution } = shapeOf(standingOf(FORMULA, HOOK.bending, FINAL))!;

  it('gives the states at the load steps as they were solved, and nothing at rest', () => {
    expect(readingAt(solution, plane, 0)).toEqual({ deflection: 0, load: 0, strain: 0 });
    const shares = stepShares(solution);
    expect(shares.at(-1)).toBe(1);
    shares.forEach((share, at) => {
      const { load, deflection } = readingAt(solution, plane, share);
      expect(load).toBeCloseTo(Math.abs(solution.steps[at]!.force), 9);
      expect(deflection).toBeCloseTo(Math.abs(solution.steps[at]!.deflection), 9);
    });
    expect(readingAt(solution, plane, 1).strain).toBeCloseTo(solution.tension.strain, 6);
  });

  it('says it in words', () => {
    expect(readingWords(readingAt(solution, plane, 1), plane)).toMatch(
      /^deflected [\d.]+\s?mm, force [\d.]+\s?N, strain [\d.]+\s?% in tension$/,
    );
  });

  it('leaves the force out where the plastic’s stiffness is not known', () => {
    expect(readingWords(readingAt(solution, { ...plane, modulus: null }, 1), plane)).not.toMatch(/force/);
  });
});
