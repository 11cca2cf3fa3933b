import { radians } from '@/lib/units';

export type ThreadProfile = 'iso-metric' | 'trapezoidal' | 'knuckle' | 'printed';

export interface ThreadSize {
  readonly profile: ThreadProfile;
  /** major diameter of the external thread, mm */
  readonly majorDiameter: number;
  /** axial distance from one ridge to the next, mm */
  readonly pitch: number;
  readonly starts: number;
}

/**
 * Basic sizes of a thread, mm, before any clearance. The external (neck) thread runs from `rootDiameter` to
 * `majorDiameter`, the internal (cap) thread from `internalMajor` in to `minorDiameter`. Flank angles in radians,
 * from the plane square to the axis. The load flank is the one that a closed cap bears on: the lower flank of the
 * neck and the upper flank of the cap, which are also the two that hang when both are printed standing.
 */
export interface ThreadBasics extends ThreadSize {
  readonly lead: number;
  readonly pitchDiameter: number;
  readonly minorDiameter: number;
  readonly rootDiameter: number;
  readonly internalMajor: number;
  readonly loadFlank: number;
  readonly freeFlank: number;
  /** radial overlap of neck and cap, H1 */
  readonly engagement: number;
}

/** Depths on the diameter below (positive) the major diameter, for pitch p. */
interface ProfileRule {
  readonly toPitchLine: number;
  readonly toMinor: number;
  readonly toRoot: number;
  readonly beyondMajor: number;
  readonly loadFlank: number;
  readonly freeFlank: number;
}

/** Crest clearance a_c of ISO 2904 by pitch, mm: 0.15 up to 1.5, 0.25 up to 5, 0.5 up to 12, 1 above. */
export function trapezoidalCrestClearance(pitch: number): number {
  if (pitch < 2) return 0.15;
  if (pitch < 6) return 0.25;
  return pitch < 14 ? 0.5 : 1;
}

/**
 * iso-metric: ISO 68-1 and ISO 724, 60 degrees, d2 = d - 0.649519 P, D1 = d - 1.082532 P, d3 = d - 1.226869 P.
 * trapezoidal: ISO 2901 and ISO 2904, 30 degrees, d2 = d - P/2, D1 = d - P, d3 = d - P - 2 ac, D4 = d + 2 ac.
 * knuckle: DIN 405, 30 degrees, d2 = d - P/2, d3 = d - P; D1 = d - 0.9 P and D4 = d + 0.1 P from memory.
 * printed: ours. Depth P/3, load flank 45 degrees so that it hangs one layer a layer, free flank 30 degrees,
 * ridge and groove both P/2 wide on the pitch line, which leaves crest flats of 0.237 P.
 */
const RULES: Readonly<Record<ThreadProfile, (pitch: number) => ProfileRule>> = {
  'iso-metric': (pitch) => ({
    toPitchLine: 0.649519 * pitch,
    toMinor: 1.082532 * pitch,
    toRoot: 1.226869 * pitch,
    beyondMajor: 0,
    loadFlank: 30,
    freeFlank: 30,
  }),
  trapezoidal: (pitch) => ({
    toPitchLine: pitch / 2,
    toMinor: pitch,
    toRoot: pitch + 2 * trapezoidalCrestClearance(pitch),
    beyondMajor: 2 * trapezoidalCrestClearance(pitch),
    loadFlank: 15,
    freeFlank: 15,
  }),
  knuckle: (pitch) => ({
    toPitchLine: pitch / 2,
    toMinor: 0.9 * pitch,
    toRoot: pitch,
    beyondMajor: 0.1 * pitch,
    loadFlank: 15,
    freeFlank: 15,
  }),
  printed: (pitch) => ({
    toPitchLine: pitch / 3,
    toMinor: (2 * pitch) / 3,
    toRoot: (2 * pitch) / 3,
    beyondMajor: 0,
    loadFlank: 45,
    freeFlank: 30,
  }),
};

/** Basic sizes of a thread of any diameter and pitch; the standards list preferred pairs only. */
export function threadBasics(size: ThreadSize): ThreadBasics {
  const { majorDiameter, pitch, starts } = size;
  const rule = RULES[size.profile](pitch);
  return {
    ...size,
    lead: pitch * starts,
    pitchDiameter: majorDiameter - rule.toPitchLine,
    minorDiameter: majorDiameter - rule.toMinor,
    rootDiameter: majorDiameter - rule.toRoot,
    internalMajor: majorDiameter + rule.beyondMajor,
    loadFlank: radians(rule.loadFlank),
    freeFlank: radians(rule.freeFlank),
    engagement: rule.toMinor / 2,
  };
}

/** tan of both flank angles, added: how fast a ridge widens towards its root. */
export const flankSpread = (thread: ThreadBasics): number =>
  Math.tan(thread.loadFlank) + Math.tan(thread.freeFlank);

export interface InternalThread {
  readonly majorDiameter: number;
  readonly pitchDiameter: number;
  readonly minorDiameter: number;
}

/**
 * The cap's thread when the whole clearance is given to the cap and the neck keeps the basic size. `clearance` in
 * mm is the gap per side: on the radius at crest and root, along the axis at each flank. An axial gap at both flanks
 * acts like a pitch diameter larger by 4 c / (tan b1 + tan b2).
 */
export function internalThread(thread: ThreadBasics, clearance: number): InternalThread {
  return {
    majorDiameter: thread.internalMajor + 2 * clearance,
    pitchDiameter: thread.pitchDiameter + (4 * clearance) / flankSpread(thread),
    minorDiameter: thread.minorDiameter + 2 * clearance,
  };
}

/** Axial width of a neck ridge at a radius, mm. */
export const neckRidgeWidth = (thread: ThreadBasics, radius: number): number =>
  thread.pitch / 2 + flankSpread(thread) * (thread.pitchDiameter / 2 - radius);

/** Axial width of a cap ridge at a radius, mm: the groove of the neck less the gap at both flanks. */
export const capRidgeWidth = (thread: ThreadBasics, clearance: number, radius: number): number =>
  thread.pitch - neckRidgeWidth(thread, radius) - 2 * clearance;

/** Tensile stress area of the solid external thread, mm2: pi/4 ((d2 + d3)/2)^2. Source: ISO 898-1 (as tabled). */
export const tensileStressArea = (thread: ThreadBasics): number =>
  (Math.PI / 4) * ((thread.pitchDiameter + thread.rootDiameter) / 2) ** 2;
