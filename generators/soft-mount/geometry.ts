import type { Kernel, Loop, NamedSolid, Solid, Vec2 } from '@/lib/geometry/kernel';
import { loopArea } from '@/lib/geometry/loops';
import {
  arcPoints,
  boreRadius,
  type Corner,
  inscribedArea,
  mirrored,
  moved,
  roundedPolygon,
} from '@/lib/geometry/outline';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import { columnsX, columnsY, freeHeight, holeZone, onColumns, springOffset, type Values } from './schema';

/** How far columns and strips reach into the plates, mm. */
const SUNK = 0.5;

/** Column in front view, x across and z from the lower plate, with fillets in the plane and feet in the plates. */
function columnLoop(p: Values, segments: number): Loop {
  const [half, h, r] = [p.columnSide / 2, p.columnHeight, p.fillet];
  const right: Corner[] = [
    { at: [half + r, -SUNK] },
    { at: [half + r, 0] },
    { at: [half, 0], radius: r },
    { at: [half, h], radius: r },
    { at: [half + r, h] },
    { at: [half + r, h + SUNK] },
  ];
  const left = right.map(({ at: [x, z], radius }): Corner => ({ at: [-x, z], radius })).reverse();
  return roundedPolygon([...right, ...left], segments);
}

/** One face of the lower half of the strip, from its plate to its middle, `side` 1 right and -1 left of its path. */
function face(p: Values, side: 1 | -1, segmentsPerTurn: number): Vec2[] {
  const [r, t, foot, leg] = [p.bendRadius, p.stripThickness / 2, p.fillet, p.legLength];
  const near = arcPoints([r, foot], r - side * t, Math.PI, Math.PI / 2, segmentsPerTurn);
  const far = arcPoints([r + leg, foot + 2 * r], r + side * t, -Math.PI / 2, Math.PI / 2, segmentsPerTurn);
  const tip: Vec2[] = [
    [side * (t + foot), -SUNK],
    [side * (t + foot), 0],
    ...arcPoints(
      [side * (t + foot), foot],
      foot,
      -Math.PI / 2,
      side > 0 ? -Math.PI : 0,
      segmentsPerTurn,
    ).slice(1),
  ];
  return [...tip, ...near, ...far];
}

const half = (points: readonly Vec2[], height: number): Vec2[] =>
  points.map(([x, z]): Vec2 => [-x, height - z]);

/** The whole strip, x across and z from the lower plate, its middle line at x = 0 on both plates. */
export function stripLoop(p: Values, segmentsPerTurn: number): Loop {
  const height = freeHeight(p);
  const right = face(p, 1, segmentsPerTurn);
  const left = face(p, -1, segmentsPerTurn);
  const above = half(left, height).reverse();
  const back = half(right, height);
  const loop = [...right, ...above, ...back, ...[...left].reverse()];
  return loop.filter((point, i) => {
    const before = loop[(i + loop.length - 1) % loop.length]!;
    return Math.hypot(point[0] - before[0], point[1] - before[1]) > 1e-6;
  });
}

/** A front view given a width along y, from y = from. */
const across = (kernel: Kernel, loop: Loop, from: number, width: number): Solid =>
  kernel.place(
    kernel.extrude({ loops: [loop] }, width),
    compose(translation([0, from + width, 0]), rotation('x', Math.PI / 2)),
  );

export const holeX = (p: Values): number => (p.plateLength - holeZone(p)) / 2;

function plate(p: Values, kernel: Kernel): Solid {
  const [x, y] = [p.plateLength / 2, p.plateWidth / 2];
  const outline: Loop = [
    [-x, -y],
    [x, -y],
    [x, y],
    [-x, y],
  ];
  if (p.holeDiameter === 0) return kernel.extrude({ loops: [outline] }, p.plateThickness);
  const n = kernel.quality.segmentsPerTurn;
  const hole = arcPoints([0, 0], boreRadius(p.holeDiameter / 2, n), 2 * Math.PI, 0, n).slice(1);
  const holes = [-1, 1].map((side) => moved(hole, [side * holeX(p), 0]));
  return kernel.extrude({ loops: [outline, ...holes] }, p.plateThickness);
}

function columns(p: Values, kernel: Kernel): Solid[] {
  const loop = columnLoop(p, kernel.quality.segmentsPerFillet);
  const one = across(kernel, loop, -p.columnSide / 2, p.columnSide);
  return columnsX(p).flatMap((x) => columnsY(p).map((y) => kernel.place(one, translation([x, y, 0]))));
}

function springs(p: Values, kernel: Kernel): Solid[] {
  const right = stripLoop(p, kernel.quality.segmentsPerTurn);
  const place = (loop: Loop, x: number) =>
    across(kernel, moved(loop, [x, 0]), -p.plateWidth / 2, p.plateWidth);
  return [place(right, springOffset(p)), place(mirrored(right, 'x'), -springOffset(p))];
}

/** One body "mount": lower plate under z = 0, soft part above it, upper plate on top. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const lower = kernel.place(plate(p, kernel), translation([0, 0, -p.plateThickness]));
  const upper = kernel.place(lower, translation([0, 0, p.plateThickness + freeHeight(p)]));
  const soft = onColumns(p) ? columns(p, kernel) : springs(p, kernel);
  return [{ name: 'mount', solid: kernel.union([lower, upper, ...soft]) }];
}

/** Volume of the columns, or of both strips, between the plates, mm3. */
function softVolume(p: Values, segmentsPerTurn: number): number {
  if (onColumns(p)) {
    const column = loopArea(columnLoop(p, segmentsPerTurn === 96 ? 16 : 8));
    const sunk = 2 * SUNK * (p.columnSide + 2 * p.fillet);
    return p.columnsAlong * p.columnsAcross * (column - sunk) * p.columnSide;
  }
  const sunk = 2 * SUNK * (p.stripThickness + 2 * p.fillet);
  return 2 * (loopArea(stripLoop(p, segmentsPerTurn)) - sunk) * p.plateWidth;
}

/** Volume of the faceted body, mm3. */
export function volumes(p: Values, segmentsPerTurn: number): Readonly<Record<string, number>> {
  const hole = inscribedArea(boreRadius(p.holeDiameter / 2, segmentsPerTurn), segmentsPerTurn);
  const holes = p.holeDiameter > 0 ? 2 * hole : 0;
  const plates = 2 * (p.plateLength * p.plateWidth - holes) * p.plateThickness;
  return { mount: plates + softVolume(p, segmentsPerTurn) };
}
