import { describe, expect, it } from 'vitest';
import { GET as health, POST as postHealth } from '@/app/api/health/route';
import { DELETE as nowhere } from '@/app/api/v1/[...rest]/route';
import { GET as family } from '@/app/api/v1/families/[id]/route';
import { GET as families } from '@/app/api/v1/families/route';
import { GET as material } from '@/app/api/v1/materials/[id]/route';
import { GET as materials } from '@/app/api/v1/materials/route';
import { FAMILIES } from '@/generators';
import type { FamilyDescription } from '@/lib/access/families';
import { familiesResponse, healthResponse, materialsResponse } from '@/lib/http/v1/responses';
import { MATERIALS, materialById } from '@/lib/materials/data';
import { get, problemOf } from '../../support/api';
import { seededDatabase } from '../../support/database';

seededDatabase();

describe('families', () => {
  it('lists every family with its parameters, groups, rules and presets', async () => {
    const answer = familiesResponse.parse(await (await get(families, '/api/v1/families')).json());
    expect(answer.families.map(({ id }) => id)).toEqual(FAMILIES.map(({ about }) => about.id));
    for (const one of answer.families) {
      expect(one.presets.length).toBeGreaterThanOrEqual(3);
      expect(one.stances.length).toBeGreaterThanOrEqual(1);
      for (const { text } of one.relations) expect(text.length).toBeGreaterThan(10);
    }
  });

  it('describes each parameter by title, bounds, default, group and unit', async () => {
    for (const { about, load } of FAMILIES) {
      const answer = await get(family, `/api/v1/families/${about.id}`, { id: about.id });
      const { parameters, groups } = (await answer.json()) as FamilyDescription;
      const { fields } = (await load()).parameters;
      const properties = parameters.properties as Record<string, Record<string, unknown>>;
      expect(Object.keys(properties)).toEqual(Object.keys(fields));
      expect(parameters.additionalProperties).toBe(false);
      expect(parameters.required ?? []).toEqual([]);
      for (const [key, field] of Object.entries(fields)) {
        const { label, help, group } = field;
        expect(properties[key], key).toMatchObject({
          title: label,
          description: help,
          default: field.default,
        });
        expect(groups.map(({ id }) => id)).toContain(group);
        if (field.type === 'number') {
          const { min, max, unit, step } = field;
          expect(properties[key], key).toMatchObject({ minimum: min, maximum: max, unit, step });
        }
      }
    }
  });

  it('answers 404 for a family that is not there', async () => {
    const answer = await get(family, '/api/v1/families/teapot', { id: 'teapot' });
    expect((await problemOf(answer, 'not-found')).detail).toBe('The part family "teapot" was not found.');
  });
});

describe('materials', () => {
  it('lists every plastic with its sources', async () => {
    const answer = materialsResponse.parse(await (await get(materials, '/api/v1/materials')).json());
    expect(answer.materials).toEqual(MATERIALS);
  });

  it('gives one plastic', async () => {
    const answer = await get(material, '/api/v1/materials/pp', { id: 'pp' });
    expect(await answer.json()).toEqual(materialById('pp'));
  });

  it('answers 404 for a plastic that is not there, and 422 for an id beyond all measure', async () => {
    await problemOf(await get(material, '/api/v1/materials/wood', { id: 'wood' }), 'not-found');
    const long = 'x'.repeat(61);
    const { errors } = await problemOf(
      await get(material, `/api/v1/materials/${long}`, { id: long }),
      'invalid-input',
    );
    expect(errors).toEqual([{ field: 'id', message: 'The id must have at most 60 characters', bound: 60 }]);
  });
});

it('says that it is well, and how many plastics its database holds', async () => {
  const answer = healthResponse.parse(await (await get(health, '/api/health')).json());
  expect(answer.materials).toBe(MATERIALS.length);
});

it('answers an address that leads nowhere with a problem, whatever the method', async () => {
  const { detail } = await problemOf(await get(nowhere, '/api/v1/teapots'), 'not-found');
  expect(detail).toBe('The address /api/v1/teapots was not found.');
});

it('names the methods an address takes to one who uses another', async () => {
  const answer = await get(postHealth, '/api/health');
  expect(answer.headers.get('allow')).toBe('GET');
  await problemOf(answer, 'method-not-allowed');
});
