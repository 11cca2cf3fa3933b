import { describe, expect, it } from 'vitest';
import hook from '@/generators/cantilever-hook';
import { judge } from '@/generators/report';
import { materialById } from '@/lib/materials/data';
import { DEFAULT_USE } from '@/lib/materials/types';

const at = (temperature: number) =>
  hook.check(hook.parameters.defaults, materialById('pla')!, { ...DEFAULT_USE, temperature });
const force = (temperature: number) => at(temperature).figures.find(({ id }) => id === 'mating-force')!;

describe('a report at the temperature of use', () => {
  it('gives forces as they are at room temperature', () => {
    expect(force(23).value).toBeGreaterThan(0);
    expect(force(23).because).not.toMatch(/softer/);
  });

  it('says that a warm part is softer', () => {
    expect(force(35).value).toBe(force(23).value);
    expect(force(35).because).toMatch(/warm plastic is softer/);
  });

  it('knows no force of a plastic past its heat limit, and draws no curve of it', () => {
    expect(force(70)).toMatchObject({ value: null, low: null, high: null, handbook: null });
    expect(force(70).because).toMatch(/^Not known/);
    expect(at(70).curves.filter(({ y }) => y.unit === 'N')).toEqual([]);
    expect(at(23).curves.filter(({ y }) => y.unit === 'N').length).toBeGreaterThan(0);
  });
});

describe('a verdict', () => {
  it('is not known without a value or a limit', () => {
    expect(judge(null, 1)).toBe('not-known');
    expect(judge(1, null)).toBe('not-known');
  });

  it('is close to the limit over 85 % of it, over it past it', () => {
    expect([0.85, 0.86, 1, 1.01].map((value) => judge(value, 1))).toEqual([
      'within-limit',
      'close-to-limit',
      'close-to-limit',
      'over-limit',
    ]);
  });
});
