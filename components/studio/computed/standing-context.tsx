'use client';

import { createContext, type ReactNode, useContext, useMemo } from 'react';
import { type SolutionState, type SolveRequests, useSolution } from '@/components/viewport/use-solution';
import { bendingOf, perModulus, solveRequest } from '@/generators/bend';
import type { Bending } from '@/generators/contract';
import type { Subject } from '@/generators/sensitivity';
import { useReading, useSubject } from '../session-context';
import { calibrated } from './calibrated';
import { type Standing, standingOf } from './standing';

export interface Solving extends Pick<SolutionState, 'took' | 'firstAnswer' | 'refinement'> {
  readonly standing: Standing;
  readonly refine: () => void;
}

const Context = createContext<Solving | null>(null);

export function useSolving(): Solving {
  const solving = useContext(Context);
  if (!solving) throw new Error('used outside the design page');
  return solving;
}

export const useStanding = (): Standing => useSolving().standing;

/** The report the verdict stands on. */
export const useStandingReport = () => useStanding().report;

/** The part with its formulas drawn to what was computed for it. */
export function useCalibrated(spare = 0): Subject {
  const subject = useSubject();
  const standing = useStanding();
  return useMemo(() => calibrated(subject, standing, spare), [subject, standing, spare]);
}

function requestsOf(bending: Bending, { material, use }: Subject): SolveRequests | null {
  if ('none' in bending) return null;
  const [small, large] = (['small', 'large'] as const).map((displacement) =>
    perModulus(solveRequest(bending, material, use, displacement)),
  );
  return { small: small!, large: large! };
}

/** The same object as long as the part asked for is the same, so that it is not solved again. */
function useRequests(bending: Bending, subject: Subject): SolveRequests | null {
  const requests = useMemo(() => requestsOf(bending, subject), [bending, subject]);
  const text = useMemo(() => JSON.stringify(requests), [requests]);
  // biome-ignore lint/correctness/useExhaustiveDependencies: what the requests say counts, not which object says it
  return useMemo(() => requests, [text]);
}

/** Solves the part as it stands in the worker and tells those inside what the verdict stands on. */
export function StandingProvider({ children }: { children: ReactNode }) {
  const subject = useSubject();
  const formula = useReading((reading) => reading.report);
  const bending = useMemo(
    () => bendingOf(subject.family, subject.values, subject.material, subject.use),
    [subject],
  );
  const requests = useRequests(bending, subject);
  const { state, refine } = useSolution(requests);
  const { solution, pending, reason, took, firstAnswer, refinement } = state;
  const answered = requests !== null && state.of === requests;
  const standing = useMemo(
    () => standingOf(formula, bending, answered ? { solution, pending, reason } : null),
    [formula, bending, answered, solution, pending, reason],
  );
  const solving = useMemo(
    () => ({ standing, refine, took, firstAnswer, refinement: answered ? refinement : null }),
    [standing, refine, took, firstAnswer, refinement, answered],
  );
  return <Context value={solving}>{children}</Context>;
}
