import type { Kernel, Solid, Vec3 } from '@/lib/geometry/kernel';
import { noseEnd, slotWidth } from './dimensions';
import type { HookValues } from './schema';

/** A box by its corners, mm. */
interface Box {
  readonly low: Vec3;
  readonly high: Vec3;
}

const between = (low: Vec3, high: Vec3): Box => ({ low, high });

const sizeOf = ({ low, high }: Box): Vec3 => [high[0] - low[0], high[1] - low[1], high[2] - low[2]];

export function boxSolid(kernel: Kernel, { low, high }: Box): Solid {
  const centre: Vec3 = [(low[0] + high[0]) / 2, (low[1] + high[1]) / 2, (low[2] + high[2]) / 2];
  return kernel.box(sizeOf({ low, high }), centre);
}

export const boxVolume = (box: Box): number => sizeOf(box).reduce((product, side) => product * side, 1);

/** A plate under the arm: along x, y and down. */
function under(v: HookValues, length: number, width: number, thickness: number): Box {
  const middle = -v.rootThickness / 2;
  return between([middle - length / 2, -width / 2, -thickness], [middle + length / 2, width / 2, 0]);
}

/** The frame a slotted panel leaves past the slot is as deep as the panel behind the root. */
function panelTop(v: HookValues): number {
  return v.root === 'panel-slot' ? noseEnd(v) + slotWidth(v) + v.wallWidth : 0;
}

/** What the arm grows from, before any slot is cut. */
export function baseBox(v: HookValues): Box {
  if (v.root === 'block') return under(v, v.baseLength, v.baseWidth, v.baseThickness);
  if (v.root === 'wall') return under(v, v.wallSpan, v.wallWidth, v.wallThickness);
  const half = v.wallSpan / 2;
  return between([-v.rootThickness, -half, -v.wallWidth], [0, half, panelTop(v)]);
}

/** The slot that frees an arm inside a panel, the arm's own place included; null for other roots. */
function slotBox(v: HookValues): Box | null {
  if (v.root !== 'panel-slot') return null;
  const slot = slotWidth(v);
  const half = v.rootWidth / 2 + slot;
  return between([-v.rootThickness, -half, 0], [0, half, noseEnd(v) + slot]);
}

export function baseSolid(v: HookValues, kernel: Kernel): Solid {
  const body = boxSolid(kernel, baseBox(v));
  const slot = slotBox(v);
  if (!slot) return body;
  const through = between([slot.low[0] - 1, slot.low[1], 0], [1, slot.high[1], slot.high[2]]);
  return kernel.subtract(body, [boxSolid(kernel, through)]);
}

export function baseVolume(v: HookValues): number {
  const slot = slotBox(v);
  return boxVolume(baseBox(v)) - (slot ? boxVolume(slot) : 0);
}

/** How far the arm reaches into its base to be joined, mm. */
export function sunkDepth(v: HookValues): number {
  const { low } = baseBox(v);
  return Math.min(0.5, -low[2] / 2);
}
