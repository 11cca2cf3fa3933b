import { bendingOf } from '@/generators/bend';
import type { Family } from '@/generators/contract';
import { FAMILIES } from '@/generators/index';
import { assemble, newKernel } from '@/lib/fea/element/kernel';
import { stVenant } from '@/lib/fea/element/law';
import { meshArea, meshProfile } from '@/lib/fea/mesh/mesh';
import { RECOMMENDED_MESH } from '@/lib/fea/mesh/options';
import { smallestAngle } from '@/lib/fea/mesh/quality';
import { type Profile, profileArea } from '@/lib/fea/profile/profile';
import { type Cantilever, cantileverModel } from '@/lib/fea/shapes/cantilever';
import { openRingModel } from '@/lib/fea/shapes/open-ring';
import { webModel } from '@/lib/fea/shapes/web';
import { LINEAR, NON_LINEAR } from '@/lib/fea/solve/options';
import { solveBending } from '@/lib/fea/solve/solve-bending';
import { systemOf } from '@/lib/fea/solve/system';
import { factorise } from '@/lib/fea/solver/factor';
import { structureOf } from '@/lib/fea/solver/structure';
import { substitute } from '@/lib/fea/solver/substitute';
import { DEFAULT_USE } from '@/lib/materials/types';
import { toughPlastic } from '../support/materials';
import { RANDOM_SHAPES, randomModels } from '../support/random-shapes';
import { randomValues } from '../support/random-values';
import { bandedMatrix, bandedOrder, factorBanded, solveBanded } from './fea-banded';

const PLASTIC = { modulus: 1500, poisson: 0.35, layers: null };

const HOOK: Cantilever = {
  length: 15,
  thickness: 2,
  tipThickness: 1.5,
  catch: { height: 1.5, land: 0.8, lead: 0.5, back: 1.2 },
  root: { kind: 'base', thickness: 3, span: 20, bottom: true },
  fillets: { front: 0.6, back: 0.6 },
  width: { kind: 'even', width: 6 },
  deflection: 1.5,
};

const MODELS = {
  hook: cantileverModel(HOOK),
  'open ring': openRingModel({
    radius: 6,
    thickness: 2,
    opening: 2,
    lips: 'round',
    foot: { width: 8, depth: 3, fillet: 1 },
    width: 8,
    spread: 2,
  }),
  'web to 180°': webModel({
    length: 3,
    thickness: 0.4,
    leaf: 2,
    leafLength: 4,
    fillet: 0.3,
    relief: 0.8,
    angle: Math.PI,
    width: 10,
  }),
};

/** Median time of a run in ms, warm. */
function median(run: () => void, runs = 25): number {
  for (let i = 0; i < runs; i++) run();
  const times = Array.from({ length: runs }, () => {
    const start = performance.now();
    run();
    return performance.now() - start;
  });
  return times.sort((a, b) => a - b)[runs >> 1]!;
}

const milliseconds = (time: number): string => `${time.toFixed(1)} ms`;

function timeModels(): void {
  for (const [name, model] of Object.entries(MODELS)) {
    const mesh = median(() => meshProfile(model.profile, RECOMMENDED_MESH));
    const linear = median(() => solveBending(model, PLASTIC, LINEAR));
    const large = median(() => solveBending(model, PLASTIC, NON_LINEAR), 9);
    const one = median(() => solveBending(model, PLASTIC, { ...NON_LINEAR, steps: 1 }), 9);
    const solution = solveBending(model, PLASTIC, LINEAR);
    const size = solution.ok ? solution.unknowns : 0;
    console.log(
      `  ${name} (${size} unknowns): mesh ${milliseconds(mesh)}, linear ${milliseconds(linear)}, ` +
        `large displacement ${milliseconds(one)} in one step, ${milliseconds(large)} with all steps kept`,
    );
  }
}

