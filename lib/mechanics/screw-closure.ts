import type { AllowableStrain } from '@/lib/materials/allowable';
import { secantModulus } from '@/lib/materials/secant';
import type { Material } from '@/lib/materials/types';
import { jointOf, plugContact, plugInner, type ScrewSizes } from './screw-sizes';
import { endFactor, type PlugFit, type PlugStrain, plugDrag, plugStrain, rigidPlugStrain } from './seal';
import type { ThreadJoint } from './thread-joint';
import {
  axialStrength,
  capSpread,
  strippingAreas,
  strippingLoad,
  threadShare,
  threadShearStrength,
} from './thread-strength';
import {
  handTorque,
  nutFactorTorque,
  PRINTED_NUT_FACTOR,
  type ScrewContact,
  type TorqueRange,
  torquePerLoad,
} from './thread-torque';

export interface Banded {
  readonly value: number;
  readonly handbook: number | null;
  readonly low: number;
  readonly high: number;
}

/** Pressure in MPa that beds a hard seal on its seat; foam and rubber under 75 Shore A need none to speak of. */
export const SEAT_PRESSURE = 1.4;

/** The thread of neck and cap, rubbing on the rim at the middle of what touches it. */
export function screwContact(joint: ThreadJoint, friction: number): ScrewContact {
  return {
    pitchDiameter: joint.thread.pitchDiameter,
    lead: joint.thread.lead,
    flank: joint.thread.loadFlank,
    friction,
    collarRadius: (joint.land.inner + joint.land.outer) / 2,
    collarFriction: friction,
  };
}

const plugFit = (p: ScrewSizes, joint: ThreadJoint, material: Material): PlugFit => ({
  bore: p.bore,
  neckOuter: joint.thread.rootDiameter,
  plugInner: plugInner(p),
  interference: p.plugInterference,
  poisson: material.poisson.value,
});

export interface Plug {
  readonly rings: PlugStrain;
  /** largest hoop strain of either ring */
  readonly hoop: number;
  /** with the rise at the end of the ring */
  readonly peak: number;
  readonly rigid: number;
  /** contact pressure in MPa, null when the modulus is not known */
  readonly pressure: number | null;
}

/** Strains of a plug in its bore; null for other seals. */
export function plugOf(p: ScrewSizes, joint: ThreadJoint, material: Material): Plug | null {
  if (p.seal !== 'plug') return null;
  const fit = plugFit(p, joint, material);
  const rings = plugStrain(fit);
  const neckPeak = rings.neck * endFactor(joint.neckWall, p.bore / 2);
  const plugPeak = Math.abs(rings.plugInside);
  const modulus = secantModulus(material, Math.max(rings.neck, plugPeak));
  return {
    rings,
    hoop: Math.max(rings.neck, plugPeak),
    peak: Math.max(neckPeak, plugPeak),
    rigid: rigidPlugStrain(fit),
    pressure: modulus ? modulus.value * rings.pressureShare : null,
  };
}

/** Load in N at which the threads strip; null when the strength is not known at this temperature. */
export function stripping(joint: ThreadJoint, clearance: number, material: Material): Banded | null {
  const shear = threadShearStrength(material);
  if (!shear) return null;
  const share = threadShare(material);
  const actual = strippingAreas(joint.thread, clearance, joint.engagedLength);
  const basic = strippingAreas(joint.thread, 0, joint.engagedLength);
  return {
    value: share.value * strippingLoad(actual, shear.value),
    handbook: share.value * strippingLoad(basic, shear.value),
    low: share.low * strippingLoad(actual, shear.low),
    high: share.high * strippingLoad(actual, shear.value),
  };
}

/** Load in N at which the neck parts between two layers; handbook: over the tensile stress area less the bore. */
export function neckStrength(p: ScrewSizes, joint: ThreadJoint, material: Material): Banded | null {
  const strength = axialStrength(material);
  if (!strength) return null;
  const { rootDiameter, pitchDiameter } = joint.thread;
  const ring = (outer: number) => (Math.PI / 4) * (outer ** 2 - p.bore ** 2);
  const { low, value, high } = threadShare(material);
  return {
    value: value * strength.value * ring(rootDiameter),
    handbook: value * strength.value * ring((rootDiameter + pitchDiameter) / 2),
    low: low * strength.low * ring(rootDiameter),
    high: high * strength.value * ring(rootDiameter),
  };
}

