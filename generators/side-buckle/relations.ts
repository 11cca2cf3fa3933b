import type { Relation } from '../parameters';
import { layoutOf, leadRun, noseTravel, padProud, railGap, squeezeTravel } from './layout';
import type { Values } from './schema';

const mm = (value: number): string => `${(Math.ceil(value * 100 - 1e-6) / 100).toFixed(2)} mm`;

const SMALLEST_RAIL = 1.2;
const SMALLEST_GAP = 0.2;
/** Flat between the roots of both arms beside their fillets, mm, per arm. */
const ROOT_FLAT = 0.4;

const rootRoom = (p: Values): number => layoutOf(p).arm - p.rootThickness - p.rootFillet;

const refusals: readonly Relation<Values>[] = [
  {
    id: 'arm-tapers',
    field: 'tipThickness',
    severity: 'refuse',
    holds: (p) => p.tipThickness <= p.rootThickness,
    message: (p) => `Tip thickness must be at most the root thickness, ${p.rootThickness} mm`,
  },
  {
    id: 'room-for-the-squeeze',
    field: 'webbingWidth',
    severity: 'refuse',
    holds: (p) => layoutOf(p).rail >= SMALLEST_RAIL - 1e-9,
    message: (p) =>
      `Webbing width must be at least ${mm(p.webbingWidth + 2 * (SMALLEST_RAIL - layoutOf(p).rail))}: the arms move in by ${mm(noseTravel(p))} and leave no rail of ${SMALLEST_RAIL} mm between them. A lower barb or a thinner arm helps too`,
  },
  {
    id: 'root-fits',
    field: 'rootThickness',
    severity: 'refuse',
    holds: (p) => rootRoom(p) >= ROOT_FLAT - 1e-9,
    message: (p) =>
      `Root thickness must be at most ${mm(p.rootThickness + rootRoom(p) - ROOT_FLAT)}: both arms with their fillets fill the plug`,
  },
  {
    id: 'rail-clears-arm',
    field: 'rootThickness',
    severity: 'refuse',
    holds: (p) => railGap(p) >= SMALLEST_GAP - 1e-9,
    message: (p) =>
      `Root thickness must be at most ${mm(p.rootThickness - SMALLEST_GAP + railGap(p))}, or the thick part of the arm meets the rail before the barb is free`,
  },
  {
    id: 'barb-holds',
    field: 'barbHeight',
    severity: 'refuse',
    holds: (p) => p.barbHeight >= p.clearance + 0.8 - 1e-9,
    message: (p) => `Barb height must be at least ${mm(p.clearance + 0.8)}, so that 0.8 mm of it hold`,
  },
  {
    id: 'side-wall-in-frame',
    field: 'sideWall',
    severity: 'refuse',
    holds: (p) => p.sideWall <= p.barWidth + 1e-9,
    message: (p) => `Side wall must be at most the bar width, ${p.barWidth} mm`,
  },
  {
    id: 'waist-over-rail',
    field: 'overtravel',
    severity: 'refuse',
    holds: (p) => layoutOf(p).waist >= layoutOf(p).rail + 0.5,
    message: (p) =>
      `Squeeze past the edge must be at most ${mm(p.overtravel + layoutOf(p).waist - layoutOf(p).rail - 0.5)}, or nothing is left of the skins beside the rail`,
  },
  {
    id: 'small-deflection',
    field: 'barbHeight',
    severity: 'refuse',
    holds: (p) => squeezeTravel(p) <= 0.4 * p.armLength,
    message: (p) =>
      `Barb height must be at most ${mm(p.barbHeight - squeezeTravel(p) + 0.4 * p.armLength)} for an arm of ${p.armLength} mm: it would bend by more than 0.4 of its length`,
  },
];

const cautions: readonly Relation<Values>[] = [
  {
    id: 'pad-within-reach',
    field: 'barbHeight',
    severity: 'warn',
    holds: (p) => padProud(p) >= 0.2 - 1e-9,
    message: (p) =>
      `Barb height under ${mm(p.clearance + p.sideWall + 0.2)} leaves the pads flush with the housing; fingers find them better standing out`,
  },
  {
    id: 'pad-for-a-finger',
    field: 'padLength',
    severity: 'warn',
    holds: (p) => p.padLength + leadRun(p) >= 9,
    message: () => 'Pad and nose shorter than 9 mm together are hard to squeeze with fingers',
  },
  {
    id: 'fillet-worth-having',
    field: 'rootFillet',
    severity: 'warn',
    holds: (p) => p.rootFillet >= 0.4 * p.rootThickness - 1e-9,
    message: (p) => `A root fillet under ${mm(0.4 * p.rootThickness)} raises the strain at the root`,
  },
  {
    id: 'arm-slender',
    field: 'armLength',
    severity: 'warn',
    holds: (p) => p.armLength >= 8 * p.rootThickness,
    message: (p) =>
      `An arm shorter than 8 thicknesses (${mm(8 * p.rootThickness)}) strains its root hard and is stiff to squeeze`,
  },
];

export const relations: readonly Relation<Values>[] = [...refusals, ...cautions];
