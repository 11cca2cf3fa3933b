import type { z } from 'zod';
import { currentViewer } from '@/lib/auth/session';
import type { Viewer } from '@/lib/auth/viewer';
import {
  Conflict,
  InvalidInput,
  NotAllowed,
  NotFound,
  SignInNeeded,
  TooLarge,
  TooMany,
  Unavailable,
} from '@/lib/errors';
import { DATA_POLICY } from './headers';
import { type FieldUnits, issuesOf } from './issues';
import { BODY_LIMIT, limiter, type RateName, URL_LIMIT } from './limits';
import { log } from './log';
import { problemResponse, RequestProblem } from './problem';
import { clientOf } from './rate-limit';
import { readJson } from './read-json';
import { fromOwnPage } from './same-origin';

interface Schemas<B, P> {
  readonly body?: z.ZodType<B>;
  readonly params?: z.ZodType<P>;
  readonly units?: FieldUnits;
}

interface Call<B, P> {
  readonly request: Request;
  readonly body: B;
  readonly params: P;
  /** who asks; always null on a route without `auth` */
  readonly viewer: Viewer;
  /** query without "?" */
  readonly query: string;
}

interface RouteSpec<B, P> {
  readonly schemas?: Schemas<B, P>;
  readonly limits?: { readonly bodyBytes?: number; readonly urlCharacters?: number };
  readonly rateLimit: RateName;
  /** the route knows who asks */
  readonly auth?: boolean;
  /** a value is sent as JSON, a Response as it is */
  readonly handler: (call: Call<B, P>) => unknown;
}

type Handler = (request: Request, context: { params: Promise<unknown> }) => Promise<Response>;

const GUARDS: Readonly<Record<string, string>> = {
  'Content-Security-Policy': DATA_POLICY,
  'X-Content-Type-Options': 'nosniff',
  'X-Frame-Options': 'DENY',
  'Referrer-Policy': 'no-referrer',
  'Cross-Origin-Resource-Policy': 'same-origin',
};

/** Faults told in one answer. */
const MOST_ERRORS = 50;

function guarded(response: Response, requestId: string): Response {
  for (const [name, value] of Object.entries(GUARDS)) response.headers.set(name, value);
  response.headers.set('X-Request-Id', requestId);
  if (!response.headers.has('Cache-Control')) response.headers.set('Cache-Control', 'no-store');
  return response;
}

function parse<T>(schema: z.ZodType<T> | undefined, input: unknown, whole: string, units?: FieldUnits): T {
  if (!schema) return undefined as T;
  const result = schema.safeParse(input);
  if (!result.success) throw new InvalidInput(issuesOf(result.error, whole, units));
  return result.data;
}

const READS: readonly string[] = ['GET', 'HEAD'];

function checkOrigin(request: Request): void {
  if (READS.includes(request.method) || fromOwnPage(request.headers)) return;
  throw new RequestProblem('not-allowed', 'The request was sent by a page of another site.');
}

async function readCall<B, P>(
  spec: RouteSpec<B, P>,
  request: Request,
  params: Promise<unknown>,
): Promise<Call<B, P>> {
  const { bodyBytes = BODY_LIMIT, urlCharacters = URL_LIMIT } = spec.limits ?? {};
  if (request.url.length > urlCharacters) {
    throw new RequestProblem('uri-too-long', `The address may be at most ${urlCharacters} characters long.`);
  }
  checkOrigin(request);
  await limiter(spec.rateLimit).take(clientOf(request));
  const viewer = spec.auth ? await currentViewer() : null;
  const body = spec.schemas?.body && (await readJson(request, bodyBytes));
  return {
    request,
    viewer,
    body: parse(spec.schemas?.body, body, 'body', spec.schemas?.units),
    params: parse(spec.schemas?.params, await params, 'address'),
    query: new URL(request.url).search.slice(1),
  };
}

function failure(error: unknown, at: { instance: string; requestId: string }): Response {
  if (error instanceof RequestProblem) return problemResponse(error, at, error.headers);
  if (error instanceof NotFound)
    return problemResponse({ kind: 'not-found', detail: `${error.message}.` }, at);
  if (error instanceof InvalidInput) {
    const errors = error.issues.slice(0, MOST_ERRORS).map(({ received: _, ...issue }) => issue);
    const detail = errors.map((issue) => issue.message).join('; ');
    return problemResponse({ kind: 'invalid-input', detail, errors }, at);
  }
  if (error instanceof SignInNeeded)
    return problemResponse({ kind: 'sign-in-needed', detail: `${error.message}.` }, at);
  if (error instanceof NotAllowed)
    return problemResponse({ kind: 'not-allowed', detail: `${error.message}.` }, at);
  if (error instanceof Conflict)
    return problemResponse({ kind: 'conflict', detail: `${error.message}.` }, at);
  if (error instanceof TooLarge)
    return problemResponse({ kind: 'too-large', detail: `${error.message}.` }, at);
  if (error instanceof TooMany) {
    const headers = { 'Retry-After': String(error.seconds) };
    return problemResponse({ kind: 'too-many-requests', detail: `${error.message}.` }, at, headers);
  }
  if (error instanceof Unavailable) {
    return problemResponse({ kind: 'unavailable', detail: `${error.message}.` }, at, { 'Retry-After': '5' });
  }
  log().error({ err: error, ...at }, 'request failed');
  const detail = 'The fault is logged under this request id.';
  return problemResponse({ kind: 'internal', detail }, at);
}

/** Wraps a route handler: limits, parsing, problem details, security headers, request id. */
export function route<B = undefined, P = undefined>(spec: RouteSpec<B, P>): Handler {
  return async (request, { params }) => {
    const requestId = crypto.randomUUID();
    try {
      const answer = await spec.handler(await readCall(spec, request, params));
      return guarded(answer instanceof Response ? answer : Response.json(answer), requestId);
    } catch (error) {
      const instance = new URL(request.url).pathname;
      return guarded(failure(error, { instance, requestId }), requestId);
    }
  };
}
