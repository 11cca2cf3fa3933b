import { type AllowableStrain, allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { FREE_SEPARATION } from '@/lib/mechanics/fold';
import { selfLockingAngle } from '@/lib/mechanics/friction';
import { webStrain } from '@/lib/mechanics/web';
import { clearanceFor } from '@/lib/printing/clearance';
import { formatQuantity, radians } from '@/lib/units';
import {
  type Curve,
  type Figure,
  judgedFigure,
  plainFigure,
  type Report,
  report,
  worstVerdict,
} from '../report';
import {
  type WebSubject,
  webBridge,
  webEndurance,
  webGoverning,
  webLayers,
  webLengthFigures,
  webMoment,
  webStrainFigures,
  webSubject,
} from '../web-figures';
import { armFace, halfWidth } from './layout';
import {
  arcLean,
  type Catch,
  type CatchForces,
  catchAllowable,
  catchForces,
  catchLayers,
  catchOf,
  foldOf,
} from './mechanics';
import type { Values } from './schema';
import * as source from './sources';

interface Context {
  readonly p: Values;
  readonly material: Material;
  readonly use: Use;
  readonly web: WebSubject;
  readonly snap: Catch;
  readonly forces: CatchForces | null;
  readonly catchLimit: AllowableStrain;
}

function catchStrain({ p, use, snap, catchLimit }: Context): Figure {
  const layers =
    catchLayers(use.layers) === 'across'
      ? 'The arm stands on the bed, so bending pulls its layers: the limit is that across them.'
      : 'Layers run along the arm in this stance.';
  return judgedFigure({
    id: 'catch-strain',
    label: 'Peak strain of the catch arm',
    unit: 'strain',
    value: snap.fault ? null : snap.pushed.peak,
    handbook: snap.handbook,
    limit: catchLimit.value,
    because: snap.fault
      ? `Not known: ${snap.fault}.`
      : catchLimit.value === null
        ? catchLimit.because
        : `At the end of its fillet, bent by ${p.undercut} mm. ${layers}`,
    source: source.ARM,
  });
}

const finite = (value: number | undefined): number | null =>
  value !== undefined && Number.isFinite(value) ? value : null;

function missing({ snap }: Context): string {
  return snap.fault ? `Not known: ${snap.fault}.` : 'Not known: the modulus is not known.';
}

function forceFigure(
  context: Context,
  id: string,
  label: string,
  force: CatchForces['close'] | undefined,
  because: string,
): Figure {
  return plainFigure({
    id,
    label,
    unit: 'N',
    value: finite(force?.value),
    handbook: finite(force?.handbook),
    low: finite(force?.low),
    high: finite(force?.high),
    because: force ? because : missing(context),
    source: source.WEDGE,
  });
}

function forceFigures(context: Context): Figure[] {
  const { p, material, forces } = context;
  const lean = formatQuantity(arcLean(p), 'deg');
  const range = forces && !forces.inRange ? ' Past the range of the secant modulus; taken at its end.' : '';
  const locks = forces !== null && !Number.isFinite(forces.open.value);
  return [
    plainFigure({
      id: 'deflection-force',
      label: 'Force that bends the arm',
      unit: 'N',
      value: forces?.deflection ?? null,
      handbook: forces?.handbook ?? null,
      because: forces ? `Square to the arm, at its catch.${range}` : missing(context),
      source: source.ARM,
    }),
    forceFigure(
      context,
      'mating-force',
      'Closing force at the front',
      forces?.close,
      `The lid swings, so the nose meets its keeper ${lean} steeper than drawn.`,
    ),
    forceFigure(
      context,
      'separation-force',
      'Opening force at the front',
      forces?.open,
      locks
        ? 'Not known as a force: the catch locks; pull the arm away from the box to open it.'
        : `Lifting at the finger notch; the swing makes the holding face ${lean} less steep.`,
    ),
    plainFigure({
      id: 'self-locking-angle',
      label: 'Self-locking return angle',
      unit: 'deg',
      value: selfLockingAngle(material.friction.value) + arcLean(p),
      low: selfLockingAngle(material.friction.high) + arcLean(p),
      high: selfLockingAngle(material.friction.low) + arcLean(p),
      because: `As drawn, the swing of ${lean} counted. From it on lifting does not open the lid; it has ${p.returnAngle}°.`,
      source: source.WEDGE,
    }),
  ];
}

/** The bent web pushes the lid open; the catch has to hold against it. */
function springFigure(context: Context): Figure {
  const { p, forces, web } = context;
  const moment = webMoment(web).value;
  const common = {
    id: 'spring-back',
    label: 'The web pushes the front open by',
    unit: 'N',
    source: source.GEOMETRY,
  } as const;
  if (moment === null || !forces) {
    const because = forces ? 'Not known: the moment of the web is not known.' : missing(context);
    return judgedFigure({ ...common, because });
  }
  const value = moment / armFace(p);
  const holds = finite(forces.open.low);
  return judgedFigure({
    ...common,
    value,
    limit: holds,
    ...(holds === null && { verdict: 'within-limit' }),
    because:
      holds === null
        ? 'The catch locks and holds it until something breaks.'
        : 'Moment of the fold over the distance of the catch; at the lowest friction the catch must hold more. A web that was folded warm pushes less.',
  });
}

function fitFigures({ p, material, web }: Context): Figure[] {
  const wanted = clearanceFor(material, 'slip');
  const room = (p.innerLength * p.innerDepth * (p.boxHeight + p.lidHeight + p.rimGap)) / 1000;
  const { separation, strain } = web.folded;
  return [
    judgedFigure({
      id: 'clearance',
      label: 'Clearance a side',
      unit: 'mm',
      value: wanted ? p.clearance : null,
      limit: wanted?.value ?? null,
      limitKind: 'min',
      because: wanted
        ? `Lip in lid and catch on keeper; a slip fit in ${material.shortName} asks ${wanted.value.toFixed(2)} mm.`
        : `Not known: ${material.shortName} is moulded, and no table of clearances covers it.`,
      source: wanted?.source ?? source.NO_TABLE,
    }),
    plainFigure({
      id: 'web-separation',
      label: 'Web ends apart, over web length',
      unit: 'ratio',
      value: separation,
      because: strain
        ? `The closed walls hold them so; ${FREE_SEPARATION.toFixed(2)} bends the web evenly. Recess and rim gap set it.`
        : 'The web would touch itself or tear: change its length or its recess.',
      source: source.GEOMETRY,
    }),
    plainFigure({
      id: 'volume',
      label: 'Room inside',
      unit: 'ml',
      value: room,
      because: 'Box and lid together, corners counted as square.',
      source: source.GEOMETRY,
    }),
  ];
}

const STEPS = 20;

function curves({ p, snap, material }: Context): Curve[] {
  const { web } = foldOf(p);
  const folding: Curve = {
    id: 'strain-over-angle',
    label: 'Peak strain of the web while the lid turns',
    x: { label: 'Fold angle', unit: 'deg' },
    y: { label: 'Peak strain', unit: 'strain' },
    points: Array.from({ length: STEPS + 1 }, (_, i) => {
      const angle = (180 * i) / STEPS;
      return [angle, webStrain(web, radians(angle)).peak] as const;
    }),
  };
  if (snap.fault) return [folding];
  const points = Array.from({ length: 9 }, (_, i) => {
    const undercut = (p.undercut * (i + 1)) / 6;
    return [undercut, catchOf({ ...p, undercut }, material.poisson.value)] as const;
  });
  const bending: Curve = {
    id: 'catch-strain-over-undercut',
    label: 'Peak strain of the catch arm over undercut',
    x: { label: 'Undercut', unit: 'mm' },
    y: { label: 'Peak strain', unit: 'strain' },
    points: points.flatMap(([x, { fault, pushed }]) => (fault ? [] : [[x, pushed.peak] as const])),
  };
  return [folding, bending];
}

/** True where the verdict of a figure is worse than that of another. */
const worse = (one: Figure, other: Figure): boolean =>
  one.verdict !== other.verdict && worstVerdict([one, other]) === one.verdict;

/** Report of a box opened and shut. The web governs, unless the verdict of the catch is worse. */
export function check(p: Values, material: Material, use: Use): Report {
  const allowable = allowableStrain(material, use);
  const { layerHeight } = p;
  const web = webSubject({ fold: foldOf(p), width: 2 * halfWidth(p), layerHeight, material, use, allowable });
  const context: Context = {
    p,
    material,
    use,
    web,
    snap: catchOf(p, material.poisson.value),
    forces: catchForces(p, material),
    catchLimit: catchAllowable(material, use),
  };
  const snap = catchStrain(context);
  const strains = webStrainFigures(web);
  const judged = strains.find(({ id }) => id === webGoverning(web))!;
  return report({
    governing: worse(snap, judged) ? snap.id : judged.id,
    headline: ['mating-force', 'separation-force', 'volume'],
    figures: [
      ...strains,
      snap,
      ...webLengthFigures(web),
      webEndurance(web, strains[1]),
      webMoment(web),
      ...forceFigures(context),
      springFigure(context),
      ...fitFigures(context),
      webLayers(web),
      webBridge(web),
    ],
    curves: curves(context),
    allowable,
  });
}
