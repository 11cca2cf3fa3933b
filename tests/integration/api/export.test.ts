import { unzipSync } from 'fflate';
import { afterAll, describe, expect, it } from 'vitest';
import { GET, POST } from '@/app/api/v1/export/route';
import { FAMILIES } from '@/generators';
import type { FieldIssue } from '@/lib/errors';
import { EXPORT_WORDS } from '@/lib/http/v1/requests';
import { closeBuildPool } from '@/lib/jobs/build-pool';
import { get, post, problemOf } from '../../support/api';
import { seededDatabase } from '../../support/database';

seededDatabase();
afterAll(closeBuildPool);

const HINGE = { family: 'living-hinge', format: 'stl', quality: 'preview' };
const send = (body: unknown) => post(POST, '/api/v1/export', body);
const link = (query: string, headers = {}) => get(GET, `/api/v1/export?${query}`, {}, headers);
const bytesOf = async (response: Response) => new Uint8Array(await response.arrayBuffer());
const faults = async (response: Response): Promise<readonly FieldIssue[]> =>
  (await problemOf(response, 'invalid-input')).errors!;

describe('an export', () => {
  it('is a binary STL of the announced length, named after the family', async () => {
    const response = await send(HINGE);
    expect(response.status).toBe(200);
    expect(response.headers.get('content-type')).toBe('model/stl');
    expect(response.headers.get('content-disposition')).toBe('attachment; filename="Living-hinge.stl"');
    const bytes = await bytesOf(response);
    expect(Number(response.headers.get('content-length'))).toBe(bytes.byteLength);
    const triangles = new DataView(bytes.buffer).getUint32(80, true);
    expect(bytes.byteLength).toBe(84 + 50 * triangles);
    expect(triangles).toBeGreaterThan(50);
  });

  it('is a 3MF package in millimetres that names the design and its plastic', async () => {
    const response = await send({ ...HINGE, format: '3mf', material: 'pp', name: 'Rudder hinge, left' });
    expect(response.headers.get('content-type')).toBe('model/3mf');
    expect(response.headers.get('content-disposition')).toContain('"Rudder-hinge-left.3mf"');
    const model = new TextDecoder().decode(unzipSync(await bytesOf(response))['3D/3dmodel.model']);
    expect(model).toContain('unit="millimeter"');
    expect(model).toContain('Rudder hinge, left');
    expect(model).toContain('PP, polypropylene, printed');
  });

  it('keeps a name from breaking out of the header', async () => {
    const response = await send({ ...HINGE, name: 'a"\r\nSet-Cookie: b=1; ../../x' });
    expect(response.headers.get('content-disposition')).toMatch(
      /^attachment; filename="[A-Za-z0-9._-]+\.stl"$/,
    );
  });

  it('is the same file by link as by POST, bytes and tag', async () => {
    const posted = await send({ ...HINGE, parameters: { webLength: 4.5, foldAngle: 90 } });
    const linked = await link('family=living-hinge&format=stl&quality=preview&webLength=4.5&foldAngle=90');
    expect(linked.headers.get('etag')).toBe(posted.headers.get('etag'));
    expect(await bytesOf(linked)).toEqual(await bytesOf(posted));
  });

  it('has another tag when a dimension changes', async () => {
    const tag = async (query: string) =>
      (await link(`family=living-hinge&format=stl&quality=preview${query}`)).headers.get('etag');
    expect(await tag('')).toMatch(/^"[\w-]{32}"$/);
    expect(await tag('&leafLength=21')).not.toBe(await tag(''));
  });

  it('is not sent again to a client that has it', async () => {
    const query = 'family=living-hinge&format=stl&quality=preview';
    const etag = (await link(query)).headers.get('etag')!;
    const again = await link(query, { 'If-None-Match': `"other", W/${etag}` });
    expect(again.status).toBe(304);
    expect(again.headers.get('etag')).toBe(etag);
    expect((await bytesOf(again)).byteLength).toBe(0);
    expect((await link(query, { 'If-None-Match': '"other"' })).status).toBe(200);
  });

  it('takes the words of a design link: plastic, use, and a comma for a point', async () => {
    const words = 'family=living-hinge&format=stl&quality=preview&material=pp&opening=often&layers=along';
    const response = await link(`${words}&temperature=23&webLength=4,5`);
    expect(response.headers.get('etag')).toBe(
      (await send({ ...HINGE, parameters: { webLength: 4.5 } })).headers.get('etag'),
    );
  });

  it('holds only the bodies that are named', async () => {
    const hook = { family: 'cantilever-hook', format: 'stl', quality: 'preview' };
    const size = async (bodies?: string[]) => (await bytesOf(await send({ ...hook, bodies }))).byteLength;
    const [both, one] = [await size(), await size(['hook'])];
    expect(one).toBeLessThan(both);
    const linked = await link('family=cantilever-hook&format=stl&quality=preview&bodies=hook');
    expect((await bytesOf(linked)).byteLength).toBe(one);
  });

  it.each(FAMILIES.map(({ about }) => about.id))(
    'of %s works at export quality with nothing but defaults',
    async (family) => {
      const response = await send({ family, format: '3mf' });
      expect(response.status).toBe(200);
      expect((await bytesOf(response)).byteLength).toBeGreaterThan(500);
    },
  );
});

