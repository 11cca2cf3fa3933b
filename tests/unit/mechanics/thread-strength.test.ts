import { describe, expect, it } from 'vitest';
import { threadBasics } from '@/lib/mechanics/thread';
import {
  axialStrength,
  capSpread,
  strippingAreas,
  threadShare,
  threadShearStrength,
} from '@/lib/mechanics/thread-strength';
import { brittlePlastic, toughPlastic } from '@/tests/support/materials';

const printed = threadBasics({ profile: 'printed', majorDiameter: 30, pitch: 3, starts: 1 });

describe('stripping areas', () => {
  it('shrink as the clearance grows and vanish when the threads no longer meet', () => {
    const areas = [0, 0.1, 0.3, 0.6].map((clearance) => strippingAreas(printed, clearance, 6));
    for (const part of ['external', 'internal'] as const) {
      const sizes = areas.map((area) => area[part]);
      expect(sizes).toEqual([...sizes].sort((a, b) => b - a));
    }
    expect(strippingAreas(printed, 1.1, 6)).toEqual({ external: 0, internal: 0 });
  });

  it('grow in proportion to the engaged length, whatever the starts', () => {
    const double = { ...printed, starts: 2, lead: 6 };
    expect(strippingAreas(double, 0.2, 12).external).toBeCloseTo(
      2 * strippingAreas(printed, 0.2, 6).external,
      9,
    );
  });

  it('equal width times circumference at the crest of the mate for the full printed ridge', () => {
    const crest = (printed.pitch / 2 - (Math.tan(Math.PI / 4) + Math.tan(Math.PI / 6)) * -0.5) as number;
    const { external } = strippingAreas(printed, 0, 3);
    expect(external).toBeCloseTo(Math.PI * printed.minorDiameter * crest, 9);
  });
});

describe('strength between layers', () => {
  it('is the strength across the layers, sheared at 0.577 of it', () => {
    expect(axialStrength(toughPlastic)!.value).toBe(15);
    expect(threadShearStrength(toughPlastic)!.value).toBeCloseTo(0.577 * 15, 9);
  });

  it('is 0.3 of the strength along the layers where nothing else is known, and says so', () => {
    const unknown = { ...brittlePlastic, tensileStrengthAcross: null };
    expect(threadShearStrength(unknown)!.value).toBeCloseTo(0.3 * 52, 9);
    expect(threadShearStrength(unknown)!.source.mark).toBe('common-practice');
  });

  it('is not known without any strength', () => {
    const none = { ...toughPlastic, tensileStrength: null, tensileStrengthAcross: null };
    expect(threadShearStrength(none)).toBeNull();
  });

  it('takes the full section of a moulded part', () => {
    const moulded = { ...toughPlastic, process: 'moulded' as const };
    expect(axialStrength(moulded)!.value).toBe(30);
    expect(threadShare(moulded).value).toBe(1);
    expect(threadShare(toughPlastic)).toEqual({ low: 0.5, value: 0.6, high: 0.7 });
  });
});

describe('spread of a cap', () => {
  it('balances the outward push of the flanks by the hoop pull in the wall', () => {
    const { hoopStrain, growth } = capSpread({
      load: 200,
      flank: Math.PI / 4,
      meanRadius: 16,
      section: 24,
      modulus: 1500,
    });
    const pressurePull = 200 / (2 * Math.PI * 16);
    expect(hoopStrain * 1500 * 24).toBeCloseTo(pressurePull * 16, 9);
    expect(growth).toBeCloseTo(hoopStrain * 16, 12);
  });
});
