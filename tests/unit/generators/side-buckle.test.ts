import { describe, expect, it } from 'vitest';
import { bendingOf, solveRequest } from '@/generators/bend';
import { withComputed } from '@/generators/computed';
import { parseParameters } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import buckle from '@/generators/side-buckle';
import guide from '@/generators/side-buckle/guide';
import { entryTravel, layoutOf, squeezeTravel } from '@/generators/side-buckle/layout';
import {
  barStrain,
  buckleStrain,
  fingerReach,
  holding,
  slipReserve,
} from '@/generators/side-buckle/mechanics';
import { parameters, type Values } from '@/generators/side-buckle/schema';
import { solveRequested } from '@/lib/fea/solve/request';
import { createKernelHost } from '@/lib/geometry/host';
import { QUALITY } from '@/lib/geometry/kernel';
import { translation } from '@/lib/geometry/placement';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';
import { linearPlastic, toughPlastic } from '@/tests/support/materials';
import { checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const checked = (changed: Partial<Values> = {}, material = toughPlastic): Report =>
  buckle.check(values(changed), material, DEFAULT_USE);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};
const host = await createKernelHost();

describe('side buckle: arms', () => {
  // Snap-Fit Joints for Plastics - A Design Guide (as quoted): h 2, l 20, y 1.2, constant section: 0.900 %; b 8, E 1700: P 4.080 N
  it('shows the guide figure of an even arm', () => {
    const p = values({
      armLength: 20,
      rootThickness: 2,
      tipThickness: 2,
      barbHeight: 1.5,
      plugThickness: 8,
    });
    expect(entryTravel(p)).toBeCloseTo(1.2, 9);
    expect(buckleStrain(p, 0.35).entry.handbook).toBeCloseTo(0.009, 9);
    const push = figure(buckle.check(p, linearPlastic(1700, 0.35, 0.5), DEFAULT_USE), 'mating-force');
    const slope = Math.tan((p.leadInAngle * Math.PI) / 180);
    expect(push.handbook).toBeCloseTo((2 * 4.08 * (0.5 + slope)) / (1 - 0.5 * slope), 3);
  });

  it('strains more when squeezed to the stop than when pushed in, and less with a closer stop', () => {
    const { entry, squeeze } = buckleStrain(values(), 0.4);
    expect(squeeze.peak).toBeGreaterThan(entry.peak);
    expect(buckleStrain(values({ overtravel: 0.2 }), 0.4).squeeze.peak).toBeLessThan(squeeze.peak);
  });

  it('moves the edge of the barb by the squeeze when the finger presses the middle of the pad', () => {
    const p = values({ rootThickness: 2.4, tipThickness: 2.4 });
    const { bent, flexible } = buckleStrain(p, 0.4).squeeze;
    expect(flexible.arm.length).toBe(fingerReach(p));
    const station = bent.along.findIndex((at) => at >= p.armLength);
    expect(Math.abs(bent.y[station]! / squeezeTravel(p) - 1)).toBeLessThan(0.05);
  });

  it.each([
    ['as it opens', {}],
    ['with a small fillet', { rootFillet: 0.7 }],
    ['with a large fillet', { rootFillet: 2.6 }],
    ['short', { armLength: 24 }],
    ['even', { tipThickness: 2.8 }],
    ['wide and thin', { webbingWidth: 50, rootThickness: 2, tipThickness: 1, rootFillet: 1 }],
  ] as const)('agrees with the plane model within 8 %% in strain and 16 %% in force: %s', (_, changed) => {
    const p = values(changed as Partial<Values>);
    const plane = bendingOf(buckle, p, toughPlastic, DEFAULT_USE);
    if ('none' in plane) throw new Error(plane.none);
    const solution = solveRequested(solveRequest(plane, toughPlastic, DEFAULT_USE, 'large'));
    if (!solution.ok) throw new Error(solution.reason);
    const formula = buckle.check(p, toughPlastic, DEFAULT_USE);
    const { computed } = withComputed(formula, plane, solution);
    expect(computed.kind).toBe('compression');
    expect(Math.abs(computed.difference!)).toBeLessThan(0.08);
    const force = computed.force! / figure(formula, 'squeeze-force').value! - 1;
    expect(force).toBeLessThan(0);
    expect(force).toBeGreaterThan(-0.16);
  });
});

