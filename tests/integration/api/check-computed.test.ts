import { afterAll, describe, expect, it, vi } from 'vitest';
import { POST } from '@/app/api/v1/check/route';
import { checkResponse } from '@/lib/http/v1/responses';
import { closeSolvePool } from '@/lib/jobs/solve-pool';
import { post, problemOf } from '../../support/api';
import { seededDatabase } from '../../support/database';

vi.stubEnv('RATE_CHECKS_PER_MINUTE', '300');
seededDatabase();
afterAll(closeSolvePool);

const HOOK = { family: 'cantilever-hook', material: 'petg' };
const report = async (body: object) =>
  checkResponse.parse(await (await post(POST, '/api/v1/check', body)).json());
type Answer = Awaited<ReturnType<typeof report>>;
const peak = ({ figures }: Answer) => figures.find(({ id }) => id === 'peak-strain')!;

function computedOf({ computed }: Answer) {
  if (!computed || 'none' in computed) throw new Error('nothing was computed');
  return computed;
}

describe('a check by finite elements', () => {
  it('is not made unless asked for', async () => {
    const answer = await report(HOOK);
    expect(answer.method).toBe('closed');
    expect(answer.computed).toBeNull();
  });

  it('gives the computed strain, its size, place and estimated error beside that of the formula', async () => {
    const [closed, both] = [await report(HOOK), await report({ ...HOOK, method: 'both' })];
    const computed = computedOf(both);
    expect(computed.method).toBe('non-linear');
    expect(computed.unknowns).toBeGreaterThan(1000);
    expect(computed.elements).toBeGreaterThan(100);
    expect(computed.errorEstimate).toBeLessThan(0.05);
    expect(computed.formula).toBe(peak(closed).value);
    expect(Math.abs(computed.difference!)).toBeLessThan(0.06);
    expect(peak(both).value).toBe(computed.strain);
    expect(peak(both).handbook).toBe(peak(closed).handbook);
  });

  it('falls back on the formulas for a part that is not plane, and says why', async () => {
    const answer = await report({ family: 'torsion-latch', material: 'petg', method: 'both' });
    expect(answer.computed).toEqual({ none: expect.stringMatching(/plane/) as string });
    expect(answer.figures.find(({ id }) => id === answer.governing)!.value).not.toBeNull();
  });

  it('leaves the verdict not known for such a part when nothing but finite elements was wanted', async () => {
    const answer = await report({ family: 'torsion-latch', material: 'petg', method: 'fe' });
    const governing = answer.figures.find(({ id }) => id === answer.governing)!;
    expect(governing).toMatchObject({ value: null, verdict: 'not-known' });
    expect(governing.because).toMatch(/^Not known:/);
    expect(['not-known', 'over-limit']).toContain(answer.verdict);
  });

  it('gives the same figures when asked again', async () => {
    const [a, b] = await Promise.all([1, 2].map(() => report({ ...HOOK, method: 'fe' })));
    expect(computedOf(a!)).toEqual(computedOf(b!));
  });

  it('keeps the event loop free while it solves', async () => {
    let ticks = 0;
    const timer = setInterval(() => {
      ticks += 1;
    }, 1);
    await report({ ...HOOK, parameters: { armLength: 60 }, method: 'fe' });
    clearInterval(timer);
    expect(ticks).toBeGreaterThan(2);
  });

  it('names the methods when another is asked for', async () => {
    const problem = await problemOf(
      await post(POST, '/api/v1/check', { ...HOOK, method: 'guess' }),
      'invalid-input',
    );
    expect(problem.errors).toEqual([{ field: 'method', message: 'method must be one of closed, fe, both' }]);
  });
});
