import { KernelError, type Loop, type Vec2 } from './kernel';

/** Light plane helpers for part families: points only, lengths mm, angles rad, counter-clockwise positive. */

const TURN = 2 * Math.PI;

/** Greatest distance in mm between a circle and the chords of a polygon inscribed in it. */
export const chordError = (radius: number, segments: number): number =>
  radius * (1 - Math.cos(Math.PI / segments));

/**
 * Radius of the polygon whose flats touch a circle of `radius` from outside. Polygons are inscribed, so a bore made
 * at its nominal radius comes out tight by the chord error: make bores at this radius.
 */
export const boreRadius = (radius: number, segments: number): number => radius / Math.cos(Math.PI / segments);

/** Area in mm2 of a regular polygon inscribed in a circle. */
export const inscribedArea = (radius: number, segments: number): number =>
  (segments / 2) * radius * radius * Math.sin(TURN / segments);

export const onCircle = ([x, y]: Vec2, radius: number, angle: number): Vec2 => [
  x + radius * Math.cos(angle),
  y + radius * Math.sin(angle),
];

/** Points from one angle to the other, both ends included, as fine as `segmentsPerTurn`. */
export function arcPoints(
  center: Vec2,
  radius: number,
  from: number,
  to: number,
  segmentsPerTurn: number,
): Vec2[] {
  const pieces = Math.max(1, Math.ceil((Math.abs(to - from) / TURN) * segmentsPerTurn - 1e-9));
  return Array.from({ length: pieces + 1 }, (_, at) =>
    onCircle(center, radius, from + ((to - from) * at) / pieces),
  );
}

const direction = (from: Vec2, to: Vec2): Vec2 => {
  const length = Math.hypot(to[0] - from[0], to[1] - from[1]);
  return [(to[0] - from[0]) / length, (to[1] - from[1]) / length];
};

/** Distance in mm from the corner to where a fillet of `radius` starts, on either side. */
export function filletSetback(before: Vec2, corner: Vec2, after: Vec2, radius: number): number {
  const [ux, uy] = direction(before, corner);
  const [vx, vy] = direction(corner, after);
  return radius * Math.tan(Math.abs(Math.atan2(ux * vy - uy * vx, ux * vx + uy * vy)) / 2);
}

/**
 * The arc of `radius` that is tangent to both lines through a corner, from the first line to the second, both ends
 * included; `segmentsPerFillet` pieces for a right angle. A corner that runs straight on, or a radius of 0, stays.
 */
export function filletPoints(
  before: Vec2,
  corner: Vec2,
  after: Vec2,
  radius: number,
  segmentsPerFillet: number,
): Vec2[] {
  const [ux, uy] = direction(before, corner);
  const [vx, vy] = direction(corner, after);
  const bend = Math.atan2(ux * vy - uy * vx, ux * vx + uy * vy);
  if (radius <= 0 || Math.abs(bend) < 1e-9) return [corner];
  const setback = radius * Math.tan(Math.abs(bend) / 2);
  const side = Math.sign(bend);
  const start: Vec2 = [corner[0] - ux * setback, corner[1] - uy * setback];
  const center: Vec2 = [start[0] - uy * side * radius, start[1] + ux * side * radius];
  const from = Math.atan2(start[1] - center[1], start[0] - center[0]);
  return arcPoints(center, radius, from, from + bend, segmentsPerFillet * 4);
}

export interface Corner {
  readonly at: Vec2;
  /** fillet or rounding radius in mm; none where not given */
  readonly radius?: number;
}

/** A closed polygon with every corner rounded by its own radius; refuses fillets that run into each other. */
export function roundedPolygon(corners: readonly Corner[], segmentsPerFillet: number): Loop {
  const at = (index: number) => corners[(index + corners.length) % corners.length]!;
  const setback = (index: number) =>
    filletSetback(at(index - 1).at, at(index).at, at(index + 1).at, at(index).radius ?? 0);
  for (let index = 0; index < corners.length; index += 1) {
    const [a, b] = [at(index).at, at(index + 1).at];
    const spare = Math.hypot(b[0] - a[0], b[1] - a[1]) - setback(index) - setback(index + 1);
    if (spare < -1e-9) {
      throw new KernelError('roundedPolygon', `the roundings of corners ${index} and ${index + 1} overlap`);
    }
  }
  const points = corners.flatMap(({ at: corner, radius = 0 }, index) =>
    filletPoints(at(index - 1).at, corner, at(index + 1).at, radius, segmentsPerFillet),
  );
  return withoutRepeats(points);
}

/** The loop without points that lie within 1e-6 mm of the one before. */
export function withoutRepeats(points: Loop): Loop {
  return points.filter((point, index) => {
    const before = points[(index + points.length - 1) % points.length]!;
    return Math.hypot(point[0] - before[0], point[1] - before[1]) > 1e-6;
  });
}

/** The points moved by a vector. */
export const moved = (points: Loop, [dx, dy]: Vec2): Vec2[] => points.map(([x, y]) => [x + dx, y + dy]);

/** The points turned about the origin. */
export const turned = (points: Loop, angle: number): Vec2[] => {
  const [c, s] = [Math.cos(angle), Math.sin(angle)];
  return points.map(([x, y]) => [c * x - s * y, s * x + c * y]);
};

/** The loop mirrored at the line x = 0 ("x") or y = 0 ("y"), in reverse order so that its direction stays. */
export const mirrored = (points: Loop, coordinate: 'x' | 'y'): Vec2[] =>
  points.map(([x, y]): Vec2 => (coordinate === 'x' ? [-x + 0, y] : [x, -y + 0])).reverse();

/** A closed loop from its half on one side of x = 0 ("x") or y = 0 ("y"): the half, then its mirror image. */
export const symmetric = (half: Loop, coordinate: 'x' | 'y'): Loop =>
  withoutRepeats([...half, ...mirrored(half, coordinate)]);
