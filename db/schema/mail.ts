import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { moment, ownId } from './columns';

/** Mail to be sent, written in the transaction of its cause. */
export const outbox = sqliteTable(
  'outbox',
  {
    id: ownId(),
    kind: text('kind').notNull(),
    recipient: text('recipient').notNull(),
    subject: text('subject').notNull(),
    text: text('text').notNull(),
    html: text('html').notNull(),
    state: text('state', { enum: ['waiting', 'sending', 'sent', 'given-up'] })
      .notNull()
      .default('waiting'),
    attempts: integer('attempts').notNull().default(0),
    /** when to try next; for a mail being sent, when its sender counts as lost */
    dueAt: moment('due_at').notNull(),
    lastError: text('last_error'),
    createdAt: moment('created_at').notNull(),
    sentAt: moment('sent_at'),
  },
  (table) => [
    index('outbox_due').on(table.state, table.dueAt),
    check('outbox_state', sql`${table.state} in ('waiting', 'sending', 'sent', 'given-up')`),
  ],
);
