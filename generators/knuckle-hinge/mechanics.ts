import type { LayerDirection, Material } from '@/lib/materials/types';
import {
  knuckleTension,
  meanPinShear,
  type PinJoint,
  pinBending,
  pinTilt,
  ROUND_SHEAR_PEAK,
} from '@/lib/mechanics/pin';
import {
  barrelRadius,
  boredKnuckles,
  boreWall,
  knuckleLength,
  leafEdge,
  lipEnd,
  lipHeight,
  type Values,
} from './schema';

export const jointOf = (p: Values): PinJoint => ({
  pinDiameter: p.pinDiameter,
  knuckles: boredKnuckles(p),
  knuckleLength: knuckleLength(p),
  sideGap: p.gap,
  wall: boreWall(p),
});

/**
 * How far the hinge opens past flat, rad: until the lip bears under the other leaf, or until the backs of the leaves
 * meet at the edge of a leaf.
 */
export function pastFlat(p: Values): number {
  const r = barrelRadius(p);
  if (p.stop === 'none') return 2 * Math.atan(leafEdge(p) / r);
  const below = r - lipHeight(p);
  const reach = Math.hypot(lipEnd(p), below);
  return Math.asin(below / reach) - Math.asin((below - p.gap) / reach);
}

/** Distance between the faces of the leaves folded together, mm. */
export const closedGap = (p: Values): number => 2 * (barrelRadius(p) - p.leafThickness);

/** How far the outer corner of a leaf can be moved along the pin, each way, mm. */
export function play(p: Values): number {
  const span = p.hingeWidth - 2 * (knuckleLength(p) + p.gap);
  return p.gap + pinTilt(p.gap, span) * p.leafLength;
}

/** Share of the strength that a print is trusted with. */
export const TRUSTED = 0.5;
/** Shear strength of a ductile plastic over its tensile strength (von Mises). */
const SHEAR_SHARE = 0.577;
/** Interlayer shear over strength along the layers, where nothing was measured. */
const LAYER_SHARE = 0.3;

export interface PinStrength {
  /** MPa, before the trusted share */
  readonly tension: number;
  readonly shear: number;
}

/** Strength of pin and knuckles in the way they are printed; null where the plastic's is not known. */
export function strengthOf(material: Material, layers: LayerDirection): PinStrength | null {
  const along = material.tensileStrength?.value;
  if (along === undefined) return null;
  if (layers === 'along' || material.process === 'moulded') {
    return { tension: along, shear: SHEAR_SHARE * along };
  }
  const across = material.tensileStrengthAcross?.value;
  return across === undefined
    ? { tension: LAYER_SHARE * along, shear: LAYER_SHARE * along }
    : { tension: across, shear: SHEAR_SHARE * across };
}

export interface PinLoad {
  /** MPa at the pull to carry */
  readonly meanShear: number;
  readonly shear: number;
  readonly bending: number;
  readonly tension: number;
}

export function loadOf(p: Values): PinLoad {
  const joint = jointOf(p);
  const meanShear = meanPinShear(joint, p.pull);
  return {
    meanShear,
    shear: ROUND_SHEAR_PEAK * meanShear,
    bending: pinBending(joint, p.pull),
    tension: knuckleTension(joint, p.pull),
  };
}

export interface Capacity {
  /** N */
  readonly value: number;
  readonly weakest: string;
}

/** Pull at which the weakest place reaches the trusted share of its strength. */
export function capacityOf(p: Values, strength: PinStrength): Capacity {
  const unit = loadOf({ ...p, pull: 1 });
  const places = [
    { value: strength.shear / unit.shear, weakest: 'shear of the pin' },
    { value: strength.tension / unit.bending, weakest: 'bending of the pin' },
    { value: strength.tension / unit.tension, weakest: 'the wall of the bored knuckles' },
  ];
  const { value, weakest } = places.reduce((least, next) => (next.value < least.value ? next : least));
  return { value: TRUSTED * value, weakest };
}
