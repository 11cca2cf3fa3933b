'use client';
import { useMemo } from 'react';
import type { Stance } from '@/generators/contract';
import { bedPlacements } from '@/generators/lay-on-bed';
import type { BuiltBody } from '@/lib/geometry/kernel';
import { arrange, type Moved } from './mesh/arrange';
import { type Box, bedUnder, boxOf, diagonalOf, joinBoxes } from './mesh/bounds';
import { type Peak, peakOf, prepare } from './mesh/prepare';
import { REFINE_LIMITS } from './mesh/refine';
import type { BedLook } from './scene-props';
import type { Build } from './use-build';

/** Without WebGL the picture is made of SVG paths, so fewer triangles are asked for. */
const FLAT_LIMIT = 2500;

const LAYER_STEPS = [0.2, 0.5, 1, 2, 5, 10];

export const layerStepFor = (height: number): number => LAYER_STEPS.find((step) => height / step <= 26) ?? 20;

export interface Arrangement {
  readonly moved: readonly Moved[];
  readonly ghost: readonly Moved[];
  readonly bed: BedLook | null;
  /** the part at both ends of its motion */
  readonly box: Box;
  /** the part as it stands */
  readonly now: Box;
  readonly peak: Peak | null;
  /** false where the part has moved so far that dimensions of the part at rest would only confuse */
  readonly nearRest: boolean;
}

interface Wish {
  readonly flex: number;
  readonly onBed: boolean;
  readonly stance: Stance | null;
  readonly flat: boolean;
  readonly ghosted: boolean;
}

const boundsBox = ({ bounds: b }: BuiltBody): Box => ({ min: [b[0], b[1], b[2]], max: [b[3], b[4], b[5]] });
const movedBox = (moved: readonly Moved[]): Box =>
  boxOf(moved.map(({ positions }) => ({ points: positions })));

/** The first and the last moment; what swings out between them has the room left around the picture. */
function endsBox({ bodies, motion }: Build): Box {
  const rest = bodies.map(boundsBox);
  if (!motion) return joinBoxes(rest);
  const coarse = bodies.map((body) => prepare(body, null));
  return joinBoxes([...rest, movedBox(arrange(coarse, motion, 1))]);
}

/** Share of its size a part may move before it no longer lies by its dimensions. */
const NEAR = 0.3;

function staysNear(moved: readonly Moved[], rest: readonly Moved[], size: number): boolean {
  return moved.every(({ positions: p }, body) => {
    const from = rest[body]!.positions;
    for (let k = 0; k < p.length; k += 3) {
      const far = Math.hypot(p[k]! - from[k]!, p[k + 1]! - from[k + 1]!, p[k + 2]! - from[k + 2]!);
      if (far > NEAR * size) return false;
    }
    return true;
  });
}

/** Share of the figure the motion tells from which a place in the picture counts as that of the figure. */
const NEAR_PEAK = 0.9;

/** The vertices only come near the peak the motion tells; close to it, its own figure is shown. */
function statedPeak(moved: readonly Moved[], { motion }: Build, t: number): Peak | null {
  const marked = motion?.markedStrain?.(t);
  if (marked !== undefined) {
    const peak = peakOf(moved, marked < 0 ? -1 : 1);
    return peak && Math.abs(peak.strain) >= NEAR_PEAK * Math.abs(marked) ? { ...peak, strain: marked } : peak;
  }
  const peak = peakOf(moved);
  const stated = motion?.peakStrain ?? 0;
  if (!peak || t < 1 || Math.abs(peak.strain) < NEAR_PEAK * stated) return peak;
  return { ...peak, strain: Math.sign(peak.strain) * stated };
}

/** Everything the picture shows, from the build and what is asked to be seen. */
export function useArrangement(build: Build | null, wish: Wish): Arrangement | null {
  const { flex, onBed, stance, flat, ghosted } = wish;
  const bends = Boolean(build?.motion) && flex > 0 && !onBed;
  const bodies = build?.bodies ?? null;
  const motion = build?.motion ?? null;
  const prepared = useMemo(
    () =>
      bodies?.map((body) =>
        prepare(body, bends ? motion : null, flat ? FLAT_LIMIT : REFINE_LIMITS.maxTriangles),
      ) ?? null,
    [bodies, motion, bends, flat],
  );
  const placements = useMemo(
    () => (bodies && onBed && stance ? bedPlacements(bodies, stance) : null),
    [bodies, onBed, stance],
  );
  const rest = useMemo(
    () => (prepared ? arrange(prepared, null, 0, placements ?? {}) : null),
    [prepared, placements],
  );
  const moved = useMemo(
    () => (prepared && bends ? arrange(prepared, motion, flex) : rest),
    [prepared, bends, motion, flex, rest],
  );
  const ends = useMemo(() => (build && !onBed ? endsBox(build) : null), [build, onBed]);
  return useMemo(() => {
    if (!build || !moved || !rest) return null;
    const now = movedBox(moved);
    const nearRest = moved === rest || staysNear(moved, rest, diagonalOf(movedBox(rest)));
    return {
      moved,
      nearRest,
      ghost: bends && ghosted && nearRest ? rest : [],
      bed: placements && { placements, layerStep: layerStepFor(now.max[2] - now.min[2]) },
      box: ends ?? joinBoxes([now, bedUnder(now)]),
      now,
      peak: statedPeak(moved, build, flex),
    };
  }, [build, moved, rest, bends, ghosted, placements, ends, flex]);
}
