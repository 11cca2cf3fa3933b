import { describe, expect, it } from 'vitest';
import type { Unit } from '@/lib/units';
import { parseQuantity } from '@/lib/units/quantity';

describe('a figure typed with its unit', () => {
  it.each<[string, Unit, number]>([
    ['12,5 mm', 'mm', 12.5],
    ['1.3mm', 'mm', 1.3],
    ['0.1cm', 'mm', 1],
    ['0,013 m', 'mm', 13],
    // 1 in = 25.4 mm exactly (international inch, 1959)
    ['0.7 in', 'mm', 17.78],
    ['1"', 'mm', 25.4],
    ['30°', 'deg', 30],
    ['−7,5 deg', 'deg', -7.5],
    ['60 °C', 'degC', 60],
    ['60C', 'degC', 60],
    ['5 N', 'N', 5],
    ['1.5 turns', 'turns', 1.5],
    ['3', 'count', 3],
  ])('reads %s in %s as %d', (text, unit, value) => {
    expect(parseQuantity(text, unit) ?? Number.NaN).toBe(value);
  });

  it.each<[string, Unit]>([
    ['30°', 'mm'],
    ['12 mm', 'deg'],
    ['5 kg', 'mm'],
    ['1e3', 'mm'],
    ['mm', 'mm'],
    ['1 000 mm', 'mm'],
    ['12 mm 5', 'mm'],
    ['2 %', 'strain'],
    ['3 mm', 'count'],
    ['5 constructor', 'mm'],
  ])('refuses %s in %s', (text, unit) => {
    expect(parseQuantity(text, unit)).toBeNull();
  });

  it('takes a comma or a point, whichever is typed', () => {
    expect(parseQuantity('2,54 cm', 'mm')).toBe(parseQuantity('2.54 cm', 'mm'));
  });
});
