import type { Vec2 } from '@/lib/geometry/kernel';
import { backSide, catchFoot, frontSide, halfWidth, inPanel, noseEnd } from './dimensions';
import { filletArc } from './fillet-arc';
import type { HookValues } from './schema';

/** Nose and catch from the straight face over the tip to the back face. */
function catchPoints(v: HookValues): Vec2[] {
  const foot: Vec2 = v.returnAngle >= 90 ? [0, v.armLength] : [0, catchFoot(v)];
  return [
    foot,
    [v.undercut, v.armLength],
    [v.undercut, v.armLength + v.landLength],
    [0, noseEnd(v)],
    [-v.tipThickness, noseEnd(v)],
    [-v.tipThickness, v.armLength],
  ];
}

/** Where the faces meet the base: with fillets on a block or wall, as they come out of a panel. */
function footPoints(v: HookValues, facets: number): { front: readonly Vec2[]; back: readonly Vec2[] } {
  if (inPanel(v)) return { front: [[0, 0]], back: [[-v.rootThickness, 0]] };
  const front = [...filletArc(frontSide(v), v.rootFillet, facets)].reverse();
  const back = filletArc(backSide(v), v.rootFillet, facets).map(([out, up]) => [-out, up] as const);
  return { front, back };
}

/**
 * Side view of arm, catch and fillets, x across the thickness and z along the arm, counter-clockwise, standing on
 * z = 0 and reaching `sunk` below it to join the base.
 */
export function sideOutline(v: HookValues, facets: number, sunk: number): readonly Vec2[] {
  const { front, back } = footPoints(v, facets);
  const under: Vec2[] =
    sunk > 0
      ? [
          [back[back.length - 1]![0], -sunk],
          [front[0]![0], -sunk],
        ]
      : [];
  return [...front, ...catchPoints(v), ...back, ...under];
}

/** Half the width from the base up, [half width, z]; an arm in a panel has its fillets here. */
function widthLine(v: HookValues, facets: number): readonly Vec2[] {
  const foot: readonly Vec2[] = inPanel(v)
    ? [...filletArc(halfWidth(v), v.rootFillet, facets)].reverse()
    : [[v.rootWidth / 2, 0]];
  return [...foot, [v.tipWidth / 2, v.armLength], [v.tipWidth / 2, noseEnd(v)]];
}

/** Front view of the arm, y across the width and z along the arm, counter-clockwise. */
export function frontOutline(v: HookValues, facets: number, sunk: number): readonly Vec2[] {
  const line = widthLine(v, facets);
  const right: Vec2[] = [[line[0]![0], -sunk], ...line];
  return [...right, ...[...right].reverse().map(([y, z]) => [-y, z] as const)];
}

function lineAt(line: readonly Vec2[], z: number): number {
  const next = line.findIndex(([, height]) => height >= z);
  if (next <= 0) return line[Math.max(next, 0)]![0];
  const [[y0, z0], [y1, z1]] = [line[next - 1]!, line[next]!];
  return z1 === z0 ? y1 : y0 + ((y1 - y0) * (z - z0)) / (z1 - z0);
}

/** Volume in mm3 of the arm above its base: the side outline swept over the width at each height. */
export function armVolume(v: HookValues, facets: number): number {
  const line = widthLine(v, facets);
  const side = sideOutline(v, facets, 0);
  const heights = line.map(([, z]) => z);
  return side.reduce((sum, from, i) => {
    const to = side[(i + 1) % side.length]!;
    return sum + sweptEdge(from, to, heights, line);
  }, 0);
}

/** Share of one edge of the side outline in the volume, exact: width and edge run straight between the heights. */
function sweptEdge(
  [x0, z0]: Vec2,
  [x1, z1]: Vec2,
  heights: readonly number[],
  line: readonly Vec2[],
): number {
  if (z0 === z1) return 0;
  const inside = heights.filter((z) => z > Math.min(z0, z1) && z < Math.max(z0, z1));
  const cuts = [z0, ...(z1 > z0 ? inside : [...inside].reverse()), z1];
  const swept = (z: number) => 2 * lineAt(line, z) * (x0 + ((x1 - x0) * (z - z0)) / (z1 - z0));
  let sum = 0;
  for (let i = 1; i < cuts.length; i += 1) {
    const [low, high] = [cuts[i - 1]!, cuts[i]!];
    sum += ((swept(low) + 4 * swept((low + high) / 2) + swept(high)) / 6) * (high - low);
  }
  return sum;
}
