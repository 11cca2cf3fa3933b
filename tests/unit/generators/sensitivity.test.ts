import { describe, expect, it } from 'vitest';
import { effectOf, numbersOf, type Subject, trialStep } from '@/generators/sensitivity';
import { presetDesign } from '@/generators/url-state';
import { ROUND_PLASTIC, STIFF_PLASTIC, TINY, tinyStrain } from './tiny-family';

const { use, values } = presetDesign(TINY);
const subject: Subject = { family: TINY, values, material: ROUND_PLASTIC, use };
const at = (other: object) => tinyStrain({ undercut: 1.2, thickness: 2, armLength: 20, ...other });

describe('the effect of a dimension', () => {
  it('is the change of the strain over one step of it', () => {
    expect(effectOf(subject, 'armLength')).toMatchObject({ step: 1, change: at({ armLength: 21 }) - at({}) });
    expect(effectOf(subject, 'undercut')).toMatchObject({
      step: 0.1,
      change: at({ undercut: 1.3 }) - at({}),
    });
  });

  it('is told for a smaller value where a larger one is refused', () => {
    expect(effectOf(subject, 'tip')).toEqual({ field: 'tip', step: -0.1, change: 0, moves: [] });
  });

  it('names the other figures that move when the strain does not', () => {
    expect(effectOf(subject, 'arms')).toEqual({
      field: 'arms',
      step: 1,
      change: 0,
      moves: ['mating-force'],
    });
  });

  it('is not told for choices, nor for numbers that do not apply', () => {
    expect(effectOf(subject, 'shape')).toBeNull();
    expect(effectOf(subject, 'noseRadius')).toBeNull();
    expect(numbersOf(subject)).toEqual(['armLength', 'thickness', 'tip', 'undercut', 'arms']);
  });

  it('is not known where the governing figure is not', () => {
    const blind = { ...TINY, check: () => ({ ...TINY.check(values, STIFF_PLASTIC, use), figures: [] }) };
    expect(effectOf({ ...subject, family: blind }, 'armLength')).toMatchObject({ change: null });
  });

  it.each([
    [18, 0.5, 1],
    [2, 0.1, 0.1],
    [2, 0.05, 0.1],
    [45, 1, 5],
    [3, 0.4, 0.4],
    [0, 0.1, 0.1],
    [200, 1, 10],
  ])('of %d with a field step of %d is tried over %d', (value, step, expected) => {
    expect(trialStep({ ...(TINY.parameters.fields.armLength as object), step } as never, value)).toBe(
      expected,
    );
  });
});
