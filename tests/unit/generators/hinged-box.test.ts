import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import box from '@/generators/hinged-box';
import { boxSolid, catchSolid, lidShell } from '@/generators/hinged-box/geometry';
import {
  armFace,
  axisHeight,
  backOuter,
  bearing,
  boxRim,
  frontOuter,
  halfWidth,
  keeperEdge,
  lidRim,
  tabEnd,
} from '@/generators/hinged-box/layout';
import { arcLean, catchOf } from '@/generators/hinged-box/mechanics';
import { parameters, type Values } from '@/generators/hinged-box/schema';
import { parseParameters } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import { createKernelHost } from '@/lib/geometry/host';
import { type Placement, QUALITY } from '@/lib/geometry/kernel';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE, type Use } from '@/lib/materials/types';
import { wedgeFactor } from '@/lib/mechanics/friction';
import { arbitraryParameters, checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const material = (id: string) => materialById(id)!;
const checked = (id: string, changed: Partial<Values> = {}, use: Use = DEFAULT_USE): Report =>
  box.check(values(changed), material(id), use);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};
const host = await createKernelHost();

/** Lid turned by an angle about the fold, then raised. */
const closedBy = (p: Values, angle: number, raised = 0): Placement => {
  const up = axisHeight(p);
  return compose(translation([0, 0, up + raised]), rotation('y', -angle), translation([0, 0, -up]));
};

/** Volume that the box and the moved lid, with or without its catch, have in common, mm3. */
function common(p: Values, move: Placement, withCatch: boolean): number {
  let shared = Number.NaN;
  host.build((kernel) => {
    const lower = kernel.place(boxSolid(p, kernel), rotation('z', Math.PI));
    const lid = withCatch ? kernel.union([lidShell(p, kernel), catchSolid(p, kernel)]) : lidShell(p, kernel);
    shared = kernel.volume(kernel.intersect([lower, kernel.place(lid, move)]));
    return [{ name: 'box', solid: lower }];
  }, QUALITY.preview);
  return shared;
}

describe('hinged box: verdicts', () => {
  it('judges the web of polypropylene as drawn and that of PETG as over its limit', () => {
    expect(figure(checked('pp'), 'drawn-strain').verdict).toBe('within-limit');
    const petg = checked('petg');
    expect(petg.verdict).toBe('over-limit');
    expect(petg.governing).toBe('peak-strain');
  });

  it('judges the standing catch across the layers, and along them on its side', () => {
    const limit = (layers: Use['layers']) =>
      figure(checked('pp', {}, { ...DEFAULT_USE, layers }), 'catch-strain').limit!;
    const pp = material('pp');
    expect(limit('across') / limit('along')).toBeCloseTo(
      pp.allowableOnce!.value / pp.allowableAcross!.value,
      9,
    );
  });

  it('lets the catch govern where its verdict is worse than that of the web', () => {
    expect(checked('pp', { undercut: 1.6, armFillet: 1 }).governing).toBe('catch-strain');
    expect(checked('pp').governing).toBe('drawn-strain');
  });

  it('closes harder and opens easier than drawn, since the lid swings', () => {
    const report = checked('pp');
    const p = values();
    const lean = arcLean(p);
    expect(lean).toBeGreaterThan(5);
    expect(lean).toBeCloseTo((Math.atan2(axisHeight(p) - keeperEdge(p), armFace(p)) * 180) / Math.PI, 9);
    const force = figure(report, 'deflection-force').value!;
    const mu = material('pp').friction.value;
    expect(figure(report, 'mating-force').value).toBeCloseTo(force * wedgeFactor(mu, 30 + lean), 9);
    expect(figure(report, 'separation-force').value).toBeCloseTo(force * wedgeFactor(mu, 72 - lean), 9);
  });

  it('holds against the spring of the web, or says that it does not', () => {
    const spring = figure(checked('pp'), 'spring-back');
    const moment = figure(checked('pp'), 'fold-moment').value!;
    expect(spring.value).toBeCloseTo(moment / armFace(values()), 9);
    expect(spring.verdict).toBe('within-limit');
    expect(figure(checked('pp', { returnAngle: 30 }), 'spring-back').verdict).toBe('over-limit');
    expect(figure(checked('pp', { returnAngle: 90, armLength: 21 }), 'spring-back')).toMatchObject({
      limit: null,
      verdict: 'within-limit',
    });
  });

  it('does not put a number on a catch that locks', () => {
    const opening = figure(checked('pp', { returnAngle: 90, armLength: 21 }), 'separation-force');
    expect(opening.value).toBeNull();
    expect(opening.because).toMatch(/locks/);
  });

  it('says when the closed walls fold the web too sharply or would tear it', () => {
    const sharp = figure(checked('pp', { webRecess: 0 }), 'drawn-strain');
    expect(sharp.verdict).toBe('over-limit');
    expect(figure(checked('pp', { webRecess: 3 }), 'drawn-strain').verdict).toBe('not-known');
  });

  it('asks a slip fit of the clearance, more in PETG than in polypropylene', () => {
    expect(figure(checked('pp'), 'clearance')).toMatchObject({ limit: 0.2, verdict: 'within-limit' });
    expect(figure(checked('petg'), 'clearance')).toMatchObject({ limit: 0.3, verdict: 'over-limit' });
  });

  it('holds as much as its inside', () => {
    expect(figure(checked('pp'), 'volume').value).toBeCloseTo((60 * 36 * (18 + 8 + 0.2)) / 1000, 9);
  });
});

