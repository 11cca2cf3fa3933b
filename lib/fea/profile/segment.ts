/**
 * The two pieces a profile is made of: straight lines and circular arcs. Lengths mm, angles rad.
 * The material lies on the left of the direction of travel: outer loops run counter-clockwise, holes clockwise.
 */
export type Point = readonly [number, number];

export interface Segment {
  readonly kind: 'line' | 'arc';
  readonly x0: number;
  readonly y0: number;
  readonly x1: number;
  readonly y1: number;
  /** centre, radius, start angle and signed sweep of an arc; 0 for a line */
  readonly cx: number;
  readonly cy: number;
  readonly radius: number;
  readonly start: number;
  readonly sweep: number;
  /** name by which supports, loads and the search for the peak find the segment */
  readonly tag: string;
  /** largest element edge wanted here, mm; Infinity leaves it to the mesher */
  readonly size: number;
}

const TURN = 2 * Math.PI;

export function line(from: Point, to: Point, tag = '', size = Infinity): Segment {
  const [x0, y0] = from;
  const [x1, y1] = to;
  return { kind: 'line', x0, y0, x1, y1, cx: 0, cy: 0, radius: 0, start: 0, sweep: 0, tag, size };
}

/** An arc from angle `start` through `sweep`, counter-clockwise positive. */
export function arc(
  centre: Point,
  radius: number,
  start: number,
  sweep: number,
  tag = '',
  size = Infinity,
): Segment {
  const [cx, cy] = centre;
  const end = start + sweep;
  return {
    kind: 'arc',
    x0: cx + radius * Math.cos(start),
    y0: cy + radius * Math.sin(start),
    x1: cx + radius * Math.cos(end),
    y1: cy + radius * Math.sin(end),
    cx,
    cy,
    radius,
    start,
    sweep,
    tag,
    size,
  };
}

/** The arc, shorter than a half circle, from one point through another to a third; a line where they are in line. */
export function arcThrough(from: Point, through: Point, to: Point, tag = '', size = Infinity): Segment {
  const [ax, ay] = [through[0] - from[0], through[1] - from[1]];
  const [bx, by] = [to[0] - from[0], to[1] - from[1]];
  const cross = 2 * (ax * by - ay * bx);
  if (Math.abs(cross) < 1e-9 * (bx * bx + by * by)) return line(from, to, tag, size);
  const [aa, bb] = [ax * ax + ay * ay, bx * bx + by * by];
  const [cx, cy] = [(by * aa - ay * bb) / cross, (ax * bb - bx * aa) / cross];
  const start = Math.atan2(-cy, -cx);
  const turn = Math.atan2(by - cy, bx - cx) - start;
  const sweep = Math.atan2(Math.sin(turn), Math.cos(turn));
  const made = arc([from[0] + cx, from[1] + cy], Math.sqrt(cx * cx + cy * cy), start, sweep, tag, size);
  return { ...made, x0: from[0], y0: from[1], x1: to[0], y1: to[1] };
}

export function segmentLength(s: Segment): number {
  if (s.kind === 'arc') return Math.abs(s.radius * s.sweep);
  return Math.sqrt((s.x1 - s.x0) ** 2 + (s.y1 - s.y0) ** 2);
}

/** The point at the share `t` of the length, 0 to 1. */
export function pointAt(s: Segment, t: number): Point {
  if (t === 0) return [s.x0, s.y0];
  if (s.kind === 'line') return [s.x0 + (s.x1 - s.x0) * t, s.y0 + (s.y1 - s.y0) * t];
  const angle = s.start + s.sweep * t;
  return [s.cx + s.radius * Math.cos(angle), s.cy + s.radius * Math.sin(angle)];
}

/** Unit vector into the material at the share `t`. */
export function inwardNormal(s: Segment, t: number): Point {
  if (s.kind === 'line') {
    const length = segmentLength(s);
    return [-(s.y1 - s.y0) / length, (s.x1 - s.x0) / length];
  }
  const angle = s.start + s.sweep * t;
  const side = -Math.sign(s.sweep);
  return [side * Math.cos(angle), side * Math.sin(angle)];
}

/** True where the direction `angle` from the centre meets the arc. */
export function arcSpans(s: Segment, angle: number): boolean {
  let along = ((angle - s.start) * Math.sign(s.sweep)) % TURN;
  if (along < 0) along += TURN;
  const slack = 1e-12;
  return along <= Math.abs(s.sweep) + slack || along >= TURN - slack;
}

/** Shortest distance from a point to the segment. */
export function distanceTo(s: Segment, x: number, y: number): number {
  return s.kind === 'line' ? distanceToLine(s, x, y) : distanceToArc(s, x, y);
}

function distanceToLine(s: Segment, x: number, y: number): number {
  const dx = s.x1 - s.x0;
  const dy = s.y1 - s.y0;
  const share = ((x - s.x0) * dx + (y - s.y0) * dy) / (dx * dx + dy * dy);
  const t = Math.max(0, Math.min(1, share));
  const ex = x - s.x0 - dx * t;
  const ey = y - s.y0 - dy * t;
  return Math.sqrt(ex * ex + ey * ey);
}

function distanceToArc(s: Segment, x: number, y: number): number {
  const ex = x - s.cx;
  const ey = y - s.cy;
  if (arcSpans(s, Math.atan2(ey, ex))) return Math.abs(Math.sqrt(ex * ex + ey * ey) - s.radius);
  const toStart = (x - s.x0) ** 2 + (y - s.y0) ** 2;
  const toEnd = (x - s.x1) ** 2 + (y - s.y1) ** 2;
  return Math.sqrt(Math.min(toStart, toEnd));
}

/** Distance along a ray (unit direction) to its first meeting with the segment past `beyond`; Infinity if none. */
export function rayHit(s: Segment, from: Point, direction: Point, beyond: number): number {
  return s.kind === 'line' ? rayHitsLine(s, from, direction, beyond) : rayHitsArc(s, from, direction, beyond);
}

function rayHitsLine(s: Segment, from: Point, direction: Point, beyond: number): number {
  const ex = s.x1 - s.x0;
  const ey = s.y1 - s.y0;
  const [dx, dy] = direction;
  const cross = dx * ey - dy * ex;
  if (Math.abs(cross) < 1e-12) return Infinity;
  const qx = s.x0 - from[0];
  const qy = s.y0 - from[1];
  const along = (qx * ey - qy * ex) / cross;
  const share = (qx * dy - qy * dx) / cross;
  return along > beyond && share > -1e-9 && share < 1 + 1e-9 ? along : Infinity;
}

function rayHitsArc(s: Segment, from: Point, direction: Point, beyond: number): number {
  const fx = from[0] - s.cx;
  const fy = from[1] - s.cy;
  const b = fx * direction[0] + fy * direction[1];
  const inner = b * b - (fx * fx + fy * fy - s.radius * s.radius);
  if (inner < 0) return Infinity;
  const root = Math.sqrt(inner);
  for (const along of [-b - root, -b + root]) {
    const angle = Math.atan2(fy + along * direction[1], fx + along * direction[0]);
    if (along > beyond && arcSpans(s, angle)) return along;
  }
  return Infinity;
}
