import { describe, expect, it } from 'vitest';
import { bendingOf, solveRequest } from '@/generators/bend';
import { withComputed } from '@/generators/computed';
import { parseParameters } from '@/generators/parameters';
import rack from '@/generators/rack-strap';
import guide from '@/generators/rack-strap/guide';
import { asPrinted, asStraight, engagement, layoutOf, turnOf } from '@/generators/rack-strap/layout';
import { along, closedLoop, pathOf } from '@/generators/rack-strap/loop';
import { bundleFor, holding, toothShear, wrapOn } from '@/generators/rack-strap/mechanics';
import { closedLength, liftAt } from '@/generators/rack-strap/motion';
import { parameters, type Values } from '@/generators/rack-strap/schema';
import type { Report } from '@/generators/report';
import { solvedMotion } from '@/generators/solved-motion';
import { solveRequested } from '@/lib/fea/solve/request';
import { createKernelHost } from '@/lib/geometry/host';
import { QUALITY } from '@/lib/geometry/kernel';
import { translation } from '@/lib/geometry/placement';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';
import { toothedWrapFactor } from '@/lib/mechanics/toothed-strip';
import { linearPlastic, toughPlastic } from '@/tests/support/materials';
import { checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const STRAIGHT = { printedAs: 'straight' } as const;
const checked = (changed: Partial<Values> = {}, material = toughPlastic): Report =>
  rack.check(values(changed), material, DEFAULT_USE);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};
const host = await createKernelHost();

describe('rack strap: band', () => {
  // exact geometry of a wrapped strip: (t, D) = (1.2, 40), (2, 60), (1.6, 25): 2.913 %, 3.226 %, 6.015 %
  it.each([
    [1.2, 40, 0.02913],
    [2, 60, 0.03226],
    [1.6, 25, 0.06015],
  ])('shows the plain strip %s mm thick on %s mm as handbook figure', (bandThickness, bundle, strain) => {
    expect(wrapOn(values({ bandThickness, anvil: 3 }), bundle).plain).toBeCloseTo(strain, 5);
  });

  it('tends to the plain strip times its teeth round a large bundle, where the head no longer counts', () => {
    const p = values(STRAIGHT);
    const wrap = wrapOn(p, 20_000);
    const teeth = toothedWrapFactor({ core: 1, pitch: 3, valley: 1.2, rootRadius: 0.4 });
    expect(wrap.peak / (wrap.plain * teeth)).toBeCloseTo(1, 2);
  });

  it('strains less printed curved, thinner, or with rounder tooth roots', () => {
    const peak = (changed: Partial<Values>) => wrapOn(values(changed), 60).peak;
    expect(peak({})).toBeLessThan(0.7 * peak(STRAIGHT));
    expect(peak({ bandThickness: 0.9 })).toBeLessThan(peak({}));
    expect(peak({ rootRadius: 0.2 })).toBeGreaterThan(peak({}));
  });

  it('names the bundle on which the limit is met', () => {
    for (const changed of [{}, STRAIGHT]) {
      const p = values(changed);
      expect(wrapOn(p, bundleFor(p, 0.015)).peak).toBeCloseTo(0.015, 9);
    }
  });

  it('does not know the strain of tooth roots sharper than were computed', () => {
    const report = checked({ rootRadius: 0.1, bandThickness: 1.6 });
    expect(figure(report, 'wrap-strain').value).toBeNull();
    expect(figure(report, 'wrap-strain').because).toMatch(/root radii of 0.1 to 0.45/);
    expect(report.verdict).not.toBe('within-limit');
  });
});

