import { describe, expect, it } from 'vitest';
import { isotropicStiffness, newResponse, stVenant } from '@/lib/fea/element/law';
import { type Layered, layeredLaw, layeredStiffness } from '@/lib/fea/element/layered';
import { neoHooke } from '@/lib/fea/element/neo-hooke';
import { REFERENCE } from '@/tests/support/plane-models';

const stress = (law: ReturnType<typeof stVenant>, strain: readonly number[]) => {
  const out = newResponse();
  law.respond(Float64Array.from(strain), out);
  return [...out.stress];
};

describe('isotropic law', () => {
  it('gives E eps for a pull in plane stress with the side free', () => {
    const [s11, s22] = stress(stVenant(REFERENCE, 'plane-stress'), [0.01, -0.0035, 0, 0]);
    expect(s11).toBeCloseTo(15, 10);
    expect(s22).toBeCloseTo(0, 10);
  });

  it('gives E / (1 - nu^2) for bending in plane strain', () => {
    const nu = REFERENCE.poisson;
    const [s11, s22] = stress(stVenant(REFERENCE, 'plane-strain'), [0.01, (-0.01 * nu) / (1 - nu), 0, 0]);
    expect(s11).toBeCloseTo(15 / (1 - nu * nu), 10);
    expect(s22).toBeCloseTo(0, 10);
  });
});

describe('neo-Hooke law', () => {
  it.each(['plane-stress', 'plane-strain', 'axisymmetric'] as const)(
    'is the isotropic law at small strain in %s',
    (plane) => {
      const strain = [2e-6, -1e-6, 1.5e-6, plane === 'axisymmetric' ? 1e-6 : 0];
      const soft = stress(neoHooke(REFERENCE, plane), strain);
      const linear = stress(stVenant(REFERENCE, plane), strain);
      const rows = plane === 'axisymmetric' ? 4 : 3;
      for (let i = 0; i < rows; i++) expect(soft[i]! / linear[i]!).toBeCloseTo(1, 4);
    },
  );

  // Closed form for this energy with the width free: J from the lateral balance, solved here by bisection.
  it('pulls uniaxially as its energy says', () => {
    const { modulus, poisson } = REFERENCE;
    const mu = modulus / (2 * (1 + poisson));
    const bulk = modulus / (3 * (1 - 2 * poisson));
    const stretch = 1.3;
    const lateral = (b: number) => {
      const j = stretch * b * b;
      return mu * j ** (-5 / 3) * (b * b - (stretch ** 2 + 2 * b * b) / 3) + bulk * (j - 1);
    };
    let [low, high] = [0.5, 1];
    for (let i = 0; i < 80; i++) {
      const middle = (low + high) / 2;
      if (lateral(middle) > 0) high = middle;
      else low = middle;
    }
    const b = low;
    const j = stretch * b * b;
    const cauchy = mu * j ** (-5 / 3) * (stretch ** 2 - (stretch ** 2 + 2 * b * b) / 3) + bulk * (j - 1);
    const green = (stretch ** 2 - 1) / 2;
    const [s11, s22] = stress(neoHooke(REFERENCE, 'plane-stress'), [green, (b * b - 1) / 2, 0, 0]);
    expect(s11).toBeCloseTo((j * cauchy) / stretch ** 2, 6);
    expect(Math.abs(s22!)).toBeLessThan(1e-6 * modulus);
  });
});

describe('layered law', () => {
  const alike: Layered = { ...REFERENCE, across: REFERENCE.modulus, shearBetween: null, normal: 0.7 };

  it('is the isotropic one when both moduli are alike, whichever way the layers lie', () => {
    const expected = isotropicStiffness(REFERENCE);
    layeredStiffness(alike).forEach((value, i) => {
      expect(value).toBeCloseTo(expected[i]!, 8);
    });
  });

  const printed: Layered = { ...REFERENCE, across: 800, shearBetween: 400, normal: 0 };

  it('has the modulus across the layers in a pull across them', () => {
    // strain of a pull across the layers by 1 MPa: 1 / Ez across, -nu / Ep both ways in the layer
    const along = -REFERENCE.poisson / REFERENCE.modulus;
    const [s11, s22] = stress(layeredLaw(printed, 'plane-stress'), [1 / 800, along, 0, 0]);
    expect(s11).toBeCloseTo(1, 10);
    expect(s22).toBeCloseTo(0, 10);
  });

  it('has the modulus of the layer in a pull along it', () => {
    const nu = REFERENCE.poisson;
    const [s11, s22] = stress(layeredLaw(printed, 'plane-stress'), [-nu / 1500, 1 / 1500, 0, 0]);
    expect(s11).toBeCloseTo(0, 10);
    expect(s22).toBeCloseTo(1, 10);
  });

  it('gives the same stress after a turn of strain and layers together', () => {
    const strain = [0.01, -0.004, 0.006, 0];
    const here = stress(layeredLaw(printed, 'plane-strain'), strain);
    const quarter = stress(layeredLaw({ ...printed, normal: Math.PI / 2 }, 'plane-strain'), [
      strain[1]!,
      strain[0]!,
      -strain[2]!,
      0,
    ]);
    expect(quarter[0]).toBeCloseTo(here[1]!, 9);
    expect(quarter[1]).toBeCloseTo(here[0]!, 9);
    expect(quarter[2]).toBeCloseTo(-here[2]!, 9);
  });
});
