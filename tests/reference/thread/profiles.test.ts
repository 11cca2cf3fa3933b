import { describe, expect, it } from 'vitest';
import { type ThreadProfile, tensileStressArea, threadBasics } from '@/lib/mechanics/thread';
import { capOutline, neckOutline } from '@/lib/mechanics/thread-outline';

const thread = (profile: ThreadProfile, majorDiameter: number, pitch: number, starts = 1) =>
  threadBasics({ profile, majorDiameter, pitch, starts });

// ISO 724, coarse series: d, P, d2, D1 (M24 and M30: d2 by the formula of ISO 68-1).
const COARSE = [
  [6, 1, 5.35, 4.917],
  [8, 1.25, 7.188, 6.647],
  [10, 1.5, 9.026, 8.376],
  [12, 1.75, 10.863, 10.106],
  [16, 2, 14.701, 13.835],
  [20, 2.5, 18.376, 17.294],
  [24, 3, 22.051, 20.752],
  [30, 3.5, 27.727, 26.211],
] as const;

describe('ISO 724 metric threads', () => {
  it.each(COARSE)('gives d2 and D1 of M%s x %s as tabled', (d, pitch, d2, D1) => {
    const { pitchDiameter, minorDiameter } = thread('iso-metric', d, pitch);
    expect(Math.abs(pitchDiameter - d2)).toBeLessThanOrEqual(0.001);
    expect(Math.abs(minorDiameter - D1)).toBeLessThanOrEqual(0.001);
  });

  it.each([
    [6, 1, 4.773],
    [8, 1.25, 6.466],
    [10, 1.5, 8.16],
    [12, 1.75, 9.853],
    [16, 2, 13.546],
    [20, 2.5, 16.933],
  ])('gives the bolt root d3 of M%s x %s as tabled', (d, pitch, d3) => {
    expect(Math.abs(thread('iso-metric', d, pitch).rootDiameter - d3)).toBeLessThanOrEqual(0.001);
  });

  it.each([
    [6, 1, 20.1],
    [8, 1.25, 36.6],
    [10, 1.5, 58.0],
    [12, 1.75, 84.3],
    [16, 2, 157],
    [20, 2.5, 245],
    [24, 3, 353],
    [30, 3.5, 561],
  ])('gives the tensile stress area of M%s x %s within 0.3 %%', (d, pitch, area) => {
    expect(Math.abs(tensileStressArea(thread('iso-metric', d, pitch)) / area - 1)).toBeLessThan(0.003);
  });

  // ISO 68-1: H1 = 0.541266 P, flats P/8 on the ridge and P/4 in the cap's crest.
  it('has the flats and the engaged depth of ISO 68-1', () => {
    const basic = thread('iso-metric', 10, 1.5);
    const crest = neckOutline(basic);
    const inner = capOutline(basic, 0);
    expect(basic.engagement).toBeCloseTo(0.541266 * 1.5, 5);
    expect(crest[2]![1] - crest[1]![1]).toBeCloseTo(1.5 / 8, 3);
    expect(inner[2]![1] - inner[1]![1]).toBeCloseTo(1.5 / 4, 3);
  });
});

describe('ISO 2904 trapezoidal threads', () => {
  // Tr8x1.5 to Tr12x3 tabled, the others by the formulas of ISO 2904: d, P, d2, d3, D1, D4.
  it.each([
    [8, 1.5, 7.25, 6.2, 6.5, 8.3],
    [10, 2, 9, 7.5, 8, 10.5],
    [12, 3, 10.5, 8.5, 9, 12.5],
    [16, 4, 14, 11.5, 12, 16.5],
    [20, 4, 18, 15.5, 16, 20.5],
    [24, 5, 21.5, 18.5, 19, 24.5],
    [30, 6, 27, 23, 24, 31],
    [40, 7, 36.5, 32, 33, 41],
  ])('gives d2, d3, D1 and D4 of Tr%s x %s', (d, pitch, d2, d3, D1, D4) => {
    const basic = thread('trapezoidal', d, pitch);
    const sizes = [basic.pitchDiameter, basic.rootDiameter, basic.minorDiameter, basic.internalMajor];
    for (const [at, size] of [d2, d3, D1, D4].entries()) expect(sizes[at]).toBeCloseTo(size, 9);
  });

  it('gives a lead of 18 to Tr60x18(P9)', () => {
    expect(thread('trapezoidal', 60, 9, 2).lead).toBe(18);
  });

  it('has the crest flat of 0.366 P of ISO 2901', () => {
    const crest = neckOutline(thread('trapezoidal', 20, 4));
    expect((crest[2]![1] - crest[1]![1]) / 4).toBeCloseTo(0.366, 3);
  });
});

describe('DIN 405 knuckle threads', () => {
  // diameter, threads per inch, P, d2
  it.each([
    [10, 10, 2.54, 8.73],
    [20, 8, 3.175, 18.412],
    [40, 6, 4.233, 37.883],
    [110, 4, 6.35, 106.825],
  ])('gives the pitch and d2 of Rd %s x 1/%s', (d, perInch, pitch, d2) => {
    const basic = thread('knuckle', d, 25.4 / perInch);
    expect(Math.abs(basic.pitch - pitch)).toBeLessThanOrEqual(0.001);
    expect(Math.abs(basic.pitchDiameter - d2)).toBeLessThanOrEqual(0.001);
  });

  // Radii of the neck 0.23851 P, crest of the cap 0.25597 P (from memory of DIN 405): the crest circle through the
  // last three points of the outline.
  it.each([
    ['neck', 0.23851],
    ['cap', 0.25597],
  ] as const)('rounds the crest of the %s with the radius of the standard', (part, share) => {
    const basic = thread('knuckle', 40, 5);
    const outline = part === 'neck' ? neckOutline(basic) : capOutline(basic, 0);
    const middle = (outline.length - 1) / 2;
    const [top, beside] = [outline[middle]!, outline[middle + 1]!];
    const sag = Math.abs(top[0] - beside[0]);
    const radius = ((beside[1] - top[1]) ** 2 + sag ** 2) / (2 * sag);
    expect(radius / 5).toBeCloseTo(share, 4);
  });
});

describe('our printed profile', () => {
  it('is a third of the pitch deep, with ridge and groove alike on the pitch line', () => {
    const basic = thread('printed', 30, 3);
    const outline = neckOutline(basic);
    expect(basic.engagement).toBeCloseTo(1, 9);
    const half = (at: number) => Math.abs((outline[at]![1] + outline[at === 0 ? 1 : 2]![1]) / 2);
    expect(half(0) + half(3)).toBeCloseTo(1.5, 9);
  });

  it('leans its load flank by 45 degrees and its free flank by 30', () => {
    const [root, crest, upper, end] = neckOutline(thread('printed', 30, 3));
    expect((crest![1] - root![1]) / (crest![0] - root![0])).toBeCloseTo(1, 9);
    expect((end![1] - upper![1]) / (upper![0] - end![0])).toBeCloseTo(Math.tan(Math.PI / 6), 9);
  });
});
