import { describe, expect, it, vi } from 'vitest';
import type { FromSolver, ToSolver } from '@/components/viewport/solve.worker';
import {
  createSolveClient,
  prepareSolver,
  type SolveClient,
  type SolverPort,
} from '@/components/viewport/solve-client';
import { cantileverModel } from '@/lib/fea/shapes/cantilever';
import { LINEAR } from '@/lib/fea/solve/options';
import type { SolveRequest } from '@/lib/fea/solve/request';
import { REFERENCE } from '@/tests/support/plane-models';

const request = (length: number): SolveRequest => ({
  model: cantileverModel({
    length,
    thickness: 2,
    tipThickness: 2,
    catch: null,
    root: { kind: 'rigid' },
    fillets: { front: 0, back: 0 },
    width: { kind: 'even', width: 5 },
    deflection: 1,
  }),
  numbers: REFERENCE,
  options: LINEAR,
  allowable: null,
});

class FakeSolver implements SolverPort {
  readonly got: ToSolver[] = [];
  ended = false;
  private readonly listeners: Record<string, ((event: never) => void)[]> = {};

  postMessage(message: ToSolver): void {
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
  answer(job: number, reason = `job ${job}`): void {
    const data: FromSolver = { job, solution: { ok: false, reason }, took: 3 };
    this.emit('message', { data });
  }
  jobs(): number[] {
    return this.got.flatMap((message) => (message.kind === 'solve' ? [message.job] : []));
  }
}

function setUp(): { client: SolveClient; workers: FakeSolver[] } {
  const workers: FakeSolver[] = [];
  const client = createSolveClient(() => {
    workers.push(new FakeSolver());
    return workers.at(-1)!;
  });
  return { client, workers };
}

const reasonOf = async (solve: ReturnType<SolveClient['solve']>) => {
  const answer = await solve;
  return answer && !answer.solution.ok ? answer.solution.reason : answer;
};

describe('solve client', () => {
  it('answers a request with what the worker found and how long it took', async () => {
    const { client, workers } = setUp();
    const solve = client.solve(request(10));
    workers[0]!.answer(1);
    expect(await solve).toEqual({ solution: { ok: false, reason: 'job 1' }, took: 3 });
  });

  it('sends one request at a time and of those waiting only the latest', async () => {
    const { client, workers } = setUp();
    const solves = [10, 11, 12, 13].map((length) => client.solve(request(length)));
    expect(workers[0]!.jobs()).toEqual([1]);
    workers[0]!.answer(1);
    expect(workers[0]!.jobs()).toEqual([1, 4]);
    workers[0]!.answer(4);
    expect(await Promise.all(solves.map(reasonOf))).toEqual([null, null, null, 'job 4']);
    expect(workers).toHaveLength(1);
  });

  it('answers with the reason when the worker is lost, and starts another for the next request', async () => {
    const { client, workers } = setUp();
    const lost = client.solve(request(10));
    workers[0]!.emit('error', { message: 'out of memory' });
    expect(await reasonOf(lost)).toMatch(/could not be started \(out of memory\)/);
    expect(workers[0]!.ended).toBe(true);
    const next = client.solve(request(11));
    workers[1]!.answer(2);
    expect(await reasonOf(next)).toBe('job 2');
  });

  it('ends the worker when disposed and answers nothing more', async () => {
    const { client, workers } = setUp();
    const open = client.solve(request(10));
    client.dispose();
    expect(workers[0]!.ended).toBe(true);
    expect(await open).toBeNull();
    expect(await client.solve(request(11))).toBeNull();
  });

  it('answers with the reason when no worker can be had at all', async () => {
    const client = createSolveClient(() => {
      throw new Error('workers are not allowed here');
    });
    expect(await reasonOf(client.solve(request(10)))).toMatch(/workers are not allowed here/);
  });

  it('takes the worker that was started before the page was alive, and starts its own after that', () => {
    const workers: FakeSolver[] = [];
    vi.stubGlobal(
      'Worker',
      class extends FakeSolver {
        constructor() {
          super();
          workers.push(this);
        }
      },
    );
    prepareSolver();
    prepareSolver();
    expect(workers.map(({ got }) => got)).toEqual([[{ kind: 'warm-up' }]]);
    const [one, other] = [createSolveClient(), createSolveClient()];
    void one.solve(request(10));
    void other.solve(request(11));
    expect(workers.map((worker) => worker.jobs())).toEqual([[1], [1]]);
    one.dispose();
    other.dispose();
    vi.unstubAllGlobals();
  });

  it('sends requests that survive structured cloning unchanged', () => {
    expect(structuredClone(request(10))).toEqual(request(10));
  });
});
