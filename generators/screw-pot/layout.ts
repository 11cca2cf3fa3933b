import { jointOf, type ScrewSizes } from '@/lib/mechanics/screw-sizes';
import { threadBasics } from '@/lib/mechanics/thread';
import type { Values } from './schema';

/** Pitch in mm by the outside of the body, up to and with the size named; common practice, no source. */
const PITCHES: readonly { readonly upTo: number; readonly regular: number; readonly fine: number }[] = [
  { upTo: 20, regular: 2.5, fine: 2 },
  { upTo: 34, regular: 3, fine: 2.5 },
  { upTo: 50, regular: 4, fine: 3 },
  { upTo: 75, regular: 5, fine: 3.5 },
  { upTo: Number.POSITIVE_INFINITY, regular: 6, fine: 4 },
];

interface Thread {
  readonly pitch: number;
  readonly starts: number;
  readonly turns: number;
}

export const bodyDiameter = (p: Values): number => p.innerDiameter + 2 * p.wall;

/** The thread that goes with the size, or the one given. */
export function threadOf(p: Values): Thread {
  const { regular, fine } = PITCHES.find(({ upTo }) => bodyDiameter(p) <= upTo)!;
  if (p.thread === 'regular') return { pitch: regular, starts: 1, turns: 1.25 };
  if (p.thread === 'fine') return { pitch: fine, starts: 1, turns: 2 };
  if (p.thread === 'quick') return { pitch: regular, starts: 2, turns: 0.75 };
  return { pitch: p.pitch, starts: p.starts, turns: p.turns };
}

/** Major diameter and mouth of the neck, mm: on the body's wall, or drawn in until the lid is flush with the body. */
function neckOf(p: Values, thread: Thread): { readonly majorDiameter: number; readonly bore: number } {
  const basics = threadBasics({ profile: p.profile, majorDiameter: 0, ...thread });
  const depth = -basics.rootDiameter;
  if (p.body === 'straight') return { majorDiameter: bodyDiameter(p) + depth, bore: p.innerDiameter };
  const majorDiameter = bodyDiameter(p) - 2 * p.lidWall - 2 * p.clearance - basics.internalMajor;
  return { majorDiameter, bore: majorDiameter - depth - 2 * p.wall };
}

export const hasDisc = (p: Values): boolean => p.seal === 'disc' || p.seal === 'foam';

/** How far a disc laid in lifts the lid, mm. */
export const discOf = (p: Values): number => (hasDisc(p) ? p.sealThickness : 0);

/** What the joint knows of the seal: a disc is a lid that is as much higher. */
const jointSeal = ({ seal }: Values): ScrewSizes['seal'] =>
  seal === 'disc' || seal === 'foam' ? 'none' : seal;

/** Least gap between the mouth of the lid and the shoulder of a flush body, mm. */
const MOUTH_GAP = 0.4;

function fittedSizes(p: Values): ScrewSizes {
  const thread = threadOf(p);
  const open: ScrewSizes = {
    profile: p.profile,
    ...thread,
    ...neckOf(p, thread),
    clearance: p.clearance,
    wall: p.lidWall,
    neckHeight: 0,
    capHeight: 0,
    topThickness: p.topThickness + discOf(p),
    seal: jointSeal(p),
    plugInterference: p.plugInterference,
    plugLength: p.plugLength,
    plugWall: p.plugWall,
  };
  const { neckHeightNeeded, capHeightNeeded, capTop } = jointOf(open);
  const least =
    p.body === 'flush' ? Math.max(0, MOUTH_GAP - (neckHeightNeeded + capTop - capHeightNeeded)) : 0;
  return { ...open, neckHeight: neckHeightNeeded + least, capHeight: capHeightNeeded };
}

const fitted = new WeakMap<Values, ScrewSizes>();

/** The closure these values ask for: neck and lid just as high as the thread needs. Shoulder of the neck at z = 0. */
export function screwOf(p: Values): ScrewSizes {
  const known = fitted.get(p);
  if (known) return known;
  const sizes = fittedSizes(p);
  fitted.set(p, sizes);
  return sizes;
}

export interface PotLayout {
  /** radii, mm */
  readonly body: number;
  readonly room: number;
  readonly mouth: number;
  readonly core: number;
  /** heights over the shoulder: rim, inside and outside of the bottom, and where the room begins to narrow */
  readonly rim: number;
  readonly floor: number;
  readonly bottom: number;
  readonly narrows: number;
  readonly dividerTop: number;
  /** chamfers round the foot and outside the rim */
  readonly foot: number;
  readonly rimChamfer: number;
}

/** Flat of a rim that presses a disc, mm: two extrusion lines, narrow so that little pull beds it. */
const RIM_FLAT = 0.8;

/** Gap between the divider and what closes the mouth, mm. */
const DIVIDER_GAP = 0.6;

export function layoutOf(p: Values): PotLayout {
  const sizes = screwOf(p);
  const joint = jointOf(sizes);
  const core = joint.neckForm[0]![0];
  const room = p.innerDiameter / 2;
  const mouth = sizes.bore / 2;
  const rim = sizes.neckHeight;
  const flush = p.body === 'flush';
  const narrows = flush ? -p.wall - (room - mouth) : rim;
  const under = rim - (p.seal === 'plug' ? p.plugLength : 0) - DIVIDER_GAP;
  return {
    body: flush ? bodyDiameter(p) / 2 : core,
    room,
    mouth,
    core,
    rim,
    floor: rim - p.innerDepth,
    bottom: rim - p.innerDepth - p.floor,
    narrows,
    dividerTop: Math.min(narrows, under),
    foot: Math.min(0.5, p.floor / 2, p.wall / 2),
    rimChamfer: hasDisc(p)
      ? Math.max(joint.rimChamfer, Math.min(core - mouth - RIM_FLAT, joint.rimGap))
      : joint.rimChamfer,
  };
}

export const ROOMS = { none: 1, two: 2, three: 3, four: 4 } as const;

/** Disc laid in the lid: it drops past the lid's thread. Radius in mm. */
export const discRadius = (p: Values): number => jointOf(screwOf(p)).cap.minorDiameter / 2 - 0.15;

/** What the pot holds up to its rim, ml, dividers taken off. */
export function roomVolume(p: Values): number {
  const { room, mouth, rim, floor, narrows, dividerTop } = layoutOf(p);
  const straight = Math.PI * room ** 2 * (narrows - floor);
  const cone = (Math.PI / 3) * (room - mouth) * (room ** 2 + room * mouth + mouth ** 2);
  const neck = Math.PI * mouth ** 2 * (rim - narrows - (room - mouth));
  const arms = ROOMS[p.divider];
  const walls = arms === 1 ? 0 : arms * p.dividerThickness * room * (dividerTop - floor);
  return (straight + (p.body === 'flush' ? cone + neck : 0) - walls) / 1000;
}