describe('side buckle: pull', () => {
  // F w / 8 over b h^2 / 6: 40 N, 20 mm, bar 4 x 6 mm, doubled by the ladder-lock: M 200 N mm, Z 16 mm3, 12.5 MPa
  it('bends the bar like a beam under even load', () => {
    const steel = linearPlastic(2000);
    expect(barStrain(values(), steel)).toBeCloseTo(12.5 / 2000, 9);
    expect(barStrain(values({ ladderLock: false }), steel)).toBeCloseTo(6.25 / 2000, 9);
    const { bar } = holding(values(), toughPlastic)!;
    expect(bar.value).toBeCloseTo((40 * 30) / 12.5, 6);
    expect(bar.builtIn / bar.value).toBeCloseTo(1.5, 9);
  });

  it('pulls an arm straight where the wall holds it in its middle line', () => {
    const p = values({ clearance: 0.1, barbHeight: 0.9, tipThickness: 2.8 });
    const area = p.tipThickness * p.plugThickness;
    const offset = p.tipThickness / 2 + 0.1 + 0.4;
    const strength = toughPlastic.tensileStrength!.value;
    expect(holding(p, toughPlastic)!.arm).toBeCloseTo(
      (2 * strength * area) / (1 + (6 * offset) / p.tipThickness),
      6,
    );
  });

  it('names the weakest part and judges it against three times the intended pull', () => {
    const breaks = figure(checked(), 'break-load');
    expect(breaks.limit).toBe(120);
    const loads = ['barb-shear-load', 'bearing-load', 'arm-load', 'bar-load'].map(
      (id) => figure(checked(), id).value!,
    );
    expect(breaks.value).toBe(Math.min(...loads));
    expect(figure(checked({ pull: 200 }), 'break-load').verdict).toBe('over-limit');
    expect(figure(checked({ barWidth: 2.5 }), 'break-load').because).toMatch(/bar under the webbing/);
  });

  it('slips out where friction is small against the lever of the pull', () => {
    expect(slipReserve(values(), 0.2)).toBeGreaterThan(1);
    const slippery = linearPlastic(1500, 0.35, 0.04);
    expect(figure(checked({}, slippery), 'slip-reserve').verdict).toBe('over-limit');
  });

  it('does not know what breaks without a strength, or past the heat limit', () => {
    const hot = buckle.check(values(), toughPlastic, { ...DEFAULT_USE, temperature: 80 });
    expect(figure(hot, 'break-load').value).toBeNull();
    expect(figure(hot, 'break-load').because).toContain('softens');
    expect(figure(checked({}, materialById('tpu-95a')!), 'break-load').because).toMatch(
      /no tensile strength/,
    );
  });

  it('does not know the strain of arms too short for their thickness', () => {
    const report = checked({ armLength: 12, rootThickness: 3.2, barbHeight: 1.6 });
    expect(figure(report, 'peak-strain').value).toBeNull();
    expect(figure(report, 'squeeze-force').because).toMatch(/shorter than 4 thicknesses/);
  });
});

describe('side buckle: input', () => {
  it('names field, bound and unit of what cannot be made', () => {
    expect(refused({ webbingWidth: 10, barbHeight: 4 })[0]).toMatch(
      /^webbingWidth: Webbing width must be at least \d+\.\d\d mm: the arms move in by/,
    );
    expect(refused({ tipThickness: 3 })).toContainEqual(
      'tipThickness: Tip thickness must be at most the root thickness, 2.8 mm',
    );
    expect(refused({ sideWall: 4.5 })).toContainEqual(
      'sideWall: Side wall must be at most the bar width, 4 mm',
    );
  });

  it('accepts the webbing it names', () => {
    const [message] = refused({ webbingWidth: 10, barbHeight: 3.4 });
    const webbingWidth = Number(/least (\d+\.\d\d)/.exec(message!)![1]);
    expect(refused({ webbingWidth, barbHeight: 3.4 })).toEqual([]);
  });

  it('opens every starting point, none over its limit', () => {
    expect(buckle.presets.length).toBeGreaterThanOrEqual(3);
    for (const preset of buckle.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      const report = buckle.check(values(preset.values), materialById(preset.material)!, preset.use);
      const worst = report.figures.filter(({ verdict }) => verdict && verdict !== 'within-limit');
      expect(['within-limit', 'close-to-limit'], `${preset.id} ${JSON.stringify(worst)}`).toContain(
        report.verdict,
      );
    }
  });

  it('cautions against lifting, climbing and child safety', () => {
    const cautions = guide.cautions.join(' ');
    for (const word of ['lifting', 'climbing', 'child safety', 'licensed practice']) {
      expect(cautions).toContain(word);
    }
  });
});

