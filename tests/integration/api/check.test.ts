import { describe, expect, it, vi } from 'vitest';
import { POST } from '@/app/api/v1/check/route';
import { FAMILIES } from '@/generators';
import type { FieldIssue } from '@/lib/errors';
import { checkResponse } from '@/lib/http/v1/responses';
import { post, problemOf } from '../../support/api';
import { seededDatabase } from '../../support/database';

vi.stubEnv('RATE_CHECKS_PER_MINUTE', '300');
seededDatabase();

const HINGE = { family: 'living-hinge', material: 'petg' };
const check = (body: unknown) => post(POST, '/api/v1/check', body);
const report = async (body: unknown) => checkResponse.parse(await (await check(body)).json());
const faults = async (body: unknown): Promise<readonly FieldIssue[]> =>
  (await problemOf(await check(body), 'invalid-input')).errors!;

describe('a check', () => {
  it.each(FAMILIES.map(({ about }) => about.id))('of %s needs no more than a plastic', async (family) => {
    const { verdict, figures, curves, governing, parameters, use } = await report({
      family,
      material: 'petg',
    });
    expect(['within-limit', 'close-to-limit', 'over-limit', 'not-known']).toContain(verdict);
    expect(figures.map(({ id }) => id)).toContain(governing);
    expect(new Set(figures.map(({ id }) => id)).size).toBe(figures.length);
    if (verdict !== 'not-known') expect(curves.length).toBeGreaterThanOrEqual(1);
    expect(Object.keys(parameters).length).toBeGreaterThan(5);
    expect(use).toEqual({ opening: 'often', layers: 'along', temperature: 23 });
    for (const figure of figures) {
      expect(figure.because, figure.id).not.toBe('');
      expect(figure.source.text, figure.id).not.toBe('');
    }
  });

  it('fills in what is left out of the parameters and the use', async () => {
    const answer = await report({ ...HINGE, parameters: { webLength: 12 }, use: { opening: 'once' } });
    expect(answer.parameters).toMatchObject({ webLength: 12, webThickness: 0.4 });
    expect(answer.use).toEqual({ opening: 'once', layers: 'along', temperature: 23 });
  });

  it('gives figures in full precision', async () => {
    const { figures } = await report({ ...HINGE, parameters: { webLength: 7 } });
    const strain = figures.find(({ id }) => id === 'web-strain')!;
    expect(strain.handbook).toBeCloseTo((0.4 * Math.PI) / (2 * 7), 12);
  });

  it('takes single properties of the plastic in place of the stored ones', async () => {
    const material = { id: 'petg', allowableStrain: 0.2, secantModulus: 1000, friction: 0.3 };
    const { allowable, material: id } = await report({ ...HINGE, material, use: { layers: 'across' } });
    expect(id).toBe('petg');
    expect(allowable.value).toBe(0.2);
    expect(allowable.factors.every(({ source }) => source.mark === 'given')).toBe(true);
  });

  it('says "not known" with the reason where the plastic has softened', async () => {
    const { figures, allowable } = await report({ ...HINGE, material: 'pla', use: { temperature: 80 } });
    expect(figures.find(({ id }) => id === 'peak-strain')?.verdict).toBe('not-known');
    expect(allowable).toMatchObject({ value: null });
    expect(allowable.because).toContain('up to 40 °C');
  });
});

