import type { FieldIssue } from '@/lib/errors';

/** Every way a request can fail, with its HTTP status. */
export const PROBLEMS = {
  'malformed-json': { status: 400, title: 'The body is not JSON' },
  'sign-in-needed': { status: 401, title: 'Sign in first' },
  'not-allowed': { status: 403, title: 'Your account may not do this' },
  'not-found': { status: 404, title: 'Not found' },
  'method-not-allowed': { status: 405, title: 'This address does not take that method' },
  conflict: { status: 409, title: 'Changed elsewhere in the meantime' },
  'too-large': { status: 413, title: 'Too large' },
  'uri-too-long': { status: 414, title: 'The address is too long' },
  'unsupported-media-type': { status: 415, title: 'The body must be application/json' },
  'invalid-input': { status: 422, title: 'The input cannot be used' },
  'too-many-requests': { status: 429, title: 'Too many requests' },
  unavailable: { status: 503, title: 'Busy, try again shortly' },
  internal: { status: 500, title: 'Something went wrong on our side' },
} as const;

export type ProblemKind = keyof typeof PROBLEMS;

/** A request that ends early. `detail` is for people. */
export class RequestProblem extends Error {
  constructor(
    readonly kind: ProblemKind,
    readonly detail: string,
    readonly headers: Readonly<Record<string, string>> = {},
  ) {
    super(`${kind}: ${detail}`);
    this.name = 'RequestProblem';
  }
}

export interface Problem {
  readonly type: string;
  readonly title: string;
  readonly status: number;
  readonly detail: string;
  readonly instance: string;
  readonly requestId: string;
  readonly errors?: readonly FieldIssue[];
}

/** Points into the API description, where each kind is explained. */
export const problemType = (kind: ProblemKind): string =>
  `/api/v1/openapi.json#/components/responses/${kind}`;

/** Problem details as of RFC 9457. */
export function problemResponse(
  given: { kind: ProblemKind; detail: string; errors?: readonly FieldIssue[] },
  at: { instance: string; requestId: string },
  headers: Readonly<Record<string, string>> = {},
): Response {
  const { status, title } = PROBLEMS[given.kind];
  const { detail, errors } = given;
  const problem: Problem = {
    type: problemType(given.kind),
    title,
    status,
    detail,
    ...at,
    ...(errors && { errors }),
  };
  return new Response(JSON.stringify(problem), {
    status,
    headers: { 'Content-Type': 'application/problem+json', ...headers },
  });
}
