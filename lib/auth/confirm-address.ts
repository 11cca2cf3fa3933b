import 'server-only';
import { database } from '@/db/client';
import { recordEvent } from '@/db/queries/audit';
import { spendLink } from '@/db/queries/links';
import { changeUser, findUser, findUserByEmail } from '@/db/queries/members';
import { queueMail } from '@/db/queries/outbox';
import { composeMail } from '@/lib/mail/compose';
import { emailChanged } from '@/lib/mail/letters';
import { countAttempt } from './attempts';
import { clubForMail, goodLink, LinkSpent } from './links';
import type { Client } from './sign-in';

/** The address a link confirms, without using it up: mail programs open links before people do. */
export const addressToConfirm = (secret: string): string =>
  goodLink(secret, ['verify-email', 'change-email']).email;

/** Confirms the address of an account, or makes the new address the account's. */
export async function confirmAddress(secret: string, client: Client): Promise<void> {
  await countAttempt('link-address', client.address);
  const link = goodLink(secret, ['verify-email', 'change-email']);
  const user = findUser(database(), link.userId);
  if (!user) throw new LinkSpent();
  const changes = link.purpose === 'change-email';
  const notice = changes ? await composeMail(user.email, emailChanged(link.email), clubForMail()) : null;
  const now = new Date();
  database().transaction(
    (tx) => {
      const holder = findUserByEmail(tx, link.email);
      const free = changes ? holder === undefined : holder?.id === user.id;
      if (!free || !spendLink(tx, link.id, now)) throw new LinkSpent();
      changeUser(tx, user.id, { email: link.email, emailVerifiedAt: now });
      if (notice) queueMail(tx, notice, now);
      const action = changes ? 'account.email-change' : 'account.email-confirm';
      recordEvent(tx, { at: now, actor: user, action, subject: link.email });
    },
    { behavior: 'immediate' },
  );
}
