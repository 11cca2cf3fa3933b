import { describe, expect, it } from 'vitest';
import {
  capRidgeWidth,
  internalThread,
  neckRidgeWidth,
  type ThreadProfile,
  threadBasics,
  trapezoidalCrestClearance,
} from '@/lib/mechanics/thread';
import { capOutline, neckHangingSide, neckOutline, sidewaysStep } from '@/lib/mechanics/thread-outline';

const PROFILES: ThreadProfile[] = ['iso-metric', 'trapezoidal', 'knuckle', 'printed'];
const thread = (profile: ThreadProfile, pitch = 4) =>
  threadBasics({ profile, majorDiameter: 32, pitch, starts: 1 });

describe('thread forms', () => {
  it.each(PROFILES)('make ridge and groove alike on the pitch line: %s', (profile) => {
    const basic = thread(profile);
    expect(neckRidgeWidth(basic, basic.pitchDiameter / 2)).toBeCloseTo(2, 9);
    expect(capRidgeWidth(basic, 0, basic.pitchDiameter / 2)).toBeCloseTo(2, 9);
  });

  it.each(PROFILES)('leave the clearance free at crest, root and along the axis: %s', (profile) => {
    const basic = thread(profile);
    const neck = neckOutline(basic);
    const cap = capOutline(basic, 0.2);
    const neckRadii = neck.map(([radius]) => radius);
    const capRadii = cap.map(([radius]) => radius);
    expect(Math.min(...capRadii) - Math.max(Math.min(...neckRadii), basic.minorDiameter / 2)).toBeGreaterThan(
      0.1,
    );
    expect(Math.min(...capRadii)).toBeCloseTo(basic.minorDiameter / 2 + 0.2, 9);
    expect(Math.max(...capRadii)).toBeGreaterThanOrEqual(Math.max(...neckRadii) + 0.2 - 1e-9);
    const radius = basic.pitchDiameter / 2;
    expect(4 - neckRidgeWidth(basic, radius) - capRidgeWidth(basic, 0.2, radius)).toBeCloseTo(0.4, 9);
  });

  it.each(PROFILES)('run from the lower root over the crest to the upper root: %s', (profile) => {
    for (const outline of [neckOutline(thread(profile)), capOutline(thread(profile), 0.1)]) {
      const heights = outline.map(([, height]) => height);
      expect(heights).toEqual([...heights].sort((a, b) => a - b));
      expect(heights.at(-1)! - heights[0]!).toBeLessThan(4);
      expect(outline[0]![0]).toBeCloseTo(outline.at(-1)![0], 9);
    }
  });

  it('open the cap by twice the clearance and its pitch diameter by what the flank gap is worth', () => {
    const cap = internalThread(thread('iso-metric'), 0.2);
    expect(cap.minorDiameter - thread('iso-metric').minorDiameter).toBeCloseTo(0.4, 9);
    expect(cap.pitchDiameter - thread('iso-metric').pitchDiameter).toBeCloseTo(
      0.8 / (2 * Math.tan(Math.PI / 6)),
      9,
    );
  });

  // Axial gap 2 c at the pitch line is c radially at 45 degrees on both flanks.
  it('agrees with a purely radial clearance where both flanks stand at 45 degrees', () => {
    const both = { ...thread('printed'), freeFlank: Math.PI / 4 };
    expect(internalThread(both, 0.3).pitchDiameter - both.pitchDiameter).toBeCloseTo(0.6, 9);
  });

  it('steps the crest clearance of trapezoidal threads with the pitch', () => {
    expect([1.5, 2, 5, 6, 12, 14].map(trapezoidalCrestClearance)).toEqual([0.15, 0.25, 0.25, 0.5, 0.5, 1]);
  });

  it('never steps out further in a layer than the ridge is deep', () => {
    const small = threadBasics({ profile: 'trapezoidal', majorDiameter: 12, pitch: 1, starts: 1 });
    const depth = (small.majorDiameter - small.rootDiameter) / 2;
    expect(sidewaysStep(neckHangingSide(small), 0.4)).toBeCloseTo(depth, 9);
  });

  it('finds the flattest place of a round flank: more than a round crest alone, less than the flank drawn on', () => {
    const step = sidewaysStep(neckHangingSide(thread('knuckle')), 0.2);
    expect(step).toBeGreaterThan(0.5);
    expect(step).toBeLessThan(0.2 / Math.tan(Math.PI / 12));
  });
});
