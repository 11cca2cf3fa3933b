import type { Kernel, Solid } from '@/lib/geometry/kernel';
import { armWidth, plateBottom, plateTop } from './dimensions';
import type { HookValues } from './schema';

interface Rectangle {
  readonly x0: number;
  readonly x1: number;
  readonly y: number;
}

/** The window: the arm bent back by the undercut has to pass, with the clearance all round. */
export function windowOf(v: HookValues): Rectangle {
  const share = Math.min(Math.max(plateBottom(v) / v.armLength, 0), 1);
  const thickness = v.rootThickness + (v.tipThickness - v.rootThickness) * share;
  const bentBack = v.tipThickness + v.undercut;
  return {
    x0: -Math.max(thickness, bentBack) - v.clearance,
    x1: v.clearance,
    y: armWidth(v, plateBottom(v)) / 2 + v.clearance,
  };
}

/** Rim left round the window, mm. */
const rimOf = (v: HookValues): number => Math.max(4, 2 * v.undercut, v.baseThickness);

export function plateOf(v: HookValues): Rectangle {
  const window = windowOf(v);
  const rim = rimOf(v);
  return { x0: window.x0 - rim, x1: window.x1 + rim, y: window.y + rim };
}

function slab(kernel: Kernel, { x0, x1, y }: Rectangle, bottom: number, top: number): Solid {
  return kernel.box([x1 - x0, 2 * y, top - bottom], [(x0 + x1) / 2, 0, (bottom + top) / 2]);
}

/** The plate as the closed hook stands in it, its upper face one clearance below the holding face. */
export function windowPlate(v: HookValues, kernel: Kernel): Solid {
  const bottom = plateBottom(v);
  const top = plateTop(v);
  const hole = slab(kernel, windowOf(v), bottom - 1, top + 1);
  return kernel.subtract(slab(kernel, plateOf(v), bottom, top), [hole]);
}

const areaOf = ({ x0, x1, y }: Rectangle) => 2 * y * (x1 - x0);

export const plateVolume = (v: HookValues): number =>
  (areaOf(plateOf(v)) - areaOf(windowOf(v))) * v.baseThickness;
