import { describe, expect, it } from 'vitest';
import { formatQuantity, significant } from '@/lib/units';

describe('a figure on screen', () => {
  it.each([
    [0.9, '0.9'],
    [2.4, '2.4'],
    [1, '1'],
    [0.8333, '0.833'],
    [120, '120'],
    [1204, '1200'],
    [0.05, '0.05'],
    [-0.5, '-0.5'],
    [999.7, '1000'],
    [0, '0'],
  ])('of %d is written %s, to three digits and without empty ones', (value, text) => {
    expect(significant(value)).toBe(text);
  });

  it('is followed by its unit, strain in percent', () => {
    expect(formatQuantity(0.024, 'strain')).toBe('2.4\u202f%');
    expect(formatQuantity(1_000_000, 'cycles')).toBe('1\u202f000\u202f000\u202fcycles');
    expect(formatQuantity(30, 'deg')).toBe('30°');
    expect(formatQuantity(null, 'N')).toBe('not known');
  });
});
