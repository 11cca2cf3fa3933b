import { describe, expect, it } from 'vitest';
import { RECOMMENDED_MESH } from '@/lib/fea/mesh/options';
import type { BendingModel } from '@/lib/fea/model';
import type { Profile } from '@/lib/fea/profile/profile';
import { arc, line, type Point, type Segment } from '@/lib/fea/profile/segment';
import { type Cantilever, cantileverModel } from '@/lib/fea/shapes/cantilever';
import { openRingModel } from '@/lib/fea/shapes/open-ring';
import { webModel } from '@/lib/fea/shapes/web';
import { LINEAR, NON_LINEAR } from '@/lib/fea/solve/options';
import type { Solved } from '@/lib/fea/solve/solution';
import { solveBending } from '@/lib/fea/solve/solve-bending';
import { REFERENCE, solved } from '@/tests/support/plane-models';

const HOOK: Cantilever = {
  length: 15,
  thickness: 2,
  tipThickness: 1.5,
  catch: { height: 1.5, land: 0.8, lead: 0.5, back: 1.2 },
  root: { kind: 'base', thickness: 3, span: 20, bottom: true },
  fillets: { front: 0.6, back: 0.6 },
  width: { kind: 'even', width: 6 },
  deflection: 1.5,
};

const bend = (model: BendingModel, options = LINEAR): Solved =>
  solved(solveBending(model, REFERENCE, options));
const last = (solution: Solved) => solution.steps.at(-1)!;

/** The profile under a map that keeps angles: turned by `angle`, scaled, shifted. */
function moved(profile: Profile, angle: number, scale: number, [dx, dy]: Point): Profile {
  const [c, s] = [scale * Math.cos(angle), scale * Math.sin(angle)];
  const to = (x: number, y: number): Point => [c * x - s * y + dx, s * x + c * y + dy];
  const segment = (one: Segment): Segment =>
    one.kind === 'line'
      ? line(to(one.x0, one.y0), to(one.x1, one.y1), one.tag, one.size * scale)
      : arc(to(one.cx, one.cy), one.radius * scale, one.start + angle, one.sweep, one.tag, one.size * scale);
  return { loops: profile.loops.map((loop) => loop.map(segment)) };
}

describe('a solved hook', () => {
  const model = cantileverModel(HOOK);
  const small = bend(model);
  const large = bend(model, NON_LINEAR);

  it('reaches the deflection asked for, in rising steps', () => {
    expect(large.steps.map((step) => step.deflection)).toEqual([0.375, 0.75, 1.125, 1.5]);
    expect(large.steps.map((step) => step.force)).toEqual(
      large.steps.map((step) => step.force).sort((a, b) => a - b),
    );
    expect(large.method).toBe('non-linear');
    expect(large.fellBack).toBeNull();
  });

  it('starts out as stiff as the linear answer', () => {
    const first = bend(cantileverModel({ ...HOOK, deflection: 0.01 }), NON_LINEAR);
    const expected = (last(small).force / 1.5) * 0.01;
    expect(Math.abs(last(first).force / expected - 1)).toBeLessThan(2e-3);
  });

  it('has its peak tension at the front fillet and its compression behind', () => {
    expect(small.tension.place[0]).toBeGreaterThan(1);
    expect(small.tension.place[1]).toBeLessThan(0.6);
    expect(small.compression.place[0]).toBeLessThan(-0.9);
    expect(small.tension.strain).toBeGreaterThan(0);
    expect(small.compression.strain).toBeLessThan(0);
  });

  it('paints the peak with the figure it reports', () => {
    expect(last(small).strain[small.tension.node]).toBeCloseTo(small.tension.strain, 6);
  });

  it('is proportional to the deflection when linear, and its strain does not depend on the modulus', () => {
    const double = bend(cantileverModel({ ...HOOK, deflection: 3 }));
    expect(double.tension.strain).toBeCloseTo(2 * small.tension.strain, 12);
    const stiffer = solved(solveBending(model, { ...REFERENCE, modulus: 3000 }));
    expect(stiffer.tension.strain).toBeCloseTo(small.tension.strain, 10);
    expect(last(stiffer).force).toBeCloseTo(2 * last(small).force, 8);
  });

  it('has a force proportional to the width', () => {
    const wide = bend(cantileverModel({ ...HOOK, width: { kind: 'even', width: 9 } }));
    expect(last(wide).force / last(small).force).toBeCloseTo(1.5, 8);
  });

  it('gives the same bytes when solved again', () => {
    const again = bend(model, NON_LINEAR);
    expect(again.steps).toEqual(large.steps);
    expect(again.tension).toEqual(large.tension);
  });

  it('multiplies force and strain by the factors of the model', () => {
    const factors = [
      { force: 0.9, strain: 1.1, because: 'wide wall' },
      { force: 1, strain: 1.08, because: 'taper' },
    ];
    const corrected = bend({ ...model, factors });
    expect(last(corrected).force).toBeCloseTo(0.9 * last(small).force, 10);
    expect(corrected.tension.strain).toBeCloseTo(1.1 * 1.08 * small.tension.strain, 12);
    expect(last(corrected).strain[small.tension.node]).toBeCloseTo(corrected.tension.strain, 6);
  });

  it('changes little on a finer mesh, within about the error it estimates', () => {
    const fine = bend(model, {
      ...LINEAR,
      mesh: { ...RECOMMENDED_MESH, perRadius: 16, perThickness: 6, growth: 0.25 },
    });
    const change = Math.abs(fine.tension.strain / small.tension.strain - 1);
    expect(change).toBeLessThan(0.01);
    expect(change).toBeLessThan(Math.max(0.005, 2 * small.errorEstimate));
  });
});

