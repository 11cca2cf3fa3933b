import { z } from 'zod';
import type { FamilyDescription } from '@/lib/access/families';
import { PROBLEMS } from '../problem';
import { ALWAYS, type Json, json, type Operation, PATHS, type SchemaName } from './openapi-paths';
import { checkRequest, exportRequest } from './requests';
import {
  checkResponse,
  familiesResponse,
  familyResponse,
  healthResponse,
  materialResponse,
  materialsResponse,
  problemSchema,
} from './responses';

const SCHEMAS = {
  Problem: problemSchema,
  Family: familyResponse,
  Families: familiesResponse,
  Material: materialResponse,
  Materials: materialsResponse,
  CheckRequest: checkRequest,
  CheckResult: checkResponse,
  ExportRequest: exportRequest,
  Health: healthResponse,
} as const satisfies Record<SchemaName, z.ZodType>;

function operationOf({ body, answer, also, problems = [], ...rest }: Operation): Json {
  const failures = [...problems, ...ALWAYS].map((kind) => [
    PROBLEMS[kind].status,
    { $ref: `#/components/responses/${kind}` },
  ]);
  return {
    ...rest,
    ...(body && { requestBody: { required: true, content: json(body) } }),
    responses: { 200: answer, ...also, ...Object.fromEntries(failures) },
  };
}

const mapValues = <A, B>(record: Readonly<Record<string, A>>, change: (value: A) => B) =>
  Object.fromEntries(Object.entries(record).map(([key, value]) => [key, change(value)]));

/** JSON Schema of everything sent and taken, each under its name. */
function schemas(): Record<string, Json> {
  const registry = z.registry<{ id: string }>();
  for (const [id, schema] of Object.entries(SCHEMAS)) registry.add(schema, { id });
  const made = z.toJSONSchema(registry, { uri: (id) => `#/components/schemas/${id}`, io: 'input' });
  return mapValues(made.schemas, withoutName);
}

/** A component is named by its place, not by an identifier of its own. */
const withoutName = ({ $schema: _, $id: __, id: ___, ...schema }: Json): Json => schema;

const problemResponses = () =>
  mapValues(PROBLEMS, ({ title }) => ({
    description: title,
    content: { 'application/problem+json': { schema: { $ref: '#/components/schemas/Problem' } } },
  }));

const parameterSchemas = (families: readonly FamilyDescription[]) =>
  Object.fromEntries(
    families.map(({ id, name, parameters }) => [
      `${id}-parameters`,
      { title: `${name}: parameters`, ...withoutName(parameters) },
    ]),
  );

const DESCRIPTION =
  'Lengths in mm, forces in N, moments in N mm, stress in MPa, mass in g, angles in degrees, strain as a fraction. Null means not known. Estimates for a first print: prove them by test; local codes and licensed practice come first.';

/** The description of API v1. The parameters of each family stand as a schema of their own. */
export const openApiDocument = (families: readonly FamilyDescription[]): Json => ({
  openapi: '3.1.0',
  info: { title: 'Bendwell API', version: '1', description: DESCRIPTION },
  servers: [{ url: '/' }],
  paths: mapValues(PATHS, (methods) => mapValues(methods, operationOf)),
  components: {
    schemas: { ...schemas(), ...parameterSchemas(families) },
    responses: problemResponses(),
  },
});
