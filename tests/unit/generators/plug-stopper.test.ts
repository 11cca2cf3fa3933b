import { describe, expect, it } from 'vitest';
import { parseParameters } from '@/generators/parameters';
import plug from '@/generators/plug-stopper';
import { bearingLength } from '@/generators/plug-stopper/mechanics';
import { parameters, ribRadius, ribStarts, type Values } from '@/generators/plug-stopper/schema';
import type { Report } from '@/generators/report';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';
import { checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const checked = (id: string, changed: Partial<Values> = {}): Report =>
  plug.check(values(changed), materialById(id)!, DEFAULT_USE);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};

describe('plug stopper: verdicts', () => {
  it('strains in proportion to the squeeze at the bore', () => {
    const strain = figure(checked('pp', { interference: 0.5 }), 'contact-strain').value!;
    expect(strain).toBeCloseTo(0.5 / 24.5, 9);
  });

  it('presses less when hollow and strains the wall more', () => {
    const [solid, hollow] = [checked('tpu-95a', { kind: 'solid' }), checked('tpu-95a')];
    expect(figure(hollow, 'radial-force').value!).toBeLessThan(figure(solid, 'radial-force').value!);
    expect(figure(hollow, 'peak-strain').value!).toBeGreaterThan(figure(solid, 'peak-strain').value!);
  });

  it('keeps every force between its bounds', () => {
    for (const kind of ['solid', 'hollow'] as const) {
      for (const id of ['radial-force', 'contact-pressure', 'mating-force', 'separation-force']) {
        const { low, value, high } = figure(checked('pp', { kind }), id);
        expect(low!, id).toBeLessThanOrEqual(value!);
        expect(value!, id).toBeLessThanOrEqual(high!);
      }
    }
  });

  it('needs more force to push in than to pull out', () => {
    const report = checked('pp');
    expect(figure(report, 'mating-force').value!).toBeGreaterThan(figure(report, 'separation-force').value!);
  });

  it('counts the length that bears once where the reaches of two ribs overlap', () => {
    const p = values({ ribCount: 3, ribPitch: 5 });
    expect(bearingLength(p, 0.4)).toBeGreaterThan(3 * p.ribWidth);
    expect(bearingLength(p, 0.4)).toBeLessThanOrEqual(p.plugLength);
  });

  it('does not know the strain or forces of a squeeze past small strain', () => {
    const report = checked('tpu-95a', { kind: 'solid', boreDiameter: 8, interference: 4 });
    expect(figure(report, 'peak-strain').value).toBeNull();
    expect(figure(report, 'peak-strain').because).toMatch(/past the 20 %/);
    expect(figure(report, 'mating-force').verdict).toBe('not-known');
    expect(figure(report, 'contact-pressure').value).toBeNull();
  });

  it('says that a thin wall may dimple', () => {
    const thin = figure(checked('pp', { wallThickness: 0.8 }), 'dimple-strain');
    expect(thin.because).toMatch(/dimples on the first print/);
    expect(figure(checked('pp', { wallThickness: 6 }), 'dimple-strain').because).toMatch(/stays under/);
  });
});

describe('plug stopper: input', () => {
  it('names the field and the bound of what cannot be made', () => {
    expect(refused({ wallThickness: 10, boreDiameter: 20 })[0]).toMatch(
      /^wallThickness: .*at most \d\.\d mm/,
    );
    expect(refused({ ribPitch: 1.5 })[0]).toMatch(/^ribPitch: .*at least \d\.\d mm/);
    expect(refused({ plugLength: 8 })[0]).toMatch(/^plugLength: .*at least \d+\.\d mm to bear 3 ribs/);
    expect(refused({ interference: 9 })[0]).toBe('interference: Squeeze of the ribs must be at most 4 mm');
    expect(refused({ ribCount: 1.5 })[0]).toMatch(/^ribCount: .*whole number/);
    expect(refused({ bore: 3 })[0]).toMatch(/^bore: /);
  });

  it('accepts the bounds that its messages name', () => {
    const bound = Number(/at least ([\d.]+) mm/.exec(refused({ ribPitch: 1.5 })[0]!)![1]);
    expect(refused({ ribPitch: bound })).toEqual([]);
    expect(refused({ ribPitch: bound - 0.1 })).toHaveLength(1);
  });

  it('opens every preset within its limit', () => {
    for (const preset of plug.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      const report = plug.check(values(preset.values), materialById(preset.material)!, preset.use);
      expect(['within-limit', 'close-to-limit'], preset.id).toContain(report.verdict);
    }
  });
});

describe('plug stopper: shape', () => {
  it('builds closed solids of the expected volume at 200 random valid designs', async () => {
    await checkFamilySolids(plug, {
      runs: 200,
      seed: 23,
      also: (drawn, bodies) => {
        const p = drawn as Values;
        const [, , minZ, maxX, , maxZ] = bodies[0]!.bounds;
        expect(minZ).toBeCloseTo(0, 4);
        expect(maxZ).toBeCloseTo(p.flangeThickness + p.plugLength, 3);
        expect(maxX).toBeCloseTo(p.boreDiameter / 2 + p.flangeOverhang, 3);
        const { positions } = bodies[0]!.mesh;
        let widest = 0;
        for (let i = 0; i < positions.length; i += 3) {
          if (positions[i + 2]! > p.flangeThickness + 1e-3) {
            widest = Math.max(widest, Math.hypot(positions[i]!, positions[i + 1]!));
          }
        }
        expect(widest).toBeCloseTo(ribRadius(p), 3);
      },
    });
  });
});

describe('plug stopper: motion', () => {
  const p = values();
  const motion = plug.motion(p, materialById('pp')!);
  const posed = (points: number[][], t: number) => {
    const rest = Float32Array.from(points.flat());
    const out = { positions: new Float32Array(rest.length), strain: new Float32Array(points.length) };
    motion.pose('plug', rest, t, out);
    return out;
  };
  const height = p.flangeThickness + ribStarts(p).at(-1)! + p.ribWidth / 2;

  it('squeezes the ribs to the bore and leaves the flange alone', () => {
    const { positions, strain } = posed(
      [
        [ribRadius(p), 0, height],
        [10, 0, 0],
      ],
      1,
    );
    expect(positions[0]).toBeCloseTo(p.boreDiameter / 2, 3);
    expect(positions[2]).toBeCloseTo(height, 5);
    expect([positions[3], strain[1]]).toEqual([10, 0]);
  });

  it('stands free of strain before the bore', () => {
    const { positions, strain } = posed([[ribRadius(p), 0, height]], 0);
    expect(positions[2]).toBeLessThan(height - p.plugLength);
    expect(Math.abs(strain[0]!)).toBe(0);
  });

  it('peaks at the cavity where the check says', () => {
    const cavity = 23 / 2 - p.wallThickness - (height - p.flangeThickness) * Math.tan(Math.PI / 180);
    const { strain } = posed([[cavity, 0, height]], 1);
    expect(-strain[0]! / motion.peakStrain).toBeCloseTo(1, 2);
  });
});
