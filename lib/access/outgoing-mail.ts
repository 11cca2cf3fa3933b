import 'server-only';
import { database } from '@/db/client';
import * as queries from '@/db/queries/outbox';
import { env } from '@/lib/env';
import { NotFound } from '@/lib/errors';
import { permit, type Viewer } from './policy';
import { audited } from './transact';

export interface MailSummary {
  readonly id: string;
  readonly kind: string;
  readonly recipient: string;
  readonly subject: string;
  readonly state: queries.MailState;
  readonly attempts: number;
  /** ISO 8601 */
  readonly created: string;
  readonly due: string;
  readonly sent: string | null;
  readonly lastError: string | null;
}

export interface OutgoingMail {
  readonly mails: readonly MailSummary[];
  readonly counts: Readonly<Record<queries.MailState, number>>;
  /** host of the mail server; null when none is set and mail waits */
  readonly server: string | null;
  /** page of the demo's own mail server */
  readonly mailBox: string | null;
}

export const MAILS_PER_PAGE = 60;

export function readOutgoingMail(viewer: Viewer, page: number): OutgoingMail {
  permit(viewer, 'mail.read');
  const limit = MAILS_PER_PAGE;
  const mails = queries.listMail(database(), { limit, offset: (page - 1) * limit });
  const { SMTP_URL, MAIL_BOX_URL } = env();
  return {
    mails: mails.map(({ createdAt, dueAt, sentAt, ...rest }) => ({
      ...rest,
      created: createdAt.toISOString(),
      due: dueAt.toISOString(),
      sent: sentAt?.toISOString() ?? null,
    })),
    counts: queries.countMail(database()),
    server: SMTP_URL === undefined ? null : new URL(SMTP_URL).host,
    mailBox: MAIL_BOX_URL ?? null,
  };
}

export function sendAgain(viewer: Viewer, id: string): void {
  const actor = permit(viewer, 'club.manage');
  audited(actor, { action: 'mail.send-again', subject: id }, (tx, now) => {
    if (!queries.retryMail(tx, id, now)) throw new NotFound('A mail that was given up');
  });
}
