import { describe, expect, it } from 'vitest';
import { shutFold } from '@/lib/mechanics/fold';
import {
  bendStrain,
  elasticStripLength,
  filletFactor,
  stripLength,
  stripStrain,
  type Web,
  webStrain,
} from '@/lib/mechanics/web';
import {
  casesOf,
  errorPercent,
  expected,
  type FiniteElementCase,
  input,
} from '@/tests/support/finite-elements';

const DEGREE = Math.PI / 180;

function webOf(solved: FiniteElementCase): Web {
  const [thickness, leafThickness] = [input(solved, 't'), input(solved, 'plate')];
  const centred = solved.inputs.layout === 'centre';
  return {
    length: input(solved, 'Lw'),
    thickness,
    leafThickness,
    relief: centred ? (leafThickness - thickness) / 2 : 0,
    fillet: input(solved, 'fillet'),
    foldTowards: solved.inputs.sign === 'fillet side in compression' ? 'groove' : 'flat-face',
  };
}

describe('hinge webs against neo-Hookean finite elements in plane strain', () => {
  it.each(casesOf('living_hinge').map((solved) => [solved.id, solved] as const))(
    'gives the peak strain of %s within 4 %%',
    (_, solved) => {
      const { peak } = webStrain(webOf(solved), input(solved, 'theta_deg') * DEGREE);
      expect(Math.abs(errorPercent(peak, expected(solved, 'local_strain')))).toBeLessThan(4);
    },
  );
});

/** Curvature at the tightest place over that of the even bend, from an independent elastica integration. */
const ELASTICA: readonly (readonly [number, number])[] = [
  [0.032, 3.289],
  [0.114, 2.952],
  [0.204, 2.602],
  [0.299, 2.249],
  [0.392, 1.907],
  [0.436, 1.746],
  [0.477, 1.595],
  [0.516, 1.453],
  [0.583, 1.205],
  [0.611, 1.097],
  [0.659, 1.157],
  [0.697, 1.45],
  [0.74, 1.841],
  [0.772, 2.186],
  [0.819, 2.861],
];

describe('a fold pressed shut between parallel leaves', () => {
  it.each(ELASTICA)('bends at s/L = %f by %f times the even curvature, within 0.5 %%', (ratio, curvature) => {
    const shape = shutFold(ratio);
    expect(Math.abs(errorPercent(Math.max(shape?.middle ?? 0, shape?.exit ?? 0), curvature))).toBeLessThan(
      0.5,
    );
  });

  it('bends evenly at s/L = 2/pi', () => {
    const shape = shutFold(2 / Math.PI);
    expect(shape?.middle).toBeCloseTo(1, 2);
    expect(shape?.exit).toBeCloseTo(1, 2);
  });

  it('has no answer for leaves wider apart than the web can bridge, nor for touching exits', () => {
    expect(shutFold(0.95)).toBeNull();
    expect(shutFold(0)).toBeNull();
  });
});

describe('published figures of hinge webs', () => {
  // Articles on hinge geometry: eps = t / (2 R + t); number computed from the formula.
  it('strains 13.04 % at t 0.3 and inner radius 1.0', () => {
    expect(bendStrain(0.3, 1)).toBeCloseTo(0.1304, 4);
  });

  // Geometry of the mean-line strip, eps = t theta / (2 L).
  it.each([
    [0.3, 1.5, 180, 0.3142],
    [0.25, 1.5, 180, 0.2618],
    [0.4, 3, 90, 0.1047],
  ])('strains at t %f, L %f, %i degrees by %f', (thickness, length, angle, strain) => {
    expect(stripStrain(thickness, length, angle * DEGREE)).toBeCloseTo(strain, 4);
  });

  // Elastic hinge length, L = theta E t / (2 sigma_y), with moulded polypropylene.
  it('needs 20 mm of polypropylene web to fold by 180 degrees without yielding', () => {
    expect(elasticStripLength(0.3, Math.PI, 1400, 33)).toBeCloseTo(20, 1);
  });

  it('needs 36.96 mm of PETG web at 0.4 mm, 180 degrees and 1.7 %', () => {
    expect(stripLength(0.4, Math.PI, 0.017)).toBeCloseTo(36.96, 2);
  });
});

describe('fillet factor of a web', () => {
  const web: Web = {
    length: 4,
    thickness: 0.4,
    leafThickness: 2,
    relief: 0,
    fillet: 0.3,
    foldTowards: 'flat-face',
  };

  it('falls as the fillet grows', () => {
    const factors = [0.1, 0.2, 0.3, 0.4].map((fillet) => filletFactor({ ...web, fillet }));
    expect([...factors].sort((a, b) => b - a)).toEqual(factors);
  });

  it('is one where the stretched face runs straight through', () => {
    expect(filletFactor({ ...web, foldTowards: 'groove' })).toBe(1);
  });
});