describe('hinged box: input', () => {
  it('names the field and the bound of what cannot be made', () => {
    expect(refused({ lidHeight: 20 })[0]).toBe(
      'lidHeight: Inside height of the lid must be at most 18 mm, that of the box',
    );
    expect(refused({ wall: 1.2 })[0]).toMatch(/^wall: .*at least 1.5 mm/);
    expect(refused({ armLength: 8 })[0]).toMatch(/^armLength: .*at least \d+\.\d mm to reach a keeper/);
    expect(refused({ armLength: 40 })[0]).toMatch(/^armLength: .*at most \d+\.\d mm/);
    expect(refused({ lipHeight: 3 })).toContainEqual(expect.stringMatching(/^lipHeight: .*at most 0.20 mm/));
    expect(refused({ webFillet: 1.5 })[0]).toMatch(/^webFillet: .*at most 1.20 mm/);
    expect(refused({ armFillet: 2 })[0]).toMatch(/^armFillet: .*at most 1.0 mm/);
    expect(refused({ notchWidth: 30 })[0]).toMatch(/^notchWidth: .*at most \d+\.\d mm/);
  });

  it('takes the arm lengths it names as bounds', () => {
    for (const [asked, word] of [
      [8, 'at least'],
      [40, 'at most'],
    ] as const) {
      const [message] = refused({ armLength: asked });
      const bound = Number(message!.match(new RegExp(`${word} ([0-9.]+) mm`))![1]);
      expect(refused({ armLength: bound }), `${bound}`).toEqual([]);
    }
  });

  it('opens every preset within its limit', () => {
    for (const preset of box.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      const report = checked(preset.material, preset.values, preset.use);
      expect(['within-limit', 'close-to-limit'], `${preset.id} ${report.verdict}`).toContain(report.verdict);
    }
  });
});

