import { allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { clearanceFor } from '@/lib/printing/clearance';
import { formatQuantity } from '@/lib/units';
import { markFigure, placeInLadder } from '../coupon';
import { type Curve, type Figure, judgedFigure, plainFigure, type Report, report } from '../report';
import { PROFILE } from '../screw-sources';
import { holeRidge } from './layout';
import { clearancesOf, threadOf, type Values, widest } from './schema';
import * as source from './sources';

function expectedFigure(p: Values, material: Material): Figure {
  const expected = clearanceFor(material, 'slip');
  const common = { id: 'slip-clearance', label: 'Expected clearance a side', unit: 'mm' } as const;
  if (!expected) {
    const because = `Not known: ${material.shortName} is moulded, and this coupon is printed.`;
    return judgedFigure({ ...common, because, source: source.NO_TABLE });
  }
  const { verdict, because } = placeInLadder(clearancesOf(p), expected.value);
  return judgedFigure({
    ...common,
    value: expected.value,
    limit: widest(p),
    verdict,
    because: `That of a slip fit. ${because}`,
    source: expected.source,
  });
}

/** Share of the thread's depth that still overlaps at a clearance. */
const overlapShare = (p: Values, clearance: number): number => {
  const { engagement } = threadOf(p);
  return (engagement - clearance) / engagement;
};

function overlapFigure(p: Values): Figure {
  return judgedFigure({
    id: 'least-overlap',
    label: 'Overlap left in the widest hole',
    unit: 'ratio',
    value: overlapShare(p, widest(p)),
    limit: 0.5,
    limitKind: 'min',
    verdict: overlapShare(p, widest(p)) >= 0.5 ? 'within-limit' : 'close-to-limit',
    because:
      'Share of the depth at which stud and hole still overlap. A ladder may go under it to show a thread that strips.',
    source: source.OVERLAP,
  });
}

function sizeFigures(p: Values): Figure[] {
  const thread = threadOf(p);
  const common = { unit: 'mm', source: PROFILE[p.profile] } as const;
  return [
    plainFigure({
      ...common,
      id: 'pitch-diameter',
      label: 'Pitch diameter of the stud',
      value: thread.pitchDiameter,
      because: 'Of the profile, without clearance: the holes take all of it.',
    }),
    plainFigure({
      ...common,
      id: 'engagement-depth',
      label: 'Depth of engagement without clearance',
      value: thread.engagement,
      because: 'On the radius.',
    }),
    plainFigure({
      id: 'turns-tried',
      label: 'Turns of thread in a hole',
      unit: 'turns',
      value: holeRidge(p, p.firstClearance).turns,
      because: 'Between the half-height points of the ridge in the first hole.',
      source: source.GEOMETRY,
    }),
    plainFigure({
      id: 'steps',
      label: 'Clearances tried',
      unit: 'mm',
      value: widest(p) - p.firstClearance,
      low: p.firstClearance,
      high: widest(p),
      because: `From ${formatQuantity(p.firstClearance, 'mm')} to ${formatQuantity(widest(p), 'mm')} a side in ${p.holes} steps; the figures are hundredths of a millimetre.`,
      source: source.GEOMETRY,
    }),
  ];
}

function overlapCurve(p: Values): Curve {
  return {
    id: 'overlap-over-clearance',
    label: 'Overlap over clearance',
    x: { label: 'Clearance a side', unit: 'mm' },
    y: { label: 'Share of the depth', unit: 'ratio' },
    points: clearancesOf(p).map((clearance) => [clearance, overlapShare(p, clearance)] as const),
  };
}

/** Report of a coupon: whether the clearance sought lies inside its ladder. */
export function check(p: Values, material: Material, use: Use): Report {
  return report({
    governing: 'slip-clearance',
    headline: ['steps', 'least-overlap', 'turns-tried'],
    figures: [expectedFigure(p, material), overlapFigure(p), ...sizeFigures(p), ...markFigure(p)],
    curves: [overlapCurve(p)],
    allowable: allowableStrain(material, use),
  });
}
