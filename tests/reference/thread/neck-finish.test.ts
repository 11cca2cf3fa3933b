import { describe, expect, it } from 'vitest';
import screwCap from '@/generators/screw-cap';
import { parameters, type Values } from '@/generators/screw-cap/schema';
import { jointOf } from '@/lib/mechanics/screw-sizes';

const INCH = 25.4;
// SPI neck finish 28-400: thread diameter T, root diameter E, height H, thread start S, least bore I.
const FINISH = {
  T: [1.068 * INCH, 1.088 * INCH],
  E: [0.974 * INCH, 0.994 * INCH],
  H: [0.385 * INCH, 0.415 * INCH],
  S: [0.79, 1.55],
  I: 15.6,
  pitch: INCH / 6,
} as const;

describe('SPI neck finish 28-400', () => {
  it('lists the same sizes in inches and in mm', () => {
    expect(FINISH.T.map((size) => size.toFixed(2))).toEqual(['27.13', '27.64']);
    expect(FINISH.E.map((size) => size.toFixed(2))).toEqual(['24.74', '25.25']);
    expect(FINISH.pitch).toBeCloseTo(4.233, 3);
    expect((FINISH.T[1] - FINISH.E[1]) / 2).toBeCloseTo(1.194, 3);
  });

  it('is met by the neck of the bottle-finish starting point', () => {
    const preset = screwCap.presets.find(({ id }) => id === 'bottle-finish-28-400')!;
    const p: Values = { ...parameters.defaults, ...preset.values };
    const { thread, rimGap } = jointOf(p);
    const within = (value: number, [low, high]: readonly [number, number] | readonly number[]) => {
      expect(value).toBeGreaterThanOrEqual(low! - 0.01);
      expect(value).toBeLessThanOrEqual(high! + 0.01);
    };
    within(thread.majorDiameter, FINISH.T);
    within(thread.rootDiameter, FINISH.E);
    within(p.neckHeight, FINISH.H);
    within(rimGap, FINISH.S);
    expect(thread.pitch).toBeCloseTo(FINISH.pitch, 2);
    expect(p.turns).toBe(1);
    expect(p.bore).toBeGreaterThanOrEqual(FINISH.I);
  });
});
