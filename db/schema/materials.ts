import { sql } from 'drizzle-orm';
import { check, index, integer, real, sqliteTable, text } from 'drizzle-orm/sqlite-core';
import type { Material, Source } from '@/lib/materials/types';

/** One plastic: the validated record, and the columns that lists and rankings ask for. */
export const materials = sqliteTable(
  'materials',
  {
    id: text('id').primaryKey(),
    position: integer('position').notNull(),
    process: text('process', { enum: ['printed', 'moulded'] }).notNull(),
    name: text('name').notNull(),
    /** strain as a fraction */
    allowableOnce: real('allowable_once'),
    allowableOften: real('allowable_often'),
    /** MPa */
    modulus: real('modulus'),
    /** °C */
    serviceLimit: real('service_limit'),
    properties: text('properties', { mode: 'json' }).$type<Omit<Material, 'price'>>().notNull(),
    /** set once the club has changed the record; the seed then leaves it alone */
    editedAt: integer('edited_at', { mode: 'timestamp' }),
  },
  (table) => [
    index('materials_process_position').on(table.process, table.position),
    check('materials_process', sql`${table.process} in ('printed', 'moulded')`),
  ],
);

export const materialPrices = sqliteTable(
  'material_prices',
  {
    materialId: text('material_id')
      .primaryKey()
      .references(() => materials.id, { onDelete: 'cascade' }),
    perKg: real('per_kg').notNull(),
    currency: text('currency', { enum: ['EUR'] }).notNull(),
    /** ISO date the price was entered */
    asOf: text('as_of').notNull(),
    source: text('source', { mode: 'json' }).$type<Source>().notNull(),
    editedAt: integer('edited_at', { mode: 'timestamp' }),
  },
  (table) => [check('material_prices_per_kg', sql`${table.perKg} > 0`)],
);
