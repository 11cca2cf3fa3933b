import { describe, expect, it } from 'vitest';
import {
  boreCompliance,
  borePressure,
  decayLength,
  hoopStress,
  radialStress,
  ringShare,
  tubeRadialForce,
} from '@/lib/mechanics/ring';

const ring = { inner: 3, outer: 6 };

describe('a flat thick ring (Lame, plane stress)', () => {
  it('bears 5/3 of the pressure as hoop stress at the bore when twice as wide as its bore (Timoshenko, thick cylinders)', () => {
    expect(hoopStress(ring, 1, 3)).toBeCloseTo(5 / 3, 12);
    expect(hoopStress(ring, 1, 6)).toBeCloseTo(2 / 3, 12);
  });

  it('carries the pressure at the bore and nothing at the rim', () => {
    expect(radialStress(ring, 1, 3)).toBeCloseTo(-1, 12);
    expect(radialStress(ring, 1, 6)).toBeCloseTo(0, 12);
  });

  it('holds half the ring in balance: hoop stress over the wall equals pressure over the bore', () => {
    const steps = 2000;
    let sum = 0;
    for (let at = 0; at < steps; at += 1) sum += hoopStress(ring, 1, 3 + (3 * (at + 0.5)) / steps);
    expect((sum * 3) / steps).toBeCloseTo(3, 5);
  });

  it('tends to p r/t and to growth p r^2/(E t) as the wall thins', () => {
    const thin = { inner: 100, outer: 100.1 };
    expect(hoopStress(thin, 1, 100.05)).toBeCloseTo(1000, -1);
    expect(borePressure(thin, 0.1, 1000, 0.3) / (0.001 * 1000 * 0.001)).toBeCloseTo(1, 2);
  });

  it('tends to a hole in an endless plate, u = p a (1 + nu)/E, as the ring widens', () => {
    expect(boreCompliance({ inner: 1, outer: 1e4 }, 0.35)).toBeCloseTo(1.35, 6);
  });

  it('leaves nearly all the interference to a thin ring and shares it with the peg in a wide one', () => {
    expect(ringShare({ inner: 100, outer: 100.5 }, 0.35)).toBeGreaterThan(0.99);
    expect(ringShare({ inner: 1, outer: 1e4 }, 0.35)).toBeCloseTo(1.35 / 2, 6);
  });
});

describe('a tube loaded on a band of its bore', () => {
  const tube = { bore: 10, wall: 1, modulus: 1500, poisson: 0.35, fromEnd: 40 };

  it('resists about four times as much far from its end as at the end, less the local give (Hetenyi)', () => {
    const ratio = tubeRadialForce(tube, 0.2) / tubeRadialForce({ ...tube, fromEnd: 0.1 }, 0.2);
    expect(ratio).toBeGreaterThan(3);
    expect(ratio).toBeLessThan(4);
  });

  it('forgets its end within a few decay lengths', () => {
    const far = tubeRadialForce({ ...tube, fromEnd: 8 * decayLength(tube) }, 0.2);
    expect(tubeRadialForce(tube, 0.2) / far).toBeCloseTo(1, 4);
  });

  it('takes twice the force for twice the growth', () => {
    expect(tubeRadialForce(tube, 0.4) / tubeRadialForce(tube, 0.2)).toBeCloseTo(2, 12);
  });
});
