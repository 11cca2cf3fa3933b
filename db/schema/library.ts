import { sql } from 'drizzle-orm';
import {
  check,
  index,
  integer,
  primaryKey,
  real,
  sqliteTable,
  text,
  uniqueIndex,
} from 'drizzle-orm/sqlite-core';
import { moment, ownId } from './columns';
import { designContent, designs, VERDICTS } from './designs';
import { users } from './members';

/** Creative Commons licences, by their SPDX identifiers. */
export const LICENCES = [
  'CC0-1.0',
  'CC-BY-4.0',
  'CC-BY-SA-4.0',
  'CC-BY-NC-4.0',
  'CC-BY-NC-SA-4.0',
  'CC-BY-ND-4.0',
  'CC-BY-NC-ND-4.0',
] as const;
export type Licence = (typeof LICENCES)[number];

/** waiting: for a librarian; sent-back: with a note, may be handed in again; retired: still readable, not listed. */
export const VERSION_STATES = ['waiting', 'sent-back', 'published', 'retired'] as const;
export type VersionState = (typeof VERSION_STATES)[number];

/** A design passed on. What it says is in its versions. */
export const presets = sqliteTable(
  'presets',
  {
    id: ownId(),
    slug: text('slug').notNull().unique(),
    /** null once the account is gone: the name stays */
    authorId: text('author_id').references(() => users.id, { onDelete: 'set null' }),
    authorName: text('author_name').notNull(),
    designId: text('design_id').references(() => designs.id, { onDelete: 'set null' }),
    /** version that the library shows; null until one is published, and again when retired */
    publishedVersionId: text('published_version_id'),
    createdAt: moment('created_at').notNull(),
    changedAt: moment('changed_at').notNull(),
  },
  (table) => [
    index('presets_author').on(table.authorId),
    index('presets_published').on(table.publishedVersionId),
  ],
);

/** One edition of a preset. Once published, only its state may change. */
export const presetVersions = sqliteTable(
  'preset_versions',
  {
    id: ownId(),
    presetId: text('preset_id')
      .notNull()
      .references(() => presets.id, { onDelete: 'cascade' }),
    number: integer('number').notNull(),
    state: text('state', { enum: VERSION_STATES }).notNull(),
    title: text('title').notNull(),
    purpose: text('purpose').notNull(),
    printingNotes: text('printing_notes').notNull(),
    tags: text('tags', { mode: 'json' }).$type<string[]>().notNull(),
    licence: text('licence', { enum: LICENCES }).notNull(),
    ...designContent(),
    kind: text('kind').notNull(),
    /** peak strain over allowable strain when handed in; null where not known */
    strainShare: real('strain_share'),
    /** bounding box on the bed, mm */
    sizeX: real('size_x').notNull(),
    sizeY: real('size_y').notNull(),
    sizeZ: real('size_z').notNull(),
    /** g; null where the density is not known */
    mass: real('mass'),
    enclosure: text('enclosure', { enum: ['needed', 'helpful', 'not-needed'] }),
    startedFrom: text('started_from'),
    handedInAt: moment('handed_in_at').notNull(),
    decidedAt: moment('decided_at'),
    decidedBy: text('decided_by').references(() => users.id, { onDelete: 'set null' }),
    decisionNote: text('decision_note'),
  },
  (table) => [
    uniqueIndex('preset_versions_number').on(table.presetId, table.number),
    index('preset_versions_state').on(table.state, table.handedInAt),
    index('preset_versions_family').on(table.family, table.state),
    check(
      'preset_versions_state_word',
      sql`${table.state} in ('waiting', 'sent-back', 'published', 'retired')`,
    ),
  ],
);

export const presetPhotos = sqliteTable(
  'preset_photos',
  {
    id: ownId(),
    versionId: text('version_id').references(() => presetVersions.id, { onDelete: 'cascade' }),
    ownerId: text('owner_id').references(() => users.id, { onDelete: 'set null' }),
    /** name of the stored file, ours */
    file: text('file').notNull(),
    alt: text('alt').notNull(),
    width: integer('width').notNull(),
    height: integer('height').notNull(),
    bytes: integer('bytes').notNull(),
    position: integer('position').notNull(),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [
    index('preset_photos_version').on(table.versionId, table.position),
    index('preset_photos_owner').on(table.ownerId),
  ],
);

/** "Worked for me" or not: one from a member for a version. */
export const presetReports = sqliteTable(
  'preset_reports',
  {
    id: ownId(),
    versionId: text('version_id')
      .notNull()
      .references(() => presetVersions.id, { onDelete: 'cascade' }),
    userId: text('user_id').references(() => users.id, { onDelete: 'set null' }),
    userName: text('user_name').notNull(),
    worked: integer('worked', { mode: 'boolean' }).notNull(),
    printer: text('printer').notNull(),
    material: text('material').notNull(),
    note: text('note').notNull(),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [uniqueIndex('preset_reports_once').on(table.versionId, table.userId)],
);

export const favourites = sqliteTable(
  'favourites',
  {
    userId: text('user_id')
      .notNull()
      .references(() => users.id, { onDelete: 'cascade' }),
    presetId: text('preset_id')
      .notNull()
      .references(() => presets.id, { onDelete: 'cascade' }),
    createdAt: moment('created_at').notNull(),
  },
  (table) => [
    primaryKey({ columns: [table.userId, table.presetId] }),
    index('favourites_preset').on(table.presetId),
  ],
);

/**
 * What the library lists: one row for each published preset, written by triggers on `presets`, `preset_reports` and
 * `favourites` and never by hand. `row` rises with each publication. The full-text index `library_search` is over it.
 */
export const libraryEntries = sqliteTable(
  'library_entries',
  {
    row: integer('row').primaryKey({ autoIncrement: true }),
    presetId: text('preset_id')
      .notNull()
      .unique()
      .references(() => presets.id, { onDelete: 'cascade' }),
    versionId: text('version_id').notNull(),
    slug: text('slug').notNull(),
    author: text('author').notNull(),
    title: text('title').notNull(),
    purpose: text('purpose').notNull(),
    notes: text('notes').notNull(),
    /** parted by blanks */
    tags: text('tags').notNull(),
    family: text('family').notNull(),
    kind: text('kind').notNull(),
    material: text('material').notNull(),
    verdict: text('verdict', { enum: VERDICTS }).notNull(),
    strainShare: real('strain_share'),
    /** longest edge of the bounding box on the bed, mm */
    longest: real('longest').notNull(),
    enclosure: text('enclosure', { enum: ['needed', 'helpful', 'not-needed'] }),
    /** what can be filtered by, as words of the full-text index */
    facets: text('facets').notNull(),
    worked: integer('worked').notNull(),
    failed: integer('failed').notNull(),
    favourites: integer('favourites').notNull(),
    publishedAt: moment('published_at').notNull(),
  },
  (table) => [
    index('library_entries_worked').on(table.worked, table.row),
    index('library_entries_favourites').on(table.favourites, table.row),
    index('library_entries_title').on(table.title, table.row),
  ],
);
