import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import { secantModulus } from '@/lib/materials/secant';
import type { Material, Use } from '@/lib/materials/types';
import { type PushedArm, pushArm } from '@/lib/mechanics/standing-arm';
import { clearanceFor } from '@/lib/printing/clearance';
import { formatQuantity } from '@/lib/units';
import { markFigure } from '../coupon';
import { type Curve, type Figure, judgedFigure, plainFigure, type Report, report } from '../report';
import { cellsOf } from './layout';
import { markOf, strainsOf, type Values } from './schema';
import * as source from './sources';
import { flexibleArm } from './stops';

interface Context {
  readonly p: Values;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  readonly stops: readonly number[];
  readonly arms: readonly PushedArm[];
}

const plainStrain = (p: Values, stop: number): number => (1.5 * p.armThickness * stop) / p.armLength ** 2;

function endFigures({ p, allowable, stops, arms }: Context): Figure[] {
  const limit = allowable.value;
  const end = (at: number) => ({
    unit: 'strain' as const,
    value: arms.at(at)!.peak,
    handbook: plainStrain(p, stops.at(at)!),
    limit,
    source: source.ARM,
  });
  const [first, last] = [strainsOf(p)[0]!, strainsOf(p).at(-1)!];
  return [
    judgedFigure({
      id: 'first-strain',
      label: 'Mildest arm, peak strain',
      ...end(0),
      because:
        limit === null
          ? allowable.because
          : `Marked ${markOf(first)}. The ladder should begin with an arm that surely holds.`,
    }),
    judgedFigure({
      id: 'last-strain',
      label: 'Hardest arm, peak strain',
      ...end(-1),
      limitKind: 'min',
      because:
        limit === null
          ? allowable.because
          : `Marked ${markOf(last)}. It should go past what the plastic is said to allow, or the test ends before the answer.`,
    }),
  ];
}

function expectedFigure({ p, allowable, arms }: Context): Figure {
  const common = {
    id: 'expected-arm',
    label: 'Arms expected to hold',
    unit: 'count',
    source: source.COUNT,
  } as const;
  if (allowable.value === null) return plainFigure({ ...common, because: allowable.because });
  const value = arms.filter(({ peak }) => peak <= allowable.value!).length;
  const marked = value === 0 ? 'none' : `up to the one marked ${markOf(strainsOf(p)[value - 1]!)}`;
  return plainFigure({
    ...common,
    value,
    because: `Within ${formatQuantity(allowable.value, 'strain')}, the allowable strain of this use: ${marked}. What holds beyond it is your plastic's margin.`,
  });
}

function forceFigure({ material, arms, stops }: Context): Figure {
  const hardest = arms.at(-1)!;
  const modulus = secantModulus(material, hardest.nominal);
  const common = {
    id: 'deflection-force',
    label: 'Push on the hardest arm',
    unit: 'N',
    source: source.ARM,
  } as const;
  if (!modulus) return plainFigure({ ...common, because: 'Not known: the modulus is not known.' });
  const tail = modulus.inRange ? '' : ' Past the range of the secant modulus; taken at its end.';
  return plainFigure({
    ...common,
    value: modulus.value * hardest.forcePerModulus,
    because: `At its tip, until it meets the stop ${formatQuantity(stops.at(-1)!, 'mm')} away.${tail}`,
  });
}

function gapFigure({ material, stops }: Context): Figure {
  const free = clearanceFor(material, 'free');
  return judgedFigure({
    id: 'smallest-gap',
    label: 'Smallest gap to a stop',
    unit: 'mm',
    value: free ? stops[0]! : null,
    limit: free?.value ?? null,
    limitKind: 'min',
    because: free
      ? 'Narrower gaps than that of a free fit may fuse.'
      : `Not known: ${material.shortName} is moulded, and this coupon is printed.`,
    source: free?.source ?? source.COUNT,
  });
}

function stopCurve({ stops, arms }: Context): Curve {
  return {
    id: 'strain-over-stop',
    label: 'Peak strain over the way to the stop',
    x: { label: 'Way of the tip', unit: 'mm' },
    y: { label: 'Peak strain', unit: 'strain' },
    points: [[0, 0], ...stops.map((stop, at) => [stop, arms[at]!.peak] as const)],
  };
}

/** Report of a coupon: whether its steps lie on both sides of the limit. */
export function check(p: Values, material: Material, use: Use): Report {
  const allowable = allowableStrain(material, use);
  const flexible = flexibleArm(p, material.poisson.value);
  const stops = cellsOf(p).map(({ stop }) => stop);
  const context: Context = { p, material, allowable, stops, arms: stops.map((y) => pushArm(flexible, y)) };
  return report({
    governing: 'first-strain',
    headline: ['expected-arm', 'last-strain', 'deflection-force'],
    figures: [
      ...endFigures(context),
      expectedFigure(context),
      plainFigure({
        id: 'allowable-strain',
        label: 'Allowable strain',
        unit: 'strain',
        value: allowable.value,
        because: allowable.because,
        source: allowable.factors[0]!.source,
      }),
      forceFigure(context),
      gapFigure(context),
      ...markFigure(p),
    ],
    curves: [stopCurve(context)],
    allowable,
  });
}
