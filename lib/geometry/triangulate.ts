import { KernelError, type Loop, type Vec2 } from './kernel';

const twiceArea = (a: Vec2, b: Vec2, c: Vec2) =>
  (b[0] - a[0]) * (c[1] - a[1]) - (b[1] - a[1]) * (c[0] - a[0]);

const covers = (a: Vec2, b: Vec2, c: Vec2, p: Vec2) =>
  twiceArea(a, b, p) >= 0 && twiceArea(b, c, p) >= 0 && twiceArea(c, a, p) >= 0;

/**
 * Triangles (index triples, counter-clockwise) of a simple counter-clockwise loop, by cutting ears. Every point of
 * the loop is used, also those on a straight run, so that the triangles meet a wall on the same loop without gaps.
 */
export function triangulate(loop: Loop): number[] {
  const left = loop.map((_, at) => at);
  const triangles: number[] = [];
  while (left.length > 2) {
    const ear = left.findIndex((_, at) => isEar(loop, left, at));
    if (ear < 0) throw new KernelError('triangulate', 'the loop is not simple and counter-clockwise');
    triangles.push(...corners(left, ear));
    left.splice(ear, 1);
  }
  return triangles;
}

const corners = (left: readonly number[], at: number): [number, number, number] => [
  left[(at + left.length - 1) % left.length]!,
  left[at]!,
  left[(at + 1) % left.length]!,
];

function isEar(loop: Loop, left: readonly number[], at: number): boolean {
  const ear = corners(left, at);
  const [a, b, c] = ear.map((index) => loop[index]!) as [Vec2, Vec2, Vec2];
  if (twiceArea(a, b, c) <= 1e-12) return false;
  return left.every((index) => ear.includes(index) || !covers(a, b, c, loop[index]!));
}
