import { describe, expect, it, vi } from 'vitest';
import { z } from 'zod';
import { InvalidInput, NotFound } from '@/lib/errors';
import { route } from '@/lib/http/route';
import { get, post, problemOf } from '../../support/api';

vi.stubEnv('LOG_LEVEL', 'silent');

const body = z.strictObject({
  length: z.number('length must be a number').max(10, 'length must be at most 10 mm'),
  plastic: z.union(
    [z.string(), z.strictObject({ id: z.string(), friction: z.number().min(0, 'friction at least 0') })],
    { error: 'plastic must be an id or an object' },
  ),
});
const echo = route({ rateLimit: 'checks', schemas: { body }, handler: (call) => call.body });
const throwing = (error: unknown) =>
  route({
    rateLimit: 'reads',
    handler: () => {
      throw error;
    },
  });
const GOOD = { length: 3, plastic: 'petg' };

describe('a route', () => {
  it('sends what the handler returns as JSON, behind guarding headers', async () => {
    const response = await post(echo, '/x', GOOD);
    expect(response.status).toBe(200);
    expect(await response.json()).toEqual(GOOD);
    expect(response.headers.get('x-content-type-options')).toBe('nosniff');
    expect(response.headers.get('content-security-policy')).toContain("default-src 'none'");
    expect(response.headers.get('cache-control')).toBe('no-store');
    expect(response.headers.get('x-request-id')).toMatch(/^[0-9a-f-]{36}$/);
  });

  it('names every field at fault with its bound', async () => {
    const { errors } = await problemOf(
      await post(echo, '/x', { length: 11, plastic: { id: 'pc', friction: -1, colour: 'red' }, extra: 1 }),
      'invalid-input',
    );
    expect(errors).toEqual([
      { field: 'length', message: 'length must be at most 10 mm', bound: 10 },
      { field: 'plastic.friction', message: 'friction at least 0', bound: 0 },
      { field: 'plastic.colour', message: 'colour is not known here' },
      { field: 'extra', message: 'extra is not known here' },
    ]);
  });

  it.each([
    ['a missing choice', { length: 1 }],
    ['a choice of neither kind', { length: 1, plastic: 7 }],
  ])('tells %s apart by the union as a whole', async (_name, input) => {
    const { errors } = await problemOf(await post(echo, '/x', input), 'invalid-input');
    expect(errors).toEqual([{ field: 'plastic', message: 'plastic must be an id or an object' }]);
  });

  it.each(['null', '[]', '"text"', '7'])('refuses the body %s as a whole', async (input) => {
    const { errors } = await problemOf(await post(echo, '/x', input), 'invalid-input');
    expect(errors![0]!.field).toBe('body');
  });

  it('tells at most fifty faults', async () => {
    const many = Object.fromEntries(Array.from({ length: 400 }, (_, index) => [`f${index}`, 1]));
    const { errors } = await problemOf(await post(echo, '/x', { ...GOOD, ...many }), 'invalid-input');
    expect(errors).toHaveLength(50);
  });

  it('keeps a key that reaches for the prototype out', async () => {
    const response = await post(echo, '/x', '{"length":1,"plastic":"pc","__proto__":{"polluted":1}}');
    expect([200, 422]).toContain(response.status);
    expect(({} as { polluted?: number }).polluted).toBeUndefined();
    expect(await response.text()).not.toContain('"polluted"');
  });
});

describe('a body', () => {
  it.each(['{', '', 'NaN', '{"length": NaN}'])('that is not JSON (%j) is malformed', async (text) => {
    await problemOf(await post(echo, '/x', text), 'malformed-json');
  });

  it('that is not UTF-8 is malformed', async () => {
    const request = new Request('http://127.0.0.1/x', {
      method: 'POST',
      body: new Uint8Array([0x22, 0xff, 0x22]),
      headers: { 'Content-Type': 'application/json' },
    });
    await problemOf(await echo(request, { params: Promise.resolve({}) }), 'malformed-json');
  });

  it.each(['text/plain', 'application/jsonx', 'application/x-www-form-urlencoded'])(
    'of type %s is not taken',
    async (type) => {
      await problemOf(await post(echo, '/x', GOOD, { 'Content-Type': type }), 'unsupported-media-type');
    },
  );

  it('is taken with a charset', async () => {
    const headers = { 'Content-Type': 'application/json; charset=utf-8' };
    expect((await post(echo, '/x', GOOD, headers)).status).toBe(200);
  });

  it('over the limit is refused, by its announced size and by what arrives', async () => {
    const small = route({
      rateLimit: 'checks',
      schemas: { body },
      limits: { bodyBytes: 40 },
      handler: () => 'unreached',
    });
    const long = `${JSON.stringify(GOOD)}${' '.repeat(40)}`;
    const { detail } = await problemOf(await post(small, '/x', long), 'too-large');
    expect(detail).toBe('The body may be at most 40 bytes.');
    const announced = { 'Content-Type': 'application/json', 'Content-Length': '5000000' };
    await problemOf(await post(small, '/x', '{}', announced), 'too-large');
  });
});

describe('a failure', () => {
  it('of something missing is 404', async () => {
    const { detail } = await problemOf(await get(throwing(new NotFound('The part')), '/x'), 'not-found');
    expect(detail).toBe('The part was not found.');
  });

  it('of a domain rule is 422 with its fields', async () => {
    const issue = { field: 'armLength', message: 'Arm length must be at most 90 mm', bound: 90, unit: 'mm' };
    const answer = await get(throwing(new InvalidInput([issue])), '/x');
    expect((await problemOf(answer, 'invalid-input')).errors).toEqual([issue]);
  });

  it('of our own tells nothing of the inside', async () => {
    const problem = await problemOf(await get(throwing(new Error('secret path')), '/x'), 'internal');
    expect(JSON.stringify(problem)).not.toContain('secret');
  });

  it('of a long address is 414', async () => {
    await problemOf(await get(throwing(new Error('unreached')), `/x?${'a'.repeat(4000)}`), 'uri-too-long');
  });
});
