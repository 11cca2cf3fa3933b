import { type FlexibleArm, stationValue, strainAt } from '@/lib/mechanics/large-deflection';
import { inPanel } from './dimensions';
import type { HookStrain } from './mechanics';
import type { Moved, Point } from './pose-arm';
import type { HookValues } from './schema';

/** How far into a block the turning of the root is felt, in arm thicknesses. */
const BLOCK_REACH = 1.5;

const fade = (distance: number, reach: number) => Math.max(0, 1 - distance / reach) ** 2;

/** Distance of a point of the base from the foot of the arm, along x and y. */
const fromMiddle = (v: HookValues, x: number) => x + v.rootThickness / 2;
const aside = (v: HookValues, y: number) => Math.max(0, Math.abs(y) - v.rootWidth / 2);

function blockPoint(v: HookValues, turned: number, [x, y, z]: Point): Moved {
  const out = Math.max(0, Math.abs(fromMiddle(v, x)) - v.rootThickness / 2 - v.rootFillet);
  const share = turned * fade(Math.hypot(out, aside(v, y), z), BLOCK_REACH * v.rootThickness);
  return { x: x - share * z, z: z + share * fromMiddle(v, x), strain: 0 };
}

/** A plate held at both ends and turned in the middle: each half a cubic, moment straight from the arm to the end. */
function wallPoint(v: HookValues, state: HookStrain, turned: number, [x, y, z]: Point): Moved {
  const off = fromMiddle(v, x);
  const share = Math.min(1, (2 * Math.abs(off)) / v.wallSpan);
  const sideways = fade(aside(v, y), v.wallSpan / 2);
  const slope = turned * sideways * (1 - share) * (1 - 3 * share);
  const depth = (2 * z) / v.wallThickness + 1;
  const side = Math.max(-1, Math.min(1, off / (v.rootThickness / 2 + v.rootFillet)));
  return {
    x: x - slope * (z + v.wallThickness / 2),
    z: z + turned * sideways * off * (1 - share) ** 2,
    strain: (state.wall ?? 0) * side * (1 - 1.5 * share) * depth * sideways,
  };
}

/** A panel bent out of its plane: it follows the root and dies out towards the held edges. */
function panelPoint(v: HookValues, flexible: FlexibleArm, state: HookStrain, [x, y, z]: Point): Moved {
  const { bent } = state;
  const behind = Math.min(z, 0);
  const sideways = fade(aside(v, y), (v.wallSpan - v.rootWidth) / 2);
  const held = fade(-behind, v.wallWidth) * sideways * fade(Math.max(z, 0), v.wallWidth);
  const turned = stationValue(bent, bent.angle, 0) * held;
  const out = stationValue(bent, bent.y, 0) * held + turned * behind;
  const depth = fromMiddle(v, x) / (v.rootThickness / 2);
  const root = strainAt(flexible, bent, 0);
  return {
    x: x - out,
    z: z + turned * fromMiddle(v, x),
    strain: root * depth * held * fade(Math.hypot(behind, aside(v, y)), v.rootWidth),
  };
}

/** A point of the base after the arm has been bent towards -x: its root turns, the held edges stay. */
export function moveBasePoint(v: HookValues, flexible: FlexibleArm, state: HookStrain, point: Point): Moved {
  if (inPanel(v)) return panelPoint(v, flexible, state, point);
  const turned = stationValue(state.bent, state.bent.angle, 0);
  return v.root === 'wall' ? wallPoint(v, state, turned, point) : blockPoint(v, turned, point);
}
