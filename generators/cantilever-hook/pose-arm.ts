import { thicknessAt } from '@/lib/mechanics/beam';
import { type FlexibleArm, stationValue, strainAt } from '@/lib/mechanics/large-deflection';
import { armWidth, inPanel } from './dimensions';
import type { HookStrain } from './mechanics';
import type { HookValues } from './schema';

/** Where a point goes in the side view, mm, and how it is strained along the arm. */
export interface Moved {
  readonly x: number;
  readonly z: number;
  readonly strain: number;
}

export type Point = readonly [x: number, y: number, z: number];

const clamp = (value: number, low: number, high: number) => Math.min(Math.max(value, low), high);

/** Half the depth of the side view at height z, the fillets of a standing arm included. */
function halfDepth(v: HookValues, { arm }: FlexibleArm, z: number): number {
  const half = thicknessAt(arm, clamp(z, 0, arm.length)) / 2;
  if (inPanel(v)) return half;
  const below = clamp(v.rootFillet - z, 0, v.rootFillet);
  return half + v.rootFillet - Math.sqrt(v.rootFillet ** 2 - below ** 2);
}

/** How much of the fillet's concentration a point sees: all at the fillet's end, across a panel only at the sides. */
function concentrated(v: HookValues, y: number, z: number): number {
  if (v.rootFillet === 0) return 0;
  const near = Math.max(0, 1 - Math.abs(z - v.rootFillet) / v.rootFillet) ** 2;
  return inPanel(v) ? near * Math.min(1, Math.abs(2 * y) / armWidth(v, z)) ** 4 : near;
}

/** Strain of the face in tension: nominal on the arm, raised at the fillet; a standing arm's runs out into its base. */
function faceStrain(v: HookValues, flexible: FlexibleArm, state: HookStrain, y: number, z: number): number {
  const { bent, nominal, fillet } = state;
  const from = inPanel(v) ? 0 : v.rootFillet;
  const raised = nominal > 0 && Number.isFinite(fillet) ? fillet / nominal - 1 : 0;
  const strain = strainAt(flexible, bent, clamp(z, from, v.armLength)) * (1 + raised * concentrated(v, y, z));
  const up = Math.max(0, Math.min(1, z / from));
  return z < from ? strain * up + (state.wall ?? 0) * (1 - up) : strain;
}

/**
 * A point of the arm after bending. Sections stay plane and turn with the slope of the middle line; the nose past
 * the catch edge turns as one piece. The arm bends towards -x, which puts its straight face (x = 0) in tension.
 */
export function moveArmPoint(
  v: HookValues,
  flexible: FlexibleArm,
  state: HookStrain,
  [x, y, z]: Point,
): Moved {
  const { arm } = flexible;
  const { bent } = state;
  const s = clamp(z, 0, arm.length);
  const turned = stationValue(bent, bent.angle, s);
  const sine = Math.sin(turned);
  const cosine = Math.cos(turned);
  const middle = -thicknessAt(arm, s) / 2;
  const off = x - middle;
  const beyond = z - clamp(z, bent.along[0]!, arm.length);
  const inSection = clamp(off / halfDepth(v, flexible, z), -1, 1);
  const outside = x > 0 && z > arm.length / 2 ? Math.max(0, 1 - x / v.undercut) : 1;
  return {
    x: middle - stationValue(bent, bent.y, s) + off * cosine - beyond * sine,
    z: stationValue(bent, bent.x, s) + off * sine + beyond * cosine,
    strain: faceStrain(v, flexible, state, y, z) * inSection * outside,
  };
}
