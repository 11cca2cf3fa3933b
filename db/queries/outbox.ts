import { and, asc, count, desc, eq, inArray, lte, sql } from 'drizzle-orm';
import type { Db } from '../client';
import { outbox } from '../schema/mail';

export interface NewMail {
  readonly kind: string;
  readonly recipient: string;
  readonly subject: string;
  readonly text: string;
  readonly html: string;
}

export type MailState = 'waiting' | 'sending' | 'sent' | 'given-up';

/** Queues a mail; called in the transaction of its cause, so that both happen or neither. */
export function queueMail(db: Db, mail: NewMail, now: Date): void {
  db.insert(outbox)
    .values({ ...mail, dueAt: now, createdAt: now })
    .run();
}

/**
 * Takes the next due mail for `lease` milliseconds: one statement, so no two workers take the same. A mail whose worker
 * died is due again when its lease runs out.
 */
export function claimMail(db: Db, now: Date, lease: number) {
  const next = db
    .select({ id: outbox.id })
    .from(outbox)
    .where(and(inArray(outbox.state, ['waiting', 'sending']), lte(outbox.dueAt, now)))
    .orderBy(asc(outbox.dueAt))
    .limit(1);
  return db
    .update(outbox)
    .set({
      state: 'sending',
      attempts: sql`${outbox.attempts} + 1`,
      dueAt: new Date(now.getTime() + lease),
    })
    .where(inArray(outbox.id, next))
    .returning()
    .get();
}

export type ClaimedMail = NonNullable<ReturnType<typeof claimMail>>;

/** Only the worker that holds the mail may write its end: the count of attempts is its claim. */
const held = ({ id, attempts }: ClaimedMail) =>
  and(eq(outbox.id, id), eq(outbox.state, 'sending'), eq(outbox.attempts, attempts));

/** The body is erased once sent: it may hold a link that opens an account. */
export function markSent(db: Db, mail: ClaimedMail, now: Date): void {
  db.update(outbox)
    .set({ state: 'sent', sentAt: now, lastError: null, text: '', html: '' })
    .where(held(mail))
    .run();
}

export function putBack(db: Db, mail: ClaimedMail, error: string, dueAt: Date): void {
  db.update(outbox).set({ state: 'waiting', lastError: error, dueAt }).where(held(mail)).run();
}

export function giveUp(db: Db, mail: ClaimedMail, error: string): void {
  db.update(outbox).set({ state: 'given-up', lastError: error }).where(held(mail)).run();
}

/** Lets a mail that was given up be tried again; false when there is none. */
export const retryMail = (db: Db, id: string, now: Date): boolean =>
  db
    .update(outbox)
    .set({ state: 'waiting', attempts: 0, dueAt: now })
    .where(and(eq(outbox.id, id), eq(outbox.state, 'given-up')))
    .run().changes > 0;

/** Newest first, without the bodies. */
export const listMail = (db: Db, page: { readonly limit: number; readonly offset: number }) =>
  db
    .select({
      id: outbox.id,
      kind: outbox.kind,
      recipient: outbox.recipient,
      subject: outbox.subject,
      state: outbox.state,
      attempts: outbox.attempts,
      dueAt: outbox.dueAt,
      lastError: outbox.lastError,
      createdAt: outbox.createdAt,
      sentAt: outbox.sentAt,
    })
    .from(outbox)
    .orderBy(desc(outbox.createdAt), desc(outbox.id))
    .limit(page.limit)
    .offset(page.offset)
    .all();

export function countMail(db: Db): Readonly<Record<MailState, number>> {
  const rows = db.select({ state: outbox.state, found: count() }).from(outbox).groupBy(outbox.state).all();
  const found = Object.fromEntries(rows.map(({ state, found }) => [state, found]));
  return { waiting: 0, sending: 0, sent: 0, 'given-up': 0, ...found };
}
