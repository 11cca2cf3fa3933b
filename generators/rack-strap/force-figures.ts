import { formatQuantity } from '@/lib/units';
import { type Figure, judge, judgedFigure, plainFigure } from '../report';
import { engagement, layoutOf, rampAngle } from './layout';
import * as source from './sources';
import type { Subject } from './subject';

/** What a hand draws at most, and a finger tips with ease, N; common practice. */
const HAND_LIMIT = 100;
const FINGER_LIMIT = 30;
const RESERVE = 3;

const finite = (value: number | null | undefined): number | null =>
  value !== null && value !== undefined && Number.isFinite(value) ? value : null;

const missing = ({ trouble }: Subject): string =>
  trouble ? `Not known: ${trouble}.` : 'Not known: the modulus is not known.';

function strengthMissing({ material, allowable }: Subject): string {
  const heat = allowable.factors.find(({ id }) => id === 'temperature')!;
  if (heat.value === null) return `Not known: ${heat.note ?? heat.label}.`;
  const gap = material.gaps?.tensileStrength;
  return `Not known: no tensile strength of ${material.shortName} was found${gap ? ` (${gap})` : ''}.`;
}

function liftFigure(subject: Subject): Figure {
  const { forces, trouble } = subject;
  const known = forces && !trouble;
  return plainFigure({
    id: 'lift-force',
    label: 'Force that lifts the pawl',
    unit: 'N',
    value: known ? forces.lift : null,
    handbook: forces?.handbookLift ?? null,
    because: known
      ? `At its end, by the whole overlap.${forces.inRange ? '' : ' Past the range of the secant modulus: an upper bound.'}`
      : missing(subject),
    source: source.PAWL,
  });
}

function drawFigure(subject: Subject): Figure {
  const { p, forces, material, trouble } = subject;
  const draw = forces && !trouble ? forces.draw : null;
  const value = finite(draw?.value);
  const locks = draw !== null && value === null;
  return judgedFigure({
    id: 'draw-force',
    label: 'Pull to draw it tighter',
    unit: 'N',
    value,
    handbook: finite(forces?.draw.handbook),
    low: finite(draw?.low),
    high: finite(draw?.high),
    limit: HAND_LIMIT,
    verdict: locks ? 'over-limit' : judge(value, HAND_LIMIT),
    because: locks
      ? `Locks: at friction ${material.friction.value} ramps of ${rampAngle(p).toFixed(0)}° do not slide. Shallower teeth or a longer pitch.`
      : draw
        ? `Over ramps of ${rampAngle(p).toFixed(0)}°, friction ${material.friction.low} to ${material.friction.high}, without the tension of the bundle.`
        : missing(subject),
    source: source.WEDGE,
  });
}

function tabFigure(subject: Subject): Figure[] {
  const { p, forces, trouble } = subject;
  if (p.release !== 'tab') return [];
  const known = forces && !trouble;
  return [
    judgedFigure({
      id: 'release-force',
      label: 'Finger on the tab to release',
      unit: 'N',
      value: known ? forces.tab : null,
      limit: FINGER_LIMIT,
      because: known
        ? `Tips the tab towards the entry until the pawl clears the teeth by ${formatQuantity(engagement(p), 'mm')}; draw the strap a little tighter first. A finger gives ${FINGER_LIMIT} N with ease (common practice).`
        : missing(subject),
      source: source.TAB,
    }),
  ];
}

const WEAKEST = {
  teeth: 'the teeth shear off: more teeth on the pawl, a wider band or a longer pitch',
  pawl: 'the pawl crumples: a thicker one',
  band: 'the band tears: a thicker or wider one',
} as const;

function breakFigure(subject: Subject): Figure {
  const { p, hold } = subject;
  const common = {
    id: 'break-load',
    label: 'Pull that breaks it',
    unit: 'N',
    limit: RESERVE * p.pull,
    limitKind: 'min',
    source: source.RESERVE,
  } as const;
  if (!hold) return judgedFigure({ ...common, because: strengthMissing(subject) });
  return judgedFigure({
    ...common,
    value: hold.least,
    because: `First ${WEAKEST[hold.weakest]} helps. Short-time; it should be ${RESERVE} times the intended ${formatQuantity(p.pull, 'N')}. Held for weeks, plastics creep and break at much less.`,
  });
}

function partFigures(subject: Subject): Figure[] {
  const { p, hold } = subject;
  const reason = (known: string) => (hold ? known : strengthMissing(subject));
  const part = (given: Pick<Figure, 'id' | 'label' | 'source' | 'because'> & Partial<Figure>) =>
    plainFigure({ ...given, unit: 'N', because: reason(given.because) });
  return [
    part({
      id: 'tooth-load',
      label: 'Pull that shears the teeth',
      ...(hold && {
        value: hold.teeth.value,
        low: hold.teeth.low,
        high: hold.teeth.high,
        handbook: hold.teeth.handbook,
      }),
      because: `${p.pawlTeeth} on the pawl; from the first alone to all alike, each after the first counted half.`,
      source: source.TOOTH,
    }),
    part({
      id: 'pawl-load',
      label: 'Pull that crumples the pawl',
      value: hold?.pawl ?? null,
      because: 'It props the pull beside its middle, held down by the band at its end.',
      source: source.PROP,
    }),
    part({
      id: 'band-load',
      label: 'Pull that tears the band',
      ...(hold && { value: hold.band.value, low: hold.band.brittle, high: hold.band.value }),
      because: 'Core of the band; a notch-sensitive plastic tears at the tooth roots, the lower figure.',
      source: source.BAND,
    }),
  ];
}

function sizeFigures({ p }: Subject): Figure[] {
  const { band, head } = layoutOf(p);
  return [
    plainFigure({
      id: 'click',
      label: 'One click in diameter',
      unit: 'mm',
      value: p.pitch / Math.PI,
      because:
        'Pitch over pi: how finely the bundle is drawn tight; after the last click it springs back up to this.',
      source: source.GEOMETRY,
    }),
    plainFigure({
      id: 'overall-length',
      label: 'Overall length',
      unit: 'mm',
      value: band + head,
      because: 'Laid straight, with a free end to grip on the largest bundle.',
      source: source.GEOMETRY,
    }),
  ];
}

export const forceFigures = (subject: Subject): Figure[] => [
  liftFigure(subject),
  drawFigure(subject),
  ...tabFigure(subject),
  breakFigure(subject),
  ...partFigures(subject),
  ...sizeFigures(subject),
];
