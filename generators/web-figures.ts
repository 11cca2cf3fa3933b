import type { AllowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import {
  DRAWN_RANGE,
  elasticLength,
  type Fold,
  type FoldedWeb,
  foldRegime,
  foldWeb,
  holdingMoment,
} from '@/lib/mechanics/web-fold';
import { formatQuantity } from '@/lib/units';
import { type Figure, judge, judgedFigure, plainFigure } from './report';
import * as source from './web-sources';

/** What the figures of a folded web are made from, whatever it joins. */
export interface WebSubject {
  readonly fold: Fold;
  /** along the fold line, mm */
  readonly width: number;
  readonly layerHeight: number;
  readonly material: Material;
  readonly use: Use;
  readonly allowable: AllowableStrain;
  readonly folded: FoldedWeb;
  readonly drawn: boolean;
}

type Given = Omit<WebSubject, 'folded' | 'drawn'>;

export function webSubject(given: Given): WebSubject {
  const folded = foldWeb(given.fold);
  const drawn = foldRegime(folded, given.material, given.allowable.value) === 'drawn';
  return { ...given, folded, drawn };
}

/** Id of the figure that judges the web. */
export const webGoverning = ({ drawn }: WebSubject): string => (drawn ? 'drawn-strain' : 'peak-strain');

function peakStrain({ material, allowable, folded, drawn }: WebSubject): Figure {
  const { strain, nominal } = folded;
  const common = {
    id: 'peak-strain',
    label: 'Peak strain in the web',
    unit: 'strain',
    handbook: nominal,
  } as const;
  if (!strain) {
    const because =
      'Not known: with this recess the leaves cannot be pressed face to face without the web touching itself or being torn. Change the recess or let the leaves stand apart.';
    return judgedFigure({ ...common, because, source: source.ELASTICA });
  }
  if (drawn) {
    const because = `${material.shortName} draws at the first fold, so an elastic limit does not apply to the web; see the drawn web below.`;
    return plainFigure({ ...common, value: strain.peak, because, source: source.STRIP });
  }
  const where = strain.end >= strain.middle ? 'at the end of the fillet' : 'in the middle of the web';
  const because = `Highest ${where}: the fillet concentrates by ${folded.filletFactor.toFixed(2)} and the fold spreads over ${folded.bendingLength.toFixed(2)} mm.`;
  return judgedFigure({
    ...common,
    value: strain.peak,
    limit: allowable.value,
    because,
    source: source.STRIP,
  });
}

/** Why a web that must draw cannot be judged by the drawn range; null where it can. */
function notDrawn({ material, use, allowable, folded }: WebSubject): string | null {
  if (!folded.shape) return 'this recess does not let the leaves be pressed face to face';
  if (use.layers === 'across' && material.process === 'printed') {
    return 'the fold pulls the layers apart, and such a web tears before it draws. Print it lying flat';
  }
  return allowable.value === null ? allowable.because.replace(/^Not known: |\.$/g, '') : null;
}

function drawnReason(value: number | null): string {
  const low = formatQuantity(DRAWN_RANGE.low, 'strain');
  if (value === null || value > DRAWN_RANGE.high) {
    return 'Past what drawn webs work at: it tears instead of thinning. Lengthen the web or make it thinner.';
  }
  return value < DRAWN_RANGE.low
    ? `Under ${low} the web yields in places without drawing evenly: shorten it, or lengthen it until it stays elastic.`
    : 'Fold it a few times while still warm from the bed: the web whitens, thins and lasts.';
}

function drawnStrain(subject: WebSubject): Figure {
  const { material, folded, drawn } = subject;
  const { nominal, shape } = folded;
  const value = shape ? nominal * Math.max(shape.middle, shape.exit) : null;
  const common = {
    id: 'drawn-strain',
    label: 'Drawn web, nominal strain',
    unit: 'strain',
    value,
    handbook: nominal,
    source: source.DRAWN,
  } as const;
  if (!drawn) {
    const because = material.drawsWhenFolded
      ? 'The web stays elastic: it does not need to draw.'
      : `${material.shortName} does not draw into a lasting hinge; only the elastic verdict counts.`;
    return plainFigure({ ...common, because });
  }
  const limit = DRAWN_RANGE.high;
  const gap = notDrawn(subject);
  if (gap !== null) {
    return judgedFigure({ ...common, limit, verdict: 'not-known', because: `Not known: ${gap}.` });
  }
  const thin = value !== null && value < DRAWN_RANGE.low;
  const verdict = thin ? 'close-to-limit' : judge(value, limit);
  return judgedFigure({ ...common, limit, verdict, because: drawnReason(value) });
}

/** Peak and drawn strain: one of them judges the web. */
export const webStrainFigures = (subject: WebSubject): readonly [peak: Figure, drawn: Figure] => [
  peakStrain(subject),
  drawnStrain(subject),
];

export function webLengthFigures({ fold, folded, allowable }: WebSubject): Figure[] {
  const { strain, nominal } = folded;
  const limit = allowable.value;
  const length = limit === null ? null : elasticLength(fold, limit);
  return [
    plainFigure({
      id: 'web-strain',
      label: 'Strain in the middle of the web',
      unit: 'strain',
      value: strain?.middle ?? null,
      handbook: nominal,
      because: 'Away from the fillets; the handbook figure is the plain strip t theta / (2 L).',
      source: source.STRIP,
    }),
    plainFigure({
      id: 'allowable-strain',
      label: 'Allowable strain',
      unit: 'strain',
      value: limit,
      because: allowable.because,
      source: allowable.factors[0]!.source,
    }),
    plainFigure({
      id: 'elastic-web-length',
      label: 'Web length that would stay elastic',
      unit: 'mm',
      value: length?.corrected ?? null,
      handbook: length?.handbook ?? null,
      because: length
        ? 'A web this long folds within the allowable strain, leaves standing apart.'
        : 'Not known: the allowable strain is not known.',
      source: source.ELASTIC_LENGTH,
    }),
  ];
}

export function webMoment({ fold, width, material, drawn }: WebSubject): Figure {
  const moment = holdingMoment(fold, width, material);
  const common = {
    id: 'fold-moment',
    label: 'Moment to hold the fold',
    unit: 'Nmm',
    source: source.MOMENT,
  } as const;
  if (!moment) return plainFigure({ ...common, because: 'Not known: the modulus is not known.' });
  const yields = moment.plastic !== null && moment.plastic < moment.elastic;
  const known = yields || moment.inRange;
  const because = yields
    ? 'The web yields through: the moment is held at the plastic moment; a drawn web needs less after the first folds.'
    : known
      ? 'Elastic, with the secant modulus at the nominal strain and plane-strain stiffness.'
      : 'Not known: the strain is past the range of the secant modulus and no yield stress is known.';
  const value = known ? Math.min(moment.elastic, moment.plastic ?? Number.POSITIVE_INFINITY) : null;
  return plainFigure({ ...common, value, handbook: drawn ? null : moment.handbook, because });
}

/** Folds asked of a hinge, by how often it is used. */
const FOLDS: Readonly<Record<Use['opening'], number>> = { once: 1, sometimes: 100, often: 1000 };

const ENDURANCE = {
  id: 'fold-endurance',
  label: 'Fold endurance',
  unit: 'cycles',
  limitKind: 'min',
} as const;

function drawnEndurance({ material, use }: WebSubject, web: Figure): Figure {
  const common = { ...ENDURANCE, limit: FOLDS[use.opening], source: source.ENDURANCE };
  if (web.verdict === 'not-known') return judgedFigure({ ...common, because: web.because });
  if (web.verdict === 'over-limit') {
    const because = 'Not known: the folding test was of webs that draw, and this one is strained past that.';
    return judgedFigure({ ...common, because });
  }
  const { class: tested, because } = material.foldEndurance;
  if (tested !== 'long-life') return judgedFigure({ ...common, because: `Not known: ${because}` });
  const value = 1_000_000;
  const told = `${because} Ranking only: prove it with a test hinge.`;
  return judgedFigure({ ...common, value, low: value, because: told });
}

export function webEndurance(subject: WebSubject, web: Figure): Figure {
  const { material, use, folded, allowable, drawn } = subject;
  if (drawn) return drawnEndurance(subject, web);
  const common = { ...ENDURANCE, limit: FOLDS[use.opening] };
  const peak = folded.strain?.peak ?? null;
  if (peak !== null && allowable.value !== null && peak <= allowable.value) {
    const because = 'The web stays elastic: such hinges last several thousand folds.';
    return judgedFigure({ ...common, low: 1000, verdict: 'within-limit', because, source: source.CLASSES });
  }
  const tested = material.foldEndurance;
  if (tested.class === 'unknown' || peak === null || allowable.value === null) {
    return judgedFigure({ ...common, because: `Not known: ${tested.because}`, source: tested.source });
  }
  const verdict = use.opening === 'once' ? null : 'over-limit';
  const because = `${tested.because} Past its allowable strain this web cracks early.`;
  return { ...plainFigure({ ...common, high: 1000, because, source: source.ENDURANCE }), verdict };
}

export function webLayers({ fold, layerHeight }: WebSubject): Figure {
  const layers = fold.web.thickness / layerHeight;
  const whole = Math.abs(layers - Math.round(layers)) < 0.02;
  const enough = Math.round(layers) >= 2;
  const nearest = Math.max(2, Math.round(layers)) * layerHeight;
  return judgedFigure({
    id: 'web-layers',
    label: 'Web in layers',
    unit: 'count',
    value: layers,
    limit: 2,
    limitKind: 'min',
    verdict: !enough ? 'over-limit' : whole ? 'within-limit' : 'close-to-limit',
    because:
      whole && enough
        ? 'A whole number of layers, lying along the web; run the strands across the fold line.'
        : `Not ${enough ? 'a whole number of' : 'two whole'} layers: ${nearest.toFixed(2)} mm prints as designed.`,
    source: source.LAYERS,
  });
}

/** For a web printed in the air between what it joins. */
export function webBridge({ fold }: WebSubject): Figure {
  const { length } = fold.web;
  return judgedFigure({
    id: 'bridge-span',
    label: 'Bridge under the web',
    unit: 'mm',
    value: length,
    limit: 10,
    verdict: length <= 5 ? 'within-limit' : length <= 10 ? 'close-to-limit' : 'over-limit',
    because: 'The recessed web is printed in the air between the leaves.',
    source: source.BRIDGE,
  });
}
