import { describe, expect, it } from 'vitest';
import { tensileStressArea, threadBasics } from '@/lib/mechanics/thread';
import {
  handTorque,
  nutFactorTorque,
  type ScrewContact,
  screwEfficiency,
  torquePerLoad,
} from '@/lib/mechanics/thread-torque';

// T = K F d: M12 of class 8.8 (580 MPa proof) at 70 %, K = 0.2.
describe('nut factor torque', () => {
  it('gives 34.2 kN and 82.1 N m for M12 8.8', () => {
    expect(
      tensileStressArea(threadBasics({ profile: 'iso-metric', majorDiameter: 12, pitch: 1.75, starts: 1 })),
    ).toBeCloseTo(84.3, 1);
    const load = 0.7 * 580 * 84.3;
    expect(Math.abs(load / 34_200 - 1)).toBeLessThan(0.005);
    expect(Math.abs(nutFactorTorque(0.2, load, 12) / 82_100 - 1)).toBeLessThan(0.005);
  });
});

// Shigley, Mechanical Engineering Design: square thread d = 32, P = 4, two starts, f = fc = 0.08, dc = 40, F = 6.4 kN.
describe("Shigley's power screw", () => {
  const screw: ScrewContact = {
    pitchDiameter: 30,
    lead: 8,
    flank: 0,
    friction: 0.08,
    collarRadius: 20,
    collarFriction: 0.08,
  };
  const thread: ScrewContact = { ...screw, collarFriction: 0 };
  const load = 6.4;

  it('needs 26.18 N m to raise, 15.94 of them in the thread', () => {
    expect(Math.abs((load * torquePerLoad(screw, 'closing')) / 26.18 - 1)).toBeLessThan(0.002);
    expect(Math.abs((load * torquePerLoad(thread, 'closing')) / 15.94 - 1)).toBeLessThan(0.002);
  });

  it('needs 9.77 N m to lower: the thread alone would run down', () => {
    expect(Math.abs((load * torquePerLoad(screw, 'opening')) / 9.77 - 1)).toBeLessThan(0.002);
    expect(load * torquePerLoad(thread, 'opening')).toBeCloseTo(-0.466, 2);
  });

  it('lifts with an efficiency of 0.311', () => {
    expect(Math.abs(screwEfficiency(screw) / 0.311 - 1)).toBeLessThan(0.002);
  });
});

// Closure torque guideline tables: 28 mm 12-21 in-lb, 38 mm 17-26 in-lb.
describe('hand closing torque', () => {
  it.each([
    [28, 1.4, 2.4, 12, 21],
    [38, 1.9, 2.9, 17, 26],
  ])('gives the range of the table for %s mm', (size, low, high, lowInch, highInch) => {
    const range = handTorque(size)!;
    expect(Math.abs(range.low / 1000 - low)).toBeLessThan(0.05);
    expect(Math.abs(range.high / 1000 - high)).toBeLessThan(0.05);
    expect(Math.abs(lowInch * 0.112985 - low)).toBeLessThan(0.05);
    expect(Math.abs(highInch * 0.112985 - high)).toBeLessThan(0.05);
  });
});
