import { EventEmitter } from 'node:events';
import { afterEach, describe, expect, it, vi } from 'vitest';
import { InvalidInput, NotFound, TooLarge, Unavailable } from '@/lib/errors';
import { KernelError } from '@/lib/geometry/kernel';
import { BuildPool, type ExportRequest, type ThreadPort } from '@/lib/jobs/build-pool';
import type { FromExporter, PackedError, ToExporter } from '@/lib/jobs/export.types';

const request = (title: string): ExportRequest => ({
  family: 'hook',
  parameters: {},
  format: 'stl',
  quality: 'export',
  title,
  materialName: null,
});
const part = (byte: number) => ({ bytes: Uint8Array.of(byte), bodies: [] });

class FakeThread extends EventEmitter {
  readonly got: ToExporter[] = [];
  ended = false;
  held = true;
  postMessage(message: ToExporter): void {
    this.got.push(message);
  }
  ref(): void {
    this.held = true;
  }
  unref(): void {
    this.held = false;
  }
  terminate(): Promise<number> {
    this.ended = true;
    return Promise.resolve(1);
  }
  reply(message: FromExporter): void {
    this.emit('message', message);
  }
  titles(): string[] {
    return this.got.map((message) => message.request.title);
  }
}

function setUp(limits: { threads?: number; waiting?: number } = {}) {
  const threads: FakeThread[] = [];
  const pool = new BuildPool({ threads: 1, waiting: 2, time: 1000, ...limits }, () => {
    threads.push(new FakeThread());
    return threads.at(-1) as unknown as ThreadPort;
  });
  return { pool, threads };
}

afterEach(() => vi.useRealTimers());

describe('the build pool', () => {
  it('hands a thread one job at a time, in the order asked, and keeps the warm thread', async () => {
    const { pool, threads } = setUp();
    const jobs = ['a', 'b'].map((title) => pool.exportPart(request(title)));
    expect(threads[0]!.titles()).toEqual(['a']);
    threads[0]!.reply({ job: 1, part: part(1) });
    expect(threads[0]!.titles()).toEqual(['a', 'b']);
    threads[0]!.reply({ job: 2, part: part(2) });
    expect(await Promise.all(jobs)).toEqual([part(1), part(2)]);
    expect(threads).toHaveLength(1);
  });

  it('uses as many threads as it may', () => {
    const { pool, threads } = setUp({ threads: 2 });
    for (const title of ['a', 'b', 'c']) void pool.exportPart(request(title));
    expect(threads.map((thread) => thread.titles())).toEqual([['a'], ['b']]);
  });

  it('holds the process only while a job runs', async () => {
    const { pool, threads } = setUp();
    const job = pool.exportPart(request('a'));
    expect(threads[0]!.held).toBe(true);
    threads[0]!.reply({ job: 1, part: part(1) });
    await job;
    expect(threads[0]!.held).toBe(false);
  });

  it('refuses a job when too many wait, and does those that wait', async () => {
    const { pool, threads } = setUp({ waiting: 2 });
    const jobs = ['a', 'b', 'c'].map((title) => pool.exportPart(request(title)));
    await expect(pool.exportPart(request('d'))).rejects.toEqual(
      new Unavailable('2 exports are waiting already'),
    );
    for (const job of [1, 2, 3]) threads[0]!.reply({ job, part: part(job) });
    expect(await Promise.all(jobs)).toEqual([part(1), part(2), part(3)]);
  });

  it('gives up a job over its time and serves the next from a fresh thread', async () => {
    vi.useFakeTimers();
    const { pool, threads } = setUp();
    const [slow, next] = ['slow', 'next'].map((title) => pool.exportPart(request(title)));
    const settled = Promise.allSettled([slow]);
    vi.advanceTimersByTime(1001);
    expect(await settled).toMatchObject([
      { reason: new Unavailable('The part took longer than 1 s to build') },
    ]);
    expect(threads[0]!.ended).toBe(true);
    threads[0]!.reply({ job: 1, part: part(9) });
    threads[1]!.reply({ job: 2, part: part(2) });
    expect(await next).toEqual(part(2));
  });

  it.each(['error', 'exit'])('fails only the job of a thread that is lost by %s', async (event) => {
    const { pool, threads } = setUp();
    const [lost, next] = ['lost', 'next'].map((title) => pool.exportPart(request(title)));
    const settled = Promise.allSettled([lost]);
    threads[0]!.emit(event, event === 'error' ? new Error('out of memory') : 1);
    expect((await settled)[0]!.status).toBe('rejected');
    threads[1]!.reply({ job: 2, part: part(2) });
    expect(await next).toEqual(part(2));
  });

  it('refuses the jobs under way and waiting when it closes', async () => {
    const { pool, threads } = setUp();
    const settled = Promise.allSettled(['a', 'b'].map((title) => pool.exportPart(request(title))));
    await pool.close();
    expect((await settled).map((one) => one.status)).toEqual(['rejected', 'rejected']);
    expect(threads.every((thread) => thread.ended)).toBe(true);
    expect(threads).toHaveLength(1);
  });

  const issues = [{ field: 'armLength', message: 'Arm length must be at least 4 mm', bound: 4 }];
  const errors: [PackedError, Error][] = [
    [{ name: 'InvalidInput', message: 'x', issues }, new InvalidInput(issues)],
    [{ name: 'NotFound', message: 'x', what: 'family x' }, new NotFound('family x')],
    [{ name: 'TooLarge', message: 'too many triangles' }, new TooLarge('too many triangles')],
    [
      { name: 'KernelError', message: 'x', operation: 'union', status: 'nothing is left' },
      new KernelError('union', 'nothing is left'),
    ],
    [{ name: 'RangeError', message: 'oops' }, new Error('oops')],
  ];
  it.each(errors)('gives back the $name of its thread', async (error, expected) => {
    const { pool, threads } = setUp();
    const job = pool.exportPart(request('a'));
    threads[0]!.reply({ job: 1, error });
    const thrown = await job.catch((reason: unknown) => reason);
    expect(thrown).toBeInstanceOf(expected.constructor);
    expect(thrown).toEqual(expected);
  });
});
