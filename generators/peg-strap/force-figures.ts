import { SHELL_BAND } from '@/lib/mechanics/annular';
import { selfLockingAngle, wedgeFactor } from '@/lib/mechanics/friction';
import { formatQuantity } from '@/lib/units';
import { type Figure, judge, judgedFigure, plainFigure } from '../report';
import {
  releaseForce,
  squeezeModulus,
  stretchModulus,
  type WorkingModulus,
  workingModulus,
} from './mechanics';
import * as source from './sources';
import { releaseReason } from './strain-figures';
import { finite, type Subject } from './subject';

/** Hand force that can still be given, and that is comfortable, N. */
const HAND_LIMIT = 100;
const HAND_COMFORT = 50;

const notKnown = (modulus: WorkingModulus): string =>
  modulus.value === null ? `Not known: ${modulus.gap}.` : 'Not known.';

function handbookOf({ radial, material }: Subject, angle: number): number | null {
  return radial && finite(radial.handbook * wedgeFactor(material.friction.value, angle));
}

function guideDoubt(value: number | null): string {
  if (value === null) return '';
  const band = `${formatQuantity(value, 'N')} to ${formatQuantity(SHELL_BAND * value, 'N')}`;
  return ` The guide's annular factor is made for long tubes, not for a flat eye, and leaves a band of ${band}.`;
}

function pushFigure(subject: Subject): Figure {
  const { push, material, values } = subject;
  const missing = notKnown(stretchModulus(values, material));
  const handbook = handbookOf(subject, values.headLeadAngle);
  const { friction } = material;
  const value = finite(push?.value);
  const locks = push !== null && value === null;
  const known = `Lead-in of ${values.headLeadAngle}°, friction ${friction.low} to ${friction.high}, the eye stretched through its whole depth.${guideDoubt(handbook)}`;
  return judgedFigure({
    id: 'push-in-force',
    label: 'Push-in force',
    unit: 'N',
    value,
    handbook,
    low: finite(push?.low),
    high: finite(push?.high),
    limit: HAND_LIMIT,
    verdict: locks ? 'over-limit' : judge(value, HAND_LIMIT),
    because: locks
      ? `Locks: at friction ${friction.value} a lead-in of ${values.headLeadAngle}° does not slide in. Make it smaller.`
      : push
        ? `${known} ${handWords(value!)}`
        : missing,
    source: source.WEDGE,
  });
}

function handWords(force: number): string {
  if (force <= HAND_COMFORT) return 'A hand gives it with ease (20 to 50 N).';
  return force <= HAND_LIMIT ? 'Over 50 N is hard work for a hand.' : 'More than a hand gives (100 N).';
}

function pullReason(subject: Subject): string {
  const { pull, loads, values, material } = subject;
  if (!pull) return notKnown(stretchModulus(values, material));
  const lock = selfLockingAngle(material.friction.value);
  if (!Number.isFinite(pull.value)) {
    return `Locks: at a return angle of ${values.headReturnAngle}° (self-locking from ${formatQuantity(lock, 'deg')}) a straight pull does not open it. Squeeze the eye.`;
  }
  const peg =
    loads.pegPull !== null && pull.value > loads.pegPull
      ? ' The peg is strained past its limit first: open it by the eye, not by pulling.'
      : '';
  return `Straight pull along the peg, back face at ${values.headReturnAngle}°.${peg}`;
}

function pullFigure(subject: Subject): Figure {
  const { pull, values } = subject;
  return plainFigure({
    id: 'pull-out-force',
    label: 'Pull-out force',
    unit: 'N',
    value: finite(pull?.value),
    handbook: handbookOf(subject, values.headReturnAngle),
    low: finite(pull?.low),
    high: finite(pull?.high),
    because: pullReason(subject),
    source: source.WEDGE,
  });
}

function lockFigure({ material, values }: Subject): Figure {
  const { low, value, high } = material.friction;
  return plainFigure({
    id: 'self-locking-angle',
    label: 'Self-locking angle',
    unit: 'deg',
    value: selfLockingAngle(value),
    handbook: selfLockingAngle(value),
    low: selfLockingAngle(high),
    high: selfLockingAngle(low),
    because: `From this return angle on a straight pull does not open the strap; the head has ${values.headReturnAngle}°.`,
    source: source.LOCK,
  });
}

const GRIP =
  ' Band: tip of a finger, half an eye wide, to its whole pad, two eyes wide. The textbook ring leaves out the strip before and behind the eye and reads far too low.';

function releaseFigure(subject: Subject): Figure {
  const opens = subject.strain.release === 'opens';
  const force = opens ? releaseForce(subject.values, subject.material) : null;
  const missing = notKnown(squeezeModulus(subject.values, subject.material));
  return plainFigure({
    id: 'release-force',
    label: 'Squeeze to release',
    unit: 'N',
    value: force?.value ?? null,
    handbook: force?.handbook ?? null,
    low: force?.low ?? null,
    high: force?.high ?? null,
    because: opens && !force ? missing : `${releaseReason(subject)}${force ? GRIP : ''}`,
    source: source.SQUEEZE,
  });
}

function netFigure({ loads, values, material, allowable }: Subject): Figure {
  return plainFigure({
    id: 'net-section-load',
    label: 'Pull the strip bears beside an eye',
    unit: 'N',
    value: loads.net,
    handbook: loads.net,
    low: loads.netAtEdge,
    high: loads.net,
    because:
      loads.net === null
        ? notKnown(workingModulus(material, allowable.value))
        : `The ${formatQuantity(values.strapWidth - values.eyeDiameter, 'mm')} beside an eye reach the allowable strain; a brittle plastic counts the edge of the eye, the lower figure.`,
    source: source.NET_SECTION,
  });
}

function tearFigure({ loads, material }: Subject): Figure {
  return plainFigure({
    id: 'break-load',
    label: 'Pull that tears the strip',
    unit: 'N',
    value: loads.tear,
    handbook: loads.tear,
    low: loads.tearBrittle,
    high: loads.tear,
    because:
      loads.tear === null
        ? `Not known: no tensile strength of ${material.shortName} is given.`
        : 'Short-time strength of the net section in a tough plastic; a notch-sensitive one tears at the lower figure.',
    source: source.NET_SECTION,
  });
}

function pegFigures({ loads, material, across }: Subject): Figure[] {
  const missing = notKnown(workingModulus(material, across.value));
  const weakest =
    loads.pegSide !== null && loads.net !== null && loads.pegSide < loads.net
      ? 'The peg reaches its limit before the strip does: a thicker peg or a larger fillet holds more.'
      : 'The strip beside the eye reaches its limit first.';
  return [
    plainFigure({
      id: 'peg-side-load',
      label: 'Pull on the strap the peg bears',
      unit: 'N',
      value: loads.pegSide,
      because:
        loads.pegSide === null
          ? missing
          : `Bending and shear at its foot, fillet counted, layers pulled apart. ${weakest}`,
      source: source.PEG,
    }),
    plainFigure({
      id: 'peg-neck-load',
      label: 'Pull along the peg its neck bears',
      unit: 'N',
      value: loads.pegPull,
      because:
        loads.pegPull === null
          ? missing
          : 'The neck is pulled across its layers, fillet counted; printed on its edge it would be pulled along them.',
      source: source.PEG,
    }),
  ];
}

export const forceFigures = (subject: Subject): Figure[] => [
  pushFigure(subject),
  pullFigure(subject),
  lockFigure(subject),
  releaseFigure(subject),
  netFigure(subject),
  tearFigure(subject),
  ...pegFigures(subject),
];
