import { addTraction, edgesWith, meanDisplacement } from '../element/edge-load';
import type { Plane } from '../element/plane';
import type { Mesh } from '../mesh/mesh';
import type { Drive, Land } from '../model';
import { nodesOn } from './supports';

/**
 * The driven quantity at a state of displacement: its value and its slope with respect to every unknown. The load
 * is the slope times one number (force or moment), so load and quantity belong together in the sense of work.
 */
export interface Driven {
  readonly value: number;
  readonly slope: Float64Array;
}

/** `near` chooses the turn an angle is counted in. */
export type Driver = (u: Float64Array, near: number) => Driven;

export function dot(a: Float64Array, b: Float64Array): number {
  let sum = 0;
  for (let i = 0; i < a.length; i++) sum += a[i]! * b[i]!;
  return sum;
}

interface Chord {
  readonly from: readonly [number, number];
  readonly along: readonly [number, number];
  readonly length: number;
}

/** The straight line through the tagged edges, from their first point to their last. */
function chordOf(mesh: Mesh, tag: string): Chord {
  const edges = edgesWith(mesh, tag);
  const starts = edges.map((e) => mesh.edges[4 * e]!);
  const ends = edges.map((e) => mesh.edges[4 * e + 2]!);
  const first = starts.find((node) => !ends.includes(node)) ?? starts[0]!;
  const last = ends.find((node) => !starts.includes(node)) ?? ends.at(-1)!;
  const from = [mesh.nodes[2 * first]!, mesh.nodes[2 * first + 1]!] as const;
  const dx = mesh.nodes[2 * last]! - from[0];
  const dy = mesh.nodes[2 * last + 1]! - from[1];
  const length = Math.sqrt(dx * dx + dy * dy);
  return { from, along: [dx / length, dy / length], length };
}

/** Share along the chord, 0 to 1. */
const shareOf = ({ from, along, length }: Chord, x: number, y: number): number =>
  ((x - from[0]) * along[0] + (y - from[1]) * along[1]) / length;

function landSlope(mesh: Mesh, plane: Plane, { tag, direction, spread }: Land): Float64Array {
  nodesOn(mesh, tag);
  if (spread !== 'parabolic') return meanDisplacement(mesh, plane, tag, direction);
  const chord = chordOf(mesh, tag);
  const slope = new Float64Array(2 * mesh.nodeCount);
  const [dx, dy] = direction;
  const shear = (x: number, y: number) => {
    const t = shareOf(chord, x, y);
    const size = (6 * t * (1 - t)) / chord.length;
    return [dx * size, dy * size] as const;
  };
  addTraction(mesh, plane, edgesWith(mesh, tag), shear, slope);
  return slope;
}

function displacementDriver(mesh: Mesh, plane: Plane, lands: readonly Land[]): Driver {
  const slope = new Float64Array(2 * mesh.nodeCount);
  for (const land of lands) {
    landSlope(mesh, plane, land).forEach((part, i) => {
      slope[i]! += part;
    });
  }
  return (u) => ({ value: dot(slope, u), slope });
}

/**
 * Turn of an edge: the angle of d = integral of s (X + u) ds along it, s from its middle. Its slope is a couple that
 * turns with the edge and has no resultant force. The second derivative is left out of the tangent, which costs
 * iterations, not accuracy.
 */
function rotationDriver(mesh: Mesh, plane: Plane, tag: string): Driver {
  const nodes = nodesOn(mesh, tag);
  const chord = chordOf(mesh, tag);
  const moments = new Float64Array(2 * mesh.nodeCount);
  const arm = (x: number, y: number) => [shareOf(chord, x, y) - 0.5, 0] as const;
  addTraction(mesh, plane, edgesWith(mesh, tag), arm, moments);
  const rest = Math.atan2(chord.along[1], chord.along[0]);
  return (u, near) => {
    let dx = 0;
    let dy = 0;
    for (const node of nodes) {
      dx += moments[2 * node]! * (mesh.nodes[2 * node]! + u[2 * node]!);
      dy += moments[2 * node]! * (mesh.nodes[2 * node + 1]! + u[2 * node + 1]!);
    }
    const square = dx * dx + dy * dy;
    const slope = new Float64Array(2 * mesh.nodeCount);
    for (const node of nodes) {
      slope[2 * node] = (-moments[2 * node]! * dy) / square;
      slope[2 * node + 1] = (moments[2 * node]! * dx) / square;
    }
    return { value: nearTurn(Math.atan2(dy, dx) - rest, near), slope };
  };
}

/** The angle plus the whole turns that bring it nearest to `near`. */
function nearTurn(angle: number, near: number): number {
  const turn = 2 * Math.PI;
  return angle + turn * Math.round((near - angle) / turn);
}

export function driverOf(mesh: Mesh, plane: Plane, drive: Drive): Driver {
  return drive.kind === 'rotation'
    ? rotationDriver(mesh, plane, drive.tag)
    : displacementDriver(mesh, plane, drive.lands);
}
