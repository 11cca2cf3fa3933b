import type { Vec2 } from '@/lib/geometry/kernel';
import { armWidth, catchFoot, noseEnd, taperAngle } from './dimensions';
import type { HookValues } from './schema';

/** Points of an arc in the plane, ends included, angles in rad. */
function arc(center: Vec2, radius: number, from: number, to: number, facets: number): Vec2[] {
  return Array.from({ length: facets + 1 }, (_, i) => {
    const angle = from + ((to - from) * i) / facets;
    return [center[0] + radius * Math.cos(angle), center[1] + radius * Math.sin(angle)] as const;
  });
}

const QUARTER = Math.PI / 2;

/** Fillet of the straight face, from the base up. */
const frontFillet = ({ rootFillet: r }: HookValues, facets: number): Vec2[] =>
  arc([r, r], r, 3 * QUARTER, 2 * QUARTER, facets);

/** Fillet of the tapered face, from the arm down to the base. */
function backFillet(v: HookValues, facets: number): Vec2[] {
  const lean = taperAngle(v);
  const face = -(v.rootThickness - v.rootFillet * Math.tan(lean));
  const center: Vec2 = [face - v.rootFillet / Math.cos(lean), v.rootFillet];
  return arc(center, v.rootFillet, -lean, -QUARTER, facets);
}

/** Nose and catch from the straight face over the tip to the back face. */
function catchPoints(v: HookValues): Vec2[] {
  const foot: Vec2[] = v.returnAngle >= 90 ? [[0, v.armLength]] : [[0, catchFoot(v)]];
  return [
    ...foot,
    [v.undercut, v.armLength],
    [v.undercut, v.armLength + v.landLength],
    [0, noseEnd(v)],
    [-v.tipThickness, noseEnd(v)],
    [-v.tipThickness, v.armLength],
  ];
}

/**
 * Side view of arm, catch and fillets, x across the thickness and z along the arm, counter-clockwise, standing on
 * z = 0 and reaching `sunk` below it to join the base.
 */
export function sideOutline(v: HookValues, facets: number, sunk: number): readonly Vec2[] {
  const front = frontFillet(v, facets);
  const back = backFillet(v, facets);
  const foot: Vec2[] =
    sunk > 0
      ? [
          [back[back.length - 1]![0], -sunk],
          [front[0]![0], -sunk],
        ]
      : [];
  return [...front, ...catchPoints(v), ...back, ...foot];
}

/** Front view of the arm, y across the width and z along the arm, counter-clockwise. */
export function frontOutline(v: HookValues, sunk: number): readonly Vec2[] {
  const half = [
    [v.rootWidth / 2, -sunk],
    [v.rootWidth / 2, 0],
    [v.tipWidth / 2, v.armLength],
    [v.tipWidth / 2, noseEnd(v)],
  ] as const;
  return [...half, ...[...half].reverse().map(([y, z]) => [-y, z] as const)];
}

/** Volume in mm3 of the arm above its base: the side outline swept over the width at each height. */
export function armVolume(v: HookValues, facets: number): number {
  const points = sideOutline(v, facets, 0);
  return points.reduce((sum, [x0, z0], i) => {
    const [x1, z1] = points[(i + 1) % points.length]!;
    const ends = x0 * armWidth(v, z0) + x1 * armWidth(v, z1);
    const middle = ((x0 + x1) / 2) * armWidth(v, (z0 + z1) / 2);
    return sum + ((ends + 4 * middle) / 6) * (z1 - z0);
  }, 0);
}
