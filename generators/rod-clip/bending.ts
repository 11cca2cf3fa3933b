import type { BendingModel } from '@/lib/fea/model';
import { arc, arcThrough, line, type Point, type Segment } from '@/lib/fea/profile/segment';
import type { Placement } from '@/lib/geometry/kernel';
import { secantModulus } from '@/lib/materials/secant';
import type { Material, Use } from '@/lib/materials/types';
import { radians } from '@/lib/units';
import type { Bending } from '../contract';
import { clipMechanics } from './mechanics';
import { centreHeight, centres } from './ring';
import { boreOf, halfArcOf, type Values } from './schema';

const QUARTER = Math.PI / 2;
/** Arcs that the outside of a thinning wall is made of. */
const PIECES = 8;
/** Half the angle of the pressed spot on the lip, rad. */
const SPOT = 0.08;

const polar = (radius: number, angle: number): Point => [radius * Math.cos(angle), radius * Math.sin(angle)];

const lipAngle = (p: Values): number => halfArcOf(p) - QUARTER;

/** Half of the stem from its foot, and its fillet; ends where the outside of the ring begins. */
function stem(p: Values): Segment[] {
  const half = p.stemWidth / 2;
  const outer = boreOf(p) / 2 + p.wallThickness;
  const foot = -outer - p.stemHeight;
  const x = half + p.stemFillet;
  const y = -Math.sqrt((outer + p.stemFillet) ** 2 - x * x);
  return [
    line([0, foot], [half, foot], 'foot'),
    line([half, foot], [half, y], 'stem'),
    arc([x, y], p.stemFillet, Math.PI, Math.atan2(-y, -x) - Math.PI, 'stem-fillet'),
  ].filter(({ x0, y0, x1, y1 }) => Math.hypot(x1 - x0, y1 - y0) > 1e-6);
}

/** Outside of the ring from the fillet to the lip; the wall thins in proportion to the angle. */
function outside(p: Values, from: number): Segment[] {
  const lip = lipAngle(p);
  const at = (share: number): Point => {
    const wall = p.wallThickness + (p.tipThickness - p.wallThickness) * share;
    return polar(boreOf(p) / 2 + wall, from + (lip - from) * share);
  };
  const pieces = p.tipThickness === p.wallThickness ? 2 : PIECES;
  return Array.from({ length: pieces }, (_, i) =>
    arcThrough(at(i / pieces), at((i + 0.5) / pieces), at((i + 1) / pieces), 'outside'),
  );
}

/** The flared lip about the outside corner: outer face, round end, inner face, and the nose the rod slides over. */
function flare(p: Values): Segment[] {
  const lip = lipAngle(p);
  const wall = p.tipThickness;
  const [cx, cy] = polar(boreOf(p) / 2 + wall, lip);
  const slope = radians(p.flareAngle);
  const [dx, dy] = [p.flareLength * Math.sin(slope), p.flareLength * Math.cos(slope)];
  const [nx, ny] = [-wall * Math.cos(slope), wall * Math.sin(slope)];
  const spot = Math.min(SPOT, lip / 2);
  const nose = (start: number, end: number, tag: string) => arc([cx, cy], wall, start, end - start, tag);
  return [
    line([cx, cy], [cx + dx, cy + dy], 'flare'),
    arc([cx + dx + nx / 2, cy + dy + ny / 2], wall / 2, Math.atan2(-ny, -nx), Math.PI, 'flare'),
    line([cx + dx + nx, cy + dy + ny], [cx + nx, cy + ny], 'flare'),
    nose(Math.PI - slope, Math.PI - spot, 'nose'),
    nose(Math.PI - spot, Math.PI + spot, 'land'),
    nose(Math.PI + spot, Math.PI + lip, 'nose'),
  ];
}

/** One ring with its stem, the half at x >= 0 about the middle of the bore. */
function halfRing(p: Values): Segment[] {
  const bore = boreOf(p) / 2;
  const lip = lipAngle(p);
  const rising = stem(p);
  const last = rising.at(-1)!;
  return [
    ...rising,
    ...outside(p, Math.atan2(last.y1, last.x1)),
    ...flare(p),
    arc([0, 0], bore, lip, -lip - QUARTER, 'bore'),
    line([0, -bore], [0, -bore - p.wallThickness - p.stemHeight], 'symmetry'),
  ];
}

/** One ring, its lips spread as far as the rod needs, its stem held at the foot. */
export function planeModel(p: Values): BendingModel {
  return {
    profile: { loops: [halfRing(p)] },
    plane: 'plane-stress',
    width: { kind: 'even', width: p.clipWidth },
    mirrored: true,
    supports: [
      { tag: 'symmetry', fix: 'x' },
      { tag: 'foot', fix: 'both' },
    ],
    drive: {
      kind: 'displacement',
      lands: [{ tag: 'land', direction: [1, 0] }],
      value: 2 * clipMechanics(p).spread,
    },
    peakTags: ['bore', 'outside', 'stem-fillet'],
    factors: [],
  };
}

/** Plane y up from the middle of a ring; the rods lie along y of the body, whose foot is on z = 0. */
const placementAt = (p: Values, x: number): Placement => [
  ...[1, 0, 0, 0],
  ...[0, 0, 1, 0],
  ...[0, -1, 0, 0],
  ...[x, 0, centreHeight(p), 1],
];

/** On its side the layers lie in the plane of bending; standing on its foot they lie across the back. */
const layerNormal = (use: Use): number | null => (use.layers === 'across' ? QUARTER : null);

const TAPER =
  'the wall thins only from the fillet of the stem on, where the formula has it thin from the edge of the stem';

export function bending(p: Values, material: Material, use: Use): Bending {
  const [first, ...others] = centres(p).map((x) => placementAt(p, x)) as [Placement, ...Placement[]];
  return {
    model: planeModel(p),
    body: 'clip',
    placements: [first, ...others],
    strainFigure: 'peak-strain',
    counts: 'tension',
    beside: null,
    forceFigures: ['deflection-force', 'mating-force', 'separation-force'],
    modulus: secantModulus(material, clipMechanics(p).strain)?.value ?? null,
    layerNormal: layerNormal(use),
    ...(p.tipThickness < p.wallThickness && { apart: TAPER }),
  };
}
