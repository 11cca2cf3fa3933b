import 'server-only';
import { database } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import { spendLink } from '@/db/queries/links';
import { changeUser, findUser, findUserByEmail } from '@/db/queries/members';
import { queueMail } from '@/db/queries/outbox';
import { endAllSessions } from '@/db/queries/sessions';
import { composeMail } from '@/lib/mail/compose';
import { passwordChanged, resetPassword as resetLetter } from '@/lib/mail/letters';
import { countAttempt, forgiveAttempts } from './attempts';
import { clubForMail, goodLink, LINK_MINUTES, LinkSpent, sendLink } from './links';
import { hashPassword } from './password';
import type { Client } from './sign-in';

/** Counted alike for addresses with and without an account. */
export async function countRecovery(email: string, client: Client): Promise<void> {
  await countAttempt('mail-address', client.address);
  await countAttempt('mail-account', email);
}

/** Mails a link for a new password where the address has an account. Run after the answer, which is the same for all. */
export async function sendResetLink(email: string): Promise<void> {
  const user = findUserByEmail(database(), email);
  if (!user || user.suspendedAt) return;
  await sendLink('reset-password', user.id, user.email, (href) =>
    resetLetter(href, LINK_MINUTES['reset-password']),
  );
}

/** Sets a new password by link and ends every sign-in. */
export async function resetPassword(secret: string, password: string, client: Client): Promise<void> {
  await countAttempt('link-address', client.address);
  const link = goodLink(secret, ['reset-password']);
  const user = findUser(database(), link.userId);
  if (!user || user.suspendedAt || user.email !== link.email) throw new LinkSpent();
  const passwordHash = await hashPassword(password);
  const mail = await composeMail(user.email, passwordChanged(), clubForMail());
  const now = new Date();
  database().transaction(
    (tx) => {
      if (!spendLink(tx, link.id, now)) throw new LinkSpent();
      changeUser(tx, user.id, { passwordHash, emailVerifiedAt: user.emailVerifiedAt ?? now });
      endAllSessions(tx, user.id);
      queueMail(tx, mail, now);
      recordEvent(tx, { at: now, actor: user, action: 'account.password-reset', subject: user.email });
    },
    { behavior: 'immediate' },
  );
  await forgiveAttempts('sign-in-account', user.email);
}
