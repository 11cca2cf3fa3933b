import { describe, expect, it } from 'vitest';
import { stepEntry, tidyEntry } from '@/components/studio/step-entry';
import { stepsOf } from '@/components/ui/number-field';
import type { NumberField } from '@/generators/parameters';
import { TINY } from '../generators/tiny-family';

const armLength = TINY.parameters.fields.armLength as NumberField;
const arms = TINY.parameters.fields.arms as NumberField;
const press = (key: string, held: object = {}) =>
  stepsOf({ key, shiftKey: false, altKey: false, metaKey: false, ctrlKey: false, ...held });

describe('stepping a number field', () => {
  it('goes one step by arrow, ten with Shift or by page', () => {
    expect([press('ArrowUp'), press('ArrowDown')]).toEqual([1, -1]);
    expect([press('ArrowUp', { shiftKey: true }), press('ArrowDown', { shiftKey: true })]).toEqual([10, -10]);
    expect([press('PageUp'), press('PageDown'), press('PageUp', { shiftKey: true })]).toEqual([10, -10, 10]);
  });

  it('leaves every other key, and keys held with Alt, Ctrl or Cmd, to the browser', () => {
    expect(['1', 'ArrowLeft', 'Home', 'Enter'].map((key) => press(key))).toEqual([0, 0, 0, 0]);
    expect([press('ArrowUp', { altKey: true }), press('ArrowUp', { metaKey: true })]).toEqual([0, 0]);
  });

  it.each([
    ['18.0', 1, '18.5'],
    ['18,0', -1, '17.5'],
    ['18.3', 1, '19.0'],
    ['59.5', 10, '60.0'],
    ['4.2', -10, '4.0'],
    ['900', 1, '60.0'],
    ['long', 1, '18.5'],
    ['', -1, '17.5'],
    ['2 cm', 1, '20.5'],
  ])('from %s by %d steps shows %s', (text, steps, expected) => {
    expect(stepEntry(armLength, text, 18, steps)).toBe(expected);
  });

  it('counts whole things whole', () => {
    expect(stepEntry(arms, '2', 2, 1)).toBe('3');
    expect(stepEntry(arms, '8', 8, 1)).toBe('8');
  });
});

describe('leaving a number field', () => {
  it.each([
    ['1,5', '1.5'],
    [' 12 ', '12.0'],
    ['12.25', '12.25'],
    ['+7', '7.0'],
    ['900', '900.0'],
    ['12,5 mm', '12.5'],
    ['1.3cm', '13.0'],
  ])('writes %s as %s', (text, expected) => {
    expect(tidyEntry(armLength, text)).toBe(expected);
  });

  it.each(['long', '1.2.3', '1e3', '1 000', '', '30 °', '5 kg'])('keeps "%s" as it was typed', (text) => {
    expect(tidyEntry(armLength, text)).toBe(text);
  });
});
