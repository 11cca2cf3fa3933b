import { describe, expect, it } from 'vitest';
import {
  endFactor,
  type PlugFit,
  plugDrag,
  plugStrain,
  rigidPlugStrain,
  ringHoopStrain,
} from '@/lib/mechanics/seal';
import { casesOf, expected, input } from '@/tests/support/finite-elements';

const fit: PlugFit = { bore: 20, neckOuter: 26, plugInner: 17.6, interference: 0.2, poisson: 0.35 };

describe('plug seal', () => {
  it('shares the interference: what the neck stretches and the plug gives add to i/d', () => {
    const { neck, plug } = plugStrain(fit);
    expect(neck - plug).toBeCloseTo(0.01, 12);
    expect(rigidPlugStrain(fit)).toBeCloseTo(0.01, 12);
  });

  it('puts nearly all of it into the neck when the plug is solid and the neck thin', () => {
    const { neck } = plugStrain({ ...fit, plugInner: 0, neckOuter: 21 });
    expect(neck / 0.01).toBeGreaterThan(0.95);
  });

  // Interference fit of a solid shaft, DuPont module I (from memory):
  // I = Sd Ds/W ((W + nu_h)/E_h + (1 - nu_s)/E_s), W = (1 + (Ds/Dh)^2)/(1 - (Ds/Dh)^2).
  it("meets the moulders' formula for a solid shaft in a hub", () => {
    const ratio = (20 / 26) ** 2;
    const W = (1 + ratio) / (1 - ratio);
    const modulus = 1700;
    const solid = plugStrain({ ...fit, plugInner: 0 });
    const hoopStress = solid.pressureShare * modulus * W;
    const interference = ((hoopStress * 20) / W) * ((W + 0.35) / modulus + (1 - 0.35) / modulus);
    expect(interference).toBeCloseTo(0.2, 9);
  });

  it('tends to the thin ring as both walls thin', () => {
    const thin = plugStrain({ bore: 40, neckOuter: 40.8, plugInner: 39.2, interference: 0.1, poisson: 0.35 });
    expect(thin.neck / (0.5 * (0.1 / 40))).toBeCloseTo(1, 1);
    expect(thin.pressureShare * 20).toBeCloseTo((0.5 * 0.1 * 0.4) / 40, 4);
  });

  it('drags with friction on the whole contact', () => {
    expect(plugDrag(0.5, 1.36, 20, 3)).toBeCloseTo(0.5 * 1.36 * Math.PI * 20 * 3 * 10, 9);
  });
});

describe('ring strain', () => {
  it('falls from the bore to the outside as Lame has it, and rises to the inside of a plug', () => {
    const { neck, plug, plugInside, pressureShare } = plugStrain(fit);
    const outside = ringHoopStrain({
      atContact: neck,
      contactRadius: 10,
      freeRadius: 13,
      poisson: 0.35,
      radius: 13,
    });
    expect(outside).toBeCloseTo((pressureShare * 2 * 20 ** 2) / (26 ** 2 - 20 ** 2), 12);
    const inside = ringHoopStrain({
      atContact: plug,
      contactRadius: 10,
      freeRadius: 8.8,
      poisson: 0.35,
      radius: 8.8,
    });
    expect(inside).toBeCloseTo(plugInside, 12);
  });

  // Loaded ring ends, CalculiX; see tests/reference/finite-elements/SOURCE.md.
  it('rises at a loaded ring end as in finite elements, within 3 %', () => {
    const ends = casesOf('annular').filter(({ id }) => id.endsWith(' end'));
    expect(ends.length).toBeGreaterThanOrEqual(3);
    for (const solved of ends) {
      const [ri, wall, y] = [input(solved, 'ri'), input(solved, 's'), input(solved, 'y_radial')];
      const strain = (y / ri) * endFactor(wall, ri);
      expect(Math.abs(strain / expected(solved, 'peak_strain') - 1), solved.id).toBeLessThan(0.03);
    }
  });
});
