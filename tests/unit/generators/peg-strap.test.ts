import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { parseParameters, warnings } from '@/generators/parameters';
import strap from '@/generators/peg-strap';
import { headOf, stripLayout } from '@/generators/peg-strap/layout';
import { type PegStrap, parameters } from '@/generators/peg-strap/schema';
import type { Figure, Report } from '@/generators/report';
import { MATERIALS, materialById } from '@/lib/materials/data';
import { DEFAULT_USE, type Material } from '@/lib/materials/types';
import { toughPlastic } from '@/tests/support/materials';
import { arbitraryParameters, checkFamilySolids } from '@/tests/support/solids';

const tpu = materialById('tpu-95a')!;
const values = (changed: Partial<PegStrap> = {}): PegStrap => ({ ...parameters.defaults, ...changed });
const checked = (changed: Partial<PegStrap> = {}, material: Material = tpu): Report =>
  strap.check(values(changed), material, DEFAULT_USE);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const figureValue = (id: string, changed: Partial<PegStrap> = {}, material: Material = tpu) =>
  figure(checked(changed, material), id).value;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};

describe('peg strap: strains', () => {
  it.each([
    [1.2, 40, 0.02913],
    [2, 60, 0.03226],
  ])(
    'wraps %s mm on %s mm with a strain of %s (exact geometry)',
    (strapThickness, bundleDiameter, strain) => {
      const report = checked({ strapThickness, bundleDiameter });
      expect(figure(report, 'wrap-strain').value).toBeCloseTo(strain, 5);
      expect(figure(report, 'wrap-strain').handbook).toBeCloseTo(strain, 5);
    },
  );

  it('lets the largest of its strains govern', () => {
    const report = checked();
    const strains = ['wrap-strain', 'eye-bend-strain', 'eye-strain', 'release-strain'];
    const largest = Math.max(...strains.map((id) => figure(report, id).value!));
    expect(figure(report, 'peak-strain').value).toBe(largest);
    expect(report.governing).toBe('peak-strain');
  });

  it('strains less when thinner, on a larger bundle, with a head closer to the eye', () => {
    expect(figureValue('wrap-strain', { strapThickness: 1.2 })).toBeLessThan(figureValue('wrap-strain')!);
    expect(figureValue('wrap-strain', { bundleDiameter: 50 })).toBeLessThan(figureValue('wrap-strain')!);
    expect(figureValue('eye-strain', { headDiameter: 6.2 })).toBeLessThan(figureValue('eye-strain')!);
    expect(figureValue('release-strain', { headDiameter: 6.2 })).toBeLessThan(figureValue('release-strain')!);
  });

  it('strains a crowded eye more than its growth over its diameter', () => {
    const crowded = checked({ eyeDiameter: 11, headDiameter: 11.5, pegDiameter: 8, headLength: 4 });
    expect(figure(crowded, 'eye-strain').handbook).toBeCloseTo(0.5 / 11, 6);
    expect(figure(crowded, 'eye-strain').value).toBeGreaterThan(1.1 * (0.5 / 11));
  });

  it('cracks in a stiff plastic', () => {
    const report = checked({}, materialById('petg')!);
    expect(report.verdict).toBe('over-limit');
    expect(figure(report, 'eye-strain').verdict).toBe('over-limit');
  });

  it('allows the peg, pulled across its layers, half of what the strip may strain', () => {
    expect(figureValue('allowable-strain-peg')).toBeCloseTo(figureValue('allowable-strain')! / 2, 9);
  });
});