describe('rack strap: pawl', () => {
  // Snap-Fit Joints for Plastics - A Design Guide (as quoted): 1.5 h y / l^2 with h 1.6, y 0.75, l 14
  it('shows the guide figure of the lifted pawl', () => {
    expect(engagement(values())).toBeCloseTo(0.75, 9);
    expect(figure(checked(), 'pawl-strain').handbook).toBeCloseTo((1.5 * 1.6 * 0.75) / 14 ** 2, 9);
  });

  it.each([
    ['as it opens', {}],
    ['small fillet', { pawlFillet: 0.4 }],
    ['large fillet', { pawlFillet: 1.6 }],
    ['long', { pawlLength: 20 }],
    ['one tooth, short', { pawlLength: 9, pawlTeeth: 1, pawlThickness: 1.4 }],
    ['under a guard', { release: 'never' }],
  ] as const)('agrees with the plane model within 8 %% in strain and 20 %% in force: %s', (_, changed) => {
    const p = values(changed as Partial<Values>);
    const plane = bendingOf(rack, p, toughPlastic, DEFAULT_USE);
    if ('none' in plane) throw new Error(plane.none);
    const solution = solveRequested(solveRequest(plane, toughPlastic, DEFAULT_USE, 'large'));
    if (!solution.ok) throw new Error(solution.reason);
    const formula = rack.check(p, toughPlastic, DEFAULT_USE);
    const { computed } = withComputed(formula, plane, solution);
    expect(Math.abs(computed.difference!)).toBeLessThan(0.08);
    const force = computed.force! / figure(formula, 'lift-force').value! - 1;
    expect(force).toBeLessThan(0);
    expect(force).toBeGreaterThan(-0.2);
  });

  it('keeps its own motion beside the computed pawl', () => {
    const plane = bendingOf(rack, values(), toughPlastic, DEFAULT_USE);
    if ('none' in plane) throw new Error(plane.none);
    const solution = solveRequested(solveRequest(plane, toughPlastic, DEFAULT_USE, 'small'));
    if (!solution.ok) throw new Error(solution.reason);
    const motion = rack.motion(values(), toughPlastic);
    expect(solvedMotion(motion, plane, solution)).toBe(motion);
  });

  it('locks the band where friction is too large for the ramps', () => {
    const sticky = linearPlastic(1500, 0.35, 1.6);
    const draw = figure(checked({}, sticky), 'draw-force');
    expect([draw.value, draw.verdict]).toEqual([null, 'over-limit']);
    expect(draw.because).toMatch(/^Locks/);
  });

  it('is released more easily by a higher tab, and not at all under a guard', () => {
    const tab = (tabHeight: number) => figure(checked({ tabHeight }), 'release-force').value!;
    expect(tab(10)).toBeLessThan(tab(5));
    const ids = checked({ release: 'never' }).figures.map(({ id }) => id);
    expect(ids).not.toContain('release-force');
  });
});

describe('rack strap: pull', () => {
  it('shears the base of each tooth: 0.577 s b w', () => {
    const { low, value, high } = toothShear(values(), 30, 3);
    const one = 0.577 * 30 * 8 * 1.8;
    expect(low).toBeCloseTo(one, 9);
    expect(value).toBeCloseTo(2 * one, 9);
    expect(high).toBeCloseTo(3 * one, 9);
  });

  it('gives the pull for every count of teeth', () => {
    const curve = checked().curves.find(({ id }) => id === 'pull-over-teeth')!;
    expect(curve.points.map(([teeth]) => teeth)).toEqual([1, 2, 3, 4]);
    expect(curve.points[1]![1]).toBeCloseTo(figure(checked(), 'tooth-load').value!, 9);
  });

  it('tears the core of the band', () => {
    expect(holding(values(), toughPlastic)!.band.value).toBeCloseTo(30 * 8 * 1, 9);
  });

  it('judges the weakest part against three times the intended pull', () => {
    const breaks = figure(checked(), 'break-load');
    const loads = ['tooth-load', 'pawl-load', 'band-load'].map((id) => figure(checked(), id).value!);
    expect(breaks.limit).toBe(30);
    expect(breaks.value).toBe(Math.min(...loads));
    expect(figure(checked({ pull: 100 }), 'break-load').verdict).toBe('over-limit');
  });

  it('does not know what breaks without a strength', () => {
    expect(figure(checked({}, materialById('tpu-95a')!), 'break-load').because).toMatch(
      /no tensile strength/,
    );
  });
});

