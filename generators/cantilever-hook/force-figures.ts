import { secantModulus } from '@/lib/materials/secant';
import { guideForce, guideRootStrain, guideStrain } from '@/lib/mechanics/beam';
import { selfLockingAngle, wedgeFactor } from '@/lib/mechanics/friction';
import { degrees, formatQuantity } from '@/lib/units';
import { type Figure, plainFigure } from '../report';
import { armOf } from './mechanics';
import { CORRECTED, GUIDE } from './sources';
import { forceOf, inGuideRange, type Subject } from './subject';

const finite = (value: number | null): number | null =>
  value !== null && Number.isFinite(value) ? value : null;

/** Transverse force as printed in the guide: rigid root, secant modulus at the guide's strain. */
function guideDeflectionForce({ values, material }: Subject): number | null {
  const arm = armOf(values);
  const modulus = secantModulus(material, guideStrain(arm, values.undercut));
  if (!modulus || !inGuideRange(values)) return null;
  return guideForce(arm, guideRootStrain(arm, values.undercut), modulus.value);
}

function modulusNote({ material, strain }: Subject): string {
  const modulus = secantModulus(material, strain.nominal);
  if (!modulus) return 'Not known: no modulus is given for this plastic.';
  const size = formatQuantity(modulus.value, 'MPa');
  const at = formatQuantity(strain.nominal, 'strain');
  const doubt = material.secant.assumed ? ' (softening assumed from another plastic)' : '';
  const range = modulus.inRange
    ? ''
    : ' The strain is past the range of the modulus curve; the force is an upper bound.';
  return `Secant modulus ${size} at ${at}${doubt}.${range}`;
}

interface Ramp {
  readonly id: string;
  readonly label: string;
  readonly angle: number;
  readonly because: string;
}

/** Force along the push for a transverse force, with the friction band. */
function rampFigure(subject: Subject, ramp: Ramp, force: number | null, guide: number | null): Figure {
  const { friction } = subject.material;
  const times = (transverse: number | null, mu: number) =>
    transverse === null ? null : finite(transverse * wedgeFactor(mu, ramp.angle));
  return plainFigure({
    id: ramp.id,
    label: ramp.label,
    unit: 'N',
    value: times(force, friction.value),
    handbook: times(guide, friction.value),
    low: times(force, friction.low),
    high: times(force, friction.high),
    because: ramp.because,
    source: GUIDE,
  });
}

const HAND = 'One hand pushes 20 to 50 N with ease, 100 N at most (common practice, no source).';

function matingReason({ values, material }: Subject): string {
  const lock = selfLockingAngle(material.friction.value);
  if (values.leadInAngle >= lock) {
    return `Locks: a lead-in of ${values.leadInAngle}° is past ${formatQuantity(lock, 'deg')}, pushing does not bend the arm.`;
  }
  return `Push at the end of the lead-in, friction ${material.friction.low} to ${material.friction.high}. ${HAND}`;
}

/** A catch meant to open stays this far below self-locking, degrees (common practice). */
const LOCK_MARGIN = 10;

function separationReason({ values, material }: Subject): string {
  const { friction } = material;
  const lock = selfLockingAngle(friction.value);
  const angle = values.returnAngle;
  if (angle >= lock) {
    return `Locked: at ${angle}° pulling does not open it (self-locking from ${formatQuantity(lock, 'deg')}); it holds until something breaks. Press the arm to release.`;
  }
  if (angle >= selfLockingAngle(friction.high)) {
    return `Opens by pulling at middle friction, locks at ${friction.high}. Lower the return angle to be sure.`;
  }
  if (angle > lock - LOCK_MARGIN) {
    return `Less than ${LOCK_MARGIN}° below self-locking: the pull-off force swings widely with friction.`;
  }
  return `Pull that opens the hook, friction ${friction.low} to ${friction.high}.`;
}

/** The arm tilts as it bends and makes the lead-in steeper by the slope at its tip. */
function tiltedFigure(subject: Subject, force: number | null): Figure {
  const { values, material, strain } = subject;
  const tilt = degrees(strain.bent.angle[strain.bent.angle.length - 1]!);
  const factor = wedgeFactor(material.friction.value, values.leadInAngle + tilt);
  const value = force === null ? null : finite(force * factor);
  return plainFigure({
    id: 'mating-force-tilted',
    label: 'Push with the nose tilted',
    unit: 'N',
    value,
    because: `Bent, the tip leans ${formatQuantity(tilt, 'deg')} and the lead-in is that much steeper${value === null && force !== null ? '; it jams' : ''}. The guides leave this out.`,
    source: CORRECTED,
  });
}

function lockFigure({ values, material }: Subject): Figure {
  const { low, value, high } = material.friction;
  return plainFigure({
    id: 'self-locking-angle',
    label: 'Self-locking angle',
    unit: 'deg',
    value: selfLockingAngle(value),
    handbook: selfLockingAngle(value),
    low: selfLockingAngle(high),
    high: selfLockingAngle(low),
    because: `From this return angle on pulling does not open the hook; it has ${values.returnAngle}°.`,
    source: GUIDE,
  });
}

export function forceFigures(subject: Subject): Figure[] {
  const { values, strain, material, trouble } = subject;
  const force = trouble ? null : forceOf(material, strain);
  const guide = guideDeflectionForce(subject);
  const mating: Ramp = {
    id: 'mating-force',
    label: 'Mating force',
    angle: values.leadInAngle,
    because: trouble ? `Not known: ${trouble}.` : matingReason(subject),
  };
  const separation: Ramp = {
    id: 'separation-force',
    label: 'Separation force',
    angle: values.returnAngle,
    because: trouble ? `Not known: ${trouble}.` : separationReason(subject),
  };
  return [
    plainFigure({
      id: 'deflection-force',
      label: 'Deflection force',
      unit: 'N',
      value: force,
      handbook: guide,
      because: trouble ? `Not known: ${trouble}.` : modulusNote(subject),
      source: CORRECTED,
    }),
    rampFigure(subject, mating, force, guide),
    tiltedFigure(subject, force),
    rampFigure(subject, separation, force, guide),
    lockFigure(subject),
  ];
}
