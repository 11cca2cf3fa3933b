import type { Mesh } from '../mesh/mesh';
import { type Law, newResponse } from './law';
import { strainRows } from './plane';
import { type GaussPoints, POINT_VALUES } from './points';
import { POINTS_PER_ELEMENT } from './shape';

/** Numbers per element stiffness: 12 x 12 by rows, lower triangle filled. */
export const STIFFNESS_SIZE = 144;

/**
 * Strain, stress and stiffness of six-node triangles in the total Lagrangian description (reference: the part at
 * rest). One kernel owns the scratch arrays of one mesh and law; it is not shared between solves.
 * Source: Bathe, Finite Element Procedures, 6.3 (from memory).
 */
export interface Kernel {
  readonly mesh: Mesh;
  readonly points: GaussPoints;
  readonly law: Law;
  readonly scratch: Scratch;
}

export interface Scratch {
  /** displacements of the element's nodes */
  readonly u: Float64Array;
  /** F11, F12, F21, F22, F33 */
  readonly f: Float64Array;
  /** E11, E22, 2 E12, E33 */
  readonly strain: Float64Array;
  /** dE/du, 12 per strain component */
  readonly b: Float64Array;
  /** volume D B */
  readonly db: Float64Array;
  readonly response: ReturnType<typeof newResponse>;
}

export function newKernel(mesh: Mesh, points: GaussPoints, law: Law): Kernel {
  return {
    mesh,
    points,
    law,
    scratch: {
      u: new Float64Array(12),
      f: new Float64Array(5),
      strain: new Float64Array(4),
      b: new Float64Array(48),
      db: new Float64Array(48),
      response: newResponse(),
    },
  };
}

/** Loads the displacements of an element, or zeros, into scratch. */
export function loadElement(
  kernel: Kernel,
  element: number,
  u: Float64Array | null,
  into: Float64Array,
): void {
  if (!u) {
    into.fill(0);
    return;
  }
  const { elements } = kernel.mesh;
  for (let k = 0; k < 6; k++) {
    const node = elements[6 * element + k]!;
    into[2 * k] = u[2 * node]!;
    into[2 * k + 1] = u[2 * node + 1]!;
  }
}

/** Displacement gradient (11, 12, 21, 22) plus u_r / r of the nodal values in `u` at a Gauss point. */
export function gradientAt(points: GaussPoints, point: number, u: Float64Array, out: Float64Array): void {
  const { slopes, perRadius } = points;
  let g11 = 0;
  let g12 = 0;
  let g21 = 0;
  let g22 = 0;
  let hoop = 0;
  for (let k = 0; k < 6; k++) {
    const sx = slopes[12 * point + 2 * k]!;
    const sy = slopes[12 * point + 2 * k + 1]!;
    const ux = u[2 * k]!;
    const uy = u[2 * k + 1]!;
    g11 += ux * sx;
    g12 += ux * sy;
    g21 += uy * sx;
    g22 += uy * sy;
  }
  if (perRadius.length > 0) {
    const values = POINT_VALUES[point % POINTS_PER_ELEMENT]!;
    for (let k = 0; k < 6; k++) hoop += u[2 * k]! * values[k]!;
    hoop *= perRadius[point]!;
  }
  out[0] = g11;
  out[1] = g12;
  out[2] = g21;
  out[3] = g22;
  out[4] = hoop;
}

/** Green-Lagrange strain of a deformation gradient: E = (F^T F - 1) / 2, shear doubled. */
export function greenStrain(f: Float64Array, out: Float64Array): void {
  const f11 = f[0]!;
  const f12 = f[1]!;
  const f21 = f[2]!;
  const f22 = f[3]!;
  const f33 = f[4]!;
  out[0] = (f11 * f11 + f21 * f21 - 1) / 2;
  out[1] = (f12 * f12 + f22 * f22 - 1) / 2;
  out[2] = f11 * f12 + f21 * f22;
  out[3] = (f33 * f33 - 1) / 2;
}

/** Sets F and E in scratch from the element displacements in scratch. */
export function deform(kernel: Kernel, point: number): void {
  const { f, u, strain } = kernel.scratch;
  gradientAt(kernel.points, point, u, f);
  f[0]! += 1;
  f[3]! += 1;
  f[4]! += 1;
  greenStrain(f, strain);
}

/** Fills the strain-displacement rows dE/du for the F in scratch. */
function fillRows(kernel: Kernel, point: number): void {
  const { slopes, perRadius } = kernel.points;
  const { b, f } = kernel.scratch;
  const f11 = f[0]!;
  const f12 = f[1]!;
  const f21 = f[2]!;
  const f22 = f[3]!;
  const f33 = f[4]!;
  for (let k = 0; k < 6; k++) {
    const sx = slopes[12 * point + 2 * k]!;
    const sy = slopes[12 * point + 2 * k + 1]!;
    const i = 2 * k;
    b[i] = f11 * sx;
    b[i + 1] = f21 * sx;
    b[12 + i] = f12 * sy;
    b[13 + i] = f22 * sy;
    b[24 + i] = f11 * sy + f12 * sx;
    b[25 + i] = f21 * sy + f22 * sx;
  }
  if (perRadius.length === 0) return;
  const values = POINT_VALUES[point % POINTS_PER_ELEMENT]!;
  for (let k = 0; k < 6; k++) {
    b[36 + 2 * k] = f33 * values[k]! * perRadius[point]!;
    b[37 + 2 * k] = 0;
  }
}