describe('rack strap: input', () => {
  it('names field, bound and unit of what cannot be made', () => {
    expect(refused({ largestBundle: 50 })).toContainEqual(
      'largestBundle: Largest bundle must be at least the smallest, 60 mm',
    );
    expect(refused({ smallestBundle: 10, pawlLength: 34 })[0]).toMatch(
      /^smallestBundle: Smallest bundle must be at least \d+\.\d\d mm: the head/,
    );
    expect(refused({ rootRadius: 1 })[0]).toMatch(
      /^rootRadius: Tooth root radius must be at most 0\.\d\d mm/,
    );
    expect(refused({ pawlTeeth: 4 })).toEqual([
      'pawlLength: Pawl length must be at least 17.15 mm for 4 teeth of pitch 3 mm',
    ]);
  });

  it('opens every starting point, none over its limit', () => {
    expect(rack.presets.length).toBeGreaterThanOrEqual(3);
    for (const preset of rack.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      const report = rack.check(values(preset.values), materialById(preset.material)!, preset.use);
      const worst = report.figures.filter(({ verdict }) => verdict && verdict !== 'within-limit');
      // no strength of printed TPU was found, so what breaks it is not known
      const fine = preset.material === 'tpu-95a' ? 'not-known' : 'close-to-limit';
      expect(['within-limit', fine], `${preset.id} ${JSON.stringify(worst)}`).toContain(report.verdict);
    }
  });

  it('cautions against lifting, climbing and child safety', () => {
    const cautions = guide.cautions.join(' ');
    for (const word of ['lifting', 'climbing', 'child safety', 'licensed practice']) {
      expect(cautions).toContain(word);
    }
  });
});

const posed = (p: Values, positions: Float32Array, t: number) => {
  const out = {
    positions: new Float32Array(positions.length),
    strain: new Float32Array(positions.length / 3),
  };
  rack.motion(p, toughPlastic).pose('strap', positions, t, out);
  return out;
};

/** Common volume in mm3 of the head and the end of a straight band put through it, home and moved along x by each. */
function common(p: Values, moves: readonly number[]): number[] {
  const { head, anvil } = { ...layoutOf(p), ...p };
  const found: number[] = [];
  host.build((kernel) => {
    const [strap] = rack.build(p, kernel);
    const [start, end] = [closedLength(p, p.smallestBundle), layoutOf(p).band];
    const far = 2 * end;
    const headOnly = kernel.intersect([strap!.solid, kernel.box([far, far, far], [far / 2, 0, 0])]);
    const tail = kernel.intersect([strap!.solid, kernel.box([end, far, far], [-start - end / 2, 0, 0])]);
    const { passageFrom } = layoutOf(p);
    for (const move of moves) {
      const at = translation([head + start + move, anvil, passageFrom + p.clearance]);
      found.push(kernel.volume(kernel.intersect([headOnly, kernel.place(tail, at)])));
    }
    return [strap!];
  }, QUALITY.export);
  return found;
}

const SHAPES = [
  ['with a tab', STRAIGHT],
  ['permanent', { ...STRAIGHT, release: 'never' }],
  ['one fine tooth', { ...STRAIGHT, pitch: 2.4, toothDepth: 0.8, pawlTeeth: 1, rootRadius: 0.3 }],
] as const;

describe('rack strap: bodies', () => {
  it.each(SHAPES)(
    'share nothing when drawn tight, and hold when pulled back by the gap: %s',
    (_, changed) => {
      const p = values(changed as Partial<Values>);
      const [home, pulled, drawn] = common(p, [-1e-3, 0.05, -0.9 * p.pitch]);
      expect(home).toBeLessThan(1e-3);
      expect(pulled).toBeGreaterThan(0.05 * p.bandWidth * (engagement(p) - p.rootRadius));
      expect(drawn).toBeGreaterThan(0.05);
    },
  );

  it('are closed, of the expected volume and size, at 100 random valid designs', async () => {
    await checkFamilySolids(rack, {
      runs: 100,
      seed: 23,
      also: (drawn, bodies) => {
        const p = drawn as Values;
        const { head, band, headTop, entryTop, guardTop, pawlTop } = layoutOf(p);
        const { bounds } = bodies[0]!;
        const top = p.release === 'never' ? guardTop : Math.max(entryTop, pawlTop + p.tabHeight);
        expect(bodies).toHaveLength(1);
        expect(bounds[5] - bounds[2]).toBeCloseTo(headTop, 3);
        expect(bounds[4]).toBeGreaterThanOrEqual(Math.min(top, bounds[4]) - 1e-3);
        if (p.printedAs === 'straight') {
          expect(bounds[0]).toBeCloseTo(-band, 3);
          expect(bounds[3]).toBeCloseTo(head, 3);
          expect(bounds[4]).toBeCloseTo(top, 3);
        }
      },
    });
  }, 90_000);

  it('lie on the bed as one ring that does not meet its own head', () => {
    const p = values();
    const { band, ring } = layoutOf(p);
    const end = asPrinted(p, [-band, 0]);
    expect(end[1]).toBeLessThan(-10);
    expect(asStraight(p, end)[0]).toBeCloseTo(-band, 6);
    expect(band / ring).toBeLessThan(2 * Math.PI * 0.85);
  });
});

