import { describe, expect, it } from 'vitest';
import { parseParameters } from '@/generators/parameters';
import screwCap from '@/generators/screw-cap';
import { parameters, type Values } from '@/generators/screw-cap/schema';
import { createKernelHost } from '@/lib/geometry/host';
import { type Placement, QUALITY, type QualityName } from '@/lib/geometry/kernel';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import { gripRise } from '@/lib/geometry/thread-bodies';
import { jointOf } from '@/lib/mechanics/screw-sizes';
import { checkFamilySolids } from '@/tests/support/solids';

const values = (changed: Partial<Values> = {}): Values => {
  const parsed = parseParameters(parameters, { ...parameters.defaults, ...changed });
  if (!parsed.ok) throw new Error(parsed.issues.map(({ message }) => message).join(', '));
  return parsed.values;
};
const host = await createKernelHost();

/** The cap rests on the rim; a micrometre over it, faces that touch share no volume by rounding. */
const OVER_THE_SEAT = 1e-3;

/** The cap turned back and lifted along its thread. */
const unscrewed = (p: Values, turn: number): Placement => {
  const lift = translation([0, 0, jointOf(p).thread.lead * turn + OVER_THE_SEAT]);
  return compose(lift, rotation('z', 2 * Math.PI * turn));
};

/** Common volume of neck and cap in mm3 with the cap moved to each place. */
function common(p: Values, places: readonly Placement[], quality: QualityName): number[] {
  const found: number[] = [];
  host.build((kernel) => {
    const [neck, cap] = screwCap.build(p, kernel);
    for (const at of places) {
      found.push(kernel.volume(kernel.intersect([neck!.solid, kernel.place(cap!.solid, at)])));
    }
    return [neck!];
  }, QUALITY[quality]);
  return found;
}

const TURNS = [0, 0.03, 0.13, 0.34, 0.5, 0.77, 1, 1.6];
const TWO_STARTS = { starts: 2, turns: 0.75, neckHeight: 18, capHeight: 19 } as const;

describe('screw cap: neck and cap together', () => {
  it.each([
    ['printed', {}],
    ['printed, two starts', TWO_STARTS],
    ['printed, three starts', { ...TWO_STARTS, starts: 3, turns: 0.5 }],
    ['iso-metric', { profile: 'iso-metric' }],
    ['trapezoidal', { profile: 'trapezoidal' }],
    ['knuckle', { profile: 'knuckle' }],
    ['knuckle, two starts', { ...TWO_STARTS, profile: 'knuckle', neckHeight: 19 }],
    ['a fine thread without a seal', { majorDiameter: 12, pitch: 1.5, bore: 6, seal: 'none' }],
    ['the widest', { majorDiameter: 110, pitch: 6, bore: 95, neckHeight: 18, capHeight: 20, turns: 1 }],
  ] as const)('turn freely at every angle and do not touch at home: %s', (_, changed) => {
    for (const clearance of [0.05, 0.2]) {
      const p = values({ ...(changed as Partial<Values>), clearance });
      const along = (turns: readonly number[]) => turns.map((turn) => unscrewed(p, turn));
      for (const volume of common(p, along(TURNS), 'preview')) expect(volume).toBeLessThan(1e-6);
      for (const volume of common(p, along([0, 0.37]), 'export')) expect(volume).toBeLessThan(1e-6);
    }
  });

  it('jam when the cap is turned without rising or pulled straight off, so that the thread holds', () => {
    const turned = [0.25, 0.5].map((turn) => rotation('z', 2 * Math.PI * turn));
    const [quarter, half, pulled] = common(values(), [...turned, translation([0, 0, 2])], 'preview');
    expect(Math.min(quarter!, half!)).toBeGreaterThan(1);
    expect(pulled).toBeGreaterThan(10);
  });

  it('overlap at home by the plug and nothing else', () => {
    const p = values({ seal: 'plug' });
    const segments = QUALITY.export.segmentsPerTurn;
    const [volume] = common(p, [unscrewed(p, 0)], 'export');
    const facets = (segments / 2) * Math.sin((2 * Math.PI) / segments);
    const bore = p.bore / 2 / Math.cos(Math.PI / segments);
    const ring = facets * (((p.bore + p.plugInterference) / 2) ** 2 - bore ** 2);
    expect(volume).toBeLessThan(ring * p.plugLength);
    expect(volume).toBeGreaterThan(ring * (p.plugLength - 0.9));
    expect(common(p, [unscrewed(p, 1)], 'export')[0]).toBeLessThan(1e-6);
  });
});

describe('screw cap: bodies', () => {
  it('are closed, of the expected volume and size, at 300 random valid designs', async () => {
    await checkFamilySolids(screwCap, {
      runs: 300,
      seed: 29,
      also: (drawn, bodies, quality) => {
        const p = drawn as Values;
        const { neckForm, capTop, capMouth, cap } = jointOf(p);
        const [neck, lid] = [bodies[0]!.bounds, bodies[1]!.bounds];
        expect(bodies.map(({ name }) => name)).toEqual(['neck', 'cap']);
        expect(neck[2]).toBeCloseTo(-p.flangeThickness, 3);
        expect(neck[5]).toBeCloseTo(p.neckHeight, 3);
        expect(lid[2]).toBeCloseTo(capMouth, 3);
        expect(lid[5]).toBeCloseTo(capTop, 3);
        const reach = Math.max(p.majorDiameter / 2, neckForm[0]![0] + p.flangeWidth);
        const sag = 1 - Math.cos(Math.PI / QUALITY[quality].segmentsPerTurn);
        expect(Math.abs(neck[3] / reach - 1)).toBeLessThanOrEqual(sag + 1e-4);
        const outside = cap.majorDiameter / 2 + p.wall;
        expect(lid[3]).toBeGreaterThan(0.95 * outside);
        expect(lid[3]).toBeLessThan((outside + gripRise(p.grip) + 0.1) / (1 - sag));
      },
    });
  }, 300_000);

  it('have one outline with as many ribs as fit, and a finer knurl', () => {
    const triangles = (grip: Values['grip']) =>
      host.build((kernel) => screwCap.build(values({ grip }), kernel), QUALITY.preview)[1]!.mesh.indices
        .length;
    expect(triangles('ribs')).toBeGreaterThan(triangles('plain'));
  });

  it('put more plastic into a thicker grip', () => {
    const volume = (grip: Values['grip']) => screwCap.volumes(values({ grip }), 32)!.cap!;
    expect(volume('ribs')).toBeGreaterThan(volume('plain'));
    expect(volume('knurl')).toBeGreaterThan(volume('plain'));
  });
});
