import { radians } from '@/lib/units';
import { filletFoot, type Side } from './fillet-arc';
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

/** Highest face of the window plate across the arm, and its lowest. */
export const plateTop = (v: HookValues): number => bearingHeight(v) - v.clearance;
export const plateBottom = (v: HookValues): number => plateTop(v) - v.baseThickness;

/** An arm in the plane of a panel as thick as its root, bending out of that plane. */
export const inPanel = (v: HookValues): boolean => v.root === 'panel-slot' || v.root === 'panel-edge';

/** The sides of the arm: the straight face, the tapered back face, and half the width. */
export const frontSide = (v: HookValues): Side => ({ root: 0, tip: 0, length: v.armLength });
export const backSide = (v: HookValues): Side => ({
  root: v.rootThickness,
  tip: v.tipThickness,
  length: v.armLength,
});
export const halfWidth = (v: HookValues): Side => ({
  root: v.rootWidth / 2,
  tip: v.tipWidth / 2,
  length: v.armLength,
});

/** Room the foot of a standing arm needs in the direction of bending, on both sides of its middle. */
export const footLength = (v: HookValues): number =>
  2 *
  (Math.max(filletFoot(frontSide(v), v.rootFillet) + v.rootThickness, filletFoot(backSide(v), v.rootFillet)) -
    v.rootThickness / 2);

/** Room the foot of an arm in a panel needs across. */
export const footWidth = (v: HookValues): number => 2 * filletFoot(halfWidth(v), v.rootFillet);

/** Width of the slot that frees an arm inside a panel: room for the fillets and for the mate. */
export const slotWidth = (v: HookValues): number => Math.max(1, 2 * v.clearance, 1.25 * v.rootFillet);

const at = ({ root, tip, length }: Side, z: number) =>
  root + (tip - root) * Math.min(Math.max(z / length, 0), 1);

/** Thickness and width of the arm at height z without fillets; constant below the root and past the catch edge. */
export const armThickness = (v: HookValues, z: number): number => at(backSide(v), z);
export const armWidth = (v: HookValues, z: number): number => 2 * at(halfWidth(v), z);
