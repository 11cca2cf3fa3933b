import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { selfLockingAngle } from '@/lib/mechanics/friction';
import { degrees } from '@/lib/units';
import { type Curve, type Figure, judgedFigure, plainFigure, type Report, report } from '../report';
import {
  type Banded,
  type LatchForces,
  type LatchStrain,
  latchForces,
  latchStrain,
  tailTravel,
} from './mechanics';
import type { Values } from './schema';
import * as source from './sources';

interface Context {
  readonly p: Values;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  readonly strain: LatchStrain;
  readonly forces: LatchForces | null;
}

function strainFigures({ strain, allowable }: Context): Figure[] {
  const inBar = strain.bar >= strain.rockerBending;
  const because = inBar
    ? 'Highest in the bars: their twist and the bending by the finger or the nose together.'
    : 'Highest in the rocker beside the bars: it bends more than the bars twist. Make the panel thicker or the bars softer.';
  const part = (id: string, label: string, value: number, why: string) =>
    plainFigure({ id, label, unit: 'strain', value, because: why, source: source.BENDING });
  return [
    judgedFigure({
      id: 'peak-strain',
      label: 'Peak strain while the nose clears the edge',
      unit: 'strain',
      value: strain.peak,
      handbook: strain.handbook,
      limit: allowable.value,
      because,
      source: source.TWIST,
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
      id: 'twist-strain',
      label: 'From the twist of the bars',
      unit: 'strain',
      value: strain.twisting,
      handbook: strain.handbook,
      because: `Shear strain ${(strain.shear * 100).toFixed(2)} % over 1 + Poisson ratio. Held ends twist less of the bar than the handbook assumes.`,
      source: source.TWIST,
    }),
    part(
      'bar-bending',
      'From the bending of the bars',
      strain.barBending,
      'The bars carry the force of finger or nose to the frame.',
    ),
    part(
      'rocker-bending',
      'Bending of the rocker',
      strain.rockerBending,
      'The rocker is a lever: it bends where it sits on the bars.',
    ),
  ];
}

const finite = (value: number | undefined): number | null =>
  value !== undefined && Number.isFinite(value) ? value : null;

function banded(id: string, label: string, force: Banded | undefined, because: string): Figure {
  return plainFigure({
    id,
    label,
    unit: 'N',
    value: finite(force?.value),
    low: finite(force?.low),
    high: finite(force?.high),
    because,
    source: source.WEDGE,
  });
}

function forceFigures({ p, material, forces }: Context): Figure[] {
  const missing = 'Not known: the modulus is not known.';
  const tail = forces && !forces.inRange ? ' Past the range of the secant modulus; taken at its end.' : '';
  const locks = forces !== null && !Number.isFinite(forces.pull.value);
  return [
    judgedFigure({
      id: 'release-force',
      label: 'Finger force on the tail',
      unit: 'N',
      value: forces?.finger ?? null,
      limit: 40,
      because: forces
        ? `Both bars turned by ${degrees(latchStrain(p, material.poisson.value).turn).toFixed(1)}°.${tail}`
        : missing,
      source: source.FINGER,
    }),
    plainFigure({
      id: 'deflection-force',
      label: 'Force on the nose',
      unit: 'N',
      value: forces?.nose ?? null,
      handbook: forces ? forces.handbookTorque / p.catchArm : null,
      because: forces
        ? `Across the panel, torque ${forces.torque.toFixed(0)} N mm of both bars.${tail}`
        : missing,
      source: source.TWIST,
    }),
    banded(
      'mating-force',
      'Closing force',
      forces?.close,
      forces ? 'Along the edge, over the sloping front of the nose.' : missing,
    ),
    banded(
      'separation-force',
      'Force to pull it open without the tail',
      forces?.pull,
      !forces
        ? missing
        : locks
          ? 'Not known as a force: at this return angle and friction the nose locks until something breaks; open it by the tail.'
          : 'The nose slips off its edge under this pull.',
    ),
    plainFigure({
      id: 'self-locking-angle',
      label: 'Self-locking return angle',
      unit: 'deg',
      value: selfLockingAngle(material.friction.value),
      low: selfLockingAngle(material.friction.high),
      high: selfLockingAngle(material.friction.low),
      because: `From this angle on a pull does not open it; the nose has ${p.returnAngle}°.`,
      source: source.WEDGE,
    }),
  ];
}

function travelFigures({ p, strain }: Context): Figure[] {
  return [
    plainFigure({
      id: 'tip-deflection',
      label: 'Travel of the nose',
      unit: 'mm',
      value: p.undercut,
      because: `The rocker turns by ${degrees(strain.turn).toFixed(1)}°.`,
      source: source.TWIST,
    }),
    plainFigure({
      id: 'tail-travel',
      label: 'Travel of the tail',
      unit: 'mm',
      value: tailTravel(p),
      because: 'Leave this much room under the tail.',
      source: source.TWIST,
    }),
  ];
}

const STEPS = 20;

function pressCurve({ p, forces }: Context): Curve[] {
  if (!forces) return [];
  const points = Array.from({ length: STEPS + 1 }, (_, i) => {
    const share = i / STEPS;
    return [tailTravel(p) * share, forces.finger * share] as const;
  });
  return [
    {
      id: 'force-over-travel',
      label: 'Finger force over travel of the tail',
      x: { label: 'Travel', unit: 'mm' },
      y: { label: 'Force', unit: 'N' },
      points,
    },
  ];
}

/** Report of a torsion latch. */
export function check(p: Values, material: Material, use: Use): Report {
  const allowable = allowableStrain(material, use);
  const strain = latchStrain(p, material.poisson.value);
  const context: Context = { p, material, allowable, strain, forces: latchForces(p, material) };
  return report({
    governing: 'peak-strain',
    headline: ['release-force', 'mating-force', 'tail-travel'],
    figures: [...strainFigures(context), ...travelFigures(context), ...forceFigures(context)],
    curves: pressCurve(context),
    allowable,
  });
}
