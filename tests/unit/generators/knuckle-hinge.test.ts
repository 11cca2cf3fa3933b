import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import hinge from '@/generators/knuckle-hinge';
import { pastFlat } from '@/generators/knuckle-hinge/mechanics';
import { barrelRadius, parameters, type Values } from '@/generators/knuckle-hinge/schema';
import { bedPlacements } from '@/generators/lay-on-bed';
import { parseParameters } from '@/generators/parameters';
import type { Report } from '@/generators/report';
import { createKernelHost } from '@/lib/geometry/host';
import { type Placement, QUALITY } from '@/lib/geometry/kernel';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE, type Use } from '@/lib/materials/types';
import { arbitraryParameters, checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const material = (id: string) => materialById(id)!;
const checked = (id: string, changed: Partial<Values> = {}, use: Use = DEFAULT_USE): Report =>
  hinge.check(values(changed), material(id), use);
const figure = (report: Report, id: string) => report.figures.find((one) => one.id === id)!;
const refused = (changed: Record<string, unknown>) => {
  const parsed = parseParameters(parameters, changed);
  return parsed.ok ? [] : parsed.issues.map(({ field, message }) => `${field}: ${message}`);
};
const host = await createKernelHost();

/** Volume the two leaves share when the bored one is moved, mm3. */
function common(p: Values, move: Placement): number {
  let shared = Number.NaN;
  host.build((kernel) => {
    const [pinned, bored] = hinge.build(p, kernel);
    shared = kernel.volume(kernel.intersect([pinned!.solid, kernel.place(bored!.solid, move)]));
    return [pinned!];
  }, QUALITY.preview);
  return shared;
}

const STILL = translation([0, 0, 0]);
const turnedBy = (p: Values, angle: number): Placement => {
  const up = barrelRadius(p);
  return compose(translation([0, 0, up]), rotation('y', -angle), translation([0, 0, -up]));
};

describe('knuckle hinge: verdicts', () => {
  it('asks a wider gap of PETG than of PLA, as the clearance notes do', () => {
    expect(figure(checked('pla', { gap: 0.25 }), 'gap')).toMatchObject({
      limit: 0.2,
      verdict: 'within-limit',
    });
    expect(figure(checked('petg', { gap: 0.25 }), 'gap')).toMatchObject({
      limit: 0.3,
      verdict: 'over-limit',
    });
  });

  it('warns of knuckles that fuse at a snug gap', () => {
    expect(figure(checked('pla', { gap: 0.1 }), 'gap').because).toMatch(/fuse: the hinge will not turn/);
    expect(figure(checked('pla', { gap: 0.15 }), 'gap').because).toMatch(/may fuse in places/);
  });

  it('puts no gap on a moulded plastic', () => {
    const gap = figure(checked('pom-moulded'), 'gap');
    expect([gap.value, gap.limit, gap.verdict]).toEqual([null, null, 'not-known']);
    expect(gap.because).toMatch(/moulded/);
  });

  it('does not know the pull of a plastic without a strength', () => {
    const capacity = figure(checked('tpu-95a', { gap: 0.4 }), 'pull-capacity');
    expect([capacity.value, capacity.verdict]).toEqual([null, 'not-known']);
    expect(capacity.because).toMatch(/strength of TPU 95A is not known/);
  });

  it('carries less when it is printed standing', () => {
    const pull = (layers: Use['layers']) =>
      figure(checked('petg', {}, { ...DEFAULT_USE, layers }), 'pull-capacity').value!;
    expect(pull('across')).toBeLessThan(pull('along'));
  });

  it('carries its capacity and no more', () => {
    const capacity = figure(checked('petg'), 'pull-capacity').value!;
    const at = (pull: number) => checked('petg', { pull, gap: 0.4 }).verdict;
    expect(at(Math.floor(figure(checked('petg', { gap: 0.4 }), 'pull-capacity').value!))).not.toBe(
      'over-limit',
    );
    expect(at(Math.ceil(capacity) + 5)).toBe('over-limit');
  });

  it('wobbles less the wider it is', () => {
    const play = (hingeWidth: number) => figure(checked('pla', { hingeWidth }), 'play').value!;
    expect(play(80)).toBeLessThan(play(40));
  });

  it('closes leaves of half the barrel almost without a gap', () => {
    expect(figure(checked('pla', { leafThickness: 3.9 }), 'closed-gap').value).toBeCloseTo(0.2, 9);
  });
});

describe('knuckle hinge: input', () => {
  it('names the field and the bound of what cannot be made', () => {
    expect(refused({ knuckles: 4 })[0]).toMatch(/^knuckles: .*odd number/);
    expect(refused({ knuckles: 21 })).toEqual([
      'knuckles: Knuckles must be at most 17 in 40 mm, each 2 mm long',
    ]);
    expect(refused({ pinDiameter: 6 })).toEqual([
      'barrelDiameter: Barrel diameter must be at least 8.6 mm, which leaves 1 mm round the bore',
    ]);
    expect(refused({ leafThickness: 5 })[0]).toMatch(/^leafThickness: .*at most 3.9 mm/);
    expect(refused({ stop: 'flat', leafThickness: 1.2 })[0]).toMatch(/^leafThickness: .*at least 1.5 mm/);
    expect(refused({ leafLength: 8 })[0]).toMatch(/^leafLength: .*at least 9.8 mm/);
    expect(refused({ holeCount: 12 })[0]).toMatch(/^holeCount: .*at most 7/);
  });

  it('opens every preset within its limit', () => {
    for (const preset of hinge.presets) {
      expect(refused(preset.values), preset.id).toEqual([]);
      const report = checked(preset.material, preset.values, preset.use);
      expect(['within-limit', 'close-to-limit'], `${preset.id} ${report.verdict}`).toContain(report.verdict);
    }
  });
});

describe('knuckle hinge: shape', () => {
  it('builds closed solids of the expected volume and size at 200 random valid designs', async () => {
    await checkFamilySolids(hinge, {
      runs: 200,
      seed: 11,
      also: (drawn, [pinned, bored]) => {
        const p = drawn as Values;
        expect(pinned!.bounds[0]).toBeCloseTo(-p.leafLength, 3);
        expect(bored!.bounds[3]).toBeCloseTo(p.leafLength, 3);
        for (const { bounds } of [pinned!, bored!]) {
          expect(bounds[4] - bounds[1]).toBeCloseTo(p.hingeWidth, 3);
          expect(bounds[2]).toBeCloseTo(0, 4);
          expect(Math.abs(bounds[5] - p.barrelDiameter)).toBeLessThan(0.01 * p.barrelDiameter);
        }
      },
    });
  });

  it('leaves the stated gap all round, and no more along and across the pin', () => {
    const draw = fc.property(arbitraryParameters(parameters), (p) => {
      expect(common(p, STILL)).toBe(0);
      const near = 0.98 * p.gap;
      for (let turn = 0; turn < 8; turn += 1) {
        const angle = (turn * Math.PI) / 4;
        const move = translation([near * Math.cos(angle), 0, near * Math.sin(angle)]);
        expect(common(p, move), `${turn}`).toBe(0);
      }
      for (const y of [-near, near]) expect(common(p, translation([0, y, 0]))).toBe(0);
      for (const y of [-1.05 * p.gap, 1.05 * p.gap]) {
        expect(common(p, translation([0, y, 0]))).toBeGreaterThan(0);
      }
      expect(common(p, translation([0, 0, -1.1 * p.gap]))).toBeGreaterThan(0);
    });
    fc.assert(draw, { numRuns: 10, seed: 3 });
  });

  it('turns from its stop to folded shut without touching, and no further', () => {
    const draw = fc.property(arbitraryParameters(parameters), (p) => {
      const stop = pastFlat(p);
      for (const share of [0.25, 0.5, 0.75, 1]) expect(common(p, turnedBy(p, Math.PI * share))).toBe(0);
      for (const share of [0.5, 0.97]) expect(common(p, turnedBy(p, -stop * share)), `${share}`).toBe(0);
      expect(common(p, turnedBy(p, -stop - 0.03))).toBeGreaterThan(0);
    });
    fc.assert(draw, { numRuns: 10, seed: 4 });
  });

  it('goes on the bed as one print, the leaves still in one another', () => {
    const p = values();
    const bodies = host.build((kernel) => hinge.build(p, kernel), QUALITY.preview);
    for (const stance of hinge.stances(p)) {
      const { pinned, bored } = bedPlacements(bodies, stance);
      expect(pinned).toEqual(bored);
    }
  });
});

describe('knuckle hinge: motion', () => {
  it('lays the bored leaf over the pinned one, which stays', () => {
    const p = values();
    const motion = hinge.motion(p, material('pla'));
    const pose = (body: string, point: number[], t: number) => {
      const out = { positions: new Float32Array(3), strain: new Float32Array(1) };
      motion.pose(body, Float32Array.from(point), t, out);
      return [...out.positions];
    };
    expect(pose('pinned', [-10, 2, 1], 1)).toEqual([-10, 2, 1]);
    expect(pose('bored', [10, 2, 1], 0)).toEqual([10, 2, 1]);
    const [x, y, z] = pose('bored', [10, 2, p.leafThickness], 1);
    expect(x).toBeCloseTo(-10, 4);
    expect(y).toBe(2);
    expect(z).toBeCloseTo(p.leafThickness + 2 * (4 - p.leafThickness), 4);
  });
});
