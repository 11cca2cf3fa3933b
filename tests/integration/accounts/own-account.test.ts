import { eq } from 'drizzle-orm';
import { beforeEach, describe, expect, it, vi } from 'vitest';
import * as account from '@/app/(account)/account/actions';
import { askResetAction } from '@/app/(account)/forgot-password/actions';
import { resetPasswordAction } from '@/app/(account)/reset-password/actions';
import { signInAction } from '@/app/(account)/sign-in/actions';
import { confirmAddressAction } from '@/app/(account)/verify-email/actions';
import { giveRolesAction, restoreAction, suspendAction } from '@/app/(club)/admin/members/[id]/actions';
import { presets } from '@/db/schema/library';
import { rateLimits } from '@/db/schema/limits';
import { outbox } from '@/db/schema/mail';
import { users } from '@/db/schema/members';
import { listOwnSessions } from '@/lib/access/account';
import { readAudit } from '@/lib/access/audit';
import { currentViewer } from '@/lib/auth/session';
import { Browser } from '../../support/browser';
import { addressOf, DEMO_PASSWORD, demoClub, signedIn, tokenTo } from '../../support/demo-club';

/** What is done after the answer, to be waited for. */
const afterwards = vi.hoisted(() => [] as Promise<unknown>[]);
vi.mock('next/server', () => ({ after: (work: () => Promise<unknown>) => afterwards.push(work()) }));

const db = await demoClub();
const NEW = 'kettle anvil heron';
const HALF_HOUR = 30 * 60_000;

const viewerOf = (browser: Browser) => browser.within(() => currentViewer());
const mails = () => db.select().from(outbox).all();
const signIn = (name: string, password: string) =>
  new Browser().submit(signInAction, { email: addressOf(name), password });

async function askReset(email: string) {
  const answer = await new Browser().submit(askResetAction, { email });
  await Promise.all(afterwards.splice(0));
  return answer;
}

beforeEach(() => {
  db.delete(rateLimits).run();
  vi.useRealTimers();
});

describe('a forgotten password', () => {
  it('is answered alike with and without an account, and mailed only to an account that may sign in', async () => {
    const before = mails().length;
    const known = await askReset(addressOf('bram'));
    const unknown = await askReset(addressOf('nobody'));
    const suspended = await askReset(addressOf('wendel'));
    const plain = ({ notice }: typeof known, name: string) => notice?.text.replace(addressOf(name), 'X');
    expect(plain(known, 'bram')).toBe(plain(unknown, 'nobody'));
    expect(plain(known, 'bram')).toBe(plain(suspended, 'wendel'));
    expect(
      mails()
        .slice(before)
        .map(({ recipient }) => recipient),
    ).toEqual([addressOf('bram')]);
  });

  it('is set anew by the link, once, which ends every sign-in and is told by mail', async () => {
    const browser = await signedIn('bram');
    await askReset(addressOf('bram'));
    const token = tokenTo(db, addressOf('bram'));
    const set = () => new Browser().submit(resetPasswordAction, { token, password: NEW });
    expect((await set()).goesTo).toBe('/sign-in?done=reset');
    expect((await set()).notice?.text).toMatch(/no longer good/);
    expect(await viewerOf(browser)).toBeNull();
    expect((await signIn('bram', DEMO_PASSWORD)).errors?.password).toBeDefined();
    expect((await signIn('bram', NEW)).goesTo).toBe('/account');
    expect(mails().at(-1)).toMatchObject({ kind: 'password-changed', recipient: addressOf('bram') });
  });

  it('cannot be set by an old link, a newer one having been sent, or half an hour having passed', async () => {
    await askReset(addressOf('bram'));
    const older = tokenTo(db, addressOf('bram'));
    await askReset(addressOf('bram'));
    const set = (token: string) => new Browser().submit(resetPasswordAction, { token, password: NEW });
    expect((await set(older)).notice?.text).toMatch(/no longer good/);
    vi.useFakeTimers({ now: Date.now() + HALF_HOUR + 1000, toFake: ['Date'] });
    expect((await set(tokenTo(db, addressOf('bram')))).notice?.text).toMatch(/no longer good/);
  });

  it('can be asked for four times an hour, with an account or without', async () => {
    for (const email of [addressOf('bram'), addressOf('nobody')]) {
      for (let i = 0; i < 4; i += 1) await askReset(email);
      expect((await askReset(email)).notice?.text).toMatch(/Too many attempts/);
    }
  });
});

