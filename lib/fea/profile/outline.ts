import { arc, line, type Point, type Segment } from './segment';

/** A corner of an outline. A radius rounds it by a tangent arc; `tag` names the edge that leaves the corner. */
export interface Corner {
  readonly at: Point;
  readonly radius?: number;
  readonly tag?: string;
  /** tag of the rounding; `fillet` unless given */
  readonly filletTag?: string;
  readonly size?: number;
}

interface Rounded {
  readonly start: Point;
  readonly end: Point;
  readonly arc: Segment | null;
}

function unit(from: Point, to: Point): Point {
  const dx = to[0] - from[0];
  const dy = to[1] - from[1];
  const length = Math.sqrt(dx * dx + dy * dy);
  return [dx / length, dy / length];
}

/** Sweep from one direction to another about a centre, in the sense of `turn` (+1 counter-clockwise). */
function sweepBetween(start: number, end: number, turn: number): number {
  const sweep = end - start;
  if (turn > 0 && sweep < 0) return sweep + 2 * Math.PI;
  if (turn < 0 && sweep > 0) return sweep - 2 * Math.PI;
  return sweep;
}

/** The tangent arc that rounds a corner; sharp corners and straight passages are returned as they are. */
function roundCorner(before: Point, corner: Corner, after: Point): Rounded {
  const { at, radius = 0 } = corner;
  const arriving = unit(before, at);
  const leaving = unit(at, after);
  const cross = arriving[0] * leaving[1] - arriving[1] * leaving[0];
  if (radius <= 0 || Math.abs(cross) < 1e-9) return { start: at, end: at, arc: null };
  const turn = Math.sign(cross);
  const cosine = arriving[0] * leaving[0] + arriving[1] * leaving[1];
  const setback = radius * Math.tan(Math.acos(Math.max(-1, Math.min(1, cosine))) / 2);
  const start: Point = [at[0] - arriving[0] * setback, at[1] - arriving[1] * setback];
  const end: Point = [at[0] + leaving[0] * setback, at[1] + leaving[1] * setback];
  const centre: Point = [start[0] - turn * arriving[1] * radius, start[1] + turn * arriving[0] * radius];
  const from = Math.atan2(start[1] - centre[1], start[0] - centre[0]);
  const to = Math.atan2(end[1] - centre[1], end[0] - centre[0]);
  const tag = corner.filletTag ?? 'fillet';
  return { start, end, arc: arc(centre, radius, from, sweepBetween(from, to, turn), tag, corner.size) };
}

/**
 * Closed loop through corners joined by lines, corners rounded by tangent arcs. Corners run counter-clockwise for
 * an outer loop, clockwise for a hole. Throws a RangeError naming the edge when two roundings overrun it or a corner
 * is not a finite number: the caller's dimensions do not fit.
 */
export function outline(corners: readonly Corner[]): Segment[] {
  const count = corners.length;
  const astray = corners.find(({ at: [x, y], radius = 0 }) => !Number.isFinite(x + y + radius));
  if (astray) throw new RangeError(`the corner at the edge "${astray.tag ?? ''}" is not a finite number`);
  const rounded = corners.map((corner, i) =>
    roundCorner(corners[(i + count - 1) % count]!.at, corner, corners[(i + 1) % count]!.at),
  );
  return corners.flatMap((corner, i) => {
    const own = rounded[i]!;
    const next = rounded[(i + 1) % count]!;
    const edge = edgeBetween(corner, own.end, next.start, corners[(i + 1) % count]!.at);
    return [own.arc, edge].filter((s): s is Segment => s !== null);
  });
}

function edgeBetween(corner: Corner, from: Point, to: Point, next: Point): Segment | null {
  const ex = next[0] - corner.at[0];
  const ey = next[1] - corner.at[1];
  const along = (to[0] - from[0]) * ex + (to[1] - from[1]) * ey;
  const whole = ex * ex + ey * ey;
  if (along < -1e-9 * whole) throw new RangeError(`roundings overrun the edge "${corner.tag ?? ''}"`);
  return along > 1e-9 * whole ? line(from, to, corner.tag, corner.size) : null;
}