describe('peg strap: half turn', () => {
  const turned = { halfTurn: true, strapWidth: 10, eyeDiameter: 4, pegDiameter: 3, headDiameter: 4.3 };

  it('needs a longer strap for the same bundle', () => {
    expect(figureValue('strap-length', turned)).toBeGreaterThan(
      1.2 * figureValue('strap-length', { ...turned, halfTurn: false })!,
    );
    expect(figureValue('smallest-bundle', turned)).toBe(30);
  });

  it('adds a strain of its own, larger in a wider strip', () => {
    const twist = (strapWidth: number) => figureValue('twist-strain', { ...turned, strapWidth })!;
    expect(twist(14)).toBeGreaterThan(twist(10));
    expect(figure(checked({ ...turned, halfTurn: false }), 'peak-strain').value).not.toBeNull();
    expect(checked({ ...turned, halfTurn: false }).figures.map(({ id }) => id)).not.toContain('twist-strain');
  });

  it('does not know the strain of a strip that folds instead of turning over', () => {
    const report = checked({ halfTurn: true, strapWidth: 30 });
    expect(figure(report, 'peak-strain').value).toBeNull();
    expect(figure(report, 'twist-strain').because).toMatch(/folds/);
    expect(report.verdict).toBe('not-known');
    expect(warnings(parameters, values({ halfTurn: true, strapWidth: 30 })).map(({ id }) => id)).toContain(
      'narrow-half-turn',
    );
  });
});

describe('peg strap: forces', () => {
  it('pushes in harder with more undercut, a steeper lead-in, more friction and a thicker strip', () => {
    const push = figureValue('push-in-force')!;
    expect(figureValue('push-in-force', { headDiameter: 6.4 })).toBeGreaterThan(push);
    expect(figureValue('push-in-force', { headLeadAngle: 25 })).toBeGreaterThan(push);
    expect(figureValue('push-in-force', { strapThickness: 2.4 })).toBeGreaterThan(push);
    const { low, high } = figure(checked(), 'push-in-force');
    expect(low!).toBeLessThan(push);
    expect(high!).toBeGreaterThan(push);
  });

  it('puts the finite-element figure above the guide, which is made for tubes', () => {
    const push = figure(checked(), 'push-in-force');
    expect(push.handbook).toBeLessThan(push.value!);
    expect(push.because).toMatch(/long tubes/);
  });

  it('says that a lead-in past self-locking does not slide in', () => {
    const push = figure(checked({ headLeadAngle: 55, headLength: 2.5 }), 'push-in-force');
    expect(push.value).toBeNull();
    expect(push.verdict).toBe('over-limit');
    expect(push.because).toMatch(/Locks/);
  });

  it('holds harder with a steeper back face and does not know the pull-out force once it locks', () => {
    const mild = figureValue('pull-out-force', { headReturnAngle: 30 })!;
    expect(figureValue('pull-out-force', { headReturnAngle: 40 })).toBeGreaterThan(mild);
    const locked = figure(checked({ headReturnAngle: 90 }), 'pull-out-force');
    expect(locked.value).toBeNull();
    expect(locked.because).toMatch(/Squeeze the eye/);
  });

  it('tells which force squeezes it open, from fingertip to pad, or why none does', () => {
    const opens = figure(checked(), 'release-force');
    expect(opens.low!).toBeLessThan(opens.value!);
    expect(opens.value!).toBeLessThan(opens.high!);
    const folds = figure(checked({ strapThickness: 0.8, headDiameter: 6.5 }), 'release-force');
    expect(folds.value).toBeNull();
    expect(folds.because).toMatch(/folds/);
    const stopped = figure(checked({ pegDiameter: 5, headDiameter: 6.5 }), 'release-force');
    expect(stopped.value).toBeNull();
    expect(stopped.because).toMatch(/closes on the neck/);
  });

  it('bears a pull in proportion to the strip left beside the eye', () => {
    const net = (changed: Partial<PegStrap>) => figureValue('net-section-load', changed)!;
    expect(net({ strapWidth: 26 }) / net({ strapWidth: 16 })).toBeCloseTo(2, 9);
    expect(net({ strapThickness: 1 }) / net({ strapThickness: 2 })).toBeCloseTo(0.5, 9);
  });

  // TPU 95A: E eps A with the modulus of the data sheet, common handbook estimate 3.4 MPa at 10 %, less the softening.
  it('loads TPU at 10 % strain with about 3.1 MPa', () => {
    expect(figureValue('net-section-load')! / (10 * 1.8)).toBeCloseTo(3.36 * (1 - 0.067), 1);
  });

  it('tears at the net section times the strength, at a fraction where the plastic is brittle', () => {
    const tear = figure(checked({}, toughPlastic), 'break-load');
    expect(tear.value).toBeCloseTo(30 * 10 * 1.8, 6);
    expect(tear.value! / tear.low!).toBeCloseTo(2 + (1 - 6 / 16) ** 3, 9);
    expect(figureValue('break-load')).toBeNull();
    expect(figure(checked(), 'break-load').because).toMatch(/no tensile strength/);
  });

  it('bears more on a thicker peg', () => {
    expect(figureValue('peg-side-load', { pegDiameter: 5 })).toBeGreaterThan(figureValue('peg-side-load')!);
    expect(figureValue('peg-neck-load', { pegDiameter: 5 })).toBeGreaterThan(figureValue('peg-neck-load')!);
  });

  it('knows no force without a modulus and says so', () => {
    const bare = { ...tpu, tensileModulus: null, flexuralModulus: null };
    for (const id of [
      'push-in-force',
      'pull-out-force',
      'release-force',
      'net-section-load',
      'peg-side-load',
    ]) {
      expect(figureValue(id, {}, bare), id).toBeNull();
      expect(figure(checked({}, bare), id).because, id).toMatch(/Not known/);
    }
  });

  it('knows no force past the strain that the modulus is known to', () => {
    const petg = materialById('petg')!;
    const push = figure(checked({}, petg), 'push-in-force');
    expect(push.value).toBeNull();
    expect(push.verdict).toBe('not-known');
    expect(push.because).toBe(
      'Not known: the strain of 5.15\u202f% is past the 4\u202f% that the modulus of PETG is known to.',
    );
    expect(figureValue('push-in-force', { headDiameter: 6.1 }, petg)).toBeGreaterThan(0);
  });

  it('does not know how an eye is squeezed open that is too small a part of its strip', () => {
    const small = figure(checked({ strapWidth: 32 }), 'release-force');
    expect(small.value).toBeNull();
    expect(small.because).toMatch(/less than a fifth/);
  });

  it('draws the push over travel from nothing over the peak to home', () => {
    const curve = checked().curves.find(({ id }) => id === 'push-in')!;
    expect(curve.points[0]).toEqual([0, 0]);
    expect(curve.points.at(-1)![1]).toBe(0);
    expect(Math.max(...curve.points.map(([, force]) => force))).toBeCloseTo(figureValue('push-in-force')!, 9);
    expect(curve.points.every(([x], i) => i === 0 || x >= curve.points[i - 1]![0])).toBe(true);
  });
});

