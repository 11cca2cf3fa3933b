import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { FREE_SEPARATION } from '@/lib/mechanics/fold';
import { stripStrain, webStrain } from '@/lib/mechanics/web';
import { degrees, formatQuantity, radians } from '@/lib/units';
import { type Curve, type Figure, judge, judgedFigure, plainFigure, type Report, report } from '../report';
import {
  DRAWN_RANGE,
  elasticWebLength,
  type HingeMechanics,
  hingeMechanics,
  holdingMoment,
  regime,
} from './mechanics';
import type { Values } from './schema';
import * as source from './sources';
import { pressedShut, webOf } from './web';

interface Context {
  readonly p: Values;
  readonly material: Material;
  readonly use: Use;
  readonly allowable: AllowableStrain;
  readonly mechanics: HingeMechanics;
  readonly drawn: boolean;
}

function peakStrain({ material, allowable, mechanics, drawn }: Context): Figure {
  const { strain, nominal } = mechanics;
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
  const because = `Highest ${where}: the fillet concentrates by ${mechanics.filletFactor.toFixed(2)} and the fold spreads over ${mechanics.bendingLength.toFixed(2)} mm.`;
  return judgedFigure({
    ...common,
    value: strain.peak,
    limit: allowable.value,
    because,
    source: source.STRIP,
  });
}

function drawnStrain({ material, mechanics, drawn }: Context): Figure {
  const { nominal, strain, shape } = mechanics;
  const value = shape ? nominal * Math.max(shape.middle, shape.exit) : null;
  const common = { id: 'drawn-strain', label: 'Drawn web, nominal strain', unit: 'strain' } as const;
  if (!drawn) {
    const because = material.drawsWhenFolded
      ? 'The web stays elastic: it does not need to draw.'
      : `${material.shortName} does not draw into a lasting hinge; only the elastic verdict counts.`;
    return plainFigure({ ...common, value, handbook: nominal, because, source: source.DRAWN });
  }
  const thin = value !== null && value < DRAWN_RANGE.low;
  const because = thin
    ? `Under ${formatQuantity(DRAWN_RANGE.low, 'strain')} the web yields in places without drawing evenly: shorten it, or lengthen it until it stays elastic.`
    : 'Fold it a few times while still warm from the bed: the web whitens, thins and lasts.';
  const verdict = strain && thin ? 'close-to-limit' : judge(value, DRAWN_RANGE.high);
  return judgedFigure({
    ...common,
    value,
    handbook: nominal,
    limit: DRAWN_RANGE.high,
    verdict,
    because,
    source: source.DRAWN,
  });
}

function webFigures(context: Context): Figure[] {
  const { p, mechanics, allowable } = context;
  const { strain, nominal } = mechanics;
  const limit = allowable.value;
  const length = limit === null ? null : elasticWebLength(p, limit);
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

function momentFigure({ p, material, drawn }: Context): Figure {
  const moment = holdingMoment(p, material);
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

function enduranceFigure({ material, use, mechanics, allowable, drawn }: Context): Figure {
  const common = { id: 'fold-endurance', label: 'Fold endurance', unit: 'cycles' } as const;
  const peak = mechanics.strain?.peak ?? null;
  const elastic = peak !== null && allowable.value !== null && peak <= allowable.value;
  const tested = material.foldEndurance;
  if (tested.class === 'long-life' && (drawn || elastic)) {
    const value = drawn ? 1_000_000 : null;
    const because = `${tested.because} ${drawn ? '' : 'Within the allowable strain.'} Ranking only: prove it with a test hinge.`;
    return judgedFigure({
      ...common,
      value,
      low: value ?? 1000,
      verdict: 'within-limit',
      because,
      source: source.ENDURANCE,
    });
  }
  if (elastic) {
    const because = 'The web stays elastic: such hinges last several thousand folds.';
    return judgedFigure({ ...common, low: 1000, verdict: 'within-limit', because, source: source.CLASSES });
  }
  if (tested.class === 'unknown' || peak === null) {
    return judgedFigure({ ...common, because: `Not known: ${tested.because}`, source: tested.source });
  }
  const verdict = use.opening === 'once' ? null : 'over-limit';
  const because = `${tested.because} Past its allowable strain this web cracks early.`;
  return { ...plainFigure({ ...common, high: 1000, because, source: source.ENDURANCE }), verdict };
}

function meetingFigure({ p, mechanics }: Context): Figure {
  const value = degrees(mechanics.meetingAngle);
  const meets = value < p.foldAngle;
  const because = pressedShut(p)
    ? `The leaves are pressed face to face; the web exits stand ${mechanics.separation.toFixed(2)} of its length apart, an even fold wants ${FREE_SEPARATION.toFixed(2)}.`
    : meets
      ? 'The leaf edges meet before the fold is reached and then force the web: lengthen the web or reduce what lies inside the fold.'
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

function printFigures({ p }: Context): Figure[] {
  const layers = p.webThickness / p.layerHeight;
  const whole = Math.abs(layers - Math.round(layers)) < 0.02;
  const enough = Math.round(layers) >= 2;
  const nearest = Math.max(2, Math.round(layers)) * p.layerHeight;
  const figures: Figure[] = [
    judgedFigure({
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
    }),
  ];
  if (p.webRelief <= 0) return figures;
  const bridge = judgedFigure({
    id: 'bridge-span',
    label: 'Bridge under the web',
    unit: 'mm',
    value: p.webLength,
    limit: 10,
    verdict: p.webLength <= 5 ? 'within-limit' : p.webLength <= 10 ? 'close-to-limit' : 'over-limit',
    because: 'The recessed web is printed in the air between the leaves.',
    source: source.BRIDGE,
  });
  return [...figures, bridge];
}

const CURVE_STEPS = 24;

/** Strain of an even bend over the fold angle. */
function strainCurve({ p }: Context): Curve {
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
function lengthCurve({ p }: Context): Curve {
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
  const drawn = regime(p, material, allowable) === 'drawn';
  const context: Context = { p, material, use, allowable, mechanics: hingeMechanics(p), drawn };
  return report({
    governing: drawn ? 'drawn-strain' : 'peak-strain',
    headline: ['fold-moment', 'elastic-web-length', 'meeting-angle'],
    figures: [
      peakStrain(context),
      drawnStrain(context),
      ...webFigures(context),
      enduranceFigure(context),
      momentFigure(context),
      meetingFigure(context),
      ...printFigures(context),
    ],
    curves: [strainCurve(context), lengthCurve(context)],
    allowable,
  });
}
