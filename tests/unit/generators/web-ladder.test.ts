import { describe, expect, it } from 'vitest';
import { parseParameters } from '@/generators/parameters';
import ladder from '@/generators/web-ladder';
import { layersOf, middleAt, parameters, type Values } from '@/generators/web-ladder/schema';
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

describe('web ladder', () => {
  it('gives the plain strip as the handbook figure of each end', () => {
    // eps = t theta / (2 L): 0.4 mm over 3 mm at half a turn, 0.209; 1 mm, 0.524
    const report = checked('pp');
    expect(figure(report, 'thinnest-strain').handbook).toBeCloseTo((0.4 * Math.PI) / 6, 9);
    expect(figure(report, 'thickest-strain').handbook).toBeCloseTo((1 * Math.PI) / 6, 9);
  });

  it('judges polypropylene by the drawn range and others by their allowable strain', () => {
    expect(figure(checked('pp'), 'thinnest-strain')).toMatchObject({ limit: 0.35, verdict: 'within-limit' });
    expect(figure(checked('pp'), 'expected-webs').value).toBe(2);
    const petg = figure(checked('petg'), 'thinnest-strain');
    expect(petg.limit).toBe(checked('petg').allowable.value);
    expect(petg.verdict).toBe('over-limit');
  });

  it('does not know polypropylene that is folded between its layers or past its heat limit', () => {
    const across = figure(checked('pp', {}, { ...DEFAULT_USE, layers: 'across' }), 'thinnest-strain');
    expect(across.limit).toBeLessThan(0.02);
    const hot = figure(checked('pp', {}, { ...DEFAULT_USE, temperature: 120 }), 'thinnest-strain');
    expect(hot.verdict).toBe('not-known');
  });

  it('asks for a ladder that goes past the limit', () => {
    const mild = checked('pp', { webLength: 12, hinges: 2 });
    expect(figure(mild, 'thickest-strain').verdict).toBe('over-limit');
    expect(figure(mild, 'thickest-strain').because).toMatch(/ends before the answer/);
  });

  it('names field, bound and unit of what cannot be made', () => {
    expect(refused({ hinges: 8, leafThickness: 2 })[0]).toMatch(/^leafThickness: .*at least 3\.60 mm/);
    expect(refused({ webFillet: 2 })[0]).toMatch(/^webFillet: .*at most 1\.20 mm/);
  });

  it('folds every leaf by the angle and leaves the shared one', () => {
    const p = values({ foldAngle: 90 });
    const motion = ladder.motion(p, materialById('pp')!);
    const end = p.webLength / 2 + p.leafLength;
    const points = layersOf(p).flatMap((_, at) => [
      [end, middleAt(p, at), 0],
      [-p.webLength / 2 - 4, middleAt(p, at), 1],
    ]);
    const rest = Float32Array.from(points.flat());
    const out = { positions: new Float32Array(rest.length), strain: new Float32Array(points.length) };
    motion.pose('ladder', rest, 1, out);
    layersOf(p).forEach((_, at) => {
      expect(out.positions[6 * at + 2]!).toBeLessThan(-p.leafLength);
      expect(Array.from(out.positions.subarray(6 * at + 3, 6 * at + 6))).toEqual(
        Array.from(rest.subarray(6 * at + 3, 6 * at + 6), (value) => expect.closeTo(value, 4)),
      );
    });
  });

  it('builds closed solids of the expected volume at 120 random valid designs', async () => {
    await checkFamilySolids(ladder, { runs: 120, seed: 43 });
  });
});
