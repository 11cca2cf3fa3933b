import { extent, loopArea, type Profile, profileArea } from './profile';
import { arcSpans, distanceTo, type Point, type Segment, segmentLength } from './segment';

/** Shares of the profile's extent: gap allowed between segments of a chain, and shortest segment. */
const JOINT = 1e-6;
const SHORTEST = 1e-5;

/**
 * What stands in the way of meshing a profile, or null: a number that is not finite, an open chain, a segment
 * without length, a loop that runs the wrong way, segments that cross or touch.
 * Method: closed-form meeting points of every pair of lines and arcs, O(n^2) for n segments (n is some tens).
 */
export function profileFault(profile: Profile): string | null {
  const scale = extent(profile);
  if (!Number.isFinite(scale) || scale <= 0) return 'the profile has a dimension that is not a finite number';
  for (const loop of profile.loops) {
    const fault = chainFault(loop, scale);
    if (fault) return fault;
  }
  if (loopArea(profile.loops[0] ?? []) <= 0) return 'the outer loop does not run counter-clockwise';
  if (profileArea(profile) <= 0) return 'the holes are larger than the outer loop';
  return crossingFault(profile, scale);
}

function chainFault(loop: readonly Segment[], scale: number): string | null {
  for (let i = 0; i < loop.length; i++) {
    const s = loop[i]!;
    const next = loop[(i + 1) % loop.length]!;
    if (!(s.size > 0)) return `the edge length wished for at "${s.tag}" is not a positive number`;
    if (segmentLength(s) < SHORTEST * scale) return `the edge "${s.tag}" has no length`;
    const gap = Math.abs(next.x0 - s.x1) + Math.abs(next.y0 - s.y1);
    if (!(gap <= JOINT * scale)) return `the profile is open behind the edge "${s.tag}"`;
  }
  return null;
}

function crossingFault(profile: Profile, scale: number): string | null {
  const all = profile.loops.flat();
  for (let i = 0; i < all.length; i++) {
    for (let j = i + 1; j < all.length; j++) {
      if (crosses(all[i]!, all[j]!, scale)) return `the edges "${all[i]!.tag}" and "${all[j]!.tag}" cross`;
    }
  }
  return null;
}

function crosses(a: Segment, b: Segment, scale: number): boolean {
  const slack = 10 * JOINT * scale;
  const apart = (p: Point, x: number, y: number) => Math.abs(p[0] - x) + Math.abs(p[1] - y) > slack;
  return meetings(a, b).some(
    (p) => ends(a).every(([x, y]) => apart(p, x, y)) || ends(b).every(([x, y]) => apart(p, x, y)),
  );
}

const ends = (s: Segment): readonly Point[] => [
  [s.x0, s.y0],
  [s.x1, s.y1],
];

/** Points the two segments have in common; overlapping pieces count by their ends only. */
function meetings(a: Segment, b: Segment): Point[] {
  if (a.kind === 'line' && b.kind === 'line') return lineWithLine(a, b);
  if (a.kind === 'line') return lineWithArc(a, b);
  if (b.kind === 'line') return lineWithArc(b, a);
  return arcWithArc(a, b);
}

function lineWithLine(a: Segment, b: Segment): Point[] {
  const dx = a.x1 - a.x0;
  const dy = a.y1 - a.y0;
  const ex = b.x1 - b.x0;
  const ey = b.y1 - b.y0;
  const cross = dx * ey - dy * ex;
  if (Math.abs(cross) < 1e-9 * segmentLength(a) * segmentLength(b)) return overlap(a, b);
  const t = ((b.x0 - a.x0) * ey - (b.y0 - a.y0) * ex) / cross;
  const s = ((b.x0 - a.x0) * dy - (b.y0 - a.y0) * dx) / cross;
  return inUnit(t) && inUnit(s) ? [[a.x0 + dx * t, a.y0 + dy * t]] : [];
}

/** Ends of either of two parallel lines that lie on the other. */
function overlap(a: Segment, b: Segment): Point[] {
  const near = 1e-9 * (segmentLength(a) + segmentLength(b));
  const onB = ends(a).filter(([x, y]) => distanceTo(b, x, y) < near);
  const onA = ends(b).filter(([x, y]) => distanceTo(a, x, y) < near);
  return [...onB, ...onA];
}

const inUnit = (t: number): boolean => t >= 0 && t <= 1;

function lineWithArc(l: Segment, a: Segment): Point[] {
  const length = segmentLength(l);
  const dx = (l.x1 - l.x0) / length;
  const dy = (l.y1 - l.y0) / length;
  const fx = l.x0 - a.cx;
  const fy = l.y0 - a.cy;
  const b = fx * dx + fy * dy;
  const inner = b * b - (fx * fx + fy * fy - a.radius * a.radius);
  if (inner <= 0) return [];
  const root = Math.sqrt(inner);
  return [-b - root, -b + root]
    .filter((t) => t >= 0 && t <= length)
    .map((t): Point => [l.x0 + dx * t, l.y0 + dy * t])
    .filter(([x, y]) => arcSpans(a, Math.atan2(y - a.cy, x - a.cx)));
}

function arcWithArc(a: Segment, b: Segment): Point[] {
  const dx = b.cx - a.cx;
  const dy = b.cy - a.cy;
  const between = Math.sqrt(dx * dx + dy * dy);
  if (between < 1e-12 * (a.radius + b.radius)) return [];
  const along = (between * between + a.radius * a.radius - b.radius * b.radius) / (2 * between);
  const inner = a.radius * a.radius - along * along;
  if (inner <= 0) return [];
  const across = Math.sqrt(inner);
  return [across, -across]
    .map((h): Point => [a.cx + (along * dx - h * dy) / between, a.cy + (along * dy + h * dx) / between])
    .filter(([x, y]) => arcSpans(a, Math.atan2(y - a.cy, x - a.cx)))
    .filter(([x, y]) => arcSpans(b, Math.atan2(y - b.cy, x - b.cx)));
}
