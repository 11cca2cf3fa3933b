import { describe, expect, it } from 'vitest';
import { parseParameters } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import clip from '@/generators/rod-clip';
import { footHalf } from '@/generators/rod-clip/geometry';
import { centreHeight, spreadOf } from '@/generators/rod-clip/ring';
import { mouthHalf, parameters, type Values } from '@/generators/rod-clip/schema';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';
import { checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const checked = (id: string, changed: Partial<Values> = {}): Report =>
  clip.check(values(changed), materialById(id)!, DEFAULT_USE);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};

describe('rod clip: verdicts', () => {
  it('strains less with less wrap, a thinner wall and a narrower stem', () => {
    const strain = (changed: Partial<Values>) => figure(checked('pp', changed), 'peak-strain').value!;
    expect(strain({ wrapAngle: 220 })).toBeLessThan(strain({ wrapAngle: 240 }));
    expect(strain({ wallThickness: 1.6, tipThickness: 1.6 })).toBeLessThan(strain({}));
    expect(strain({ stemWidth: 3 })).toBeLessThan(strain({ stemWidth: 8 }));
  });

  it('does not let strain depend on the width, but force does', () => {
    const [narrow, wide] = [checked('pp', { clipWidth: 10 }), checked('pp', { clipWidth: 20 })];
    expect(figure(wide, 'peak-strain').value).toBe(figure(narrow, 'peak-strain').value);
    expect(figure(wide, 'mating-force').value).toBeCloseTo(2 * figure(narrow, 'mating-force').value!, 6);
  });

  it('warns of a bore that grips', () => {
    expect(figure(checked('petg'), 'standing-strain').value).toBe(0);
    expect(figure(checked('petg', { play: -0.8 }), 'standing-strain').verdict).toBe('over-limit');
  });

  it('does not know the strain of an opening past the checked range', () => {
    const report = checked('tpu-95a', { wrapAngle: 320, tipThickness: 0.8, wallThickness: 0.8 });
    expect(figure(report, 'peak-strain').value).toBeNull();
    expect(figure(report, 'peak-strain').verdict).toBe('not-known');
    expect(figure(report, 'mating-force').value).toBeNull();
  });

  // Thin ring by Castigliano, derived: di 12, h 2, b 10, beta 120 degrees, E 1700 on a 12 mm rod gives 11.96 N, 1.108 %.
  it('shows the handbook figures of the worked example beside its own', () => {
    const steady = {
      ...materialById('pp')!,
      flexuralModulus: { value: 1700, unit: 'MPa', source: { text: 'given', mark: 'given' } } as const,
      secant: { ...materialById('pp')!.secant, kind: 'constant' as const },
    };
    const report = clip.check(values(), steady, DEFAULT_USE);
    expect(figure(report, 'deflection-force').handbook).toBeCloseTo(11.96, 1);
    expect(figure(report, 'peak-strain').handbook).toBeCloseTo(0.01108, 4);
    expect(figure(report, 'tip-deflection').handbook).toBeCloseTo(1.608 / 2, 3);
  });
});

describe('rod clip: input', () => {
  it('names the field and the bound of what cannot be made', () => {
    expect(refused({ tipThickness: 3 })).toEqual([
      'tipThickness: Wall at the lips must be at most 2 mm, the wall at the back',
    ]);
    expect(refused({ rodDiameter: 4, wallThickness: 1.6, tipThickness: 1.6, wrapAngle: 312 })[0]).toMatch(
      /^wrapAngle: .*mouth under 0.3 mm/,
    );
    expect(refused({ clipCount: 2, spacing: 10 })[0]).toMatch(/^spacing: .*at least \d+\.\d mm/);
    expect(refused({ footOverhang: 4 })[0]).toMatch(/^footOverhang: .*6.4 mm/);
  });

  it('opens every preset within its limit', () => {
    for (const preset of clip.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      const report = clip.check(values(preset.values), materialById(preset.material)!, preset.use);
      expect(['within-limit', 'close-to-limit'], preset.id).toContain(report.verdict);
    }
  });
});

describe('rod clip: shape', () => {
  it('builds closed solids of the expected volume at 200 random valid designs', async () => {
    await checkFamilySolids(clip, {
      runs: 200,
      seed: 11,
      also: (drawn, bodies) => {
        const p = drawn as Values;
        const [minX, , minZ, maxX, , maxZ] = bodies[0]!.bounds;
        expect(minZ).toBeCloseTo(0, 4);
        expect(maxX).toBeGreaterThanOrEqual(footHalf(p) - 1e-3);
        expect(minX).toBeCloseTo(-maxX, 2);
        expect(maxZ).toBeGreaterThan(centreHeight(p));
      },
    });
  });

  it('measures the mouth that the parameters promise', async () => {
    const { createKernelHost } = await import('@/lib/geometry/host');
    const { QUALITY } = await import('@/lib/geometry/kernel');
    const host = await createKernelHost();
    const p = values();
    const [body] = host.build((kernel) => clip.build(p, kernel), QUALITY.export);
    let nearest = Number.POSITIVE_INFINITY;
    const { positions } = body!.mesh;
    for (let i = 0; i < positions.length; i += 3) {
      if (positions[i + 2]! > centreHeight(p)) nearest = Math.min(nearest, Math.abs(positions[i]!));
    }
    expect(nearest).toBeCloseTo(mouthHalf(p), 2);
  });
});

describe('rod clip: motion', () => {
  const p = values();
  const motion = clip.motion(p, materialById('pp')!);
  const posed = (points: number[][]) => {
    const rest = Float32Array.from(points.flat());
    const out = { positions: new Float32Array(rest.length), strain: new Float32Array(points.length) };
    motion.pose('clip', rest, 1, out);
    return out;
  };

  it('opens the mouth for the rod and leaves the foot alone', () => {
    const radius = (12 + 2) / 2;
    const lip = [radius * Math.sin((2 * Math.PI) / 3), 0, centreHeight(p) + radius * 0.5];
    const { positions } = posed([lip, [-lip[0]!, 0, lip[2]!], [15, 0, 0], [0, 0, 3]]);
    expect(positions[0]! - lip[0]!).toBeCloseTo(spreadOf(p), 1);
    expect(positions[3]! + lip[0]!).toBeCloseTo(-spreadOf(p), 1);
    expect([positions[6], positions[8], positions[9]]).toEqual([15, 0, 0]);
  });

  it('stretches the bore, squeezes the outside, and peaks where the check says', () => {
    const ring = Array.from({ length: 90 }, (_, i) => 0.3 + (i / 90) * 1.7);
    const at = (radius: number) =>
      ring.map((angle) => [radius * Math.sin(angle), 0, centreHeight(p) - radius * Math.cos(angle)]);
    const bore = posed(at(6)).strain;
    const outside = posed(at(8)).strain;
    expect(Math.min(...bore)).toBeGreaterThanOrEqual(0);
    expect(Math.max(...outside)).toBeLessThanOrEqual(0);
    expect(Math.max(...bore)).toBeCloseTo(motion.peakStrain, 3);
  });
});
