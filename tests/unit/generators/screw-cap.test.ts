import { describe, expect, it } from 'vitest';
import { parseParameters } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import screwCap from '@/generators/screw-cap';
import guide from '@/generators/screw-cap/guide';
import { parameters, type Values } from '@/generators/screw-cap/schema';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';
import { jointOf, plugContact } from '@/lib/mechanics/screw-sizes';
import { linearPlastic, toughPlastic } from '@/tests/support/materials';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const checked = (changed: Partial<Values> = {}, material = toughPlastic, use = DEFAULT_USE): Report =>
  screwCap.check(values(changed), material, use);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const faults = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, { ...parameters.defaults, ...changed });
  return parsed.ok ? [] : parsed.issues.map((issue) => `${issue.field}: ${issue.message}`);
};
const plugged = { seal: 'plug' } as const;

describe('screw cap: figures', () => {
  it('gives every promised figure, each with a source', () => {
    const ids = checked(plugged).figures.map(({ id }) => id);
    expect(ids).toEqual(
      expect.arrayContaining([
        'peak-strain',
        'allowable-strain',
        'seal-strain',
        'pitch-diameter',
        'minor-diameter',
        'engagement-depth',
        'engaged-turns',
        'stripping-load',
        'hand-torque',
        'closing-torque',
        'flank-overhang',
        'self-locking',
        'lead',
      ]),
    );
    expect(new Set(ids).size).toBe(ids.length);
    for (const { id, source, because } of checked(plugged).figures) {
      expect(source.text.length, id).toBeGreaterThan(3);
      expect(because.length, id).toBeGreaterThan(10);
    }
  });

  // ISO 724: M10 x 1.5.
  it('reports the basic sizes of a metric thread whatever the clearance', () => {
    const report = checked({
      profile: 'iso-metric',
      majorDiameter: 10,
      pitch: 1.5,
      clearance: 0.15,
      bore: 4,
    });
    expect(figure(report, 'pitch-diameter').value).toBeCloseTo(9.026, 3);
    expect(figure(report, 'minor-diameter').value).toBeCloseTo(8.376, 3);
    expect(figure(report, 'engagement-depth').handbook).toBeCloseTo(0.541266 * 1.5, 5);
    expect(figure(report, 'engagement-depth').value).toBeCloseTo(0.541266 * 1.5 - 0.15, 5);
  });

  it('loses stripping load to the clearance, and never to a handbook that has none', () => {
    const loads = [0.1, 0.2, 0.4].map((clearance) => figure(checked({ clearance }), 'stripping-load'));
    const [tight, middle, loose] = loads;
    expect(tight!.value!).toBeGreaterThan(middle!.value!);
    expect(middle!.value!).toBeGreaterThan(loose!.value!);
    expect(loose!.handbook).toBeCloseTo(tight!.handbook!, 6);
  });

  it('judges the pull of a firm hand by the weaker of thread and neck', () => {
    const report = checked();
    const weakest = Math.min(figure(report, 'stripping-load').value!, figure(report, 'neck-load').value!);
    expect(figure(report, 'closing-load').limit).toBeCloseTo(weakest, 9);
    expect(figure(report, 'stripping-load').limit).toBeCloseTo(figure(report, 'closing-load').value!, 9);
  });

  it('finds a weak plastic stripped by a firm hand', () => {
    const weak = { ...toughPlastic, tensileStrengthAcross: { ...toughPlastic.tensileStrength!, value: 0.3 } };
    expect(figure(checked({}, weak), 'stripping-load').verdict).toBe('over-limit');
    expect(checked({}, weak).verdict).toBe('over-limit');
    expect(checked({}, weak).governing).toBe('closing-load');
  });

  it('says that the strength is not known, and why', () => {
    const report = checked({}, materialById('tpu-95a')!);
    expect(figure(report, 'stripping-load').value).toBeNull();
    expect(figure(report, 'stripping-load').verdict).toBe('not-known');
    expect(figure(report, 'stripping-load').because).toContain('no strength of TPU');
    const hot = checked({}, toughPlastic, { ...DEFAULT_USE, temperature: 80 });
    expect(figure(hot, 'stripping-load').because).toContain('softens');
    expect(figure(hot, 'neck-load').value).toBeNull();
  });

  it('warns that a soft cap jumps its thread', () => {
    const rubber = linearPlastic(15, 0.48, 0.6);
    expect(figure(checked({}, rubber), 'cap-spread').verdict).toBe('over-limit');
    expect(figure(checked(), 'cap-spread').verdict).toBe('within-limit');
  });

  it('pulls less through more friction', () => {
    const { low, value, high } = figure(checked(), 'closing-load');
    expect(low!).toBeLessThan(value!);
    expect(value!).toBeLessThan(high!);
  });

  it('loses self-locking with steep starts and little friction', () => {
    const slippery = linearPlastic(1500, 0.35, 0.1);
    const steep = { majorDiameter: 12, pitch: 4, starts: 4, bore: 2, neckHeight: 30, capHeight: 30 };
    expect(figure(checked(steep, slippery), 'self-locking').verdict).toBe('over-limit');
    expect(figure(checked({}, slippery), 'self-locking').verdict).toBe('within-limit');
  });

  // Geometry: layer / tan(flank angle), against a line of 0.45 mm.
  it.each([
    ['printed', 0.2, 'within-limit'],
    ['iso-metric', 0.346, 'within-limit'],
    ['trapezoidal', 0.746, 'over-limit'],
  ] as const)('steps out on the %s profile by %s mm a layer: %s', (profile, step, verdict) => {
    const overhang = figure(checked({ profile }), 'flank-overhang');
    expect(overhang.value).toBeCloseTo(step, 3);
    expect(overhang.verdict).toBe(verdict);
    expect(figure(checked({ profile, layerHeight: 0.1 }), 'flank-overhang').verdict).toBe('within-limit');
  });

  it('calls a cap of half a turn close to limit and of less over it', () => {
    const { capHeightNeeded } = jointOf(values({ turns: 0.75 }));
    const turns = (capHeight: number) => figure(checked({ turns: 0.75, capHeight }), 'engaged-turns').verdict;
    expect(figure(checked(), 'engaged-turns').verdict).toBe('within-limit');
    expect(turns(capHeightNeeded)).toBe('close-to-limit');
    expect(turns(capHeightNeeded - 1.2)).toBe('over-limit');
  });

  it('has no torque to bed a seal that is not there', () => {
    expect(figure(checked({ seal: 'none' }), 'closing-torque').value).toBeNull();
    expect(figure(checked({ seal: 'none' }), 'closing-torque').verdict).toBeNull();
    expect(checked({ seal: 'none' }).figures.some(({ id }) => id === 'seal-strain')).toBe(false);
  });
});

