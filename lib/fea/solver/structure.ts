import type { Mesh } from '../mesh/mesh';
import { type Dissection, dissect, type Part } from './dissection';

/**
 * A dense block of the elimination: `size` unknowns, of which the first `pivots` are eliminated here and the rest
 * passed up. `at` is where its columns stand in the factor.
 */
export interface Front {
  readonly pivots: number;
  readonly size: number;
  /** number of each unknown: 2 node + direction */
  readonly unknowns: Int32Array;
  readonly children: readonly Child[];
  /** elements assembled here, leaves only */
  readonly elements: Int32Array;
  readonly at: number;
}

/** A front below and where each of the unknowns it passes up stands in this one. */
export interface Child {
  readonly front: number;
  readonly places: Int32Array;
}

/** Order and shape of the elimination: depends on the mesh and on what is held, not on numbers. */
export interface Structure {
  readonly fronts: readonly Front[];
  /** place in its front of each of the 12 unknowns of each element, -1 where held */
  readonly places: Int32Array;
  readonly unknownCount: number;
  readonly largestFront: number;
  /** numbers in the factor */
  readonly factorSize: number;
  /** most numbers that wait at one time to be gathered by a front above */
  readonly stackSize: number;
}

/** The smallest part that holds all elements of a node eliminates it. */
function ownedNodes(mesh: Mesh, { order, parts }: Dissection): number[][] {
  const first = new Int32Array(mesh.nodeCount).fill(mesh.elementCount);
  const last = new Int32Array(mesh.nodeCount).fill(-1);
  order.forEach((element, i) => {
    for (let k = 0; k < 6; k++) {
      const node = mesh.elements[6 * element + k]!;
      if (i < first[node]!) first[node] = i;
      if (i > last[node]!) last[node] = i;
    }
  });
  const owned: number[][] = parts.map(() => []);
  for (let node = 0; node < mesh.nodeCount; node++) {
    owned[smallestPart(parts, first[node]!, last[node]!)]!.push(node);
  }
  return owned;
}

function smallestPart(parts: readonly Part[], first: number, last: number): number {
  let at = parts.length - 1;
  for (;;) {
    const { left, right } = parts[at]!;
    if (left < 0) return at;
    const middle = parts[left]!.last;
    if (last < middle) at = left;
    else if (first >= middle) at = right;
    else return at;
  }
}

/** State while the fronts are laid out from the leaves up. */
interface Layout {
  readonly mesh: Mesh;
  readonly held: Uint8Array;
  readonly order: Int32Array;
  /** front that last touched each node */
  readonly touched: Int32Array;
  /** place of each unknown in the front being laid out */
  readonly place: Int32Array;
  readonly passed: number[][];
  readonly places: Int32Array;
  readonly fronts: Front[];
}

/** Nodes that a part hands up: those of its elements or children that it does not own. */
function passedUp(layout: Layout, part: Part, number: number, own: readonly number[]): number[] {
  const { mesh, touched, order, passed } = layout;
  for (const node of own) touched[node] = number;
  const up: number[] = [];
  const visit = (node: number) => {
    if (touched[node] === number) return;
    touched[node] = number;
    up.push(node);
  };
  if (part.left >= 0) {
    passed[part.left]!.forEach(visit);
    passed[part.right]!.forEach(visit);
    return up;
  }
  for (let i = part.first; i < part.last; i++) {
    for (let k = 0; k < 6; k++) visit(mesh.elements[6 * order[i]! + k]!);
  }
  return up;
}

function freeUnknowns(nodes: readonly number[], held: Uint8Array): number[] {
  return nodes.flatMap((node) => [2 * node, 2 * node + 1]).filter((unknown) => !held[unknown]);
}

function childOf(layout: Layout, number: number): Child {
  const { unknowns, pivots } = layout.fronts[number]!;
  return { front: number, places: unknowns.subarray(pivots).map((unknown) => layout.place[unknown]!) };
}

function placeElements({ mesh, places, place, held }: Layout, elements: Int32Array): void {
  for (const element of elements) {
    for (let k = 0; k < 12; k++) {
      const unknown = 2 * mesh.elements[6 * element + (k >> 1)]! + (k & 1);
      places[12 * element + k] = held[unknown] ? -1 : place[unknown]!;
    }
  }
}

function layOut(layout: Layout, part: Part, number: number, own: readonly number[], at: number): Front {
  const up = passedUp(layout, part, number, own);
  layout.passed.push(up);
  const pivots = freeUnknowns(own, layout.held);
  const unknowns = Int32Array.from([...pivots, ...freeUnknowns(up, layout.held)]);
  unknowns.forEach((unknown, i) => {
    layout.place[unknown] = i;
  });
  const isLeaf = part.left < 0;
  const elements = isLeaf ? layout.order.slice(part.first, part.last) : new Int32Array(0);
  placeElements(layout, elements);
  const children = isLeaf ? [] : [childOf(layout, part.left), childOf(layout, part.right)];
  return { pivots: pivots.length, size: unknowns.length, unknowns, children, elements, at };
}

/** Lays out the elimination of a mesh; `held` is 1 for unknowns that are prescribed. */
export function structureOf(mesh: Mesh, held: Uint8Array): Structure {
  const dissection = dissect(mesh);
  const owned = ownedNodes(mesh, dissection);
  const layout: Layout = {
    mesh,
    held,
    order: dissection.order,
    touched: new Int32Array(mesh.nodeCount).fill(-1),
    place: new Int32Array(2 * mesh.nodeCount).fill(-1),
    passed: [],
    places: new Int32Array(12 * mesh.elementCount),
    fronts: [],
  };
  let at = 0;
  dissection.parts.forEach((part, number) => {
    const front = layOut(layout, part, number, owned[number]!, at);
    layout.fronts.push(front);
    at += front.size * front.pivots;
  });
  return {
    fronts: layout.fronts,
    places: layout.places,
    unknownCount: 2 * mesh.nodeCount,
    largestFront: layout.fronts.reduce((most, front) => Math.max(most, front.size), 0),
    factorSize: at,
    stackSize: deepestStack(layout.fronts),
  };
}

/** Numbers in the packed remainder that a front passes up. */
export function remainderSize({ size, pivots }: Front): number {
  const rest = size - pivots;
  return (rest * (rest + 1)) / 2;
}

/** Fronts come children first, so the remainders of a front's children are the last on the stack. */
function deepestStack(fronts: readonly Front[]): number {
  let height = 0;
  let deepest = 0;
  for (const front of fronts) {
    for (const child of front.children) height -= remainderSize(fronts[child.front]!);
    height += remainderSize(front);
    deepest = Math.max(deepest, height);
  }
  return deepest;
}
