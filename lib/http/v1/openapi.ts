import { z } from 'zod';
import type { FamilyDescription } from '@/lib/access/families';
import { PROBLEMS, type ProblemKind } from '../problem';
import { checkRequest } from './requests';
import {
  checkResponse,
  familiesResponse,
  familyResponse,
  healthResponse,
  materialResponse,
  materialsResponse,
  problemSchema,
} from './responses';

type Json = Readonly<Record<string, unknown>>;

const SCHEMAS = {
  Problem: problemSchema,
  Family: familyResponse,
  Families: familiesResponse,
  Material: materialResponse,
  Materials: materialsResponse,
  CheckRequest: checkRequest,
  CheckResult: checkResponse,
  Health: healthResponse,
} as const;

type SchemaName = keyof typeof SCHEMAS;

interface Operation {
  readonly operationId: string;
  readonly summary: string;
  readonly body?: SchemaName;
  readonly parameters?: readonly Json[];
  readonly answer: Json;
  readonly problems?: readonly ProblemKind[];
}

const json = (schema: SchemaName) => ({
  'application/json': { schema: { $ref: `#/components/schemas/${schema}` } },
});
const answers = (description: string, schema: SchemaName): Json => ({ description, content: json(schema) });

const ID: Json = {
  name: 'id',
  in: 'path',
  required: true,
  schema: { type: 'string', minLength: 1, maxLength: 60 },
};
const ALWAYS: readonly ProblemKind[] = ['uri-too-long', 'too-many-requests', 'internal'];
const BY_ID: readonly ProblemKind[] = ['not-found', 'invalid-input'];
const WITH_BODY: readonly ProblemKind[] = [...BY_ID, 'malformed-json', 'too-large', 'unsupported-media-type'];

const PATHS: Readonly<Record<string, Readonly<Record<string, Operation>>>> = {
  '/api/v1/families': {
    get: {
      operationId: 'listFamilies',
      summary: 'Part families with their parameters',
      answer: answers('All part families', 'Families'),
    },
  },
  '/api/v1/families/{id}': {
    get: {
      operationId: 'getFamily',
      summary: 'One part family',
      parameters: [ID],
      answer: answers('The part family', 'Family'),
      problems: BY_ID,
    },
  },
  '/api/v1/materials': {
    get: {
      operationId: 'listMaterials',
      summary: 'Plastics, every figure with its source',
      answer: answers('All plastics', 'Materials'),
    },
  },
  '/api/v1/materials/{id}': {
    get: {
      operationId: 'getMaterial',
      summary: 'One plastic',
      parameters: [ID],
      answer: answers('The plastic', 'Material'),
      problems: BY_ID,
    },
  },
  '/api/v1/check': {
    post: {
      operationId: 'checkDesign',
      summary: 'Will the part hold? Figures, verdicts and curves',
      body: 'CheckRequest',
      answer: answers('The report', 'CheckResult'),
      problems: WITH_BODY,
    },
  },
  '/api/v1/openapi.json': {
    get: {
      operationId: 'describeApi',
      summary: 'This description',
      answer: { description: 'OpenAPI 3.1', content: { 'application/json': { schema: { type: 'object' } } } },
    },
  },
  '/api/health': {
    get: {
      operationId: 'health',
      summary: 'Whether the server and its database answer',
      answer: answers('They answer', 'Health'),
    },
  },
};

function operationOf({ body, answer, problems = [], ...rest }: Operation): Json {
  const failures = [...problems, ...ALWAYS].map((kind) => [
    PROBLEMS[kind].status,
    { $ref: `#/components/responses/${kind}` },
  ]);
  return {
    ...rest,
    ...(body && { requestBody: { required: true, content: json(body) } }),
    responses: { 200: answer, ...Object.fromEntries(failures) },
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
