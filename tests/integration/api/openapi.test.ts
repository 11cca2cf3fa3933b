import { beforeAll, describe, expect, it } from 'vitest';
import { z } from 'zod';
import { POST as check } from '@/app/api/v1/check/route';
import { GET as families } from '@/app/api/v1/families/route';
import { GET as materials } from '@/app/api/v1/materials/route';
import { GET } from '@/app/api/v1/openapi.json/route';
import { FAMILIES } from '@/generators';
import { get, post } from '../../support/api';
import { seededDatabase } from '../../support/database';

seededDatabase();

type Json = Record<string, unknown>;
interface Operation {
  operationId: string;
  summary: string;
  parameters?: { name: string; in: string; required?: boolean }[];
  responses: Record<string, { $ref?: string; content?: Json; description?: string }>;
}
interface Document extends Json {
  openapi: string;
  info: { title: string; version: string };
  paths: Record<string, Record<string, Operation>>;
  components: { schemas: Record<string, Json>; responses: Record<string, Json> };
}

let document: Document;
beforeAll(async () => {
  document = (await (await get(GET, '/api/v1/openapi.json')).json()) as Document;
});

const operations = () =>
  Object.entries(document.paths).flatMap(([path, methods]) =>
    Object.entries(methods).map(([method, operation]) => ({ path, method, operation })),
  );

function referencesIn(value: unknown): string[] {
  if (value === null || typeof value !== 'object') return [];
  const own = '$ref' in value && typeof value.$ref === 'string' ? [value.$ref] : [];
  return [...own, ...Object.values(value).flatMap(referencesIn)];
}

const resolve = (reference: string): unknown =>
  reference
    .slice(2)
    .split('/')
    .reduce<unknown>((at, key) => (at as Json | undefined)?.[key], document);

/** Reads a component as JSON Schema, its references beside it, and checks a value against it. */
function conforms(component: string, value: unknown): void {
  const text = JSON.stringify({ $ref: `#/$defs/${component}`, $defs: document.components.schemas });
  const schema = JSON.parse(text.replaceAll('#/components/schemas/', '#/$defs/'));
  expect(z.fromJSONSchema(schema).safeParse(value).error).toBeUndefined();
}

describe('the API description', () => {
  it('is OpenAPI 3.1 with a title and a version', () => {
    expect(document.openapi).toBe('3.1.0');
    expect(document.info).toMatchObject({ title: 'Bendwell API', version: '1' });
  });

  it('describes every route', () => {
    const known = operations().map(({ method, path }) => `${method} ${path}`);
    expect(known.sort()).toEqual([
      'get /api/health',
      'get /api/v1/export',
      'get /api/v1/families',
      'get /api/v1/families/{id}',
      'get /api/v1/materials',
      'get /api/v1/materials/{id}',
      'get /api/v1/openapi.json',
      'post /api/v1/check',
      'post /api/v1/export',
    ]);
  });

  it('names every operation once, and every place in its address', () => {
    const ids = operations().map(({ operation }) => operation.operationId);
    expect(new Set(ids).size).toBe(ids.length);
    for (const { path, operation } of operations()) {
      const places = [...path.matchAll(/\{(\w+)\}/g)].map((match) => match[1]);
      const declared = (operation.parameters ?? []).filter((one) => one.in === 'path');
      expect(declared.map(({ name }) => name)).toEqual(places);
      expect(declared.every(({ required }) => required)).toBe(true);
      expect(operation.summary).not.toBe('');
      expect(Object.keys(operation.responses)).toEqual(expect.arrayContaining(['200', '429', '500']));
    }
  });

  it('has no reference that leads nowhere', () => {
    const references = referencesIn(document);
    expect(references.length).toBeGreaterThan(20);
    expect(references.filter((one) => resolve(one) === undefined)).toEqual([]);
  });

  it('has the parameters of each family as a schema', () => {
    for (const { about } of FAMILIES) {
      expect(document.components.schemas[`${about.id}-parameters`]).toMatchObject({ type: 'object' });
    }
  });

  it('fits what the routes answer', async () => {
    const list = (await (await get(families, '/api/v1/families')).json()) as { families: unknown[] };
    for (const family of list.families) conforms('Family', family);
    const plastics = (await (await get(materials, '/api/v1/materials')).json()) as { materials: unknown[] };
    for (const material of plastics.materials) conforms('Material', material);
    const request = {
      family: 'living-hinge',
      material: { id: 'pp', friction: 0.4 },
      parameters: { webLength: 4 },
    };
    conforms('CheckRequest', request);
    const answer = await post(check, '/api/v1/check', request);
    conforms('CheckResult', await answer.json());
    const refusal = await post(check, '/api/v1/check', { ...request, family: 3 });
    conforms('Problem', await refusal.json());
  });

  it('does not fit just anything', () => {
    expect(() => conforms('CheckResult', { verdict: 'fine' })).toThrow();
    expect(() => conforms('Material', { id: 'pp' })).toThrow();
  });
});
