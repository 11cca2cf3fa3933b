import { pointAt, type Segment } from '../profile/segment';
import type { Mesh } from './mesh';
import { following, type Triangulation } from './triangulate';

interface Numbering {
  readonly nodes: number[];
  /** node of each point of the triangulation, -1 where it is outside */
  readonly cornerOf: Int32Array;
  /** middle node of each half-edge, -1 until made */
  readonly middleOf: Int32Array;
  readonly edges: number[];
}

function numberCorners(t: Triangulation, within: readonly number[]): Numbering {
  const nodes: number[] = [];
  const cornerOf = new Int32Array(t.x.length).fill(-1);
  for (const triangle of within) {
    for (let edge = 3 * triangle; edge < 3 * triangle + 3; edge++) {
      const point = t.corners[edge]!;
      if (cornerOf[point]! >= 0) continue;
      cornerOf[point] = nodes.length / 2;
      nodes.push(t.x[point]!, t.y[point]!);
    }
  }
  return { nodes, cornerOf, middleOf: new Int32Array(t.corners.length).fill(-1), edges: [] };
}

/** Node in the middle of a half-edge; on a boundary piece it lies on the true curve. */
function middleNode(t: Triangulation, made: Numbering, edge: number, segments: readonly Segment[]): number {
  const known = made.middleOf[edge]!;
  if (known >= 0) return known;
  const node = made.nodes.length / 2;
  const [a, b] = [t.corners[edge]!, t.corners[following(edge)]!];
  const piece = t.pieces[t.pieceAt[edge]!];
  if (piece) {
    made.nodes.push(...pointAt(segments[piece.segment]!, (piece.t0 + piece.t1) / 2));
    made.edges.push(made.cornerOf[piece.from]!, node, made.cornerOf[piece.to]!, piece.segment);
  } else {
    made.nodes.push((t.x[a]! + t.x[b]!) / 2, (t.y[a]! + t.y[b]!) / 2);
  }
  made.middleOf[edge] = node;
  const twin = t.twins[edge]!;
  if (twin >= 0) made.middleOf[twin] = node;
  return node;
}

/** Six-node triangles from the triangles inside; curved where an edge lies on an arc. */
export function quadratic(t: Triangulation, segments: readonly Segment[]): Mesh {
  const within = [...t.inside.keys()].filter((triangle) => t.inside[triangle]);
  const made = numberCorners(t, within);
  const cornerCount = made.nodes.length / 2;
  const elements = new Int32Array(6 * within.length);
  within.forEach((triangle, e) => {
    // corners 0, 2, 1 turn the clockwise triangle round; the half-edge that ends in a corner then follows it
    [0, 2, 1].forEach((corner, k) => {
      const edge = 3 * triangle + corner;
      const before = 3 * triangle + ((corner + 2) % 3);
      elements[6 * e + k] = made.cornerOf[t.corners[edge]!]!;
      elements[6 * e + 3 + k] = middleNode(t, made, before, segments);
    });
  });
  return {
    nodes: Float64Array.from(made.nodes),
    nodeCount: made.nodes.length / 2,
    cornerCount,
    elements,
    elementCount: within.length,
    edges: Int32Array.from(made.edges),
    edgeCount: made.edges.length / 4,
    tags: segments.map((s) => s.tag),
  };
}
