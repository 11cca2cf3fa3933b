import { describe, expect, it } from 'vitest';
import { type ThreadProfile, threadBasics } from '@/lib/mechanics/thread';
import { capHangingSide, neckHangingSide, sidewaysStep } from '@/lib/mechanics/thread-outline';

const thread = (profile: ThreadProfile) => threadBasics({ profile, majorDiameter: 40, pitch: 6, starts: 1 });

// Geometry: a flank at an angle b from the plane square to the axis steps out by layer / tan b a layer.
describe('sideways step of a flank printed with its axis upright, 0.2 mm layers', () => {
  it.each([
    ['iso-metric', 0.346],
    ['trapezoidal', 0.746],
    ['printed', 0.2],
  ] as const)('is as geometry gives it for the %s profile, on neck and cap', (profile, step) => {
    expect(Math.abs(sidewaysStep(neckHangingSide(thread(profile)), 0.2) - step)).toBeLessThanOrEqual(0.001);
    expect(Math.abs(sidewaysStep(capHangingSide(thread(profile), 0.1), 0.2) - step)).toBeLessThanOrEqual(
      0.001,
    );
  });
});
