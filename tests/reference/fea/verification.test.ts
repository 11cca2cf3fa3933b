import { readFileSync } from 'node:fs';
import { describe, expect, it } from 'vitest';
import { solveBending } from '@/lib/fea/solve/solve-bending';
import { REFERENCE, solved } from '@/tests/support/plane-models';
import { RUNS } from './runs';
import type { Verification } from './verification';

const shown: Verification = JSON.parse(
  readFileSync(new URL('../../../public/verification/finite-elements.json', import.meta.url), 'utf8'),
);

describe('the verification table of the guide', () => {
  it('has every case once', () => {
    expect(shown.cases.map(({ id }) => id)).toEqual(RUNS.map(({ id }) => id));
  });

  it('shows what the solver gives today', () => {
    const sampled = RUNS.filter((_, i) => i % 9 === 0);
    for (const run of sampled) {
      const line = shown.cases.find(({ id }) => id === run.id)!;
      const solution = solved(solveBending(run.model, REFERENCE, run.options));
      if (line.strain) expect(solution.tension.strain / line.strain.computed).toBeCloseTo(1, 4);
      if (line.force) expect(Math.abs(solution.steps.at(-1)!.force) / line.force.computed).toBeCloseTo(1, 4);
    }
  });

  it('shows errors that fall as the mesh gets finer', () => {
    expect(shown.convergence).toHaveLength(4);
    for (const { id, meshes } of shown.convergence) {
      const [first, last] = [meshes[0]!, meshes.at(-1)!];
      expect(last.unknowns, id).toBeGreaterThan(first.unknowns);
      expect(Math.abs(last.strainPercent), id).toBeLessThan(0.5);
      expect(Math.abs(last.forcePercent), id).toBeLessThan(Math.abs(first.forcePercent) + 1e-3);
    }
  });
});
