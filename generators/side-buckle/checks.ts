import type { Material, Use } from '@/lib/materials/types';
import { type Curve, type Report, report } from '../report';
import { forceFigures } from './force-figures';
import { holdFigures } from './hold-figures';
import { leadRun } from './layout';
import type { Values } from './schema';
import { strainFigures } from './strain-figures';
import { type Subject, subjectOf } from './subject';

/** Push over travel: up the lead-in in proportion, over the pads by friction alone, then the arms snap out. */
function pushCurve({ p, forces, material, trouble }: Subject): Curve[] {
  if (!forces || trouble || !Number.isFinite(forces.mating.high)) return [];
  const { mating, entry } = forces;
  const slide = (mu: number) => 2 * mu * entry;
  const { low, value, high } = material.friction;
  const rise = leadRun(p);
  const end = rise + p.padLength;
  return [
    {
      id: 'push-over-travel',
      label: 'Push to close over travel',
      x: { label: 'Travel', unit: 'mm' },
      y: { label: 'Push', unit: 'N' },
      points: [
        [0, 0],
        [rise, mating.value],
        [rise, slide(value)],
        [end, slide(value)],
        [end, 0],
      ],
      band: [
        [0, 0],
        [mating.low, mating.high],
        [slide(low), slide(high)],
        [slide(low), slide(high)],
        [0, 0],
      ],
    },
  ];
}

/** Report of a side buckle. */
export function check(p: Values, material: Material, use: Use): Report {
  const subject = subjectOf(p, material, use);
  return report({
    governing: 'peak-strain',
    headline: ['squeeze-force', 'mating-force', 'break-load'],
    figures: [...strainFigures(subject), ...forceFigures(subject), ...holdFigures(subject)],
    curves: pushCurve(subject),
    allowable: subject.allowable,
  });
}
