import { describe, expect, it } from 'vitest';
import hook from '@/generators/cantilever-hook';
import { noseEnd } from '@/generators/cantilever-hook/dimensions';
import { type HookValues, parameters } from '@/generators/cantilever-hook/schema';
import { parseParameters, warnings } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import { createKernelHost } from '@/lib/geometry/host';
import { QUALITY } from '@/lib/geometry/kernel';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE, type Material } from '@/lib/materials/types';
import { brittlePlastic, linearPlastic, toughPlastic } from '@/tests/support/materials';
import { checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<HookValues> = {}): HookValues => ({ ...parameters.defaults, ...changed });
const checked = (changed: Partial<HookValues> = {}, material: Material = toughPlastic): Report =>
  hook.check(values(changed), material, DEFAULT_USE);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const sized = (changed: Partial<HookValues>, id = 'peak-strain') => figure(checked(changed), id).value!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};

describe('cantilever hook: solids', () => {
  it('are closed, of the closed-form volume, and as high and wide as the dimensions say', async () => {
    await checkFamilySolids(hook, {
      runs: 300,
      seed: 20_260,
      volumeError: 1e-6,
      also: (drawn, bodies) => {
        const v = drawn as HookValues;
        const { bounds } = bodies.find((body) => body.name === 'hook')!;
        expect(bounds[5]).toBeGreaterThanOrEqual(noseEnd(v) - 1e-4);
        expect(bounds[4]).toBeCloseTo(-bounds[1], 4);
        expect(bounds[3]).toBeGreaterThanOrEqual(v.undercut - 1e-4);
      },
    });
  });

  it('stand apart by the clearance when closed: hook and window plate do not overlap', async () => {
    const host = await createKernelHost();
    for (const changed of [{}, { root: 'wall' }, { returnAngle: 90 }, { tipWidth: 4 }] as const) {
      host.build((kernel) => {
        const bodies = hook.build(values(changed), kernel);
        const meeting = kernel.intersect(bodies.map((body) => body.solid));
        expect(kernel.volume(meeting), JSON.stringify(changed)).toBe(0);
        return bodies;
      }, QUALITY.preview);
    }
  });
});

