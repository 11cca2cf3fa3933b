import { beforeEach, describe, expect, it, vi } from 'vitest';
import { signInAction } from '@/app/(account)/sign-in/actions';
import { rateLimits } from '@/db/schema/limits';
import { sessions, users } from '@/db/schema/members';
import { lucia } from '@/lib/auth/lucia';
import { currentViewer } from '@/lib/auth/session';
import { Browser, OWN_PAGE } from '../../support/browser';
import { addressOf, DEMO_PASSWORD, demoClub, signedIn } from '../../support/demo-club';

const db = await demoClub();
const DAY = 86_400_000;
const viewerOf = (browser: Browser) => browser.within(() => currentViewer());
const attempt = (browser: Browser, email: string, password: string) =>
  browser.submit(signInAction, { email, password });

beforeEach(() => {
  db.delete(rateLimits).run();
  vi.useRealTimers();
});

describe('signing in', () => {
  it('makes the member known to every page, with the roles they have', async () => {
    const browser = await signedIn('tomas');
    expect(await viewerOf(browser)).toEqual({
      id: 'demo-tomas',
      name: 'Tomas Reed',
      email: 'tomas@millrace.example',
      emailVerified: true,
      roles: ['librarian', 'member'],
    });
  });

  it('stores neither the password nor what the cookie holds', async () => {
    const browser = await signedIn('ines');
    const [secret] = browser.jar.values();
    const stored = JSON.stringify([db.select().from(users).all(), db.select().from(sessions).all()]);
    expect(secret!.length).toBeGreaterThanOrEqual(32);
    expect(stored).not.toContain(secret);
    expect(stored).not.toContain(DEMO_PASSWORD);
    expect(stored).toContain('$argon2id$v=19$m=24576,t=2,p=1$');
  });

  it('answers the same for a wrong password as for an address without an account', async () => {
    const wrong = await attempt(new Browser(), addressOf('ines'), 'not the password');
    const unknown = await attempt(new Browser(), addressOf('nobody'), 'not the password');
    expect(wrong.errors).toEqual({ password: 'Address and password do not fit together' });
    expect(unknown.errors).toEqual(wrong.errors);
    expect(unknown.notice).toEqual(wrong.notice);
  });

  it('keeps the address and never sends the password back', async () => {
    const answer = await attempt(new Browser(), addressOf('ines'), 'not the password');
    expect(answer.values).toEqual({ email: addressOf('ines') });
    expect(JSON.stringify(answer)).not.toContain('not the password');
  });

  it('tells every field that is wrong at once', async () => {
    const answer = await attempt(new Browser(), 'not an address', '');
    expect(Object.keys(answer.errors ?? {})).toEqual(['email', 'password']);
  });

  it('lets no suspended member in', async () => {
    const answer = await attempt(new Browser(), addressOf('wendel'), DEMO_PASSWORD);
    expect(answer.errors?.password).toMatch(/suspended/);
    expect(await viewerOf(new Browser())).toBeNull();
  });

  it('leads back to where the visitor came from, but never to another site', async () => {
    const goesTo = async (next: string) => {
      const fields = { email: addressOf('ines'), password: DEMO_PASSWORD, next };
      return (await new Browser().submit(signInAction, fields)).goesTo;
    };
    expect(await goesTo('/designs?page=2')).toBe('/designs?page=2');
    for (const elsewhere of [
      'https://evil.example',
      '//evil.example',
      '/\\evil.example',
      'javascript:alert(1)',
    ]) {
      expect(await goesTo(elsewhere), elsewhere).toBe('/account');
    }
  });
});

