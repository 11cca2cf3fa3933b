import { describe, expect, test } from 'vitest';
import {
  type Arm,
  guideForce,
  guideRootStrain,
  guideStrain,
  guideUndercut,
  strainPeak,
  undercutCoefficient,
} from '@/lib/mechanics/beam';
import { shoulderConcentration } from '@/lib/mechanics/fillet';
import { selfLockingAngle, wedgeFactor } from '@/lib/mechanics/friction';
import { errorPercent } from '../../support/finite-elements';

const even = (length: number, h: number, b = 1): Arm => ({
  length,
  rootThickness: h,
  tipThickness: h,
  rootWidth: b,
  tipWidth: b,
});
const thinning = (arm: Arm, k: number): Arm => ({ ...arm, tipThickness: k * arm.rootThickness });
const narrowing = (arm: Arm, q: number): Arm => ({ ...arm, tipWidth: q * arm.rootWidth });

const within = (value: number, printed: number, percent: number) =>
  expect(Math.abs(errorPercent(value, printed))).toBeLessThanOrEqual(percent);

describe('Snap-Fit Joints for Plastics - A Design Guide, example I: polycarbonate hook, l = 19, b = 9.5, y = 2.4', () => {
  test('a strain of 2 % with the tip at half the thickness needs a root of 3.28 mm', () => {
    const thickness = (0.02 * undercutCoefficient(0.5, 1) * 19 ** 2) / 2.4;
    within(thickness, 3.28, 1);
  });
  test('the deflection force is 32.5 N at a secant modulus of 1815 MPa', () => {
    within(guideForce(thinning(even(19, 3.28, 9.5), 0.5), 0.02, 1815), 32.5, 0.5);
  });
  test('the factor for 30 degrees and friction 0.6 is 1.8', () => within(wedgeFactor(0.6, 30), 1.8, 0.5));
  test('the mating force is 58.5 N', () => {
    const force = guideForce(thinning(even(19, 3.28, 9.5), 0.5), 0.02, 1815);
    within(force * wedgeFactor(0.6, 30), 58.5, 0.5);
  });
});

test('C is 0.67, 1.09 and 0.86 as in Table 1 of the guide', () => {
  expect(undercutCoefficient(1, 1)).toBeCloseTo(2 / 3, 6);
  expect(undercutCoefficient(0.5, 1)).toBeCloseTo(1.090355, 5);
  expect(undercutCoefficient(1, 0.25)).toBeCloseTo(0.855198, 5);
});

test('a tip of half the thickness allows 1.63 times the undercut (makers guides 1.627 to 1.636)', () => {
  expect(undercutCoefficient(0.5, 1) / undercutCoefficient(1, 1)).toBeCloseTo(1.6355, 3);
});

test.each([
  ['L 18, t 1.2, y 1.6 gives 0.9 % (article on printed snap-fits)', 18, 1.2, 1.6, 0.009, 0.0002],
  ['half the length gives 3.6 % (same article)', 9, 1.2, 1.6, 0.036, 0.0005],
  [
    'L 15, h 2.5, y 2.5 gives 4.16 %, over the limit of 4 % (article on snap-fit calculation)',
    15,
    2.5,
    2.5,
    0.0416,
    0.0001,
  ],
  ['L 20, t 2.4, y 1.4 gives 1.26 % (research note on a printed spring clip)', 20, 2.4, 1.4, 0.0126, 0.00005],
])('%s', (_, length, h, y, printed, tolerance) => {
  expect(Math.abs(guideStrain(even(length, h), y) - printed)).toBeLessThanOrEqual(tolerance);
});

test('eps 1.2 %, b 16, y 0.7, L 20, E 2000 gives about 4.6 mm and 65 N (research note on a printed spring clip)', () => {
  const thickness = (0.012 * (2 / 3) * 20 ** 2) / 0.7;
  within(thickness, 4.6, 4);
  within(guideForce(even(20, thickness, 16), 0.012, 2000), 65, 4);
});

test.each([
  [0.25, 75.96],
  [0.35, 70.71],
  [0.5, 63.43],
  [0.6, 59.04],
])('friction %d locks a return face from %d degrees on (the guide, mu tan a = 1)', (mu, angle) => {
  expect(Math.abs(selfLockingAngle(mu) - angle)).toBeLessThanOrEqual(0.01);
});

const base = even(20, 2, 8);
test.each([
  ['even', base, 0.009, 4.08, 6.179, 9.413],
  ['thickness to one half', thinning(base, 0.5), 0.005503, 2.495, 3.778, 5.755],
  ['width to one quarter', narrowing(base, 0.25), 0.007016, 3.18, 4.817, 7.337],
])(
  '%s arm b 8, h 2, l 20, y 1.2, E 1700, mu 0.5 (guide formulas, computed)',
  (_, arm, strain, force, push, pull) => {
    const eps = guideRootStrain(arm, 1.2);
    const p = guideForce(arm, eps, 1700);
    within(eps, strain, 0.1);
    within(p, force, 0.1);
    within(p * wedgeFactor(0.5, 30), push, 0.1);
    within(p * wedgeFactor(0.5, 40), pull, 0.1);
  },
);

test('the force of an even arm is 3 E I y / l^3', () => {
  const identity = (3 * 1700 * ((8 * 2 ** 3) / 12) * 1.2) / 20 ** 3;
  expect(guideForce(base, guideRootStrain(base, 1.2), 1700)).toBeCloseTo(identity, 9);
});

test.each([
  [0.3, 1.1905, 0.4286],
  [0.4, 1.0417, 2 / 3],
  [0.5, 1, 1],
  [0.8, 1, 1],
])(
  'a tip of %d of the thickness has its peak %d times the root strain at %d of the length from the tip',
  (k, factor, place) => {
    const peak = strainPeak(k, 1);
    expect(peak.factor).toBeCloseTo(factor, 4);
    expect(peak.fromTip).toBeCloseTo(place, 4);
  },
);

test('the peak of an arm that thins and narrows is where a scan along it finds it', () => {
  for (const [k, q] of [
    [0.5, 0.5],
    [0.3, 0.4],
    [0.7, 0.3],
    [0.45, 0.9],
  ] as const) {
    const at = (u: number) => u / ((q + (1 - q) * u) * (k + (1 - k) * u) ** 2);
    const scanned = Math.max(...Array.from({ length: 4001 }, (_, i) => at(i / 4000)));
    expect(strainPeak(k, q).factor).toBeCloseTo(scanned, 5);
  }
});

test('the undercut for a strain gives that strain back, for any taper', () => {
  const arm = narrowing(thinning(base, 0.35), 0.6);
  expect(guideStrain(arm, guideUndercut(arm, 0.02))).toBeCloseTo(0.02, 12);
});

test.each([
  [0.1, 1.918],
  [0.25, 1.464],
  [0.5, 1.222],
  [0.6, 1.184],
])('a shoulder fillet of %d of the thickness on a wide wall has Kt %d (Roark, Table 17.1)', (ratio, kt) => {
  within(shoulderConcentration(1, 1, ratio), kt, 0.5);
});
