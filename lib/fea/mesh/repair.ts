/** Corner angle, rad, under which the points of a triangle are moved. */
const THIN = (22 * Math.PI) / 180;
/** Moves tried, as shares of the triangle's mean edge, in six directions each. */
const STEPS = [0.3, 0.15, 0.07];
const ROUNDS = 3;

/** Straight triangles as corner numbers, three each, in either sense of turning. */
export interface Triangles {
  readonly x: number[];
  readonly y: number[];
  readonly corners: Uint32Array;
  readonly inside: Uint8Array;
  readonly isBoundary: readonly boolean[];
}

/** Smallest angle of a triangle, rad; negative where it is turned over (the corners run clockwise). */
function smallestAngle({ x, y, corners }: Triangles, triangle: number): number {
  let smallest = Math.PI;
  for (let k = 0; k < 3; k++) {
    const a = corners[3 * triangle + k]!;
    const b = corners[3 * triangle + ((k + 1) % 3)]!;
    const c = corners[3 * triangle + ((k + 2) % 3)]!;
    const ux = x[b]! - x[a]!;
    const uy = y[b]! - y[a]!;
    const vx = x[c]! - x[a]!;
    const vy = y[c]! - y[a]!;
    smallest = Math.min(smallest, Math.atan2(uy * vx - ux * vy, ux * vx + uy * vy));
  }
  return smallest;
}

function trianglesAt({ corners, inside }: Triangles, point: number): number[] {
  const found: number[] = [];
  for (let edge = 0; edge < corners.length; edge++) {
    const triangle = Math.floor(edge / 3);
    if (corners[edge] === point && inside[triangle]) found.push(triangle);
  }
  return found;
}

const worst = (mesh: Triangles, around: readonly number[]): number =>
  around.reduce((least, triangle) => Math.min(least, smallestAngle(mesh, triangle)), Math.PI);

function meanEdge({ x, y, corners }: Triangles, around: readonly number[], point: number): number {
  let sum = 0;
  for (const triangle of around) {
    for (let k = 0; k < 3; k++) {
      const other = corners[3 * triangle + k]!;
      sum += Math.sqrt((x[other]! - x[point]!) ** 2 + (y[other]! - y[point]!) ** 2) / 2;
    }
  }
  return sum / around.length;
}

/** Moves a point to the best of the places tried, judged by the smallest angle around it. */
function improve(mesh: Triangles, point: number): void {
  const { x, y } = mesh;
  const around = trianglesAt(mesh, point);
  let best = worst(mesh, around);
  let [bestX, bestY] = [x[point]!, y[point]!];
  const [fromX, fromY] = [bestX, bestY];
  const edge = meanEdge(mesh, around, point);
  for (const step of STEPS) {
    for (let k = 0; k < 6; k++) {
      x[point] = fromX + step * edge * Math.cos((k * Math.PI) / 3);
      y[point] = fromY + step * edge * Math.sin((k * Math.PI) / 3);
      const here = worst(mesh, around);
      if (here > best) [best, bestX, bestY] = [here, x[point]!, y[point]!];
    }
  }
  x[point] = bestX;
  y[point] = bestY;
}

/**
 * Moves the inner points of thin triangles to where their smallest angle is largest. Returns whether there were any.
 * Method: optimisation-based smoothing by pattern search, after Freitag and Ollivier-Gooch, Int. J. Numer. Meth.
 * Engrg. 40 (1997), from memory. Few triangles are thin, so it costs little.
 */
export function repairThin(mesh: Triangles): boolean {
  let found = false;
  for (let round = 0; round < ROUNDS; round++) {
    for (let triangle = 0; triangle < mesh.inside.length; triangle++) {
      if (!mesh.inside[triangle] || smallestAngle(mesh, triangle) >= THIN) continue;
      found = true;
      for (let k = 0; k < 3; k++) {
        const point = mesh.corners[3 * triangle + k]!;
        if (!mesh.isBoundary[point]) improve(mesh, point);
      }
    }
  }
  return found;
}
