import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import ladder from '@/generators/clearance-ladder';
import { columnAt, gapsOf, parameters, rowsOf, type Values } from '@/generators/clearance-ladder/schema';
import { parseParameters } from '@/generators/parameters';
import { createKernelHost } from '@/lib/geometry/host';
import { QUALITY } from '@/lib/geometry/kernel';
import { translation } from '@/lib/geometry/placement';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';
import { arbitraryParameters, checkFamilySolids } from '@/tests/support/solids';

const host = await createKernelHost();
const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const checked = (id: string, changed: Partial<Values> = {}) =>
  ladder.check(values(changed), materialById(id)!, DEFAULT_USE);
const figure = (report: ReturnType<typeof checked>, id: string) =>
  report.figures.find((one) => one.id === id)!;

/** Volume that pin and tongue share with the plate when moved along the row and across it, mm3. */
function shared(p: Values, [dx, dy]: readonly [number, number]): { pin: number; tongue: number } {
  const found = { pin: Number.NaN, tongue: Number.NaN };
  host.build((kernel) => {
    const [plate, pin, tongue] = ladder.build(p, kernel);
    const common = (of: typeof pin) =>
      kernel.volume(kernel.intersect([plate!.solid, kernel.place(of!.solid, translation([dx, dy, 0]))]));
    Object.assign(found, { pin: common(pin), tongue: common(tongue) });
    return [plate!];
  }, QUALITY.export);
  return found;
}

describe('clearance ladder', () => {
  it('places the fits of the clearance notes in its steps', () => {
    expect(figure(checked('pla'), 'slip-gap')).toMatchObject({ value: 0.2, verdict: 'within-limit' });
    expect(figure(checked('pla'), 'slip-gap').because).toMatch(/marked 20/);
    expect(figure(checked('petg'), 'slip-gap').because).toMatch(/marked 30/);
  });

  it('says when the fit sought lies outside or at an end', () => {
    expect(figure(checked('petg', { holes: 3 }), 'slip-gap').verdict).toBe('over-limit');
    expect(figure(checked('petg', { firstGap: 0.35 }), 'slip-gap').verdict).toBe('over-limit');
    expect(figure(checked('petg', { holes: 6 }), 'slip-gap').verdict).toBe('close-to-limit');
  });

  it('knows no gap of a moulded plastic', () => {
    expect(figure(checked('pom-moulded'), 'slip-gap')).toMatchObject({ value: null, verdict: 'not-known' });
  });

  it('refuses gaps past a quarter of the pin, with the bound', () => {
    const parsed = parseParameters(parameters, { pinDiameter: 4, gapStep: 0.2, holes: 12 });
    expect(parsed.ok ? [] : parsed.issues.map(({ message }) => message).join()).toMatch(/at most 1\.00 mm/);
  });

  it('keeps the gap on every side of every hole, and no more', () => {
    const p = values({ marks: 'none', holes: 4, firstGap: 0.1, gapStep: 0.1 });
    gapsOf(p).forEach((gap, at) => {
      const along = columnAt(p, at) - columnAt(p, p.holes - 1);
      for (const [dx, dy] of [
        [0, 0],
        [gap - 0.005, 0],
        [0, -(gap - 0.005)],
      ] as const) {
        const { pin, tongue } = shared(p, [along + dx, dy]);
        expect(pin).toBeLessThan(1e-3);
        expect(tongue).toBeLessThan(1e-3);
      }
      const past = shared(p, [along + gap + 0.02, 0]);
      expect(past.pin).toBeGreaterThan(1e-3);
      expect(past.tongue).toBeGreaterThan(1e-3);
    });
  });

  it('never overlaps as built, at 40 random valid designs', () => {
    fc.assert(
      fc.property(arbitraryParameters(parameters), (p) => {
        const { pin, tongue } = shared(p, [0, 0]);
        expect(pin + tongue).toBeLessThan(1e-6);
      }),
      { numRuns: 40, seed: 5 },
    );
  });

  it('keeps the rows clear of the figures between them', () => {
    const { round, flat } = rowsOf(values());
    expect(round).toBeGreaterThan(0);
    expect(flat).toBeLessThan(0);
  });

  it('builds closed solids of the expected volume at 120 random valid designs', async () => {
    await checkFamilySolids(ladder, { runs: 120, seed: 42 });
  });
});
