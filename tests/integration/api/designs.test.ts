import { afterAll, describe, expect, it, vi } from 'vitest';
import { POST as copy } from '@/app/api/v1/designs/[id]/copy/route';
import { GET as picture } from '@/app/api/v1/designs/[id]/picture/route';
import { DELETE, GET, PATCH, PUT } from '@/app/api/v1/designs/[id]/route';
import { POST as restore } from '@/app/api/v1/designs/[id]/states/[state]/restore/route';
import { GET as list, POST } from '@/app/api/v1/designs/route';
import type { Design } from '@/lib/access/designs';
import type { Viewer } from '@/lib/auth/viewer';
import { closePicturePool } from '@/lib/jobs/picture-pool';
import { get, problemOf, sendTo } from '../../support/api';
import { seededDatabase } from '../../support/database';
import { memberOf } from '../../support/viewers';

const asked = vi.hoisted(() => ({ viewer: null as Viewer }));
vi.mock('@/lib/auth/session', () => ({ currentViewer: () => Promise.resolve(asked.viewer) }));

/** Who asks from now on, in place of the cookie. */
const askAs = (viewer: Viewer) => {
  asked.viewer = viewer;
};

const db = seededDatabase();
const ines = memberOf(db, 'Ines Moor');
const tom = memberOf(db, 'Tom Reed');
afterAll(() => closePicturePool());

const HINGE = { family: 'living-hinge', material: 'pp' };
const at = '/api/v1/designs';

async function kept(): Promise<Design> {
  askAs(ines);
  const response = await sendTo(POST, 'POST', at, { body: { ...HINGE, name: 'Lid' } });
  expect(response.status).toBe(201);
  return (await response.json()) as Design;
}

describe('the designs API', () => {
  it('asks a visitor to sign in', async () => {
    askAs(null);
    await problemOf(await get(list, at), 'sign-in-needed');
    await problemOf(await sendTo(POST, 'POST', at, { body: { ...HINGE, name: 'Lid' } }), 'sign-in-needed');
  });

  it('does not find the design of another member', async () => {
    const { id } = await kept();
    askAs(tom);
    const params = { id };
    await problemOf(await get(GET, `${at}/${id}`, params), 'not-found');
    await problemOf(await get(picture, `${at}/${id}/picture`, params), 'not-found');
    await problemOf(await sendTo(copy, 'POST', `${at}/${id}/copy`, { params }), 'not-found');
    await problemOf(await sendTo(DELETE, 'DELETE', `${at}/${id}`, { params }), 'not-found');
  });

  it('answers a save on an old revision with a conflict', async () => {
    const { id } = await kept();
    const save = (revision: number) =>
      sendTo(PUT, 'PUT', `${at}/${id}`, { params: { id }, body: { ...HINGE, revision } });
    expect((await save(1)).status).toBe(200);
    await problemOf(await save(1), 'conflict');
    const stale = { params: { id, state: '1' }, body: { revision: 1 } };
    await problemOf(await sendTo(restore, 'POST', `${at}/${id}/states/1/restore`, stale), 'conflict');
  });

  it('takes no change from a page of another site, whoever is signed in', async () => {
    const { id } = await kept();
    const foreign: Record<string, string>[] = [
      { 'Sec-Fetch-Site': 'cross-site' },
      { 'Sec-Fetch-Site': 'same-site' },
      { Origin: 'https://elsewhere.example' },
    ];
    for (const headers of foreign) {
      const sent = await sendTo(DELETE, 'DELETE', `${at}/${id}`, { params: { id }, headers });
      await problemOf(sent, 'not-allowed');
    }
    expect((await get(GET, `${at}/${id}`, { id })).status).toBe(200);
  });

  it.each([
    ['no name', { name: ' ' }, 'name'],
    ['a name too long', { name: 'x'.repeat(81) }, 'name'],
    ['a name of several lines', { name: 'one\ntwo' }, 'name'],
    ['a parameter out of bounds', { parameters: { webLength: -1 } }, 'webLength'],
    ['an unknown field', { owner: 'tom' }, 'owner'],
    ['a verdict of its own', { verdict: 'within-limit' }, 'verdict'],
  ])('refuses %s', async (_, change, field) => {
    askAs(ines);
    const problem = await problemOf(
      await sendTo(POST, 'POST', at, { body: { ...HINGE, name: 'Lid', ...change } }),
      'invalid-input',
    );
    expect(problem.errors?.map((one) => one.field)).toContain(field);
  });

  it('renames, and reads any address of the list without failing', async () => {
    const { id } = await kept();
    const renamed = await sendTo(PATCH, 'PATCH', `${at}/${id}`, { params: { id }, body: { name: 'Hatch' } });
    expect(await renamed.json()).toMatchObject({ name: 'Hatch', revision: 1 });
    for (const query of [
      'page=-3',
      'sort=%27;drop',
      'verdict=odd&order=sideways',
      `search=${'x'.repeat(500)}`,
    ]) {
      expect((await get(list, `${at}?${query}`)).status).toBe(200);
    }
  });

  it('sends a picture once, and again only when the part has changed', async () => {
    const { id } = await kept();
    const ask = (headers = {}) => get(picture, `${at}/${id}/picture`, { id }, headers);
    const first = await ask();
    expect(first.headers.get('content-type')).toBe('image/webp');
    expect(first.headers.get('cache-control')).toBe('private, no-cache');
    const tag = first.headers.get('etag')!;
    expect((await ask({ 'If-None-Match': tag })).status).toBe(304);
    const body = { ...HINGE, revision: 1, parameters: { leafWidth: 61 } };
    await sendTo(PUT, 'PUT', `${at}/${id}`, { params: { id }, body });
    expect((await ask({ 'If-None-Match': tag })).status).toBe(200);
  });
});
