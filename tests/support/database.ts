import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterAll, vi } from 'vitest';
import { type Connection, connect, database } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { seedMaterials } from '@/db/seed/materials';

/** An empty migrated database in memory. */
export function emptyDatabase(): Connection {
  const db = connect(':memory:');
  migrateDatabase(db);
  return db;
}

/** Points the application at a seeded database file of its own for the tests of this file. */
export function seededDatabase(): Connection {
  const folder = mkdtempSync(path.join(tmpdir(), 'bendwell-'));
  vi.stubEnv('DATABASE_PATH', path.join(folder, 'test.sqlite'));
  vi.stubEnv('FILES_PATH', path.join(folder, 'files'));
  vi.stubEnv('LOG_LEVEL', 'silent');
  const db = database();
  migrateDatabase(db);
  seedMaterials(db);
  afterAll(() => {
    db.$client.close();
    vi.unstubAllEnvs();
  });
  return db;
}
