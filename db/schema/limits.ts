import { integer, sqliteTable, text } from 'drizzle-orm/sqlite-core';

/** Counters of attempts that must survive a restart. The columns are those of rate-limiter-flexible. */
export const rateLimits = sqliteTable('rate_limits', {
  key: text('key').primaryKey(),
  points: integer('points').notNull().default(0),
  /** milliseconds since 1970 */
  expire: integer('expire'),
});
