import { describe, expect, it } from 'vitest';
import { dropWork, keepWork, keptWork, startOf } from '@/components/studio/autosave';
import { presetTyped } from '@/components/studio/session';
import { TINY } from '../generators/tiny-family';

function shelf(text?: string) {
  const kept = new Map<string, string>(text === undefined ? [] : [['bendwell:design:tiny', text]]);
  return {
    kept,
    getItem: (key: string) => kept.get(key) ?? null,
    setItem: (key: string, value: string) => void kept.set(key, value),
    removeItem: (key: string) => void kept.delete(key),
  };
}

const work = { entries: { ...presetTyped(TINY).entries, armLength: '2,' }, from: 'lid' };

describe('work kept in the browser', () => {
  it('comes back as it was typed, faults included', () => {
    const storage = shelf();
    expect(keepWork(TINY, work, storage)).toBe(true);
    expect(keptWork(TINY, storage)).toEqual(work);
  });

  it('is gone once dropped', () => {
    const storage = shelf();
    keepWork(TINY, work, storage);
    dropWork(TINY, storage);
    expect(keptWork(TINY, storage)).toBeNull();
  });

  it.each([
    ['is damaged', '{"version":1,'],
    ['is of another version', JSON.stringify({ ...work, version: 0 })],
    ['is of another shape', JSON.stringify({ version: 1, from: null, entries: { armLength: 3 } })],
    ['is far too long', JSON.stringify({ ...work, version: 1, filler: 'x'.repeat(9000) })],
  ])('is left alone where it %s', (_, text) => {
    expect(keptWork(TINY, shelf(text))).toBeNull();
  });

  it('drops fields the part no longer has and fills those it gained', () => {
    const text = JSON.stringify({ version: 1, from: null, entries: { armLength: '30', gone: '1' } });
    const kept = keptWork(TINY, shelf(text));
    expect(kept?.entries).toEqual({ ...presetTyped(TINY).entries, armLength: '30' });
  });

  it('does without a store that refuses', () => {
    const refuse = () => {
      throw new DOMException('full', 'QuotaExceededError');
    };
    expect(keepWork(TINY, work, { setItem: refuse })).toBe(false);
    expect(keptWork(TINY, { getItem: refuse })).toBeNull();
    expect(() => dropWork(TINY, { removeItem: refuse })).not.toThrow();
  });
});

describe('opening the page', () => {
  it('takes the link where it says something about the part', () => {
    const { typed, linked } = startOf(TINY, 'armLength=31,50&material=stiff');
    expect(typed).toMatchObject({ from: null, entries: { armLength: '31.5', material: 'stiff' } });
    expect(linked).toBe(true);
  });

  it('takes the first preset where it does not', () => {
    expect(startOf(TINY, 'from=mail')).toEqual({
      typed: presetTyped(TINY),
      unused: { unknown: ['from'], repeated: [], unread: [] },
      linked: false,
    });
  });
});
