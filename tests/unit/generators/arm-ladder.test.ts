import { describe, expect, it } from 'vitest';
import ladder from '@/generators/arm-ladder';
import { outline } from '@/generators/arm-ladder/geometry';
import { cellsOf } from '@/generators/arm-ladder/layout';
import { parameters, strainsOf, type Values } from '@/generators/arm-ladder/schema';
import { parseParameters } from '@/generators/parameters';
import { createKernelHost } from '@/lib/geometry/host';
import { QUALITY } from '@/lib/geometry/kernel';
import { loopArea } from '@/lib/geometry/loops';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';
import { checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const checked = (id: string, changed: Partial<Values> = {}, use = DEFAULT_USE) =>
  ladder.check(values(changed), materialById(id)!, use);
const figure = (report: ReturnType<typeof checked>, id: string) =>
  report.figures.find((one) => one.id === id)!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};

describe('arm ladder', () => {
  it('strains each arm at its stop as marked, within the spread of Poisson ratios', () => {
    for (const id of ['pla', 'petg', 'pp', 'pa-conditioned']) {
      const points = checked(id).curves[0]!.points.slice(1);
      points.forEach(([, strain], at) => {
        expect(strain / strainsOf(values())[at]! - 1).toBeCloseTo(0, 1.5);
      });
    }
  });

  it('lies above the beam formula for stubby arms and meets it for slender ones', () => {
    // 3 t y / (2 L^2) holds for a rigid root and no fillet: the corrected stop lies further for a long arm.
    const slender = checked('petg', { armLength: 60, armThickness: 1.2, rootFillet: 0.6 });
    const first = figure(slender, 'first-strain');
    expect(first.value! / first.handbook!).toBeGreaterThan(0.95);
    expect(first.value! / first.handbook!).toBeLessThan(1.35);
  });

  it('asks for a ladder that reaches past the allowable strain', () => {
    const short = checked('pa-conditioned', { arms: 2, strainStep: 0.002 });
    expect(figure(short, 'last-strain').verdict).toBe('over-limit');
    const hard = checked('pla', { firstStrain: 0.06, strainStep: 0.01, arms: 2 });
    expect(figure(hard, 'first-strain').verdict).toBe('over-limit');
    expect(figure(hard, 'expected-arm').value).toBe(0);
  });

  it('counts the arms expected to hold', () => {
    const report = checked('petg');
    const within = strainsOf(values()).filter((strain) => strain <= report.allowable.value!).length;
    expect(Math.abs(figure(report, 'expected-arm').value! - within)).toBeLessThanOrEqual(1);
  });

  it('names field, bound and unit of what cannot be laid out', () => {
    expect(refused({ armLength: 10, armThickness: 3 })[0]).toMatch(/^armLength: .*at least 15\.0 mm/);
    expect(refused({ firstStrain: 0.002, strainStep: 0.001 })[0]).toMatch(/^firstStrain: .*0\.9 mm/);
    expect(refused({ strainStep: 0.05, arms: 10 })[0]).toMatch(/^strainStep: .*mm, half its length/);
    expect(refused({ armThickness: 5, armLength: 30, rootFillet: 0.2 }).join()).toMatch(
      /rootFillet: .*0\.5 and 5\.0 mm/,
    );
  });

  it('brings every tip to its stop and paints the marked strain at its root', () => {
    const p = values();
    const motion = ladder.motion(p, materialById('petg')!);
    const cells = cellsOf(p);
    const points = cells.flatMap(({ arm }) => [
      [arm[1], p.armLength, 0],
      [arm[0], p.rootFillet, 0],
    ]);
    const rest = Float32Array.from(points.flat());
    const out = { positions: new Float32Array(rest.length), strain: new Float32Array(points.length) };
    motion.pose('ladder', rest, 1, out);
    cells.forEach(({ post }, at) => {
      expect(out.positions[6 * at]! / post[0] - 1).toBeCloseTo(0, 2);
      expect(out.strain[2 * at + 1]! / strainsOf(p)[at]! - 1).toBeCloseTo(0, 1);
    });
    expect(motion.peakStrain / strainsOf(p).at(-1)! - 1).toBeCloseTo(0, 1);
    motion.pose('ladder', rest, 0, out);
    expect(out.positions).toEqual(rest);
  });

  it.each(['raised', 'cut'] as const)('is one closed body with its figures %s', async (marks) => {
    const host = await createKernelHost();
    const p = values({ marks });
    const [body] = host.build((kernel) => ladder.build(p, kernel), QUALITY.preview);
    const bare = loopArea(outline(p, QUALITY.preview.segmentsPerTurn)) * p.armWidth;
    const change = body!.volume - bare;
    expect(marks === 'raised' ? change : -change).toBeGreaterThan(5);
  });

  it('builds closed solids of the expected volume at 120 random valid designs', async () => {
    await checkFamilySolids(ladder, { runs: 120, seed: 41 });
  });
});
