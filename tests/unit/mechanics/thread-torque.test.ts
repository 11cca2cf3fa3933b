import { describe, expect, it } from 'vitest';
import { handTorque, lockingRatio, type ScrewContact, torquePerLoad } from '@/lib/mechanics/thread-torque';

const contact = (changed: Partial<ScrewContact> = {}): ScrewContact => ({
  pitchDiameter: 30,
  lead: 4,
  flank: Math.PI / 4,
  friction: 0.4,
  collarRadius: 0,
  collarFriction: 0,
  ...changed,
});

describe('screw torque', () => {
  it('lifts without loss where there is no friction', () => {
    expect(torquePerLoad(contact({ friction: 0 }), 'closing')).toBeCloseTo(4 / (2 * Math.PI), 9);
    expect(torquePerLoad(contact({ friction: 0 }), 'opening')).toBeCloseTo(-4 / (2 * Math.PI), 9);
  });

  it('needs torque to open exactly where the locking ratio is over one', () => {
    for (const lead of [4, 20, 40, 60]) {
      const screw = contact({ lead, friction: 0.3 });
      expect(torquePerLoad(screw, 'opening') > 0).toBe(lockingRatio(screw) > 1);
    }
  });

  it('adds the rim where it rubs', () => {
    const rim = torquePerLoad(contact({ collarRadius: 13, collarFriction: 0.4 }), 'closing');
    expect(rim - torquePerLoad(contact(), 'closing')).toBeCloseTo(0.4 * 13, 9);
  });

  it('cannot drive a thread steeper than friction lets it climb', () => {
    expect(torquePerLoad(contact({ lead: 200, friction: 0.9 }), 'closing')).toBe(Number.POSITIVE_INFINITY);
  });
});

describe('hand torque', () => {
  it('goes straight from row to row of the table', () => {
    expect(handTorque(28)).toEqual({ low: 1400, high: 2400, tabled: true });
    expect(handTorque(30.5)!.low).toBeCloseTo(1550, 6);
    expect(handTorque(30.5)!.high).toBeCloseTo(2600, 6);
    expect(handTorque(110)!.high).toBeCloseTo(7900, 6);
  });

  it('falls with the diameter under the table and says that it is not tabled', () => {
    expect(handTorque(9)).toEqual({ low: 395, high: 550, tabled: false });
  });

  it('is not known above 110 mm', () => {
    expect(handTorque(111)).toBeNull();
  });

  // Common practice: inch-pounds about the radius in mm.
  it.each([18, 24, 28, 38, 58, 89])('holds the rule of thumb inside the range at %s mm', (size) => {
    const rule = (size / 2) * 112.985;
    const { low, high } = handTorque(size)!;
    expect(rule).toBeGreaterThan(0.85 * low);
    expect(rule).toBeLessThan(1.15 * high);
  });
});
