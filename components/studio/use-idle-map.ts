'use client';

import { useEffect, useState } from 'react';

/** Milliseconds of work at a time; short enough that a key pressed meanwhile is answered in the same frame. */
const SLICE = 8;
/** Milliseconds after a change before the work begins, so that the picture of the change comes first. */
const WAIT = 120;

type Left = () => number;

function slice(): Left {
  const end = performance.now() + SLICE;
  return () => end - performance.now();
}

function whenIdle(work: (left: Left) => void): () => void {
  if (typeof requestIdleCallback === 'function') {
    const handle = requestIdleCallback(() => work(slice()), { timeout: 200 });
    return () => cancelIdleCallback(handle);
  }
  const handle = setTimeout(() => work(slice()), 30);
  return () => clearTimeout(handle);
}

interface Answers<T> {
  readonly found: ReadonlyMap<string, T>;
  /** false while the answers are still those of the former subject */
  readonly current: boolean;
}

/**
 * Works out one answer per key while nothing else is to be done. Answers appear together; until then the former
 * ones stand, null at first. `make` must be stable for the same subject.
 */
export function useIdleMap<T>(keys: readonly string[], make: (key: string) => T): Answers<T> | null {
  const [answers, setAnswers] = useState<{ found: ReadonlyMap<string, T>; of: typeof make } | null>(null);
  useEffect(() => {
    const found = new Map<string, T>();
    const rest = [...keys];
    const next = (left: Left): void => {
      do {
        const key = rest.shift();
        if (key !== undefined) found.set(key, make(key));
      } while (rest.length > 0 && left() > 0);
      if (rest.length === 0) setAnswers({ found, of: make });
      else cancel = whenIdle(next);
    };
    const wait = setTimeout(() => {
      cancel = whenIdle(next);
    }, WAIT);
    let cancel = () => clearTimeout(wait);
    return () => cancel();
  }, [keys, make]);
  return answers && { found: answers.found, current: answers.of === make };
}
