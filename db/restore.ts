import { copyFileSync, existsSync, mkdirSync, renameSync } from 'node:fs';
import path from 'node:path';
import { pathToFileURL } from 'node:url';
import Database from 'better-sqlite3';
import { env } from '@/lib/env';
import { connect } from './client';
import { migrateDatabase } from './migrate';

const TAILS = ['', '-wal', '-shm'];

/** Throws unless the file is a whole database of this program. */
function examine(file: string): void {
  const db = new Database(file, { readonly: true, fileMustExist: true });
  try {
    const integrity = db.pragma('integrity_check', { simple: true });
    if (integrity !== 'ok') throw new Error(`${file} is damaged: ${String(integrity)}`);
    const ours = db.prepare("select 1 from sqlite_master where name = 'users'").get();
    if (!ours) throw new Error(`${file} is not a backup of Bendwell`);
  } finally {
    db.close();
  }
}

/**
 * Puts a backup in the place of the database. Stop the server first. What stood there before is kept beside it, under the
 * name answered; null where there was nothing.
 */
export function restoreDatabase(backup: string, target: string, stamp: string): string | null {
  examine(backup);
  mkdirSync(path.dirname(path.resolve(target)), { recursive: true });
  const kept = existsSync(target) ? `${target}.before-${stamp}` : null;
  for (const tail of TAILS) {
    if (kept && existsSync(target + tail)) renameSync(target + tail, kept + tail);
  }
  copyFileSync(backup, target);
  const db = connect(target);
  migrateDatabase(db);
  db.$client.close();
  return kept;
}

if (import.meta.url === pathToFileURL(process.argv[1] ?? '').href) {
  const backup = process.argv[2];
  if (!backup) throw new Error('Name the backup: npm run db:restore -- path/to/backup.sqlite');
  const target = env().DATABASE_PATH;
  const kept = restoreDatabase(backup, target, new Date().toISOString().replaceAll(/[:.]/g, '-'));
  console.log(`${target} is restored from ${backup}${kept ? `; what was there is kept as ${kept}` : ''}`);
}
