'use client';
import { useCallback, useEffect, useRef, useState } from 'react';
import { refined } from '@/lib/fea/mesh/options';
import type { SolveRequest } from '@/lib/fea/solve/request';
import type { Solved } from '@/lib/fea/solve/solution';
import { createSolveClient, type SolveClient } from './solve-client';

/** What to solve: the quick answer for small movement, then the one that counts. */
export interface SolveRequests {
  readonly small: SolveRequest;
  readonly large: SolveRequest;
}

/** The answer for large movement once more, on edges half as long. */
export type Refinement =
  | { readonly status: 'solving' }
  | { readonly status: 'solved'; readonly solution: Solved; readonly took: number }
  | { readonly status: 'failed'; readonly reason: string };

export interface SolutionState {
  /** requests the solution belongs to; compare before showing it beside other figures */
  readonly of: SolveRequests | null;
  readonly solution: Solved | null;
  /** true until the answer for large movement is there, or has failed */
  readonly pending: boolean;
  /** why there is no solution, or none for large movement */
  readonly reason: string | null;
  /** time of each solve in the worker, ms */
  readonly took: { readonly small: number | null; readonly large: number | null };
  /** ms from the start of the page to the first answer on it */
  readonly firstAnswer: number | null;
  /** null until asked for */
  readonly refinement: Refinement | null;
}

export interface UsedSolution {
  readonly state: SolutionState;
  /** Solves once more on a finer mesh; given up when the requests change. */
  readonly refine: () => void;
}

const NOTHING: SolutionState = {
  of: null,
  solution: null,
  pending: false,
  reason: null,
  took: { small: null, large: null },
  firstAnswer: null,
  refinement: null,
};

/** Most degrees of freedom of a refined solve: it is asked for, so it may take a while. */
const MOST_REFINED = 40_000;

type Show = (change: Partial<SolutionState>) => void;

async function solveInTurn(client: SolveClient, requests: SolveRequests, show: Show): Promise<void> {
  const small = await client.solve(requests.small);
  if (!small) return;
  const took = { small: small.took, large: null };
  const fresh = { of: requests, took, refinement: null };
  if (!small.solution.ok)
    return show({ ...fresh, solution: null, pending: false, reason: small.solution.reason });
  show({ ...fresh, solution: small.solution, pending: true, reason: null });
  const large = await client.solve(requests.large);
  if (!large) return;
  const both = { took: { ...took, large: large.took }, pending: false };
  if (large.solution.ok) show({ ...both, solution: large.solution });
  else show({ ...both, reason: large.solution.reason });
}

function finer({ options, ...request }: SolveRequest): SolveRequest {
  return { ...request, options: { ...options, mesh: refined(options.mesh), mostUnknowns: MOST_REFINED } };
}

async function solveFiner(client: SolveClient, { large }: SolveRequests, show: Show): Promise<void> {
  show({ refinement: { status: 'solving' } });
  const solve = await client.solve(finer(large));
  if (!solve) return;
  const { solution, took } = solve;
  show({
    refinement: solution.ok
      ? { status: 'solved', solution, took }
      : { status: 'failed', reason: solution.reason },
  });
}

/**
 * Solves in the worker whenever the requests change: small movement at once, then large. Pass the same object while
 * nothing changes; null solves nothing.
 */
export function useSolution(requests: SolveRequests | null): UsedSolution {
  const [state, setState] = useState<SolutionState>(NOTHING);
  const client = useRef<SolveClient | null>(null);
  const show = useRef<Show>(() => {});

  useEffect(() => {
    const created = createSolveClient();
    client.current = created;
    return () => created.dispose();
  }, []);

  useEffect(() => {
    let wanted = true;
    show.current = (change) => {
      if (!wanted) return;
      setState((last) => ({ ...last, firstAnswer: last.firstAnswer ?? performance.now(), ...change }));
    };
    if (requests) void solveInTurn(client.current!, requests, show.current);
    return () => {
      wanted = false;
    };
  }, [requests]);

  const refine = useCallback(() => {
    if (requests) void solveFiner(client.current!, requests, show.current);
  }, [requests]);
  return { state: requests ? state : NOTHING, refine };
}