describe('rack strap: motion', () => {
  it('closes its loop where the passage begins', () => {
    const [a, b] = closedLoop(200, 20, 2);
    const end = along(pathOf({ length: 200, closed: 1, a, b, printed: 0 }), 200);
    expect(end.x).toBeCloseTo(20, 6);
    expect(end.y).toBeCloseTo(2, 6);
    expect(end.heading).toBeCloseTo(3 * Math.PI, 9);
  });

  it('closes on about the bundle, a tooth home', () => {
    const p = values();
    const { head } = layoutOf(p);
    expect(Math.abs(closedLength(p, 60) + head - turnOf(p, 60))).toBeLessThanOrEqual(p.pitch / 2 + 1e-9);
  });

  it.each([{}, STRAIGHT])('starts as printed and ends with its free end through the head: %j', (changed) => {
    const p = values(changed);
    const { band, head, floor } = layoutOf(p);
    const tip = [...asPrinted(p, [-band, 0]), 0];
    const rest = Float32Array.from([...tip, head / 2, 0, 5]);
    expect([...posed(p, rest, 0).positions]).toEqual([...rest]);
    const { positions } = posed(p, rest, 1);
    expect(positions[0]).toBeCloseTo(head - (band - closedLength(p, p.smallestBundle)), 2);
    expect(positions[1]).toBeCloseTo(floor, 2);
    expect([...positions.slice(3)]).toEqual([...rest.slice(3)]);
  });

  it('keeps the length of the band and passes its rest shape without a jump', () => {
    const p = values();
    const points = [20, 60, 100, 140].map((s) => [...asPrinted(p, [-s, p.bandThickness / 2]), 0]);
    const rest = Float32Array.from(points.flat());
    const early = posed(p, rest, 1e-6).positions;
    for (const [i, value] of rest.entries()) expect(early[i]).toBeCloseTo(value, 1);
  });

  it('strains the tooth roots most, by what the check says', () => {
    const p = values();
    const rest = Float32Array.from([...asPrinted(p, [-80, p.bandThickness]), 4]);
    const motion = rack.motion(p, toughPlastic);
    const strain = posed(p, rest, 1).strain[0]!;
    expect(Math.abs(strain / motion.peakStrain - 1)).toBeLessThan(0.03);
  });

  it('lifts the pawl over a tooth and drops it at each click', () => {
    const p = values();
    expect(liftAt(p, 0)).toBe(0);
    expect(liftAt(p, 0.1)).toBe(0);
    expect(liftAt(p, 0.95)).toBe(1);
    const shares = Array.from({ length: 21 }, (_, i) => liftAt(p, i / 21));
    for (let i = 1; i < shares.length; i += 1) expect(shares[i]!).toBeGreaterThanOrEqual(shares[i - 1]!);
  });

  it('draws dimensions whose ends lie as far apart as they say', () => {
    for (const changed of [{}, STRAIGHT, { release: 'never' as const }]) {
      for (const { field, from, to, value } of rack.callouts(values(changed))) {
        expect(Math.hypot(...from.map((one, at) => one - to[at]!)), field).toBeCloseTo(value, 6);
        expect(value).toBe(values(changed)[field as keyof Values]);
      }
    }
  });
});
