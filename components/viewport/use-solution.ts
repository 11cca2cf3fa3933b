'use client';
import { useEffect, useRef, useState } from 'react';
import type { SolveRequest } from '@/lib/fea/solve/request';
import type { Solved } from '@/lib/fea/solve/solution';
import { createSolveClient, type SolveClient } from './solve-client';

/** What to solve: the quick answer for small movement, then the one that counts. */
export interface SolveRequests {
  readonly small: SolveRequest;
  readonly large: SolveRequest;
}

export interface SolutionState {
  /** requests the solution belongs to; compare before showing it beside other figures */
  readonly of: SolveRequests | null;
  readonly solution: Solved | null;
  /** true until the answer for large movement is there, or has failed */
  readonly pending: boolean;
  /** why there is no solution */
  readonly reason: string | null;
  /** time of the last solve in the worker, ms */
  readonly took: number | null;
}

const NOTHING: SolutionState = { of: null, solution: null, pending: false, reason: null, took: null };

type Show = (change: Partial<SolutionState>) => void;

async function solveInTurn(client: SolveClient, requests: SolveRequests, show: Show): Promise<void> {
  const small = await client.solve(requests.small);
  if (!small) return;
  const { solution, took } = small;
  if (!solution.ok)
    return show({ of: requests, solution: null, pending: false, reason: solution.reason, took });
  show({ of: requests, solution, pending: true, reason: null, took });
  const large = await client.solve(requests.large);
  if (!large) return;
  if (large.solution.ok) show({ solution: large.solution, pending: false, took: large.took });
  else show({ pending: false, reason: large.solution.reason, took: large.took });
}

/**
 * Solves in the worker whenever the requests change: small movement at once, then large. Pass the same object while
 * nothing changes; null solves nothing.
 */
export function useSolution(requests: SolveRequests | null): SolutionState {
  const [state, setState] = useState<SolutionState>(NOTHING);
  const client = useRef<SolveClient | null>(null);

  useEffect(() => {
    const created = createSolveClient();
    client.current = created;
    created.warmUp();
    return () => created.dispose();
  }, []);

  useEffect(() => {
    let wanted = true;
    if (requests) {
      void solveInTurn(client.current!, requests, (change) => {
        if (wanted) setState((last) => ({ ...last, ...change }));
      });
    }
    return () => {
      wanted = false;
    };
  }, [requests]);

  return requests ? state : NOTHING;
}
