import { formatQuantity } from '@/lib/units';
import { type Figure, judgedFigure, plainFigure } from '../report';
import * as source from './sources';
import type { Subject } from './subject';

const percent = (value: number): string => formatQuantity(value, 'strain');
const mm = (value: number): string => formatQuantity(value, 'mm');

const GOVERNS = {
  wrap: 'The bend round the smallest bundle governs: a thinner strap or a larger bundle lowers it.',
  twist: 'The half turn governs: a narrower strap or a longer loop lowers it.',
  'eye-bend':
    'The edge of the eyes governs, where the strip bends round the smallest bundle: a thinner strap lowers it.',
  eye: 'The eye stretched over the head governs: a head closer to the eye lowers it.',
  squeeze: 'The eye squeezed open governs: a head closer to the eye lowers it.',
} as const;

const TOO_WIDE =
  'Not known: a strip this wide for its loop folds instead of turning over. Make it narrower or the bundle larger.';

function peakFigure({ strain, allowable }: Subject): Figure {
  return judgedFigure({
    id: 'peak-strain',
    label: 'Peak strain in use',
    unit: 'strain',
    value: strain.peak,
    handbook: Math.max(strain.handbookWrap, strain.eye.mean),
    limit: allowable.value,
    because: strain.peak === null ? TOO_WIDE : GOVERNS[strain.governs],
    source: SOURCE_OF[strain.governs],
  });
}

const SOURCE_OF = {
  wrap: source.GEOMETRY,
  twist: source.HALF_TURN,
  'eye-bend': source.BENT_HOLE,
  eye: source.EYE,
  squeeze: source.SQUEEZE,
} as const;

function wrapFigure({ values, strain, allowable }: Subject): Figure {
  const { bundleDiameter, halfTurn } = values;
  const straight = `Faces of the strip on the smallest bundle of ${mm(bundleDiameter)}, outer stretched, inner squeezed.`;
  const turned = 'Sharpest bend of the loop with a half turn, which does not lie on the bundle all round.';
  return judgedFigure({
    id: 'wrap-strain',
    label: 'Wrap strain',
    unit: 'strain',
    value: strain.wrap,
    handbook: strain.handbookWrap,
    limit: allowable.value,
    because: strain.wrap === null ? TOO_WIDE : halfTurn ? turned : straight,
    source: halfTurn ? source.HALF_TURN : source.GEOMETRY,
  });
}

function twistFigure({ values, strain, allowable }: Subject): Figure[] {
  if (!values.halfTurn) return [];
  const { twist } = strain;
  const parts = twist
    ? `Half a turn, tightest opposite the peg: edges stretched ${percent(twist.edge)}, faces sheared ${percent(twist.shear)}, together with the bend.`
    : TOO_WIDE;
  return [
    judgedFigure({
      id: 'twist-strain',
      label: 'Strain of the half turn',
      unit: 'strain',
      value: twist?.peak ?? null,
      limit: allowable.value,
      because: parts,
      source: source.HALF_TURN,
    }),
  ];
}

function eyeBendFigure({ strain, allowable }: Subject): Figure {
  const { eyeBend } = strain;
  return judgedFigure({
    id: 'eye-bend-strain',
    label: 'Bend strain at the eyes',
    unit: 'strain',
    value: eyeBend?.pressed ?? null,
    handbook: null,
    low: eyeBend?.pressed ?? null,
    high: eyeBend?.free ?? null,
    limit: allowable.value,
    because: eyeBend
      ? 'The edge of an eye strains more than the plain strip where both follow the bundle; up to the higher figure where nothing presses the strip on.'
      : TOO_WIDE,
    source: source.BENT_HOLE,
  });
}

function eyeFigure({ values, strain, allowable }: Subject): Figure {
  const undercut = values.headDiameter - values.eyeDiameter;
  return judgedFigure({
    id: 'eye-strain',
    label: 'Eye strain over the head',
    unit: 'strain',
    value: strain.eye.peak,
    handbook: strain.eye.mean,
    limit: allowable.value,
    because: `The head is ${mm(undercut)} wider than the eye. Taken as rigid; if it gives like a disc the eye strains less. The eye is shorter than the reach of a tube's end, so it stretches through its whole depth.`,
    source: source.EYE,
  });
}

const RELEASE_REASON = {
  opens: (growth: string) =>
    `Squeezed across the strip until the eye is ${growth} longer, one edge slips over the head; the bore stretches beside the fingers.`,
  neck: () =>
    'Not known: squeezed, the eye closes on the neck before it is long enough. A thinner peg or a wider eye lets it open.',
  small: () =>
    'Not known: the eye is less than a fifth of the strap width, narrower than was checked. Lever the eye off by its tail.',
  folds: () =>
    'Not known: squeezed, the strip folds out of flat before the eye is long enough. Lever the eye off by its tail, or make the strap thicker.',
} as const;

export const releaseReason = ({ values, strain }: Subject): string =>
  RELEASE_REASON[strain.release](mm(values.headDiameter - values.eyeDiameter));

function squeezeFigure(subject: Subject): Figure {
  const { strain, allowable } = subject;
  const given = {
    id: 'release-strain',
    label: 'Eye strain when squeezed open',
    unit: 'strain',
    because: releaseReason(subject),
    source: source.SQUEEZE,
  } as const;
  return strain.release === 'opens'
    ? judgedFigure({ ...given, value: strain.squeeze, limit: allowable.value })
    : plainFigure(given);
}

function allowableFigures({ allowable, across }: Subject): Figure[] {
  return [
    plainFigure({
      id: 'allowable-strain',
      label: 'Allowable strain',
      unit: 'strain',
      value: allowable.value,
      because: allowable.because,
      source: allowable.factors[0]!.source,
    }),
    plainFigure({
      id: 'allowable-strain-peg',
      label: 'Allowable strain of the peg',
      unit: 'strain',
      value: across.value,
      because: `The peg stands upright on the bed and is pulled across its layers: ${across.because}`,
      source: across.factors.find(({ id }) => id === 'layers')!.source,
    }),
  ];
}

export const strainFigures = (subject: Subject): Figure[] => [
  peakFigure(subject),
  wrapFigure(subject),
  ...twistFigure(subject),
  eyeBendFigure(subject),
  eyeFigure(subject),
  squeezeFigure(subject),
  ...allowableFigures(subject),
];
