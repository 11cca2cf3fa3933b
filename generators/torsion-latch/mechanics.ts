import { secantModulus } from '@/lib/materials/secant';
import type { Material } from '@/lib/materials/types';
import { wedgeFactor } from '@/lib/mechanics/friction';
import {
  type BarSection,
  equivalentStrain,
  shearModulus,
  type Twist,
  torsionConstant,
  twistBar,
} from '@/lib/mechanics/torsion';
import type { Values } from './schema';

export const sectionOf = (p: Values): BarSection =>
  p.barShape === 'round'
    ? { shape: 'round', diameter: p.barDiameter }
    : { shape: 'rectangular', width: p.barWidth, thickness: p.barThickness };

/** Turn of the rocker that clears the undercut, rad. */
export const turnOf = (p: Values): number => Math.asin(Math.min(1, p.undercut / p.catchArm));

/** Section modulus of a bar against bending across the panel, mm3. */
const bendingModulus = (p: Values): number =>
  p.barShape === 'round' ? (Math.PI * p.barDiameter ** 3) / 32 : (p.barWidth * p.barThickness ** 2) / 6;

export interface LatchStrain {
  readonly turn: number;
  /** largest shear strain of a bar */
  readonly shear: number;
  /** tensile strain that stands for it */
  readonly twisting: number;
  /** tension from the bars' bending under the finger or the nose */
  readonly barBending: number;
  /** tension in the rocker beside the bars */
  readonly rockerBending: number;
  /** twist and bending of the bar together, sqrt(bending^2 + twisting^2) */
  readonly bar: number;
  readonly peak: number;
  readonly handbook: number;
}

/** Torques per shear modulus: strain does not depend on the modulus, only on shape and Poisson ratio. */
function torquePerModulus(p: Values, poisson: number, ends: 'held' | 'free'): Twist {
  return twistBar(sectionOf(p), p.barLength, turnOf(p), shearModulus(1, poisson), ends);
}

/**
 * Strain of the latch while its nose clears the edge. The bars twist with held ends and bend as beams held at both
 * ends under the larger of nose and finger force; the rocker bends as a cantilever from the bars. Bar stresses join
 * as the greatest shear does (Tresca), which agrees with eps = gamma / (1 + nu) for pure twist.
 */
export function latchStrain(p: Values, poisson: number): LatchStrain {
  const held = torquePerModulus(p, poisson, 'held');
  const torque = 2 * held.torque;
  const [nose, finger] = [torque / p.catchArm, torque / p.tailArm];
  const across = Math.max(nose, finger);
  const twisting = equivalentStrain(held.shear, poisson);
  const barBending = ((across / 2) * (p.barLength / 2)) / bendingModulus(p);
  const rockerBending = torque / ((p.rockerWidth * p.panelThickness ** 2) / 6);
  const bar = Math.hypot(barBending, twisting);
  const free = torquePerModulus(p, poisson, 'free');
  return {
    turn: turnOf(p),
    shear: held.shear,
    twisting,
    barBending,
    rockerBending,
    bar,
    peak: Math.max(bar, rockerBending),
    handbook: equivalentStrain(free.shear, poisson),
  };
}

export interface LatchForces {
  readonly torque: number;
  readonly handbookTorque: number;
  readonly finger: number;
  readonly nose: number;
  readonly close: Banded;
  readonly pull: Banded;
  readonly inRange: boolean;
}

export interface Banded {
  readonly value: number;
  readonly low: number;
  readonly high: number;
}

/** Forces with the secant modulus at the peak strain; null where the modulus is not known. */
export function latchForces(p: Values, material: Material): LatchForces | null {
  const poisson = material.poisson.value;
  const secant = secantModulus(material, latchStrain(p, poisson).peak);
  if (!secant) return null;
  const torque = 2 * torquePerModulus(p, poisson, 'held').torque * secant.value;
  const nose = torque / p.catchArm;
  const { value, low, high } = material.friction;
  const along = (angle: number): Banded => ({
    value: nose * wedgeFactor(value, angle),
    low: nose * wedgeFactor(low, angle),
    high: nose * wedgeFactor(high, angle),
  });
  return {
    torque,
    handbookTorque: 2 * torquePerModulus(p, poisson, 'free').torque * secant.value,
    finger: torque / p.tailArm,
    nose,
    close: along(p.leadInAngle),
    pull: along(p.returnAngle),
    inRange: secant.inRange,
  };
}

/** Twist constant of a bar, for the report. mm4 */
export const barConstant = (p: Values): number => torsionConstant(sectionOf(p));

/** How far the tail has to be pressed, mm. */
export const tailTravel = (p: Values): number => p.tailArm * Math.sin(turnOf(p));
