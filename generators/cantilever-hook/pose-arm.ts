import { type Arm, thicknessAt } from '@/lib/mechanics/beam';
import { type FlexibleArm, stationValue, strainAt } from '@/lib/mechanics/large-deflection';
import type { HookStrain } from './mechanics';
import type { HookValues } from './schema';

/** Where a point goes in the side view, mm, and how it is strained along the arm. */
export interface Moved {
  readonly x: number;
  readonly z: number;
  readonly strain: number;
}

const clamp = (value: number, low: number, high: number) => Math.min(Math.max(value, low), high);

/** Half the depth of the side view at height z, the fillets included. */
function halfDepth(v: HookValues, arm: Arm, z: number): number {
  const r = v.rootFillet;
  const below = clamp(r - z, 0, r);
  return thicknessAt(arm, clamp(z, 0, arm.length)) / 2 + r - Math.sqrt(r * r - below * below);
}

/** Strain of the face in tension at height z: nominal on the arm, raised at the fillet, fading to the base. */
function faceStrain(
  v: HookValues,
  flexible: FlexibleArm,
  { bent, nominal, fillet }: HookStrain,
  z: number,
): number {
  const r = v.rootFillet;
  const raised = nominal > 0 ? fillet / nominal - 1 : 0;
  const near = Math.max(0, 1 - Math.abs(z - r) / r);
  const strain = strainAt(flexible, bent, clamp(z, r, v.armLength)) * (1 + raised * near * near);
  return z < r ? strain * Math.max(0, z / r) : strain;
}

/**
 * A point of the arm after bending. Sections stay plane and turn with the slope of the middle line; the nose past
 * the catch edge turns as one piece. The arm bends towards -x, which puts its straight face (x = 0) in tension.
 */
export function moveArmPoint(
  v: HookValues,
  flexible: FlexibleArm,
  state: HookStrain,
  x: number,
  z: number,
): Moved {
  const { arm } = flexible;
  const s = clamp(z, 0, arm.length);
  const { bent } = state;
  const turned = stationValue(bent, bent.angle, s);
  const sine = Math.sin(turned);
  const cosine = Math.cos(turned);
  const middle = -thicknessAt(arm, s) / 2;
  const off = x - middle;
  const beyond = z - clamp(z, bent.along[0]!, arm.length);
  const inSection = clamp(off / halfDepth(v, arm, z), -1, 1);
  const outside = x > 0 && z > arm.length / 2 ? Math.max(0, 1 - x / v.undercut) : 1;
  return {
    x: middle - stationValue(bent, bent.y, s) + off * cosine - beyond * sine,
    z: stationValue(bent, bent.x, s) + off * sine + beyond * cosine,
    strain: faceStrain(v, flexible, state, z) * inSection * outside,
  };
}
