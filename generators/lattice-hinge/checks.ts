import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { degrees, formatQuantity } from '@/lib/units';
import { type Curve, type Figure, judgedFigure, plainFigure, type Report, report } from '../report';
import {
  angleAt,
  bendMoment,
  bendRadius,
  closingAngle,
  type LatticeStrain,
  latticeStrain,
  pullAcross,
  twistOf,
} from './mechanics';
import { flexLength, linksInLine, overlapOf, type Values } from './schema';
import * as source from './sources';

interface Context {
  readonly p: Values;
  readonly material: Material;
  readonly use: Use;
  readonly allowable: AllowableStrain;
  readonly strain: LatticeStrain;
}

function peakFigure({ p, use, allowable, strain }: Context): Figure {
  const where =
    strain.link >= strain.bridge
      ? `At mid-length of the links, on their wider faces: each twists by ${formatQuantity(degrees(twistOf(p)), 'deg')}.`
      : 'In the bridges, which bend more than the links twist: make them longer.';
  const layers =
    use.layers === 'across' ? ' Printed on edge, the links are pulled apart between layers.' : '';
  return judgedFigure({
    id: 'peak-strain',
    label: 'Peak strain at the bend',
    unit: 'strain',
    value: strain.fault ? null : strain.peak,
    handbook: strain.handbook,
    limit: allowable.value,
    because: strain.fault ? `Not known: ${strain.fault}.` : `${where}${layers}`,
    source: source.LINK,
  });
}

function strainFigures({ p, allowable, strain }: Context): Figure[] {
  const known = strain.fault === null;
  const missing = `Not known: ${strain.fault}.`;
  return [
    plainFigure({
      id: 'allowable-strain',
      label: 'Allowable strain',
      unit: 'strain',
      value: allowable.value,
      because: allowable.because,
      source: allowable.factors[0]!.source,
    }),
    plainFigure({
      id: 'link-shear',
      label: 'Shear strain of the links',
      unit: 'strain',
      value: known ? strain.shear : null,
      because: known
        ? `Over ${overlapOf(p).toFixed(1)} mm of overlap and what the bridges let twist. Over 1 + Poisson ratio it stands as tension.`
        : missing,
      source: source.LINK,
    }),
    plainFigure({
      id: 'bridge-strain',
      label: 'Bending strain of the bridges',
      unit: 'strain',
      value: known ? strain.bridge : null,
      because: known
        ? 'Nominal: the ends of the slits raise it by an amount that is not known here. Keep them round.'
        : missing,
      source: source.BRIDGE,
    }),
  ];
}

function reachFigures({ p, allowable, strain }: Context): Figure[] {
  const limit = allowable.value;
  const known = !strain.fault && limit !== null;
  const angle = known ? angleAt(p, strain, limit) : null;
  const missing = strain.fault
    ? `Not known: ${strain.fault}.`
    : 'Not known: the allowable strain is not known.';
  return [
    plainFigure({
      id: 'bend-radius',
      label: 'Bend radius',
      unit: 'mm',
      value: bendRadius(p),
      because: `Of the middle of the sheet; ${flexLength(p).toFixed(1)} mm of slits make the bend.`,
      source: source.GEOMETRY,
    }),
    plainFigure({
      id: 'least-radius',
      label: 'Least bend radius',
      unit: 'mm',
      value: angle === null ? null : (bendRadius(p) * p.bendAngle) / degrees(angle),
      because: known ? 'Where the strain meets its limit, however many rows there are.' : missing,
      source: source.LINK,
    }),
    plainFigure({
      id: 'rows-needed',
      label: 'Rows needed for this angle',
      unit: 'count',
      value: angle === null ? null : Math.ceil((linksInLine(p) * p.bendAngle) / degrees(angle) - 1e-9) + 1,
      because: known ? 'The strain falls as the rows grow in number.' : missing,
      source: source.LINK,
    }),
    judgedFigure({
      id: 'closing-angle',
      label: 'Slits close at',
      unit: 'deg',
      value: degrees(closingAngle(p)),
      limit: p.bendAngle,
      limitKind: 'min',
      because:
        'Neighbouring strips turn against one another; past this angle their inner edges meet and wedge.',
      source: source.GEOMETRY,
    }),
  ];
}

