import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import type { Family } from '@/generators/contract';
import { arbitraryParameters, checkFamilySolids } from '@/tests/support/solids';
import { spacerFamily } from '@/tests/support/spacer-family';

describe('random parameters', () => {
  const drawn = fc.sample(arbitraryParameters(spacerFamily.parameters), { numRuns: 400, seed: 7 });

  it('are all accepted by the schema', () => {
    expect(drawn.filter((values) => !spacerFamily.parameters.schema.safeParse(values).success)).toEqual([]);
  });

  it('reach the bounds, every choice and the limits of the relations', () => {
    const diameters = drawn.map((values) => values.diameter);
    expect(Math.min(...diameters)).toBeLessThan(9);
    expect(Math.max(...diameters)).toBeGreaterThan(56);
    expect(new Set(drawn.map((values) => values.shape))).toEqual(new Set(['round', 'square']));
    expect(new Set(drawn.map((values) => values.bored))).toEqual(new Set([true, false]));
    expect(new Set(drawn.map((values) => values.pieces))).toEqual(new Set([1, 2, 3]));
    expect(Math.min(...drawn.map(({ diameter, bore }) => diameter - bore))).toBeLessThan(4);
  });

  it('stay on the steps of the fields', () => {
    for (const { height } of drawn)
      expect(Math.abs(height / 0.2 - Math.round(height / 0.2))).toBeLessThan(1e-6);
  });
});

describe('the check of a family', () => {
  it('passes a sound family', async () => {
    await checkFamilySolids(spacerFamily, { runs: 60, seed: 3 });
  });

  it('finds a volume that is off', async () => {
    const wrong: Family = {
      ...spacerFamily,
      volumes: (values, n) => {
        const right = spacerFamily.volumes(values, n)!;
        return { ...right, 'spacer-1': right['spacer-1']! * 1.002 };
      },
    };
    await expect(checkFamilySolids(wrong, { runs: 5, seed: 3 })).rejects.toThrow('mm3 expected');
  });

  it('finds a body that the kernel refuses', async () => {
    const wrong: Family = {
      ...spacerFamily,
      build: (_, kernel) => [{ name: 'a', solid: kernel.box([1, 1, 0]) }],
    };
    await expect(checkFamilySolids(wrong, { runs: 5, seed: 3 })).rejects.toThrow('Property failed');
  });
});
