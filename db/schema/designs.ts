import { index, integer, sqliteTable, text, uniqueIndex } from 'drizzle-orm/sqlite-core';
import type { Use } from '@/lib/materials/types';
import { moment, ownId } from './columns';
import { users } from './members';

export const VERDICTS = ['within-limit', 'close-to-limit', 'over-limit', 'not-known'] as const;

/** What a design says: everything the check and the build need. */
export const designContent = () => ({
  family: text('family').notNull(),
  material: text('material').notNull(),
  use: text('use', { mode: 'json' }).$type<Use>().notNull(),
  values: text('values', { mode: 'json' }).$type<Record<string, unknown>>().notNull(),
  /** worst verdict when it was saved */
  verdict: text('verdict', { enum: VERDICTS }).notNull(),
});

export const designs = sqliteTable(
  'designs',
  {
    id: ownId(),
    ownerId: text('owner_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    name: text('name').notNull(),
    ...designContent(),
    /** version of a preset it started from */
    startedFrom: text('started_from'),
    /** rises with each save; a save names the revision it changes */
    revision: integer('revision').notNull().default(1),
    createdAt: moment('created_at').notNull(),
    changedAt: moment('changed_at').notNull(),
    /** set while a deletion can be undone */
    deletedAt: moment('deleted_at'),
  },
  (table) => [
    index('designs_owner_changed').on(table.ownerId, table.changedAt),
    index('designs_deleted').on(table.deletedAt),
  ],
);

/** Saved states of a design, oldest numbered 1. */
export const designStates = sqliteTable(
  'design_states',
  {
    id: ownId(),
    designId: text('design_id')
      .notNull()
      .references(() => designs.id, { onDelete: 'cascade' }),
    revision: integer('revision').notNull(),
    name: text('name').notNull(),
    ...designContent(),
    /** first save of this state: saves soon after it take its place */
    begunAt: moment('begun_at').notNull(),
    savedAt: moment('saved_at').notNull(),
  },
  (table) => [uniqueIndex('design_states_revision').on(table.designId, table.revision)],
);
