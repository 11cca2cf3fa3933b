import { integer, text } from 'drizzle-orm/sqlite-core';

/** A random id of our own, as primary key. */
export const ownId = () =>
  text('id')
    .primaryKey()
    .$defaultFn(() => crypto.randomUUID());

/** A moment in milliseconds since 1970. */
export const moment = (name: string) => integer(name, { mode: 'timestamp_ms' });
