import { describe, expect, it } from 'vitest';
import { parseParameters } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import mount from '@/generators/soft-mount';
import { stripLoop } from '@/generators/soft-mount/geometry';
import { carriedBy } from '@/generators/soft-mount/mechanics';
import { freeHeight, parameters, springOf, springOffset, type Values } from '@/generators/soft-mount/schema';
import { loopArea } from '@/lib/geometry/loops';
import { materialById } from '@/lib/materials/data';
import { secantModulus } from '@/lib/materials/secant';
import { DEFAULT_USE, type Use } from '@/lib/materials/types';
import { springReach } from '@/lib/mechanics/s-spring';
import { ISOLATES_FROM } from '@/lib/mechanics/vibration';
import { checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const material = (id: string) => materialById(id)!;
const checked = (id: string, changed: Partial<Values> = {}, use: Use = DEFAULT_USE): Report =>
  mount.check(values(changed), material(id), use);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const value = (report: Report, id: string) => figure(report, id).value!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};
const S_SPRING = { kind: 's-spring', mass: 60, dropHeight: 5 } as const;

describe('soft mount: verdicts', () => {
  it('is lower in frequency the heavier its mass and the fewer its columns', () => {
    const frequency = (changed: Partial<Values>) => value(checked('tpu-95a', changed), 'natural-frequency');
    expect(frequency({ mass: 2400 })).toBeCloseTo(frequency({}) / 2, 0);
    expect(frequency({ columnsAlong: 1 })).toBeLessThan(frequency({}));
    expect(frequency({ ...S_SPRING, legLength: 5 })).toBeLessThan(frequency(S_SPRING));
  });

  it('isolates from root two times the frequency on, taken on its stiffer side', () => {
    const report = checked('tpu-95a');
    const isolates = figure(report, 'isolates-from');
    expect(isolates.handbook).toBeCloseTo(ISOLATES_FROM * value(report, 'natural-frequency'), 9);
    expect(isolates.value).toBeCloseTo(isolates.handbook! * Math.sqrt(1.5), 9);
    expect(figure(checked('tpu-95a', { shaking: 100 }), 'isolates-from').verdict).toBe('over-limit');
  });

  it('sags as its stiffness says and strains more the higher the fall', () => {
    const report = checked('tpu-95a');
    expect(value(report, 'static-sag') * value(report, 'axial-stiffness')).toBeCloseTo(0.6 * 9.80665, 6);
    const strain = (dropHeight: number) => value(checked('tpu-95a', { dropHeight }), 'peak-strain');
    expect(strain(3)).toBeGreaterThan(strain(0));
    expect(strain(0)).toBeCloseTo(2 * value(report, 'static-strain'), 9);
  });

  it('does not know the strain of a knock past a fifth of its height, and says why', () => {
    const report = checked('tpu-95a', { dropHeight: 200 });
    expect(figure(report, 'peak-strain')).toMatchObject({ value: null, verdict: 'not-known' });
    expect(figure(report, 'peak-strain').because).toMatch(/a fifth of its height/);
    expect(figure(report, 'knock-travel').verdict).toBe('over-limit');
  });

  it('finds slim columns that give way under the knock', () => {
    const slim = { columnSide: 2.5, columnHeight: 14, dropHeight: 8 };
    expect(figure(checked('tpu-95a', slim), 'buckling-load').verdict).toBe('over-limit');
    expect(figure(checked('tpu-95a'), 'buckling-load').verdict).toBe('within-limit');
  });

  it('does not put figures on columns of a plastic that is not like rubber', () => {
    const report = checked('petg');
    expect(report.verdict).toBe('not-known');
    expect(figure(report, 'natural-frequency').value).toBeNull();
    expect(figure(report, 'peak-strain').because).toMatch(/rubber-like/);
    expect(report.curves.map(({ id }) => id)).toEqual(['transmitted-over-ratio']);
    expect(value(checked('petg', S_SPRING), 'natural-frequency')).toBeGreaterThan(0);
  });

  it('finds modulus and sag that belong together', () => {
    const p = values({ ...S_SPRING, mass: 200 });
    const { modulus, stiffness, sag } = carriedBy(p, material('pp'))!;
    expect(modulus).toBeCloseTo(secantModulus(material('pp'), stiffness.axialStrain * sag)!.value, 1);
  });
});

describe('soft mount: input', () => {
  it('names the field and the bound of what cannot be made', () => {
    expect(refused({ columnsAlong: 8, columnSide: 10 })[0]).toMatch(/^plateLength: .*at least \d+\.\d mm/);
    expect(refused({ columnsAcross: 8 })[0]).toMatch(/^plateWidth: .*at least 32.0 mm for 8 columns/);
    expect(refused({ columnHeight: 3, fillet: 2 })[0]).toMatch(/^fillet: .*at most 0.90 mm/);
    expect(refused({ kind: 's-spring', bendRadius: 1.5 })[0]).toMatch(/^bendRadius: .*at least 1.70 mm/);
    expect(refused({ kind: 's-spring', legLength: 30 })[0]).toMatch(/^plateLength: /);
    expect(refused({ holeDiameter: 10, plateWidth: 10 })).toContainEqual(
      expect.stringMatching(/^holeDiameter: .*at most 7.0 mm/),
    );
  });

  it('opens every preset within its limit', () => {
    for (const preset of mount.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      const report = checked(preset.material, preset.values, preset.use);
      expect(['within-limit', 'close-to-limit'], `${preset.id} ${report.verdict}`).toContain(report.verdict);
    }
  });
});

