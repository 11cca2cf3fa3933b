import 'server-only';
import { database } from '@/db/client';
import { findClub } from '@/db/queries/club';
import { addLink, findLink, type LinkPurpose } from '@/db/queries/links';
import { queueMail } from '@/db/queries/outbox';
import { publicUrl } from '@/lib/env';
import { Conflict } from '@/lib/errors';
import { composeMail } from '@/lib/mail/compose';
import type { LetterSpec } from '@/lib/mail/letters';
import { digest, newSecret } from './secret';

const MINUTE = 60_000;

/** How long a link works, minutes. */
export const LINK_MINUTES: Readonly<Record<LinkPurpose, number>> = {
  'verify-email': 24 * 60,
  'change-email': 24 * 60,
  'reset-password': 30,
};

const PATHS: Readonly<Record<LinkPurpose, string>> = {
  'verify-email': 'verify-email',
  'change-email': 'verify-email',
  'reset-password': 'reset-password',
};

export const clubForMail = (): string => findClub(database())?.name ?? 'your club';

export const addressOf = (path: string, secret: string): string => `${publicUrl()}/${path}?token=${secret}`;

/** Sends a one-time link; the link and its mail are written together or not at all. */
export async function sendLink(
  purpose: LinkPurpose,
  userId: string,
  email: string,
  letter: (href: string) => LetterSpec,
): Promise<void> {
  const secret = newSecret();
  const mail = await composeMail(email, letter(addressOf(PATHS[purpose], secret)), clubForMail());
  const createdAt = new Date();
  const expiresAt = new Date(createdAt.getTime() + LINK_MINUTES[purpose] * MINUTE);
  database().transaction(
    (tx) => {
      addLink(tx, { id: digest(secret), purpose, userId, email, expiresAt, createdAt });
      queueMail(tx, mail, createdAt);
    },
    { behavior: 'immediate' },
  );
}

export class LinkSpent extends Conflict {
  constructor() {
    super('This link is no longer good: it was used, is too old, or a newer one was sent');
  }
}

/** A link that still works, and is for one of these purposes. */
export function goodLink(secret: string, purposes: readonly LinkPurpose[]) {
  const link = findLink(database(), digest(secret), new Date());
  if (!link || !purposes.includes(link.purpose)) throw new LinkSpent();
  return link;
}
