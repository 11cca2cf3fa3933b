'use client';

import { createContext, useContext, useMemo } from 'react';
import { useStore } from 'zustand';
import type { Subject } from '@/generators/sensitivity';
import type { FieldIssue } from '@/lib/errors';
import type { Reading, Session } from './session';

const Context = createContext<Session | null>(null);

export const SessionProvider = Context.Provider;

export function useSession(): Session {
  const session = useContext(Context);
  if (!session) throw new Error('used outside the design page');
  return session;
}

export const useReading = <T,>(select: (reading: Reading) => T): T => useStore(useSession().reading, select);

export const useEntry = (key: string): string =>
  useStore(useSession().typed, ({ entries }) => entries[key] ?? '');

export const useIssue = (key: string): FieldIssue | undefined =>
  useReading(({ issues }) => issues.find(({ field }) => field === key));

/** The part the shown check is of. Its identity changes only with the design. */
export function useSubject(): Subject {
  const { family } = useSession();
  const design = useReading((reading) => reading.design);
  const material = useReading((reading) => reading.material);
  return useMemo(
    () => ({ family, values: design.values, material, use: design.use }),
    [family, design, material],
  );
}
