import { describe, expect, it } from 'vitest';
import hinge from '@/generators/living-hinge';
import { holeCentres } from '@/generators/living-hinge/geometry';
import { parameters, type Values } from '@/generators/living-hinge/schema';
import { parseParameters } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import { createKernelHost } from '@/lib/geometry/host';
import { QUALITY } from '@/lib/geometry/kernel';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';
import { checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const material = (id: string) => materialById(id)!;
const checked = (id: string, changed: Partial<Values> = {}, use = DEFAULT_USE): Report =>
  hinge.check(values(changed), material(id), use);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const faults = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, { ...parameters.defaults, ...changed });
  return parsed.ok ? [] : parsed.issues.map((issue) => `${issue.field}: ${issue.message}`);
};

describe('living hinge: verdicts', () => {
  it('finds a short PETG web over its limit', () => {
    const report = checked('petg');
    expect(report.verdict).toBe('over-limit');
    expect(figure(report, 'peak-strain').handbook).toBeCloseTo((0.4 * Math.PI) / 6, 6);
    expect(figure(report, 'fold-endurance').high).toBe(1000);
  });

  it('does not judge a drawn polypropylene web by an elastic limit', () => {
    const report = checked('pp');
    expect(report.governing).toBe('drawn-strain');
    expect(figure(report, 'peak-strain').verdict).toBeNull();
    expect(figure(report, 'drawn-strain').verdict).toBe('within-limit');
    expect(figure(report, 'drawn-strain').limit).toBe(0.35);
  });

  it('judges polypropylene as elastic where the web is long enough', () => {
    const report = checked('pp', { webLength: 60, foldAngle: 90 });
    expect(report.governing).toBe('peak-strain');
    expect(figure(report, 'peak-strain').verdict).toBe('within-limit');
  });

  it('warns of polypropylene that yields without drawing', () => {
    expect(figure(checked('pp', { webLength: 10 }), 'drawn-strain').verdict).toBe('close-to-limit');
  });

  it('finds over limit a flush web pressed shut and relieves it by a recess', () => {
    const flush = figure(checked('pp', { closing: 'shut' }), 'drawn-strain');
    const recessed = figure(
      checked('pp', { closing: 'shut', leafThickness: 3, webRelief: 0.75 }),
      'drawn-strain',
    );
    expect(flush.verdict).toBe('over-limit');
    expect(recessed.verdict).toBe('within-limit');
  });

  it('meets the limit at the elastic web length it proposes', () => {
    const proposed = figure(checked('petg'), 'elastic-web-length').value!;
    const report = checked('petg', { webLength: Math.ceil(proposed * 10) / 10 });
    expect(figure(report, 'peak-strain').verdict).not.toBe('over-limit');
    expect(figure(report, 'peak-strain').value! / report.allowable.value!).toBeGreaterThan(0.97);
  });

  it('says at which angle the leaf edges meet when the groove is inside', () => {
    const meeting = figure(checked('pp', { foldTowards: 'groove' }), 'meeting-angle');
    expect(meeting.verdict).toBe('over-limit');
    expect(meeting.value).toBeCloseTo(((3 / 1.8) * 180) / Math.PI, 6);
  });

  it('asks for whole layers, two at least', () => {
    expect(figure(checked('pp'), 'web-layers').verdict).toBe('within-limit');
    expect(figure(checked('pp', { webThickness: 0.5 }), 'web-layers').verdict).toBe('close-to-limit');
    expect(figure(checked('pp', { webThickness: 0.2 }), 'web-layers').verdict).toBe('over-limit');
  });

  // Balderrama-Armendariz et al. 2019: TPU and PP last, PLA, PETG and nylon stay under 1000 folds.
  it.each([
    ['pp', 'within-limit'],
    ['pla', 'over-limit'],
    ['petg', 'over-limit'],
    ['pa-dry', 'over-limit'],
  ])('ranks the fold endurance of %s as published', (id, verdict) => {
    expect(figure(checked(id), 'fold-endurance').verdict).toBe(verdict);
  });

  it('knows neither drawing nor endurance of a web whose layers the fold pulls apart', () => {
    const report = checked('pp', {}, { ...DEFAULT_USE, layers: 'across' });
    expect(figure(report, 'drawn-strain').verdict).toBe('not-known');
    expect(figure(report, 'drawn-strain').because).toMatch(/layers apart/);
    expect(figure(report, 'fold-endurance')).toMatchObject({ value: null, verdict: 'not-known' });
  });

  it('knows nothing of a drawn web past the heat limit of the plastic', () => {
    const report = checked('pp', {}, { ...DEFAULT_USE, temperature: 120 });
    expect(figure(report, 'drawn-strain').verdict).toBe('not-known');
    expect(figure(report, 'fold-moment').value).toBeNull();
  });

  it('promises no endurance of a web strained past what drawn webs work at', () => {
    const report = checked('pp', { webLength: 0.5, webFillet: 0.2 });
    expect(figure(report, 'drawn-strain').verdict).toBe('over-limit');
    expect(figure(report, 'drawn-strain').because).toMatch(/tears/);
    expect(figure(report, 'fold-endurance')).toMatchObject({ value: null, verdict: 'not-known' });
  });

  it('gives no angle past a full turn at which leaf edges meet', () => {
    expect(figure(checked('pp'), 'meeting-angle')).toMatchObject({ value: 360, verdict: 'within-limit' });
  });

  it('caps the holding moment at the plastic moment', () => {
    const moment = figure(checked('pp'), 'fold-moment').value!;
    const yieldStress = material('pp').tensileStrength!.value;
    expect(moment).toBeCloseTo((yieldStress * 30 * 0.4 ** 2) / 4, 6);
  });
});