describe('cantilever hook: strain', () => {
  it('falls with a longer arm, a thinner root and a smaller undercut', () => {
    expect(sized({ armLength: 24 })).toBeLessThan(sized({}));
    expect(sized({ rootThickness: 1.6 })).toBeLessThan(sized({}));
    expect(sized({ undercut: 0.8 })).toBeLessThan(sized({}));
  });

  it('falls with a thinner tip down to half the root, and with a larger fillet', () => {
    expect(sized({ tipThickness: 1.2 })).toBeLessThan(sized({ tipThickness: 2 }));
    expect(sized({ rootFillet: 1 })).toBeLessThan(sized({ rootFillet: 0.4 }));
  });

  it('is lower on a wall than on a block, and the force too, for the root turns further', () => {
    const wall = { root: 'wall', wallThickness: 2 } as const;
    expect(sized(wall)).toBeLessThan(sized({}));
    expect(sized(wall, 'deflection-force')).toBeLessThan(sized({}, 'deflection-force'));
    expect(sized(wall, 'root-share')).toBeGreaterThan(sized({}, 'root-share'));
  });

  it('moves into the wall where the wall is much thinner than the arm', () => {
    const report = checked({ root: 'wall', wallThickness: 0.9, wallWidth: 8, wallSpan: 24 });
    expect(figure(report, 'peak-strain').value).toBe(figure(report, 'wall-strain').value);
    expect(figure(report, 'peak-strain').because).toMatch(/wall of 0.9 mm bends harder/);
  });

  it('does not depend on the modulus, and the force grows with it', () => {
    const [soft, stiff] = [checked({}, linearPlastic(1000)), checked({}, linearPlastic(2000))];
    expect(figure(stiff, 'peak-strain').value).toBe(figure(soft, 'peak-strain').value);
    expect(figure(stiff, 'deflection-force').value).toBeCloseTo(
      2 * figure(soft, 'deflection-force').value!,
      9,
    );
  });

  it('meets the allowable strain at the permissible undercut', () => {
    const permissible = sized({}, 'permissible-undercut');
    const report = checked({ undercut: permissible });
    expect(figure(report, 'peak-strain').value).toBeCloseTo(figure(report, 'allowable-strain').value!, 6);
  });

  it('is not known where the arm bends by more than half its length', () => {
    const report = checked({ undercut: 9.5, armLength: 18 });
    expect(figure(report, 'peak-strain').value).toBeNull();
    expect(report.verdict).toBe('not-known');
    expect(figure(report, 'deflection-force').because).toMatch(/more than half its length/);
  });

  it('shows the published concentration of a shoulder fillet beside its own (Roark, Table 17.1)', () => {
    const shown = figure(checked({ rootFillet: 1 }), 'fillet-concentration');
    expect(shown.handbook).toBeCloseTo(1.222, 2);
    expect(Math.abs(shown.value! / shown.handbook! - 1)).toBeLessThan(0.08);
  });

  it('is not known at a sharp root, where the force still is', () => {
    const report = checked({ rootFillet: 0 });
    expect(figure(report, 'peak-strain').value).toBeNull();
    expect(figure(report, 'peak-strain').because).toMatch(/sharp root/);
    expect(figure(report, 'permissible-undercut').value).toBeNull();
    expect(figure(report, 'deflection-force').value).toBeGreaterThan(0);
    expect(report.verdict).toBe('not-known');
  });

  it('is taken at the corners of an arm in a panel, and falls with a rounder one', () => {
    const panel = { root: 'panel-slot', wallSpan: 30, wallWidth: 12 } as const;
    expect(figure(checked(panel), 'peak-strain').because).toMatch(/^At the corners/);
    expect(sized({ ...panel, rootFillet: 1.6 })).toBeLessThan(sized({ ...panel, rootFillet: 0.8 }));
    expect(sized({ ...panel, wallSpan: 60 })).toBeLessThan(sized(panel));
  });

  it('is higher up a thin arm than at its root', () => {
    const report = checked({ tipThickness: 0.5, rootFillet: 2 });
    expect(figure(report, 'peak-strain').because).toMatch(/thin part of the arm/);
  });

  it('has no limit where the plastic has none for the use, and says so', () => {
    const report = hook.check(values(), { ...toughPlastic, allowableOnce: null }, DEFAULT_USE);
    expect(report.verdict).toBe('not-known');
    expect(figure(report, 'peak-strain').because).toMatch(/Not known: short-term limit/);
  });
});

describe('cantilever hook: forces', () => {
  it('give the band of the friction around the middle figure', () => {
    const push = figure(checked(), 'mating-force');
    expect(push.low!).toBeLessThan(push.value!);
    expect(push.high!).toBeGreaterThan(push.value!);
  });

  it('have no pull-off figure for a square catch, but the reason', () => {
    const pull = figure(checked({ returnAngle: 90 }), 'separation-force');
    expect(pull.value).toBeNull();
    expect(pull.because).toMatch(/^Locked: at 90°/);
    expect(checked({ returnAngle: 90 }).curves.map((curve) => curve.id)).toEqual(['insertion', 'strain']);
  });

  it('peak on the curve at the mating force', () => {
    const report = checked();
    const push = report.curves.find((curve) => curve.id === 'insertion')!;
    const highest = Math.max(...push.points.map(([, force]) => force));
    expect(highest).toBeCloseTo(figure(report, 'mating-force').value!, 9);
  });

  it('are not known without a modulus; the strain still is', () => {
    const bare: Material = { ...brittlePlastic, flexuralModulus: null, tensileModulus: null };
    const report = checked({}, bare);
    expect(figure(report, 'deflection-force').value).toBeNull();
    expect(figure(report, 'mating-force').value).toBeNull();
    expect(figure(report, 'peak-strain').value).toBeGreaterThan(0);
  });

  // Snap-Fit Joints for Plastics - A Design Guide, example I: polycarbonate, 4 % once, half of it used.
  it('reproduce the design guide: 2 %, 32.5 N, 58.5 N in the handbook column', () => {
    const plastic = linearPlastic(1815, 0.35, 0.6);
    const report = checked(
      {
        armLength: 19,
        rootThickness: 3.28,
        tipThickness: 1.64,
        rootWidth: 9.5,
        tipWidth: 9.5,
        undercut: 2.4,
        leadInAngle: 30,
      },
      plastic,
    );
    expect(figure(report, 'peak-strain').handbook!).toBeCloseTo(0.02, 4);
    expect(figure(report, 'deflection-force').handbook!).toBeCloseTo(32.5, 1);
    expect(Math.abs(figure(report, 'mating-force').handbook! / 58.5 - 1)).toBeLessThanOrEqual(0.005);
  });
});

