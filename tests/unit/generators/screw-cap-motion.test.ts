import { describe, expect, it } from 'vitest';
import screwCap from '@/generators/screw-cap';
import { parameters, type Values } from '@/generators/screw-cap/schema';
import { jointOf } from '@/lib/mechanics/screw-sizes';
import { toughPlastic } from '@/tests/support/materials';

const values = (changed: Partial<Values> = {}): Values => ({ ...parameters.defaults, ...changed });
const moved = (body: string, points: number[][], t: number, changed: Partial<Values> = {}) => {
  const rest = Float32Array.from(points.flat());
  const out = { positions: new Float32Array(rest.length), strain: new Float32Array(points.length) };
  screwCap.motion(values(changed), toughPlastic).pose(body, rest, t, out);
  return out;
};
const P = [14, 0, 10];

describe('screw cap: motion', () => {
  it('leaves neck and cap where they are built when screwed home', () => {
    for (const body of ['neck', 'cap']) {
      const { positions, strain } = moved(body, [P], 1);
      for (const [at, value] of P.entries()) expect(positions[at]).toBeCloseTo(value, 5);
      expect(strain[0]).toBe(0);
    }
  });

  it('climbs by the lead in a turn, anticlockwise on the way off', () => {
    const { lead } = jointOf(values()).thread;
    for (const t of [0.35, 0.6, 0.9, 0.99]) {
      const { positions } = moved('cap', [P], t);
      const lift = positions[2]! - P[2]!;
      const turn = lift / lead;
      expect(positions[0]).toBeCloseTo(14 * Math.cos(2 * Math.PI * turn), 3);
      expect(positions[1]).toBeCloseTo(14 * Math.sin(2 * Math.PI * turn), 3);
    }
  });

  it('keeps the shape of the cap all the way', () => {
    const other = [3, -11, 12];
    const apart = Math.hypot(...P.map((value, at) => value - other[at]!));
    for (const t of [0, 0.2, 0.5, 0.8]) {
      const { positions } = moved('cap', [P, other], t);
      const now = Math.hypot(...[0, 1, 2].map((at) => positions[at]! - positions[at + 3]!));
      expect(now).toBeCloseTo(apart, 4);
    }
  });

  it('ends with the mouth of the cap clear of the rim', () => {
    const p = values();
    const { capMouth } = jointOf(p);
    const { positions } = moved('cap', [[14, 0, capMouth]], 0);
    expect(positions[2]).toBeGreaterThan(p.neckHeight + 5);
  });

  it('comes down without a jump', () => {
    const heights = Array.from({ length: 101 }, (_, at) => moved('cap', [P], at / 100).positions[2]!);
    for (let at = 1; at < heights.length; at += 1) {
      expect(heights[at]!).toBeLessThanOrEqual(heights[at - 1]! + 1e-5);
      expect(heights[at - 1]! - heights[at]!).toBeLessThan(1.5);
    }
  });

  it('strains only where a plug is: the neck stretches, the plug is squeezed, both by what they share', () => {
    const seal = { seal: 'plug' } as const;
    const motion = screwCap.motion(values(seal), toughPlastic);
    const neck = moved('neck', [[11.5, 0, 13.5]], 1, seal);
    const plug = moved(
      'cap',
      [
        [11.6, 0, 13.5],
        [10.4, 0, 13.5],
        [18, 0, 13.5],
      ],
      1,
      seal,
    );
    expect(neck.strain[0]!).toBeGreaterThan(0);
    expect(plug.strain[0]!).toBeLessThan(0);
    expect(plug.strain[2]).toBe(0);
    expect(Math.max(neck.strain[0]!, -plug.strain[1]!)).toBeCloseTo(motion.peakStrain, 5);
    expect(11.5 * (1 + neck.strain[0]!)).toBeCloseTo(11.6 * (1 + plug.strain[0]!), 2);
    expect(neck.positions[0]).toBeCloseTo(plug.positions[0]!, 2);
    expect(moved('neck', [[11.5, 0, 13.5]], 0.3, seal).strain[0]).toBe(0);
  });

  it('has no strain to colour without a plug', () => {
    expect(screwCap.motion(values(), toughPlastic).peakStrain).toBe(0);
  });
});

describe('screw cap: callouts and stances', () => {
  it('draws dimensions whose ends lie as far apart as they say', () => {
    for (const { field, from, to, value } of screwCap.callouts(values())) {
      expect(Math.hypot(...from.map((one, at) => one - to[at]!)), field).toBeCloseTo(value, 6);
      expect(value).toBe(values()[field as keyof Values]);
    }
  });

  it('stands both parts with the threads upright, the cap on its top', () => {
    const [best] = screwCap.stances(values());
    expect(best!.layers).toBe('along');
    const cap = best!.orient.cap!;
    expect(cap[10]).toBeCloseTo(-1, 9);
    expect(best!.orient.neck).toBeUndefined();
  });
});
