import type { Material, Use } from '@/lib/materials/types';
import { type Report, report } from '../report';
import { curvesOf } from './curves';
import { forceFigures } from './force-figures';
import type { HookValues } from './schema';
import { strainFigures } from './strain-figures';
import { subjectOf } from './subject';

export function check(values: HookValues, material: Material, use: Use): Report {
  const subject = subjectOf(values, material, use);
  return report({
    governing: 'peak-strain',
    headline: ['mating-force', 'separation-force', 'deflection-force'],
    figures: [...strainFigures(subject), ...forceFigures(subject)],
    curves: curvesOf(subject),
    allowable: subject.allowable,
  });
}
