import { describe, expect, it } from 'vitest';
import { remedies, remedyOf } from '@/generators/remedies';
import { changed, checkOf, figureOf, type Subject } from '@/generators/sensitivity';
import { presetDesign } from '@/generators/url-state';
import { ROUND_PLASTIC, STIFF_PLASTIC, TINY } from './tiny-family';

const { use, values } = presetDesign(TINY);
const subject = (other: object, material = ROUND_PLASTIC): Subject => ({
  family: TINY,
  values: { ...values, ...other },
  material,
  use,
});
const verdictAt = (from: Subject, key: string, value: number) =>
  figureOf(checkOf(changed(from, key, value)!), 'peak-strain')!.verdict;

describe('a remedy for a part over its limit', () => {
  const over = subject({ armLength: 10.5 });

  it('is the nearest value on the field step that meets the limit', () => {
    // 1.5 * 1.2 * 2 / L2 <= 0.024 needs L >= 12.247 mm; the step is 0.5 mm
    expect(remedyOf(over, 'armLength')).toMatchObject({ from: 10.5, to: 12.5 });
    // y <= 0.024 * 110.25 / 3 = 0.88 mm
    expect(remedyOf(over, 'undercut')).toMatchObject({ from: 1.2, to: 0.8 });
  });

  it('stays inside the relations between dimensions', () => {
    // t <= 0.024 * 110.25 / 1.8 = 1.47 mm, but no thinner than the tip of 2.0 mm
    expect(remedyOf(over, 'thickness')).toBeNull();
    expect(remedyOf(subject({ armLength: 10.5, tip: 1 }), 'thickness')).toMatchObject({ to: 1.4 });
  });

  it('never pushes another figure over its limit', () => {
    // L >= 61.2 mm would do, past the 40 mm of the case and the 60 mm of the field
    expect(
      remedyOf(subject({ armLength: 30, undercut: 6, thickness: 5 }, STIFF_PLASTIC), 'armLength'),
    ).toBeNull();
  });

  it('is left out for dimensions that do nothing', () => {
    expect(remedyOf(over, 'arms')).toBeNull();
    expect(remedyOf(over, 'shape')).toBeNull();
    expect(remedyOf(over, 'noseRadius')).toBeNull();
  });

  it('comes with the smallest relative change first', () => {
    const list = remedies(over);
    expect(list.map(({ field }) => field)).toEqual(['armLength', 'undercut']);
    for (const { field, to } of list) expect(verdictAt(over, field, to)).not.toBe('over-limit');
  });
});

describe('the room of a part within its limit', () => {
  const within = subject({ armLength: 21 });

  it('ends at the last value that still meets the limit', () => {
    expect(remedyOf(within, 'armLength')).toMatchObject({ from: 21, to: 12.5 });
    expect(verdictAt(within, 'armLength', 12.5)).not.toBe('over-limit');
    expect(verdictAt(within, 'armLength', 12)).toBe('over-limit');
    // y <= 0.024 * 441 / 3 = 3.53 mm
    expect(remedyOf(within, 'undercut')).toMatchObject({ to: 3.5 });
  });

  it('ends before another figure goes over its limit, and names it', () => {
    // no arm in the range is too short for so small an undercut; the case ends at 40 mm
    const calm = subject({ armLength: 30, undercut: 0.2, thickness: 2 });
    const room = remedyOf(calm, 'armLength');
    expect(room).toMatchObject({ from: 30, to: 40 });
    expect(room!.stoppedBy).toMatchObject({ verdict: 'over-limit', limit: 40 });
    expect(room!.stoppedBy!.id).not.toBe('peak-strain');
    expect(remedyOf(within, 'armLength')!.stoppedBy).toBeNull();
  });

  it('is not told where the field ends before the limit does', () => {
    expect(remedyOf(subject({ armLength: 40, undercut: 0.2 }), 'undercut')).toBeNull();
  });
});

describe('a part whose limit is not known', () => {
  it('has no remedies', () => {
    expect(remedies(subject({}, { ...ROUND_PLASTIC, allowableOnce: null }))).toEqual([]);
  });
});
