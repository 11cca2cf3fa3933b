import { NextRequest } from 'next/server';
import { describe, expect, it, vi } from 'vitest';
import { signInAction } from '@/app/(account)/sign-in/actions';
import { lucia } from '@/lib/auth/lucia';
import { wantsDemo } from '@/lib/env';
import { proxy } from '@/proxy';
import { Browser, OWN_PAGE } from '../../support/browser';
import { addressOf, DEMO_PASSWORD, demoClub } from '../../support/demo-club';

vi.stubEnv('PUBLIC_URL', 'https://bendwell.example/');
await demoClub();

describe('a site reached over https', () => {
  it('keeps the sign-in in a cookie that no other host, path or plain connection can set or read', () => {
    const { name, attributes } = lucia().createSessionCookie('secret');
    expect(name).toBe('__Host-bendwell');
    expect(attributes).toMatchObject({ secure: true, httpOnly: true, sameSite: 'lax', path: '/' });
    expect(attributes.domain).toBeUndefined();
  });

  it('tells browsers to come over https only', () => {
    const { headers } = proxy(new NextRequest('https://bendwell.example/'));
    expect(headers.get('strict-transport-security')).toBe('max-age=63072000; includeSubDomains');
    expect(headers.get('content-security-policy')).toContain('upgrade-insecure-requests');
  });

  it('hands every request a nonce of its own', () => {
    const nonce = () =>
      /nonce-(\w+)/.exec(
        proxy(new NextRequest('https://bendwell.example/')).headers.get('content-security-policy')!,
      )?.[1];
    expect(nonce()).not.toBe(nonce());
  });

  it('takes forms of its own origin only, whatever host the request names', async () => {
    const send = (head: Readonly<Record<string, string>>) =>
      new Browser().submit(signInAction, { email: addressOf('ines'), password: DEMO_PASSWORD }, head);
    expect((await send({ ...OWN_PAGE, host: 'inner:3000', origin: 'https://bendwell.example' })).goesTo).toBe(
      '/account',
    );
    const plain = { ...OWN_PAGE, origin: 'http://bendwell.example' };
    expect((await send(plain)).notice?.text).toMatch(/another site/);
    const forged = { ...OWN_PAGE, host: 'evil.example', origin: 'https://evil.example' };
    expect((await send(forged)).notice?.text).toMatch(/another site/);
  });

  it('gets no demo members with published passwords unless asked to', () => {
    expect(wantsDemo()).toBe(false);
  });
});