describe('the own account', () => {
  it('changes its password only for who knows the present one, ends other sign-ins and renews its own', async () => {
    const here = await signedIn('ines');
    const [before] = here.jar.values();
    const elsewhere = await signedIn('ines');
    const change = (password: string) => here.submit(account.changePasswordAction, { password, next: NEW });
    expect((await change('wrong')).errors?.password).toMatch(/not your present password/);
    expect((await change(DEMO_PASSWORD)).notice?.kind).toBe('done');
    expect(await viewerOf(elsewhere)).toBeNull();
    expect((await viewerOf(here))?.name).toBe('Ines Marlow');
    expect([...here.jar.values()]).not.toContain(before);
    expect(
      (await here.submit(account.changePasswordAction, { password: NEW, next: DEMO_PASSWORD })).notice?.kind,
    ).toBe('done');
  });

  it('takes a new address once its link is opened, and tells the old one', async () => {
    const browser = await signedIn('ines');
    const wanted = 'ines.marlow@millrace.example';
    await browser.submit(account.changeEmailAction, { email: wanted, password: DEMO_PASSWORD });
    expect((await viewerOf(browser))?.email).toBe(addressOf('ines'));
    const token = tokenTo(db, wanted);
    expect((await browser.submit(confirmAddressAction, { token })).goesTo).toBe('/sign-in?done=confirmed');
    expect(await viewerOf(browser)).toMatchObject({ email: wanted, emailVerified: true });
    expect(mails().at(-1)).toMatchObject({ kind: 'email-changed', recipient: addressOf('ines') });
    db.$client.prepare("update users set email = 'ines@millrace.example' where id = 'demo-ines'").run();
  });

  it('answers alike for an address that is taken, whose owner is told instead', async () => {
    const browser = await signedIn('ines');
    const ask = (email: string) =>
      browser.submit(account.changeEmailAction, { email, password: DEMO_PASSWORD });
    const taken = await ask(addressOf('tomas'));
    expect(mails().at(-1)).toMatchObject({ kind: 'address-taken', recipient: addressOf('tomas') });
    const free = await ask('free@millrace.example');
    expect(taken.notice?.text.replace(addressOf('tomas'), 'X')).toBe(
      free.notice?.text.replace('free@millrace.example', 'X'),
    );
  });

  it('cannot take an address that another account took before the link was opened', async () => {
    const browser = await signedIn('ines');
    const wanted = 'contested@millrace.example';
    await browser.submit(account.changeEmailAction, { email: wanted, password: DEMO_PASSWORD });
    db.update(users).set({ email: wanted }).where(eq(users.id, 'demo-priya')).run();
    const answer = await browser.submit(confirmAddressAction, { token: tokenTo(db, wanted) });
    expect(answer.notice?.text).toMatch(/no longer good/);
    db.update(users)
      .set({ email: addressOf('priya') })
      .where(eq(users.id, 'demo-priya'))
      .run();
  });

  it('lists its sign-ins and ends one of them, but none of another member', async () => {
    const here = await signedIn('ines');
    const there = await signedIn('ines');
    const bram = await signedIn('tomas');
    const own = listOwnSessions(await viewerOf(there));
    const [foreign] = listOwnSessions(await viewerOf(bram));
    const refused = await here.submit(account.endSessionAction, { id: foreign!.id });
    expect(refused.notice?.text).toMatch(/not found/);
    expect(await viewerOf(bram)).not.toBeNull();
    const thereId = await there.within(async () => (await import('@/lib/auth/session')).currentSession());
    expect(own.map(({ id }) => id)).toContain(thereId?.id);
    await here.submit(account.endSessionAction, { id: thereId!.id });
    expect(await viewerOf(there)).toBeNull();
    expect(await viewerOf(here)).not.toBeNull();
  });

  it('ends every sign-in but its own', async () => {
    const here = await signedIn('ines');
    const there = await signedIn('ines');
    await here.submit(account.endOtherSessionsAction, {});
    expect(await viewerOf(there)).toBeNull();
    expect(await viewerOf(here)).not.toBeNull();
  });

  it('is signed out for good: what the cookie held opens nothing any more', async () => {
    const here = await signedIn('ines');
    const copy = new Browser();
    for (const [name, value] of here.jar) copy.jar.set(name, value);
    expect((await here.submit(account.signOutAction, {})).goesTo).toBe('/');
    expect(await viewerOf(copy)).toBeNull();
  });

  it('is deleted with its sign-ins, its published presets keeping the name of their author', async () => {
    const browser = await signedIn('priya');
    const now = new Date();
    db.insert(presets)
      .values({
        slug: 'rigging-clip',
        authorId: 'demo-priya',
        authorName: 'Priya Nolan',
        createdAt: now,
        changedAt: now,
      })
      .run();
    expect(
      (await browser.submit(account.deleteAccountAction, { password: 'wrong' })).errors?.password,
    ).toBeDefined();
    const answer = await browser.submit(account.deleteAccountAction, { password: DEMO_PASSWORD });
    expect(answer.goesTo).toBe('/sign-in?done=deleted');
    expect(await viewerOf(browser)).toBeNull();
    expect(db.select().from(presets).all()).toMatchObject([{ authorId: null, authorName: 'Priya Nolan' }]);
    const orla = await signedIn('orla');
    const { events } = readAudit(await viewerOf(orla), { action: 'account.delete' });
    expect(events).toMatchObject([{ actor: 'Priya Nolan', subject: addressOf('priya') }]);
  });
});