function expectSound({ id, value, handbook, low, high, limit, because }: Figure) {
  for (const part of [value, handbook, low, high, limit]) {
    if (part !== null) expect(Number.isFinite(part) && part >= 0, id).toBe(true);
  }
  if (value === null) {
    expect(because, id).toMatch(/Not known|Locks/);
    return;
  }
  expect(low ?? value, id).toBeLessThanOrEqual(value);
  expect(high ?? value, id).toBeGreaterThanOrEqual(value);
}

describe('peg strap: any valid design in any plastic', () => {
  const every = fc.property(
    arbitraryParameters(parameters),
    fc.constantFrom(...MATERIALS),
    fc.constantFrom('once', 'sometimes', 'often'),
    (drawn, material, opening) => {
      const report = strap.check(drawn, material, { ...DEFAULT_USE, opening });
      report.figures.forEach(expectSound);
      const points = report.curves.flatMap((curve) => curve.points.flat());
      expect(points.every(Number.isFinite)).toBe(true);
    },
  );

  it('has figures that are finite, or not known with the reason, inside their bands', () => {
    fc.assert(every, { numRuns: 400, seed: 3 });
  });

  it('never strains the eye less than its handbook figure, whatever the shape', () => {
    const dearer = fc.property(arbitraryParameters(parameters), (drawn) => {
      const eye = figure(strap.check(drawn, tpu, DEFAULT_USE), 'eye-strain');
      expect(eye.value!).toBeGreaterThanOrEqual(eye.handbook!);
    });
    fc.assert(dearer, { numRuns: 100, seed: 4 });
  });
});

