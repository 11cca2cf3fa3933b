import { beforeEach, describe, expect, it, vi } from 'vitest';
import { acceptInvitationAction } from '@/app/(account)/accept-invite/actions';
import { signInAction } from '@/app/(account)/sign-in/actions';
import { confirmAddressAction } from '@/app/(account)/verify-email/actions';
import { inviteAction, withdrawAction } from '@/app/(club)/admin/invitations/actions';
import { addInvitation } from '@/db/queries/invitations';
import { rateLimits } from '@/db/schema/limits';
import { outbox } from '@/db/schema/mail';
import { invitations, type Role, users } from '@/db/schema/members';
import { readAudit } from '@/lib/access/audit';
import { listInvitations } from '@/lib/access/invitations';
import { digest, newSecret } from '@/lib/auth/secret';
import { currentViewer } from '@/lib/auth/session';
import { Browser } from '../../support/browser';
import { demoClub, signedIn, tokenTo } from '../../support/demo-club';

const db = await demoClub();
const orla = await signedIn('orla');
const viewer = () => orla.within(() => currentViewer());
const PASSWORD = 'kettle anvil heron';
const DAY = 86_400_000;

let count = 0;
const newAddress = () => {
  count += 1;
  return `new${count}@millrace.example`;
};

async function invited(roles: readonly string[] = []): Promise<{ email: string; token: string }> {
  const email = newAddress();
  const answer = await orla.submit(inviteAction, { email, roles });
  expect(answer.notice?.kind).toBe('done');
  return { email, token: tokenTo(db, email) };
}

const accept = (token: string, browser = new Browser()) =>
  browser.submit(acceptInvitationAction, { token, name: 'Mira Sand', password: PASSWORD });

beforeEach(() => {
  db.delete(rateLimits).run();
  vi.useRealTimers();
});

describe('an invitation', () => {
  it('makes a member with the roles given, whose address is proved, and signs them in', async () => {
    const { email, token } = await invited(['host']);
    const browser = new Browser();
    expect((await accept(token, browser)).goesTo).toBe('/account');
    expect(await browser.within(() => currentViewer())).toMatchObject({
      name: 'Mira Sand',
      email,
      emailVerified: true,
      roles: ['host', 'member'],
    });
  });

  it('works once', async () => {
    const { token } = await invited();
    await accept(token);
    expect((await accept(token)).notice?.text).toMatch(/no longer good/);
  });

  it('makes one account of two acceptances at the same moment', async () => {
    const { email, token } = await invited();
    const answers = await Promise.allSettled([accept(token), accept(token)]);
    expect(answers.filter((one) => one.status === 'fulfilled' && one.value.goesTo)).toHaveLength(1);
    expect(
      db
        .select()
        .from(users)
        .all()
        .filter((user) => user.email === email),
    ).toHaveLength(1);
  });

  it('stops working after seven days, when withdrawn, and when a newer one is sent', async () => {
    const withdrawn = await invited();
    const [newest] = listInvitations(await viewer());
    await orla.submit(withdrawAction, { id: newest!.id });
    expect((await accept(withdrawn.token)).notice?.text).toMatch(/no longer good/);

    const replaced = await invited();
    await orla.submit(inviteAction, { email: replaced.email });
    expect((await accept(replaced.token)).notice?.text).toMatch(/no longer good/);

    const late = await invited();
    vi.useFakeTimers({ now: Date.now() + 7 * DAY + 1000, toFake: ['Date'] });
    expect((await accept(late.token)).notice?.text).toMatch(/no longer good/);
  });

  it('is stored hashed, and its mail is written in the same transaction', async () => {
    const { email, token } = await invited();
    expect(JSON.stringify(db.select().from(invitations).all())).not.toContain(token);
    db.$client.exec(
      "create trigger broken before insert on outbox begin select raise(abort, 'no room'); end",
    );
    const before = db.select().from(invitations).all().length;
    const answer = await orla.submit(inviteAction, { email });
    db.$client.exec('drop trigger broken');
    expect(answer.notice).toMatchObject({ kind: 'refused' });
    expect(db.select().from(invitations).all()).toHaveLength(before);
    expect((await accept(token)).goesTo).toBe('/account');
  });

  it('goes to nobody who is a member already', async () => {
    const before = db.select().from(outbox).all().length;
    const answer = await orla.submit(inviteAction, { email: 'Ines@Millrace.example' });
    expect(answer.errors?.email).toMatch(/already/);
    expect(answer.values?.email).toBe('Ines@Millrace.example');
    expect(db.select().from(outbox).all()).toHaveLength(before);
  });

  it('takes no header with the address and no role there is not', async () => {
    for (const email of ['a@b.example\r\nBcc: c@d.example', 'a@b.example,c@d.example', 'a b@c.example']) {
      expect((await orla.submit(inviteAction, { email })).errors?.email, email).toBeDefined();
    }
    const answer = await orla.submit(inviteAction, { email: newAddress(), roles: ['owner'] });
    expect(answer.errors?.roles).toBeDefined();
  });

  it('takes no name with a second line and no short password, and never sends the password back', async () => {
    const { token } = await invited();
    const fields = { token, name: 'Mira\nBcc: all', password: 'short' };
    const answer = await new Browser().submit(acceptInvitationAction, fields);
    expect(Object.keys(answer.errors ?? {})).toEqual(['name', 'password']);
    expect(JSON.stringify(answer)).not.toContain('short');
    expect(JSON.stringify(answer)).not.toContain(token);
  });

  it('is told in the audit trail from the sending to the joining', async () => {
    const { email, token } = await invited(['librarian']);
    await accept(token);
    const { events } = readAudit(await viewer(), {});
    const told = events
      .filter(({ subject }) => subject === email)
      .map(({ action, actor }) => [action, actor]);
    expect(told).toEqual([
      ['member.join', 'Mira Sand'],
      ['member.invite', 'Orla Finch'],
    ]);
    expect(JSON.stringify(events)).not.toContain(token);
  });

  it('lets the new member sign in with the password they chose', async () => {
    const { email, token } = await invited();
    await accept(token);
    const answer = await new Browser().submit(signInAction, { email, password: PASSWORD });
    expect(answer.goesTo).toBe('/account');
  });

  it('printed instead of mailed proves no address: the first admin still has to confirm theirs', async () => {
    const email = newAddress();
    const token = newSecret();
    const createdAt = new Date();
    const expiresAt = new Date(createdAt.getTime() + DAY);
    const roles: Role[] = ['member', 'admin'];
    addInvitation(db, { tokenHash: digest(token), email, roles, invitedBy: null, createdAt, expiresAt });
    const browser = new Browser();
    await accept(token, browser);
    const before = await browser.within(() => currentViewer());
    expect(before).toMatchObject({ emailVerified: false, roles: ['admin', 'member'] });
    await browser.submit(confirmAddressAction, { token: tokenTo(db, email) });
    expect(await browser.within(() => currentViewer())).toMatchObject({ emailVerified: true });
  });
});
