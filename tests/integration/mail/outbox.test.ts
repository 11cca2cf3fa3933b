import { spawn } from 'node:child_process';
import { mkdtempSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { afterEach, describe, expect, it } from 'vitest';
import { type Connection, connect } from '@/db/client';
import { migrateDatabase } from '@/db/migrate';
import { claimMail, countMail, listMail, queueMail, retryMail } from '@/db/queries/outbox';
import { composeMail } from '@/lib/mail/compose';
import { deliverDue, LEASE, waitAfter } from '@/lib/mail/deliver';
import { invitation, verifyEmail } from '@/lib/mail/letters';
import { type Sender, smtpSender } from '@/lib/mail/transport';
import { startMailBox } from '@/lib/scripts/mail-box.mjs';
import { emptyDatabase } from '../../support/database';

const CLUB = 'Millrace Model Club';
const START = new Date('2026-12-01T12:00:00Z');
const later = (milliseconds: number) => new Date(START.getTime() + milliseconds);
const at = (moment: Date) => () => moment;

type Box = Awaited<ReturnType<typeof startMailBox>>;
const open: { close(): unknown }[] = [];
afterEach(async () => {
  for (const one of open.splice(0)) await one.close();
});

async function mailBox(smtpPort = 0): Promise<Box> {
  const box = await startMailBox({ smtpPort });
  open.push(box);
  return box;
}

function sender(url: string): Sender {
  const made = smtpSender(url);
  open.push(made);
  return made;
}

const letter = () =>
  composeMail(
    'bram@millrace.example',
    invitation('Orla Finch', CLUB, 'http://127.0.0.1/accept?token=abc', 7),
    CLUB,
  );

async function withOneMail(db: Connection = emptyDatabase()): Promise<Connection> {
  queueMail(db, await letter(), START);
  return db;
}

const states = (db: Connection) => listMail(db, { limit: 10, offset: 0 }).map(({ state }) => state);

describe('outgoing mail', () => {
  it('arrives once, with a text and an HTML part that both hold the link', async () => {
    const db = await withOneMail();
    const box = await mailBox();
    expect(await deliverDue(db, sender(box.smtpUrl), at(START))).toBe(1);
    expect(await deliverDue(db, sender(box.smtpUrl), at(later(LEASE * 2)))).toBe(0);
    expect(box.mails).toHaveLength(1);
    expect(box.mails[0]).toMatchObject({
      to: 'bram@millrace.example',
      subject: 'Orla Finch invites you to Millrace Model Club',
    });
    for (const part of ['text', 'html'] as const) {
      expect(box.mails[0]![part]).toContain('http://127.0.0.1/accept?token=abc');
    }
  });

  it('is erased from the database once sent, as its link may open an account', async () => {
    const db = await withOneMail();
    const box = await mailBox();
    await deliverDue(db, sender(box.smtpUrl), at(START));
    expect(states(db)).toEqual(['sent']);
    expect(JSON.stringify(db.$client.prepare('select * from outbox').all())).not.toContain('token=abc');
  });

  it('waits while the server is down and arrives when it is up', async () => {
    const gone = await startMailBox();
    const { smtpUrl } = gone;
    await gone.close();
    const db = await withOneMail();
    expect(await deliverDue(db, sender(smtpUrl), at(START))).toBe(0);
    const [mail] = listMail(db, { limit: 1, offset: 0 });
    expect(mail).toMatchObject({ state: 'waiting', attempts: 1, dueAt: later(waitAfter(1)) });
    expect(mail?.lastError).toContain('ECONNREFUSED');

    const box = await mailBox(Number(new URL(smtpUrl).port));
    expect(await deliverDue(db, sender(smtpUrl), at(later(waitAfter(1) - 1)))).toBe(0);
    expect(await deliverDue(db, sender(smtpUrl), at(later(waitAfter(1))))).toBe(1);
    expect(box.mails).toHaveLength(1);
  });

  it('is never given up while the server is down', async () => {
    const db = await withOneMail();
    const down: Sender = { send: () => Promise.reject(new Error('connect ECONNREFUSED')), close: () => {} };
    for (let day = 0; day < 100; day += 1) await deliverDue(db, down, at(later(day * 86_400_000)));
    expect(states(db)).toEqual(['waiting']);
  });

  it('is given up when the server refuses it for good, and can be tried again', async () => {
    const db = await withOneMail();
    const refusing: Sender = {
      send: () => Promise.reject(Object.assign(new Error('550 no such user'), { responseCode: 550 })),
      close: () => {},
    };
    await deliverDue(db, refusing, at(START));
    const [mail] = listMail(db, { limit: 1, offset: 0 });
    expect(mail).toMatchObject({ state: 'given-up', lastError: '550 no such user' });
    expect(retryMail(db, mail!.id, START)).toBe(true);
    expect(states(db)).toEqual(['waiting']);
  });

  it('is sent by one of two workers, never by both', async () => {
    const db = emptyDatabase();
    const mail = await letter();
    for (let i = 0; i < 20; i += 1) queueMail(db, mail, START);
    const box = await mailBox();
    const sent = await Promise.all([
      deliverDue(db, sender(box.smtpUrl), at(START)),
      deliverDue(db, sender(box.smtpUrl), at(START)),
    ]);
    expect(sent[0]! + sent[1]!).toBe(20);
    expect(sent.every((count) => count > 0)).toBe(true);
    expect(new Set(box.mails.map(({ messageId }) => messageId)).size).toBe(20);
    expect(countMail(db)).toMatchObject({ sent: 20, waiting: 0, sending: 0 });
  });

  it('is neither taken by another worker before the lease runs out nor marked by one that lost it', async () => {
    const db = await withOneMail();
    let wake = () => {};
    const slow: Sender = {
      send: () =>
        new Promise((resolve) => {
          wake = resolve;
        }),
      close: () => {},
    };
    const first = deliverDue(db, slow, at(START));
    expect(claimMail(db, later(LEASE - 1), LEASE)).toBeUndefined();
    expect(claimMail(db, later(LEASE), LEASE)).toMatchObject({ attempts: 2 });
    wake();
    await first;
    expect(states(db)).toEqual(['sending']);
  });

  it('survives a worker killed between sending and marking, with the same Message-ID on the second copy', async () => {
    const file = path.join(mkdtempSync(path.join(tmpdir(), 'bendwell-mail-')), 'mail.sqlite');
    const db = connect(file);
    open.push({ close: () => db.$client.close() });
    migrateDatabase(db);
    await withOneMail(db);
    const box = await mailBox();
    await killedAfterSending(file, box.smtpUrl);
    expect(box.mails).toHaveLength(1);
    expect(states(db)).toEqual(['sending']);

    const afterLease = new Date(Date.now() + LEASE + 1000);
    expect(await deliverDue(db, sender(box.smtpUrl), at(afterLease))).toBe(1);
    expect(states(db)).toEqual(['sent']);
    expect(box.mails).toHaveLength(2);
    expect(box.mails[0]!.messageId).toBe(box.mails[1]!.messageId);
  });
});

/** A worker of its own process that kills itself with SIGKILL when the server has taken the mail. */
function killedAfterSending(file: string, smtpUrl: string): Promise<void> {
  const worker = spawn(
    process.execPath,
    [
      'node_modules/tsx/dist/cli.mjs',
      '--conditions=react-server',
      'tests/support/killed-mail-worker.ts',
      file,
      smtpUrl,
    ],
    { stdio: ['ignore', 'ignore', 'inherit'] },
  );
  return new Promise((resolve) => worker.on('exit', () => resolve()));
}

describe('the headers of a mail', () => {
  const spec = verifyEmail('http://127.0.0.1/verify-email?token=abc', 24);

  it('take no second header smuggled in with the address', async () => {
    for (const address of [
      'bram@millrace.example\r\nBcc: all@millrace.example',
      'bram@millrace.example, all@millrace.example',
      'bram@millrace.example\u2028Bcc: all@millrace.example',
      '<bram@millrace.example> NOTIFY=NEVER',
      'bram@millrace.example\0',
    ]) {
      await expect(composeMail(address, spec, CLUB), JSON.stringify(address)).rejects.toThrow(
        /cannot be written/,
      );
    }
  });

  it('take no second header smuggled in with a name', async () => {
    const forged = invitation('Orla\r\nBcc: all@millrace.example\r\n\r\nBuy', CLUB, 'http://127.0.0.1/', 7);
    await expect(composeMail('bram@millrace.example', forged, CLUB)).rejects.toThrow(/one line/);
  });

  it('stay whole with names of any script, quotes and angle brackets', async () => {
    const db = emptyDatabase();
    const name = 'Zoë "<Ø>" 木村; x=y';
    queueMail(
      db,
      await composeMail('bram@millrace.example', invitation(name, CLUB, 'http://127.0.0.1/', 7), CLUB),
      START,
    );
    const box = await mailBox();
    await deliverDue(db, sender(box.smtpUrl), at(START));
    expect(box.mails[0]!.subject).toBe(`${name} invites you to ${CLUB}`);
    expect(box.mails[0]!.headers).not.toContain('bcc');
    expect(box.mails[0]!.html).not.toContain('"<Ø>"');
  });
});
