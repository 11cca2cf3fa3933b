import { newKernel } from '../element/kernel';
import { type Law, stVenant } from '../element/law';
import { layeredLaw } from '../element/layered';
import { neoHooke } from '../element/neo-hooke';
import { type Mesh, meshProfile } from '../mesh/mesh';
import type { BendingModel, ElasticNumbers } from '../model';
import { peakError } from '../strain/error';
import { type LayerAllowable, layerVerdict } from '../strain/layers';
import { dominantStrain, nodalStrain } from '../strain/nodal';
import { findPeak, type Peak } from '../strain/peak';
import { type SurfaceStrain, surfaceStrain } from '../strain/surface';
import { solveLinear } from './linear';
import { followPath } from './newton';
import { LINEAR, type SolveOptions } from './options';
import type { Path, State } from './path';
import type { Solution, SolvedStep } from './solution';
import { type System, systemOf } from './system';

const refuse = (reason: string): Solution => ({ ok: false, reason });

/** The law that suits small displacement, robust for first steps. */
function smallLaw(numbers: ElasticNumbers, model: BendingModel): Law {
  const { modulus, poisson, layers } = numbers;
  return layers
    ? layeredLaw({ modulus, poisson, ...layers }, model.plane)
    : stVenant({ modulus, poisson }, model.plane);
}

/** The law for large strain; layered prints have only the small one. */
function largeLaw(numbers: ElasticNumbers, model: BendingModel, wanted: SolveOptions['law']): Law {
  return numbers.layers || wanted === 'st-venant' ? smallLaw(numbers, model) : neoHooke(numbers, model.plane);
}

/** A turn is taken in steps of at most 15 degrees: past that the couple's change of direction is too large. */
const WIDEST_TURN = Math.PI / 12;

function stepsFor(model: BendingModel, system: System, wanted: number): number {
  if (model.drive.kind !== 'rotation') return wanted;
  return Math.max(wanted, Math.ceil(Math.abs(system.target) / WIDEST_TURN - 1e-9));
}

interface Outcome {
  readonly path: Path;
  readonly method: 'linear' | 'non-linear';
  readonly fellBack: string | null;
}

/** The path asked for; the linear one, with the reason, when large displacement does not come out. */
function solvePath(
  model: BendingModel,
  numbers: ElasticNumbers,
  system: System,
  options: SolveOptions,
): Outcome {
  const small = smallLaw(numbers, model);
  const linear = () => solveLinear(system, small);
  if (options.displacement === 'small') return { path: linear(), method: 'linear', fellBack: null };
  const steps = stepsFor(model, system, options.steps);
  const newton = { steps, iterations: 25, tolerance: 1e-4 };
  const path = followPath(system, small, largeLaw(numbers, model, options.law), newton);
  if (!path.failure) return { path, method: 'non-linear', fellBack: null };
  return { path: linear(), method: 'linear', fellBack: path.failure };
}

/** Solves a meshed model. Throws only when the model contradicts itself, for example names an edge it lacks. */
export function solveMeshed(
  model: BendingModel,
  mesh: Mesh,
  numbers: ElasticNumbers,
  options: SolveOptions = LINEAR,
  allowable: LayerAllowable | null = null,
): Solution {
  const unknowns = 2 * mesh.nodeCount;
  if (unknowns > options.mostUnknowns) {
    return refuse(`${unknowns} degrees of freedom, over the limit of ${options.mostUnknowns}`);
  }
  const system = systemOf(model, mesh);
  if (!system) return refuse('an element is folded at rest');
  const outcome = solvePath(model, numbers, system, options);
  if (outcome.path.failure) return refuse(outcome.path.failure);
  return report(model, numbers, system, outcome, allowable);
}

/**
 * Bends a family's model to its full deflection. Pure and synchronous; same input, same bytes. A shape that cannot
 * be meshed or solved is a reason, not an exception.
 */
export function solveBending(
  model: BendingModel,
  numbers: ElasticNumbers,
  options: SolveOptions = LINEAR,
  allowable: LayerAllowable | null = null,
): Solution {
  const meshed = meshProfile(model.profile, options.mesh);
  if (!meshed.ok) return refuse(meshed.reason);
  return solveMeshed(model, meshed.mesh, numbers, options, allowable);
}

function report(
  model: BendingModel,
  numbers: ElasticNumbers,
  system: System,
  { path, method, fellBack }: Outcome,
  allowable: LayerAllowable | null,
): Solution {
  const { mesh } = system;
  const finite = method === 'non-linear';
  const last = path.states.at(-1)!;
  const surface = surfaceStrain(mesh, model.plane, model.peakTags, last.u, finite);
  const kernel = newKernel(mesh, system.points, smallLaw(numbers, model));
  const { strain: factor } = factorsOf(model);
  const tension = findPeak(mesh, surface, 1);
  const compression = findPeak(mesh, surface, -1);
  const inside = nodalStrain(kernel, last.u, finite);
  const scaled = (peak: Peak): Peak => ({ ...peak, strain: peak.strain * factor });
  const layers = allowable ? layerVerdict(mesh, withFactor(surface, factor), allowable) : null;
  return {
    ok: true,
    mesh,
    method,
    fellBack,
    unstable: path.unstable,
    steps: path.states.map((state) => solvedStep(model, system, state, finite)),
    tension: scaled(tension),
    compression: scaled(compression),
    layers,
    errorEstimate: peakError(mesh, tension, surface, inside, finite),
    unknowns: 2 * mesh.nodeCount,
    elements: mesh.elementCount,
    factorisations: path.factorisations,
  };
}

function factorsOf(model: BendingModel): { force: number; strain: number } {
  return model.factors.reduce(
    (product, factor) => ({ force: product.force * factor.force, strain: product.strain * factor.strain }),
    { force: 1, strain: 1 },
  );
}

const withFactor = (surface: SurfaceStrain, factor: number): SurfaceStrain => ({
  ...surface,
  along: surface.along.map((strain) => strain * factor),
});

/** A state with its strain field; on the searched edges the field takes the surface strain, so colours agree. */
function solvedStep(model: BendingModel, system: System, state: State, finite: boolean): SolvedStep {
  const { mesh, points } = system;
  const kernel = newKernel(mesh, points, stVenant({ modulus: 1, poisson: 0 }, model.plane));
  const strain = dominantStrain(nodalStrain(kernel, state.u, finite), finite);
  const surface = surfaceStrain(mesh, model.plane, model.peakTags, state.u, finite);
  const factor = factorsOf(model);
  for (let node = 0; node < mesh.nodeCount; node++) {
    const along = surface.along[node]!;
    const isPeak = !Number.isNaN(along) && Math.abs(along) >= Math.abs(surface.round[node]!);
    strain[node] = (isPeak ? along : strain[node]!) * factor.strain;
  }
  const whole = model.mirrored ? 2 : 1;
  return { deflection: whole * state.value, force: state.load * factor.force, displacement: state.u, strain };
}
