import { expect, it } from 'vitest';
import { RequestProblem } from '@/lib/http/problem';
import { clientOf, rateLimit } from '@/lib/http/rate-limit';

const refused = async (attempt: Promise<void>): Promise<RequestProblem> => {
  const error = await attempt.then(
    () => undefined,
    (reason: unknown) => reason,
  );
  expect(error).toBeInstanceOf(RequestProblem);
  return error as RequestProblem;
};

it('lets a client through as often as it may, then names the seconds to wait', async () => {
  const limit = rateLimit('test-each', 3);
  for (let i = 0; i < 3; i += 1) await limit.take('10.0.0.1');
  const { kind, headers } = await refused(limit.take('10.0.0.1'));
  expect(kind).toBe('too-many-requests');
  expect(Number(headers['Retry-After'])).toBeGreaterThanOrEqual(1);
  expect(Number(headers['Retry-After'])).toBeLessThanOrEqual(60);
});

it('does not make one client wait for another', async () => {
  const limit = rateLimit('test-apart', 1);
  await limit.take('10.0.0.1');
  await expect(limit.take('10.0.0.2')).resolves.toBeUndefined();
});

it('holds a ceiling for all, whatever address they claim', async () => {
  const limit = rateLimit('test-all', 1);
  for (let i = 0; i < 20; i += 1) await limit.take(`10.0.1.${i}`);
  await refused(limit.take('10.0.2.1'));
});

it('takes the address that was added last', () => {
  const from = (value: string) =>
    clientOf(new Request('http://x', { headers: { 'x-forwarded-for': value } }));
  expect(from('6.6.6.6, 10.0.0.7')).toBe('10.0.0.7');
  expect(from('a'.repeat(500))).toHaveLength(64);
  expect(clientOf(new Request('http://x'))).toBe('unknown');
});
