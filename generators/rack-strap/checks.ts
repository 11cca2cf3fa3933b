import type { Material, Use } from '@/lib/materials/types';
import { type Curve, type Report, report } from '../report';
import { forceFigures } from './force-figures';
import { pawlStrain, toothShear, wrapOn } from './mechanics';
import { parameters, type Values } from './schema';
import { strainFigures } from './strain-figures';
import { type Subject, subjectOf } from './subject';

const STEPS = 16;

/** Pull that shears the teeth over how many the pawl has. */
function teethCurve({ p, material, hold }: Subject): Curve[] {
  const strength = material.tensileStrength?.value;
  const { max } = parameters.fields.pawlTeeth as { max: number };
  if (!hold || !strength) return [];
  const loads = Array.from({ length: max }, (_, i) => toothShear(p, strength, i + 1));
  return [
    {
      id: 'pull-over-teeth',
      label: 'Pull that shears the teeth over teeth on the pawl',
      x: { label: 'Teeth on the pawl', unit: 'count' },
      y: { label: 'Pull', unit: 'N' },
      points: loads.map(({ value }, i) => [i + 1, value] as const),
      band: loads.map(({ low, high }) => [low, high] as const),
    },
  ];
}

/** Strain of the band over the bundle, from the smallest to three times it. */
function wrapCurve({ p, wrap }: Subject): Curve[] {
  if (!wrap.inRange) return [];
  const bundles = Array.from({ length: STEPS + 1 }, (_, i) => p.smallestBundle * (1 + (2 * i) / STEPS));
  return [
    {
      id: 'strain-over-bundle',
      label: 'Peak strain of the band over the bundle',
      x: { label: 'Bundle diameter', unit: 'mm' },
      y: { label: 'Peak strain', unit: 'strain' },
      points: bundles.map((bundle) => [bundle, wrapOn(p, bundle).peak] as const),
    },
  ];
}

/** Report of a rack strap. */
export function check(p: Values, material: Material, use: Use): Report {
  const subject = subjectOf(p, material, use);
  const { wrap, pawl, trouble } = subject;
  const bandGoverns = trouble === null && (!wrap.inRange || wrap.peak >= pawlStrain(p, pawl));
  return report({
    governing: bandGoverns ? 'wrap-strain' : 'pawl-strain',
    headline: ['draw-force', p.release === 'tab' ? 'release-force' : 'break-load', 'least-bundle'],
    figures: [...strainFigures(subject), ...forceFigures(subject)],
    curves: [...wrapCurve(subject), ...teethCurve(subject)],
    allowable: subject.allowable,
  });
}
