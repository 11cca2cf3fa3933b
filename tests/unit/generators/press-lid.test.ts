import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseParameters } from '@/generators/parameters';
import lid from '@/generators/press-lid';
import { lidMechanics, lipOnCrest } from '@/generators/press-lid/mechanics';
import { mouthHeight, parameters, skirtLength, type Values } from '@/generators/press-lid/schema';
import type { Report } from '@/generators/report';
import { createKernelHost } from '@/lib/geometry/host';
import { QUALITY } from '@/lib/geometry/kernel';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';
import { annularForce, tubeFactor } from '@/lib/mechanics/annular';
import { tubeRadialForce } from '@/lib/mechanics/ring';
import { arbitraryParameters, checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const DEEP = { fromRim: 24 };
const checked = (id: string, changed: Partial<Values> = {}): Report =>
  lid.check(values({ ...DEEP, ...changed }), materialById(id)!, DEFAULT_USE);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};

describe('press lid: verdicts', () => {
  it('shares the undercut between lid and pot so that both press alike', () => {
    const p = values(DEEP);
    const { lidGives, potGives, radialShare } = lidMechanics(p, 0.4);
    const tube = { modulus: 1, poisson: 0.4 };
    const pot = { ...tube, bore: 25 - 1.2, wall: 1.2, fromEnd: 24 };
    expect(lidGives + potGives).toBeCloseTo(p.undercut / 2, 9);
    expect(tubeRadialForce(pot, potGives)).toBeCloseTo(radialShare, 9);
  });

  // Snap-Fit Joints for Plastics - A Design Guide, annular snap, as quoted: P = y d Es X, eps = y / d.
  it('shows the handbook force and strain beside its own, and doubts the force in words', () => {
    const report = checked('pp');
    const radial = figure(report, 'deflection-force');
    const nu = materialById('pp')!.poisson.value;
    const perModulus = annularForce(0.2, 50.4, 1, tubeFactor(50.4, 53.6, nu));
    const share = lidMechanics(values(DEEP), nu).radialShare;
    expect(radial.handbook! / radial.value!).toBeCloseTo(perModulus / share, 6);
    expect(figure(report, 'peak-strain').handbook).toBeCloseTo(0.2 / 50, 9);
    expect(radial.because).toMatch(/1\.4 to 1\.5 times below shell theory/);
  });

  it('needs more force with the bead remote from the rim of the pot than near it', () => {
    const near = lidMechanics(values({ fromRim: 3 }), 0.4).radialShare;
    expect(lidMechanics(values(DEEP), 0.4).radialShare).toBeGreaterThan(near);
  });

  it('does not know a closed lid whose skirt is too short for the ring formula', () => {
    const peak = figure(checked('pp', { fromRim: 5 }), 'peak-strain');
    expect(peak.value).toBeNull();
    expect(peak.verdict).toBe('not-known');
    expect(peak.because).toMatch(/skirt must reach \d+\.\d mm/);
    expect(figure(checked('pp', { fromRim: 5 }), 'mating-force').verdict).toBe('not-known');
  });

  // Snap-Fit Joints for Plastics - A Design Guide: slotted rings as cantilevers, eps = 1.5 t y / l^2.
  it('treats the fingers of a slotted skirt as cantilevers', () => {
    const p = values({ ...DEEP, skirt: 'slotted', slots: 24 });
    const length = skirtLength(p) - p.lip / 2;
    const report = checked('pp', { skirt: 'slotted', slots: 24 });
    expect(figure(report, 'peak-strain').value).toBeCloseTo((1.5 * 1.6 * 0.1) / length ** 2, 9);
    const closed = figure(checked('pp'), 'mating-force').value!;
    expect(figure(report, 'mating-force').value!).toBeLessThan(closed);
  });

  it('does not know arched fingers', () => {
    const few = figure(checked('pp', { skirt: 'slotted', slots: 4 }), 'peak-strain');
    expect(few.value).toBeNull();
    expect(few.because).toMatch(/use more slots/);
  });
});

