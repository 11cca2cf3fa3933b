// @vitest-environment happy-dom
import { beforeEach, describe, expect, it } from 'vitest';
import { startOf } from '@/components/studio/autosave';
import { createSession, presetTyped, type Typed } from '@/components/studio/session';
import { keepAddress } from '@/components/studio/use-keeping';
import { ROUND_PLASTIC, TINY } from '../generators/tiny-family';

const open = (query: string, typed: Typed) => {
  window.history.replaceState(null, '', `/design/tiny${query}`);
  return keepAddress(createSession(TINY, [ROUND_PLASTIC], typed));
};
const preset = presetTyped(TINY);

beforeEach(() => window.history.replaceState(null, '', '/'));

describe('the address', () => {
  it('holds a design that was restored, though it was opened without one', () => {
    open('', { ...preset, entries: { ...preset.entries, armLength: '31.0' } })();
    expect(window.location.search).toBe('?material=round&armLength=31');
  });

  it('holds the restored design in place of a link that says nothing', () => {
    open('?foo=1', { ...preset, entries: { ...preset.entries, armLength: '31.0' } })();
    expect(window.location.search).toBe('?material=round&armLength=31');
  });

  it('is left plain where it brings back what is shown', () => {
    open('', preset)();
    expect(window.location.search).toBe('');
  });

  it('is left as it was sent, faults included, until something is changed', () => {
    open('?armLength=9oo', startOf(TINY, 'armLength=9oo').typed)();
    expect(window.location.search).toBe('?armLength=9oo');
  });
});
