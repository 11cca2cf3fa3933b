import { describe, expect, it } from 'vitest';
import { type Arm, guideForce, guideRootStrain } from '@/lib/mechanics/beam';
import {
  bendArm,
  compliance,
  type FlexibleArm,
  highestStrain,
  leverAt,
  strainAt,
} from '@/lib/mechanics/large-deflection';
import { blockSprings, rootSection, wallSprings, widthStiffening } from '@/lib/mechanics/root';

const arm = (k = 1, q = 1): Arm => ({
  length: 20,
  rootThickness: 2,
  tipThickness: 2 * k,
  rootWidth: 8,
  tipWidth: 8 * q,
});
/** Slender beam: no shear, rigid root, no fillet. */
const slender = (of: Arm): FlexibleArm => ({ arm: of, fillet: 0, springs: [], poisson: -1, stiffening: 1 });
const tip = <T>(values: ArrayLike<T>) => values[values.length - 1]!;

describe('an arm bent at its tip', () => {
  it.each([
    ['even', 1, 1],
    ['half as thick at the tip', 0.5, 1],
    ['thin and narrow at the tip', 0.3, 0.4],
  ])('on a rigid root, a little: meets the guide formula for an arm that is %s', (_, k, q) => {
    const of = arm(k, q);
    const bent = bendArm(slender(of), 1e-3);
    expect(bent.forcePerModulus / guideForce(of, guideRootStrain(of, 1e-3), 1)).toBeCloseTo(1, 2);
    expect(strainAt(slender(of), bent, 0) / guideRootStrain(of, 1e-3)).toBeCloseTo(1, 2);
  });

  it('reaches the deflection asked for', () => {
    for (const deflection of [0, 0.5, 4, 9]) {
      expect(tip(bendArm(slender(arm(0.5)), deflection).y)).toBeCloseTo(deflection, 6);
    }
  });

  it('keeps its length: every piece of the arc is as long bent as straight', () => {
    const { x, y, along } = bendArm(slender(arm()), 8);
    const arc = x.slice(1).reduce((sum, next, i) => sum + Math.hypot(next - x[i]!, y[i + 1]! - y[i]!), 0);
    expect(arc).toBeCloseTo(tip(along) - along[0]!, 6);
  });

  it('takes the same force for the same compliance as long as the deflection is small', () => {
    const flexible = slender(arm(0.6));
    expect(bendArm(flexible, 1e-4).forcePerModulus * compliance(flexible)).toBeCloseTo(1e-4, 9);
  });

  it('scales: twice the size in every direction and twice the deflection take four times the force', () => {
    const twice = (of: Arm): Arm => ({
      length: 2 * of.length,
      rootThickness: 2 * of.rootThickness,
      tipThickness: 2 * of.tipThickness,
      rootWidth: 2 * of.rootWidth,
      tipWidth: 2 * of.tipWidth,
    });
    const of = (a: Arm, fillet: number): FlexibleArm => ({
      arm: a,
      fillet,
      springs: blockSprings(3 * a.rootWidth, rootSection(a, fillet, 0.35)),
      poisson: 0.35,
      stiffening: widthStiffening(a, 0.35),
    });
    const [one, two] = [bendArm(of(arm(0.5), 1), 3), bendArm(of(twice(arm(0.5)), 2), 6)];
    expect(two.forcePerModulus / one.forcePerModulus).toBeCloseTo(4, 9);
    expect(strainAt(of(twice(arm(0.5)), 2), two, 2)).toBeCloseTo(strainAt(of(arm(0.5), 1), one, 1), 12);
  });

  it('has its highest strain at the root when even, and further out when the tip is thin', () => {
    const even = bendArm(slender(arm()), 1);
    expect(highestStrain(slender(arm()), even, 0)).toBe(strainAt(slender(arm()), even, 0));
    const thin = bendArm(slender(arm(0.3)), 1);
    const ratio = highestStrain(slender(arm(0.3)), thin, 0) / strainAt(slender(arm(0.3)), thin, 0);
    expect(ratio).toBeCloseTo(1.19, 2);
  });

  it('has no lever at its tip', () => {
    expect(leverAt(bendArm(slender(arm()), 5), 20)).toBe(0);
  });
});

describe('what an arm stands on', () => {
  const on = (springs: FlexibleArm['springs']): number => compliance({ ...slender(arm()), springs });
  const section = rootSection(arm(), 0, 0.35);

  it('gives nothing where there is no spring', () => {
    const { rootWidth, rootThickness, length } = arm();
    const rigid = (4 * length ** 3) / (rootWidth * rootThickness ** 3);
    expect(on([]) / rigid).toBeCloseTo(1, 3);
  });

  it('gives more the narrower a block is, down to the width of the arm', () => {
    expect(on(blockSprings(8, section))).toBeGreaterThan(on(blockSprings(12, section)));
    expect(on(blockSprings(12, section))).toBeGreaterThan(on(blockSprings(80, section)));
  });

  it('gives more on a thinner, longer or narrower wall, and little more than a block on a thick one', () => {
    const wall = { thickness: 2, span: 40, width: 40 };
    const at = (changed: Partial<typeof wall>) => on(wallSprings({ ...wall, ...changed }, section));
    expect(at({ thickness: 1.5 })).toBeGreaterThan(at({}));
    expect(at({ span: 60 })).toBeGreaterThan(at({}));
    expect(at({ width: 10 })).toBeGreaterThan(at({}));
    expect(at({ thickness: 20 }) / on(blockSprings(40, section))).toBeCloseTo(1, 3);
  });

  it('changes no further once a wall is wide against its span', () => {
    const at = (width: number) => on(wallSprings({ thickness: 2, span: 30, width }, section));
    expect(at(400) / at(200)).toBeCloseTo(1, 2);
  });
});
