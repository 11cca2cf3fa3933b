import 'server-only';
import { database } from '@/db/client';
import { changeUser, countOtherAdmins, deleteUser, findUser, findUserByEmail } from '@/db/queries/members';
import { queueMail } from '@/db/queries/outbox';
import * as sessions from '@/db/queries/sessions';
import { sendVerification } from '@/lib/auth/accept-invitation';
import { countAttempt, forgiveAttempts } from '@/lib/auth/attempts';
import { clubForMail, LINK_MINUTES, sendLink } from '@/lib/auth/links';
import { hashPassword, passwordMatches } from '@/lib/auth/password';
import { Conflict, InvalidInput, NotFound } from '@/lib/errors';
import { composeMail } from '@/lib/mail/compose';
import { addressTaken, passwordChanged, verifyEmail } from '@/lib/mail/letters';
import { type Member, permit, type Viewer } from './policy';
import { audited } from './transact';

export interface OwnSession {
  readonly id: string;
  /** ISO 8601 */
  readonly since: string;
  readonly seen: string;
  readonly userAgent: string;
}

/** Asks for the password again before something that cannot be taken back. */
async function reauthenticate(member: Member, password: string): Promise<void> {
  await countAttempt('password-account', member.id);
  const user = findUser(database(), member.id);
  if (!(await passwordMatches(user?.passwordHash, password))) {
    throw new InvalidInput([{ field: 'password', message: 'This is not your present password' }]);
  }
  await forgiveAttempts('password-account', member.id);
}

export function renameSelf(viewer: Viewer, name: string): void {
  const member = permit(viewer, 'account.own');
  audited(member, { action: 'account.rename', subject: member.email, detail: { name } }, (tx) =>
    changeUser(tx, member.id, { name }),
  );
}

/** Sets a new password and ends every sign-in; the caller begins a new one. */
export async function changePassword(viewer: Viewer, password: string, next: string): Promise<Member> {
  const member = permit(viewer, 'account.own');
  await reauthenticate(member, password);
  const passwordHash = await hashPassword(next);
  const mail = await composeMail(member.email, passwordChanged(), clubForMail());
  audited(member, { action: 'account.password', subject: member.email }, (tx, now) => {
    changeUser(tx, member.id, { passwordHash });
    sessions.endAllSessions(tx, member.id);
    queueMail(tx, mail, now);
  });
  return member;
}

/** Mails a link to the new address. The answer is the same when another account has it; its owner is told instead. */
export async function askEmailChange(viewer: Viewer, password: string, email: string): Promise<void> {
  const member = permit(viewer, 'account.own');
  await reauthenticate(member, password);
  await countAttempt('mail-account', member.email);
  if (findUserByEmail(database(), email)) {
    const mail = await composeMail(email, addressTaken(), clubForMail());
    queueMail(database(), mail, new Date());
    return;
  }
  await sendLink('change-email', member.id, email, (href) =>
    verifyEmail(href, LINK_MINUTES['change-email'] / 60),
  );
}

export async function askVerification(viewer: Viewer): Promise<void> {
  const member = permit(viewer, 'account.own');
  if (member.emailVerified) throw new Conflict('This address is confirmed already');
  await countAttempt('mail-account', member.email);
  await sendVerification(member.id, member.email);
}

export function listOwnSessions(viewer: Viewer): OwnSession[] {
  const member = permit(viewer, 'account.own');
  return sessions
    .listSessions(database(), member.id, new Date())
    .map(({ id, createdAt, seenAt, userAgent }) => ({
      id,
      since: createdAt.toISOString(),
      seen: seenAt.toISOString(),
      userAgent,
    }));
}

export function endOwnSession(viewer: Viewer, id: string): void {
  const member = permit(viewer, 'account.own');
  if (!sessions.endSession(database(), member.id, id)) throw new NotFound('The sign-in');
}

export function endOtherSessions(viewer: Viewer, present: string): void {
  const member = permit(viewer, 'account.own');
  sessions.endOtherSessions(database(), member.id, present);
}

/**
 * Deletes the account with its designs. Published presets stay, with the name of their author, as others build on them.
 */
export async function deleteAccount(viewer: Viewer, password: string): Promise<void> {
  const member = permit(viewer, 'account.own');
  await reauthenticate(member, password);
  audited(member, { action: 'account.delete', subject: member.email }, (tx) => {
    if (member.roles.includes('admin') && countOtherAdmins(tx, member.id) === 0) {
      throw new Conflict('You are the only admin. Make another member admin first');
    }
    deleteUser(tx, member.id);
  });
}
