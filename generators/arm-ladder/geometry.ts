import type { Kernel, Loop, NamedSolid } from '@/lib/geometry/kernel';
import { loopArea } from '@/lib/geometry/loops';
import { type Corner, roundedPolygon } from '@/lib/geometry/outline';
import { withMarks } from '../coupon';
import { type Cell, cellsOf, markAt } from './layout';
import { baseDepth, markOf, strainsOf, type Values } from './schema';

function cellCorners({ arm, post }: Cell, p: Values): Corner[] {
  const { armLength: tip, rootFillet: radius } = p;
  return [
    { at: [post[1], tip] },
    { at: [post[0], tip] },
    { at: [post[0], 0] },
    { at: [arm[1], 0], radius },
    { at: [arm[1], tip] },
    { at: [arm[0], tip] },
    { at: [arm[0], 0], radius },
  ];
}

/** Seen from above, counter-clockwise: base below y = 0, arms and stops standing on it along +y. */
export function outline(p: Values, segmentsPerTurn: number): Loop {
  const cells = cellsOf(p);
  const [first, ...others] = [...cells].reverse().map((cell) => cellCorners(cell, p));
  const depth = baseDepth(p);
  const corners: Corner[] = [
    { at: [0, -depth] },
    { at: [cells.at(-1)!.post[1], -depth] },
    ...first!,
    ...others.flatMap((cell) => [{ at: [cell[0]!.at[0], 0] as const }, ...cell]),
    { at: [0, 0] },
  ];
  return roundedPolygon(corners, Math.round(segmentsPerTurn / 4));
}

/** One body "ladder", lying on z = 0. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const flat = kernel.extrude({ loops: [outline(p, kernel.quality.segmentsPerTurn)] }, p.armWidth);
  const strains = strainsOf(p);
  const marks = cellsOf(p).map((cell, at) => ({ text: markOf(strains[at]!), at: markAt(p, cell) }));
  return [{ name: 'ladder', solid: withMarks(kernel, flat, p.armWidth, marks, p) }];
}

/** Volume of the faceted body, mm3; none in closed form with figures on it. */
export const volumes = (p: Values, segmentsPerTurn: number) =>
  p.marks === 'none' ? { ladder: loopArea(outline(p, segmentsPerTurn)) * p.armWidth } : null;
