import { spawn } from 'node:child_process';
import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { connect } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { auditEvents } from '@/db/schema/club';

const KILLS = 20;
const file = path.join(mkdtempSync(path.join(tmpdir(), 'bendwell-kill-')), 'club.sqlite');

/** The settings of the application's own connections. */
function preparedFile(): string {
  const db = connect(file);
  migrateDatabase(db);
  expect(db.$client.pragma('journal_mode', { simple: true })).toBe('wal');
  const synchronous = String(db.$client.pragma('synchronous', { simple: true }));
  db.$client.close();
  return synchronous;
}

/** Starts a writer, kills it with SIGKILL once it has acknowledged `after` writes; answers what it acknowledged. */
function killedWriter(round: number, after: number, synchronous: string): Promise<string[]> {
  const args = ['tests/support/writer.mjs', file, String(round), synchronous];
  const writer = spawn(process.execPath, args, { stdio: ['ignore', 'pipe', 'inherit'] });
  let heard = '';
  writer.stdout.on('data', (chunk: Buffer) => {
    heard += chunk.toString();
    if (heard.split('\n').length > after) writer.kill('SIGKILL');
  });
  return new Promise((resolve, reject) => {
    writer.on('close', (code, signal) => {
      if (signal === 'SIGKILL') resolve(heard.split('\n').slice(0, -1));
      else reject(new Error(`The writer ended by itself with ${code}`));
    });
  });
}

describe('a server killed in the middle of writing', () => {
  it(`loses nothing it acknowledged and leaves the database whole, ${KILLS} times over`, async () => {
    const synchronous = preparedFile();
    const acknowledged: string[] = [];
    for (let round = 0; round < KILLS; round += 1) {
      acknowledged.push(...(await killedWriter(round, 1 + ((round * 7) % 13), synchronous)));
      const db = connect(file);
      expect(db.$client.pragma('integrity_check', { simple: true }), `round ${round}`).toBe('ok');
      const there = db.select().from(auditEvents).all();
      const found = new Set(there.map(({ subject }) => subject));
      db.$client.close();
      expect(acknowledged.filter((one) => !found.has(one))).toEqual([]);
      expect(there.length, 'no half of a pair').toBe(found.size * 2);
    }
    expect(acknowledged.length).toBeGreaterThanOrEqual(KILLS);
  });
});
