import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import { secantModulus } from '@/lib/materials/secant';
import type { Material, Use } from '@/lib/materials/types';
import { annularForce, tubeFactor } from '@/lib/mechanics/annular';
import { wedgeFactor } from '@/lib/mechanics/friction';
import { pinchedRing } from '@/lib/mechanics/ring';
import { bentHoleFactor, bundleOfLoop, netArea, pulledHoleFactor, wrapStrain } from '@/lib/mechanics/strap';
import {
  type Eye,
  eyeShare,
  foldingForce,
  NARROWEST_EYE,
  narrowingOfSqueeze,
  type Patch,
  squeezeForce,
  squeezeStrain,
  stretchedEye,
  stretchForce,
} from '@/lib/mechanics/strap-eye';
import { type HalfTurnStrain, halfTurnBundle, halfTurnStrain } from '@/lib/mechanics/strap-half-turn';
import { pegPull, pegSidePull } from '@/lib/mechanics/strap-peg';
import { formatQuantity } from '@/lib/units';
import { firstEyeAt, stripLayout } from './layout';
import type { PegStrap } from './schema';

export const eyeOf = ({ eyeDiameter, strapWidth, strapThickness }: PegStrap): Eye => ({
  diameter: eyeDiameter,
  width: strapWidth,
  thickness: strapThickness,
});

/** Bundle diameter in mm that a loop of a given length closes on. */
export const bundleAt = (values: PegStrap, loop: number): number =>
  values.halfTurn
    ? halfTurnBundle(loop, values.strapWidth, values.strapThickness)
    : bundleOfLoop(loop, values.strapThickness);

/** Largest bundle in mm: the last eye. */
export const largestBundle = (values: PegStrap): number => bundleAt(values, stripLayout(values).eyes.at(-1)!);

/**
 * How the squeezed eye comes off the head. `opens`: its length reaches the head's diameter. `neck`: it narrows onto
 * the neck first. `folds`: the strip folds out of flat first. `small`: the eye is too small a part of the strip for
 * the factors to be checked.
 */
export type Release = 'opens' | 'neck' | 'folds' | 'small';

export interface StrapStrain {
  /** plain strip on the smallest bundle, or the largest bending of the half-turn loop */
  readonly wrap: number | null;
  /** t/(D + t) */
  readonly handbookWrap: number;
  readonly twist: HalfTurnStrain | null;
  /** edge of an eye bent with the strip; `free` where nothing presses the weakened strip to the bundle's curve */
  readonly eyeBend: { readonly pressed: number; readonly free: number } | null;
  readonly eye: { readonly mean: number; readonly peak: number };
  readonly squeeze: number;
  readonly release: Release;
  /** largest of those that occur; null where one is not known */
  readonly peak: number | null;
  readonly governs: 'wrap' | 'twist' | 'eye-bend' | 'eye' | 'squeeze';
}

/** Growth in mm that lets the eye, squeezed across the strip, slip over the head's edge. */
const growthToRelease = ({ headDiameter, eyeDiameter }: PegStrap): number => headDiameter - eyeDiameter;

function releaseOf(values: PegStrap): Release {
  const eye = eyeOf(values);
  const growth = growthToRelease(values);
  if (values.eyeDiameter < NARROWEST_EYE * values.strapWidth) return 'small';
  const left = values.eyeDiameter - narrowingOfSqueeze(eye) * growth;
  if (left < values.pegDiameter) return 'neck';
  return squeezeForce(eye, growth, 1, 'middle') > foldingForce(eye, 1) ? 'folds' : 'opens';
}

type Entry = readonly [StrapStrain['governs'], number | null];

function largest(entries: readonly Entry[]): Pick<StrapStrain, 'peak' | 'governs'> {
  const unknown = entries.find(([, value]) => value === null);
  if (unknown) return { peak: null, governs: unknown[0] };
  const [governs, peak] = entries.reduce((a, b) => (b[1]! > a[1]! ? b : a));
  return { peak, governs };
}

/** Strains of the closed strap and of its opening; they follow from shape and Poisson's ratio alone. */
export function strapStrain(values: PegStrap, poisson: number): StrapStrain {
  const { strapThickness: t, strapWidth: b, bundleDiameter, eyeDiameter, halfTurn } = values;
  const eye = eyeOf(values);
  const handbookWrap = wrapStrain(t, bundleDiameter);
  const twist = halfTurn ? halfTurnStrain(firstEyeAt(values), b, t, poisson) : null;
  const wrap = halfTurn ? (twist?.bending ?? null) : handbookWrap;
  const factor = bentHoleFactor(eyeDiameter, b, t);
  const eyeBend =
    wrap === null ? null : { pressed: factor * wrap, free: (factor * wrap) / (1 - eyeDiameter / b) };
  const stretched = stretchedEye(eye, values.headDiameter);
  const squeeze = squeezeStrain(eye, growthToRelease(values));
  const release = releaseOf(values);
  const entries: Entry[] = [
    ['wrap', wrap],
    ...(halfTurn ? [['twist', twist?.peak ?? null] as const] : []),
    ['eye-bend', eyeBend?.pressed ?? null],
    ['eye', stretched.peak],
    ...(release === 'opens' ? [['squeeze', squeeze] as const] : []),
  ];
  return {
    wrap,
    handbookWrap,
    twist,
    eyeBend,
    eye: stretched,
    squeeze,
    release,
    ...largest(entries),
  };
}

/** Secant modulus in MPa at a strain, or why it is not known: none is given, or the strain is past its range. */
export type WorkingModulus = { readonly value: number } | { readonly value: null; readonly gap: string };

