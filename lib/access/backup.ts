import 'server-only';
import { createReadStream, statSync } from 'node:fs';
import { Readable } from 'node:stream';
import { type Backup, makeBackup } from '@/db/backup';
import { database } from '@/db/client';
import { permit, type Viewer } from './policy';
import { audited } from './transact';

export interface BackupFile {
  readonly name: string;
  readonly size: number;
  readonly content: ReadableStream<Uint8Array>;
}

function streamOf({ file, drop }: Backup): ReadableStream<Uint8Array> {
  const stream = createReadStream(file);
  stream.once('close', drop);
  return Readable.toWeb(stream) as ReadableStream<Uint8Array>;
}

/** The whole database as it stands; the copy on disk is gone once it was read. */
export async function backupDatabase(viewer: Viewer): Promise<BackupFile> {
  const actor = permit(viewer, 'club.manage');
  const backup = await makeBackup(database());
  const now = new Date().toISOString().slice(0, 19).replaceAll(':', '-');
  const name = `bendwell-${now}.sqlite`;
  audited(actor, { action: 'club.backup', subject: name }, () => undefined);
  return { name, size: statSync(backup.file).size, content: streamOf(backup) };
}
