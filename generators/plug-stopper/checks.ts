import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { type Curve, type Figure, judge, judgedFigure, plainFigure, type Report, report } from '../report';
import { type PlugForces, type PlugStrains, plugForces, plugStrains, STRAIN_LIMIT } from './mechanics';
import type { Values } from './schema';
import * as source from './sources';

interface Context {
  readonly p: Values;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  readonly strains: PlugStrains;
  readonly forces: PlugForces | null;
}

const HAND_LIMIT = 100;

function strainFigures({ p, allowable, strains }: Context): Figure[] {
  const known = strains.peak <= STRAIN_LIMIT;
  const where =
    p.kind === 'hollow'
      ? 'Hoop compression at the cavity, where the wall is squeezed most; it stays while the plug is in.'
      : 'Hoop compression, alike through the solid plug; it stays while the plug is in.';
  return [
    judgedFigure({
      id: 'peak-strain',
      label: 'Peak strain, plugged in',
      unit: 'strain',
      value: known ? strains.peak : null,
      handbook: strains.handbook,
      limit: allowable.value,
      because: known
        ? where
        : `Not known: ${(100 * strains.peak).toFixed(0)} % is past the ${100 * STRAIN_LIMIT} % that small-strain formulas reach. Reduce the squeeze.`,
      source: p.kind === 'hollow' ? source.OPEN_END : source.LAME,
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
      id: 'contact-strain',
      label: 'Strain at the bore',
      unit: 'strain',
      value: strains.contact,
      because:
        'Squeeze over the diameter of the ribs: the bore is taken as rigid, which is on the safe side.',
      source: source.LAME,
    }),
  ];
}

function dimpleFigure({ p, strains }: Context): Figure[] {
  if (strains.dimple === null) return [];
  const tail =
    strains.contact > strains.dimple
      ? `The squeeze is past it: only the bore and the flange keep this wall of ${p.wallThickness} mm round. Look for dimples on the first print.`
      : 'The squeeze stays under it.';
  return [
    plainFigure({
      id: 'dimple-strain',
      label: 'A free ring would dimple at',
      unit: 'strain',
      value: strains.dimple,
      because: tail,
      source: source.DIMPLE,
    }),
  ];
}

function missing({ strains }: Context): string {
  return strains.peak > STRAIN_LIMIT
    ? 'Not known: the strain is past the range of small-strain formulas.'
    : 'Not known: the modulus is not known.';
}

const PAST = ' Past the range of the secant modulus; taken at its end, so the true force is lower.';

const finite = (value: number | undefined): number | null =>
  value !== undefined && Number.isFinite(value) ? value : null;

function judgePush(force: number | null) {
  if (force === null) return 'not-known' as const;
  return force > 50 && force <= HAND_LIMIT ? ('close-to-limit' as const) : judge(force, HAND_LIMIT);
}

const bounds = (spread: { low: number; value: number; high: number } | undefined) => ({
  value: finite(spread?.value),
  low: finite(spread?.low),
  high: finite(spread?.high),
});

function moveFigures(context: Context): Figure[] {
  const { material, forces } = context;
  const friction = `friction ${material.friction.low} to ${material.friction.high} of the plastic on itself`;
  const tail = forces && !forces.inRange ? PAST : '';
  const locked = forces !== null && !Number.isFinite(forces.push.value);
  const push = finite(forces?.push.value);
  return [
    {
      ...judgedFigure({
        id: 'mating-force',
        label: 'Push-in force',
        unit: 'N',
        ...bounds(forces?.push),
        limit: HAND_LIMIT,
        because: locked
          ? 'Not known: at this friction and lead-in the ribs lock at the rim. Use a flatter lead-in.'
          : forces
            ? `The last rib climbs its lead-in while the others slide; ${friction}. A wet or greased bore needs less.${tail}`
            : missing(context),
        source: source.WEDGE,
      }),
      verdict: judgePush(push),
    },
    plainFigure({
      id: 'separation-force',
      label: 'Pull-out force',
      unit: 'N',
      ...bounds(forces?.pull),
      because: forces
        ? `All ribs slide; ${friction}. It fades as the plastic relaxes.${tail}`
        : missing(context),
      source: source.WEDGE,
    }),
    plainFigure({
      id: 'ejection-pressure',
      label: 'Pressure that pushes it out, new',
      unit: 'MPa',
      value: forces?.ejection ?? null,
      because: forces
        ? 'At the low end of force and friction. 0.1 MPa is one bar. Not a rating: never use the plug to hold pressure.'
        : missing(context),
      source: source.EQUILIBRIUM,
    }),
  ];
}

function contactFigures(context: Context): Figure[] {
  const { forces } = context;
  return [
    plainFigure({
      id: 'contact-pressure',
      label: 'Contact pressure under the ribs',
      unit: 'MPa',
      ...bounds(forces?.pressure),
      because: forces
        ? 'Mean over the flats. Low: ribs as discs cut free (Lame). High: the whole body shrunk alike.'
        : missing(context),
      source: source.RADIAL,
    }),
    plainFigure({
      id: 'radial-force',
      label: 'Radial force, all ribs',
      unit: 'N',
      ...bounds(forces?.radial),
      because: forces
        ? 'An estimate between two strict bounds: the body between the ribs helps to bear them, how far is estimated.'
        : missing(context),
      source: source.RADIAL,
    }),
  ];
}

const STEPS = 20;

function squeezeCurve({ p, material }: Context): Curve {
  const most = Math.min(4, 2 * p.interference);
  const points = Array.from({ length: STEPS }, (_, i) => {
    const interference = (most * (i + 1)) / STEPS;
    return [interference, plugStrains({ ...p, interference }, material.poisson.value).peak] as const;
  });
  return {
    id: 'strain-over-squeeze',
    label: 'Peak strain over squeeze',
    x: { label: 'Squeeze on the diameter', unit: 'mm' },
    y: { label: 'Peak strain', unit: 'strain' },
    points,
  };
}

/** Report of a plug stopper. */
export function check(p: Values, material: Material, use: Use): Report {
  const allowable = allowableStrain(material, use);
  const context: Context = {
    p,
    material,
    allowable,
    strains: plugStrains(p, material.poisson.value),
    forces: plugForces(p, material),
  };
  return report({
    governing: 'peak-strain',
    headline: ['mating-force', 'separation-force', 'contact-pressure'],
    figures: [
      ...strainFigures(context),
      ...dimpleFigure(context),
      ...moveFigures(context),
      ...contactFigures(context),
    ],
    curves: [squeezeCurve(context)],
    allowable,
  });
}
