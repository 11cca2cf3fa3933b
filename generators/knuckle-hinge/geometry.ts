import type { Kernel, Loop, NamedSolid, Profile, Solid, Vec2 } from '@/lib/geometry/kernel';
import { loopArea } from '@/lib/geometry/loops';
import {
  arcPoints,
  boreRadius,
  inscribedArea,
  mirrored,
  moved,
  withoutRepeats,
} from '@/lib/geometry/outline';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import {
  barrelRadius,
  boredKnuckles,
  footHalf,
  knuckleLength,
  leafEdge,
  lipEnd,
  lipHeight,
  plainFrom,
  type Values,
} from './schema';

/** How far knuckles reach into the plate so that the solids fuse, mm. */
const SUNK = 0.5;

/**
 * Section of a knuckle with its neck to the leaf on +x, counter-clockwise; the axis is at (0, radius), the bed y = 0.
 * The barrel stands on a flat between 45 degree flanks.
 */
function knuckleOutline(p: Values, neck: number, segmentsPerTurn: number): Vec2[] {
  const r = barrelRadius(p);
  const start = -Math.asin((r - p.leafThickness) / r);
  const round = arcPoints([0, r], r, start, 1.25 * Math.PI, segmentsPerTurn);
  return [[-footHalf(p), 0], [neck, 0], [neck, p.leafThickness], ...round];
}

/** As above with the lip that reaches under the other leaf, on -x. */
function stoppedOutline(p: Values, neck: number, segmentsPerTurn: number): Loop {
  const top = lipHeight(p);
  const plain = knuckleOutline(p, neck, segmentsPerTurn).slice(1);
  const above = plain.filter(([x, y]) => x > 0 || y > top);
  return withoutRepeats([[-lipEnd(p), 0], ...above, [flankAt(p, top), top], [-lipEnd(p), top]]);
}

/** Where the lower left flank of the barrel is at a height, mm from the axis (negative). */
function flankAt(p: Values, height: number): number {
  const r = barrelRadius(p);
  const tangent = r * (1 - Math.SQRT1_2);
  return height < tangent ? -footHalf(p) - height : -Math.sqrt(r * r - (r - height) ** 2);
}

type Leaf = 'pinned' | 'bored';

/** Where the knuckles of a leaf begin along the pin, mm. */
function knuckleStarts(p: Values, leaf: Leaf): number[] {
  const step = knuckleLength(p) + p.gap;
  const first = leaf === 'pinned' ? 0 : 1;
  const count = leaf === 'pinned' ? boredKnuckles(p) + 1 : boredKnuckles(p);
  return Array.from({ length: count }, (_, i) => -p.hingeWidth / 2 + (first + 2 * i) * step);
}

const facing = (leaf: Leaf, loop: Loop): Loop => (leaf === 'bored' ? loop : mirrored(loop, 'x'));

/** Holes along the middle of the plain plate of the bored leaf, (x, y). */
export function holeCentres(p: Values): Vec2[] {
  const x = (plainFrom(p) + p.leafLength) / 2;
  return Array.from({ length: p.holeCount }, (_, i) => [
    x,
    -p.hingeWidth / 2 + (p.hingeWidth * (i + 0.5)) / p.holeCount,
  ]);
}

/** Seen from above, the leaf on +x with holes, from `near` the pin to its outer edge. */
function plateProfile(p: Values, near: number, kernel: Kernel): Profile {
  const [far, half] = [p.leafLength, p.hingeWidth / 2];
  const segments = kernel.quality.segmentsPerTurn;
  const radius = boreRadius(p.holeDiameter / 2, segments);
  const hole = arcPoints([0, 0], radius, 2 * Math.PI, 0, segments).slice(1);
  const holes = holeCentres(p).map((center) => moved(hole, center));
  return {
    loops: [
      [
        [near, -half],
        [far, -half],
        [far, half],
        [near, half],
      ],
      ...holes,
    ],
  };
}

