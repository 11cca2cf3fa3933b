// @vitest-environment happy-dom
import { act } from 'react';
import { createRoot, type Root } from 'react-dom/client';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import { StandingProvider } from '@/components/studio/computed/standing-context';
import { Faults } from '@/components/studio/head/notices';
import { createSession, presetTyped, type Session } from '@/components/studio/session';
import { SessionProvider } from '@/components/studio/session-context';
import { DimensionSheet } from '@/components/studio/sheet/dimension-sheet';
import { ROUND_PLASTIC, STIFF_PLASTIC, TINY } from '../generators/tiny-family';

let root: Root;
let session: Session;
let idle: (() => void)[] = [];

/** Does all that waits for the browser to be idle. */
async function beIdle(): Promise<void> {
  await vi.waitUntil(() => idle.length > 0);
  await act(async () => {
    for (let work = idle.shift(); work; work = idle.shift()) work();
  });
}

const input = (key: string) => document.getElementById(`field-${key}`) as HTMLInputElement;

async function set(control: HTMLInputElement | HTMLSelectElement, value: string): Promise<void> {
  await act(async () => {
    const prototype = Object.getPrototypeOf(control) as object;
    Object.getOwnPropertyDescriptor(prototype, 'value')!.set!.call(control, value);
    control.dispatchEvent(
      new Event(control instanceof HTMLInputElement ? 'input' : 'change', { bubbles: true }),
    );
  });
}

async function press(control: HTMLElement, key: string, held: object = {}): Promise<void> {
  await act(async () => {
    control.dispatchEvent(new KeyboardEvent('keydown', { key, bubbles: true, cancelable: true, ...held }));
  });
}

async function leave(control: HTMLElement): Promise<void> {
  await act(async () => {
    control.dispatchEvent(new FocusEvent('focusout', { bubbles: true }));
  });
}

beforeEach(async () => {
  idle = [];
  vi.stubGlobal('requestIdleCallback', (work: () => void) => idle.push(work));
  vi.stubGlobal('cancelIdleCallback', () => {});
  Object.assign(globalThis, { IS_REACT_ACT_ENVIRONMENT: true });
  const place = document.createElement('div');
  document.body.replaceChildren(place);
  session = createSession(TINY, [ROUND_PLASTIC, STIFF_PLASTIC], presetTyped(TINY));
  root = createRoot(place);
  await act(async () =>
    root.render(
      <SessionProvider value={session}>
        <Faults />
        <StandingProvider>
          <DimensionSheet />
        </StandingProvider>
      </SessionProvider>,
    ),
  );
});

afterEach(async () => {
  await act(async () => root.unmount());
  vi.unstubAllGlobals();
});

describe('the dimension sheet', () => {
  it('takes a decimal comma and writes it with a point on leaving', async () => {
    await set(input('armLength'), '22,5');
    expect(input('armLength').value).toBe('22,5');
    expect(session.reading.getState().design.values.armLength).toBe(22.5);
    await leave(input('armLength'));
    expect(input('armLength').value).toBe('22.5');
  });

  it('takes a length with its unit, or in another one, and writes it in millimetres on leaving', async () => {
    await set(input('armLength'), '2,25 cm');
    expect(input('armLength').getAttribute('aria-invalid')).toBeNull();
    expect(input('armLength').getAttribute('aria-valuetext')).toBe('2,25 cm');
    expect(session.reading.getState().design.values.armLength).toBe(22.5);
    await leave(input('armLength'));
    expect(input('armLength').value).toBe('22.5');
  });

  it('steps by the arrows, tenfold with Shift, and stops at the range', async () => {
    await press(input('armLength'), 'ArrowUp');
    expect(input('armLength').value).toBe('20.5');
    await press(input('armLength'), 'ArrowDown', { shiftKey: true });
    expect(input('armLength').value).toBe('15.5');
    for (let n = 0; n < 9; n += 1) await press(input('armLength'), 'PageUp');
    expect(input('armLength').value).toBe('60.0');
  });

  it('keeps a faulty entry and says field, bound, unit and what is shown instead', async () => {
    await set(input('armLength'), '900');
    expect(input('armLength').value).toBe('900');
    expect(input('armLength').getAttribute('aria-invalid')).toBe('true');
    expect(document.getElementById('error-armLength')!.textContent).toMatch(
      /Arm length must be at most 60 mm\. Range 4 to 60\smm; the part shown still has 20\smm\./,
    );
    expect(input('armLength').getAttribute('aria-describedby')).toContain('error-armLength');
    expect(document.querySelector('[role=alert]')!.textContent).toContain('Arm length must be at most 60 mm');
    await leave(input('armLength'));
    expect(input('armLength').value).toBe('900.0');
  });

  it('keeps what is no number at all', async () => {
    await set(input('undercut'), 'a bit');
    await leave(input('undercut'));
    expect(input('undercut').value).toBe('a bit');
    expect(document.getElementById('error-undercut')!.textContent).toContain('must be a number in mm');
    await press(input('undercut'), 'ArrowUp');
    expect(input('undercut').value).toBe('1.3');
  });

  it('shows a field once it applies, even while another entry is faulty', async () => {
    expect(input('noseRadius')).toBeNull();
    await set(input('armLength'), 'long');
    await set(document.getElementById('field-shape') as HTMLSelectElement, 'round');
    expect(input('noseRadius').value).toBe('0.5');
  });

  it('gives every control a name and its help', () => {
    for (const control of document.querySelectorAll('input, select')) {
      const label = document.querySelector(`label[for="${control.id}"]`);
      expect(label?.textContent, control.id).toBeTruthy();
      const described = control.getAttribute('aria-describedby')!;
      expect(document.getElementById(described)?.textContent, control.id).toBeTruthy();
    }
  });

  it('tells which field has the focus, for the picture', async () => {
    await act(async () => {
      input('undercut').dispatchEvent(new FocusEvent('focusin', { bubbles: true }));
    });
    expect(session.focused.getState().field).toBe('undercut');
    await leave(input('undercut'));
    expect(session.focused.getState().field).toBeNull();
  });

  it('says in idle time what each dimension does to the strain', async () => {
    const effect = (key: string) => input(key).closest('.grid')!.lastElementChild!.textContent;
    // 1.5 * 1.2 * 2 * (1 / 21^2 - 1 / 20^2) = -0.0837 %
    await beIdle();
    expect(effect('armLength')).toBe('+1 mm changes Peak strain by −0.084');
    expect(effect('arms')).toBe('force only');
    const legend = document.querySelector('[aria-label="Words in the effect column"]')!;
    const words = [...legend.querySelectorAll('dt')].map((one) => one.textContent);
    const said = [...document.querySelectorAll('input')].flatMap((one) => {
      const text = one.closest('.grid')!.lastElementChild!.textContent!;
      return /^[a-z ]+$/.test(text) ? [text] : [];
    });
    expect(new Set(words)).toEqual(new Set(said));
    expect(legend.textContent).toContain('force onlyleaves this figure as it is and moves a force');
  });
});
