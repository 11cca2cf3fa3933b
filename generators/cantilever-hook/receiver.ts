import type { Kernel, Solid, Vec3 } from '@/lib/geometry/kernel';
import { boxSolid, boxVolume } from './base';
import { armThickness, armWidth, noseEnd, plateBottom, plateTop } from './dimensions';
import type { HookValues } from './schema';

interface Box {
  readonly low: Vec3;
  readonly high: Vec3;
}

interface Mate {
  readonly plate: Box;
  readonly window: Box;
}

/** Rim left round the window, mm. */
const rimOf = (v: HookValues): number => Math.max(4, 2 * v.undercut, v.baseThickness);

/** Box widened by `rim` along two of its axes. */
function rimmed({ low, high }: Box, rim: Vec3): Box {
  return {
    low: [low[0] - rim[0], low[1] - rim[1], low[2] - rim[2]],
    high: [high[0] + rim[0], high[1] + rim[1], high[2] + rim[2]],
  };
}

/** A plate across the arm: the arm bent back by the undercut passes its window with the clearance all round. */
function acrossArm(v: HookValues): Mate {
  const [bottom, top] = [plateBottom(v), plateTop(v)];
  const behind = Math.max(armThickness(v, bottom), v.tipThickness + v.undercut) + v.clearance;
  const half = armWidth(v, bottom) / 2 + v.clearance;
  const window: Box = { low: [-behind, -half, bottom], high: [v.clearance, half, top] };
  const rim = rimOf(v);
  return { plate: rimmed(window, [rim, rim, 0]), window };
}

/** A plate beside a slotted panel, the catch springing into its window. */
function besidePanel(v: HookValues): Mate {
  const half = v.tipWidth / 2 + v.clearance;
  const [near, far] = [v.clearance, v.clearance + v.baseThickness];
  const window: Box = {
    low: [near, -half, plateTop(v)],
    high: [far, half, noseEnd(v) + v.clearance],
  };
  const rim = rimOf(v);
  return { plate: rimmed(window, [0, rim, rim]), window };
}

const mateOf = (v: HookValues): Mate => (v.root === 'panel-slot' ? besidePanel(v) : acrossArm(v));

/** The window plate as the closed hook stands in it, its holding edge one clearance from the return face. */
export function receiver(v: HookValues, kernel: Kernel): Solid {
  const { plate, window } = mateOf(v);
  const through = rimmed(window, v.root === 'panel-slot' ? [1, 0, 0] : [0, 0, 1]);
  return kernel.subtract(boxSolid(kernel, plate), [boxSolid(kernel, through)]);
}

export function receiverVolume(v: HookValues): number {
  const { plate, window } = mateOf(v);
  return boxVolume(plate) - boxVolume(window);
}
