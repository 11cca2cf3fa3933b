'use client';
import { type RefObject, useCallback, useRef, useState } from 'react';
import { percent, pullWords } from './describe';
import { drawDimensions } from './drawing/dimensions';
import type { Extent, Project } from './drawing/views';
import type { OverlayContent, Pin } from './hud/overlay';
import type { ViewportProps } from './types';
import type { Arrangement } from './use-arrangement';
import type { BuildState } from './use-build';

const EMPTY: OverlayContent = { dimensions: [], pin: null };

/** On the place of largest strain that is nearest to the eye. */
function pinOf(shown: Arrangement | null, project: Project): Pin | null {
  if (!shown?.peak) return null;
  const { body, vertices, strain } = shown.peak;
  const { positions: p } = shown.moved[body]!;
  const nearest = vertices
    .map((vertex) => project([p[3 * vertex]!, p[3 * vertex + 1]!, p[3 * vertex + 2]!]))
    .reduce((best, one) => (one.depth > best.depth ? one : best));
  return { ...nearest, text: `${percent(strain)} ${pullWords(strain)}` };
}

type Wishes = Pick<ViewportProps, 'showDimensions' | 'onBed' | 'paint' | 'highlightField'>;

/** Sets dimensions and the mark of the peak anew with each frame drawn, and notes how long the frame took to come. */
export function useOverlay(
  { build, askedAt }: BuildState,
  shown: Arrangement | null,
  { showDimensions, onBed, paint, highlightField = null }: Wishes,
  stage: RefObject<HTMLElement | null>,
) {
  const [overlay, setOverlay] = useState(EMPTY);
  const measured = useRef(0);
  const callouts = showDimensions && !onBed && shown?.nearRest ? build?.callouts : undefined;
  const pinned = paint === 'strain' && !onBed ? shown : null;
  const onFrame = useCallback(
    (project: Project, size: Extent) => {
      setOverlay({
        dimensions: callouts ? drawDimensions(callouts, project, size, highlightField) : [],
        pin: pinOf(pinned, project),
      });
      if (measured.current === askedAt || !stage.current) return;
      measured.current = askedAt;
      const { dataset } = stage.current;
      queueMicrotask(() => {
        dataset.pictureMs = (performance.now() - askedAt).toFixed(1);
      });
    },
    [callouts, highlightField, pinned, askedAt, stage],
  );
  return { overlay, onFrame };
}