describe('peg strap: bundles', () => {
  it('takes a third of the pitch more with each further eye', () => {
    const largest = figureValue('largest-bundle', { eyeCount: 2 })!;
    expect((largest - 30) / (10 / Math.PI)).toBeCloseTo(1, 2);
    expect(figureValue('largest-bundle', { eyeCount: 1 })).toBeCloseTo(30, 6);
  });

  it('is one width longer than its last eye and half a width longer than its peg', () => {
    const { from, to, eyes } = stripLayout(values());
    expect(from).toBe(-8);
    expect(to - eyes.at(-1)!).toBe(16);
    expect(figureValue('strap-length')).toBe(to - from);
  });
});

describe('peg strap: input', () => {
  it.each([
    [{ eyeDiameter: 5 }, /^eyeDiameter: Eye diameter must be at least 5.8 mm: Peg diameter plus twice/],
    [{ headDiameter: 6 }, /^headDiameter: Head diameter must be at least 6.1 mm/],
    [{ eyePitch: 6 }, /^eyePitch: Eye pitch must be at least 6.8 mm/],
    [{ strapWidth: 7 }, /^strapWidth: Strap width must be at least 8.57 mm/],
    [{ cornerRadius: 9 }, /^cornerRadius: Corner radius must be at most 8 mm/],
    [{ headLength: 1.5 }, /^headLength: Head length must be at least 2.08 mm/],
    [{ headLength: 12 }, /^headLength: Head length must be at most 11.04 mm/],
    [{ bundleDiameter: 5, strapWidth: 40, eyeCount: 1 }, /^bundleDiameter: .* must lie at least 29.15 mm/],
    [{ eyeCount: 12 }, /^eyeCount: The tail past the first eye is 126 mm long and must be at most/],
    [
      { pegFillet: 2, pegDiameter: 1.5, strapThickness: 1.2 },
      /^pegFillet: Peg fillet must be at most 1.2 mm/,
    ],
    [{ strapWidth: 50 }, /^strapWidth: Strap width must be at most 40 mm/],
    [{ eyeCount: 2.5 }, /^eyeCount: Eyes must be a whole number/],
  ])('refuses %o and names field, bound and unit', (changed, message) => {
    expect(
      refused(changed).some((line) => message.test(line)),
      refused(changed).join('\n'),
    ).toBe(true);
  });

  it('warns of a thin peg, an overhanging head, a stiff strip and a strap too long for the bed', () => {
    const ids = (changed: Partial<PegStrap>) => warnings(parameters, values(changed)).map(({ id }) => id);
    expect(ids({})).toEqual([]);
    expect(ids({ pegDiameter: 2.5 })).toEqual(['peg-prints']);
    expect(ids({ headReturnAngle: 60 })).toEqual(['return-prints']);
    expect(ids({ strapThickness: 5.5 })).toEqual(['thin-for-bundle']);
    expect(ids({ bundleDiameter: 80 })).toEqual(['fits-bed']);
  });

  it('opens every preset within its limit', () => {
    expect(strap.presets.length).toBeGreaterThanOrEqual(3);
    for (const preset of strap.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      const report = strap.check(values(preset.values), materialById(preset.material)!, preset.use);
      expect(['within-limit', 'close-to-limit'], preset.id).toContain(report.verdict);
    }
  });

  it('shows dimensions of fields that exist, with the value the field has', () => {
    for (const { field, value } of strap.callouts(values())) {
      expect(value, field).toBe(values()[field as keyof PegStrap]);
    }
  });
});

describe('peg strap: shape', () => {
  it('builds closed solids of the expected volume and size at 300 random valid designs', async () => {
    await checkFamilySolids(strap, {
      runs: 300,
      seed: 5,
      also: (drawn, bodies) => {
        const p = drawn as PegStrap;
        const { from, to } = stripLayout(p);
        const [minX, minY, minZ, maxX, maxY, maxZ] = bodies[0]!.bounds;
        expect(minX).toBeCloseTo(from, 3);
        expect(maxX).toBeCloseTo(to, 3);
        expect(maxY - minY).toBeCloseTo(p.strapWidth, 3);
        expect(minZ).toBeCloseTo(0, 5);
        expect(maxZ).toBeCloseTo(p.strapThickness + headOf(p).top, 3);
      },
    });
  });
});
