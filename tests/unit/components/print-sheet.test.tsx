import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { StandingProvider } from '@/components/studio/computed/standing-context';
import { PrintSheet } from '@/components/studio/print-sheet';
import { createSession, presetTyped } from '@/components/studio/session';
import { SessionProvider } from '@/components/studio/session-context';
import { ROUND_PLASTIC, TINY } from '../generators/tiny-family';

function printed(change: Record<string, string> = {}, title?: string): string {
  const start = presetTyped(TINY);
  const typed = { ...start, entries: { ...start.entries, ...change } };
  const session = createSession(TINY, [ROUND_PLASTIC], typed);
  return renderToStaticMarkup(
    <SessionProvider value={session}>
      <StandingProvider>
        <PrintSheet title={title} />
      </StandingProvider>
    </SessionProvider>,
  );
}

const words = (html: string): string => html.replaceAll(/<[^>]+>/g, ' ').replaceAll(/\s+/g, ' ');

describe('the printed sheet', () => {
  it('has name, link, dimensions with units, figures with limits, cautions', () => {
    const text = words(printed({ tip: '0.7' }));
    expect(text).toContain('Tiny hook');
    expect(text).toContain('/design/tiny?material=round&amp;armLength=20&amp;tip=0.7');
    expect(text).toMatch(/Arm length 20\smm/);
    expect(text).toMatch(/Receiver yes/);
    // 1.5 * 1.2 * 2 / 20^2 = 0.9 % of 4 % * 0.6 = 2.4 %
    expect(text).toMatch(/Peak strain 0\.9\s%, at most 2\.4\s%, within limit/);
    expect(text).toContain('Tip thickness under 0.8 mm prints as one line');
    expect(text).toContain('Prove the part by test');
  });

  it('has nothing to press or to fill in', () => {
    expect(printed()).not.toMatch(/<(button|select|input|a)\b/);
  });

  it('says that it is of the last valid part while a field is at fault', () => {
    expect(words(printed({ armLength: '900' }))).toContain(
      'The last valid part: Arm length must be at most 60 mm.',
    );
  });

  it('is headed by what the design is called, with the kind of part under it', () => {
    expect(words(printed({}, 'Left rudder'))).toMatch(/Left rudder Tiny hook/);
  });
});
