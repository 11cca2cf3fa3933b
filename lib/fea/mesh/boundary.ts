import type { Profile } from '../profile/profile';
import { pointAt, type Segment, segmentLength } from '../profile/segment';
import type { SizeField } from './size-field';

/** A piece of a segment between two points of the mesh, from share `t0` to `t1` of the segment's length. */
export interface Piece {
  readonly from: number;
  readonly to: number;
  readonly segment: number;
  readonly t0: number;
  readonly t1: number;
}

/** Points on the boundary, xy each, and the pieces that join them. */
export interface BoundaryPoints {
  readonly x: number[];
  readonly y: number[];
  readonly pieces: Piece[];
}

/** Largest turn of one piece of an arc, rad: keeps a curved element edge close to the circle. */
const WIDEST_TURN = 0.8;

/** Integral of ds / h along a segment, tabulated by marching with steps of 0.4 h. */
interface Fineness {
  readonly shares: readonly number[];
  readonly sums: readonly number[];
}

function fineness(s: Segment, size: SizeField): Fineness {
  const length = segmentLength(s);
  const shares = [0];
  const sums = [0];
  let before = size(s.x0, s.y0);
  let gone = 0;
  let sum = 0;
  while (gone < length * (1 - 1e-9)) {
    const usual = 0.4 * before;
    const step = gone + 1.3 * usual > length ? length - gone : usual;
    gone += step;
    const [x, y] = pointAt(s, Math.min(1, gone / length));
    const here = size(x, y);
    sum += 0.5 * (1 / here + 1 / before) * step;
    shares.push(gone / length);
    sums.push(sum);
    before = here;
  }
  return { shares, sums };
}

/** Shares of the length at equal increments of the tabulated integral. */
function evenShares({ shares, sums }: Fineness, count: number): number[] {
  const total = sums.at(-1)!;
  const even = [0];
  let at = 0;
  for (let i = 1; i < count; i++) {
    const wanted = (total * i) / count;
    while (at < sums.length - 2 && sums[at + 1]! < wanted) at++;
    const part = (wanted - sums[at]!) / (sums[at + 1]! - sums[at]!);
    even.push(shares[at]! + part * (shares[at + 1]! - shares[at]!));
  }
  return [...even, 1];
}

function sharesOf(s: Segment, size: SizeField): number[] {
  const table = fineness(s, size);
  const byTurn = s.kind === 'arc' ? Math.ceil(Math.abs(s.sweep) / WIDEST_TURN) : 1;
  const count = Math.max(1, byTurn, Math.ceil(table.sums.at(-1)! - 0.05));
  return evenShares(table, count);
}

/**
 * Points along every segment so that each piece is one wanted edge long: equal increments of the integral of ds / h.
 * Marching rather than halving keeps neighbouring pieces alike; coarse sampling makes angles of 4 to 10 degrees.
 */
export function sampleBoundary(profile: Profile, size: SizeField): BoundaryPoints {
  const points: BoundaryPoints = { x: [], y: [], pieces: [] };
  let segment = 0;
  for (const loop of profile.loops) {
    const first = points.x.length;
    for (const s of loop) addSegment(points, s, segment++, sharesOf(s, size));
    closeLoop(points.pieces, first);
  }
  return points;
}

function addSegment(points: BoundaryPoints, s: Segment, segment: number, shares: readonly number[]): void {
  for (let i = 0; i + 1 < shares.length; i++) {
    const [x, y] = pointAt(s, shares[i]!);
    const from = points.x.length;
    points.x.push(x);
    points.y.push(y);
    points.pieces.push({ from, to: from + 1, segment, t0: shares[i]!, t1: shares[i + 1]! });
  }
}

function closeLoop(pieces: Piece[], first: number): void {
  const last = pieces.at(-1)!;
  pieces[pieces.length - 1] = { ...last, to: first };
}
