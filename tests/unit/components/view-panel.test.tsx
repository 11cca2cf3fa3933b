import { renderToStaticMarkup } from 'react-dom/server';
import { describe, expect, it } from 'vitest';
import { StandingProvider } from '@/components/studio/computed/standing-context';
import { createSession, presetTyped } from '@/components/studio/session';
import { SessionProvider } from '@/components/studio/session-context';
import { ViewPanel } from '@/components/studio/view/view-panel';
import { ROUND_PLASTIC, TINY } from '../generators/tiny-family';

describe('the view before it is there', () => {
  it('shows what is being done and a picture of the part, before any script has run', () => {
    const html = renderToStaticMarkup(
      <SessionProvider value={createSession(TINY, [ROUND_PLASTIC], presetTyped(TINY))}>
        <StandingProvider>
          <ViewPanel stance={null} onStance={() => {}} state={{ status: 'loading' }} onState={() => {}} />
        </StandingProvider>
      </SessionProvider>,
    );
    expect(html).toMatch(/role="status"[^>]*>.*Setting up the view…/);
    expect(html).toContain('src="/guide/tiny/part.svg"');
    expect(html).toContain('animate-spin');
  });
});
