import { expect, it } from 'vitest';
import { allowableStrain } from '@/lib/materials/allowable';
import { materialById } from '@/lib/materials/data';
import { withOverrides } from '@/lib/materials/overrides';
import { secantModulus } from '@/lib/materials/secant';

const pc = materialById('pc-moulded')!;

it('leaves the plastic as it is when nothing is given', () => {
  expect(withOverrides(pc, {})).toEqual(pc);
});

it('takes a given secant modulus as it stands at every strain', () => {
  const given = withOverrides(pc, { secantModulus: 1815 });
  expect(secantModulus(given, 0.005)?.value).toBe(1815);
  expect(secantModulus(given, 0.05)).toEqual({ value: 1815, inRange: true });
  expect(given.secant.source.mark).toBe('given');
});

it('puts a band of +- 50 % round a single friction figure and keeps a band that is given', () => {
  expect(withOverrides(pc, { friction: 0.6 }).friction).toMatchObject({ low: 0.3, value: 0.6 });
  expect(withOverrides(pc, { friction: 0.6 }).friction.high).toBeCloseTo(0.9, 12);
  const band = { value: 0.6, low: 0.55, high: 0.7 };
  expect(withOverrides(pc, { friction: band }).friction).toMatchObject({
    ...band,
    source: { mark: 'given' },
  });
});

it('takes a given allowable strain as final, whatever the use, the layers and the heat', () => {
  const given = withOverrides(materialById('pla')!, { allowableStrain: 0.02 });
  const { value, factors } = allowableStrain(given, { opening: 'often', layers: 'across', temperature: 90 });
  expect(value).toBe(0.02);
  expect(factors.map((factor) => factor.value)).toEqual([0.02, 1, 1, 1]);
  expect(factors.every((factor) => factor.source.mark === 'given')).toBe(true);
});
