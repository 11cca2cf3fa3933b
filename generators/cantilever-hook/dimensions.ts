import { radians } from '@/lib/units';
import type { HookValues } from './schema';

/**
 * Dimensions that follow from the parameters, mm. The arm stands on z = 0 and rises along +z, its straight face
 * is x = 0 and carries the catch on the +x side; width along y, symmetric.
 */
export const leadInLength = (v: HookValues): number => v.undercut / Math.tan(radians(v.leadInAngle));

/** Length along the arm that the sloping return face takes. */
export const returnRun = (v: HookValues): number =>
  v.returnAngle >= 90 ? 0 : v.undercut / Math.tan(radians(v.returnAngle));

export const noseEnd = (v: HookValues): number => v.armLength + v.landLength + leadInLength(v);

/** Where the return face leaves the arm. */
export const catchFoot = (v: HookValues): number => v.armLength - returnRun(v);

/** How far catch and window edge overlap when the hook is home. */
export const engagement = (v: HookValues): number => v.undercut - v.clearance;

/** Height at which the return face bears on the window edge. */
export const bearingHeight = (v: HookValues): number =>
  v.armLength - (v.returnAngle >= 90 ? 0 : engagement(v) / Math.tan(radians(v.returnAngle)));

/** Faces of the window plate across the arm: from `bottom` to `top` along z. */
export const plateTop = (v: HookValues): number => bearingHeight(v) - v.clearance;
export const plateBottom = (v: HookValues): number => plateTop(v) - v.baseThickness;

/** Slope of the tapered back face against the straight one, rad. */
export const taperAngle = (v: HookValues): number =>
  Math.atan((v.rootThickness - v.tipThickness) / v.armLength);

/** Where the back fillet ends on the base, measured as positive distance from the straight face. */
export const backFilletFoot = (v: HookValues): number => {
  const atFillet = v.rootThickness - v.rootFillet * Math.tan(taperAngle(v));
  return atFillet + v.rootFillet / Math.cos(taperAngle(v));
};

/** Width of the arm at height z; constant below the root and past the catch edge. */
export const armWidth = (v: HookValues, z: number): number => {
  const share = Math.min(Math.max(z / v.armLength, 0), 1);
  return v.rootWidth + (v.tipWidth - v.rootWidth) * share;
};
