// @vitest-environment happy-dom
import { act } from 'react';
import { createRoot, type Root } from 'react-dom/client';
import { afterEach, beforeEach, describe, expect, it, vi } from 'vitest';
import type { FromSolver, ToSolver } from '@/components/viewport/solve.worker';
import { type SolveRequests, type UsedSolution, useSolution } from '@/components/viewport/use-solution';
import { refined } from '@/lib/fea/mesh/options';
import { cantileverModel } from '@/lib/fea/shapes/cantilever';
import { LINEAR, NON_LINEAR, type SolveOptions } from '@/lib/fea/solve/options';
import type { SolveRequest } from '@/lib/fea/solve/request';
import type { Solution } from '@/lib/fea/solve/solution';
import { solveBending } from '@/lib/fea/solve/solve-bending';
import { REFERENCE } from '@/tests/support/plane-models';

const model = (length: number) =>
  cantileverModel({
    length,
    thickness: 2,
    tipThickness: 2,
    catch: null,
    root: { kind: 'rigid' },
    fillets: { front: 0, back: 0 },
    width: { kind: 'even', width: 5 },
    deflection: 1,
  });

function requests(length: number): SolveRequests {
  const of = (options: SolveOptions): SolveRequest => ({
    model: model(length),
    numbers: REFERENCE,
    options,
    allowable: null,
  });
  return { small: of(LINEAR), large: of(NON_LINEAR) };
}

/** Holds what it is asked until the test answers. */
class FakeWorker {
  static readonly all: FakeWorker[] = [];
  readonly asked: (ToSolver & { kind: 'solve' })[] = [];
  ended = false;
  private listener: (event: MessageEvent<FromSolver>) => void = () => {};

  constructor() {
    FakeWorker.all.push(this);
  }
  postMessage(message: ToSolver): void {
    if (message.kind === 'solve') this.asked.push(message);
  }
  addEventListener(type: string, listener: (event: MessageEvent<FromSolver>) => void): void {
    if (type === 'message') this.listener = listener;
  }
  terminate(): void {
    this.ended = true;
  }
  async answer(took: number, solution?: Solution): Promise<void> {
    const { job, request } = this.asked.at(-1)!;
    const own = solution ?? solveBending(request.model, request.numbers, request.options);
    await act(async () => this.listener({ data: { job, solution: own, took } } as MessageEvent<FromSolver>));
  }
}

let root: Root;
let used: UsedSolution;

function Probe({ wanted }: { wanted: SolveRequests | null }) {
  used = useSolution(wanted);
  return null;
}

const show = (wanted: SolveRequests | null) => act(async () => root.render(<Probe wanted={wanted} />));
const worker = () => FakeWorker.all.at(-1)!;

beforeEach(() => {
  FakeWorker.all.length = 0;
  vi.stubGlobal('Worker', FakeWorker);
  Object.assign(globalThis, { IS_REACT_ACT_ENVIRONMENT: true });
  root = createRoot(document.createElement('div'));
});

afterEach(async () => {
  await act(async () => root.unmount());
  vi.unstubAllGlobals();
});

describe('useSolution', () => {
  it('gives the answer for small movement at once, then the one for large', async () => {
    const first = requests(12);
    await show(first);
    expect(used.state).toMatchObject({ of: null, solution: null });
    await worker().answer(8);
    expect(used.state).toMatchObject({ of: first, pending: true, took: { small: 8, large: null } });
    expect(used.state.solution!.method).toBe('linear');
    await worker().answer(40);
    expect(used.state).toMatchObject({ of: first, pending: false, took: { small: 8, large: 40 } });
    expect(used.state.solution!.method).toBe('non-linear');
    expect(used.state.firstAnswer).toBeGreaterThan(0);
  });

  it('keeps the former answer, marked as that of the former part, until the new one is there', async () => {
    const [first, second] = [requests(12), requests(13)];
    await show(first);
    await worker().answer(8);
    await show(second);
    expect(used.state.of).toBe(first);
    await worker().answer(9);
    expect(used.state.of).toBe(first);
    await worker().answer(9);
    expect(used.state.of).toBe(second);
  });

  it('of parts that follow quickly solves the one under way and the last', async () => {
    const all = [12, 13, 14, 15].map(requests);
    for (const one of all) await show(one);
    expect(worker().asked).toHaveLength(1);
    await worker().answer(8);
    expect(worker().asked.map(({ request }) => request)).toEqual([all[0]!.small, all[3]!.small]);
    await worker().answer(8);
    expect(used.state.of).toBe(all[3]);
  });

  it('says why when a part cannot be solved, and when only its large movement cannot', async () => {
    await show(requests(12));
    await worker().answer(1, { ok: false, reason: 'an element is folded at rest' });
    expect(used.state).toMatchObject({
      solution: null,
      pending: false,
      reason: 'an element is folded at rest',
    });
    await show(requests(13));
    await worker().answer(8);
    expect(used.state.reason).toBeNull();
    await worker().answer(30, { ok: false, reason: 'no balance' });
    expect(used.state).toMatchObject({ pending: false, reason: 'no balance' });
    expect(used.state.solution!.method).toBe('linear');
  });

  it('solves on edges half as long when asked, and drops that with the part', async () => {
    await show(requests(12));
    await worker().answer(8);
    await worker().answer(40);
    await act(async () => used.refine());
    expect(used.state.refinement).toEqual({ status: 'solving' });
    expect(worker().asked.at(-1)!.request.options.mesh).toEqual(refined(NON_LINEAR.mesh));
    await worker().answer(200);
    const { refinement, solution } = used.state;
    if (refinement?.status !== 'solved') throw new Error('not refined');
    expect(refinement.took).toBe(200);
    expect(refinement.solution.unknowns).toBeGreaterThan(solution!.unknowns);
    await show(requests(13));
    await worker().answer(8);
    expect(used.state.refinement).toBeNull();
  });

  it('solves nothing for a part without a plane model', async () => {
    await show(null);
    expect(FakeWorker.all).toHaveLength(0);
    expect(used.state).toMatchObject({ of: null, solution: null, pending: false, reason: null });
  });

  it('ends its worker with the page', async () => {
    await show(requests(12));
    await act(async () => root.unmount());
    expect(worker().ended).toBe(true);
    root = createRoot(document.createElement('div'));
  });
});
