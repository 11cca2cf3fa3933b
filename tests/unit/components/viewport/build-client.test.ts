import { afterEach, describe, expect, it, vi } from 'vitest';
import type { BuildRequest, FromWorker, ToWorker } from '@/components/viewport/build.worker';
import {
  type BuildClient,
  BuildFailed,
  createBuildClient,
  type WorkerPort,
} from '@/components/viewport/build-client';
import type { BuiltBody } from '@/lib/geometry/kernel';

const request = (armLength: number): BuildRequest => ({
  family: 'hook',
  parameters: { armLength },
  quality: 'preview',
});
const body = (name: string): BuiltBody => ({
  name,
  mesh: { positions: new Float32Array(9), indices: new Uint32Array(3) },
  volume: 1,
  bounds: [0, 0, 0, 1, 1, 1],
});

class FakeWorker implements WorkerPort {
  readonly got: ToWorker[] = [];
  ended = false;
  private readonly listeners: Record<string, ((event: never) => void)[]> = {};

  postMessage(message: ToWorker): void {
    this.got.push(message);
  }
  addEventListener(type: string, listener: (event: never) => void): void {
    this.listeners[type] = [...(this.listeners[type] ?? []), listener];
  }
  terminate(): void {
    this.ended = true;
  }
  emit(type: 'message' | 'error', event: object): void {
    for (const listener of this.listeners[type] ?? []) listener(event as never);
  }
  say(data: FromWorker): void {
    this.emit('message', { data });
  }
  builds(): { job: number; armLength: unknown }[] {
    return this.got.flatMap((message) =>
      message.kind === 'build'
        ? [{ job: message.job, armLength: (message.request.parameters as { armLength: number }).armLength }]
        : [],
    );
  }
}

function setUp(timeLimit = 1000): { client: BuildClient; workers: FakeWorker[] } {
  const workers: FakeWorker[] = [];
  const startWorker = () => {
    workers.push(new FakeWorker());
    return workers.at(-1)!;
  };
  return { client: createBuildClient({ startWorker, timeLimit }), workers };
}

afterEach(() => vi.useRealTimers());

describe('the build client', () => {
  it('answers with the bodies of the build', async () => {
    const { client, workers } = setUp();
    const built = client.build(request(10));
    workers[0]!.say({ kind: 'built', job: 1, bodies: [body('hook')] });
    expect(await built).toEqual([body('hook')]);
  });

  it('starts no worker before it is asked for something', () => {
    expect(setUp().workers).toHaveLength(0);
  });

  it('lets the latest of many builds win: the overtaken ones answer null, those in between are never built', async () => {
    const { client, workers } = setUp();
    const builds = [10, 11, 12, 13].map((length) => client.build(request(length)));
    expect(workers[0]!.builds()).toEqual([{ job: 1, armLength: 10 }]);
    expect(await Promise.all(builds.slice(0, 3))).toEqual([null, null, null]);
    workers[0]!.say({ kind: 'built', job: 1, bodies: [body('old')] });
    expect(workers[0]!.builds()).toEqual([
      { job: 1, armLength: 10 },
      { job: 4, armLength: 13 },
    ]);
    workers[0]!.say({ kind: 'built', job: 4, bodies: [body('new')] });
    expect((await builds[3])?.[0]?.name).toBe('new');
  });

  it('answers null to a cancelled build and goes on with the next', async () => {
    const { client, workers } = setUp();
    const first = client.build(request(10));
    client.cancel();
    expect(await first).toBeNull();
    const second = client.build(request(11));
    workers[0]!.say({ kind: 'built', job: 1, bodies: [body('old')] });
    workers[0]!.say({ kind: 'built', job: 2, bodies: [body('new')] });
    expect((await second)?.[0]?.name).toBe('new');
  });

  it('passes on why a build failed, and builds again', async () => {
    const { client, workers } = setUp();
    const first = client.build(request(10));
    workers[0]!.say({ kind: 'failed', job: 1, because: 'Arm length must be at least 4 mm' });
    await expect(first).rejects.toEqual(new BuildFailed('Arm length must be at least 4 mm'));
    const second = client.build(request(11));
    workers[0]!.say({ kind: 'built', job: 2, bodies: [] });
    expect(await second).toEqual([]);
  });

  it('gives up a build that hangs and serves the next from a fresh worker', async () => {
    vi.useFakeTimers();
    const { client, workers } = setUp(1000);
    const first = client.build(request(10));
    vi.advanceTimersByTime(1001);
    await expect(first).rejects.toThrow('longer than 1 s');
    expect(workers[0]!.ended).toBe(true);
    const second = client.build(request(11));
    workers[0]!.say({ kind: 'built', job: 1, bodies: [body('late')] });
    workers[1]!.say({ kind: 'built', job: 2, bodies: [body('new')] });
    expect((await second)?.[0]?.name).toBe('new');
  });

  it('says so when the worker cannot start, and tries again', async () => {
    const { client, workers } = setUp();
    const first = client.build(request(10));
    workers[0]!.emit('error', { message: 'no such script' });
    await expect(first).rejects.toThrow('The geometry kernel could not be started (no such script).');
    const second = client.build(request(11));
    workers[1]!.say({ kind: 'built', job: 2, bodies: [] });
    expect(await second).toEqual([]);
  });

  it('says so when the browser has no workers', async () => {
    const client = createBuildClient({
      startWorker: () => {
        throw new Error('Worker is not defined');
      },
    });
    await expect(client.build(request(10))).rejects.toThrow('Worker is not defined');
  });

  it('warms up once asked, with the family named', () => {
    const { client, workers } = setUp();
    client.warmUp('peg-strap');
    expect(workers[0]!.got).toEqual([{ kind: 'warm-up', family: 'peg-strap' }]);
  });

  it('ends its worker, answers null to the build under way and refuses later ones', async () => {
    const { client, workers } = setUp();
    const first = client.build(request(10));
    client.dispose();
    expect(await first).toBeNull();
    expect(workers[0]!.ended).toBe(true);
    await expect(client.build(request(11))).rejects.toThrow('The view was closed.');
  });
});
