import { assemble, type Kernel, newKernel } from '../element/kernel';
import type { Law } from '../element/law';
import { updateMixedStress } from '../element/mixed-stress';
import { type Factor, factorise } from '../solver/factor';
import { substitute } from '../solver/substitute';
import { dot } from './driver';
import type { Path, State } from './path';
import { onlyFree, type System } from './system';

export interface NewtonOptions {
  /** equal steps of the drive */
  readonly steps: number;
  /** iterations allowed in one step */
  readonly iterations: number;
  /** ten times the last correction, as a share of the displacement */
  readonly tolerance: number;
}

/** Correction, as a share of the displacement, at which the robust law hands over to the final one. */
const HAND_OVER = 0.02;
/** Correction under which the factor is kept for the next iterations, */
const KEEP = 0.05;
/** as long as each correction is at most this share of the one before. */
const QUICK = 0.2;
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
  /** false until the mixed stress belongs to the present law and displacement */
  mixedIsSet: boolean;
  load: number;
  factor: Factor | null;
  factorisations: number;
  unstable: boolean;
}

function newWork(system: System, robust: Law, final: Law, options: NewtonOptions): Work {
  const { mesh, points, structure, target } = system;
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
    factor: null,
    factorisations: 0,
    unstable: false,
  };
}

function largest(v: Float64Array): number {
  let most = 0;
  for (const value of v) most = Math.max(most, Math.abs(value));
  return most;
}

function add(into: Float64Array, a: Float64Array, scale: number): void {
  for (let i = 0; i < into.length; i++) into[i]! += scale * a[i]!;
}

/** Internal force at the present displacement, and the tangent's factor where none is kept. */
function assembleWork(work: Work): Factor {
  const { system, u, force } = work;
  const { stiffness, structure, workspace } = system;
  if (work.factor) {
    assemble(work.kernel, u, null, null, force);
    return work.factor;
  }
  assemble(work.kernel, u, work.mixedIsSet ? work.mixed : null, stiffness, force);
  const factor = factorise(structure, stiffness, workspace);
  work.factorisations++;
  work.unstable = factor.notPositive > 0;
  return factor;
}

/** Correction and change of load that bring equilibrium and the driven quantity to their values together. */
function correctionOf(
  work: Work,
  factor: Factor,
  pattern: Float64Array,
  gap: number,
): [Float64Array, number] {
  const residual = onlyFree(work.force, work.system.held).map((f, i) => work.load * pattern[i]! - f);
  const du = substitute(factor, residual);
  const perLoad = substitute(factor, pattern);
  const more = (gap - dot(pattern, du)) / dot(pattern, perLoad);
  add(du, perLoad, more);
  return [du, more];
}

/**
 * One iteration towards `value`. Returns the size of the correction as a share of the displacement, null when it ran
 * away. A small correction keeps the factor; a large one takes the mixed stress into the next tangent.
 */
function iterate(work: Work, value: number): number | null {
  const { system, u } = work;
  const { value: reached, slope } = system.driver(u, value);
  const factor = assembleWork(work);
  const pattern = onlyFree(slope, system.held);
  const [du, more] = correctionOf(work, factor, pattern, value - reached);
  const size = largest(du) / Math.max(largest(u), largest(du));
  work.factor = size < KEEP ? factor : null;
  work.mixedIsSet = work.factor === null;
  if (work.mixedIsSet) updateMixedStress(work.kernel, u, du, work.mixed);
  add(u, du, 1);
  work.load += more;
  return Number.isFinite(work.load) ? size : null;
}

/** Passes from the robust law to the final one when the shape has nearly settled. */
function handOver(work: Work, correction: number): void {
  if (work.kernel === work.final || correction > HAND_OVER) return;
  work.kernel = work.final;
  work.mixedIsSet = false;
  work.factor = null;
}

const isSettled = (work: Work, value: number, correction: number): boolean =>
  work.kernel === work.final &&
  correction < 0.1 * work.options.tolerance &&
  Math.abs(value - work.system.driver(work.u, value).value) < GAP * Math.abs(work.target);

/** Iterates to balance at one value of the drive; the reason where it fails. */
function settle(work: Work, value: number): string | null {
  const { iterations } = work.options;
  let before = Infinity;
  work.factor = null;
  for (let i = 0; i < iterations; i++) {
    const correction = iterate(work, value);
    if (correction === null) return 'the iterations ran away';
    if (i > 0 && isSettled(work, value, correction)) return null;
    if (correction > QUICK * before) work.factor = null;
    before = correction;
    handOver(work, correction);
  }
  return `no balance after ${iterations} iterations`;
}

/** Carries displacement and load on in a straight line from the last two states, over `ahead` of their distance. */
function predict(work: Work, states: readonly State[], ahead: number): void {
  const last = states.at(-1);
  if (!last) return;
  const before = states.at(-2);
  for (let i = 0; i < work.u.length; i++) work.u[i]! += ahead * (last.u[i]! - (before?.u[i] ?? 0));
  work.load += ahead * (last.load - (before?.load ?? 0));
  work.mixedIsSet = false;
}

/**
 * Equilibrium path at large displacement, by steps of the driven quantity.
 * Method: Newton's method with displacement control (Batoz and Dhatt, Int. J. Numer. Meth. Engrg. 14, 1979) and the
 * mixed-point stress of mixed-stress.ts while corrections are large, the kept tangent (modified Newton) once they are
 * small; passes load maxima. Starts with the robust law and hands over to the final.
 * Limits: follows one branch; where the driven quantity itself turns back, or an element folds, it reports failure.
 */
export function followPath(system: System, robust: Law, final: Law, options: NewtonOptions): Path {
  const work = newWork(system, robust, final, options);
  const states: State[] = [];
  let unstable = false;
  for (let n = 1; n <= options.steps; n++) {
    predict(work, states, 1);
    const value = (system.target * n) / options.steps;
    const failure = settle(work, value);
    if (failure) return { states, failure, factorisations: work.factorisations, unstable };
    unstable ||= work.unstable;
    states.push({ value, load: work.load, u: Float64Array.from(work.u) });
  }
  return { states, failure: null, factorisations: work.factorisations, unstable };
}