/** Common volume in mm3 of the plug, its arms squeezed by a share of the stop, and the housing moved along x. */
function common(p: Values, squeezed: number, along: readonly number[]): number[] {
  const found: number[] = [];
  const motion = buckle.motion(p, toughPlastic);
  const [built] = host.build((kernel) => buckle.build(p, kernel), QUALITY.export);
  const { positions, indices } = built!.mesh;
  const out = {
    positions: new Float32Array(positions.length),
    strain: new Float32Array(positions.length / 3),
  };
  motion.pose('plug', positions, squeezed, out);
  host.build((kernel) => {
    const plug = kernel.fromMesh({ positions: out.positions, indices });
    const housing = buckle.build(p, kernel)[1]!.solid;
    for (const x of along) {
      found.push(kernel.volume(kernel.intersect([plug, kernel.place(housing, translation([x, 0, 0]))])));
    }
    return [{ name: 'plug', solid: plug }];
  }, QUALITY.export);
  return found;
}

const SHAPES = [
  ['as it opens', {}],
  ['wide', { webbingWidth: 40, barWidth: 8, armLength: 50 }],
  ['without a ladder-lock', { ladderLock: false, clearance: 0.1 }],
] as const;

describe('side buckle: bodies', () => {
  it.each(SHAPES)(
    'touch at the shoulder, hold behind the wall and share nothing when locked: %s',
    (_, changed) => {
      const p = values(changed as Partial<Values>);
      const [locked, further, pulled] = common(p, 0, [1e-3, -0.02, p.clearance + 0.05]);
      expect(locked).toBeLessThan(1e-6);
      expect(further).toBeGreaterThan(0.01);
      expect(pulled).toBeGreaterThan(0.3);
    },
  );

  it.each(SHAPES)('come apart when both pads are squeezed to the rail: %s', (_, changed) => {
    const p = values(changed as Partial<Values>);
    const { nose } = layoutOf(p);
    for (const volume of common(p, 1, [0.01, 2, nose / 2, nose])) expect(volume).toBeLessThan(0.05);
  });

  it('are closed, of the expected volume and size, at 120 random valid designs', async () => {
    await checkFamilySolids(buckle, {
      runs: 120,
      seed: 17,
      also: (drawn, bodies) => {
        const p = drawn as Values;
        const { plugEnd, nose, arm, half, housingEnd, housingTop } = layoutOf(p);
        const [plug, housing] = [bodies[0]!.bounds, bodies[1]!.bounds];
        expect(plug[0]).toBeCloseTo(plugEnd, 3);
        expect(plug[3]).toBeCloseTo(nose, 3);
        expect(plug[4]).toBeCloseTo(Math.max(half, arm + p.barbHeight), 3);
        expect(plug[5] - plug[2]).toBeCloseTo(p.plugThickness, 3);
        expect(housing[0]).toBeCloseTo(0, 3);
        expect(housing[3]).toBeCloseTo(housingEnd, 3);
        expect(housing[4]).toBeCloseTo(half, 3);
        expect(housing[5]).toBeCloseTo(housingTop, 3);
      },
    });
  }, 60_000);
});

describe('side buckle: motion', () => {
  it('squeezes both arms alike, then draws the housing off', () => {
    const p = values();
    const { edge, arm, nose } = layoutOf(p);
    const motion = buckle.motion(p, toughPlastic);
    const rest = Float32Array.of(edge, arm, 0, edge, -arm, 0, -2, 5, 0);
    const posed = (body: string, t: number) => {
      const out = { positions: new Float32Array(9), strain: new Float32Array(3) };
      motion.pose(body, rest, t, out);
      return out;
    };
    const { positions, strain } = posed('plug', 1);
    expect(positions[1]! - arm).toBeCloseTo(-squeezeTravel(p), 0);
    expect(positions[4]).toBeCloseTo(-positions[1]!, 6);
    expect([...positions.slice(6)]).toEqual([-2, 5, 0]);
    expect(strain[2]).toBe(0);
    expect(posed('housing', 0.5).positions[0]).toBe(rest[0]);
    expect(posed('housing', 1).positions[0]! - edge).toBeGreaterThan(nose);
  });

  it('draws dimensions whose ends lie as far apart as they say', () => {
    for (const { field, from, to, value } of buckle.callouts(values())) {
      expect(Math.hypot(...from.map((one, at) => one - to[at]!)), field).toBeCloseTo(value, 6);
      expect(value).toBe(values()[field as keyof Values]);
    }
  });
});
