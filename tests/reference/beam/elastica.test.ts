import { expect, test } from 'vitest';
import type { Arm } from '@/lib/mechanics/beam';
import { bendArm, compliance, type FlexibleArm } from '@/lib/mechanics/large-deflection';
import { blockSprings, rootSection } from '@/lib/mechanics/root';

const even = (length: number, h: number, b: number): Arm => ({
  length,
  rootThickness: h,
  tipThickness: h,
  rootWidth: b,
  tipWidth: b,
});

/** E I = 1 and no shear: P over modulus is P L^2 / (E I). */
const ELASTICA: FlexibleArm = {
  arm: even(1, 1e-3, 12e9),
  fillet: 0,
  springs: [],
  poisson: -1,
  stiffening: 1,
};

test.each([
  [1, 0.30172, 0.05643],
  [2, 0.49346, 0.16064],
  [5, 0.71379, 0.38763],
  [10, 0.81061, 0.555],
])(
  'P L^2/(E I) = %d bends to %d of the length and draws the tip in by %d (Bisshopp and Drucker 1945)',
  (load, down, inward) => {
    const bent = bendArm(ELASTICA, down);
    const tip = bent.x.length - 1;
    const rate = (bendArm(ELASTICA, down + 1e-4).forcePerModulus - bent.forcePerModulus) / 1e-4;
    expect(Math.abs(bent.forcePerModulus - load) / rate).toBeLessThanOrEqual(1e-4);
    expect(Math.abs(1 - bent.x[tip]! - inward)).toBeLessThanOrEqual(1.5e-4);
    expect(bent.y[tip]).toBeCloseTo(down, 6);
  },
);

test('the root of a wide body gives as the elastic support of O’Donnell, J. Appl. Mech. 27 (1960) 461', () => {
  for (const [slenderness, printed] of [
    [5, 1.233],
    [10, 1.116],
  ] as const) {
    const arm = even(2 * slenderness, 2, 20);
    const rigid: FlexibleArm = { arm, fillet: 0, springs: [], poisson: 0.35, stiffening: 1 };
    const onBody = { ...rigid, springs: blockSprings(200, rootSection(arm, 0, 0.35)) };
    const more = (compliance(onBody) - compliance(rigid)) / ((4 * slenderness ** 3) / arm.rootWidth);
    expect(Math.abs(1 + more - printed)).toBeLessThanOrEqual(0.025 * printed);
  }
});
