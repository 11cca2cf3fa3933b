import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseParameters } from '@/generators/parameters';
import ladder from '@/generators/thread-ladder';
import { clearancesOf, columnAt, parameters, type Values } from '@/generators/thread-ladder/schema';
import { createKernelHost } from '@/lib/geometry/host';
import { QUALITY } from '@/lib/geometry/kernel';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';
import { arbitraryParameters, checkFamilySolids } from '@/tests/support/solids';

const host = await createKernelHost();
const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const checked = (id: string, changed: Partial<Values> = {}) =>
  ladder.check(values(changed), materialById(id)!, DEFAULT_USE);
const figure = (report: ReturnType<typeof checked>, id: string) =>
  report.figures.find((one) => one.id === id)!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};

/** Volume that the stud shares with the plate when it stands in a hole, lifted and turned along the helix, mm3. */
function shared(p: Values, hole: number, lift = 0): number {
  let volume = Number.NaN;
  host.build((kernel) => {
    const [plate, stud] = ladder.build(p, kernel);
    const [from, to] = [columnAt(p, p.holes - 1), columnAt(p, hole)];
    const turn = (2 * Math.PI * lift) / (p.pitch * p.starts);
    const at = compose(translation([to, 0, lift]), rotation('z', turn), translation([-from, 0, 0]));
    volume = kernel.volume(kernel.intersect([plate!.solid, kernel.place(stud!.solid, at)]));
    return [plate!];
  }, QUALITY.export);
  return volume;
}

describe('thread ladder', () => {
  it('places the slip fit of the clearance notes in its steps', () => {
    expect(figure(checked('petg'), 'slip-clearance')).toMatchObject({ value: 0.3, verdict: 'within-limit' });
    expect(figure(checked('petg', { firstClearance: 0.3 }), 'slip-clearance').verdict).toBe('close-to-limit');
    expect(figure(checked('petg', { firstClearance: 0.35, holes: 3 }), 'slip-clearance').verdict).toBe(
      'over-limit',
    );
    expect(figure(checked('pom-moulded'), 'slip-clearance').verdict).toBe('not-known');
  });

  it('gives the pitch diameter of ISO 724 for M12 x 1.75', () => {
    const metric = checked('pla', {
      profile: 'iso-metric',
      majorDiameter: 12,
      pitch: 1.75,
      clearanceStep: 0.05,
    });
    expect(figure(metric, 'pitch-diameter').value).toBeCloseTo(10.863, 3);
  });

  it('warns where less than half of the depth is left', () => {
    const loose = checked('petg', { clearanceStep: 0.12 });
    expect(figure(loose, 'least-overlap').value).toBeLessThan(0.5);
    expect(figure(loose, 'least-overlap').verdict).toBe('close-to-limit');
  });

  it('names field, bound and unit of what cannot be made', () => {
    expect(refused({ clearanceStep: 0.2, holes: 8 })[0]).toMatch(/^clearanceStep: .*at most 0\.\d\d mm/);
    expect(refused({ plateThickness: 4 })[0]).toMatch(/^plateThickness: .*at least \d+\.\d\d mm/);
    expect(refused({ majorDiameter: 6, pitch: 6 }).join()).toMatch(/majorDiameter|pitch/);
  });

  it.each(['printed', 'iso-metric', 'trapezoidal', 'knuckle'] as const)(
    'lets the stud stand in every hole and turn along its helix without cutting it (%s)',
    (profile) => {
      const p = values({ profile, marks: 'none', holes: 3, firstClearance: 0.1, clearanceStep: 0.05 });
      clearancesOf(p).forEach((_, at) => {
        expect(shared(p, at)).toBeLessThan(1e-3);
      });
      expect(shared(p, 2, -1.3)).toBeLessThan(1e-3);
    },
  );

  it('cuts the thread when the stud is pushed without turning', () => {
    const p = values({ marks: 'none' });
    let volume = 0;
    host.build((kernel) => {
      const [plate, stud] = ladder.build(p, kernel);
      const pushed = kernel.place(stud!.solid, translation([0, 0, 0.5 * p.pitch]));
      volume = kernel.volume(kernel.intersect([plate!.solid, pushed]));
      return [plate!];
    }, QUALITY.preview);
    expect(volume).toBeGreaterThan(1);
  });

  it('never overlaps as built, at 12 random valid designs', () => {
    fc.assert(
      fc.property(arbitraryParameters(parameters), (p) => {
        expect(shared({ ...p, marks: 'none' }, p.holes - 1)).toBeLessThan(1e-3);
      }),
      { numRuns: 12, seed: 6 },
    );
  });

  it('builds closed solids of the expected volume at 30 random valid designs', async () => {
    await checkFamilySolids(ladder, { runs: 30, seed: 44, volumeError: 2e-3 });
  });
});
