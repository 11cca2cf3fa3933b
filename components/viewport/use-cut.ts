'use client';
import { useMemo, useState } from 'react';
import type { CutChoice } from './hud/cut-control';
import type { Box } from './mesh/bounds';
import { AXES } from './mesh/slice';
import type { Section } from './scene-props';

/** Where the part is cut open; across y first, which shows how an arm, a web or a thread is made. */
export function useCut(cut: boolean, now: Box | null) {
  const [choice, choose] = useState<CutChoice>({ axis: 'y', share: 0.5 });
  const axis = AXES.indexOf(choice.axis);
  const low = now?.min[axis] ?? 0;
  const high = now?.max[axis] ?? 0;
  const section = useMemo<Section | null>(
    () => (cut && high > low ? { axis: choice.axis, at: low + choice.share * (high - low) } : null),
    [cut, choice, low, high],
  );
  return { choice, choose, section };
}
