'use client';
import { useCallback, useEffect, useState } from 'react';
import { webglWorks } from './webgl';

/** How the part can be drawn here: not looked yet, in 3-D, or flat because there is no WebGL or it was lost. */
export type Drawing = 'unknown' | 'works' | 'none' | 'lost';

export const REMARKS: Readonly<Record<Drawing, string | null>> = {
  unknown: null,
  works: null,
  none: 'This browser draws no 3-D here, so the part is shown as a flat picture.',
  lost: 'The graphics card let go of the picture, so the part is shown flat.',
};

export function useDrawing() {
  const [drawing, setDrawing] = useState<Drawing>('unknown');
  useEffect(() => setDrawing(webglWorks() ? 'works' : 'none'), []);
  const lose = useCallback(() => setDrawing('lost'), []);
  return { drawing, lose };
}
