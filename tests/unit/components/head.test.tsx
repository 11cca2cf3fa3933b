// @vitest-environment happy-dom
import { act } from 'react';
import { createRoot, type Root } from 'react-dom/client';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { CopyLink } from '@/components/studio/head/copy-link';
import { Files } from '@/components/studio/head/files';
import { createSession, presetTyped, type Session } from '@/components/studio/session';
import { SessionProvider } from '@/components/studio/session-context';
import { ROUND_PLASTIC, TINY } from '../generators/tiny-family';

let root: Root;
let session: Session;
let clipboard: string[];

const button = (name: string) =>
  [...document.querySelectorAll('button')].find((one) => one.textContent === name);
const status = () => document.querySelector('[role=status]')!;
const download = () => document.querySelector('a[download]')!;
const type = (key: string, text: string) => act(async () => session.type(key, text));

beforeEach(async () => {
  Object.assign(globalThis, { IS_REACT_ACT_ENVIRONMENT: true });
  clipboard = [];
  const writeText = async (text: string) => void clipboard.push(text);
  vi.stubGlobal('navigator', { clipboard: { writeText } });
  const place = document.createElement('div');
  document.body.replaceChildren(place);
  session = createSession(TINY, [ROUND_PLASTIC], presetTyped(TINY));
  root = createRoot(place);
  await act(async () =>
    root.render(
      <SessionProvider value={session}>
        <CopyLink />
        <Files bodies={['arm']} stance={null} />
      </SessionProvider>,
    ),
  );
});

afterEach(async () => {
  await act(async () => root.unmount());
  vi.unstubAllGlobals();
});

describe('the button that copies the link', () => {
  it('is named by its own words, and tells beside it what was done', async () => {
    expect(button('Copy link')!.querySelector('[role]')).toBeNull();
    expect(status().textContent).toBe('');
    await act(async () => button('Copy link')!.click());
    expect(clipboard[0]).toMatch(/\?material=round&armLength=20$/);
    expect(status().textContent).toBe('Link copied');
    expect(status().closest('button')).toBeNull();
  });

  it('says so when the link is of the last valid part', async () => {
    await type('armLength', '900');
    await act(async () => button('Copy link')!.click());
    expect(clipboard[0]).toContain('armLength=20');
    expect(status().textContent).toBe('Link of the last valid part copied');
  });
});

describe('the file', () => {
  it('is said to be of the last valid part while a field is at fault', async () => {
    expect(download().textContent).toBe('Download STL');
    await type('armLength', '900');
    expect(download().getAttribute('href')).toContain('armLength=20');
    expect(download().textContent).toBe('Download STL of the last valid part');
    expect(document.querySelector('[popover] h2')!.textContent).toBe('File of the last valid part');
    await type('armLength', '25');
    expect(download().getAttribute('href')).toContain('armLength=25');
    expect(download().textContent).toBe('Download STL');
  });
});
