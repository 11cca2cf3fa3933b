import type { Material } from '@/lib/materials/types';
import type { FlexibleArm } from '@/lib/mechanics/large-deflection';
import { radians } from '@/lib/units';
import type { Motion, Posed } from '../contract';
import { engagement, noseEnd, slotWidth } from './dimensions';
import { flexibleArm, type HookStrain, peakOf, strainOf } from './mechanics';
import { moveArmPoint, type Point } from './pose-arm';
import { moveBasePoint } from './pose-base';
import type { HookValues } from './schema';

/** Lift of the window plate, mm, while its edge rides up the return face of an arm bent by `deflection`. */
function plateLift(v: HookValues, deflection: number): number {
  if (v.returnAngle >= 90) return 0;
  return Math.min(engagement(v), deflection) / Math.tan(radians(v.returnAngle));
}

/** Past the root the arm; in a slotted panel only what stands inside the slot. */
const onArm = (v: HookValues, y: number, z: number): boolean =>
  z > 0 && (v.root !== 'panel-slot' || (Math.abs(y) < armReach(v) && z < noseEnd(v) + slotWidth(v) / 2));

/** Between the arm's foot and the far side of the slot. */
const armReach = (v: HookValues): number => v.rootWidth / 2 + slotWidth(v) - 1e-4;

function poseHook(
  v: HookValues,
  flexible: FlexibleArm,
  state: HookStrain,
  rest: Float32Array,
  out: Posed,
): void {
  for (let i = 0; i < rest.length; i += 3) {
    const point: Point = [rest[i]!, rest[i + 1]!, rest[i + 2]!];
    const move = onArm(v, point[1], point[2]) ? moveArmPoint : moveBasePoint;
    const moved = move(v, flexible, state, point);
    out.positions[i] = moved.x;
    out.positions[i + 1] = point[1];
    out.positions[i + 2] = moved.z;
    out.strain[i / 3] = moved.strain;
  }
}

function posePlate(lift: number, rest: Float32Array, out: Posed): void {
  out.positions.set(rest);
  out.strain.fill(0);
  for (let i = 2; i < rest.length; i += 3) out.positions[i] = rest[i]! + lift;
}

/** The catch pressed back until it clears the window edge; the plate rides up a sloping return face. */
export function motion(v: HookValues, material: Material): Motion {
  const flexible = flexibleArm(v, material.poisson.value);
  const full = strainOf(v, flexible, v.undercut);
  return {
    label: 'Flex',
    from: 'closed',
    to: 'past the edge',
    peakStrain: v.rootFillet > 0 ? peakOf(full) : full.nominal,
    pose(body, rest, t, out) {
      const deflection = t * v.undercut;
      if (body === 'receiver') posePlate(plateLift(v, deflection), rest, out);
      else poseHook(v, flexible, t === 1 ? full : strainOf(v, flexible, deflection), rest, out);
    },
  };
}
