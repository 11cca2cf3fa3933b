import { expect } from 'vitest';
import { PROBLEMS, type Problem, type ProblemKind } from '@/lib/http/problem';

type Handler = (request: Request, context: { params: Promise<unknown> }) => Promise<Response>;
type Params = Readonly<Record<string, string>>;

const BASE = 'http://127.0.0.1';

export const get = (
  handler: Handler,
  address: string,
  params: Params = {},
  headers: Readonly<Record<string, string>> = {},
): Promise<Response> =>
  handler(new Request(BASE + address, { headers }), { params: Promise.resolve(params) });

export const post = (
  handler: Handler,
  address: string,
  body: unknown,
  headers: Readonly<Record<string, string>> = { 'Content-Type': 'application/json' },
): Promise<Response> => {
  const text = typeof body === 'string' ? body : JSON.stringify(body);
  const request = new Request(BASE + address, { method: 'POST', body: text, headers });
  return handler(request, { params: Promise.resolve({}) });
};

/** The answer is a problem of this kind, in the form of RFC 9457. */
export async function problemOf(response: Response, kind: ProblemKind): Promise<Problem> {
  const problem = (await response.json()) as Problem;
  expect(problem).toMatchObject(PROBLEMS[kind]);
  expect(response.status).toBe(PROBLEMS[kind].status);
  expect(response.headers.get('content-type')).toBe('application/problem+json');
  expect(problem.type).toBe(`/api/v1/openapi.json#/components/responses/${kind}`);
  expect(problem.requestId).toBe(response.headers.get('x-request-id'));
  return problem;
}

/** Any request with a JSON body, as a page of this site sends it. */
export function sendTo(
  handler: Handler,
  method: string,
  address: string,
  {
    body,
    params = {},
    headers = {},
  }: { body?: unknown; params?: Params; headers?: Record<string, string> } = {},
): Promise<Response> {
  const request = new Request(BASE + address, {
    method,
    headers: { 'Content-Type': 'application/json', 'Sec-Fetch-Site': 'same-origin', ...headers },
    ...(body !== undefined && { body: JSON.stringify(body) }),
  });
  return handler(request, { params: Promise.resolve(params) });
}
