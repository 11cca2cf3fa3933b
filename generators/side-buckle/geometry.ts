import type { Kernel, Loop, NamedSolid, Profile, Vec2 } from '@/lib/geometry/kernel';
import { convexCut, loopArea, profileArea } from '@/lib/geometry/loops';
import { type Corner, mirrored, roundedPolygon } from '@/lib/geometry/outline';
import { translation } from '@/lib/geometry/placement';
import { layoutOf } from './layout';
import type { Values } from './schema';

/** How far cutters reach past the faces they cut, mm. */
const PAST = 1;
const SLOT_ROUND = 0.5;
const RAIL_NOSE = 1;

/** Pieces of a quarter-turn rounding. */
const pieces = (segmentsPerTurn: number): number => Math.max(2, Math.round(segmentsPerTurn / 8));

/** A loop from its half at y >= 0, given from its greatest x round to its least, mirrored at y = 0. */
function wholeLoop(half: readonly Corner[], segments: number): Loop {
  const other = [...half].reverse().map(
    ({ at: [x, y], radius }): Corner => ({
      at: [x, -y],
      ...(radius !== undefined && { radius }),
    }),
  );
  return roundedPolygon([...half, ...other], pieces(segments));
}

function slotLoop([from, to]: readonly [number, number], half: number, segments: number): Loop {
  const corner = (x: number, y: number): Corner => ({ at: [x, y], radius: SLOT_ROUND });
  return roundedPolygon(
    [corner(from, half), corner(to, half), corner(to, -half), corner(from, -half)],
    pieces(segments),
  );
}

/** The plug from above: arms with their barbs, shoulder, frame with its slots. */
export function plugProfile(p: Values, segments: number): Profile {
  const { half, arm, root, edge, nose, plugEnd, slotHalf, plugSlots } = layoutOf(p);
  const round = Math.min(2, p.barWidth / 2);
  const outline = wholeLoop(
    [
      { at: [root, arm - p.rootThickness], radius: p.rootFillet },
      { at: [edge, arm - p.tipThickness] },
      { at: [nose, arm - p.tipThickness] },
      { at: [nose, arm] },
      { at: [edge + p.padLength, arm + p.barbHeight], radius: Math.min(1, p.padLength / 4) },
      { at: [edge, arm + p.barbHeight] },
      { at: [edge, arm] },
      { at: [0, arm] },
      { at: [0, half] },
      { at: [plugEnd, half], radius: round },
    ],
    segments,
  );
  return { loops: [outline, ...plugSlots.map((slot) => slotLoop(slot, slotHalf, segments))] };
}

/** The housing from above: waisted at the windows, where fingers reach the pads. */
export function housingProfile(p: Values, segments: number): Profile {
  const { half, cavity, waist, window, windowEnd, housingEnd, slotHalf, housingSlot } = layoutOf(p);
  const inner = cavity - waist;
  const outline = wholeLoop(
    [
      { at: [housingEnd, half], radius: Math.min(2, p.barWidth / 2) },
      { at: [windowEnd, half], radius: Math.min(1, p.barWidth / 4) },
      { at: [windowEnd, waist], radius: Math.min(inner, 1) },
      { at: [window, waist], radius: inner },
      { at: [window, half] },
      { at: [0, half] },
    ],
    segments,
  );
  return { loops: [outline, slotLoop(housingSlot, slotHalf, segments)] };
}

/** What is hollow between the skins, with a chamfered mouth; the rail stays. */
function cavityLoop(p: Values): Loop {
  const { cavity, rail, railFrom, cavityEnd, mouthChamfer } = layoutOf(p);
  const half: Vec2[] = [
    [railFrom, rail - Math.min(RAIL_NOSE, rail / 2)],
    [railFrom + RAIL_NOSE, rail],
    [cavityEnd, rail],
    [cavityEnd, cavity],
    [mouthChamfer, cavity],
    [0, cavity + mouthChamfer],
    [-PAST, cavity + mouthChamfer],
  ];
  return [...half, ...mirrored(half, 'y')];
}

/** Plug and housing locked, shoulder on the mouth at x = 0. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const { segmentsPerTurn } = kernel.quality;
  const { plugTop, cavityTop, housingTop } = layoutOf(p);
  const slab = (profile: Profile, top: number) =>
    kernel.place(kernel.extrude(profile, 2 * top), translation([0, 0, -top]));
  const hollow = slab({ loops: [cavityLoop(p)] }, cavityTop);
  return [
    { name: 'plug', solid: slab(plugProfile(p, segmentsPerTurn), plugTop) },
    {
      name: 'housing',
      solid: kernel.subtract(slab(housingProfile(p, segmentsPerTurn), housingTop), [hollow]),
    },
  ];
}

/** Area in mm2 that the cavity takes out of the housing's outline. */
function hollowArea(p: Values, segments: number): number {
  const { cavity, cavityEnd, rail, railFrom, mouthChamfer } = layoutOf(p);
  const room: Loop = [
    [0, -cavity],
    [cavityEnd, -cavity],
    [cavityEnd, cavity],
    [0, cavity],
  ];
  const [outline] = housingProfile(p, segments).loops;
  const railArea = 2 * rail * (cavityEnd - railFrom) - RAIL_NOSE * Math.min(RAIL_NOSE, rail / 2);
  return loopArea(convexCut(outline!, room)) - railArea + mouthChamfer ** 2;
}

/** Volumes in mm3 of the faceted bodies, plane areas times heights. */
export function volumes(p: Values, segments: number): Record<string, number> {
  const { plugTop, cavityTop, housingTop } = layoutOf(p);
  return {
    plug: profileArea(plugProfile(p, segments)) * 2 * plugTop,
    housing:
      profileArea(housingProfile(p, segments)) * 2 * housingTop - hollowArea(p, segments) * 2 * cavityTop,
  };
}
