import type { Values } from './schema';

/**
 * Where everything lies, mm. Straight and on edge: x along the band, which runs from the head towards -x, y through
 * its thickness with the bundle at y < 0 and the teeth on the +y face, z its width from the bed up. Drawn round the
 * bundle, the strap enters the head at its +x end and leaves it at x = 0, on top of its own start.
 */
export interface RackLayout {
  /** heights y: floor and roof of the passage, where the skins end, roof of the pawl, of the head, under a guard */
  readonly floor: number;
  readonly roof: number;
  readonly skinTop: number;
  readonly pawlTop: number;
  readonly exitTop: number;
  readonly entryTop: number;
  readonly guardFrom: number;
  readonly guardTop: number;
  /** places x: end of the exit block, end face and root of the pawl, end of the head */
  readonly exit: number;
  readonly tip: number;
  readonly root: number;
  readonly head: number;
  /** z: passage from and to, top of the head */
  readonly passageFrom: number;
  readonly passageTo: number;
  readonly headTop: number;
  /** length of the band, and from where to where along it the teeth run */
  readonly band: number;
  readonly toothedFrom: number;
  readonly teeth: number;
  /** radius of the middle of the band as printed; infinite where it is straight */
  readonly ring: number;
}

/** Shares of the pitch: flat between two teeth, flat on top of one, flat end of a pawl tooth. */
const VALLEY = 0.4;
const CREST = 0.12;
const PAWL_FLAT = 0.2;

export const valleyOf = (p: Values): number => VALLEY * p.pitch;
export const crestOf = (p: Values): number => CREST * p.pitch;
export const pawlFlat = (p: Values): number => PAWL_FLAT * p.pitch;
/** Length of the ramp of a tooth along the band. */
export const rampRun = (p: Values): number => (1 - VALLEY - CREST) * p.pitch;
/** Angle of the ramp to the band, degrees. */
export const rampAngle = (p: Values): number => (Math.atan(p.toothDepth / rampRun(p)) * 180) / Math.PI;

/** How far pawl and teeth overlap, and so how far the pawl is lifted at each click. */
export const engagement = (p: Values): number => p.toothDepth - p.clearance;

/** Free end of the band without teeth, past the largest bundle, to grip it by. */
const GRIP = 14;
const END_GAP = 0.6;
const SHOULDER = 0.8;

/** Angle of the ring a curved band is printed as, rad: its end stays clear of the head. */
const RING_ANGLE = (295 * Math.PI) / 180;

/** Length of the band from the head round a bundle and back to the head's exit: a turn that ends one anvil higher. */
export const turnOf = (p: Values, bundle: number): number =>
  Math.PI * (bundle + p.bandThickness + p.anvil / 2);

export function layoutOf(p: Values): RackLayout {
  const floor = p.anvil;
  const roof = floor + p.bandThickness + p.toothDepth + p.clearance;
  const pawlTop = roof + p.pawlThickness;
  const exit = Math.max(2.5, 1.5 * p.skin);
  const tip = exit + END_GAP;
  const root = tip + p.pawlLength;
  const entryTop = pawlTop + p.pawlFillet + SHOULDER;
  const guardFrom = Math.max(pawlTop + engagement(p) + 0.5, entryTop);
  const passageTo = p.skin + p.bandWidth + 2 * p.clearance;
  const toothedFrom = turnOf(p, p.smallestBundle) - tip - (p.pawlTeeth + 1) * p.pitch;
  const toothedTo = turnOf(p, p.largestBundle) - tip + p.pitch;
  const teeth = Math.max(1, Math.ceil((toothedTo - toothedFrom) / p.pitch));
  const band = toothedFrom + teeth * p.pitch + tip + GRIP;
  return {
    floor,
    roof,
    skinTop: floor + p.bandThickness,
    pawlTop,
    exitTop: roof + Math.max(1.6, p.skin),
    entryTop,
    guardFrom,
    guardTop: guardFrom + p.anvil,
    exit,
    tip,
    root,
    head: root + Math.max(3, 2 * p.pawlThickness),
    passageFrom: p.skin,
    passageTo,
    headTop: passageTo + p.skin,
    band,
    toothedFrom,
    teeth,
    ring: p.printedAs === 'curved' ? band / RING_ANGLE : Number.POSITIVE_INFINITY,
  };
}

/** Where a point of the straight band lies on the bed; past the head nothing moves. */
export function asPrinted(p: Values, [x, y]: readonly [number, number]): [number, number] {
  const { ring } = layoutOf(p);
  if (x >= 0 || !Number.isFinite(ring)) return [x, y];
  const half = p.bandThickness / 2;
  const radius = ring + y - half;
  return [radius * Math.sin(x / ring), half - ring + radius * Math.cos(x / ring)];
}

/** The point of the straight band that lies there on the bed. */
export function asStraight(p: Values, [x, y]: readonly [number, number]): [number, number] {
  const { ring } = layoutOf(p);
  if (!Number.isFinite(ring)) return [x, y];
  const half = p.bandThickness / 2;
  const height = y - half + ring;
  const angle = (Math.atan2(-x, height) + 2 * Math.PI) % (2 * Math.PI);
  return [-angle * ring, Math.hypot(x, height) - ring + half];
}

/** True for points of the printed body that belong to the band and not to the head. */
export const onBand = (x: number, y: number): boolean => x < -1e-5 || y < -1e-3;
