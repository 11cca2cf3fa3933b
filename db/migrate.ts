import path from 'node:path';
import { pathToFileURL } from 'node:url';
import { migrate } from 'drizzle-orm/better-sqlite3/migrator';
import { env } from '@/lib/env';
import { type Connection, connect } from './client';

export const migrateDatabase = (db: Connection): void =>
  migrate(db, { migrationsFolder: path.resolve('drizzle') });

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  const db = connect(env().DATABASE_PATH);
  migrateDatabase(db);
  db.$client.close();
  console.log(`${env().DATABASE_PATH} is up to date`);
}
