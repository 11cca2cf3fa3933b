import { describe, expect, it } from 'vitest';
import hook from '@/generators/folded-hook';
import { foldedStrain, solveFolded } from '@/generators/folded-hook/mechanics';
import { parameters, type Values } from '@/generators/folded-hook/schema';
import { parseParameters } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import { createKernelHost } from '@/lib/geometry/host';
import { QUALITY } from '@/lib/geometry/kernel';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';
import { checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const pp = materialById('pp')!;
const checked = (changed: Partial<Values> = {}): Report => hook.check(values(changed), pp, DEFAULT_USE);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};

/** Catch so short that the force acts at the end of the free leg. */
const POINT = { undercut: 0.2, landLength: 0.2, returnAngle: 90, leadInAngle: 60 } as const;

describe('folded hook: mechanics', () => {
  // Exact thin-beam results, derived: L arm eps 1 %, h 1.6, L2 12, L1 4: y 1.20 mm (twice a straight arm of 12 mm).
  it('shows the thin L arm as handbook figure', () => {
    const p = values({ shape: 'l', rootLeg: 4 - 1.2, freeLeg: 12 - 1.2 + 0.1, bendRadius: 0.4, ...POINT });
    const { handbook } = foldedStrain(p);
    expect(handbook / 0.2).toBeCloseTo(0.01 / 1.2, 4);
  });

  // U arm P 5, E 1700, b 6, h 1.6, L1 = L2 = 8, R 3: y 1.831 mm, eps 1.264 % at the crown.
  it('shows the thin U arm as handbook figure', () => {
    const p = values({ rootLeg: 8, freeLeg: 8.1, bendRadius: 2.2, armWidth: 6, ...POINT });
    const { handbook } = foldedStrain(p);
    expect(handbook / 0.2).toBeCloseTo(0.012638 / 1.831, 4);
  });

  it('finds the peak in the bend, above the thin beam', () => {
    const strain = foldedStrain(values());
    expect(strain.peak).toBe(strain.bend);
    expect(strain.bend).toBeGreaterThan(strain.handbook);
  });

  it('gives way more on its base than on a rigid one', () => {
    const elastic = { modulus: 1500, poisson: 0.35, width: 8 };
    const { compliance, solved } = solveFolded(values(), elastic);
    expect(compliance).toBeGreaterThan(solved.compliance);
  });

  it('strains less with longer legs, a larger bend and a thinner arm', () => {
    const peak = (changed: Partial<Values>) => foldedStrain(values(changed)).peak;
    expect(peak({ rootLeg: 20, freeLeg: 17 })).toBeLessThan(peak({}));
    expect(peak({ bendRadius: 4 })).toBeLessThan(peak({}));
    expect(peak({ thickness: 1.2 })).toBeLessThan(peak({}));
  });
});

describe('folded hook: report', () => {
  it('says what the fold buys', () => {
    const gain = figure(checked({ undercut: 2 }), 'fold-gain');
    expect(gain.value).toBeGreaterThan(1);
    expect(gain.because).toMatch(/straight arm of the same height/);
  });

  it('does not know the strain past small deflection', () => {
    const report = checked({
      rootLeg: 6,
      freeLeg: 4.5,
      bendRadius: 4,
      undercut: 6,
      leadInAngle: 60,
      returnAngle: 90,
      landLength: 0.2,
    });
    expect(figure(report, 'peak-strain').value).toBeNull();
    expect(figure(report, 'mating-force').value).toBeNull();
    expect(report.verdict).toBe('not-known');
  });

  it('does not put a number on a catch that locks', () => {
    const separation = figure(checked({ returnAngle: 90 }), 'separation-force');
    expect(separation.value).toBeNull();
    expect(separation.because).toMatch(/locks/);
  });
});

describe('folded hook: input', () => {
  it('names the field and the bound of what cannot be made', () => {
    expect(refused({ bendRadius: 0.5 })[0]).toMatch(/^bendRadius: .*at least 0.70 mm/);
    expect(refused({ freeLeg: 11 })).toEqual([
      'freeLeg: Free leg must be at most 10.5 mm, so that its end stays 1.5 mm above the base',
    ]);
  });

  it('opens every preset within its limit', () => {
    for (const preset of hook.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      const report = hook.check(values(preset.values), materialById(preset.material)!, preset.use);
      const worst = report.figures.filter(({ verdict }) => verdict && verdict !== 'within-limit');
      expect(['within-limit', 'close-to-limit'], `${preset.id} ${JSON.stringify(worst)}`).toContain(
        report.verdict,
      );
    }
  });
});

describe('folded hook: shape', () => {
  it('builds closed solids of the expected volume at 200 random valid designs', async () => {
    await checkFamilySolids(hook, { runs: 200, seed: 3 });
  });

  it.each(['u', 'l'] as const)('keeps hook and edge of the %s apart by the clearance', async (shape) => {
    const host = await createKernelHost();
    const p = values({ shape });
    const overlap = host.build((kernel) => {
      const [arm, edge] = hook.build(p, kernel);
      return [{ name: 'both', solid: kernel.union([arm!.solid, edge!.solid]) }];
    }, QUALITY.preview)[0]!;
    const expected = hook.volumes(p, QUALITY.preview.segmentsPerTurn)!;
    expect(overlap.volume).toBeCloseTo(expected.hook! + expected.receiver!, 1);
  });
});

describe('folded hook: motion', () => {
  it.each(['u', 'l'] as const)('moves the catch of the %s by the undercut and leaves the base', (shape) => {
    const p = values({ shape });
    const motion = hook.motion(p, pp);
    const leg = shape === 'u' ? [2 * 2.8, 0, 12 - 9 + 1.5] : [12 + 2.8, 0, 2.8 + 9 - 1.5];
    const rest = Float32Array.from([...leg, 0, 0, -3]);
    const out = { positions: new Float32Array(6), strain: new Float32Array(2) };
    motion.pose('hook', rest, 1, out);
    expect(out.positions[0]! - leg[0]!).toBeCloseTo(-p.undercut, 0);
    expect([...out.positions.slice(3)]).toEqual([0, 0, -3]);
  });
});
