import { secantModulus } from '@/lib/materials/secant';
import type { Material } from '@/lib/materials/types';
import { type Arm, guideForce, guideRootStrain } from '@/lib/mechanics/beam';
import { type BentFlushArm, bendFlushArm } from '@/lib/mechanics/flush-arm';
import { wedgeFactor } from '@/lib/mechanics/friction';
import { wrapStrain } from '@/lib/mechanics/strap';
import {
  type ToothedStrip,
  toothedStripInRange,
  toothedWrapFactor,
  toothRootFactor,
} from '@/lib/mechanics/toothed-strip';
import { engagement, layoutOf, rampAngle, turnOf, valleyOf } from './layout';
import type { Values } from './schema';

/** The pawl is as wide as the head; it is lifted at its end. */
export const pawlArm = (p: Values): Arm => {
  const width = layoutOf(p).headTop;
  return {
    length: p.pawlLength,
    rootThickness: p.pawlThickness,
    tipThickness: p.pawlThickness,
    rootWidth: width,
    tipWidth: width,
  };
};

/** The pawl lifted over the crest of a tooth, as if it had none itself. */
export const pawlLifted = (p: Values, poisson: number): BentFlushArm =>
  bendFlushArm(pawlArm(p), p.pawlFillet, engagement(p), poisson);

/** The toothed end of the pawl hardly bends; the rest bends more: 1 / (1 - (a/L)^3), a its toothed length. */
export const toothedEnd = (p: Values): number => 1 / (1 - ((p.pawlTeeth * p.pitch) / p.pawlLength) ** 3);

/** Peak strain of the lifted pawl. */
export const pawlStrain = (p: Values, pawl: BentFlushArm): number => toothedEnd(p) * pawl.peak;

export const stripOf = (p: Values): ToothedStrip => ({
  core: p.bandThickness,
  pitch: p.pitch,
  valley: valleyOf(p),
  rootRadius: p.rootRadius,
});

export interface Wrap {
  /** t/(D + t) of a plain band */
  readonly plain: number;
  /** with the straight head, so that the rest turns the whole way, the teeth, and the curve it is printed with */
  readonly peak: number;
  readonly factor: number;
  readonly inRange: boolean;
}

/** Mean radius in mm of the band round a bundle: a whole turn on what the straight head leaves. */
const meanRadius = (p: Values, bundle: number): number =>
  (turnOf(p, bundle) - layoutOf(p).head) / (2 * Math.PI);

/** Mean curvature in 1/mm that closing on a bundle adds to the band as printed. */
const bendOn = (p: Values, bundle: number): number =>
  Math.max(0, 1 / meanRadius(p, bundle) - 1 / layoutOf(p).ring);

export function wrapOn(p: Values, bundle: number): Wrap {
  const strip = stripOf(p);
  const factor = toothedWrapFactor(strip);
  return {
    plain: wrapStrain(p.bandThickness, bundle),
    peak: (factor * p.bandThickness * bendOn(p, bundle)) / 2,
    factor,
    inRange: toothedStripInRange(strip),
  };
}

/** Bundle diameter in mm on which the band reaches a strain. */
export function bundleFor(p: Values, strain: number): number {
  const { ring, head } = layoutOf(p);
  const bend = (2 * strain) / (toothedWrapFactor(stripOf(p)) * p.bandThickness);
  return 2 / (bend + 1 / ring) + head / Math.PI - p.bandThickness - p.anvil / 2;
}

export interface Banded {
  readonly value: number;
  readonly low: number;
  readonly high: number;
  readonly handbook: number | null;
}

export interface RackForces {
  /** across the pawl as it is lifted over a tooth, N */
  readonly lift: number;
  readonly handbookLift: number;
  /** to draw the strap one tooth tighter, N */
  readonly draw: Banded;
  /** on top of the tab, N */
  readonly tab: number;
  readonly inRange: boolean;
}

/** Forces of the hand; null where no modulus is known. */
export function rackForces(p: Values, pawl: BentFlushArm, material: Material): RackForces | null {
  const modulus = secantModulus(material, pawl.nominal);
  const plain = secantModulus(material, pawl.handbook);
  if (!modulus || !plain) return null;
  const lift = toothedEnd(p) * modulus.value * pawl.bent.forcePerModulus;
  const handbookLift = guideForce(pawlArm(p), guideRootStrain(pawlArm(p), pawl.deflection), plain.value);
  const { low, value, high } = material.friction;
  const draw = (force: number, mu: number) => force * (wedgeFactor(mu, rampAngle(p)) + mu);
  return {
    lift,
    handbookLift,
    draw: {
      value: draw(lift, value),
      low: draw(lift, low),
      high: draw(lift, high),
      handbook: draw(handbookLift, value),
    },
    tab: (lift * 2 * p.pawlLength) / (3 * (p.tabHeight + p.pawlThickness / 2)),
    inRange: modulus.inRange,
  };
}

const SHEAR_SHARE = 0.577;
/** Share of a full tooth that each tooth after the first is counted with. */
const LATER_TEETH = 0.5;

/** Pull in N that shears the teeth of a pawl with so many of them: first alone, as counted, all alike. */
export function toothShear(p: Values, strength: number, teeth: number): Banded {
  const one = SHEAR_SHARE * strength * p.bandWidth * (p.pitch - valleyOf(p));
  return {
    low: one,
    value: one * (1 + LATER_TEETH * (teeth - 1)),
    high: one * teeth,
    handbook: one * teeth,
  };
}

/** From the middle of the pawl to the middle of the faces that hold, mm. */
const propOffset = (p: Values): number => p.pawlThickness / 2 + p.clearance + engagement(p) / 2;

export interface Holding {
  /** pulls in the strap in N at which each part breaks, short-time */
  readonly teeth: Banded;
  readonly pawl: number;
  readonly band: { readonly value: number; readonly brittle: number };
  readonly weakest: 'teeth' | 'pawl' | 'band';
  readonly least: number;
}

/** What the closed strap holds; null where no tensile strength is known. */
export function holding(p: Values, material: Material): Holding | null {
  const strength = material.tensileStrength?.value;
  if (!strength) return null;
  const width = layoutOf(p).headTop;
  const perNewton = 1 / (width * p.pawlThickness) + (3 * propOffset(p)) / (width * p.pawlThickness ** 2);
  const tension = strength * p.bandWidth * p.bandThickness;
  const teeth = toothShear(p, strength, p.pawlTeeth);
  const loads = { teeth: teeth.value, pawl: strength / perNewton, band: tension };
  const [weakest, least] = (Object.entries(loads) as [Holding['weakest'], number][]).reduce((a, b) =>
    b[1] < a[1] ? b : a,
  );
  return {
    teeth,
    pawl: loads.pawl,
    band: { value: tension, brittle: tension / toothRootFactor(stripOf(p)) },
    weakest,
    least,
  };
}