/** The leaf without its knuckles, on +x. Over a lip it is undercut from the plain plate inward. */
function plate(p: Values, leaf: Leaf, kernel: Kernel): Solid[] {
  const whole = kernel.extrude(plateProfile(p, leafEdge(p), kernel), p.leafThickness);
  if (p.stop === 'none' || leaf === 'pinned') return [whole];
  const plain = kernel.extrude(plateProfile(p, plainFrom(p), kernel), p.leafThickness);
  const roof = lipHeight(p) + p.gap;
  const edge = kernel.box(
    [p.lipLength + p.gap + SUNK, p.hingeWidth, p.leafThickness - roof],
    [(leafEdge(p) + plainFrom(p) + SUNK) / 2, 0, (roof + p.leafThickness) / 2],
  );
  return [plain, edge];
}

/** Knuckles of a leaf side by side, those of the bored one with their bore. */
function knuckles(p: Values, leaf: Leaf, kernel: Kernel): Solid[] {
  const segments = kernel.quality.segmentsPerTurn;
  const neck = plainFrom(p) + SUNK;
  const radius = boreRadius(p.pinDiameter / 2 + p.gap, segments);
  const bore = arcPoints([0, barrelRadius(p)], radius, 2 * Math.PI, 0, segments).slice(1);
  const outline = knuckleSection(p, leaf, neck, segments);
  const profile: Profile = { loops: leaf === 'bored' ? [outline, bore] : [outline] };
  const lying = kernel.place(kernel.extrude(profile, knuckleLength(p)), rotation('x', Math.PI / 2));
  return knuckleStarts(p, leaf).map((from) =>
    kernel.place(lying, translation([0, from + knuckleLength(p), 0])),
  );
}

function pin(p: Values, kernel: Kernel): Solid {
  const end = (p.hingeWidth - knuckleLength(p)) / 2;
  return kernel.place(
    kernel.cylinder(p.pinDiameter / 2, 2 * end),
    compose(translation([0, end, barrelRadius(p)]), rotation('x', Math.PI / 2)),
  );
}

function knuckleSection(p: Values, leaf: Leaf, neck: number, segments: number): Loop {
  const stopped = leaf === 'pinned' && p.stop === 'flat';
  return facing(leaf, stopped ? stoppedOutline(p, neck, segments) : knuckleOutline(p, neck, segments));
}

function pinnedLeaf(p: Values, kernel: Kernel): Solid {
  const leaf = plate(p, 'pinned', kernel).map((solid) => kernel.place(solid, rotation('z', Math.PI)));
  return kernel.union([...leaf, ...knuckles(p, 'pinned', kernel), pin(p, kernel)]);
}

const boredLeaf = (p: Values, kernel: Kernel): Solid =>
  kernel.union([...plate(p, 'bored', kernel), ...knuckles(p, 'bored', kernel)]);

/** Bodies "pinned leaf" on -x and "bored leaf" on +x, lying open on z = 0, pin along y, in one another. */
export const build = (p: Values, kernel: Kernel): NamedSolid[] => [
  { name: 'pinned', solid: pinnedLeaf(p, kernel) },
  { name: 'bored', solid: boredLeaf(p, kernel) },
];

/** Volumes of the faceted bodies, mm3. */
export function volumes(p: Values, segmentsPerTurn: number): Readonly<Record<string, number>> {
  const area = (radius: number) => inscribedArea(boreRadius(radius, segmentsPerTurn), segmentsPerTurn);
  const holes = p.holeCount * area(p.holeDiameter / 2) * p.leafThickness;
  const leaf = (p.leafLength - leafEdge(p)) * p.hingeWidth * p.leafThickness - holes;
  const each = (which: Leaf) => loopArea(knuckleSection(p, which, leafEdge(p), segmentsPerTurn));
  const [bored, pinned] = [boredKnuckles(p) * knuckleLength(p), (boredKnuckles(p) + 1) * knuckleLength(p)];
  const pinArea = inscribedArea(p.pinDiameter / 2, segmentsPerTurn);
  const rebate = (plainFrom(p) - leafEdge(p)) * (lipHeight(p) + p.gap) * (p.hingeWidth - bored);
  return {
    pinned: leaf + pinned * each('pinned') + (p.hingeWidth - pinned) * pinArea,
    bored: leaf - rebate + bored * (each('bored') - area(p.pinDiameter / 2 + p.gap)),
  };
}
