import type { Material, Use } from '@/lib/materials/types';
import { type Figure, plainFigure, type Report, report } from '../report';
import { curves } from './curves';
import { forceFigures } from './force-figures';
import { stripLayout } from './layout';
import { largestBundle } from './mechanics';
import type { PegStrap } from './schema';
import * as source from './sources';
import { strainFigures } from './strain-figures';
import { subjectOf } from './subject';

const LAP =
  'The strip laps itself as a spiral; on a hard round bundle, where it steps up only at the lap, it holds up to one thickness more.';
const TURNED =
  'Round bundle that passes the loop; opposite the peg the strip stands on edge and takes half its width.';

function bundleFigures(values: PegStrap): Figure[] {
  const { strapThickness, halfTurn, eyeCount } = values;
  const figure = (id: string, label: string, value: number, eye: string): Figure =>
    plainFigure({
      id,
      label,
      unit: 'mm',
      value,
      ...(!halfTurn && { low: value, high: value + strapThickness }),
      because: `${eye} ${halfTurn ? TURNED : LAP}`,
      source: halfTurn ? source.HALF_TURN : source.SPIRAL,
    });
  const last = eyeCount === 1 ? 'The one eye.' : `Eye ${eyeCount}, the farthest from the peg.`;
  return [
    figure('smallest-bundle', 'Smallest bundle', values.bundleDiameter, 'Eye 1, nearest the peg.'),
    figure('largest-bundle', 'Largest bundle', largestBundle(values), last),
  ];
}

function lengthFigure(values: PegStrap): Figure {
  const { from, to, eyes } = stripLayout(values);
  return plainFigure({
    id: 'strap-length',
    label: 'Length of the strip',
    unit: 'mm',
    value: to - from,
    because: `Half a width behind the peg, ${eyes[0]!.toFixed(1)} mm to the first eye, and one width past the last eye to hold it by.`,
    source: source.SPIRAL,
  });
}

/** Report of a peg strap. */
export function check(values: PegStrap, material: Material, use: Use): Report {
  const subject = subjectOf(values, material, use);
  return report({
    governing: 'peak-strain',
    headline: ['push-in-force', 'release-force', 'largest-bundle'],
    figures: [
      ...strainFigures(subject),
      ...forceFigures(subject),
      ...bundleFigures(values),
      lengthFigure(values),
    ],
    curves: curves(subject),
    allowable: subject.allowable,
  });
}