describe('cantilever hook: input', () => {
  it('names the field, the bound and the unit of what cannot be made', () => {
    expect(refused({ tipThickness: 3 })).toEqual([
      'tipThickness: Tip thickness must be at most the root thickness, 2 mm',
    ]);
    expect(refused({ tipWidth: 9 })[0]).toMatch(/^tipWidth: .*8 mm/);
    expect(refused({ rootFillet: 5 })[0]).toMatch(/^rootFillet: .*4.5 mm/);
    expect(refused({ undercut: 10 })[0]).toMatch(/^undercut: .*9 mm/);
    expect(refused({ clearance: 1.2 })[0]).toMatch(/^clearance: .*0.9 mm/);
    expect(refused({ leadInAngle: 10, undercut: 4 })[0]).toMatch(/^leadInAngle: .*at least 13°.*18 mm/);
    expect(refused({ returnAngle: 20, undercut: 7, leadInAngle: 30 })[0]).toMatch(/^returnAngle: /);
    expect(refused({ baseLength: 4 })[0]).toMatch(/^baseLength: .*at least/);
    expect(refused({ root: 'wall', wallWidth: 6 })[0]).toMatch(/^wallWidth: .*8 mm/);
    expect(refused({ baseThickness: 16 })[0]).toMatch(/^baseThickness: .*mm to fit/);
  });

  it('warns of what can be made but is unwise', () => {
    const warned = (changed: Partial<HookValues>) =>
      warnings(parameters, values(changed)).map((warning) => warning.id);
    expect(warned({})).toEqual([]);
    expect(warned({ tipThickness: 0.8 })).toEqual(['tip-half-the-root']);
    expect(warned({ armLength: 9 })).toEqual(['arm-slender']);
    expect(warned({ baseThickness: 2.5 })).toEqual(['block-is-deep']);
    expect(warned({ landLength: 0.4, returnAngle: 90 })).toEqual(['captive-land']);
    expect(warned({ clearance: 0.6 })).toEqual(['catch-overlaps']);
    expect(warned({ rootWidth: 4, tipWidth: 4 })).toEqual(['width-printable']);
    expect(warned({ rootFillet: 2.4 })).toEqual(['fillet-past-the-known']);
    expect(warned({ rootThickness: 1, tipThickness: 0.6 })).toEqual(['root-printable']);
    expect(warned({ rootFillet: 0.4 })).toEqual(['fillet-worth-having']);
    expect(warned({ returnAngle: 70 })).toEqual(['return-face-decides']);
    expect(warned({ undercut: 2.6 })).toEqual(['small-deflection']);
  });

  it('opens every preset within its limit and without a warning', () => {
    for (const preset of hook.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      expect(warnings(parameters, values(preset.values)), preset.id).toEqual([]);
      const report = hook.check(values(preset.values), materialById(preset.material)!, preset.use);
      expect(['within-limit', 'close-to-limit'], preset.id).toContain(report.verdict);
    }
  });
});