describe('screw cap: plug', () => {
  it('shares the interference between neck and plug: less strain than a rigid mate', () => {
    const seal = figure(checked(plugged), 'seal-strain');
    expect(seal.handbook).toBeCloseTo(0.2 / 23, 9);
    expect(seal.value!).toBeLessThan(seal.handbook!);
    expect(seal.value!).toBeGreaterThan(seal.handbook! / 2);
  });

  it('finds a plug too large for a plastic that takes little strain', () => {
    const report = checked({ ...plugged, plugInterference: 0.6 }, materialById('pla')!);
    expect(figure(report, 'peak-strain').verdict).toBe('over-limit');
    expect(report.governing).toBe('peak-strain');
  });

  it('says when a plug drags more than a hand can turn', () => {
    const tight = checked(
      { ...plugged, plugInterference: 0.5, plugLength: 12, plugWall: 3 },
      linearPlastic(3000),
    );
    expect(figure(tight, 'closing-torque').verdict).toBe('over-limit');
    expect(figure(tight, 'closing-load').value!).toBeLessThan(figure(checked(), 'closing-load').value!);
  });

  it('is close to the limit where a light hand does not close it', () => {
    const plain = figure(checked(), 'closing-torque');
    const [low, high] = [figure(checked(), 'hand-torque').low!, figure(checked(), 'hand-torque').high!];
    expect(plain.value!).toBeLessThan(low);
    expect(plain.verdict).toBe('within-limit');
    const rough = { ...toughPlastic, friction: { ...toughPlastic.friction, value: 0.55, high: 0.6 } };
    const firm = figure(checked({}, rough), 'closing-torque');
    expect(firm.value!).toBeGreaterThan(low);
    expect(firm.value!).toBeLessThan(0.85 * high);
    expect(firm.verdict).toBe('close-to-limit');
  });

  it('drags along with its depth', () => {
    const curve = checked(plugged).curves.find(({ id }) => id === 'torque-over-turn')!;
    expect(curve.points[0]).toEqual([0, 0]);
    expect(curve.points.at(-1)![0]).toBeCloseTo(plugContact(values(plugged)) / 4, 9);
    expect(plugContact(values(plugged))).toBeCloseTo(3 - 0.3 - 0.4, 9);
    expect(curve.points.at(-1)![1]).toBeCloseTo(figure(checked(plugged), 'closing-torque').value!, 9);
  });
});