/** Factor and solve of the same matrix by both solvers in one run. */
function compareSolvers(): void {
  for (const refine of [1, 2]) {
    const options = { ...RECOMMENDED_MESH, perRadius: 8 * refine, perThickness: 3 * refine };
    const meshed = meshProfile(MODELS.hook.profile, options);
    if (!meshed.ok) throw new Error(meshed.reason);
    const { mesh } = meshed;
    const system = systemOf(MODELS.hook, mesh)!;
    const force = new Float64Array(2 * mesh.nodeCount);
    const kernel = newKernel(mesh, system.points, stVenant(PLASTIC, 'plane-stress'));
    assemble(kernel, null, null, system.stiffness, force);
    force.fill(0);
    force[2 * mesh.nodeCount - 2] = 1;
    const structure = structureOf(mesh, system.held);
    const frontal = median(() => {
      substitute(factorise(structure, system.stiffness, system.workspace), force);
    });
    const order = bandedOrder(mesh, system.held);
    const banded = median(() => {
      const rows = bandedMatrix(mesh, system.stiffness, order);
      factorBanded(rows, order.order, order.band);
      solveBanded(rows, order.order, order.band, new Float64Array(order.order).fill(1));
    }, 9);
    console.log(
      `  ${2 * mesh.nodeCount} unknowns: multifrontal ${milliseconds(frontal)}, ` +
        `banded (half band ${order.band}) ${milliseconds(banded)}, ratio ${(banded / frontal).toFixed(1)}`,
    );
  }
}

/** Largest departure of ln(peak) from the mean of its neighbours while the thickness is dragged by 0.025 mm. */
function jitter(): void {
  const peaks = Array.from({ length: 60 }, (_, i) => {
    const solution = solveBending(cantileverModel({ ...HOOK, thickness: 1.5 + 0.025 * i }), PLASTIC);
    return solution.ok ? Math.log(solution.tension.strain) : Number.NaN;
  });
  const steps = peaks.slice(1, -1).map((peak, i) => Math.abs(peak - (peaks[i]! + peaks[i + 2]!) / 2));
  console.log(`  peak while dragging: ${(100 * Math.max(...steps)).toFixed(2)} % (limit 0.3 %)`);
}

/** Heap after 100 and after 1,100 solves; run with --expose-gc for exact figures. */
function memory(): void {
  const used = () => {
    (globalThis as { gc?: () => void }).gc?.();
    return process.memoryUsage().heapUsed + process.memoryUsage().arrayBuffers;
  };
  for (let i = 0; i < 100; i++) solveBending(MODELS.hook, PLASTIC);
  const before = used();
  for (let i = 0; i < 1000; i++) solveBending(MODELS.hook, PLASTIC);
  console.log(`  memory over 1,000 solves: ${((used() - before) / 2 ** 20).toFixed(1)} MB more`);
}

const FUZZ = 10_000;

/** Meshes every profile and prints the worst of them. */
function fuzz(name: string, profiles: Iterable<Profile>): void {
  let [made, failed, thinnest, areaError] = [0, 0, 180, 0];
  for (const profile of profiles) {
    made++;
    const meshed = meshProfile(profile, RECOMMENDED_MESH);
    if (!meshed.ok) {
      failed++;
      continue;
    }
    thinnest = Math.min(thinnest, (smallestAngle(meshed.mesh) * 180) / Math.PI);
    areaError = Math.max(areaError, Math.abs(meshArea(meshed.mesh) / profileArea(profile) - 1));
  }
  console.log(
    `  ${made} random profiles of ${name}: ${failed} without a mesh, smallest angle ${thinnest.toFixed(1)}°, ` +
      `area within ${areaError.toExponential(1)}`,
  );
}

function* shapes(name: string): Generator<Profile> {
  for (const { profile } of randomModels(name, FUZZ)) yield profile;
}

function* parts(family: Family): Generator<Profile> {
  for (const values of randomValues(family, FUZZ)) {
    const plane = bendingOf(family, values, toughPlastic, DEFAULT_USE);
    if (!('none' in plane)) yield plane.model.profile;
  }
}

async function fuzzAll(): Promise<void> {
  for (const name of Object.keys(RANDOM_SHAPES)) fuzz(`the shape ${name}`, shapes(name));
  for (const { load } of FAMILIES) {
    const family = await load();
    if (family.bending) fuzz(family.about.name.toLowerCase(), parts(family));
  }
}

console.log('finite elements');
timeModels();
compareSolvers();
jitter();
memory();
void fuzzAll();
