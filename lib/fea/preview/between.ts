import type { Mesh } from '../mesh/mesh';
import type { Solved, SolvedStep } from '../solve/solution';
import type { Anchors } from './locate';

/** Displacement (xy per node) and strain of the part at a moment between rest (0) and the full deflection (1). */
export interface Moment {
  readonly displacement: Float64Array;
  readonly strain: Float32Array;
}

const mix = (a: number, b: number, share: number): number => (1 - share) * a + share * b;

/**
 * The solved motion at share `t` of the full deflection: straight between the stored steps. Exact at the steps;
 * between them a turning part is short by the cosine of half the turn of one step.
 */
export function momentAt({ steps }: Solved, t: number): Moment {
  const full = steps.at(-1)!.deflection;
  const next = steps.findIndex((step) => Math.abs(step.deflection) >= Math.abs(t * full) - 1e-12);
  const after = steps[next < 0 ? steps.length - 1 : next]!;
  const before: SolvedStep | undefined = steps[next - 1];
  const from = before?.deflection ?? 0;
  const share = (t * full - from) / (after.deflection - from);
  return {
    displacement: after.displacement.map((value, i) => mix(before?.displacement[i] ?? 0, value, share)),
    strain: after.strain.map((value, i) => mix(before?.strain[i] ?? 0, value, share)),
  };
}

/** Turn of an element as a rigid body, rad, from the movement of its corners. */
function turnOf({ nodes, elements }: Mesh, element: number, u: Float64Array): number {
  let sine = 0;
  let cosine = 0;
  for (let k = 0; k < 3; k++) {
    const a = 2 * elements[6 * element + k]!;
    const b = 2 * elements[6 * element + ((k + 1) % 3)]!;
    const x = nodes[b]! - nodes[a]!;
    const y = nodes[b + 1]! - nodes[a + 1]!;
    const movedX = x + u[b]! - u[a]!;
    const movedY = y + u[b + 1]! - u[a + 1]!;
    sine += x * movedY - y * movedX;
    cosine += x * movedX + y * movedY;
  }
  return Math.atan2(sine, cosine);
}

export interface Moved {
  /** displacement of the point */
  x: number;
  y: number;
  strain: number;
}

/** Reads a moment at an anchored point; outside the mesh the nearest element carries it along as a rigid body. */
export function readMoment(mesh: Mesh, moment: Moment, anchors: Anchors, point: number, out: Moved): void {
  const element = anchors.elements[point]!;
  const u = moment.displacement;
  const turn = turnOf(mesh, element, u);
  const ox = anchors.offsets[2 * point]!;
  const oy = anchors.offsets[2 * point + 1]!;
  out.x = (Math.cos(turn) - 1) * ox - Math.sin(turn) * oy;
  out.y = Math.sin(turn) * ox + (Math.cos(turn) - 1) * oy;
  out.strain = 0;
  for (let k = 0; k < 6; k++) {
    const node = mesh.elements[6 * element + k]!;
    const weight = anchors.weights[6 * point + k]!;
    out.x += weight * u[2 * node]!;
    out.y += weight * u[2 * node + 1]!;
    out.strain += weight * moment.strain[node]!;
  }
}
