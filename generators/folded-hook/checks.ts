import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { selfLockingAngle, wedgeFactor } from '@/lib/mechanics/friction';
import { formatQuantity, radians } from '@/lib/units';
import { type Curve, type Figure, judgedFigure, plainFigure, type Report, report } from '../report';
import {
  type Banded,
  DEFLECTION_LIMIT,
  type FoldedForces,
  type FoldedStrain,
  foldedForces,
  foldedStrain,
} from './mechanics';
import { leadRun, type Values } from './schema';
import * as source from './sources';

interface Context {
  readonly p: Values;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  readonly strain: FoldedStrain;
  readonly forces: FoldedForces | null;
}

const known = ({ strain }: Context): boolean => strain.slenderMove <= DEFLECTION_LIMIT;

function because(context: Context): string {
  const { strain } = context;
  if (!known(context)) {
    return `Not known: the catch moves ${(strain.slenderMove * 100).toFixed(0)} % of the arm's length, past the ${DEFLECTION_LIMIT * 100} % that small deflection holds for.`;
  }
  return strain.bend >= strain.root
    ? 'Highest on the inside of the bend.'
    : 'Highest at the root fillet; legs of more equal length would move it into the bend.';
}

/** What the fold buys against a straight arm of the same height. */
function foldFigure(context: Context): Figure {
  const { strain, allowable } = context;
  const limit = allowable.value;
  const times = strain.straight / strain.peak;
  const would = formatQuantity(strain.straight, 'strain');
  const fails = limit !== null && strain.straight > limit;
  return plainFigure({
    id: 'fold-gain',
    label: 'Straight arm of the same height over this one',
    unit: 'ratio',
    value: known(context) ? times : null,
    because:
      times <= 1
        ? `A straight arm of the same height would strain less, ${would}: the fold buys nothing here.`
        : fails
          ? `A straight arm of the same height would reach ${would} and be over the limit; the fold takes the strain down ${times.toFixed(1)} times.`
          : `A straight arm of the same height would reach ${would}.`,
    source: source.STRAIGHT,
  });
}

function strainFigures(context: Context): Figure[] {
  const { strain, allowable } = context;
  const value = (figure: number) => (known(context) ? figure : null);
  return [
    judgedFigure({
      id: 'peak-strain',
      label: 'Peak strain while snapping in',
      unit: 'strain',
      value: value(strain.peak),
      handbook: strain.handbook,
      limit: allowable.value,
      because: because(context),
      source: source.ARM,
    }),
    plainFigure({
      id: 'allowable-strain',
      label: 'Allowable strain',
      unit: 'strain',
      value: allowable.value,
      because: allowable.because,
      source: allowable.factors[0]!.source,
    }),
    plainFigure({
      id: 'bend-strain',
      label: 'On the inside of the bend',
      unit: 'strain',
      value: value(strain.bend),
      handbook: strain.handbook,
      because:
        'Moment of the whole free leg, raised by the curvature; the handbook leaves the curvature out.',
      source: source.ARM,
    }),
    plainFigure({
      id: 'root-strain',
      label: 'At the root fillet',
      unit: 'strain',
      value: value(strain.root),
      because: 'Raised by the fillet; small where both legs are alike.',
      source: source.ARM,
    }),
    plainFigure({
      id: 'tip-deflection',
      label: 'The catch gives way by',
      unit: 'mm',
      value: context.p.undercut,
      because: 'The whole undercut; the edge is taken as rigid.',
      source: source.ARM,
    }),
    foldFigure(context),
  ];
}

const finite = (value: number | undefined): number | null =>
  value !== undefined && Number.isFinite(value) ? value : null;

function forceFigure(
  id: string,
  label: string,
  force: Banded | undefined,
  handbook: number | undefined,
  because: string,
): Figure {
  return plainFigure({
    id,
    label,
    unit: 'N',
    value: finite(force?.value),
    handbook: finite(handbook),
    low: finite(force?.low),
    high: finite(force?.high),
    because,
    source: source.WEDGE,
  });
}

function forceFigures(context: Context): Figure[] {
  const { p, material, forces } = context;
  const use = known(context) ? forces : null;
  const missing = forces
    ? 'Not known: past the range of small deflection.'
    : 'Not known: the modulus is not known.';
  const tail = use && !use.inRange ? ' Past the range of the secant modulus; taken at its end.' : '';
  const locks = use !== null && !Number.isFinite(use.separation.value);
  return [
    plainFigure({
      id: 'deflection-force',
      label: 'Force across the arm',
      unit: 'N',
      value: use?.across ?? null,
      handbook: forces?.handbookAcross ?? null,
      because: use ? `With the secant modulus at the peak strain.${tail}` : missing,
      source: source.ARM,
    }),
    forceFigure(
      'mating-force',
      'Push-in force',
      use?.mating,
      forces?.handbookMating,
      use ? 'Over the lead-in slope.' : missing,
    ),
    forceFigure(
      'separation-force',
      'Pull-out force',
      use?.separation,
      forces?.handbookSeparation,
      locks
        ? 'Not known as a force: at this return angle and friction the catch locks; press the free leg in to open it.'
        : use
          ? 'Over the return face; press the free leg in to open it without force.'
          : missing,
    ),
    plainFigure({
      id: 'self-locking-angle',
      label: 'Self-locking return angle',
      unit: 'deg',
      value: selfLockingAngle(material.friction.value),
      low: selfLockingAngle(material.friction.high),
      high: selfLockingAngle(material.friction.low),
      because: `From this angle on a pull does not open it; the catch has ${p.returnAngle}°.`,
      source: source.WEDGE,
    }),
  ];
}

function curves(context: Context): Curve[] {
  const { p, forces, material } = context;
  if (!forces || !known(context) || !Number.isFinite(forces.mating.high)) return [];
  const rise = leadRun(p);
  const slide = (mu: number) => forces.across * mu;
  const { value, low, high } = material.friction;
  const at = (share: number) => wedgeFactor(value, p.leadInAngle) * forces.across * share;
  return [
    {
      id: 'force-over-travel',
      label: 'Push-in force over travel',
      x: { label: 'Travel', unit: 'mm' },
      y: { label: 'Force', unit: 'N' },
      points: [
        [0, 0],
        [rise, at(1)],
        [rise + 1e-3, slide(value)],
        [rise + p.landLength, slide(value)],
        [rise + p.landLength + p.undercut / Math.tan(radians(Math.min(p.returnAngle, 89))), 0],
      ],
      band: [
        [0, 0],
        [forces.mating.low, forces.mating.high],
        [slide(low), slide(high)],
        [slide(low), slide(high)],
        [0, 0],
      ],
    },
  ];
}

/** Report of a folded hook. */
export function check(p: Values, material: Material, use: Use): Report {
  const context: Context = {
    p,
    material,
    allowable: allowableStrain(material, use),
    strain: foldedStrain(p),
    forces: foldedForces(p, material),
  };
  return report({
    governing: 'peak-strain',
    headline: ['mating-force', 'separation-force', 'fold-gain'],
    figures: [...strainFigures(context), ...forceFigures(context)],
    curves: curves(context),
    allowable: context.allowable,
  });
}