/** db = volume D B, row by row. */
function fillProducts(kernel: Kernel, rows: number, volume: number): void {
  const { b, db, response } = kernel.scratch;
  const { tangent } = response;
  for (let r = 0; r < rows; r++) {
    const d0 = volume * tangent[4 * r]!;
    const d1 = volume * tangent[4 * r + 1]!;
    const d2 = volume * tangent[4 * r + 2]!;
    for (let i = 0; i < 12; i++) db[12 * r + i] = d0 * b[i]! + d1 * b[12 + i]! + d2 * b[24 + i]!;
    if (rows === 3) continue;
    const d3 = volume * tangent[4 * r + 3]!;
    for (let i = 0; i < 12; i++) db[12 * r + i]! += d3 * b[36 + i]!;
  }
}

/** Material part of the tangent: K += B^T (volume D B), lower triangle. */
function addMaterial(kernel: Kernel, rows: number, stiffness: Float64Array, offset: number): void {
  const { b, db } = kernel.scratch;
  for (let i = 0; i < 12; i++) {
    const b0 = b[i]!;
    const b1 = b[12 + i]!;
    const b2 = b[24 + i]!;
    const row = offset + 12 * i;
    for (let j = 0; j <= i; j++) stiffness[row + j]! += b0 * db[j]! + b1 * db[12 + j]! + b2 * db[24 + j]!;
    if (rows === 3) continue;
    const b3 = b[36 + i]!;
    for (let j = 0; j <= i; j++) stiffness[row + j]! += b3 * db[36 + j]!;
  }
}

/** Geometric part of the tangent: the stress turning with the material. */
function addGeometric(
  kernel: Kernel,
  point: number,
  stress: Float64Array,
  at: number,
  stiffness: Float64Array,
  offset: number,
): void {
  const { slopes, volume, perRadius } = kernel.points;
  const w = volume[point]!;
  const s11 = w * stress[at]!;
  const s22 = w * stress[at + 1]!;
  const s12 = w * stress[at + 2]!;
  const hoop = perRadius.length > 0 ? w * stress[at + 3]! * perRadius[point]! ** 2 : 0;
  const values = POINT_VALUES[point % POINTS_PER_ELEMENT]!;
  for (let a = 0; a < 6; a++) {
    const sx = slopes[12 * point + 2 * a]!;
    const sy = slopes[12 * point + 2 * a + 1]!;
    const hx = sx * s11 + sy * s12;
    const hy = sx * s12 + sy * s22;
    const round = hoop * values[a]!;
    for (let b = 0; b <= a; b++) {
      const k = hx * slopes[12 * point + 2 * b]! + hy * slopes[12 * point + 2 * b + 1]!;
      stiffness[offset + 24 * a + 2 * b]! += k + round * values[b]!;
      stiffness[offset + 24 * a + 12 + 2 * b + 1]! += k;
    }
  }
}

/** Internal force of a Gauss point: volume B^T S, added to the nodes. */
function addForce(kernel: Kernel, point: number, rows: number, force: Float64Array): void {
  const { mesh, points, scratch } = kernel;
  const { b, response } = scratch;
  const { stress } = response;
  const volume = points.volume[point]!;
  const element = Math.floor(point / POINTS_PER_ELEMENT);
  for (let i = 0; i < 12; i++) {
    let sum = b[i]! * stress[0]! + b[12 + i]! * stress[1]! + b[24 + i]! * stress[2]!;
    if (rows === 4) sum += b[36 + i]! * stress[3]!;
    const node = mesh.elements[6 * element + (i >> 1)]!;
    force[2 * node + (i & 1)]! += volume * sum;
  }
}

/**
 * Element tangents into `stiffness` (144 per element; null leaves them out) and internal forces into `force`, both
 * overwritten. `u` null: the linear stiffness at rest. `mixed`: four stresses per Gauss point to take in the geometric part in
 * place of the law's own (see mixed-stress.ts).
 */
export function assemble(
  kernel: Kernel,
  u: Float64Array | null,
  mixed: Float64Array | null,
  stiffness: Float64Array | null,
  force: Float64Array,
): void {
  const { mesh, points, law, scratch } = kernel;
  const rows = strainRows(points.plane);
  stiffness?.fill(0);
  force.fill(0);
  for (let point = 0; point < POINTS_PER_ELEMENT * mesh.elementCount; point++) {
    const element = Math.floor(point / POINTS_PER_ELEMENT);
    if (point % POINTS_PER_ELEMENT === 0) loadElement(kernel, element, u, scratch.u);
    deform(kernel, point);
    fillRows(kernel, point);
    law.respond(scratch.strain, scratch.response);
    if (u) addForce(kernel, point, rows, force);
    if (!stiffness) continue;
    const at = STIFFNESS_SIZE * element;
    fillProducts(kernel, rows, points.volume[point]!);
    addMaterial(kernel, rows, stiffness, at);
    if (!u) continue;
    const stress = mixed ?? scratch.response.stress;
    addGeometric(kernel, point, stress, mixed ? 4 * point : 0, stiffness, at);
  }
}
