import { assemble, type Kernel, newKernel } from '../element/kernel';
import type { Law } from '../element/law';
import { updateMixedStress } from '../element/mixed-stress';
import { factorise } from '../solver/factor';
import { substitute } from '../solver/substitute';
import { dot } from './driver';
import type { Path, State } from './path';
import { onlyFree, type System } from './system';

export interface NewtonOptions {
  /** equal steps of the drive */
  readonly steps: number;
  /** iterations allowed in one step */
  readonly iterations: number;
  /** residual force as a share of the load, and three times the last correction as a share of the displacement */
  readonly tolerance: number;
}

/** Correction, as a share of the displacement, at which the robust law hands over to the final one. */
const HAND_OVER = 0.02;
/** Gap left in the driven quantity, as a share of the target. */
const GAP = 1e-5;

/** What the iterations work on; one per path. */
interface Work {
  readonly system: System;
  readonly target: number;
  readonly options: NewtonOptions;
  readonly final: Kernel;
  kernel: Kernel;
  readonly u: Float64Array;
  readonly force: Float64Array;
  readonly mixed: Float64Array;
  /** false until the mixed stress belongs to the present law */
  mixedIsSet: boolean;
  load: number;
  factorisations: number;
  unstable: boolean;
}

function newWork(system: System, robust: Law, final: Law, target: number, options: NewtonOptions): Work {
  const { mesh, points, structure } = system;
  const kernel = newKernel(mesh, points, final);
  return {
    system,
    target,
    options,
    final: kernel,
    kernel: robust === final ? kernel : newKernel(mesh, points, robust),
    u: new Float64Array(structure.unknownCount),
    force: new Float64Array(structure.unknownCount),
    mixed: new Float64Array(12 * mesh.elementCount),
    mixedIsSet: false,
    load: 0,
    factorisations: 0,
    unstable: false,
  };
}

const norm = (v: Float64Array): number => Math.sqrt(dot(v, v));

function largest(v: Float64Array): number {
  let most = 0;
  for (const value of v) most = Math.max(most, Math.abs(value));
  return most;
}

function add(into: Float64Array, a: Float64Array, scale: number): void {
  for (let i = 0; i < into.length; i++) into[i]! += scale * a[i]!;
}

/**
 * One iteration towards `value`: the correction du and the load solve the equilibrium and the drive together
 * (two right-hand sides, one factorisation). Returns the size of the correction as a share of the displacement,
 * 0 when the state was already in balance, null when it ran away.
 */
function iterate(work: Work, value: number, first: boolean): number | null {
  const { system, u, force, mixed, options } = work;
  const { held, stiffness, structure, workspace, driver } = system;
  const { value: reached, slope } = driver(u, value);
  const pattern = onlyFree(slope, held);
  assemble(work.kernel, u, work.mixedIsSet ? mixed : null, stiffness, force);
  const residual = onlyFree(force, held).map((f, i) => work.load * pattern[i]! - f);
  const gap = value - reached;
  const balanced = norm(residual) < options.tolerance * Math.abs(work.load) * norm(pattern);
  if (!first && work.kernel === work.final && balanced && Math.abs(gap) < GAP * Math.abs(work.target))
    return 0;
  const factor = factorise(structure, stiffness, workspace);
  work.factorisations++;
  work.unstable = factor.notPositive > 0;
  const du = substitute(factor, residual);
  const perLoad = substitute(factor, pattern);
  const more = (gap - dot(pattern, du)) / dot(pattern, perLoad);
  add(du, perLoad, more);
  updateMixedStress(work.kernel, u, du, mixed);
  work.mixedIsSet = true;
  add(u, du, 1);
  work.load += more;
  return Number.isFinite(work.load) ? largest(du) / largest(u) : null;
}

/** Passes from the robust law to the final one when the shape has nearly settled. */
function handOver(work: Work, correction: number): void {
  if (work.kernel === work.final || correction > HAND_OVER) return;
  work.kernel = work.final;
  work.mixedIsSet = false;
}

function step(work: Work, value: number): string | null {
  const { iterations, tolerance } = work.options;
  for (let i = 0; i < iterations; i++) {
    const correction = iterate(work, value, i === 0);
    if (correction === null) return 'the iterations ran away';
    if (correction === 0) return null;
    const settled = i > 0 && correction < 0.3 * tolerance;
    if (settled && work.kernel === work.final) return null;
    if (i > 0) handOver(work, correction);
  }
  return `no balance after ${iterations} iterations`;
}

/**
 * Equilibrium path at large displacement, by steps of the driven quantity.
 * Method: Newton's method with displacement control (Batoz and Dhatt, Int. J. Numer. Meth. Engrg. 14, 1979) and the
 * mixed-point stress of mixed-stress.ts; passes load maxima. Starts with the robust law and hands over to the final.
 * Limits: follows one branch; where the driven quantity itself turns back, or an element folds, it reports failure.
 */
export function followPath(system: System, robust: Law, final: Law, options: NewtonOptions): Path {
  const work = newWork(system, robust, final, system.target, options);
  const states: State[] = [];
  let failure: string | null = null;
  let unstable = false;
  for (let n = 1; n <= options.steps && !failure; n++) {
    const value = (system.target * n) / options.steps;
    failure = step(work, value);
    if (failure) break;
    unstable ||= work.unstable;
    states.push({ value, load: work.load, u: Float64Array.from(work.u) });
  }
  return { states, failure, factorisations: work.factorisations, unstable };
}