export interface Closing {
  readonly hand: TorqueRange;
  /** torque in N mm that the plug takes before the thread is loaded, at the middle friction */
  readonly drag: number;
  /** axial load in N of a firm hand: the upper end of its range */
  readonly load: Banded;
}

/** Torque in N mm a plug takes: friction round the bore, and the push along the lead it follows. Null: not known. */
export function plugTorque(
  p: ScrewSizes,
  joint: ThreadJoint,
  plug: Plug | null,
  friction: number,
): number | null {
  if (!plug) return 0;
  if (plug.pressure === null) return null;
  const around = plugDrag(friction, plug.pressure, p.bore, plugContact(p));
  const push = ((2 * around) / p.bore) * (joint.thread.lead / (Math.PI * p.bore));
  return around + push * torquePerLoad({ ...screwContact(joint, friction), collarFriction: 0 }, 'closing');
}

/** What a hand does to the closed thread; null where the torque or the drag of the plug is not known. */
export function closing(
  p: ScrewSizes,
  joint: ThreadJoint,
  plug: Plug | null,
  material: Material,
): Closing | null {
  const hand = handTorque(p.majorDiameter);
  const { low, value, high } = material.friction;
  const drag = plugTorque(p, joint, plug, value);
  if (!hand || drag === null) return null;
  const loadAt = (friction: number) => {
    const left = Math.max(0, hand.high - (plugTorque(p, joint, plug, friction) ?? 0));
    return left / torquePerLoad(screwContact(joint, friction), 'closing');
  };
  const handbook = Math.max(0, hand.high - drag) / nutFactorTorque(PRINTED_NUT_FACTOR, 1, p.majorDiameter);
  return { hand, drag, load: { value: loadAt(value), handbook, low: loadAt(high), high: loadAt(low) } };
}

/** Axial load in N that presses a ring between two radii (mm) with a pressure (MPa). */
export const seatLoad = (ring: {
  readonly inner: number;
  readonly outer: number;
  readonly pressure: number;
}): number => ring.pressure * Math.PI * (ring.outer ** 2 - ring.inner ** 2);

/** Hoop strain and growth of the cap under the load of a firm hand; null when the modulus is not known. */
export function spread(p: ScrewSizes, joint: ThreadJoint, load: number, material: Material) {
  const initial = secantModulus(material, 0);
  if (!initial) return null;
  const given = {
    load,
    flank: joint.thread.loadFlank,
    meanRadius: (joint.cap.majorDiameter + p.wall) / 2,
    section: p.wall * (p.neckHeight - joint.capMouth),
  };
  const first = capSpread({ ...given, modulus: initial.value });
  const softened = secantModulus(material, first.hoopStrain)!;
  return capSpread({ ...given, modulus: softened.value });
}

export interface ScrewMechanics {
  readonly joint: ThreadJoint;
  readonly plug: Plug | null;
  readonly stripping: Banded | null;
  readonly neck: Banded | null;
  readonly closing: Closing | null;
  readonly spread: { readonly hoopStrain: number; readonly growth: number } | null;
}

/** Everything the report rests on. Strengths are not known where the temperature factor of the allowable is not. */
export function screwMechanics(
  p: ScrewSizes,
  material: Material,
  allowable: AllowableStrain,
): ScrewMechanics {
  const joint = jointOf(p);
  const plug = plugOf(p, joint, material);
  const warm = allowable.factors.some(({ id, value }) => id === 'temperature' && value === null);
  const shut = closing(p, joint, plug, material);
  return {
    joint,
    plug,
    stripping: warm ? null : stripping(joint, p.clearance, material),
    neck: warm ? null : neckStrength(p, joint, material),
    closing: shut,
    spread: shut && spread(p, joint, shut.load.value, material),
  };
}
