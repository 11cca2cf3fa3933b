import { describe, expect, it } from 'vitest';
import { bundleOfLoop, loopLength, spiralOf, spiralRadius, turnLength } from '@/lib/mechanics/strap';
import { foldingForce, squeezeForce } from '@/lib/mechanics/strap-eye';
import {
  halfTurnBundle,
  halfTurnCurvature,
  halfTurnLength,
  halfTurnStrain,
  halfTurnTwist,
  principalStrain,
  twistStrain,
  WIDEST_HALF_TURN,
} from '@/lib/mechanics/strap-half-turn';
import { bentPegFactor, pegPull, pegSidePull, pulledPegFactor } from '@/lib/mechanics/strap-peg';
import { followStrip, stripFrame } from '@/lib/mechanics/strip-curve';

const frameAt = (curve: ReturnType<typeof followStrip>, s: number) => {
  const out = new Float64Array(12);
  stripFrame(curve, s, out);
  const part = (from: number) => Array.from(out.subarray(from, from + 3));
  return { position: part(0), tangent: part(3), width: part(6), normal: part(9) };
};
const distance = (a: readonly number[], b: readonly number[]) =>
  Math.hypot(...a.map((value, i) => value - b[i]!));

describe('the loop of a strap', () => {
  it('is close to pi times bundle plus two thicknesses', () => {
    expect(loopLength(30, 2) / (Math.PI * 34)).toBeCloseTo(1, 2);
  });

  it('closes on the bundle it was made for', () => {
    for (const [bundle, thickness] of [
      [30, 2],
      [5, 1.2],
      [200, 0.6],
      [12, 4],
    ] as const) {
      expect(bundleOfLoop(loopLength(bundle, thickness), thickness)).toBeCloseTo(bundle, 8);
    }
  });

  it('brings the eye one pitch above the peg, both lying parallel', () => {
    const length = 120;
    const spiral = spiralOf(length, 3);
    expect(turnLength(spiral.start, 3)).toBeCloseTo(length, 9);
    const curve = followStrip(
      -5,
      length + 5,
      0.1,
      (s) => -1 / spiralRadius(spiral, s),
      () => 0,
    );
    const { position, tangent } = frameAt(curve, length);
    const tilt = Math.atan(spiral.growth);
    expect(distance(position, [3 * Math.sin(tilt), 0, 3 * Math.cos(tilt)])).toBeLessThan(0.01);
    expect(distance(tangent, [1, 0, 0])).toBeLessThan(1e-3);
  });
});

describe('the loop with a half turn', () => {
  const length = 200;
  const curve = followStrip(
    0,
    length,
    0.05,
    (s) => halfTurnCurvature(s / length, length),
    (s) => halfTurnTwist(s / length, length),
  );

  it('comes back to the peg, parallel and turned over', () => {
    const { position, tangent, width, normal } = frameAt(curve, length);
    expect(distance(position, [0, 0, 0])).toBeLessThan(1e-4 * length);
    expect(distance(tangent, [1, 0, 0])).toBeLessThan(1e-3);
    expect(distance(width, [0, -1, 0])).toBeLessThan(1e-3);
    expect(distance(normal, [0, 0, -1])).toBeLessThan(1e-3);
  });

  it('stands on edge opposite the peg, pointing at it, without bending there', () => {
    const { position, width } = frameAt(curve, length / 2);
    const inward = position.map((value) => -value / Math.hypot(...position));
    expect(Math.abs(inward.reduce((sum, value, i) => sum + value * width[i]!, 0))).toBeCloseTo(1, 3);
    expect(halfTurnCurvature(0.5, length)).toBeCloseTo(0, 12);
  });

  it('leaves the room for the bundle that its length is made for', () => {
    const [bundle, breadth, thickness] = [40, 10, 1.2];
    const loop = halfTurnLength(bundle, breadth, thickness);
    expect(halfTurnBundle(loop, breadth, thickness)).toBeCloseTo(bundle, 9);
    const own = followStrip(
      0,
      loop,
      0.1,
      (s) => halfTurnCurvature(s / loop, loop),
      (s) => halfTurnTwist(s / loop, loop),
    );
    const far = frameAt(own, loop / 2).position;
    const along = far.map((value) => value / Math.hypot(...far));
    const centre = along.map((value) => (value * (bundle + thickness)) / 2);
    const axis = [0, 1, 0];
    const clear = Array.from({ length: 400 }, (_, i) => {
      const { position, width } = frameAt(own, (loop * i) / 400);
      return [-1, 0, 1].map((side) => {
        const from = position.map((value, k) => value + (side * breadth * width[k]!) / 2 - centre[k]!);
        const up = from.reduce((sum, value, k) => sum + value * axis[k]!, 0);
        return Math.hypot(...from.map((value, k) => value - up * axis[k]!));
      });
    }).flat();
    expect(Math.min(...clear)).toBeGreaterThan(bundle / 2 - 0.02 * bundle);
  });

  it('bends more sharply than a plain ring and twists most opposite the peg', () => {
    const shares = Array.from({ length: 201 }, (_, i) => i / 200);
    const bend = Math.max(...shares.map((s) => Math.abs(halfTurnCurvature(s, length))));
    const turns = shares.map((s) => halfTurnTwist(s, length));
    expect(bend / ((2 * Math.PI) / length)).toBeCloseTo(1.65, 2);
    expect(Math.max(...turns)).toBe(halfTurnTwist(0.5, length));
    expect(Math.max(...turns) / (Math.PI / length)).toBeCloseTo(2.907, 2);
  });

  it('lifts the eye off along the peg, both ends still parallel', () => {
    for (const lift of [1, 4, 8]) {
      const lifted = followStrip(
        0,
        length,
        0.05,
        (s) => halfTurnCurvature(s / length, length, lift),
        (s) => halfTurnTwist(s / length, length, lift),
      );
      const { position, tangent, normal } = frameAt(lifted, length);
      expect(distance(position, [0, 0, lift])).toBeLessThan(0.1 * lift);
      expect(distance(tangent, [1, 0, 0])).toBeLessThan(0.01);
      expect(distance(normal, [0, 0, -1])).toBeLessThan(0.01);
    }
  });

  it('costs less bending and twisting energy than neighbouring closed shapes of the same kind', () => {
    const energy = (curvature: (u: number) => number, twist: (u: number) => number) => {
      let sum = 0;
      for (let i = 0; i < 400; i += 1) {
        const u = (Math.PI * (i + 0.5)) / 400;
        sum += (curvature(u) ** 2 + 1.43 * twist(u) ** 2) * (Math.PI / 400);
      }
      return sum;
    };
    const share = (u: number) => 0.5 + u / (2 * Math.PI);
    const own = energy(
      (u) => halfTurnCurvature(share(u), 2 * Math.PI),
      (u) => halfTurnTwist(share(u), 2 * Math.PI),
    );
    // Two closed shapes found with fewer terms; their loops meet the same closing conditions.
    const fewer = energy(
      (u) => 1.4439 * Math.sin(u / 2) + 0.9283 * Math.sin(1.5 * u),
      (u) => 0.3701 + 0.8761 * Math.cos(u),
    );
    const six = energy(
      (u) => 1.413 * Math.sin(u / 2) + 0.8969 * Math.sin(1.5 * u),
      (u) => 0.398 + 0.8786 * Math.cos(u) + 0.1524 * Math.cos(2 * u),
    );
    expect(own).toBeLessThan(six);
    expect(six).toBeLessThan(fewer);
  });

  it('has no strain figure for a strip too wide to turn over', () => {
    expect(halfTurnStrain(100, 100 * WIDEST_HALF_TURN + 0.1, 1, 0.4)).toBeNull();
    expect(halfTurnStrain(100, 100 * WIDEST_HALF_TURN, 1, 0.4)?.peak).toBeGreaterThan(0);
  });

  it('adds twist to bending: the peak is more than either alone', () => {
    const strain = halfTurnStrain(200, 12, 2, 0.4)!;
    expect(strain.peak).toBeGreaterThan(strain.bending);
    expect(strain.peak).toBeGreaterThan(strain.edge);
    expect(strain.peak).toBeLessThan(strain.bending + strain.edge + strain.shear);
  });
});