describe('hinged box: shape', () => {
  it('builds closed solids of the expected volume and size at 100 random valid designs', async () => {
    await checkFamilySolids(box, {
      runs: 100,
      seed: 17,
      volumeError: 1e-4,
      also: (drawn, bodies) => {
        const p = drawn as Values;
        const [minX, minY, minZ, maxX, maxY] = bodies[0]!.bounds;
        expect(minX).toBeLessThanOrEqual(-frontOuter(p) + 1e-3);
        expect(maxX).toBeCloseTo(tabEnd(p), 3);
        expect(maxY - minY).toBeCloseTo(2 * halfWidth(p), 3);
        expect(minZ).toBeCloseTo(0, 4);
      },
    });
  });

  it('closes without box and lid overlapping, and turns there freely', () => {
    const draw = fc.property(arbitraryParameters(parameters), (p) => {
      expect(common(p, closedBy(p, Math.PI, 1e-3), true), 'closed').toBeLessThan(1e-6);
      for (const share of [0.4, 0.8, 0.9, 0.96, 0.99]) {
        expect(common(p, closedBy(p, Math.PI * share), false), `${share}`).toBeLessThan(1e-6);
      }
    });
    fc.assert(draw, { numRuns: 14, seed: 6 });
  });

  it('is held by its catch once it rises by more than the clearance', () => {
    const draw = fc.property(arbitraryParameters(parameters), (p) => {
      const raised = 1.05 * p.clearance + 0.02;
      expect(common(p, closedBy(p, Math.PI, 0.95 * p.clearance), true)).toBeLessThan(1e-6);
      expect(common(p, closedBy(p, Math.PI, raised), true)).toBeGreaterThan(0);
      expect(common(p, closedBy(p, Math.PI, raised), false)).toBeLessThan(1e-6);
    });
    fc.assert(draw, { numRuns: 10, seed: 8 });
  });

  it('brings the holding face a clearance below the keeper', () => {
    const p = values();
    const faceClosed = 2 * axisHeight(p) - p.floor - bearing(p);
    expect(keeperEdge(p) - faceClosed).toBeCloseTo(p.clearance, 9);
    expect(boxRim(p) + lidRim(p) + p.rimGap).toBeCloseTo(2 * axisHeight(p), 9);
  });
});

describe('hinged box: motion', () => {
  const p = values();
  const motion = box.motion(p, material('pp'));
  const pose = (points: number[][], t: number) => {
    const rest = Float32Array.from(points.flat());
    const out = { positions: new Float32Array(rest.length), strain: new Float32Array(points.length) };
    motion.pose('box', rest, t, out);
    return out;
  };

  it('leaves the box as it is and closes the lid where the design wants it', () => {
    const still = [-20, 5, 3];
    const lid = [frontOuter(p), -5, lidRim(p)];
    const { positions } = pose([still, lid], 1);
    expect([...positions.slice(0, 3)]).toEqual(still.map((value) => expect.closeTo(value, 4)));
    expect([...positions.slice(3)]).toEqual(
      [-frontOuter(p), -5, boxRim(p) + p.rimGap].map((value) => expect.closeTo(value, 3)),
    );
  });

  it('bends the arm by the undercut on its way over the keeper and not once it is home', () => {
    const catchEdge = [armFace(p), 0, p.floor + p.armLength];
    const beside = [armFace(p), 0, p.floor];
    const gap = (t: number) => {
      const { positions: at } = pose([catchEdge, beside], t);
      return Math.hypot(at[0]! - at[3]!, at[2]! - at[5]!);
    };
    const length = p.armLength;
    const most = Math.max(...Array.from({ length: 200 }, (_, i) => gap(i / 199)));
    expect(most).toBeCloseTo(Math.hypot(length, p.undercut), 3);
    expect(gap(1)).toBeCloseTo(length, 3);
    expect(gap(0.5)).toBeCloseTo(length, 3);
  });

  it('paints the web and not the walls it joins', () => {
    const wall = [backOuter(p), 0, 2];
    const middle = [0, 0, axisHeight(p) - p.rimGap / 2 - p.webRecess];
    const { strain } = pose([wall, middle], 1);
    expect(strain[0]).toBe(0);
    expect(Math.abs(strain[1]!)).toBeGreaterThan(0.9 * motion.peakStrain);
  });

  it('never strains more than the larger peak of the check', () => {
    const web = foldStrains();
    expect(web).toBeLessThanOrEqual(motion.peakStrain + 1e-6);
    const root = pose([[armFace(p), 0, p.floor + 1e-3]], 0.9).strain[0]!;
    expect(root).toBeLessThanOrEqual(catchOf(p, material('pp').poisson.value).pushed.peak + 1e-6);
  });

  function foldStrains(): number {
    const points = Array.from({ length: 40 }, (_, i) => [
      backOuter(p) * (i / 20 - 1),
      0,
      axisHeight(p) - p.webRecess,
    ]);
    return Math.max(...pose(points, 1).strain.map(Math.abs));
  }
});
