import { allowableStrain } from '@/lib/materials/allowable';
import type { Material, Use } from '@/lib/materials/types';
import { clearanceFor } from '@/lib/printing/clearance';
import { degrees, formatQuantity } from '@/lib/units';
import { type Curve, type Figure, judgedFigure, plainFigure, type Report, report } from '../report';
import { capacityOf, closedGap, loadOf, pastFlat, play, strengthOf, TRUSTED } from './mechanics';
import { boreWall, type Values } from './schema';
import * as source from './sources';

function gapReason(p: Values, material: Material, wanted: number): string {
  const name = material.shortName;
  if (p.gap >= wanted) {
    return `The table asks ${wanted.toFixed(2)} mm a side for a ${p.fit} fit in ${name}. Break the hinge loose once, gently, while still warm.`;
  }
  const snug = clearanceFor(material, 'snug')?.value ?? 0;
  return p.gap <= snug
    ? `At or under a snug fit of ${snug.toFixed(2)} mm in ${name} pin and knuckles fuse: the hinge will not turn.`
    : `Under the ${wanted.toFixed(2)} mm of a ${p.fit} fit in ${name}: it may fuse in places and turn hard.`;
}

function gapFigure(p: Values, material: Material): Figure {
  const wanted = clearanceFor(material, p.fit);
  return judgedFigure({
    id: 'gap',
    label: 'Gap a side',
    unit: 'mm',
    value: wanted ? p.gap : null,
    limit: wanted?.value ?? null,
    limitKind: 'min',
    because: wanted
      ? gapReason(p, material, wanted.value)
      : `Not known: ${material.shortName} is moulded, and this hinge can only be printed.`,
    source: wanted?.source ?? source.NO_TABLE,
  });
}

function printFigures(p: Values): Figure[] {
  return [
    judgedFigure({
      id: 'gap-layers',
      label: 'Gap in layers',
      unit: 'count',
      value: p.gap / p.layerHeight,
      limit: 1,
      limitKind: 'min',
      because:
        'Lying flat, the underside of the pin hangs over its bore: leave it at least one layer of air.',
      source: source.LAYERS,
    }),
    judgedFigure({
      id: 'pin-diameter',
      label: 'Pin diameter',
      unit: 'mm',
      value: p.pinDiameter,
      limit: 3,
      limitKind: 'min',
      verdict: p.pinDiameter >= 3 ? 'within-limit' : 'close-to-limit',
      because:
        p.pinDiameter >= 3
          ? 'Thick enough to print round.'
          : 'Under 3 mm a lying pin prints out of round; prove it with a short test hinge.',
      source: source.PIN_RULE,
    }),
  ];
}

function turnFigures(p: Values): Figure[] {
  return [
    plainFigure({
      id: 'opening-stop',
      label: 'Opens up to',
      unit: 'deg',
      value: 180 + degrees(pastFlat(p)),
      because:
        p.stop === 'flat'
          ? 'Counted from folded shut. The lip bears under the other leaf; the gap it is printed with lets it pass flat by a little.'
          : 'Counted from folded shut, until the backs of the leaves meet.',
      source: source.GEOMETRY,
    }),
    plainFigure({
      id: 'closed-gap',
      label: 'Between the leaves folded shut',
      unit: 'mm',
      value: closedGap(p),
      because: 'Twice what the axis stands over the leaf. A leaf of half the barrel closes without a gap.',
      source: source.GEOMETRY,
    }),
    plainFigure({
      id: 'play',
      label: 'Play at the outer corner',
      unit: 'mm',
      value: play(p),
      because: 'Along the pin, each way: the gap and the tilt it allows. A wider hinge tilts less.',
      source: source.GEOMETRY,
    }),
  ];
}

function loadFigures(p: Values, material: Material, use: Use): Figure[] {
  const strength = strengthOf(material, use.layers);
  const capacity = strength && capacityOf(p, strength);
  const load = loadOf(p);
  const missing = `Not known: the strength of ${material.shortName} is not known.`;
  const trusted = (value: number | undefined) => (value === undefined ? null : TRUSTED * value);
  const layers = use.layers === 'across' ? ' Printed standing, the layers are pulled or slid apart.' : '';
  return [
    judgedFigure({
      id: 'pull-capacity',
      label: 'Pull the hinge can carry',
      unit: 'N',
      value: capacity?.value ?? null,
      limit: p.pull,
      limitKind: 'min',
      because: capacity
        ? `Decided by ${capacity.weakest}, at half of the strength.${layers} Shared evenly by the knuckles; prove it by test.`
        : missing,
      source: source.STRENGTH,
    }),
    judgedFigure({
      id: 'pin-shear',
      label: 'Shear in the pin',
      unit: 'MPa',
      value: load.shear,
      handbook: load.meanShear,
      limit: trusted(strength?.shear),
      because: strength
        ? `At ${formatQuantity(p.pull, 'N')}, greatest at the axis of the pin; the plain figure is the mean.`
        : missing,
      source: source.PIN,
    }),
    judgedFigure({
      id: 'pin-bending',
      label: 'Bending in the pin',
      unit: 'MPa',
      value: load.bending,
      limit: trusted(strength?.tension),
      because: strength ? 'At the fixed knuckles. More and shorter knuckles bend it less.' : missing,
      source: source.PIN,
    }),
    judgedFigure({
      id: 'knuckle-tension',
      label: 'Tension beside the bore',
      unit: 'MPa',
      value: load.tension,
      limit: trusted(strength?.tension),
      because: strength ? `Mean over walls of ${boreWall(p).toFixed(2)} mm.` : missing,
      source: source.STRENGTH,
    }),
  ];
}

const STEPS = 18;

function playCurve(p: Values): Curve {
  return {
    id: 'play-over-gap',
    label: 'Play at the outer corner over the gap',
    x: { label: 'Gap', unit: 'mm' },
    y: { label: 'Play', unit: 'mm' },
    points: Array.from({ length: STEPS + 1 }, (_, i) => {
      const gap = (2 * p.gap * i) / STEPS;
      return [gap, play({ ...p, gap })] as const;
    }),
  };
}

/** Report of a hinge that does not strain: the gap decides. */
export function check(p: Values, material: Material, use: Use): Report {
  return report({
    governing: 'gap',
    headline: ['pull-capacity', 'opening-stop', 'play'],
    figures: [
      gapFigure(p, material),
      ...printFigures(p),
      ...turnFigures(p),
      ...loadFigures(p, material, use),
    ],
    curves: [playCurve(p)],
    allowable: allowableStrain(material, use),
  });
}
