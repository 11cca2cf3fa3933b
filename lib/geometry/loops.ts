import type { Loop, Profile, Vec2 } from './kernel';

/** Signed area in mm2: positive for a counter-clockwise loop. */
export function loopArea(loop: Loop): number {
  let double = 0;
  for (let at = 0; at < loop.length; at += 1) {
    const [x1, y1] = loop[at]!;
    const [x2, y2] = loop[(at + 1) % loop.length]!;
    double += x1 * y2 - x2 * y1;
  }
  return double / 2;
}

export const profileArea = (profile: Profile): number =>
  profile.loops.reduce((sum, loop) => sum + loopArea(loop), 0);

/** The loop counter-clockwise, whichever way it was given. */
export const counterClockwise = (loop: Loop): Loop => (loopArea(loop) < 0 ? [...loop].reverse() : loop);

/**
 * The part of a loop inside a convex counter-clockwise one, cut edge by edge (Sutherland and Hodgman). Pieces that come
 * apart stay joined by edges of no width, so the area is right for any loop.
 */
export function convexCut(loop: Loop, convex: Loop): Loop {
  return convex.reduce<Loop>((kept, [ax, ay], at) => {
    const [bx, by] = convex[(at + 1) % convex.length]!;
    const inside = ([x, y]: Vec2) => (bx - ax) * (y - ay) - (by - ay) * (x - ax);
    return kept.flatMap((point, i): Vec2[] => {
      const next = kept[(i + 1) % kept.length]!;
      const [here, there] = [inside(point), inside(next)];
      const share = here / (here - there);
      const crossing: Vec2 = [
        point[0] + share * (next[0] - point[0]),
        point[1] + share * (next[1] - point[1]),
      ];
      const crosses = here >= 0 !== there >= 0;
      return [...(here >= 0 ? [point] : []), ...(crosses ? [crossing] : [])];
    });
  }, loop);
}

/** How often the loop runs counter-clockwise round the point. */
export function windingAt(loop: Loop, [x, y]: Vec2): number {
  let winding = 0;
  for (let at = 0; at < loop.length; at += 1) {
    const [x1, y1] = loop[at]!;
    const [x2, y2] = loop[(at + 1) % loop.length]!;
    if (y1 <= y === y2 <= y) continue;
    const side = (x2 - x1) * (y - y1) - (x - x1) * (y2 - y1);
    if (y1 <= y && side > 0) winding += 1;
    if (y1 > y && side < 0) winding -= 1;
  }
  return winding;
}

interface Edge {
  readonly loop: number;
  readonly at: number;
  readonly last: number;
  readonly a: Vec2;
  readonly b: Vec2;
}

const turn = (a: Vec2, b: Vec2, c: Vec2): number =>
  Math.sign((b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]));

const within = (a: Vec2, b: Vec2, p: Vec2): boolean =>
  Math.min(a[0], b[0]) <= p[0] &&
  p[0] <= Math.max(a[0], b[0]) &&
  Math.min(a[1], b[1]) <= p[1] &&
  p[1] <= Math.max(a[1], b[1]);

/** True where two segments share a point. */
function meet(p: Edge, q: Edge): boolean {
  const [t1, t2] = [turn(p.a, p.b, q.a), turn(p.a, p.b, q.b)];
  const [t3, t4] = [turn(q.a, q.b, p.a), turn(q.a, q.b, p.b)];
  if (t1 !== t2 && t3 !== t4) return true;
  return (
    (t1 === 0 && within(p.a, p.b, q.a)) ||
    (t2 === 0 && within(p.a, p.b, q.b)) ||
    (t3 === 0 && within(q.a, q.b, p.a)) ||
    (t4 === 0 && within(q.a, q.b, p.b))
  );
}

/** Neighbours share one end by right; they clash only where one folds back on the other. */
function foldsBack(p: Edge, q: Edge): boolean {
  const [first, second] = p.b === q.a ? [p, q] : [q, p];
  const forward =
    (first.b[0] - first.a[0]) * (second.b[0] - second.a[0]) +
    (first.b[1] - first.a[1]) * (second.b[1] - second.a[1]);
  return turn(first.a, first.b, second.b) === 0 && forward < 0;
}

function neighbours(p: Edge, q: Edge): boolean {
  const apart = Math.abs(p.at - q.at);
  return p.loop === q.loop && (apart === 1 || apart === p.last);
}

const leftOf = (edge: Edge) => Math.min(edge.a[0], edge.b[0]);
const rightOf = (edge: Edge) => Math.max(edge.a[0], edge.b[0]);
const apartInY = (p: Edge, q: Edge) =>
  Math.max(p.a[1], p.b[1]) < Math.min(q.a[1], q.b[1]) || Math.max(q.a[1], q.b[1]) < Math.min(p.a[1], p.b[1]);

/** First pair of edges that cross or touch, as a sentence, or null where every loop is simple and apart. */
function clash(loops: readonly Loop[]): string | null {
  const edges = loops.flatMap((points, loop) =>
    points.map(
      (a, at): Edge => ({ loop, at, last: points.length - 1, a, b: points[(at + 1) % points.length]! }),
    ),
  );
  edges.sort((p, q) => leftOf(p) - leftOf(q));
  for (let i = 0; i < edges.length; i += 1) {
    const p = edges[i]!;
    const reach = rightOf(p);
    for (let j = i + 1; j < edges.length && leftOf(edges[j]!) <= reach; j += 1) {
      const q = edges[j]!;
      if (apartInY(p, q)) continue;
      if (neighbours(p, q) ? foldsBack(p, q) : meet(p, q)) {
        const where = `near x ${q.a[0].toFixed(3)}, y ${q.a[1].toFixed(3)} mm`;
        return p.loop === q.loop
          ? `a loop crosses or touches itself ${where}`
          : `two loops cross or touch ${where}`;
      }
    }
  }
  return null;
}

function nestingFault(loops: readonly Loop[]): string | null {
  for (const loop of loops) {
    const around = loops.reduce((sum, other) => sum + (other === loop ? 0 : windingAt(other, loop[0]!)), 0);
    if (loopArea(loop) > 0 && around !== 0) return 'an outline lies inside another outline';
    if (loopArea(loop) < 0 && around !== 1) return 'a hole lies outside every outline';
  }
  return null;
}

/** Why the profile cannot bound a solid, or null: outlines counter-clockwise, holes clockwise, simple, disjoint. */
export function profileFault({ loops }: Profile): string | null {
  if (loops.length === 0) return 'the profile has no loop';
  for (const loop of loops) {
    if (loop.length < 3) return 'a loop has fewer than three points';
    if (!loop.every(([x, y]) => Number.isFinite(x) && Number.isFinite(y)))
      return 'a point is not a finite number';
    if (Math.abs(loopArea(loop)) < 1e-9) return 'a loop encloses no area';
  }
  if (loopArea(loops[0]!) < 0) return 'the first loop runs clockwise';
  return clash(loops) ?? nestingFault(loops);
}