describe('soft mount: shape', () => {
  it('builds closed solids of the expected volume and size at 120 random valid designs', async () => {
    await checkFamilySolids(mount, {
      runs: 120,
      seed: 13,
      volumeError: 1e-4,
      also: (drawn, bodies) => {
        const p = drawn as Values;
        const [minX, minY, minZ, maxX, maxY, maxZ] = bodies[0]!.bounds;
        const size = [p.plateLength, p.plateWidth, freeHeight(p) + 2 * p.plateThickness];
        expect([maxX - minX, maxY - minY, maxZ - minZ]).toEqual(size.map((one) => expect.closeTo(one, 3)));
      },
    });
  });

  it('draws a strip as long as its middle line and as thick as asked for', () => {
    const p = values({ kind: 's-spring', fillet: 0.5 });
    const { radius, leg, thickness, foot } = springOf(p);
    const line = 2 * foot + 2 * leg + 3 * Math.PI * radius + 2 * (radius + leg);
    const fillets = 4 * (1 - Math.PI / 4) * foot ** 2;
    const sunk = 2 * 0.5 * (thickness + 2 * foot);
    expect(loopArea(stripLoop(p, 4000))).toBeCloseTo(line * thickness + fillets + sunk, 3);
  });

  it('keeps the springs apart and on their plates', () => {
    const p = values({ kind: 's-spring' });
    expect(springOffset(p) - springReach(springOf(p))).toBeGreaterThan(0.5);
    expect(2 * (springOffset(p) + springReach(springOf(p)))).toBeLessThanOrEqual(p.plateLength);
  });
});

describe('soft mount: motion', () => {
  const posed = (p: Values, points: number[][], t: number) => {
    const rest = Float32Array.from(points.flat());
    const out = { positions: new Float32Array(rest.length), strain: new Float32Array(points.length) };
    mount.motion(p, material('tpu-95a')).pose('mount', rest, t, out);
    return out;
  };

  it.each<[string, Partial<Values>]>([
    ['columns', {}],
    ['S-springs', S_SPRING],
  ])('sinks on %s by the travel of the knock, the lower plate at rest', (_, changed) => {
    const p = values(changed);
    const h = freeHeight(p);
    const travel = value(checked('tpu-95a', changed), 'knock-travel');
    const { positions } = posed(
      p,
      [
        [3, 1, h + 1],
        [3, 1, -1],
      ],
      1,
    );
    expect(positions[2]! - (h + 1)).toBeCloseTo(-travel, 4);
    expect(positions[0]).toBeCloseTo(3, 4);
    expect([...positions.slice(3)]).toEqual([3, 1, -1]);
  });

  it('sways to either side on the way', () => {
    const p = values();
    const top = [[0, 0, freeHeight(p) + 1]];
    expect(posed(p, top, 0.25).positions[0]!).toBeGreaterThan(0.05);
    expect(posed(p, top, 0.75).positions[0]!).toBeLessThan(-0.05);
  });

  it('joins the strip to both plates without a step', () => {
    const p = values(S_SPRING);
    const h = freeHeight(p);
    for (const t of [0.25, 0.6, 1]) {
      for (const side of [-1, 1]) {
        const x = side * springOffset(p);
        const { positions: at } = posed(
          p,
          [
            [x, 0, h - 0.01],
            [x, 0, h + 0.01],
            [x, 0, 0.01],
            [x, 0, -0.01],
          ],
          t,
        );
        for (const [a, b] of [
          [0, 3],
          [6, 9],
        ] as const) {
          const apart = Math.hypot(at[a]! - at[b]!, at[a + 2]! - at[b + 2]!);
          expect(apart).toBeLessThan(0.1);
        }
      }
    }
  });

  it('strains the bends as the check says at the knock', () => {
    const p = values(S_SPRING);
    const motion = mount.motion(p, material('tpu-95a'));
    const loop = stripLoop(p, 96);
    const points = loop.map(([x, z]) => [x + springOffset(p), 0, z]);
    const most = Math.max(...posed(p, points, 1).strain.map(Math.abs));
    expect(motion.peakStrain).toBeCloseTo(value(checked('tpu-95a', S_SPRING), 'peak-strain'), 9);
    expect(most / motion.peakStrain).toBeGreaterThan(0.97);
    expect(most / motion.peakStrain).toBeLessThan(1.001);
  });
});
