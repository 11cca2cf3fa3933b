import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { selfLockingAngle } from '@/lib/mechanics/friction';
import { formatQuantity } from '@/lib/units';
import { type Curve, type Figure, judge, judgedFigure, plainFigure, type Report, report } from '../report';
import { type ClipForces, type ClipMechanics, clipForces, clipMechanics, SPREAD_LIMIT } from './mechanics';
import { mouthHalf, type Values } from './schema';
import * as source from './sources';

interface Context {
  readonly p: Values;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  readonly mechanics: ClipMechanics;
  readonly forces: ClipForces | null;
}

function strainFigures({ allowable, mechanics }: Context): Figure[] {
  const within = mechanics.opening <= SPREAD_LIMIT;
  const because = within
    ? `Tension on the bore, highest just above the stem, while the rod spreads each lip by ${mechanics.spread.toFixed(2)} mm.`
    : `Not known: each lip would have to give ${mechanics.opening.toFixed(2)} of the radius, past the ${SPREAD_LIMIT} this was checked to. Reduce the wrap angle.`;
  return [
    judgedFigure({
      id: 'peak-strain',
      label: 'Peak strain while snapping on',
      unit: 'strain',
      value: within ? mechanics.strain : null,
      handbook: mechanics.handbookStrain,
      limit: allowable.value,
      because,
      source: source.RING,
    }),
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

function shapeFigures({ p, mechanics }: Context): Figure[] {
  return [
    plainFigure({
      id: 'tip-deflection',
      label: 'Each lip gives way by',
      unit: 'mm',
      value: mechanics.spread,
      handbook: mechanics.handbookSpread,
      because:
        'Half the rod less half the mouth; the handbook measures the mouth at the bore, not at the rounded lips.',
      source: source.RING,
    }),
    plainFigure({
      id: 'mouth',
      label: 'Mouth at rest',
      unit: 'mm',
      value: 2 * mouthHalf(p),
      because: 'Between the rounded lips.',
      source: source.RING,
    }),
  ];
}

function residualFigure({ p, allowable, mechanics }: Context): Figure {
  const share = allowable.value === null ? null : allowable.value / 4;
  const because =
    p.play >= 0
      ? 'The bore is not smaller than the rod: nothing is strained while it is held, so nothing relaxes.'
      : 'The ring is held open by the rod. The grip fades as the plastic relaxes; do not count on it after weeks or in a hot car.';
  return judgedFigure({
    id: 'standing-strain',
    label: 'Strain while the rod is held',
    unit: 'strain',
    value: mechanics.residual,
    limit: share,
    because,
    source: source.GRIP,
  });
}

const NO_MODULUS = 'Not known: the modulus is not known.';
const PAST = ' Past the range of the secant modulus; taken at its end, so the true force is lower.';

function forceFigures({ material, mechanics, forces }: Context): Figure[] {
  const known = forces && mechanics.opening <= SPREAD_LIMIT ? forces : null;
  const tail = known && !known.inRange ? PAST : '';
  const missing = forces ? 'Not known: the opening is past the checked range.' : NO_MODULUS;
  const locked = known !== null && !Number.isFinite(known.pull);
  const finite = (value: number | undefined) =>
    value !== undefined && Number.isFinite(value) ? value : null;
  return [
    plainFigure({
      id: 'deflection-force',
      label: 'Force at each lip',
      unit: 'N',
      value: known?.lip ?? null,
      handbook: forces?.handbookLip ?? null,
      because: known ? `Across the rod, with the secant modulus at the peak strain.${tail}` : missing,
      source: source.RING,
    }),
    {
      ...judgedFigure({
        id: 'mating-force',
        label: 'Push-on force',
        unit: 'N',
        value: finite(known?.push),
        handbook: finite(forces?.handbookPush),
        low: finite(known?.pushLow),
        high: finite(known?.pushHigh),
        limit: 100,
        because: known
          ? `Both lips over the flare, friction ${material.friction.low} to ${material.friction.high}.`
          : missing,
        source: source.WEDGE,
      }),
      verdict: known ? judgePush(known.push) : 'not-known',
    },
    plainFigure({
      id: 'separation-force',
      label: 'Pull-off force',
      unit: 'N',
      value: finite(known?.pull),
      handbook: finite(forces?.handbookPull),
      low: finite(known?.pullLow),
      high: finite(known?.pullHigh),
      because: locked
        ? 'Not known: at this friction the lips lock on the rod and the clip has to be spread to let go.'
        : known
          ? `The lips hold under a return angle of ${mechanics.returnAngle.toFixed(0)}°.`
          : missing,
      source: source.WEDGE,
    }),
    plainFigure({
      id: 'self-locking-angle',
      label: 'Self-locking return angle',
      unit: 'deg',
      value: selfLockingAngle(material.friction.value),
      low: selfLockingAngle(material.friction.high),
      high: selfLockingAngle(material.friction.low),
      because: `A return angle past it does not open by pulling; this one is ${mechanics.returnAngle.toFixed(0)}° (wrap angle / 2 - 90°).`,
      source: source.WEDGE,
    }),
  ];
}

function judgePush(force: number) {
  if (!Number.isFinite(force) || force > 100) return 'over-limit' as const;
  return force > 50 ? ('close-to-limit' as const) : judge(force, 100);
}

/** Push and pull over travel: rise along the flare to the full force, then the fall into the bore. */
function forceCurve({ p, forces, mechanics }: Context): Curve[] {
  if (!forces || !Number.isFinite(forces.pushHigh) || mechanics.opening > SPREAD_LIMIT) return [];
  const flare = mechanics.spread / Math.tan((p.flareAngle * Math.PI) / 180);
  const seat = p.rodDiameter / 2;
  const at = (share: number) => [forces.pushLow * share, forces.pushHigh * share] as const;
  return [
    {
      id: 'force-over-travel',
      label: 'Push-on force over travel',
      x: { label: 'Travel', unit: 'mm' },
      y: { label: 'Force', unit: 'N' },
      points: [
        [0, 0],
        [flare, forces.push],
        [flare + 0.05 * seat, 0],
        [flare + seat, 0],
      ],
      band: [[0, 0], at(1), [0, 0], [0, 0]],
    },
  ];
}

const STEPS = 20;

function wrapCurve({ p }: Context): Curve {
  const angles = Array.from({ length: STEPS + 1 }, (_, i) => p.wrapAngle - 30 + 3 * i);
  const points = angles.flatMap((wrapAngle) => {
    const changed = { ...p, wrapAngle };
    const open = mouthHalf(changed) >= 0.15 && mouthHalf(changed) < p.rodDiameter / 2;
    return wrapAngle >= 190 && open ? [[wrapAngle, clipMechanics(changed).strain] as const] : [];
  });
  return {
    id: 'strain-over-wrap',
    label: 'Peak strain over wrap angle',
    x: { label: 'Wrap angle', unit: 'deg' },
    y: { label: 'Peak strain', unit: 'strain' },
    points,
  };
}

/** Report of a rod clip. */
export function check(p: Values, material: Material, use: Use): Report {
  const allowable = allowableStrain(material, use);
  const context: Context = {
    p,
    material,
    allowable,
    mechanics: clipMechanics(p),
    forces: clipForces(p, material),
  };
  const grip = plainFigure({
    id: 'rods-held',
    label: 'Rods held',
    unit: 'count',
    value: p.clipCount,
    because: `Each ring wraps ${p.wrapAngle}° of a ${formatQuantity(p.rodDiameter, 'mm')} rod.`,
    source: source.RING,
  });
  return report({
    governing: 'peak-strain',
    headline: ['mating-force', 'separation-force', 'tip-deflection'],
    figures: [
      ...strainFigures(context),
      ...shapeFigures(context),
      ...forceFigures(context),
      residualFigure(context),
      grip,
    ],
    curves: [...forceCurve(context), wrapCurve(context)],
    allowable,
  });
}
