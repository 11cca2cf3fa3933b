import 'server-only';
import { mkdirSync } from 'node:fs';
import path from 'node:path';
import Database from 'better-sqlite3';
import { drizzle } from 'drizzle-orm/better-sqlite3';
import type { BaseSQLiteDatabase } from 'drizzle-orm/sqlite-core';
import { env } from '@/lib/env';
import * as club from './schema/club';
import * as designs from './schema/designs';
import * as library from './schema/library';
import * as limits from './schema/limits';
import * as mail from './schema/mail';
import * as materials from './schema/materials';
import * as members from './schema/members';

const schema = { ...materials, ...members, ...club, ...mail, ...designs, ...library, ...limits };

/** What a query takes: the database, or a transaction on it. */
export type Db = BaseSQLiteDatabase<'sync', Database.RunResult, typeof schema>;

/** Opens a database file, made with its folder when it is not there. */
export function connect(file: string) {
  if (file !== ':memory:') mkdirSync(path.dirname(path.resolve(file)), { recursive: true });
  const client = new Database(file);
  client.pragma('busy_timeout = 5000');
  client.pragma('journal_mode = WAL');
  client.pragma('synchronous = FULL');
  client.pragma('foreign_keys = ON');
  return drizzle(client, { schema });
}

export type Connection = ReturnType<typeof connect>;

let opened: Connection | undefined;

/** The one connection of this process, opened on first use so that a build never opens one. */
export function database(): Connection {
  opened ??= connect(env().DATABASE_PATH);
  return opened;
}
