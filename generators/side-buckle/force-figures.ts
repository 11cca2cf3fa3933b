import { type Figure, judge, judgedFigure } from '../report';
import * as source from './sources';
import { inGuideRange, type Subject } from './subject';

/** What two fingers squeeze with ease and at most, and what a hand pushes, N; common practice. */
const PINCH_LIMIT = 50;
const HAND_LIMIT = 100;

/** Under this, N, pads that are brushed let go; common practice. */
const BRUSHED = 3;

const missing = ({ trouble }: Subject): string =>
  trouble ? `Not known: ${trouble}.` : 'Not known: the modulus is not known.';

function squeezeFigure(subject: Subject): Figure {
  const { p, forces, trouble } = subject;
  const known = forces && !trouble;
  const tail = known && !forces.inRange ? ' Past the range of the secant modulus: an upper bound.' : '';
  const soft =
    known && forces.squeeze < BRUSHED
      ? ` Under ${BRUSHED} N it may open when something brushes along it: thicker arms, a thicker plug.`
      : '';
  return judgedFigure({
    id: 'squeeze-force',
    label: 'Squeeze of each finger to release',
    unit: 'N',
    value: known ? forces.squeeze : null,
    handbook: forces && inGuideRange(p) ? forces.handbookSqueeze : null,
    limit: PINCH_LIMIT,
    because: known
      ? `In the middle of the pad, until the rail stops it. Two fingers pinch 20 N with ease, ${PINCH_LIMIT} N at most (common practice, no source). Reads up to 15 % above finite elements.${soft}${tail}`
      : missing(subject),
    source: source.ARM,
  });
}

function matingFigure(subject: Subject): Figure {
  const { p, forces, material, trouble } = subject;
  const known = forces && !trouble ? forces.mating : null;
  const finite = (value: number | undefined) =>
    value !== undefined && Number.isFinite(value) ? value : null;
  const locks = known !== null && !Number.isFinite(known.value);
  const { low, high } = material.friction;
  return judgedFigure({
    id: 'mating-force',
    label: 'Push to close',
    unit: 'N',
    value: finite(known?.value),
    handbook: inGuideRange(p) ? finite(forces?.mating.handbook) : null,
    low: finite(known?.low),
    high: finite(known?.high),
    limit: HAND_LIMIT,
    verdict: locks ? 'over-limit' : judge(finite(known?.value), HAND_LIMIT),
    because: locks
      ? `Locks: at friction ${material.friction.value} a lead-in of ${p.leadInAngle}° does not slide in. Make it smaller.`
      : known
        ? `Both arms over the lead-in of ${p.leadInAngle}°, friction ${low} to ${high}. A hand pushes ${HAND_LIMIT} N at most (common practice).`
        : missing(subject),
    source: source.WEDGE,
  });
}

export const forceFigures = (subject: Subject): Figure[] => [squeezeFigure(subject), matingFigure(subject)];
