import { type MeshOptions, RECOMMENDED_MESH } from '@/lib/fea/mesh/options';
import { solveBending } from '@/lib/fea/solve/solve-bending';
import { REFERENCE, solved } from '@/tests/support/plane-models';
import { percent } from './cases';
import { RUNS, type Run } from './runs';

/** One line of the table: reference and computed figures, difference in percent. */
export interface VerificationCase {
  readonly id: string;
  readonly group: string;
  readonly force: { readonly reference: number; readonly computed: number; readonly percent: number } | null;
  readonly strain: { readonly reference: number; readonly computed: number; readonly percent: number } | null;
  readonly estimate: number;
  readonly unknowns: number;
  readonly exception: string | null;
}

/** Peak strain and force of one case on ever finer meshes; difference to the finest in percent. */
export interface Convergence {
  readonly id: string;
  readonly group: string;
  readonly meshes: readonly {
    readonly unknowns: number;
    readonly strainPercent: number;
    readonly forcePercent: number;
  }[];
}

export interface Verification {
  readonly note: string;
  readonly cases: readonly VerificationCase[];
  readonly convergence: readonly Convergence[];
}

/** Six significant digits: more would differ between machines. */
const round = (value: number): number => Number(value.toPrecision(6));

function compared(reference: number | null, computed: number) {
  if (reference === null) return null;
  const difference = Number(percent(computed, reference).toFixed(2));
  return { reference: round(reference), computed: round(computed), percent: difference };
}

function caseOf(run: Run): VerificationCase {
  const solution = solved(solveBending(run.model, REFERENCE, run.options));
  return {
    id: run.id,
    group: run.group,
    force: compared(run.force, Math.abs(solution.steps.at(-1)!.force)),
    strain: compared(run.strain, solution.tension.strain),
    estimate: Number((100 * solution.errorEstimate).toFixed(2)),
    unknowns: solution.unknowns,
    exception: run.exception,
  };
}

const finer = (times: number): MeshOptions => ({
  ...RECOMMENDED_MESH,
  longest: RECOMMENDED_MESH.longest / times,
  perRadius: RECOMMENDED_MESH.perRadius * times,
  perThickness: RECOMMENDED_MESH.perThickness * times,
  growth: RECOMMENDED_MESH.growth * Math.min(1, times ** -0.5),
});

const FINENESS = [0.5, 0.7, 1, 1.4, 2, 2.8];
const FINEST = 4;

function convergenceOf(run: Run): Convergence {
  const solve = (times: number) => {
    const options = { ...run.options, mesh: finer(times), mostUnknowns: 100_000 };
    const solution = solved(solveBending(run.model, REFERENCE, options));
    const force = Math.abs(solution.steps.at(-1)!.force);
    return { unknowns: solution.unknowns, strain: solution.tension.strain, force };
  };
  const finest = solve(FINEST);
  const meshes = FINENESS.map((times) => {
    const { unknowns, strain, force } = solve(times);
    return {
      unknowns,
      strainPercent: Number(percent(strain, finest.strain).toFixed(3)),
      forcePercent: Number(percent(force, finest.force).toFixed(3)),
    };
  });
  return { id: run.id, group: run.group, meshes };
}

const SHOWN = ['5 block L/h=7.5 R/h=0.3', '8 R=5 t=1.5 90', '12 10,14,3', '9 Lw=3.0 90 centre r=0.3 sym'];

/** Runs every case: what the guide's verification page shows. */
export function verify(): Verification {
  return {
    note: 'Made by tests/reference/fea/write-verification.ts from real runs; not to be edited. Percent throughout.',
    cases: RUNS.map(caseOf),
    convergence: RUNS.filter(({ id }) => SHOWN.includes(id)).map(convergenceOf),
  };
}