export function workingModulus(material: Material, strain: number | null): WorkingModulus {
  if (strain === null) return { value: null, gap: 'the allowable strain is not known' };
  const secant = secantModulus(material, strain);
  if (!secant) return { value: null, gap: `no modulus of ${material.shortName} is given` };
  if (secant.inRange) return { value: secant.value };
  const [at, to] = [strain, material.secant.validTo].map((part) => formatQuantity(part, 'strain'));
  return {
    value: null,
    gap: `the strain of ${at} is past the ${to} that the modulus of ${material.shortName} is known to`,
  };
}

/** A force in N with its band; Infinity where it locks. */
export interface Banded {
  readonly value: number;
  readonly low: number;
  readonly high: number;
}

export interface RadialForce {
  /** strip as wide as it is, rigid head: the value */
  readonly strip: number;
  /** flat ring alone, head giving like a disc: the lower end */
  readonly least: number;
  /** the guide's annular factor */
  readonly handbook: number;
}

/** Secant modulus while the eye is over the head, and while it is squeezed open. */
export const stretchModulus = (values: PegStrap, material: Material): WorkingModulus =>
  workingModulus(material, stretchedEye(eyeOf(values), values.headDiameter).peak);
export const squeezeModulus = (values: PegStrap, material: Material): WorkingModulus =>
  workingModulus(material, squeezeStrain(eyeOf(values), growthToRelease(values)));

/** Radial force of the eye stretched over the head, N; null where the modulus is not known. */
export function radialForce(values: PegStrap, material: Material): RadialForce | null {
  const eye = eyeOf(values);
  const { headDiameter, eyeDiameter, strapWidth } = values;
  const modulus = stretchModulus(values, material).value;
  if (modulus === null) return null;
  const poisson = material.poisson.value;
  const { strip, ring } = stretchForce(eye, headDiameter, modulus, poisson);
  const factor = tubeFactor(eyeDiameter, strapWidth, poisson);
  return {
    strip,
    least: ring * eyeShare(eye, poisson),
    handbook: annularForce(headDiameter - eyeDiameter, eyeDiameter, modulus, factor),
  };
}

/** Force along the peg at an angle of the head, with the band of friction and of the radial force. */
export function alongPeg(radial: RadialForce, angle: number, { friction }: Material): Banded {
  return {
    value: radial.strip * wedgeFactor(friction.value, angle),
    low: radial.least * wedgeFactor(friction.low, angle),
    high: radial.strip * wedgeFactor(friction.high, angle),
  };
}

/** Force in N that makes a thin ring of the eye's webs as much longer, by the textbook's pinched ring. */
function pinchForce({ strapWidth, eyeDiameter, strapThickness }: PegStrap, growth: number, modulus: number) {
  const ring = {
    radius: (strapWidth + eyeDiameter) / 4,
    thickness: (strapWidth - eyeDiameter) / 2,
    width: strapThickness,
  };
  return growth / pinchedRing(ring, modulus, 1).across;
}

/** Finger force in N that squeezes the eye open, from a narrow to a wide grip; null where the modulus is not known. */
export function releaseForce(values: PegStrap, material: Material): (Banded & { handbook: number }) | null {
  const eye = eyeOf(values);
  const growth = growthToRelease(values);
  const modulus = squeezeModulus(values, material).value;
  if (modulus === null) return null;
  const force = (patch: Patch) => squeezeForce(eye, growth, modulus, patch);
  return {
    value: force('middle'),
    low: force('narrow'),
    high: force('wide'),
    handbook: pinchForce(values, growth, modulus),
  };
}

export interface HoldingLoads {
  /** pull on the strip, N, at which the strip beside an eye reaches the allowable strain; at the eye's edge */
  readonly net: number | null;
  readonly netAtEdge: number | null;
  /** pull on the strip, N, that tears it beside an eye: tough, and notch-sensitive */
  readonly tear: number | null;
  readonly tearBrittle: number | null;
  /** pull along the peg, and on the strip, N, that strain the peg's root to what the layers allow */
  readonly pegPull: number | null;
  readonly pegSide: number | null;
}

/** Allowable strain of the peg, which stands upright on the bed and is pulled across its layers. */
export const acrossLayers = (material: Material, use: Use): AllowableStrain =>
  allowableStrain(material, { ...use, layers: 'across' });

/** Loads the closed strap holds. The peg is pulled sideways at half the strip's thickness above its root. */
export function holdingLoads(
  values: PegStrap,
  material: Material,
  along: number | null,
  across: number | null,
): HoldingLoads {
  const { eyeDiameter, strapWidth, strapThickness, pegDiameter, pegFillet } = values;
  const area = netArea(strapWidth, eyeDiameter, strapThickness);
  const edge = pulledHoleFactor(eyeDiameter, strapWidth);
  const strength = material.tensileStrength?.value ?? null;
  const alongModulus = workingModulus(material, along).value;
  const net = along === null || alongModulus === null ? null : alongModulus * along;
  const modulus = workingModulus(material, across).value;
  const peg = { diameter: pegDiameter, fillet: pegFillet };
  const known = across !== null && modulus !== null;
  return {
    net: net === null ? null : net * area,
    netAtEdge: net === null ? null : (net * area) / edge,
    tear: strength === null ? null : strength * area,
    tearBrittle: strength === null ? null : (strength * area) / edge,
    pegPull: known ? pegPull(peg, across, modulus) : null,
    pegSide: known ? pegSidePull(peg, strapThickness / 2, across, modulus, material.poisson.value) : null,
  };
}
