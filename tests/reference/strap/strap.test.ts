import { describe, expect, it } from 'vitest';
import { bentHoleFactor, pulledHoleFactor, smallestBundle, wrapStrain } from '@/lib/mechanics/strap';
import {
  narrowingOfSqueeze,
  type Patch,
  squeezeForce,
  squeezeStrain,
  stretchedEye,
  stretchForce,
  stripOverRing,
} from '@/lib/mechanics/strap-eye';
import { errorPercent } from '../../support/finite-elements';
import cases from './eye-in-strip.json';

interface EyeCase {
  readonly kind: string;
  readonly eyeOverWidth: number;
  readonly patchOverEye?: number;
  readonly poisson: number;
  readonly [figure: string]: string | number | undefined;
}

const named = (kind: string) =>
  (cases as EyeCase[])
    .filter((one) => one.kind === kind)
    .map((one) => ({
      ...one,
      name: `d/b ${one.eyeOverWidth}, nu ${one.poisson}, patch ${one.patchOverEye ?? '-'}`,
    }));
const numberOf = (one: EyeCase, figure: string): number => {
  const value = one[figure];
  if (typeof value !== 'number') throw new Error(`no ${figure}`);
  return value;
};
const eyeOf = ({ eyeOverWidth }: EyeCase) => ({ diameter: 2, width: 2 / eyeOverWidth, thickness: 1 });
const PATCH: Readonly<Record<string, Patch>> = { '0.5': 'narrow', '1': 'middle', '2': 'wide' };

describe('an eye in a strip, stretched by a head, against finite elements', () => {
  it.each(named('plug'))('$name: force within 1.5 %, peak strain within 2.5 %', (one) => {
    const eye = eyeOf(one);
    const { mean, peak } = stretchedEye(eye, 2.02);
    const { strip, ring } = stretchForce(eye, 2.02, 1000, one.poisson);
    expect(Math.abs(errorPercent(stripOverRing(eye), numberOf(one, 'forceOverLame')))).toBeLessThan(1.5);
    expect(strip / ring).toBeCloseTo(stripOverRing(eye), 12);
    expect(mean).toBeCloseTo(0.01, 12);
    expect(Math.abs(errorPercent(peak / mean, numberOf(one, 'peakOverMean')))).toBeLessThan(2.5);
  });
});

describe('an eye squeezed open, against finite elements', () => {
  it.each(named('squeeze'))('$name: growth within 1.5 %', (one) => {
    const force = squeezeForce(eyeOf(one), 0.01, 1000, PATCH[String(one.patchOverEye)]!);
    expect(Math.abs(errorPercent((0.01 * 1000) / force, numberOf(one, 'growth')))).toBeLessThan(1.5);
  });

  it.each(named('squeeze').filter((one) => one.patchOverEye === 1))(
    '$name: narrowing and strain within 3 %',
    (one) => {
      const strain = squeezeStrain(eyeOf(one), 0.02) / 0.01;
      expect(Math.abs(errorPercent(strain, numberOf(one, 'strainOverGrowth')))).toBeLessThan(3);
      expect(
        Math.abs(errorPercent(narrowingOfSqueeze(eyeOf(one)), numberOf(one, 'narrowingOverGrowth'))),
      ).toBeLessThan(3);
    },
  );
});

describe('a wrapped strap', () => {
  it.each([
    [1.2, 40, 2.913],
    [2, 60, 3.226],
    [1.6, 25, 6.015],
  ])(
    'of %s mm strains by its share of diameter plus thickness on %s mm: %s %% (exact geometry)',
    (t, d, strain) => {
      expect(Math.abs(100 * wrapStrain(t, d) - strain)).toBeLessThan(0.001);
      expect(smallestBundle(t, wrapStrain(t, d))).toBeCloseTo(d, 9);
    },
  );
});

describe('holes in strips', () => {
  // Heywood, Designing by Photoelasticity (from memory)
  it.each([
    [0.2, 2.51],
    [0.3, 2.34],
    [0.5, 2.13],
  ])('pulled, d/b %s: the edge bears %s times the mean', (ratio, factor) => {
    expect(Math.abs(pulledHoleFactor(ratio, 1) - factor)).toBeLessThan(0.006);
  });

  // Goodier's limits as quoted with Roark's polynomial (from memory): 1.79 for a thin plate at nu 0.3, 3 for a deep hole.
  it('bent, a wide plate has 1.79 when thin and 3 when the hole is deep', () => {
    expect(bentHoleFactor(1, 1e6, 1e-4)).toBeCloseTo((5 + 3 * 0.3) / (3 + 0.3), 2);
    expect(bentHoleFactor(1, 1e6, 1e6)).toBeCloseTo(3, 1);
  });
});
