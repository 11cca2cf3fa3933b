import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { remoteDistance } from '@/lib/mechanics/annular';
import { selfLockingAngle } from '@/lib/mechanics/friction';
import { type Curve, type Figure, judge, judgedFigure, plainFigure, type Report, report } from '../report';
import { type LidForces, type LidMechanics, lidForces, lidMechanics } from './mechanics';
import type { Values } from './schema';
import * as source from './sources';

interface Context {
  readonly p: Values;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  readonly mechanics: LidMechanics;
  readonly forces: LidForces | null;
}

const HAND_LIMIT = 100;

const finite = (value: number | null | undefined): number | null =>
  value !== null && value !== undefined && Number.isFinite(value) ? value : null;

function strainFigures({ p, allowable, mechanics }: Context): Figure[] {
  const { fault, lidStrain, potStrain, handbookStrain } = mechanics;
  const closed = p.skirt === 'closed';
  const from = closed ? source.RING : source.FINGER;
  const strain = (id: string, label: string, value: number, because: string) =>
    judgedFigure({
      id,
      label,
      unit: 'strain',
      value: fault ? null : value,
      handbook: handbookStrain,
      limit: allowable.value,
      because: fault ? `Not known: ${fault}.` : because,
      source: from,
    });
  const lid = closed
    ? `The skirt stretches by ${mechanics.lidGives.toFixed(2)} mm on the radius while its lip passes the bead. Handbook: the pot does not give.`
    : 'Each finger bends at the plate while its lip passes the bead; the pot is taken as rigid.';
  const pot = `The pot gives way by ${mechanics.potGives.toFixed(2)} mm under the bead: it is squeezed.`;
  return [
    strain('peak-strain', 'Peak strain of the lid', lidStrain, lid),
    ...(closed ? [strain('pot-strain', 'Peak strain of the pot', potStrain, pot)] : []),
    plainFigure({
      id: 'allowable-strain',
      label: 'Allowable strain',
      unit: 'strain',
      value: allowable.value,
      because: allowable.because,
      source: allowable.factors[0]!.source,
    }),
  ];
}

const DOUBT =
  'The handbook figure takes one side as rigid, and its factor X is 1.4 to 1.5 times below shell theory for a load at the end: read it with that doubt.';
const PAST = ' Past the range of the secant modulus; taken at its end, so the true force is lower.';

const missing = ({ mechanics }: Context): string =>
  mechanics.fault ? `Not known: ${mechanics.fault}.` : 'Not known: the modulus is not known.';

function judgePush(force: number | null) {
  if (force === null) return 'not-known' as const;
  return force > 50 && force <= HAND_LIMIT ? ('close-to-limit' as const) : judge(force, HAND_LIMIT);
}

function forceFigures(context: Context): Figure[] {
  const { p, material, forces } = context;
  const from = p.skirt === 'closed' ? source.FORCE : source.FINGER;
  const doubt = p.skirt === 'closed' ? ` ${DOUBT}` : '';
  const tail = forces && !forces.inRange ? PAST : '';
  const locked = forces !== null && !Number.isFinite(forces.pull.value);
  const bounds = (spread: LidForces['push'] | undefined) => ({
    value: finite(spread?.value),
    handbook: finite(spread?.handbook),
    low: finite(spread?.low),
    high: finite(spread?.high),
  });
  const push = bounds(forces?.push);
  return [
    plainFigure({
      id: 'deflection-force',
      label: 'Radial force all round',
      unit: 'N',
      value: forces?.radial ?? null,
      handbook: finite(forces?.handbookRadial),
      because: forces ? `With the secant modulus at the peak strain.${doubt}${tail}` : missing(context),
      source: from,
    }),
    {
      ...judgedFigure({
        id: 'mating-force',
        label: 'Push-on force',
        unit: 'N',
        ...push,
        limit: HAND_LIMIT,
        because: forces
          ? `All round at once, friction ${material.friction.low} to ${material.friction.high}. Started at one side, a lid takes less. Limit: hand force, common practice.`
          : missing(context),
        source: from,
      }),
      verdict: judgePush(push.value),
    },
    plainFigure({
      id: 'separation-force',
      label: 'Pull-off force',
      unit: 'N',
      ...bounds(forces?.pull),
      because: locked
        ? 'Not known: at this friction the lip locks under the bead.'
        : forces
          ? `Straight up over a return flank of ${p.returnAngle}°; levered at one side it takes less.`
          : missing(context),
      source: from,
    }),
    plainFigure({
      id: 'self-locking-angle',
      label: 'Self-locking return angle',
      unit: 'deg',
      value: selfLockingAngle(material.friction.value),
      low: selfLockingAngle(material.friction.high),
      high: selfLockingAngle(material.friction.low),
      because: 'A steeper return flank does not open by pulling.',
      source: source.FINGER,
    }),
  ];
}

function shapeFigures({ p }: Context): Figure[] {
  const remote = remoteDistance(p.tubeDiameter, p.tubeWall);
  const inside = p.tubeDiameter / 2 - p.tubeWall;
  return [
    plainFigure({
      id: 'remote-distance',
      label: 'Counts as remote from the rim at',
      unit: 'mm',
      value: remote,
      because:
        p.fromRim < remote
          ? `The bead lies ${p.fromRim} mm below the rim: near, the pot gives more easily.`
          : `The bead lies ${p.fromRim} mm below the rim: remote, the whole pot resists, up to four times as hard.`,
      source: source.FORCE,
    }),
    plainFigure({
      id: 'volume',
      label: 'Room in the pot',
      unit: 'ml',
      value: (Math.PI * inside ** 2 * (p.potHeight - p.floor)) / 1000,
      because: 'From the floor to the rim.',
      source: source.GEOMETRY,
    }),
  ];
}

const STEPS = 20;

function undercutCurve({ p, material }: Context): Curve {
  const points = Array.from({ length: STEPS }, (_, i) => {
    const undercut = (2 * p.undercut * (i + 1)) / STEPS;
    return [undercut, lidMechanics({ ...p, undercut }, material.poisson.value)] as const;
  });
  return {
    id: 'strain-over-undercut',
    label: 'Peak strain of the lid over undercut',
    x: { label: 'Undercut on the diameter', unit: 'mm' },
    y: { label: 'Peak strain', unit: 'strain' },
    points: points.flatMap(([x, { fault, lidStrain }]) => (fault ? [] : [[x, lidStrain] as const])),
  };
}

/** Report of a press lid and its pot. */
export function check(p: Values, material: Material, use: Use): Report {
  const allowable = allowableStrain(material, use);
  const context: Context = {
    p,
    material,
    allowable,
    mechanics: lidMechanics(p, material.poisson.value),
    forces: lidForces(p, material),
  };
  return report({
    governing: 'peak-strain',
    headline: ['mating-force', 'separation-force', 'volume'],
    figures: [...strainFigures(context), ...forceFigures(context), ...shapeFigures(context)],
    curves: [undercutCurve(context)],
    allowable,
  });
}