describe('screw cap: curves', () => {
  it('ends the load curve at the pull of a firm hand, inside its band', () => {
    const report = checked();
    const curve = report.curves.find(({ id }) => id === 'load-over-torque')!;
    expect(curve.points.at(-1)![0]).toBeCloseTo(figure(report, 'hand-torque').high!, 9);
    expect(curve.points.at(-1)![1]).toBeCloseTo(figure(report, 'closing-load').value!, 9);
    for (const [at, [, load]] of curve.points.entries()) {
      expect(curve.band![at]![0]).toBeLessThanOrEqual(load);
      expect(curve.band![at]![1]).toBeGreaterThanOrEqual(load);
    }
  });
});

describe('screw cap: input', () => {
  it('names field, bound and unit of impossible threads', () => {
    expect(faults({ bore: 28 })).toEqual([
      'bore: Bore must be at most 26.93 mm, which leaves 1.2 mm of wall under the thread',
    ]);
    expect(faults({ pitch: 1, clearance: 0.3 })).toContainEqual(
      'clearance: Clearance must be at most 0.18 mm for a pitch of 1 mm, or neck and cap hardly touch',
    );
    expect(faults({ neckHeight: 9, capHeight: 11 })).toContainEqual(
      'neckHeight: Neck height must be at least 10.36 mm for 1.25 turns of lead 4 mm',
    );
    expect(faults({ capHeight: 18 })).toEqual([
      'capHeight: Cap height must be at most 16.70 mm, or the mouth meets the flange before the top meets the rim',
    ]);
    expect(faults({ ...plugged, plugLength: 13.1 })).toEqual([
      'plugLength: Plug length must be at most 13.00 mm, so that it ends inside the skirt of the cap',
    ]);
  });

  it('refuses a pitch that the root of the ridge fills', () => {
    const rule = parameters.relations.find(({ id }) => id === 'ridge-in-pitch')!;
    const fine = values({ profile: 'iso-metric', pitch: 0.5 });
    expect(rule.severity).toBe('refuse');
    expect(rule.holds(fine)).toBe(false);
    expect(rule.message(fine)).toBe(
      'Pitch must be at least 0.52 mm, 0.1 mm more than the root of the ridge, or its turns run together',
    );
    expect(rule.holds(values({ profile: 'iso-metric', pitch: 1 }))).toBe(true);
  });

  it('takes the coarse metric series from M6 on as it stands', () => {
    for (const [majorDiameter, pitch] of [
      [6, 1],
      [8, 1.25],
      [10, 1.5],
      [16, 2],
      [30, 3.5],
    ]) {
      expect(faults({ profile: 'iso-metric', majorDiameter, pitch, bore: 2 }), `M${majorDiameter}`).toEqual(
        [],
      );
    }
  });

  it('accepts the bounds it names', () => {
    expect(faults({ bore: 26.93, seal: 'none' })).toEqual([]);
    expect(faults({ capHeight: 16.7 })).toEqual([]);
    expect(faults({ clearance: 0.18, pitch: 1 })).toEqual([]);
  });

  it('opens every starting point, none over its limit', () => {
    expect(screwCap.presets.length).toBeGreaterThanOrEqual(3);
    for (const preset of screwCap.presets) {
      const parsed = parseParameters(parameters, preset.values);
      expect(parsed.ok, preset.id).toBe(true);
      const material = materialById(preset.material)!;
      const { verdict } = screwCap.check(values(preset.values), material, preset.use);
      expect(['within-limit', 'close-to-limit'], preset.id).toContain(verdict);
    }
  });

  it('cautions about food, drinking water and pressure', () => {
    const cautions = guide.cautions.join(' ');
    for (const word of ['Food', 'drinking water', 'pressure', 'licensed practice']) {
      expect(cautions).toContain(word);
    }
  });
});
