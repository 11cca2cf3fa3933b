import type { Kernel, Loop, NamedSolid, Solid, Vec2 } from '@/lib/geometry/kernel';
import { loopArea } from '@/lib/geometry/loops';
import { arcPoints, withoutRepeats } from '@/lib/geometry/outline';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import { withMarks } from '../coupon';
import { backDepth, backWidth, layersOf, middleAt, thicknessOf, type Values } from './schema';

/** How far a hinge reaches into the leaf they share, so that the solids fuse, mm. */
const SUNK = 1;

const fillet = (center: Vec2, radius: number, from: number, to: number, segments: number): Vec2[] =>
  radius > 0 ? arcPoints(center, radius, from, to, segments) : [center];

/** Section of one hinge across the fold, counter-clockwise in (x, z): its stub on -x, the free leaf on +x. */
export function section(p: Values, layers: number, stub: number, segments: number): Loop {
  const [half, roof, top, r] = [p.webLength / 2, thicknessOf(p, layers), p.leafThickness, p.webFillet];
  const quarter = Math.PI / 2;
  return withoutRepeats([
    [-half - stub, 0],
    [half + p.leafLength, 0],
    [half + p.leafLength, top],
    [half, top],
    ...fillet([half - r, roof + r], r, 0, -quarter, segments),
    ...fillet([-half + r, roof + r], r, -quarter, -2 * quarter, segments),
    [-half, top],
    [-half - stub, top],
  ]);
}

function hinge(p: Values, layers: number, middle: number, kernel: Kernel): Solid {
  const loop = section(p, layers, SUNK, kernel.quality.segmentsPerTurn);
  return kernel.place(
    kernel.extrude({ loops: [loop] }, p.leafWidth),
    compose(translation([0, middle + p.leafWidth / 2, 0]), rotation('x', Math.PI / 2)),
  );
}

/** One body "ladder", flat on z = 0: fold line along y, the leaf that all share on -x. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const from = -p.webLength / 2 - backDepth(p);
  const back = kernel.box(
    [backDepth(p), backWidth(p), p.leafThickness],
    [from + backDepth(p) / 2, 0, p.leafThickness / 2],
  );
  const layers = layersOf(p);
  const hinges = layers.map((count, at) => hinge(p, count, middleAt(p, at), kernel));
  const marks = layers.map((count, at) => ({
    text: String(count),
    at: [from + backDepth(p) / 2, middleAt(p, at)] as const,
  }));
  const whole = kernel.union([back, ...hinges]);
  return [{ name: 'ladder', solid: withMarks(kernel, whole, p.leafThickness, marks, p) }];
}

/** Volume of the faceted body, mm3; none in closed form with figures on it. */
export function volumes(p: Values, segments: number): Readonly<Record<string, number>> | null {
  if (p.marks !== 'none') return null;
  const hinges = layersOf(p).reduce((sum, count) => sum + loopArea(section(p, count, 0, segments)), 0);
  return { ladder: hinges * p.leafWidth + backDepth(p) * backWidth(p) * p.leafThickness };
}
