'use client';
import { type RefObject, useCallback, useRef, useState } from 'react';
import type { Vec3 } from '@/lib/geometry/kernel';
import { percent, pullWords } from './describe';
import { drawDimensions } from './drawing/dimensions';
import type { Extent, Project } from './drawing/views';
import type { OverlayContent } from './hud/overlay';
import { type Moved, meshOf } from './mesh/arrange';
import { diagonalOf } from './mesh/bounds';
import { markOf } from './mesh/sight';
import type { BodyStyle, Section } from './scene-props';
import type { ViewportProps } from './types';
import type { Arrangement } from './use-arrangement';
import type { BuildState } from './use-build';

const EMPTY: OverlayContent = { dimensions: [], pin: null, cutAway: false };

/** Nearer than this share of its size to a vertex, the part does not hide it. */
const SKIN = 0.004;

export interface Staging {
  readonly styles: Readonly<Record<string, BodyStyle>>;
  readonly section: Section | null;
}

/** The mark of the largest strain where it can be seen; `cutAway` where the cut took all of that place. */
function markPeak(
  { peak, moved, now }: Arrangement,
  { styles, section }: Staging,
  project: Project,
  eye: Vec3,
): Pick<OverlayContent, 'pin' | 'cutAway'> {
  const styleOf = (one: Moved) => styles[one.body.name] ?? 'solid';
  if (!peak || styleOf(moved[peak.body]!) === 'hidden') return { pin: null, cutAway: false };
  const size = diagonalOf(now);
  const solids = moved.filter((one) => styleOf(one) === 'solid').map(meshOf);
  const sight = { solids, eye, section, skin: SKIN * size };
  const place = markOf(moved[peak.body]!.positions, peak.vertices, size, sight);
  if (!place) return { pin: null, cutAway: true };
  const text = `${percent(peak.strain)} ${pullWords(peak.strain)}`;
  return { pin: { ...project(place.point), text, seen: place.seen }, cutAway: false };
}

type Wishes = Pick<ViewportProps, 'showDimensions' | 'onBed' | 'paint' | 'highlightField'>;

/** Sets dimensions and the mark of the peak anew with each frame drawn, and notes how long the frame took to come. */
export function useOverlay(
  { build, askedAt }: BuildState,
  shown: Arrangement | null,
  { showDimensions, onBed, paint, highlightField = null }: Wishes,
  stage: RefObject<HTMLElement | null>,
  staging: Staging,
) {
  const [overlay, setOverlay] = useState(EMPTY);
  const measured = useRef(0);
  const callouts = showDimensions && !onBed && shown?.nearRest ? build?.callouts : undefined;
  const pinned = paint === 'strain' && !onBed ? shown : null;
  const onFrame = useCallback(
    (project: Project, size: Extent, eye: Vec3) => {
      setOverlay({
        ...(pinned ? markPeak(pinned, staging, project, eye) : EMPTY),
        dimensions: callouts ? drawDimensions(callouts, project, size, highlightField) : [],
      });
      if (measured.current === askedAt || !stage.current) return;
      measured.current = askedAt;
      const { dataset } = stage.current;
      queueMicrotask(() => {
        dataset.pictureMs = (performance.now() - askedAt).toFixed(1);
      });
    },
    [callouts, highlightField, pinned, staging, askedAt, stage],
  );
  return { overlay, drawn: overlay !== EMPTY, onFrame };
}
