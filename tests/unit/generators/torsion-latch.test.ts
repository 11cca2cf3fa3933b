import { describe, expect, it } from 'vitest';
import { parseParameters } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import latch from '@/generators/torsion-latch';
import { frontEnd } from '@/generators/torsion-latch/geometry';
import { parameters, type Values } from '@/generators/torsion-latch/schema';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE, type Material } from '@/lib/materials/types';
import { checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const checked = (material: Material, changed: Partial<Values> = {}): Report =>
  latch.check(values(changed), material, DEFAULT_USE);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const pp = materialById('pp')!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};

/** Modulus 1700 MPa at any strain, Poisson ratio 0.35. */
const steady: Material = {
  ...pp,
  flexuralModulus: { value: 1700, unit: 'MPa', source: { text: 'given', mark: 'given' } },
  poisson: { value: 0.35, unit: 'ratio', source: { text: 'given', mark: 'given' } },
  secant: { ...pp.secant, kind: 'constant' },
};

describe('torsion latch: verdicts', () => {
  // Snap-Fit Joints for Plastics - A Design Guide, torsion formulas (as quoted), numbers computed: round bars r 2, l 12
  // at 2 % turn by 9.28 degrees; on a 10 mm arm two bars give 42.7 N and a travel of 1.61 mm.
  it('gives the guide its round bars', () => {
    const undercut = 1.6;
    const round = { barShape: 'round', barDiameter: 4, barLength: 12, catchArm: 10, undercut } as const;
    const report = checked(steady, { ...round, panelThickness: 8, rockerWidth: 40 });
    const scale = Math.asin(undercut / 10) / ((9.28 * Math.PI) / 180);
    expect(figure(report, 'twist-strain').handbook).toBeCloseTo(0.02 * scale, 4);
    expect(figure(report, 'deflection-force').handbook).toBeCloseTo(42.7 * scale, 1);
  });

  it('strains less with longer and thinner bars', () => {
    const twist = (changed: Partial<Values>) => figure(checked(pp, changed), 'twist-strain').value!;
    expect(twist({ barLength: 16 })).toBeLessThan(twist({ barLength: 8 }));
    expect(twist({ barThickness: 1.2 })).toBeLessThan(twist({ barThickness: 2 }));
  });

  it('tells when the rocker bends more than the bars', () => {
    const report = checked(pp, { panelThickness: 2, barThickness: 2, barWidth: 4, rockerWidth: 4 });
    expect(figure(report, 'peak-strain').value).toBe(figure(report, 'rocker-bending').value);
    expect(figure(report, 'peak-strain').because).toMatch(/rocker/);
  });

  it('does not put a number on a nose that locks', () => {
    const report = checked(pp, { returnAngle: 90 });
    expect(figure(report, 'separation-force').value).toBeNull();
    expect(figure(report, 'separation-force').because).toMatch(/locks/);
  });

  it('trades finger force for travel', () => {
    const long = checked(pp, { tailArm: 28 });
    expect(figure(long, 'release-force').value).toBeCloseTo(
      figure(checked(pp), 'release-force').value! / 2,
      6,
    );
    expect(figure(long, 'tail-travel').value).toBeCloseTo(2, 6);
  });
});

describe('torsion latch: input', () => {
  it('names the field and the bound of what cannot be made', () => {
    expect(refused({ barThickness: 4 })).toEqual([
      'panelThickness: Panel thickness must be at least 4 mm, the height of the bars',
    ]);
    expect(refused({ undercut: 8 })[0]).toMatch(/^undercut: .*at most 7.0 mm/);
  });

  it('opens every preset within its limit', () => {
    for (const preset of latch.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      const report = latch.check(values(preset.values), materialById(preset.material)!, preset.use);
      expect(['within-limit', 'close-to-limit'], `${preset.id} ${report.verdict}`).toContain(report.verdict);
    }
  });
});

describe('torsion latch: shape', () => {
  it('builds closed solids of the expected volume at 200 random valid designs', async () => {
    await checkFamilySolids(latch, {
      runs: 200,
      seed: 5,
      also: (drawn, bodies) => {
        const p = drawn as Values;
        const [, minY, minZ, maxX, maxY, maxZ] = bodies[0]!.bounds;
        const across = p.rockerWidth + 2 * p.barLength + 2 * p.railWidth;
        expect(minZ).toBeCloseTo(0, 4);
        expect(maxZ).toBeCloseTo(p.panelThickness + p.undercut, 3);
        expect(maxY - minY).toBeCloseTo(across, 3);
        expect(maxX).toBeGreaterThanOrEqual(frontEnd(p) - 1e-3);
      },
    });
  });
});

describe('torsion latch: motion', () => {
  it('moves the nose down by the undercut, the tail up, and leaves the frame', () => {
    const p = values();
    const motion = latch.motion(p, pp);
    const rest = Float32Array.from([p.catchArm, 0, 1, -p.tailArm, 0, 1, 0, 17, 0, -p.tailArm - 3, 0, 0]);
    const out = { positions: new Float32Array(12), strain: new Float32Array(4) };
    motion.pose('latch', rest, 1, out);
    expect(out.positions[2]! - 1).toBeCloseTo(-p.undercut, 2);
    expect(out.positions[5]! - 1).toBeCloseTo(p.undercut, 2);
    expect([...out.positions.slice(6)].map((value, i) => value - rest[6 + i]!)).toEqual(
      Array.from({ length: 6 }, () => expect.closeTo(0, 5)),
    );
  });
});
