import { type NextRequest, NextResponse } from 'next/server';
import { env, overHttps } from '@/lib/env';
import { contentPolicy, DATA_POLICY, STANDING_HEADERS, TRANSPORT_SECURITY } from '@/lib/http/headers';

/** Puts the security headers on every answer, and hands pages the nonce their scripts carry. Decides nothing else. */
export function proxy(request: NextRequest): NextResponse {
  const nonce = crypto.randomUUID().replaceAll('-', '');
  const data = request.nextUrl.pathname.startsWith('/api/');
  const given = { development: env().NODE_ENV === 'development', https: overHttps() };
  const policy = data ? DATA_POLICY : contentPolicy(nonce, given);
  const headers = new Headers(request.headers);
  headers.set('x-nonce', nonce);
  headers.set('content-security-policy', policy);
  const response = NextResponse.next({ request: { headers } });
  response.headers.set('Content-Security-Policy', policy);
  for (const [name, value] of Object.entries(STANDING_HEADERS)) response.headers.set(name, value);
  if (overHttps()) response.headers.set('Strict-Transport-Security', TRANSPORT_SECURITY);
  return response;
}
