import { radians } from '@/lib/units';
import type { Values } from './schema';

/**
 * Where everything lies, mm. x along the pull with the shoulder of the plug at 0 and the housing at +x, y across, z
 * through the thickness, both bodies symmetric about y = 0 and z = 0.
 */
export interface BuckleLayout {
  /** half widths: whole buckle, cavity, outside of the arms, rail, skins between the windows */
  readonly half: number;
  readonly cavity: number;
  readonly arm: number;
  readonly rail: number;
  readonly waist: number;
  /** x of the roots of the arms, of the holding face, of the end of the nose */
  readonly root: number;
  readonly edge: number;
  readonly nose: number;
  /** x of the edge the barb holds behind, the end of the cavity and of the window, the front of the rail */
  readonly window: number;
  readonly cavityEnd: number;
  readonly windowEnd: number;
  readonly railFrom: number;
  readonly housingEnd: number;
  readonly plugEnd: number;
  /** half heights */
  readonly plugTop: number;
  readonly cavityTop: number;
  readonly housingTop: number;
  readonly mouthChamfer: number;
  readonly slotHalf: number;
  /** x from and to of each webbing slot */
  readonly plugSlots: readonly (readonly [number, number])[];
  readonly housingSlot: readonly [number, number];
}

/** Play of the webbing in its slots, mm. */
const SLOT_PLAY = 1.5;
const LAYER_PLAY = 0.8;
/** Gap between rail and root fillet, and how far the window reaches past the cavity. */
const RAIL_GAP = 1;
/** The skins end this far inside where the pads are pressed to. */
const FINGER_ROOM = 0.5;
const CELLS = 40;

/** How far the edge of the barb is pressed in to pass the wall, and until the rail stops it. */
export const entryTravel = (p: Values): number => p.barbHeight - p.clearance;
export const squeezeTravel = (p: Values): number => entryTravel(p) + p.overtravel;

export const leadRun = (p: Values): number => p.barbHeight / Math.tan(radians(p.leadInAngle));
/** From the holding face to the end of the nose. */
export const noseLength = (p: Values): number => p.padLength + leadRun(p);

/**
 * Movements along a tapered arm pressed in the middle of its pad, over that of the edge of the barb: slender beam on a
 * rigid root. A root that gives turns the nose a little less, so the rail stands a hair further off.
 */
function shapeOf(p: Values, places: readonly number[]): number[] {
  const finger = p.armLength + p.padLength / 2;
  const thickness = (x: number) =>
    p.rootThickness + (p.tipThickness - p.rootThickness) * Math.min(1, x / p.armLength);
  const step = finger / CELLS;
  const moved = (to: number): number => {
    let sum = 0;
    for (let i = 0; i < CELLS; i += 1) {
      const x = (i + 0.5) * step;
      if (x < to) sum += ((finger - x) / thickness(x) ** 3) * (to - x) * step;
    }
    return sum;
  };
  const edge = moved(p.armLength);
  return places.map((place) => moved(place) / edge);
}

/** How far the end of the nose moves in when the arms are squeezed to the rail. */
export const noseTravel = (p: Values): number =>
  squeezeTravel(p) * shapeOf(p, [p.armLength + noseLength(p)])[0]!;

/** How far the pad stands out of the housing, so that a finger finds it. */
export const padProud = (p: Values): number => p.barbHeight - p.clearance - p.sideWall;

function slotsOf(p: Values): BuckleLayout['plugSlots'] {
  const first = -p.barWidth;
  if (!p.ladderLock) return [[first - p.webbingThickness - LAYER_PLAY, first]];
  const slot = 2 * p.webbingThickness + LAYER_PLAY;
  const second = first - slot - p.barWidth;
  return [
    [first - slot, first],
    [second - slot, second],
  ];
}

export function layoutOf(p: Values): BuckleLayout {
  const slotHalf = (p.webbingWidth + SLOT_PLAY) / 2;
  const half = slotHalf + p.barWidth;
  const cavity = half - p.sideWall;
  const arm = cavity - p.clearance;
  const root = Math.max(4, 2 * p.rootThickness);
  const edge = root + p.armLength;
  const nose = edge + noseLength(p);
  const cavityEnd = nose + p.clearance;
  const windowEnd = cavityEnd + RAIL_GAP;
  const plugSlots = slotsOf(p);
  const slotFrom = windowEnd + p.barWidth;
  const slotTo = slotFrom + p.webbingThickness + LAYER_PLAY;
  return {
    half,
    cavity,
    arm,
    rail: arm - p.tipThickness - noseTravel(p),
    waist: cavity - p.overtravel - FINGER_ROOM,
    root,
    edge,
    nose,
    window: edge - p.clearance,
    cavityEnd,
    windowEnd,
    railFrom: root + p.rootFillet + RAIL_GAP,
    housingEnd: slotTo + p.barWidth,
    plugEnd: plugSlots.at(-1)![0] - p.barWidth,
    plugTop: p.plugThickness / 2,
    cavityTop: p.plugThickness / 2 + p.clearance,
    housingTop: p.plugThickness / 2 + p.clearance + p.skin,
    mouthChamfer: Math.min(0.8, p.sideWall / 3),
    slotHalf,
    plugSlots,
    housingSlot: [slotFrom, slotTo],
  };
}

/** Least gap between an arm squeezed to the stop and the side of the rail, mm, along its length. */
export function railGap(p: Values): number {
  const shares = Array.from({ length: 9 }, (_, i) => i / 8);
  const shape = shapeOf(
    p,
    shares.map((share) => share * p.armLength),
  );
  const gaps = shares.map((share, i) => {
    const thicker = (p.rootThickness - p.tipThickness) * (1 - share);
    return noseTravel(p) - thicker - squeezeTravel(p) * shape[i]!;
  });
  return Math.min(...gaps);
}
