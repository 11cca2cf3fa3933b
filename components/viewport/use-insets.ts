'use client';
import { type RefObject, useEffect, useState } from 'react';
import type { Insets } from './drawing/views';

const BARE: Insets = { top: 52, bottom: 12 };

/** How much of the picture the bars above and below it cover, as they wrap. */
export function useInsets(top: RefObject<HTMLElement | null>, bottom: RefObject<HTMLElement | null>): Insets {
  const [insets, setInsets] = useState(BARE);
  useEffect(() => {
    const measure = () => {
      const next = { top: top.current?.offsetHeight ?? 0, bottom: bottom.current?.offsetHeight ?? 0 };
      setInsets((now) => (now.top === next.top && now.bottom === next.bottom ? now : next));
    };
    const observer = new ResizeObserver(measure);
    for (const bar of [top.current, bottom.current]) if (bar) observer.observe(bar);
    return () => observer.disconnect();
  }, [top, bottom]);
  return insets;
}
