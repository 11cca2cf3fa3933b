import { describe, expect, it } from 'vitest';
import { solveBending } from '@/lib/fea/solve/solve-bending';
import { REFERENCE, solved } from '@/tests/support/plane-models';
import { percent } from './cases';
import { RUNS } from './runs';

/*
 * The plane solver at the recommended mesh against tests/reference/finite-elements (CalculiX, see its SOURCE.md):
 * force within 2 %, peak strain within 3 %, exceptions with their cause in runs.ts.
 */
describe.each([...new Set(RUNS.map(({ group }) => group))])('%s', (group) => {
  it.each(RUNS.filter((run) => run.group === group).map((run) => [run.id, run] as const))('%s', (_, run) => {
    const solution = solved(solveBending(run.model, REFERENCE, run.options));
    expect(solution.fellBack).toBeNull();
    const force = Math.abs(solution.steps.at(-1)!.force);
    if (run.force !== null) expect(Math.abs(percent(force, run.force))).toBeLessThan(run.within.force);
    if (run.strain !== null) {
      expect(Math.abs(percent(solution.tension.strain, run.strain))).toBeLessThan(run.within.strain);
    }
  });
});

describe('estimated error of the peak', () => {
  const judged = RUNS.filter(({ strain, exception }) => strain !== null && exception === null).map((run) => {
    const { tension, errorEstimate } = solved(solveBending(run.model, REFERENCE, run.options));
    return { estimate: 100 * errorEstimate, error: Math.abs(percent(tension.strain, run.strain!)) };
  });

  // the references themselves are uncertain by 0.3 to 3 %, so a small true error says little
  it('is at least the true one, or within 0.6 percentage points of it, in every case', () => {
    const missed = judged.filter(({ estimate, error }) => error > estimate + 0.6);
    expect(missed).toEqual([]);
  });

  it('stays under 4 % at the recommended mesh', () => {
    expect(Math.max(...judged.map(({ estimate }) => estimate))).toBeLessThan(4);
  });
});