describe('living hinge: input', () => {
  it('names field, bound and unit of impossible webs', () => {
    expect(faults({ webFillet: 1.5 })).toContainEqual(
      'webFillet: Web fillet must be at most 1.20 mm, 0.4 of the web length',
    );
    expect(faults({ webRelief: 1 })).toContainEqual(
      'webRelief: Web recess must be at most 0.80 mm, which centres the web; turn the part over instead',
    );
    expect(faults({ webThickness: 0.1 })).toEqual(['webThickness: Web thickness must be at least 0.2 mm']);
    expect(faults({ hinge: 1 })).toEqual(['hinge: hinge is not a parameter of this family']);
  });

  it('opens every preset', () => {
    for (const preset of hinge.presets) {
      expect(parseParameters(parameters, preset.values).ok, preset.id).toBe(true);
      expect(materialById(preset.material), preset.id).toBeDefined();
      const report = hinge.check(values(preset.values), material(preset.material), preset.use);
      expect(report.verdict, preset.id).not.toBe('over-limit');
    }
  });
});

describe('living hinge: shape', () => {
  it('builds closed solids of the expected volume at 200 random valid designs', async () => {
    await checkFamilySolids(hinge, {
      runs: 200,
      seed: 7,
      also: (drawn, bodies) => {
        const p = drawn as Values;
        const [minX, minY, minZ, maxX, maxY, maxZ] = bodies[0]!.bounds;
        expect(maxX - minX).toBeCloseTo(2 * p.leafLength + p.webLength, 3);
        expect(maxY - minY).toBeCloseTo(p.leafWidth, 3);
        expect([minZ, maxZ - p.leafThickness]).toEqual([expect.closeTo(0, 4), expect.closeTo(0, 4)]);
      },
    });
  });

  it('keeps every hole inside its leaf', () => {
    const p = values({ holeCount: 5, leafWidth: 60 });
    for (const [x, y] of holeCentres(p)) {
      expect(Math.abs(x) - p.holeDiameter / 2).toBeGreaterThan(p.webLength / 2 + 1);
      expect(Math.abs(y) + p.holeDiameter / 2).toBeLessThan(p.leafWidth / 2 - 1);
    }
  });
});

describe('living hinge: motion', () => {
  const p = values();
  const motion = hinge.motion(p, material('pp'));
  const posed = (points: number[][], t: number) => {
    const rest = Float32Array.from(points.flat());
    const out = { positions: new Float32Array(rest.length), strain: new Float32Array(points.length) };
    motion.pose('hinge', rest, t, out);
    return out;
  };

  it('leaves the flat hinge as it is', () => {
    const { positions, strain } = posed(
      [
        [10, 3, 1],
        [0, 0, 0.4],
      ],
      0,
    );
    for (const [i, value] of [10, 3, 1, 0, 0, 0.4].entries()) expect(positions[i]).toBeCloseTo(value, 4);
    expect([...strain].map(Math.abs)).toEqual([0, 0]);
  });

  it('turns the free leaf by the fold angle without changing its size', () => {
    const { positions } = posed(
      [
        [5, 0, 0],
        [15, 0, 0],
      ],
      1,
    );
    expect(positions[3]! - positions[0]!).toBeCloseTo(-10, 3);
    expect(positions[5]).toBeCloseTo(positions[2]!, 3);
  });

  it('brings the exits of a half-turn about two thirds of the web length apart', () => {
    const { positions } = posed(
      [
        [-1.5, 0, 0.2],
        [1.5, 0, 0.2],
      ],
      1,
    );
    const apart = Math.abs(positions[5]! - positions[2]!);
    expect(apart / p.webLength).toBeGreaterThan(0.5);
    expect(apart / p.webLength).toBeLessThan(0.66);
  });

  it('stretches the outside, squeezes the inside and never exceeds the peak', () => {
    const heights = Array.from({ length: 61 }, (_, i) => -1.5 + i * 0.05).flatMap((x) => [
      [x, 0, 0],
      [x, 0, 0.4],
    ]);
    const { strain } = posed(heights, 1);
    const inside = strain.filter((_, i) => i % 2 === 0);
    const outside = strain.filter((_, i) => i % 2 === 1);
    expect(Math.max(...inside)).toBeLessThanOrEqual(0);
    expect(Math.min(...outside)).toBeGreaterThanOrEqual(0);
    expect(Math.max(...strain)).toBeCloseTo(motion.peakStrain, 2);
    expect(Math.max(...strain)).toBeLessThanOrEqual(motion.peakStrain + 1e-6);
  });
});

describe('living hinge: kernel', () => {
  it('drills the holes through', async () => {
    const host = await createKernelHost();
    const solid = (holeCount: number) =>
      host.build((kernel) => hinge.build(values({ holeCount }), kernel), QUALITY.preview)[0]!.volume;
    expect(solid(0) - solid(2)).toBeGreaterThan(4 * Math.PI * 1.6 ** 2 * 2 * 0.98);
  });
});
