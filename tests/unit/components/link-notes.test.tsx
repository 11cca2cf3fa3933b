import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { startOf } from '@/components/studio/autosave';
import { LinkNotes, Restored } from '@/components/studio/head/notices';
import { createSession, presetTyped } from '@/components/studio/session';
import { SessionProvider } from '@/components/studio/session-context';
import { ROUND_PLASTIC, TINY } from '../generators/tiny-family';

const notesOn = (query: string): string =>
  renderToStaticMarkup(
    <SessionProvider value={createSession(TINY, [ROUND_PLASTIC], presetTyped(TINY))}>
      <LinkNotes {...startOf(TINY, query)} />
    </SessionProvider>,
  ).replaceAll(/<[^>]+>/g, '|');

const restored = (instead: boolean): string =>
  renderToStaticMarkup(<Restored instead={instead} onFresh={() => {}} onKeep={() => {}} />);

describe('the notes on a link', () => {
  it('name words that the part does not know, and say whether the rest was used', () => {
    expect(notesOn('armLength=20&colour=red')).toContain(
      'The link says colour, which this part does not know; the rest of it was used.',
    );
    expect(notesOn('foo=1')).toContain(
      'The link says foo, which this part does not know; nothing of it was used.',
    );
  });

  it('name a dimension given twice, and which of the two counts', () => {
    expect(notesOn('armLength=20&armLength=30')).toContain(
      'The link gives Arm length more than once; the last one was used.',
    );
  });

  it('name what stands past the longest link that is read', () => {
    const notes = notesOn(`armLength=21&${'x=1&'.repeat(500)}thickness=3`);
    expect(notes).toContain('The link is longer than 2000 characters; x, thickness past that was not read.');
  });

  it('stay short however much the link says', () => {
    const words = Array.from({ length: 60 }, (_, k) => `w${k}=1`).join('&');
    expect(notesOn(words)).toContain('w0, w1, w2, w3, w4 and 55 more');
    expect(notesOn(`${'y'.repeat(300)}=1`)).toContain(`${'y'.repeat(40)}…, which`);
  });

  it('are none where all of it was used', () => {
    expect(notesOn('armLength=20&material=round')).toBe('');
  });
});

describe('the note on restored work', () => {
  it('says that it is the own earlier work where a link was opened', () => {
    expect(restored(true)).toContain('your own earlier work in this browser, not what the link says');
    expect(restored(false)).not.toContain('link');
  });
});
