import { EventEmitter } from 'node:events';
import { describe, expect, it } from 'vitest';
import { Unavailable } from '@/lib/errors';
import { webModel } from '@/lib/fea/shapes/web';
import { LINEAR } from '@/lib/fea/solve/options';
import type { SolveRequest } from '@/lib/fea/solve/request';
import { createSolvePool } from '@/lib/jobs/solve-pool';
import type { ThreadPort } from '@/lib/jobs/thread-pool';
import { REFERENCE } from '@/tests/support/plane-models';

const request: SolveRequest = {
  model: webModel({
    length: 3,
    thickness: 0.4,
    leaf: 2,
    leafLength: 4,
    fillet: 0.3,
    relief: 0,
    angle: 1,
    width: 10,
  }),
  numbers: REFERENCE,
  options: LINEAR,
  allowable: null,
};

class FakeThread extends EventEmitter {
  postMessage(): void {}
  ref(): void {}
  unref(): void {}
  terminate(): Promise<number> {
    return Promise.resolve(1);
  }
}

function setUp(waiting = 1) {
  const threads: FakeThread[] = [];
  const pool = createSolvePool({ threads: 1, waiting, time: 1000 }, () => {
    threads.push(new FakeThread());
    return threads.at(-1) as unknown as ThreadPort;
  });
  return { pool, threads };
}

describe('the solve pool', () => {
  it('gives a shape that could not be solved as an answer, not as an error', async () => {
    const { pool, threads } = setUp();
    const job = pool.run(request);
    const solution = { ok: false, reason: 'the supports do not hold the part' } as const;
    threads[0]!.emit('message', { job: 1, solution });
    expect(await job).toEqual(solution);
  });

  it('rejects with a fault of the program', async () => {
    const { pool, threads } = setUp();
    const job = pool.run(request);
    threads[0]!.emit('message', { job: 1, fault: 'the profile has no edge "x"' });
    await expect(job).rejects.toThrow('the profile has no edge "x"');
  });

  it('refuses a solve when too many wait', async () => {
    const { pool, threads } = setUp(1);
    const jobs = [pool.run(request), pool.run(request)];
    await expect(pool.run(request)).rejects.toEqual(new Unavailable('1 solves are waiting already'));
    for (const job of [1, 2]) threads[0]!.emit('message', { job, solution: { ok: false, reason: 'x' } });
    expect(await Promise.all(jobs)).toHaveLength(2);
  });
});