describe('press lid: input', () => {
  it('names the field and the bound of what cannot be made', () => {
    expect(refused({ lidWall: 1, undercut: 1 })[0]).toMatch(/^lidWall: .*at least 1.3 mm/);
    expect(refused({ fromRim: 2, leadAngle: 10 })[0]).toMatch(/^fromRim: .*at least \d\.\d mm/);
    expect(refused({ potHeight: 20, fromRim: 18 })[0]).toMatch(/^potHeight: .*at least \d+\.\d mm/);
    expect(refused({ tubeDiameter: 16, skirt: 'slotted', slots: 36 })[0]).toMatch(/^slots: .*at most \d+ of/);
    expect(refused({ tubeDiameter: 300 })[0]).toBe('tubeDiameter: Pot diameter must be at most 120 mm');
  });

  it('opens every preset within its limit', () => {
    for (const preset of lid.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      const report = lid.check(values(preset.values), materialById(preset.material)!, preset.use);
      expect(['within-limit', 'close-to-limit'], preset.id).toContain(report.verdict);
    }
  });
});

describe('press lid: shape', () => {
  it('builds closed solids of the expected volume at 200 random valid designs', async () => {
    await checkFamilySolids(lid, {
      runs: 200,
      seed: 31,
      also: (drawn, [pot, cover]) => {
        const p = drawn as Values;
        expect(pot!.bounds[5]).toBeCloseTo(p.potHeight, 3);
        expect(cover!.bounds[2]).toBeCloseTo(mouthHeight(p), 3);
      },
    });
  });

  it('leaves no common volume a micrometre over home, and overlaps once pushed past the rim', async () => {
    const host = await createKernelHost();
    const common = (p: Values, drop: number) => {
      let shared = Number.NaN;
      host.build((kernel) => {
        const bodies = lid.build(p, kernel);
        const lowered = kernel.place(bodies[1]!.solid, [1, 0, 0, 0, 0, 1, 0, 0, 0, 0, 1, 0, 0, 0, -drop, 1]);
        shared = kernel.volume(kernel.intersect([bodies[0]!.solid, lowered]));
        return bodies;
      }, QUALITY.preview);
      return shared;
    };
    const draw = fc.property(arbitraryParameters(parameters), (p) => {
      expect(common(p, -1e-3)).toBe(0);
      expect(common(p, 0.05)).toBeGreaterThan(1e-3);
    });
    fc.assert(draw, { numRuns: 25, seed: 5 });
  });
});

describe('press lid: motion', () => {
  const p = values(DEEP);
  const motion = lid.motion(p, materialById('pp')!);
  const travel = skirtLength(p) + 8;
  const posed = (body: string, point: number[], t: number) => {
    const out = { positions: new Float32Array(3), strain: new Float32Array(1) };
    motion.pose(body, Float32Array.from(point), t, out);
    return { at: [...out.positions], strain: out.strain[0]! };
  };
  const lip = [25.2, 0, mouthHeight(p) + p.lip / 2];

  it('ends home and free of strain, and starts clear of the pot', () => {
    const home = posed('lid', lip, 1);
    expect(home.at[2]).toBeCloseTo(lip[2]!, 4);
    expect(home.strain).toBe(0);
    expect(posed('lid', lip, 0).at[2]).toBeGreaterThan(p.potHeight);
    expect(posed('pot', [25, 0, 40], 0).at).toEqual([25, 0, 40]);
  });

  it('stretches the lip and squeezes the pot as the check says while it rides on the bead', () => {
    const t = 1 - lipOnCrest(p) / travel;
    const { lidStrain, lidGives, potStrain } = lidMechanics(p, materialById('pp')!.poisson.value);
    const riding = posed('lid', lip, t);
    expect(riding.strain).toBeCloseTo(lidStrain, 6);
    expect(riding.at[0]! - 25.2).toBeCloseTo(lidGives, 4);
    expect(posed('pot', [25, 0, p.potHeight - p.fromRim], t).strain).toBeCloseTo(-potStrain, 6);
  });
});
