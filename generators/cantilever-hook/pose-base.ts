import { stationValue } from '@/lib/mechanics/large-deflection';
import type { HookStrain } from './mechanics';
import type { Moved } from './pose-arm';
import type { HookValues } from './schema';

/** How far into a block the turning of the root is felt, in arm thicknesses. */
const BLOCK_REACH = 1.5;

const fade = (distance: number, reach: number) => Math.max(0, 1 - distance / reach) ** 2;

/** Distance of a point of the base from the foot of the arm, along x and y. */
const fromMiddle = (v: HookValues, x: number) => x + v.rootThickness / 2;
const aside = (v: HookValues, y: number) => Math.max(0, Math.abs(y) - v.rootWidth / 2);

function blockPoint(v: HookValues, turned: number, x: number, y: number, z: number): Moved {
  const out = Math.max(0, Math.abs(fromMiddle(v, x)) - v.rootThickness / 2 - v.rootFillet);
  const share = turned * fade(Math.hypot(out, aside(v, y), z), BLOCK_REACH * v.rootThickness);
  return { x: x - share * z, z: z + share * fromMiddle(v, x), strain: 0 };
}

/** A plate held at both ends and turned in the middle: each half a cubic, moment straight from the arm to the end. */
function wallPoint(v: HookValues, state: HookStrain, turned: number, x: number, y: number, z: number): Moved {
  const off = fromMiddle(v, x);
  const share = Math.min(1, (2 * Math.abs(off)) / v.wallSpan);
  const sideways = fade(aside(v, y), v.wallSpan / 2 + 1e-9);
  const slope = turned * sideways * (1 - share) * (1 - 3 * share);
  const depth = (2 * z) / v.wallThickness + 1;
  return {
    x: x - slope * (z + v.wallThickness / 2),
    z: z + turned * sideways * off * (1 - share) ** 2,
    strain: (state.wall ?? 0) * Math.sign(off) * (1 - 1.5 * share) * depth * sideways,
  };
}

/** A point of the base (z <= 0) after the arm has been bent towards -x: its root turns, the held edges stay. */
export function moveBasePoint(v: HookValues, state: HookStrain, x: number, y: number, z: number): Moved {
  const turned = stationValue(state.bent, state.bent.angle, 0);
  return v.root === 'wall' ? wallPoint(v, state, turned, x, y, z) : blockPoint(v, turned, x, y, z);
}
