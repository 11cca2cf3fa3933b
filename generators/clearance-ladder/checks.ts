import { allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { clearanceFor, type Fit } from '@/lib/printing/clearance';
import { formatQuantity } from '@/lib/units';
import { markFigure, placeInLadder } from '../coupon';
import { type Curve, type Figure, judgedFigure, plainFigure, type Report, report } from '../report';
import { gapsOf, type Values, widestGap } from './schema';
import * as source from './sources';

function fitFigure(p: Values, material: Material, fit: Exclude<Fit, 'press'>): Figure {
  const expected = clearanceFor(material, fit);
  const common = { id: `${fit}-gap`, label: `Expected gap a side, ${fit} fit`, unit: 'mm' } as const;
  if (!expected) {
    const because = `Not known: ${material.shortName} is moulded, and this coupon is printed.`;
    return fit === 'slip'
      ? judgedFigure({ ...common, because, source: source.NO_TABLE })
      : plainFigure({ ...common, because, source: source.NO_TABLE });
  }
  const place = placeInLadder(gapsOf(p), expected.value);
  const given = { ...common, value: expected.value, because: place.because, source: expected.source };
  return fit === 'slip'
    ? judgedFigure({ ...given, limit: widestGap(p), verdict: place.verdict })
    : plainFigure(given);
}

function gapCurve(p: Values): Curve {
  return {
    id: 'gap-over-hole',
    label: 'Gap a side, hole by hole',
    x: { label: 'Hole', unit: 'count' },
    y: { label: 'Gap a side', unit: 'mm' },
    points: gapsOf(p).map((gap, at) => [at + 1, gap] as const),
  };
}

/** Report of a coupon: whether the fits sought lie inside its ladder. */
export function check(p: Values, material: Material, use: Use): Report {
  const gaps = gapsOf(p);
  return report({
    governing: 'slip-gap',
    headline: ['snug-gap', 'free-gap', 'steps'],
    figures: [
      fitFigure(p, material, 'slip'),
      fitFigure(p, material, 'snug'),
      fitFigure(p, material, 'free'),
      plainFigure({
        id: 'steps',
        label: 'Gaps tried',
        unit: 'mm',
        value: gaps.at(-1)! - gaps[0]!,
        low: gaps[0]!,
        high: gaps.at(-1)!,
        because: `From ${formatQuantity(gaps[0]!, 'mm')} to ${formatQuantity(gaps.at(-1)!, 'mm')} a side in ${p.holes} steps; the figures are hundredths of a millimetre.`,
        source: source.GEOMETRY,
      }),
      judgedFigure({
        id: 'wall-between',
        label: 'Wall between the widest holes',
        unit: 'mm',
        value: p.wall,
        limit: 1.2,
        limitKind: 'min',
        because: 'Thin walls give and make a hole seem wider than it is.',
        source: source.WALL,
      }),
      ...markFigure(p),
    ],
    curves: [gapCurve(p)],
    allowable: allowableStrain(material, use),
  });
}