describe('invariance', () => {
  const model = cantileverModel(HOOK);
  const upright = bend(model, NON_LINEAR);

  it.each([0.4, Math.PI / 2, 2.8])('gives the same answer when the model is turned by %f rad', (angle) => {
    const turned: BendingModel = {
      ...model,
      profile: moved(model.profile, angle, 1, [40, -7]),
      drive: {
        kind: 'displacement',
        lands: [{ tag: 'land', direction: [-Math.cos(angle), -Math.sin(angle)] }],
        value: 1.5,
      },
    };
    const solution = bend(turned, NON_LINEAR);
    // the mesh is another one, as boxes and buckets are upright
    expect(Math.abs(last(solution).force / last(upright).force - 1)).toBeLessThan(1e-3);
    expect(Math.abs(solution.tension.strain / upright.tension.strain - 1)).toBeLessThan(5e-3);
  });

  it('has the same strain and a force as the square of the size when everything is scaled', () => {
    const scale = 2.5;
    const larger: BendingModel = {
      ...model,
      profile: moved(model.profile, 0, scale, [0, 0]),
      width: { kind: 'even', width: 6 * scale },
      drive: { ...model.drive, value: 1.5 * scale },
    };
    const mesh = { ...RECOMMENDED_MESH, longest: RECOMMENDED_MESH.longest * scale };
    const solution = bend(larger, { ...NON_LINEAR, mesh });
    expect(solution.tension.strain / upright.tension.strain).toBeCloseTo(1, 6);
    expect(last(solution).force / last(upright).force / scale ** 2).toBeCloseTo(1, 6);
  });

  it('gives mirrored strains for a ring solved as half and as a whole', () => {
    const half = openRingModel({
      radius: 6,
      thickness: 1.5,
      opening: 1.6,
      lips: 'cut',
      foot: null,
      width: 5,
      spread: 1,
    });
    const [outer, lip, bore] = half.profile.loops[0]!;
    const angle = lip!.x0 > 0 ? Math.atan2(lip!.y0, lip!.x0) : 0;
    const other = (x: number, y: number): Point => [-x, y];
    const whole: BendingModel = {
      ...half,
      mirrored: false,
      profile: {
        loops: [
          [
            arc([0, 0], outer!.radius, Math.PI - angle, 2 * angle + Math.PI, 'outer'),
            lip!,
            arc([0, 0], bore!.radius, angle, -(Math.PI + 2 * angle), 'bore'),
            line(other(lip!.x1, lip!.y1), other(lip!.x0, lip!.y0), 'left-lip'),
          ],
        ],
      },
      // statically determinate: the lips balance each other, so these carry nothing
      supports: [
        { corner: [0, -6], fix: 'both' },
        { corner: other(lip!.x0, lip!.y0), fix: 'y' },
      ],
      drive: {
        kind: 'displacement',
        lands: [
          { tag: 'lip', direction: [1, 0] },
          { tag: 'left-lip', direction: [-1, 0] },
        ],
        value: 1,
      },
    };
    const [asHalf, asWhole] = [bend(half), bend(whole)];
    expect(Math.abs(last(asWhole).force / last(asHalf).force - 1)).toBeLessThan(1e-3);
    expect(Math.abs(asWhole.tension.strain / asHalf.tension.strain - 1)).toBeLessThan(5e-3);
  });
});

