import fc from 'fast-check';
import { describe, expect, it, vi } from 'vitest';
import { POST } from '@/app/api/v1/check/route';
import { FAMILIES } from '@/generators';
import type { Field, Fields } from '@/generators/parameters';
import { checkResponse, problemSchema } from '@/lib/http/v1/responses';
import { MATERIALS } from '@/lib/materials/data';
import { post } from '../../support/api';
import { seededDatabase } from '../../support/database';

vi.stubEnv('RATE_CHECKS_PER_MINUTE', '1000000');
seededDatabase();

const SEED = { seed: 20261201, numRuns: 40 };

/** The answer is a report or a problem of the input, never a fault of ours, and has the published form. */
async function expectSound(body: unknown): Promise<number> {
  const response = await post(POST, '/api/v1/check', JSON.stringify(body));
  const answer = await response.json();
  expect([200, 404, 422], JSON.stringify({ body, answer })).toContain(response.status);
  (response.status === 200 ? checkResponse : problemSchema).parse(answer);
  return response.status;
}

const answered = async (body: unknown): Promise<void> => {
  await expectSound(body);
};

/** A value inside the bounds of the field, three times out of four within a fifth of its default. */
const inRange = (field: Field): fc.Arbitrary<unknown> => {
  if (field.type === 'toggle') return fc.boolean();
  if (field.type === 'choice') return fc.constantFrom(...field.options.map(({ value }) => value));
  const { min, max, whole, default: usual } = field;
  if (whole) return fc.integer({ min, max });
  const fifth = Math.abs(usual) / 5;
  const near = fc.double({
    min: Math.max(min, usual - fifth),
    max: Math.min(max, usual + fifth),
    noNaN: true,
  });
  const any = fc.double({ min, max, noNaN: true });
  return fc.oneof({ weight: 3, arbitrary: near }, { weight: 1, arbitrary: any });
};

/** Values for up to four of the fields; the others are left to their defaults. */
const someOf = (fields: Fields): fc.Arbitrary<Record<string, unknown>> =>
  fc
    .subarray(Object.keys(fields), { maxLength: 4 })
    .chain((keys) => fc.record(Object.fromEntries(keys.map((key) => [key, inRange(fields[key]!)]))));

const use = fc.record({
  opening: fc.constantFrom('once', 'sometimes', 'often'),
  layers: fc.constantFrom('along', 'across'),
  temperature: fc.integer({ min: -40, max: 150 }),
});
const material = fc.constantFrom(...MATERIALS.map(({ id }) => id));

describe('a check', () => {
  it.each(FAMILIES.map(({ about, load }) => [about.id, load] as const))(
    'of %s answers any values inside the bounds in the published form',
    async (family, load) => {
      const { fields } = (await load()).parameters;
      const parameters = someOf(fields);
      const body = fc.record({ family: fc.constant(family), parameters, material, use });
      const seen = new Set<number>();
      const sound = async (one: unknown) => {
        seen.add(await expectSound(one));
      };
      await fc.assert(fc.asyncProperty(body, sound), SEED);
      expect(seen).toContain(200);
    },
  );

  it('answers anything at all with a problem of the input', async () => {
    await fc.assert(fc.asyncProperty(fc.jsonValue({ maxDepth: 3 }), answered), SEED);
  });

  it('answers anything at all in place of one part of a good request', async () => {
    const key = fc.constantFrom('family', 'parameters', 'material', 'use');
    const good = { family: 'living-hinge', material: 'pp', parameters: {}, use: {} };
    const spoilt = (at: string, value: unknown) => answered({ ...good, [at]: value });
    await fc.assert(fc.asyncProperty(key, fc.jsonValue({ maxDepth: 2 }), spoilt), { ...SEED, numRuns: 100 });
  });
});
