import 'server-only';
import { database } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import { findOpenInvitation, markAccepted } from '@/db/queries/invitations';
import { addUser, findUserByEmail } from '@/db/queries/members';
import { verifyEmail } from '@/lib/mail/letters';
import { countAttempt } from './attempts';
import { LINK_MINUTES, LinkSpent, sendLink } from './links';
import { hashPassword } from './password';
import { digest } from './secret';
import { beginSession } from './session';
import type { Client } from './sign-in';

/** Who is invited by a link that still works. */
export function invitationOf(secret: string) {
  const invitation = findOpenInvitation(database(), digest(secret), new Date());
  if (!invitation) throw new LinkSpent();
  return invitation;
}

export interface Joining {
  readonly name: string;
  readonly password: string;
}

/**
 * Makes the account and signs it in. An invitation by a member was mailed, which proves the address; one made on the
 * server's own command line was not, so its address is still to be confirmed.
 */
export async function acceptInvitation(
  secret: string,
  { name, password }: Joining,
  client: Client,
): Promise<void> {
  await countAttempt('link-address', client.address);
  const { id, email, roles, invitedBy } = invitationOf(secret);
  const passwordHash = await hashPassword(password);
  const now = new Date();
  const mailed = invitedBy !== null;
  const user = { id: crypto.randomUUID(), email, name, passwordHash, createdAt: now };
  database().transaction(
    (tx) => {
      if (!markAccepted(tx, id, now) || findUserByEmail(tx, email)) throw new LinkSpent();
      addUser(tx, { ...user, emailVerifiedAt: mailed ? now : null }, roles);
      recordEvent(tx, { at: now, actor: user, action: 'member.join', subject: email, detail: { roles } });
    },
    { behavior: 'immediate' },
  );
  if (!mailed) await sendVerification(user.id, email);
  await beginSession(user.id, client.userAgent);
}

export const sendVerification = (userId: string, email: string): Promise<void> =>
  sendLink('verify-email', userId, email, (href) => verifyEmail(href, LINK_MINUTES['verify-email'] / 60));
