import { existsSync, mkdtempSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { describe, expect, it } from 'vitest';
import { POST as backup } from '@/app/(club)/admin/club/backup/route';
import { inviteAction } from '@/app/(club)/admin/invitations/actions';
import { makeBackup } from '@/db/backup';
import { connect } from '@/db/client';
import { restoreDatabase } from '@/db/restore';
import { invitations, users } from '@/db/schema/members';
import { OWN_PAGE, SITE } from '../../support/browser';
import { demoClub, signedIn } from '../../support/demo-club';

const db = await demoClub();
const orla = await signedIn('orla');
const folder = mkdtempSync(path.join(tmpdir(), 'bendwell-restore-'));

function download(
  browser: typeof orla,
  head: Readonly<Record<string, string>> = OWN_PAGE,
): Promise<Response> {
  const cookie = [...browser.jar].map(([name, value]) => `${name}=${value}`).join('; ');
  const request = new Request(`${SITE}/admin/club/backup`, { method: 'POST' });
  for (const [name, value] of Object.entries({ ...head, cookie })) request.headers.set(name, value);
  return browser.within(() => backup(request, { params: Promise.resolve({}) }), head);
}

const names = (file: string): string[] => {
  const copy = connect(file);
  const found = copy.select({ name: users.name }).from(users).all();
  copy.$client.close();
  return found.map(({ name }) => name).sort();
};

describe('a backup', () => {
  it('downloads as one whole file that restores to what the club had, keeping what was there', async () => {
    const response = await download(orla);
    expect(response.status).toBe(200);
    expect(response.headers.get('content-disposition')).toMatch(/attachment; filename="bendwell-.*\.sqlite"/);
    const file = path.join(folder, 'backup.sqlite');
    writeFileSync(file, Buffer.from(await response.arrayBuffer()));
    const had = db
      .select({ name: users.name })
      .from(users)
      .all()
      .map(({ name }) => name)
      .sort();

    const target = path.join(folder, 'club.sqlite');
    const broken = connect(target);
    broken.$client.exec('create table ruined (id)');
    broken.$client.close();
    const kept = restoreDatabase(file, target, 'now');
    expect(names(target)).toEqual(had);
    expect(kept).toBe(`${target}.before-now`);
    expect(existsSync(kept!)).toBe(true);

    const restored = connect(target);
    expect(restored.$client.pragma('integrity_check', { simple: true })).toBe('ok');
    expect(restored.$client.pragma('foreign_key_check')).toEqual([]);
    restored.$client.close();
  });

  it('holds what was written up to its beginning, while others write on', async () => {
    await orla.submit(inviteAction, { email: 'before@millrace.example' });
    const { file, drop } = await makeBackup(db);
    await orla.submit(inviteAction, { email: 'after@millrace.example' });
    const copy = connect(file);
    const emails = copy
      .select()
      .from(invitations)
      .all()
      .map(({ email }) => email);
    copy.$client.close();
    drop();
    expect(emails).toEqual(['before@millrace.example']);
    expect(existsSync(file)).toBe(false);
  });

  it('is refused to a request from another site, even with an admin’s cookie', async () => {
    expect((await download(orla, { ...OWN_PAGE, origin: 'https://evil.example' })).status).toBe(403);
    expect((await download(orla, { ...OWN_PAGE, 'sec-fetch-site': 'cross-site' })).status).toBe(403);
  });

  it('is not taken for one when damaged or foreign, and the database stays as it was', async () => {
    const { file, drop } = await makeBackup(db);
    const target = path.join(folder, 'kept.sqlite');
    restoreDatabase(file, target, 'first');
    drop();
    const before = names(target);
    const junk = path.join(folder, 'junk.sqlite');
    writeFileSync(junk, 'this is no database');
    expect(() => restoreDatabase(junk, target, 'second')).toThrow(/not a database/);
    const foreign = connect(path.join(folder, 'foreign.sqlite'));
    foreign.$client.exec('create table notes (text)');
    foreign.$client.close();
    expect(() => restoreDatabase(path.join(folder, 'foreign.sqlite'), target, 'third')).toThrow(
      /not a backup/,
    );
    expect(names(target)).toEqual(before);
  });
});
