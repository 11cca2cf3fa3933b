import { FITTED_BASE, FITTED_RADIUS } from '@/lib/mechanics/toothed-strip';
import { formatQuantity } from '@/lib/units';
import { type Figure, judgedFigure, plainFigure } from '../report';
import { engagement, layoutOf } from './layout';
import { bundleFor, pawlStrain } from './mechanics';
import * as source from './sources';
import type { Subject } from './subject';

const mm = (value: number): string => formatQuantity(value, 'mm');

function pawlFigure({ p, pawl, allowable, trouble }: Subject): Figure {
  return judgedFigure({
    id: 'pawl-strain',
    label: 'Peak strain of the pawl at each click',
    unit: 'strain',
    value: trouble ? null : pawlStrain(p, pawl),
    handbook: pawl.handbook,
    limit: allowable.value,
    because: trouble
      ? `Not known: ${trouble}.`
      : `Lifted by ${mm(engagement(p))} over each tooth, most at its root. A longer or thinner pawl strains less.`,
    source: source.PAWL,
  });
}

const OUT_OF_RANGE = `Not known: the factor for the teeth holds for root radii of ${FITTED_RADIUS.join(' to ')} and tooth bases of ${FITTED_BASE.join(' to ')} band thicknesses.`;

function wrapFigure({ p, wrap, allowable }: Subject): Figure {
  return judgedFigure({
    id: 'wrap-strain',
    label: 'Peak strain of the band on the smallest bundle',
    unit: 'strain',
    value: wrap.inRange ? wrap.peak : null,
    handbook: wrap.plain,
    limit: allowable.value,
    because: wrap.inRange
      ? `At the tooth roots: teeth hardly bend, so the band between them takes their turn, ${wrap.factor.toFixed(1)} times the plain band; the head of ${mm(layoutOf(p).head)} stays straight${p.printedAs === 'curved' ? ', and the curve it is printed with is taken off' : ''}. Thinner band, larger root radius, softer plastic.`
      : OUT_OF_RANGE,
    source: source.WRAP,
  });
}

function bundleFigure({ p, wrap, allowable }: Subject): Figure {
  const limit = allowable.value;
  return plainFigure({
    id: 'least-bundle',
    label: 'Smallest bundle for this band',
    unit: 'mm',
    value: limit === null || !wrap.inRange ? null : bundleFor(p, limit),
    handbook: limit === null ? null : (p.bandThickness * (1 - limit)) / limit,
    because:
      limit === null
        ? allowable.because
        : wrap.inRange
          ? 'Diameter on which the tooth roots just meet the allowable strain; the plain figure leaves teeth, head and printed curve out.'
          : OUT_OF_RANGE,
    source: source.WRAP,
  });
}

export const strainFigures = (subject: Subject): Figure[] => [
  wrapFigure(subject),
  pawlFigure(subject),
  plainFigure({
    id: 'allowable-strain',
    label: 'Allowable strain',
    unit: 'strain',
    value: subject.allowable.value,
    because: subject.allowable.because,
    source: subject.allowable.factors[0]!.source,
  }),
  bundleFigure(subject),
];