function momentFigure({ p, material, strain }: Context): Figure {
  const moment = bendMoment(p, material);
  const common = {
    id: 'bend-moment',
    label: 'Moment to hold the bend',
    unit: 'Nmm',
    source: source.LINK,
  } as const;
  if (!moment) {
    const because = strain.fault ? `Not known: ${strain.fault}.` : 'Not known: the modulus is not known.';
    return plainFigure({ ...common, because });
  }
  const range = moment.inRange ? '' : ' Past the range of the secant modulus; taken at its end.';
  const because = `${2 * p.columns} links abreast, ${linksInLine(p)} in line. It springs back: hold it at both ends.${range}`;
  return plainFigure({ ...common, value: moment.value, handbook: moment.handbook, because });
}

function pullFigures({ p, material, allowable }: Context): Figure[] {
  const pull = allowable.value === null ? null : pullAcross(p, material, allowable.value);
  const missing =
    allowable.value === null
      ? 'Not known: the allowable strain is not known.'
      : 'Not known: the modulus is not known.';
  return [
    plainFigure({
      id: 'pull-stiffness',
      label: 'Stiffness against a pull across the bend',
      unit: 'N/mm',
      value: pull?.stiffness ?? null,
      because: pull
        ? 'Flat: the links bend sideways. The panel stretches, skews and shears far more easily than a plain one: guide its edges.'
        : missing,
      source: source.PULL,
    }),
    plainFigure({
      id: 'pull-limit',
      label: 'Pull at the allowable strain',
      unit: 'N',
      value: pull?.force ?? null,
      because: pull ? 'Flat, without the bend; less when bent. Let something else carry the load.' : missing,
      source: source.PULL,
    }),
  ];
}

function printFigure({ p }: Context): Figure {
  return judgedFigure({
    id: 'link-lines',
    label: 'Link width',
    unit: 'mm',
    value: p.linkWidth,
    limit: 0.8,
    limitKind: 'min',
    verdict: p.linkWidth >= 0.8 - 1e-9 ? 'within-limit' : 'over-limit',
    because: 'Two lines of a 0.4 mm nozzle at least; whole line widths leave no voids in the links.',
    source: source.LINES,
  });
}

const STEPS = 20;

function curves({ p, material, strain }: Context): Curve[] {
  if (strain.fault) return [];
  const rows = Array.from({ length: 9 }, (_, i) => Math.round(3 + ((2 * p.rows - 3) * i) / 8));
  const at = (n: number) => bendMoment({ ...p, rows: n }, material);
  const moments = [...new Set(rows)].flatMap((n) => {
    const moment = at(n);
    return moment ? [[n, moment.value] as const] : [];
  });
  const overAngle: Curve = {
    id: 'strain-over-angle',
    label: 'Peak strain while bending',
    x: { label: 'Bend angle', unit: 'deg' },
    y: { label: 'Peak strain', unit: 'strain' },
    points: Array.from(
      { length: STEPS + 1 },
      (_, i) => [(p.bendAngle * i) / STEPS, (strain.peak * i) / STEPS] as const,
    ),
  };
  const overRows: Curve = {
    id: 'moment-over-rows',
    label: 'Moment to hold the bend over the rows',
    x: { label: 'Rows of slits', unit: 'count' },
    y: { label: 'Moment', unit: 'Nmm' },
    points: moments,
  };
  return moments.length > 1 ? [overAngle, overRows] : [overAngle];
}

/** Report of a slit panel bent by its angle. */
export function check(p: Values, material: Material, use: Use): Report {
  const allowable = allowableStrain(material, use);
  const context: Context = { p, material, use, allowable, strain: latticeStrain(p, material.poisson.value) };
  return report({
    governing: 'peak-strain',
    headline: ['bend-moment', 'least-radius', 'rows-needed'],
    figures: [
      peakFigure(context),
      ...strainFigures(context),
      ...reachFigures(context),
      momentFigure(context),
      ...pullFigures(context),
      printFigure(context),
    ],
    curves: curves(context),
    allowable,
  });
}
