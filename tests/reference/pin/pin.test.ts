import { describe, expect, it } from 'vitest';
import { knuckleTension, meanPinShear, pinBending, pinTilt, ROUND_SHEAR_PEAK } from '@/lib/mechanics/pin';

const joint = { pinDiameter: 4, knuckles: 1, knuckleLength: 10, sideGap: 0.5, wall: 2 };

describe('hinge pin', () => {
  // Textbook clevis in double shear, tau = P / (2 A); from memory of strength-of-materials texts.
  it('is sheared as a clevis pin where one knuckle turns', () => {
    expect(meanPinShear(joint, 100)).toBeCloseTo(100 / (2 * 4 * Math.PI), 9);
    expect(meanPinShear({ ...joint, knuckles: 3 }, 300)).toBeCloseTo(meanPinShear(joint, 100), 9);
  });

  // Shear of a round section: tau = V Q / (I t) at the axis, integrated here strip by strip.
  it('has its peak shear at four thirds of the mean', () => {
    const [r, strips] = [2, 20000];
    let first = 0;
    for (let i = 0; i < strips; i += 1) {
      const y = ((i + 0.5) * r) / strips;
      first += (y * 2 * Math.sqrt(r * r - y * y) * r) / strips;
    }
    const peak = first / (((Math.PI * r ** 4) / 4) * 2 * r);
    expect(peak * Math.PI * r * r).toBeCloseTo(ROUND_SHEAR_PEAK, 5);
  });

  // Beam tables: both ends fixed, even load, moment w L^2 / 12 at the ends (from memory, recomputed: the end slope of a
  // simply supported beam, w L^3 / 24 E I, is turned back by M L / 2 E I).
  it('bends as a beam with fixed ends under an even load', () => {
    const span = 11;
    const load = 60 / span;
    const moment = ((load * span ** 3) / 24 / span) * 2;
    expect(pinBending(joint, 60)).toBeCloseTo(moment / ((Math.PI * 4 ** 3) / 32), 9);
  });

  it('pulls the two walls of its knuckle evenly, and tilts by its gap', () => {
    expect(knuckleTension(joint, 80)).toBe(2);
    expect(pinTilt(0.25, 20)).toBe(0.025);
  });
});
