import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import type { Connection } from './client';

export interface Backup {
  readonly file: string;
  /** removes the copy */
  drop(): void;
}

/** A copy of the database as one file, whole in itself, made through SQLite's backup API while others read and write. */
export async function makeBackup(db: Connection): Promise<Backup> {
  const folder = mkdtempSync(path.join(tmpdir(), 'bendwell-backup-'));
  const file = path.join(folder, 'bendwell.sqlite');
  const drop = () => rmSync(folder, { recursive: true, force: true });
  try {
    await db.$client.backup(file);
  } catch (error) {
    drop();
    throw error;
  }
  return { file, drop };
}
