import { describe, expect, it } from 'vitest';
import {
  CASES,
  CONVERGENCE,
  caseName,
  differences,
  groups,
  spreadOf,
} from '@/components/site/verification/record';

describe('the record behind the verification page', () => {
  it('keeps every difference within what the solver promises: 2 % in force, 3 % in strain', () => {
    expect(spreadOf(CASES, 'force')!.largest).toBeLessThan(2);
    expect(spreadOf(CASES, 'strain')!.largest).toBeLessThan(3);
  });

  it('counts exceptions apart and gives the cause of each', () => {
    const exceptions = CASES.filter(({ exception }) => exception !== null);
    expect(exceptions.length).toBeGreaterThan(0);
    for (const { exception } of exceptions) expect(exception!.length).toBeGreaterThan(40);
    expect(differences(exceptions, 'strain')).toEqual([]);
  });

  it('groups every case once', () => {
    const all = groups().flatMap(([, cases]) => cases);
    expect(all).toHaveLength(CASES.length);
    expect(new Set(all).size).toBe(CASES.length);
  });

  it('has the middle of an even number of differences on the smaller side', () => {
    const cases = CASES.slice(0, 2);
    const sizes = differences(cases, 'force').map(Math.abs);
    expect(spreadOf(cases, 'force')).toEqual({
      count: 2,
      median: Math.min(...sizes),
      largest: Math.max(...sizes),
    });
    expect(spreadOf([], 'force')).toBeNull();
  });

  it('compares with the finest mesh in every plot, the mesh in use being the third', () => {
    for (const { meshes } of CONVERGENCE) {
      expect(meshes.length).toBeGreaterThan(3);
      expect(meshes.map(({ unknowns }) => unknowns)).toEqual(
        meshes.map(({ unknowns }) => unknowns).sort((a, b) => a - b),
      );
      expect(Math.abs(meshes[2]!.strainPercent)).toBeLessThan(0.5);
    }
  });

  it('names cases without the number of their series', () => {
    expect(caseName({ id: '5 block L/h=7.5 R/h=0.3' })).toBe('block L/h=7.5 R/h=0.3');
    expect(caseName({ id: '2_tapered_thickness' })).toBe('tapered thickness');
  });
});