describe('a twisted strip', () => {
  it('has edge and middle stretch that leave no pull', () => {
    const { edge, middle } = twistStrain(0.02, 12, 1);
    const steps = 1000;
    let pull = 0;
    for (let i = 0; i < steps; i += 1) {
      const y = -6 + (12 * (i + 0.5)) / steps;
      pull += middle + (0.02 * y) ** 2 / 2;
    }
    expect(pull / steps).toBeCloseTo(0, 8);
    expect(middle + (0.02 * 6) ** 2 / 2).toBeCloseTo(edge, 12);
  });

  it('has half the shear as principal strain when nothing else acts, and the stretch alone without shear', () => {
    expect(principalStrain(0, 0.06, 0.4)).toBeCloseTo(0.03, 12);
    expect(principalStrain(0.02, 0, 0.4)).toBeCloseTo(0.02, 12);
  });
});

describe('a squeezed eye', () => {
  it('folds sooner when the strip is thin, whatever the plastic', () => {
    const eye = { diameter: 6, width: 16, thickness: 2 };
    const ratio = (thickness: number, modulus: number) =>
      squeezeForce({ ...eye, thickness }, 0.3, modulus, 'middle') /
      foldingForce({ ...eye, thickness }, modulus);
    expect(ratio(1, 30)).toBeCloseTo(4 * ratio(2, 30), 9);
    expect(ratio(2, 30)).toBeCloseTo(ratio(2, 2000), 9);
  });

  it('needs more force from a wide grip than from a narrow one', () => {
    const eye = { diameter: 6, width: 16, thickness: 2 };
    const force = (patch: 'narrow' | 'middle' | 'wide') => squeezeForce(eye, 0.3, 30, patch);
    expect(force('narrow')).toBeLessThan(force('middle'));
    expect(force('middle')).toBeLessThan(force('wide'));
  });
});

describe('a peg', () => {
  it('bears more with a larger fillet', () => {
    const pull = (fillet: number) => pegPull({ diameter: 5, fillet }, 0.01, 1000);
    expect(pull(1)).toBeGreaterThan(pull(0.3));
    expect(pulledPegFactor({ diameter: 5, fillet: 0.5 })).toBeCloseTo(2.03, 2);
    expect(bentPegFactor({ diameter: 5, fillet: 0.5 })).toBeCloseTo(1.82, 2);
  });

  it('is limited by shear where the pull acts close to its foot and by bending farther up', () => {
    const peg = { diameter: 6, fillet: 0.6 };
    const near = pegSidePull(peg, 0.1, 0.01, 1000, 0.4);
    expect(near).toBe(pegSidePull(peg, 0.2, 0.01, 1000, 0.4));
    expect(pegSidePull(peg, 10, 0.01, 1000, 0.4)).toBeCloseTo(pegSidePull(peg, 5, 0.01, 1000, 0.4) / 2, 9);
  });
});
