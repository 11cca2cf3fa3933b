import type { ProblemKind } from '../problem';

export type Json = Readonly<Record<string, unknown>>;

export type SchemaName =
  | 'Problem'
  | 'Family'
  | 'Families'
  | 'Material'
  | 'Materials'
  | 'CheckRequest'
  | 'CheckResult'
  | 'ExportRequest'
  | 'Health';

export interface Operation {
  readonly operationId: string;
  readonly summary: string;
  readonly body?: SchemaName;
  readonly parameters?: readonly Json[];
  readonly answer: Json;
  /** further answers that are not failures */
  readonly also?: Json;
  readonly problems?: readonly ProblemKind[];
}

export const json = (schema: SchemaName) => ({
  'application/json': { schema: { $ref: `#/components/schemas/${schema}` } },
});
const answers = (description: string, schema: SchemaName): Json => ({ description, content: json(schema) });

const ID: Json = {
  name: 'id',
  in: 'path',
  required: true,
  schema: { type: 'string', minLength: 1, maxLength: 60 },
};
const query = (name: string, schema: Json, description: string, required = false): Json => ({
  name,
  in: 'query',
  required,
  description,
  schema,
});
const text = (maxLength: number): Json => ({ type: 'string', maxLength });
const word = (...values: readonly string[]): Json => ({ type: 'string', enum: values });
const EXPORT_QUERY: readonly Json[] = [
  query('family', text(60), 'Id of a part family', true),
  query('format', word('stl', '3mf'), 'File format', true),
  query('quality', word('preview', 'export'), 'How finely curves are cut; export where left out'),
  query('bodies', text(1200), 'Names of the bodies wanted, parted by commas; all where left out'),
  query('stance', text(60), 'How the part lies on the bed; the best where left out'),
  query('name', text(80), 'What the design is called'),
  query('material', text(60), 'Id of the material, named in 3MF files'),
  {
    ...query(
      'parameters',
      { type: 'object' },
      'Parameters of the family, each as a query word of its own name',
    ),
    style: 'form',
    explode: true,
  },
];

const binary: Json = { schema: { type: 'string', format: 'binary' } };
const FILE: Json = {
  description: 'Millimetres, closed bodies laid on the bed; ETag by content, named after the design',
  content: { 'model/stl': binary, 'model/3mf': binary },
  headers: {
    ETag: { schema: { type: 'string' } },
    'Content-Disposition': { schema: { type: 'string' } },
    'Content-Length': { schema: { type: 'integer' } },
  },
};

export const ALWAYS: readonly ProblemKind[] = ['uri-too-long', 'too-many-requests', 'internal'];
const BY_ID: readonly ProblemKind[] = ['not-found', 'invalid-input'];
const WITH_BODY: readonly ProblemKind[] = [...BY_ID, 'malformed-json', 'too-large', 'unsupported-media-type'];

/** Every route of the API: what it takes, what it answers, how it can fail. */
export const PATHS: Readonly<Record<string, Readonly<Record<string, Operation>>>> = {
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
      problems: [...WITH_BODY, 'unavailable'],
    },
  },
  '/api/v1/export': {
    get: {
      operationId: 'exportByLink',
      summary: 'The file of a part, by a link: each parameter of the family by its name',
      parameters: EXPORT_QUERY,
      answer: FILE,
      also: { 304: { description: 'The client has this very file (If-None-Match)' } },
      problems: [...BY_ID, 'too-large', 'unavailable'],
    },
    post: {
      operationId: 'exportDesign',
      summary: 'The file of a part',
      body: 'ExportRequest',
      answer: FILE,
      problems: [...WITH_BODY, 'unavailable'],
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
