import { describe, expect, it } from 'vitest';
import { allowableStrain, serviceLimit } from '@/lib/materials/allowable';
import { materialById } from '@/lib/materials/data';
import type { Use } from '@/lib/materials/types';
import { toughPlastic } from '../../support/materials';

const use = (part: Partial<Use> = {}): Use => ({
  opening: 'often',
  layers: 'along',
  temperature: 23,
  ...part,
});
const plastic = (id: string) => materialById(id)!;
const factor = (id: string, part: Partial<Use>) =>
  allowableStrain(plastic(id), use(part)).factors.find((one) => one.id === 'temperature')!;

describe('allowable strain', () => {
  it('is the product of its four factors, each with a source', () => {
    const { value, factors } = allowableStrain(toughPlastic, use({ layers: 'across' }));
    expect(factors.map((one) => one.id)).toEqual(['short-term', 'use', 'layers', 'temperature']);
    expect(value).toBeCloseTo(0.03 * 0.6 * (0.008 / 0.03), 12);
    for (const one of factors) expect(one.source.text).not.toBe('');
  });

  it('falls from once over sometimes to often, the middle one on a logarithmic scale', () => {
    const [once, sometimes, often] = (['once', 'sometimes', 'often'] as const).map(
      (opening) => allowableStrain(toughPlastic, use({ opening })).value!,
    );
    expect(once).toBeCloseTo(0.03, 12);
    expect(often).toBeCloseTo(0.018, 12);
    expect(sometimes! ** 2).toBeCloseTo(once! * often!, 12);
  });

  it('takes 60 % for frequent opening and half across layers where the plastic has no figure of its own', () => {
    const bare = { ...toughPlastic, allowableOften: null, allowableAcross: null };
    expect(allowableStrain(bare, use({ layers: 'across' })).value).toBeCloseTo(0.03 * 0.6 * 0.5, 12);
  });

  it('knows no layers in a moulding', () => {
    const pc = plastic('pc-moulded');
    expect(allowableStrain(pc, use({ layers: 'across' })).value).toBe(allowableStrain(pc, use()).value);
  });

  it('is not known for a plastic without a limit', () => {
    const bare = { ...toughPlastic, allowableOnce: null };
    const { value, because } = allowableStrain(bare, use());
    expect(value).toBeNull();
    expect(because).toContain('short-term limit of Tough');
  });
});

describe('temperature', () => {
  it('limits service to heat deflection less 20 K or the continuous limit, whichever is lower', () => {
    expect(serviceLimit(plastic('pla'))).toBe(40);
    expect(serviceLimit(plastic('petg'))).toBe(58);
    expect(serviceLimit(plastic('pp'))).toBe(60);
    expect(serviceLimit(plastic('abs'))).toBe(80);
    expect(serviceLimit(plastic('pc'))).toBe(94);
    expect(serviceLimit(plastic('tpu-95a'))).toBeNull();
  });

  it('is not known for PLA in a warm car, and says up to where', () => {
    const { value, because } = allowableStrain(plastic('pla'), use({ temperature: 70 }));
    expect(value).toBeNull();
    expect(because).toBe('Not known: at 70 °C (PLA softens: use it up to 40 °C).');
  });

  it('counts in full up to 40 °C and warns of creep between there and the limit', () => {
    expect(factor('abs', { temperature: 40 })).toMatchObject({ value: 1 });
    expect(factor('abs', { temperature: 40 }).note).toBeUndefined();
    expect(factor('abs', { temperature: 70 })).toMatchObject({ value: 1 });
    expect(factor('abs', { temperature: 70 }).note).toContain('creeps');
  });

  it('is not known below freezing', () => {
    expect(factor('petg', { temperature: -5 }).value).toBeNull();
  });

  it('stands at room temperature for a plastic without a heat limit, and no further', () => {
    expect(factor('tpu-95a', { temperature: 30 }).value).toBe(1);
    expect(factor('tpu-95a', { temperature: 31 }).value).toBeNull();
  });
});
