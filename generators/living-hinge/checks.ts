import { allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { FREE_SEPARATION } from '@/lib/mechanics/fold';
import { stripStrain, webStrain } from '@/lib/mechanics/web';
import { degrees, radians } from '@/lib/units';
import { type Curve, type Figure, plainFigure, type Report, report } from '../report';
import {
  type WebSubject,
  webBridge,
  webEndurance,
  webGoverning,
  webLayers,
  webLengthFigures,
  webMoment,
  webStrainFigures,
  webSubject,
} from '../web-figures';
import * as source from '../web-sources';
import { foldOf } from './mechanics';
import type { Values } from './schema';
import { pressedShut, webOf } from './web';

/** Leaves cannot be folded further, deg. */
const FULL_TURN = 360;

function meetingFigure(p: Values, { folded }: WebSubject): Figure {
  const angle = degrees(folded.meetingAngle);
  const meets = angle < p.foldAngle;
  const value = Math.min(angle, FULL_TURN);
  const because = pressedShut(p)
    ? `The leaves are pressed face to face; the web exits stand ${folded.separation.toFixed(2)} of its length apart, an even fold wants ${FREE_SEPARATION.toFixed(2)}.`
    : meets
      ? 'The leaf edges meet before the fold is reached and then force the web: lengthen the web or reduce what lies inside the fold.'
      : angle >= FULL_TURN
        ? 'The leaf edges never meet: the web is long enough for a full turn.'
        : 'The leaf edges clear each other up to the fold angle.';
  const figure = plainFigure({
    id: 'meeting-angle',
    label: 'Fold angle where the leaf edges meet',
    unit: 'deg',
    value,
    limit: p.foldAngle,
    limitKind: 'min',
    because,
    source: source.GEOMETRY,
  });
  if (pressedShut(p)) return { ...figure, limit: null };
  return { ...figure, verdict: meets ? 'over-limit' : 'within-limit' };
}

const CURVE_STEPS = 24;

/** Strain of an even bend over the fold angle. */
function strainCurve(p: Values): Curve {
  const web = webOf(p);
  const at = (i: number) => (p.foldAngle * i) / CURVE_STEPS;
  return {
    id: 'strain-over-angle',
    label: 'Peak strain while folding, leaves standing apart',
    x: { label: 'Fold angle', unit: 'deg' },
    y: { label: 'Peak strain', unit: 'strain' },
    points: Array.from(
      { length: CURVE_STEPS + 1 },
      (_, i) => [at(i), webStrain(web, radians(at(i))).peak] as const,
    ),
  };
}

/** The plain strip over web length, to see what a longer web buys. */
function lengthCurve(p: Values): Curve {
  const angle = radians(p.foldAngle);
  const at = (i: number) => p.webLength * (0.5 + (2.5 * i) / CURVE_STEPS);
  return {
    id: 'strain-over-length',
    label: 'Nominal strain over web length',
    x: { label: 'Web length', unit: 'mm' },
    y: { label: 'Nominal strain', unit: 'strain' },
    points: Array.from(
      { length: CURVE_STEPS + 1 },
      (_, i) => [at(i), stripStrain(p.webThickness, at(i), angle)] as const,
    ),
  };
}

/** Report of a hinge: elastic and drawn verdicts kept apart. */
export function check(p: Values, material: Material, use: Use): Report {
  const allowable = allowableStrain(material, use);
  const { layerHeight, leafWidth: width } = p;
  const subject = webSubject({ fold: foldOf(p), width, layerHeight, material, use, allowable });
  const strains = webStrainFigures(subject);
  const drawnWeb = strains[1];
  return report({
    governing: webGoverning(subject),
    headline: ['fold-moment', 'elastic-web-length', subject.drawn ? 'fold-endurance' : 'meeting-angle'],
    figures: [
      ...strains,
      ...webLengthFigures(subject),
      webEndurance(subject, drawnWeb),
      webMoment(subject),
      meetingFigure(p, subject),
      webLayers(subject),
      ...(p.webRelief > 0 ? [webBridge(subject)] : []),
    ],
    curves: [strainCurve(p), lengthCurve(p)],
    allowable,
  });
}
