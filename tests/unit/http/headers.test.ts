import { describe, expect, it } from 'vitest';
import { contentPolicy } from '@/lib/http/headers';

const ruleOf = (policy: string, name: string) =>
  policy.split('; ').find((rule) => rule === name || rule.startsWith(`${name} `));
const live = contentPolicy('abc', { development: false, https: true });

describe('the content policy', () => {
  it('lets scripts run from this site’s files or with the nonce, and never inline or by eval', () => {
    expect(ruleOf(live, 'script-src')).toBe("script-src 'self' 'nonce-abc' 'wasm-unsafe-eval'");
    expect(ruleOf(live, 'script-src')).not.toContain("'unsafe-");
  });

  it('lets workers build and solve', () => {
    expect(ruleOf(live, 'worker-src')).toBe("worker-src 'self' blob:");
  });

  it('lets nobody frame a page, rebase its links, or take its forms elsewhere', () => {
    expect(ruleOf(live, 'frame-ancestors')).toBe("frame-ancestors 'none'");
    expect(ruleOf(live, 'base-uri')).toBe("base-uri 'none'");
    expect(ruleOf(live, 'form-action')).toBe("form-action 'self'");
    expect(ruleOf(live, 'object-src')).toBe("object-src 'none'");
  });

  it('asks for https where the site is reached by it, and only there', () => {
    expect(ruleOf(live, 'upgrade-insecure-requests')).toBe('upgrade-insecure-requests');
    const plain = contentPolicy('abc', { development: false, https: false });
    expect(ruleOf(plain, 'upgrade-insecure-requests')).toBeUndefined();
  });
});
