import { edgesOf } from './edges';

export interface FlatTriangles {
  readonly indices: Uint32Array;
  readonly parent: Uint32Array;
}

/** True where the triangles cut from these two lie in one plane, so that the edge between them may be moved. */
export type Coplanar = (oneParent: number, otherParent: number) => boolean;

/** A flip that does not turn the worse pair into the better one could go on for ever. */
const FLIPS_PER_SIDE = 12;
const FLAT_ANGLE = 1e-9;

function twinsOf(indices: Uint32Array): Int32Array {
  const { ofSide, sides } = edgesOf(indices);
  return Int32Array.from(indices, (_, side) => {
    const edge = ofSide[side]!;
    return sides[2 * edge] === side ? sides[2 * edge + 1]! : sides[2 * edge]!;
  });
}

/** Sine and cosine, times the two lengths, of the angle at `at` between `from` and `to`. */
function angleAt(p: Float32Array, at: number, from: number, to: number): { sin: number; cos: number } {
  const u = [0, 1, 2].map((k) => p[3 * from + k]! - p[3 * at + k]!) as [number, number, number];
  const v = [0, 1, 2].map((k) => p[3 * to + k]! - p[3 * at + k]!) as [number, number, number];
  const cross = [u[1] * v[2] - u[2] * v[1], u[2] * v[0] - u[0] * v[2], u[0] * v[1] - u[1] * v[0]] as const;
  return {
    sin: Math.sqrt(cross[0] ** 2 + cross[1] ** 2 + cross[2] ** 2),
    cos: u[0] * v[0] + u[1] * v[1] + u[2] * v[2],
  };
}

/** Delaunay's rule: the angles across an edge add up to no more than a half turn. */
function breaksRule(p: Float32Array, a: number, b: number, c: number, d: number): boolean {
  const one = angleAt(p, c, a, b);
  const other = angleAt(p, d, a, b);
  const size = Math.hypot(one.sin, one.cos) * Math.hypot(other.sin, other.cos);
  return one.cos * other.sin + one.sin * other.cos < -FLAT_ANGLE * size;
}

/** Twice the area of abc over that of the quadrilateral it belongs to, negative where turned over. */
function turnsAs(p: Float32Array, [a, b, c]: readonly number[], [d, e, f]: readonly number[]): boolean {
  const normal = (i: number, j: number, k: number) => {
    const u = [0, 1, 2].map((axis) => p[3 * j + axis]! - p[3 * i + axis]!) as [number, number, number];
    const v = [0, 1, 2].map((axis) => p[3 * k + axis]! - p[3 * i + axis]!) as [number, number, number];
    return [u[1] * v[2] - u[2] * v[1], u[2] * v[0] - u[0] * v[2], u[0] * v[1] - u[1] * v[0]];
  };
  const [n, m] = [normal(a!, b!, c!), normal(d!, e!, f!)];
  return n[0]! * m[0]! + n[1]! * m[1]! + n[2]! * m[2]! > 0;
}

/**
 * Turns edges inside flat faces until no triangle is thinner than it must be (Delaunay's rule, by Lawson's flips).
 * Long fans across a face, which bend badly, become short ones; the surface stays the same.
 */
export function relaxed(
  positions: Float32Array,
  { indices: given, parent }: FlatTriangles,
  coplanar: Coplanar,
): FlatTriangles {
  const indices = given.slice();
  const twin = twinsOf(indices);
  const stack = Array.from(indices, (_, side) => side);
  let left = FLIPS_PER_SIDE * indices.length;
  while (stack.length > 0 && left > 0) {
    const side = stack.pop()!;
    if (!mayFlip(positions, indices, parent, twin, side, coplanar)) continue;
    stack.push(...flip(indices, twin, side));
    left -= 1;
  }
  return { indices, parent };
}

const second = (side: number): number => (side % 3 === 2 ? side - 2 : side + 1);
const third = (side: number): number => (side % 3 === 0 ? side + 2 : side - 1);

function mayFlip(
  positions: Float32Array,
  indices: Uint32Array,
  parent: Uint32Array,
  twin: Int32Array,
  side: number,
  coplanar: Coplanar,
): boolean {
  const other = twin[side]!;
  if (other < 0 || !coplanar(parent[Math.floor(side / 3)]!, parent[Math.floor(other / 3)]!)) return false;
  const [a, b, c, d] = [
    indices[side]!,
    indices[second(side)]!,
    indices[third(side)]!,
    indices[third(other)]!,
  ];
  return breaksRule(positions, a, b, c, d) && turnsAs(positions, [a, d, c], [d, b, c]);
}

/** Triangles abc and bad become adc and dbc; returns the four outer sides. */
function flip(indices: Uint32Array, twin: Int32Array, side: number): number[] {
  const other = twin[side]!;
  const [t, u] = [side - (side % 3), other - (other % 3)];
  const [a, b, c, d] = [
    indices[side]!,
    indices[second(side)]!,
    indices[third(side)]!,
    indices[third(other)]!,
  ];
  const outer = [twin[second(other)]!, twin[third(side)]!, twin[third(other)]!, twin[second(side)]!];
  indices.set([a, d, c], t);
  indices.set([d, b, c], u);
  const places = [t, t + 2, u, u + 1];
  places.forEach((place, k) => {
    twin[place] = outer[k]!;
    if (outer[k]! >= 0) twin[outer[k]!] = place;
  });
  twin[t + 1] = u + 2;
  twin[u + 2] = t + 1;
  return places;
}
