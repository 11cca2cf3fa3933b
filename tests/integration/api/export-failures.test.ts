import { describe, expect, it, vi } from 'vitest';
import { POST } from '@/app/api/v1/export/route';
import { TooLarge, Unavailable } from '@/lib/errors';
import { KernelError } from '@/lib/geometry/kernel';
import { exportPart } from '@/lib/jobs/build-pool';
import { post, problemOf } from '../../support/api';
import { seededDatabase } from '../../support/database';

vi.mock('@/lib/jobs/build-pool', () => ({ exportPart: vi.fn() }));
seededDatabase();

async function sendWhile(error: Error): Promise<Response> {
  vi.mocked(exportPart).mockRejectedValueOnce(error);
  return post(POST, '/api/v1/export', { family: 'living-hinge', format: 'stl' });
}

describe('when the build fails', () => {
  it('answers an impossible shape with the step and the reason', async () => {
    const response = await sendWhile(new KernelError('subtract', 'nothing is left'));
    const { errors } = await problemOf(response, 'invalid-input');
    expect(errors).toEqual([
      { field: 'parameters', message: 'The shape cannot be built: subtract, nothing is left' },
    ]);
  });

  it('answers a part with too many triangles as too large', async () => {
    const problem = await problemOf(
      await sendWhile(new TooLarge('The part has 600000 triangles')),
      'too-large',
    );
    expect(problem.detail).toBe('The part has 600000 triangles.');
  });

  it('asks to come back when too many builds are waiting', async () => {
    const response = await sendWhile(new Unavailable('24 exports are waiting already'));
    expect(response.headers.get('retry-after')).toBe('5');
    await problemOf(response, 'unavailable');
  });

  it('tells nothing of a fault of our own', async () => {
    const problem = await problemOf(await sendWhile(new Error('thread at /srv died')), 'internal');
    expect(JSON.stringify(problem)).not.toContain('/srv');
  });
});
