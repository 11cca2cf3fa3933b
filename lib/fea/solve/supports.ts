import { edgesWith } from '../element/edge-load';
import type { Mesh } from '../mesh/mesh';
import type { Support } from '../model';

const DIRECTIONS = { x: [0], y: [1], both: [0, 1] } as const;

/** Nodes on the edges with the tag. Throws when the profile has no such edge: the model is wrong. */
export function nodesOn(mesh: Mesh, tag: string): number[] {
  const edges = edgesWith(mesh, tag);
  if (edges.length === 0) throw new Error(`the profile has no edge "${tag}"`);
  return [...new Set(edges.flatMap((e) => [...mesh.edges.subarray(4 * e, 4 * e + 3)]))];
}

function nodeNearest(mesh: Mesh, [x, y]: readonly [number, number]): number {
  let nearest = 0;
  let least = Infinity;
  for (let node = 0; node < mesh.cornerCount; node++) {
    const distance = (mesh.nodes[2 * node]! - x) ** 2 + (mesh.nodes[2 * node + 1]! - y) ** 2;
    if (distance < least) [nearest, least] = [node, distance];
  }
  return nearest;
}

/** 1 for every unknown that is held. */
export function heldBy(mesh: Mesh, supports: readonly Support[]): Uint8Array {
  const held = new Uint8Array(2 * mesh.nodeCount);
  for (const support of supports) {
    const nodes = 'tag' in support ? nodesOn(mesh, support.tag) : [nodeNearest(mesh, support.corner)];
    for (const node of nodes) for (const direction of DIRECTIONS[support.fix]) held[2 * node + direction] = 1;
  }
  return held;
}