describe('an export that cannot be', () => {
  it('names every parameter at fault with bound and unit, by POST and by link', async () => {
    const posted = await faults(await send({ ...HINGE, parameters: { webLength: 99, leafWidth: null } }));
    expect(posted).toMatchObject([
      { field: 'leafWidth', unit: 'mm', min: 4, max: 300 },
      { field: 'webLength', bound: 60, unit: 'mm' },
    ]);
    const linked = await faults(await link('family=living-hinge&format=stl&webLength=99&leafWidth=wide'));
    expect(linked.map(({ field }) => field)).toEqual(['leafWidth', 'webLength']);
  });

  it.each([
    ['format=stl', 'family'],
    ['family=living-hinge', 'format'],
    ['family=living-hinge&format=obj', 'format'],
    ['family=living-hinge&format=stl&quality=fine', 'quality'],
    ['family=living-hinge&format=stl&webLenght=3', 'webLenght'],
    ['family=living-hinge&format=stl&bodies=', 'bodies.0'],
    ['family=living-hinge&format=stl&bodies=lid', 'bodies'],
    ['family=living-hinge&format=stl&stance=headstand', 'stance'],
    ['family=living-hinge&format=stl&name=', 'name'],
    ['family=living-hinge&format=stl&opening=daily', 'opening'],
    ['family=living-hinge&format=stl&webLength=1e1', 'webLength'],
    ['family=living-hinge&format=stl&webLength=NaN', 'webLength'],
    ['family=living-hinge&format=stl&webLength=3&webLength=4', 'webLength'],
    ['family=living-hinge&format=stl&format=3mf', 'format'],
  ])('names the word at fault in %s', async (query, field) => {
    expect((await faults(await link(query))).map((issue) => issue.field)).toContain(field);
  });

  it.each([
    [{ ...HINGE, bodies: [] }, 'bodies'],
    [{ ...HINGE, bodies: Array.from({ length: 21 }, () => 'leaf') }, 'bodies'],
    [{ ...HINGE, stance: 7 }, 'stance'],
    [{ ...HINGE, name: 'x'.repeat(81) }, 'name'],
    [{ ...HINGE, use: {} }, 'use'],
  ])('names the field at fault in %j', async (body, field) => {
    expect((await faults(await send(body))).map((issue) => issue.field)).toContain(field);
  });

  it('is 404 for a family or a plastic that is not there', async () => {
    await problemOf(await send({ ...HINGE, family: 'teapot' }), 'not-found');
    await problemOf(await send({ ...HINGE, material: 'wood' }), 'not-found');
    await problemOf(await link('family=teapot&format=stl'), 'not-found');
  });

  it('is 414 for a link beyond 4000 characters', async () => {
    await problemOf(await link(`family=living-hinge&format=stl&name=${'x'.repeat(4000)}`), 'uri-too-long');
  });
});

it('keeps the words of an export link apart from the parameters of every family', async () => {
  for (const { load } of FAMILIES) {
    const names = Object.keys((await load()).parameters.fields);
    expect(names.filter((name) => EXPORT_WORDS.includes(name))).toEqual([]);
  }
});
