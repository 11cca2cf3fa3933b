import { sql } from 'drizzle-orm';
import { check, index, integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import { moment } from './columns';
import { users } from './members';

/** One row: how this club's instance is set up. */
export const clubSettings = sqliteTable(
  'club_settings',
  {
    id: integer('id').primaryKey(),
    name: text('name').notNull(),
    contactEmail: text('contact_email'),
    changedAt: moment('changed_at').notNull(),
  },
  (table) => [check('club_settings_one_row', sql`${table.id} = 1`)],
);

/** Who did what. Rows are only ever added; the name stays when the account is gone. */
export const auditEvents = sqliteTable(
  'audit_events',
  {
    id: integer('id').primaryKey({ autoIncrement: true }),
    at: moment('at').notNull(),
    actorId: text('actor_id').references(() => users.id, { onDelete: 'set null' }),
    actorName: text('actor_name').notNull(),
    /** "member.suspend", "preset.publish", ... */
    action: text('action').notNull(),
    subject: text('subject').notNull(),
    detail: text('detail', { mode: 'json' }).$type<Record<string, unknown>>().notNull(),
  },
  (table) => [index('audit_events_at').on(table.at), index('audit_events_actor').on(table.actorId)],
);
