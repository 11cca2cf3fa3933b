'use client';
import { useEffect, useRef } from 'react';
import { FIRST_PULL, MOST_PULL } from './sample';

const SECONDS = 3.2;

/** Out to the most pull and back, slow at the ends. `share` of the time, 0 to 1. */
function sweep(share: number): number {
  const out = (1 - Math.cos(2 * Math.PI * share)) / 2;
  return FIRST_PULL + out * (MOST_PULL - FIRST_PULL);
}

/** Bends the part once, to show that it does; not where motion is unwanted, nor after the visitor takes over. */
export function useSweep(ready: boolean, touched: boolean, onPull: (pull: number) => void): void {
  const done = useRef(false);
  useEffect(() => {
    if (!ready || touched || done.current) return;
    if (matchMedia('(prefers-reduced-motion: reduce)').matches) return;
    let frame = 0;
    let start: number | null = null;
    const step = (now: number) => {
      start ??= now;
      const share = Math.min(1, (now - start) / (1000 * SECONDS));
      onPull(sweep(share));
      if (share < 1) frame = requestAnimationFrame(step);
      else done.current = true;
    };
    frame = requestAnimationFrame(step);
    return () => cancelAnimationFrame(frame);
  }, [ready, touched, onPull]);
}