describe('a folded web', () => {
  it('needs a moment that grows with the angle and mirrors when folded the other way', () => {
    const web = (angle: number) =>
      webModel({
        length: 3,
        thickness: 0.4,
        leaf: 2,
        leafLength: 4,
        fillet: 0.3,
        relief: 0.8,
        angle,
        width: 10,
      });
    const up = bend(web(Math.PI / 2), NON_LINEAR);
    const down = bend(web(-Math.PI / 2), NON_LINEAR);
    expect(up.steps).toHaveLength(4);
    expect(last(up).deflection).toBeCloseTo(Math.PI / 2, 12);
    expect(last(down).force / last(up).force).toBeCloseTo(-1, 2);
    expect(down.tension.strain / up.tension.strain).toBeCloseTo(1, 2);
    // E I theta / L for a strip as stiff as plane strain; the ends of the web count for more length
    const strip = (1500 / (1 - 0.35 ** 2)) * ((10 * 0.4 ** 3) / 12) * (Math.PI / 2 / 3);
    expect(last(up).force / strip).toBeGreaterThan(0.9);
    expect(last(up).force / strip).toBeLessThan(1.3);
  });
});

describe('what cannot be solved', () => {
  const model = cantileverModel(HOOK);

  it('refuses a model over the cap and says how large it is', () => {
    const solution = solveBending(model, REFERENCE, { ...LINEAR, mostUnknowns: 500 });
    expect(solution).toEqual({ ok: false, reason: expect.stringMatching(/over the limit of 500/) as string });
  });

  it('refuses a part that nothing holds', () => {
    const loose = { ...model, supports: [] };
    expect(solveBending(loose, REFERENCE)).toEqual({
      ok: false,
      reason: 'the supports do not hold the part',
    });
  });

  it('gives the fault of the profile as the reason', () => {
    const crossed = { loops: [model.profile.loops[0]!.slice(2)] };
    expect(solveBending({ ...model, profile: crossed }, REFERENCE).ok).toBe(false);
  });

  it('falls back to the linear answer, with the reason, when large displacement does not come out', () => {
    const torn = cantileverModel({ ...HOOK, deflection: 60 });
    const solution = bend(torn, { ...NON_LINEAR, steps: 1 });
    expect(solution.method).toBe('linear');
    expect(solution.fellBack).toMatch(/iterations/);
    expect(last(solution).deflection).toBe(60);
  });

  it('throws when a model names an edge that its profile lacks', () => {
    const wrong: BendingModel = { ...model, supports: [{ tag: 'nowhere', fix: 'both' }] };
    expect(() => solveBending(wrong, REFERENCE)).toThrow(/no edge "nowhere"/);
  });
});

describe('dragging a dimension', () => {
  it('moves the peak smoothly: no step off the trend over 0.3 %', () => {
    const peaks = Array.from({ length: 25 }, (_, i) => {
      const moved = cantileverModel({ ...HOOK, thickness: 2 + 0.025 * i });
      return Math.log(bend(moved).tension.strain);
    });
    const steps = peaks.slice(1, -1).map((here, i) => here - (peaks[i]! + peaks[i + 2]!) / 2);
    expect(Math.max(...steps.map(Math.abs))).toBeLessThan(0.003);
  });
});
