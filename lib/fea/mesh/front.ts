import type { Box } from '../profile/profile';
import type { BoundaryPoints } from './boundary';
import { Buckets } from './buckets';
import { MOST_POINTS } from './options';
import type { SizeField } from './size-field';

const SIXTH = Math.PI / 3;
const TURN = 2 * Math.PI;
/** A proposed point is taken when nothing lies nearer than this share of the wanted edge. */
const CLEARANCE = 0.78;

/** Points of the mesh: those of the boundary first, then the inner ones. */
export interface Points {
  readonly x: number[];
  readonly y: number[];
  readonly onBoundary: number;
}

interface Filling extends Points {
  /** direction each point was reached in; on the boundary the direction of travel */
  readonly heading: number[];
  readonly buckets: Buckets;
  readonly box: Box;
  readonly size: SizeField;
}

function boxOf(x: readonly number[], y: readonly number[]): Box {
  let [left, bottom, right, top] = [Infinity, Infinity, -Infinity, -Infinity];
  for (let i = 0; i < x.length; i++) {
    left = Math.min(left, x[i]!);
    right = Math.max(right, x[i]!);
    bottom = Math.min(bottom, y[i]!);
    top = Math.max(top, y[i]!);
  }
  return [left, bottom, right, top];
}

function direction(points: Points, from: number, to: number): number {
  return Math.atan2(points.y[to]! - points.y[from]!, points.x[to]! - points.x[from]!);
}

/** Directions into the material from a boundary point, dividing its inner angle into parts of about 60 degrees. */
function boundaryDirections(ahead: number, behind: number): number[] {
  const span = (((behind - ahead) % TURN) + TURN) % TURN;
  const parts = Math.max(2, Math.round(span / SIXTH));
  return Array.from({ length: parts - 1 }, (_, i) => ahead + (span * (i + 1)) / parts);
}

const innerDirections = (heading: number): number[] =>
  Array.from({ length: 6 }, (_, i) => heading + i * SIXTH);

/** Takes the point one wanted edge away in the direction, if it is in the box and free. */
function propose(fill: Filling, from: number, angle: number, here: number): void {
  const [x, y] = [fill.x[from]!, fill.y[from]!];
  const cos = Math.cos(angle);
  const sin = Math.sin(angle);
  const there = fill.size(x + here * cos, y + here * sin);
  const step = 0.5 * (here + there);
  const [px, py] = [x + step * cos, y + step * sin];
  const [left, bottom, right, top] = fill.box;
  if (px < left || px > right || py < bottom || py > top) return;
  if (!fill.buckets.isFree(px, py, CLEARANCE * there)) return;
  fill.x.push(px);
  fill.y.push(py);
  fill.heading.push(angle);
  fill.buckets.put(fill.x.length - 1);
}

/**
 * Fills a sampled boundary with points spaced as wanted: each point in turn proposes neighbours one edge away, at
 * 60 degrees to each other, taken when they are clear of all others. Points outside the profile are dropped by the
 * triangulation. Method: advancing front on a hexagonal pattern; deterministic, no random seeds. After the packing
 * approach of Shimada and Gossard (bubble mesh, 1995), from memory, without its relaxation.
 * Gives up (null) past MOST_POINTS points.
 */
export function fillInside(boundary: BoundaryPoints, size: SizeField): Points | null {
  const [x, y] = [[...boundary.x], [...boundary.y]];
  const box = boxOf(x, y);
  const buckets = new Buckets(box, x, y);
  const fill: Filling = { x, y, onBoundary: x.length, heading: [], buckets, box, size };
  const behind: number[] = [];
  for (const { from, to } of boundary.pieces) {
    fill.heading[from] = direction(fill, from, to);
    behind[to] = direction(fill, to, from);
    buckets.put(from);
  }
  for (let i = 0; i < x.length; i++) {
    if (x.length > MOST_POINTS) return null;
    const ahead = fill.heading[i]!;
    const angles = i < fill.onBoundary ? boundaryDirections(ahead, behind[i]!) : innerDirections(ahead);
    const here = size(x[i]!, y[i]!);
    for (const angle of angles) propose(fill, i, angle, here);
  }
  return fill;
}
