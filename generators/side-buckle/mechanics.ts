import { secantModulus } from '@/lib/materials/secant';
import type { Material } from '@/lib/materials/types';
import { type Arm, guideForce, guideRootStrain } from '@/lib/mechanics/beam';
import { type BentFlushArm, bendFlushArm } from '@/lib/mechanics/flush-arm';
import { wedgeFactor } from '@/lib/mechanics/friction';
import { entryTravel, squeezeTravel } from './layout';
import type { Values } from './schema';

/** An arm pushed `reach` mm from its root: at the holding edge, or where the finger presses. */
export const armOf = (p: Values, reach: number): Arm => ({
  length: reach,
  rootThickness: p.rootThickness,
  tipThickness: p.tipThickness,
  rootWidth: p.plugThickness,
  tipWidth: p.plugThickness,
});

const bentBy = (p: Values, reach: number, deflection: number, poisson: number): BentFlushArm =>
  bendFlushArm(armOf(p, reach), p.rootFillet, deflection, poisson);

/** Where the finger presses, from the root, mm. */
export const fingerReach = (p: Values): number => p.armLength + p.padLength / 2;

/** Movement under the finger for a movement of the edge: load at a, edge at L, 2 a^3 / (L^2 (3 a - L)). */
export function fingerTravel(p: Values, atEdge: number): number {
  const [a, length] = [fingerReach(p), p.armLength];
  return (atEdge * 2 * a ** 3) / (length ** 2 * (3 * a - length));
}

export interface BuckleStrain {
  readonly entry: BentFlushArm;
  readonly squeeze: BentFlushArm;
}

/** Pushing in, each barb pressed at its edge; squeezing, each pad pressed in its middle until the rail stops it. */
export function buckleStrain(p: Values, poisson: number): BuckleStrain {
  return {
    entry: bentBy(p, p.armLength, entryTravel(p), poisson),
    squeeze: bentBy(p, fingerReach(p), fingerTravel(p, squeezeTravel(p)), poisson),
  };
}

export interface Banded {
  readonly value: number;
  readonly low: number;
  readonly high: number;
  readonly handbook: number;
}

export interface BuckleForces {
  /** each finger, N: computed and as printed in the guide */
  readonly squeeze: number;
  readonly handbookSqueeze: number;
  /** across each arm as its edge passes the wall, N */
  readonly entry: number;
  /** push on the plug, both arms, N */
  readonly mating: Banded;
  readonly inRange: boolean;
}

function acrossForce(p: Values, strain: BentFlushArm, reach: number, material: Material) {
  const modulus = secantModulus(material, strain.nominal);
  const plain = secantModulus(material, strain.handbook);
  if (!modulus || !plain) return null;
  const arm = armOf(p, reach);
  return {
    force: modulus.value * strain.bent.forcePerModulus,
    handbook: guideForce(arm, guideRootStrain(arm, strain.deflection), plain.value),
    inRange: modulus.inRange,
  };
}

/** Forces of the hand; null where no modulus is known. */
export function buckleForces(p: Values, strain: BuckleStrain, material: Material): BuckleForces | null {
  const squeeze = acrossForce(p, strain.squeeze, fingerReach(p), material);
  const entry = acrossForce(p, strain.entry, p.armLength, material);
  if (!squeeze || !entry) return null;
  const { low, value, high } = material.friction;
  const push = (force: number, mu: number) => 2 * force * wedgeFactor(mu, p.leadInAngle);
  return {
    squeeze: squeeze.force,
    handbookSqueeze: squeeze.handbook,
    entry: entry.force,
    mating: {
      value: push(entry.force, value),
      low: push(entry.force, low),
      high: push(entry.force, high),
      handbook: push(entry.handbook, value),
    },
    inRange: squeeze.inRange && entry.inRange,
  };
}

/** Height of the barb that holds behind the wall, mm. */
export const heldHeight = (p: Values): number => Math.min(entryTravel(p), p.sideWall);
/** From the middle of the arm to the middle of what holds, mm. */
export const pullOffset = (p: Values): number => p.tipThickness / 2 + p.clearance + heldHeight(p) / 2;

const SHEAR_SHARE = 0.577;
/** The webbing of a ladder-lock bears on its bar with both its ends, at most with twice the pull. */
const ladderShare = (p: Values): number => (p.ladderLock ? 2 : 1);

export interface Holding {
  /** pulls on the strap in N at which each part breaks, short-time; both arms bear alike */
  readonly barb: number;
  readonly bearing: number;
  readonly arm: number;
  readonly bar: { readonly value: number; readonly builtIn: number };
  readonly weakest: 'barb' | 'bearing' | 'arm' | 'bar';
  readonly least: number;
}

/** Bending moment of a bar over load, mm: even load over the slot, on hinges and built in. */
const barLever = (p: Values) => ({ hinged: p.webbingWidth / 8, builtIn: p.webbingWidth / 12 });

const barModulus = (p: Values): number => (p.plugThickness * p.barWidth ** 2) / 6;

/** What the locked buckle holds; null where no tensile strength is known. */
export function holding(p: Values, material: Material): Holding | null {
  const strength = material.tensileStrength?.value;
  if (!strength) return null;
  const { plugThickness: t, tipThickness: h } = p;
  const perArm = 1 / (h * t) + (6 * pullOffset(p)) / (t * h ** 2);
  const bar = (lever: number) => (strength * barModulus(p)) / (lever * ladderShare(p));
  const loads = {
    barb: 2 * SHEAR_SHARE * strength * t * p.padLength,
    bearing: 2 * strength * t * heldHeight(p),
    arm: (2 * strength) / perArm,
    bar: bar(barLever(p).hinged),
  };
  const [weakest, least] = (Object.entries(loads) as [Holding['weakest'], number][]).reduce((a, b) =>
    b[1] < a[1] ? b : a,
  );
  return { ...loads, bar: { value: loads.bar, builtIn: bar(barLever(p).builtIn) }, weakest, least };
}

/** Outer-fibre strain of the most loaded bar under the intended pull; null where no modulus is known. */
export function barStrain(p: Values, material: Material): number | null {
  const modulus = secantModulus(material, 0);
  if (!modulus) return null;
  return (p.pull * ladderShare(p) * barLever(p).hinged) / (modulus.value * barModulus(p));
}

/**
 * Friction on the holding faces over what it has to bear: pulled beside their middle, the arms want to turn inward and
 * out of the windows. The prop force at the edge is 3 e / (2 L) of the pull.
 */
export const slipReserve = (p: Values, friction: number): number =>
  (friction * 2 * p.armLength) / (3 * pullOffset(p));
