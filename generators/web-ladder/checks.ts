import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { DRAWN_RANGE, type FoldedWeb, foldWeb } from '@/lib/mechanics/web-fold';
import { formatQuantity } from '@/lib/units';
import { markFigure } from '../coupon';
import { type Curve, type Figure, judgedFigure, plainFigure, type Report, report } from '../report';
import * as source from '../web-sources';
import { foldOf, layersOf, thickest, thicknessOf, type Values } from './schema';

interface Context {
  readonly p: Values;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  readonly webs: readonly FoldedWeb[];
  /** judged as a drawn web of polypropylene, by its nominal strain */
  readonly drawn: boolean;
}

const strainOf = ({ drawn }: Context, { nominal, strain }: FoldedWeb): number =>
  drawn ? nominal : (strain?.peak ?? nominal);

const limitOf = ({ drawn, allowable }: Context): number | null =>
  drawn && allowable.value !== null ? DRAWN_RANGE.high : allowable.value;

function endFigure(context: Context, which: 'first' | 'last'): Figure {
  const { webs, p, drawn, allowable } = context;
  const at = which === 'first' ? 0 : webs.length - 1;
  const layers = layersOf(p)[at]!;
  const limit = limitOf(context);
  const wish =
    which === 'first'
      ? 'The ladder should begin with a web that surely lasts.'
      : 'It should go past the limit, or the test ends before the answer.';
  const kind = drawn ? 'Nominal strain of a web that draws.' : 'Peak strain of a web that stays elastic.';
  return judgedFigure({
    id: which === 'first' ? 'thinnest-strain' : 'thickest-strain',
    label: which === 'first' ? 'Thinnest web' : 'Thickest web',
    unit: 'strain',
    value: strainOf(context, webs[at]!),
    handbook: webs[at]!.nominal,
    limit,
    limitKind: which === 'first' ? 'max' : 'min',
    because:
      limit === null
        ? allowable.because
        : `Marked ${layers}, ${formatQuantity(thicknessOf(p, layers), 'mm')}. ${wish} ${kind}`,
    source: drawn ? source.DRAWN : source.STRIP,
  });
}

function expectedFigure(context: Context): Figure {
  const { p, webs, allowable } = context;
  const common = {
    id: 'expected-webs',
    label: 'Webs expected to last',
    unit: 'count',
    source: context.drawn ? source.DRAWN : source.STRIP,
  } as const;
  const limit = limitOf(context);
  if (limit === null) return plainFigure({ ...common, because: allowable.because });
  const value = webs.filter((web) => strainOf(context, web) <= limit).length;
  const marked = value === 0 ? 'none' : `up to the one marked ${layersOf(p)[value - 1]}`;
  return plainFigure({
    ...common,
    value,
    because: `Within ${formatQuantity(limit, 'strain')}: ${marked}. What your print makes of the others is what you find out.`,
  });
}

function stiffFigure({ p }: Context): Figure {
  return judgedFigure({
    id: 'leaf-over-web',
    label: 'Leaf over thickest web',
    unit: 'ratio',
    value: p.leafThickness / thickest(p),
    limit: 3,
    limitKind: 'min',
    verdict: p.leafThickness >= 3 * thickest(p) - 1e-9 ? 'within-limit' : 'close-to-limit',
    because:
      'A leaf that bends along takes strain from the web, and the hinge seems to last longer than it will.',
    source: source.GEOMETRY,
  });
}

function webCurve(context: Context): Curve {
  const { p, webs } = context;
  return {
    id: 'strain-over-thickness',
    label: 'Strain over thickness of the web',
    x: { label: 'Web thickness', unit: 'mm' },
    y: { label: 'Strain', unit: 'strain' },
    points: layersOf(p).map((layers, at) => [thicknessOf(p, layers), strainOf(context, webs[at]!)] as const),
  };
}

/** Report of a coupon: whether its webs lie on both sides of the limit. */
export function check(p: Values, material: Material, use: Use): Report {
  const allowable = allowableStrain(material, use);
  const webs = layersOf(p).map((layers) => foldWeb(foldOf(p, layers)));
  const drawn = material.drawsWhenFolded && use.layers === 'along';
  const context: Context = { p, material, allowable, webs, drawn };
  return report({
    governing: 'thinnest-strain',
    headline: ['expected-webs', 'thickest-strain', 'leaf-over-web'],
    figures: [
      endFigure(context, 'first'),
      endFigure(context, 'last'),
      expectedFigure(context),
      plainFigure({
        id: 'allowable-strain',
        label: 'Allowable strain',
        unit: 'strain',
        value: allowable.value,
        because: allowable.because,
        source: allowable.factors[0]!.source,
      }),
      stiffFigure(context),
      ...markFigure(p),
    ],
    curves: [webCurve(context)],
    allowable,
  });
}