describe('a sign-in', () => {
  it('takes a new id, so that one planted in the browser beforehand is worth nothing', async () => {
    const browser = new Browser();
    const planted = 'a'.repeat(40);
    browser.jar.set(lucia().sessionCookieName, planted);
    await attempt(browser, addressOf('ines'), DEMO_PASSWORD);
    const attacker = new Browser();
    attacker.jar.set(lucia().sessionCookieName, planted);
    expect(await viewerOf(attacker)).toBeNull();
    expect([...browser.jar.values()]).not.toContain(planted);
    expect((await viewerOf(browser))?.name).toBe('Ines Marlow');
  });

  it('ends the one the browser had before', async () => {
    const browser = await signedIn('ines');
    const old = new Browser();
    for (const [name, value] of browser.jar) old.jar.set(name, value);
    await attempt(browser, addressOf('bram'), DEMO_PASSWORD);
    expect((await viewerOf(browser))?.name).toBe('Bram Okafor');
    expect(await viewerOf(old)).toBeNull();
  });

  it('cannot be opened with what the database stores', async () => {
    await signedIn('ines');
    for (const { id } of db.select().from(sessions).all()) {
      const thief = new Browser();
      thief.jar.set(lucia().sessionCookieName, id);
      expect(await viewerOf(thief)).toBeNull();
    }
  });

  it('ends after two weeks without use', async () => {
    const browser = await signedIn('ines');
    vi.useFakeTimers({ now: Date.now() + 14 * DAY + 1000, toFake: ['Date'] });
    expect(await viewerOf(browser)).toBeNull();
  });

  it('ends after ninety days however often it is used', async () => {
    const browser = await signedIn('ines');
    const start = Date.now();
    for (let day = 1; day <= 90; day += 1) {
      vi.useFakeTimers({ now: start + day * DAY - 1000, toFake: ['Date'] });
      expect((await viewerOf(browser))?.name, `day ${day}`).toBe('Ines Marlow');
    }
    vi.useFakeTimers({ now: start + 90 * DAY + 1000, toFake: ['Date'] });
    expect(await viewerOf(browser)).toBeNull();
  });

  it('ends the moment the member is suspended', async () => {
    const browser = await signedIn('priya');
    db.$client.prepare("update users set suspended_at = 1 where id = 'demo-priya'").run();
    expect(await viewerOf(browser)).toBeNull();
    db.$client.prepare("update users set suspended_at = null where id = 'demo-priya'").run();
    expect(await viewerOf(browser)).toBeNull();
  });
});

describe('a form', () => {
  const send = (head: Readonly<Record<string, string>>) =>
    new Browser().submit(signInAction, { email: addressOf('ines'), password: DEMO_PASSWORD }, head);
  const { origin: _, 'sec-fetch-site': __, ...plain } = OWN_PAGE;

  it.each([
    ['of another origin', { ...OWN_PAGE, origin: 'https://evil.example' }],
    ['whose origin hides', { ...OWN_PAGE, origin: 'null' }],
    ['of another port', { ...OWN_PAGE, origin: 'http://127.0.0.1:3001' }],
    ['sent across sites', { ...OWN_PAGE, 'sec-fetch-site': 'cross-site' }],
    ['sent from a sister site', { ...OWN_PAGE, 'sec-fetch-site': 'same-site' }],
    ['that comes with a cookie and says nothing of its origin', { ...plain, cookie: 'bendwell=x' }],
  ])('%s is refused', async (_name, head) => {
    const answer = await send(head);
    expect(answer.goesTo).toBeUndefined();
    expect(answer.notice?.text).toMatch(/another site/);
  });

  it('of this site is taken', async () => {
    expect((await send(OWN_PAGE)).goesTo).toBe('/account');
  });

  it('larger than any of this site is refused unread', async () => {
    const long = await new Browser().submit(signInAction, { email: 'x'.repeat(50_000), password: 'y' });
    expect(long.notice?.text).toMatch(/more than this form takes/);
    const many = Object.fromEntries(Array.from({ length: 300 }, (_x, index) => [`f${index}`, '']));
    expect((await new Browser().submit(signInAction, many)).notice?.text).toMatch(/more than/);
  });
});

describe('attempts', () => {
  const guess = (browser = new Browser()) => attempt(browser, addressOf('ines'), 'a wrong guess');

  it('on one account are limited, wherever they come from, the right password then too', async () => {
    for (let i = 0; i < 10; i += 1) await guess(new Browser(`198.51.100.${i}`));
    const answer = await attempt(new Browser('203.0.113.9'), addressOf('ines'), DEMO_PASSWORD);
    expect(answer.notice?.text).toMatch(/Too many attempts. Try again in 1\d minutes/);
  });

  it('are limited alike for an address without an account', async () => {
    for (let i = 0; i < 10; i += 1) await attempt(new Browser(), addressOf('nobody'), 'x');
    expect((await attempt(new Browser(), addressOf('nobody'), 'x')).notice?.text).toMatch(/Too many/);
  });

  it('are counted in the database, so that a restart forgives nothing', async () => {
    await guess();
    const [row] = db.select().from(rateLimits).all();
    expect(row?.points).toBe(1);
    expect(JSON.stringify(db.select().from(rateLimits).all())).not.toContain('millrace');
  });

  it('of one network address are limited over all accounts', async () => {
    db.insert(rateLimits)
      .values({ key: await keyOf('sign-in-address'), points: 60, expire: Date.now() + 60_000 })
      .run();
    expect((await attempt(new Browser(), addressOf('bram'), DEMO_PASSWORD)).notice?.text).toMatch(/Too many/);
  });
});

async function keyOf(kind: string): Promise<string> {
  const { digest } = await import('@/lib/auth/secret');
  return `${kind}:${digest(new Browser().address)}`;
}
