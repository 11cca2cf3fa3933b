import { assemble, newKernel } from '../element/kernel';
import type { Law } from '../element/law';
import { factorise, pivotRatio } from '../solver/factor';
import { substitute } from '../solver/substitute';
import { dot } from './driver';
import type { Path } from './path';
import { onlyFree, type System } from './system';

const failed = (failure: string): Path => ({ states: [], failure, factorisations: 1, unstable: false });

/** Pivot ratio under which a part counts as not held; slender held parts have 1e-8 and more. */
const LOOSE = 1e-12;

/**
 * Small-displacement solution: K u = load x pattern, load such that the driven quantity reaches the target.
 * Deflection, force and strain are proportional to the target.
 */
export function solveLinear(system: System, law: Law): Path {
  const { mesh, points, held, structure, stiffness, workspace, driver, target } = system;
  const still = new Float64Array(structure.unknownCount);
  assemble(newKernel(mesh, points, law), null, null, stiffness, still);
  const factor = factorise(structure, stiffness, workspace);
  if (!(pivotRatio(factor) > LOOSE)) return failed('the supports do not hold the part');
  still.fill(0);
  const { slope } = driver(still, 0);
  const unit = substitute(factor, onlyFree(slope, held));
  const load = target / dot(slope, unit);
  if (!Number.isFinite(load)) return failed('the drive does not move the part');
  const u = unit.map((value) => value * load);
  return { states: [{ value: target, load, u }], failure: null, factorisations: 1, unstable: false };
}
