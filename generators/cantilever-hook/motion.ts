import type { Material } from '@/lib/materials/types';
import type { FlexibleArm } from '@/lib/mechanics/large-deflection';
import { radians } from '@/lib/units';
import type { Motion, Posed } from '../contract';
import { engagement } from './dimensions';
import { flexibleArm, type HookStrain, peakOf, strainOf } from './mechanics';
import { moveArmPoint } from './pose-arm';
import { moveBasePoint } from './pose-base';
import type { HookValues } from './schema';

/** Lift of the window plate, mm, while its edge rides up the return face of an arm bent by `deflection`. */
function plateLift(v: HookValues, deflection: number): number {
  if (v.returnAngle >= 90) return 0;
  return Math.min(engagement(v), deflection) / Math.tan(radians(v.returnAngle));
}

function poseHook(
  v: HookValues,
  flexible: FlexibleArm,
  state: HookStrain,
  rest: Float32Array,
  out: Posed,
): void {
  for (let i = 0; i < rest.length; i += 3) {
    const [x, y, z] = [rest[i]!, rest[i + 1]!, rest[i + 2]!];
    const moved = z > 0 ? moveArmPoint(v, flexible, state, x, z) : moveBasePoint(v, state, x, y, z);
    out.positions[i] = moved.x;
    out.positions[i + 1] = y;
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
    peakStrain: peakOf(full),
    pose(body, rest, t, out) {
      const deflection = t * v.undercut;
      if (body === 'receiver') posePlate(plateLift(v, deflection), rest, out);
      else poseHook(v, flexible, t === 1 ? full : strainOf(v, flexible, deflection), rest, out);
    },
  };
}
