import { describe, expect, it } from 'vitest';
import { threadBasics } from '@/lib/mechanics/thread';
import { strippingAreas } from '@/lib/mechanics/thread-strength';

const metric = (majorDiameter: number, pitch: number) =>
  threadBasics({ profile: 'iso-metric', majorDiameter, pitch, starts: 1 });

describe('FED-STD-H28 stripping areas', () => {
  it.each([
    [10, 1.5, 10, 197.4, 274.86],
    [20, 2.5, 20, 814.8, 1099.6],
  ])('gives both areas of M%s x %s over %s mm at basic sizes', (d, pitch, length, external, internal) => {
    const areas = strippingAreas(metric(d, pitch), 0, length);
    expect(Math.abs(areas.external / external - 1)).toBeLessThan(1e-3);
    expect(Math.abs(areas.internal / internal - 1)).toBeLessThan(1e-3);
  });

  it('reduces to the shortcuts 0.750 pi D1 Le and 0.875 pi d Le', () => {
    const thread = metric(10, 1.5);
    const areas = strippingAreas(thread, 0, 10);
    expect(areas.external / (Math.PI * thread.minorDiameter * 10)).toBeCloseTo(0.7502, 3);
    expect(areas.internal / (Math.PI * 10 * 10)).toBeCloseTo(0.8749, 3);
  });
});
