import type { Kernel, Loop, NamedSolid, Vec2 } from '@/lib/geometry/kernel';
import { loopArea } from '@/lib/geometry/loops';
import { arcPoints, boreRadius, inscribedArea, mirrored, withoutRepeats } from '@/lib/geometry/outline';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import { radians } from '@/lib/units';
import { centreHeight, centres } from './ring';
import { boreOf, halfArcOf, type Values } from './schema';

const QUARTER = Math.PI / 2;

/** Angle of the fillet's centre seen from the ring's, below horizontal (negative). */
function filletCentre(p: Values): Vec2 {
  const outer = boreOf(p) / 2 + p.wallThickness;
  const x = p.stemWidth / 2 + p.stemFillet;
  return [x, -Math.sqrt((outer + p.stemFillet) ** 2 - x * x)];
}

/** Outside of the ring from the fillet to the lip: the wall thins in proportion to the angle. */
function outside(p: Values, from: number, lip: number, segmentsPerTurn: number): Vec2[] {
  const pieces = Math.max(8, Math.ceil(((lip - from) / (2 * Math.PI)) * segmentsPerTurn));
  return Array.from({ length: pieces + 1 }, (_, i) => {
    const share = i / pieces;
    const radius = boreOf(p) / 2 + p.wallThickness + (p.tipThickness - p.wallThickness) * share;
    const at = from + (lip - from) * share;
    return [radius * Math.cos(at), radius * Math.sin(at)];
  });
}

/** Flared lip about the outside corner C: rounded end, inner face, nose. Runs from C round to the bore. */
function flare(p: Values, lip: number, segmentsPerTurn: number): Vec2[] {
  const wall = p.tipThickness;
  const radius = boreOf(p) / 2 + wall;
  const corner: Vec2 = [radius * Math.cos(lip), radius * Math.sin(lip)];
  const angle = radians(p.flareAngle);
  const [dx, dy] = [Math.sin(angle), Math.cos(angle)];
  const [nx, ny] = [-Math.cos(angle), Math.sin(angle)];
  const far: Vec2 = [
    corner[0] + dx * p.flareLength + (nx * wall) / 2,
    corner[1] + dy * p.flareLength + (ny * wall) / 2,
  ];
  const outward = Math.atan2(-ny, -nx);
  const end = arcPoints(far, wall / 2, outward, outward + Math.PI, segmentsPerTurn);
  const nose = arcPoints(corner, wall, Math.PI - angle, lip + Math.PI, segmentsPerTurn);
  return [...end, ...nose];
}

/** Right half of one ring about its own middle, from the foot round the lip to the bottom of the bore. */
function halfRing(p: Values, segmentsPerTurn: number): Vec2[] {
  const lip = -QUARTER + halfArcOf(p);
  const centre = filletCentre(p);
  const towards = Math.atan2(-centre[1], -centre[0]);
  const foot: Vec2 = [p.stemWidth / 2, p.footThickness - centreHeight(p)];
  return [
    foot,
    ...arcPoints(centre, p.stemFillet, Math.PI, towards, segmentsPerTurn),
    ...outside(p, Math.atan2(centre[1], centre[0]), lip, segmentsPerTurn),
    ...flare(p, lip, segmentsPerTurn),
    ...arcPoints([0, 0], boreRadius(boreOf(p) / 2, segmentsPerTurn), lip, -QUARTER, segmentsPerTurn),
  ];
}

/** Half the length of the foot, mm. */
export const footHalf = (p: Values): number =>
  ((p.clipCount - 1) / 2) * p.spacing + p.stemWidth / 2 + p.footOverhang;

/** Section across the rods, counter-clockwise: x along the row, y up from the underside of the foot. */
export function section(p: Values, segmentsPerTurn: number): Loop {
  const half = halfRing(p, segmentsPerTurn);
  const ring = [...half, ...mirrored(half, 'x')];
  const height = centreHeight(p);
  const end = footHalf(p);
  const rings = [...centres(p)].reverse().flatMap((x) => ring.map((at): Vec2 => [at[0] + x, at[1] + height]));
  return withoutRepeats([[-end, 0], [end, 0], [end, p.footThickness], ...rings, [-end, p.footThickness]]);
}

/** Middle of the hole or slot at the right end of the foot, mm from the middle of the row. */
export const fasteningAt = (p: Values): number =>
  footHalf(p) - 1.5 - (p.fastening === 'screws' ? p.holeDiameter : p.slotWidth) / 2;

function cutters(p: Values, kernel: Kernel) {
  const segments = kernel.quality.segmentsPerTurn;
  const height = p.footThickness + 2;
  const at = (x: number) => translation([x, 0, -1]);
  const cutter =
    p.fastening === 'screws'
      ? kernel.cylinder(boreRadius(p.holeDiameter / 2, segments), height, { segments })
      : kernel.extrude(kernel.outlines.rectangle(p.slotWidth, p.slotLength), height);
  return [fasteningAt(p), -fasteningAt(p)].map((x) => kernel.place(cutter, at(x)));
}

/** One body "clip" standing on its foot, rods along y, mouths up. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const lying = kernel.extrude({ loops: [section(p, kernel.quality.segmentsPerTurn)] }, p.clipWidth);
  const upright = kernel.place(lying, compose(translation([0, p.clipWidth / 2, 0]), rotation('x', QUARTER)));
  if (p.fastening === 'tape') return [{ name: 'clip', solid: upright }];
  return [{ name: 'clip', solid: kernel.subtract(upright, cutters(p, kernel)) }];
}

/** Volume of the faceted body, mm3. */
export function volumes(p: Values, segmentsPerTurn: number): Readonly<Record<string, number>> {
  const hole =
    p.fastening === 'screws'
      ? inscribedArea(boreRadius(p.holeDiameter / 2, segmentsPerTurn), segmentsPerTurn)
      : p.fastening === 'strap'
        ? p.slotWidth * p.slotLength
        : 0;
  return { clip: loopArea(section(p, segmentsPerTurn)) * p.clipWidth - 2 * hole * p.footThickness };
}