describe('input that cannot be used', () => {
  it('is answered with every parameter out of range, its bound and unit', async () => {
    const issues = await faults({ ...HINGE, parameters: { webLength: 1000, leafWidth: 1, holeCount: 2.5 } });
    expect(issues).toEqual([
      { field: 'leafWidth', message: expect.any(String), bound: 4, unit: 'mm', min: 4, max: 300 },
      { field: 'webLength', message: expect.any(String), bound: 60, unit: 'mm', min: 0.5, max: 60 },
      { field: 'holeCount', message: expect.any(String), unit: 'count', min: 0, max: 20 },
    ]);
    expect(issues[1]!.message).toBe('Web length must be at most 60 mm');
  });

  it.each([
    ['null, as NaN is written in JSON', 'null'],
    ['a text', '"3"'],
    ['a number past all numbers', '1e999'],
    ['a list', '[3]'],
    ['true', 'true'],
  ])('names a length that is %s, with its unit', async (_name, text) => {
    const body = `{"family":"living-hinge","material":"petg","parameters":{"webLength":${text}}}`;
    const [issue] = (await problemOf(await check(body), 'invalid-input')).errors!;
    expect(issue).toMatchObject({ field: 'webLength', unit: 'mm', min: 0.5, max: 60 });
  });

  it('names a choice that does not exist and a parameter that is not known', async () => {
    const issues = await faults({ ...HINGE, parameters: { closing: 'slam', webLenght: 3 } });
    expect(issues.map(({ field }) => field)).toEqual(['closing', 'webLenght']);
  });

  it('names the parameter of a contradiction, and the bound that follows from the others', async () => {
    const [issue] = await faults({ ...HINGE, parameters: { webThickness: 2, leafThickness: 1 } });
    expect(issue!.message).toMatch(/\d/);
    expect(['webRelief', 'webThickness', 'webFillet']).toContain(issue!.field);
  });

  it.each([
    [{ material: 'petg' }, 'family'],
    [{ family: 'living-hinge' }, 'material'],
    [{ ...HINGE, family: 7 }, 'family'],
    [{ ...HINGE, family: 'x'.repeat(61) }, 'family'],
    [{ ...HINGE, use: { opening: 'daily' } }, 'use.opening'],
    [{ ...HINGE, use: { layers: 'round' } }, 'use.layers'],
    [{ ...HINGE, use: { weather: 'rain' } }, 'use.weather'],
    [{ ...HINGE, parameters: [1] }, 'parameters'],
    [{ ...HINGE, material: { id: 'pc', allowableStrain: 4 } }, 'material.allowableStrain'],
    [{ ...HINGE, material: { id: 'pc', secantModulus: 0 } }, 'material.secantModulus'],
    [{ ...HINGE, material: { id: 'pc', friction: { value: 1, low: 0.1, high: 0.2 } } }, 'material.friction'],
    [{ ...HINGE, material: { friction: 0.2 } }, 'material.id'],
    [{ ...HINGE, colour: 'red' }, 'colour'],
  ])('names the field at fault in %j', async (body, field) => {
    expect((await faults(body)).map((issue) => issue.field)).toContain(field);
  });

  it('gives the bound and the unit of a temperature', async () => {
    const [issue] = await faults({ ...HINGE, use: { temperature: 900 } });
    expect(issue).toEqual({
      field: 'use.temperature',
      message: 'Temperature must be at most 150 °C',
      bound: 150,
      unit: 'degC',
    });
  });

  it('is 404 for a family or a plastic that is not there', async () => {
    await problemOf(await check({ ...HINGE, family: 'teapot' }), 'not-found');
    await problemOf(await check({ ...HINGE, material: 'wood' }), 'not-found');
    await problemOf(await check({ ...HINGE, material: { id: 'wood', friction: 0.2 } }), 'not-found');
  });

  it('is 404 for a name that every object has', async () => {
    await problemOf(await check({ ...HINGE, family: 'constructor' }), 'not-found');
    await problemOf(await check({ ...HINGE, family: '__proto__' }), 'not-found');
  });

  it('is 413 beyond 64 kB', async () => {
    const body = { ...HINGE, parameters: { webLength: 'x'.repeat(65_536) } };
    await problemOf(await check(body), 'too-large');
  });
});

it('asks a client with too many checks to wait', async () => {
  const from = { 'Content-Type': 'application/json', 'X-Forwarded-For': '10.9.9.9' };
  const answers = await Promise.all(
    Array.from({ length: 301 }, () => post(POST, '/api/v1/check', '{}', from)),
  );
  const refused = answers.filter(({ status }) => status === 429);
  expect(refused).toHaveLength(1);
  expect(Number(refused[0]!.headers.get('retry-after'))).toBeGreaterThan(0);
  await problemOf(refused[0]!, 'too-many-requests');
});
