import { shapeValues } from '../element/shape';
import type { Mesh } from '../mesh/mesh';

/** Where points lie in a mesh. */
export interface Anchors {
  /** element of each point: the one it is in, or the nearest to it */
  readonly elements: Int32Array;
  /** six weights of the element's nodes per point */
  readonly weights: Float32Array;
  /** xy per point: from the place the weights give to the point itself; more than rounding only outside the mesh */
  readonly offsets: Float32Array;
}

/** Elements listed by the cells of a uniform grid that their boxes touch. */
interface Grid {
  readonly left: number;
  readonly bottom: number;
  readonly cell: number;
  readonly columns: number;
  readonly rows: number;
  readonly lists: readonly number[][];
}

function bounds(values: Float64Array, axis: 0 | 1, nodes: Iterable<number>): [number, number] {
  let low = Infinity;
  let high = -Infinity;
  for (const node of nodes) {
    low = Math.min(low, values[2 * node + axis]!);
    high = Math.max(high, values[2 * node + axis]!);
  }
  return [low, high];
}

function newGrid(mesh: Mesh): Grid {
  const [left, right] = bounds(mesh.nodes, 0, mesh.elements);
  const [bottom, top] = bounds(mesh.nodes, 1, mesh.elements);
  const cell = Math.sqrt(((right - left) * (top - bottom)) / mesh.elementCount);
  const columns = Math.floor((right - left) / cell) + 1;
  const rows = Math.floor((top - bottom) / cell) + 1;
  const lists: number[][] = Array.from({ length: columns * rows }, () => []);
  const grid: Grid = { left, bottom, cell, columns, rows, lists };
  for (let e = 0; e < mesh.elementCount; e++) enter(grid, mesh, e);
  return grid;
}

const column = (grid: Grid, x: number): number =>
  Math.min(grid.columns - 1, Math.max(0, Math.floor((x - grid.left) / grid.cell)));
const row = (grid: Grid, y: number): number =>
  Math.min(grid.rows - 1, Math.max(0, Math.floor((y - grid.bottom) / grid.cell)));

function enter(grid: Grid, mesh: Mesh, element: number): void {
  const nodes = mesh.elements.subarray(6 * element, 6 * element + 6);
  const [left, right] = bounds(mesh.nodes, 0, nodes);
  const [bottom, top] = bounds(mesh.nodes, 1, nodes);
  for (let j = row(grid, bottom); j <= row(grid, top); j++) {
    for (let i = column(grid, left); i <= column(grid, right); i++)
      grid.lists[i + grid.columns * j]!.push(element);
  }
}

interface Found {
  readonly element: number;
  readonly a: number;
  readonly b: number;
  /** smallest area coordinate: not negative inside */
  readonly depth: number;
}

/** Area coordinates of a point in the straight triangle of an element. */
function coordinates(mesh: Mesh, element: number, x: number, y: number): Found {
  const { nodes, elements } = mesh;
  const [p, q, r] = [0, 1, 2].map((k) => 2 * elements[6 * element + k]!) as [number, number, number];
  const ux = nodes[q]! - nodes[p]!;
  const uy = nodes[q + 1]! - nodes[p + 1]!;
  const vx = nodes[r]! - nodes[p]!;
  const vy = nodes[r + 1]! - nodes[p + 1]!;
  const dx = x - nodes[p]!;
  const dy = y - nodes[p + 1]!;
  const area = ux * vy - uy * vx;
  const a = (dx * vy - dy * vx) / area;
  const b = (ux * dy - uy * dx) / area;
  return { element, a, b, depth: Math.min(a, b, 1 - a - b) };
}

/** The element that holds the point, searched in rings of cells round it; the nearest by area coordinates if none. */
function find(grid: Grid, mesh: Mesh, x: number, y: number): Found {
  const [i, j] = [column(grid, x), row(grid, y)];
  let best: Found | null = null;
  for (let ring = 0; ring < Math.max(grid.columns, grid.rows) && !best; ring++) {
    for (const element of ringOf(grid, i, j, ring)) {
      const here = coordinates(mesh, element, x, y);
      if (!best || here.depth > best.depth) best = here;
      if (here.depth >= 0) return here;
    }
  }
  return best!;
}

function ringOf(grid: Grid, i: number, j: number, ring: number): number[] {
  const found: number[] = [];
  for (let r = Math.max(0, j - ring); r <= Math.min(grid.rows - 1, j + ring); r++) {
    for (let c = Math.max(0, i - ring); c <= Math.min(grid.columns - 1, i + ring); c++) {
      if (Math.max(Math.abs(r - j), Math.abs(c - i)) === ring)
        found.push(...grid.lists[c + grid.columns * r]!);
    }
  }
  return found;
}

/** Area coordinates moved into the triangle. */
function clamped({ a, b }: Found): readonly [number, number] {
  const [low, high] = [Math.max(0, a), Math.max(0, b)];
  const over = Math.max(1, low + high);
  return [low / over, high / over];
}

/**
 * Finds the points (xy each) in a mesh, so that fields on its nodes can be read there. Points outside take the
 * nearest element. Method: uniform grid of element boxes and area coordinates of straight triangles.
 */
export function locate(mesh: Mesh, points: Float32Array): Anchors {
  const grid = newGrid(mesh);
  const count = points.length / 2;
  const anchors: Anchors = {
    elements: new Int32Array(count),
    weights: new Float32Array(6 * count),
    offsets: new Float32Array(2 * count),
  };
  for (let i = 0; i < count; i++) anchor(grid, mesh, anchors, i, points[2 * i]!, points[2 * i + 1]!);
  return anchors;
}

function anchor(grid: Grid, mesh: Mesh, anchors: Anchors, i: number, x: number, y: number): void {
  const found = find(grid, mesh, x, y);
  const weights = shapeValues(...clamped(found));
  let [px, py] = [0, 0];
  for (let k = 0; k < 6; k++) {
    const node = mesh.elements[6 * found.element + k]!;
    px += weights[k]! * mesh.nodes[2 * node]!;
    py += weights[k]! * mesh.nodes[2 * node + 1]!;
  }
  anchors.elements[i] = found.element;
  anchors.weights.set(weights, 6 * i);
  anchors.offsets[2 * i] = x - px;
  anchors.offsets[2 * i + 1] = y - py;
}