describe('running the club', () => {
  it('suspends a member, which ends their sign-ins, and restores them', async () => {
    const orla = await signedIn('orla');
    const tomas = await signedIn('tomas');
    const suspend = { id: 'demo-tomas', reason: 'Lent the key to others' };
    expect((await orla.submit(suspendAction, suspend)).notice?.kind).toBe('done');
    expect(await viewerOf(tomas)).toBeNull();
    expect((await signIn('tomas', DEMO_PASSWORD)).errors?.password).toMatch(/suspended/);
    await orla.submit(restoreAction, { id: 'demo-tomas' });
    expect((await signIn('tomas', DEMO_PASSWORD)).goesTo).toBe('/account');
    const { events } = readAudit(await viewerOf(orla), { action: 'member.suspend' });
    expect(events[0]).toMatchObject({ actor: 'Orla Finch', detail: { reason: 'Lent the key to others' } });
  });

  it('never leaves the club without an admin', async () => {
    const orla = await signedIn('orla');
    expect((await orla.submit(giveRolesAction, { id: 'demo-orla', roles: [] })).notice?.text).toMatch(
      /must be an admin/,
    );
    expect((await orla.submit(suspendAction, { id: 'demo-orla', reason: 'x' })).notice?.text).toMatch(
      /yourself/,
    );
    const answer = await orla.submit(account.deleteAccountAction, { password: DEMO_PASSWORD });
    expect(answer.notice?.text).toMatch(/only admin/);
  });

  it('gives a role that holds from the next request on, and takes it back', async () => {
    const orla = await signedIn('orla');
    const ines = await signedIn('ines');
    await orla.submit(giveRolesAction, { id: 'demo-ines', roles: ['librarian'] });
    expect((await viewerOf(ines))?.roles).toEqual(['librarian', 'member']);
    await orla.submit(giveRolesAction, { id: 'demo-ines', roles: [] });
    expect((await viewerOf(ines))?.roles).toEqual(['member']);
  });
});
