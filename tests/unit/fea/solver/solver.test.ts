import { Matrix, solve } from 'ml-matrix';
import { describe, expect, it } from 'vitest';
import { stVenant } from '@/lib/fea/element/law';
import type { Mesh } from '@/lib/fea/mesh/mesh';
import { outline } from '@/lib/fea/profile/outline';
import { arc } from '@/lib/fea/profile/segment';
import { eliminate } from '@/lib/fea/solver/eliminate';
import { factorise, newWorkspace } from '@/lib/fea/solver/factor';
import { multiply } from '@/lib/fea/solver/multiply';
import { structureOf } from '@/lib/fea/solver/structure';
import { substitute } from '@/lib/fea/solver/substitute';
import { linearProblem, meshed, REFERENCE, sampled } from '@/tests/support/plane-models';

const plate = meshed(
  {
    loops: [
      outline([
        { at: [0, 0], tag: 'low' },
        { at: [12, 0], tag: 'right' },
        { at: [12, 6], radius: 1.5, tag: 'high' },
        { at: [0, 6], tag: 'left' },
      ]),
      [arc([5, 3], 1.2, 0, -2 * Math.PI, 'hole')],
    ],
  },
  { longest: 3, perRadius: 1, perThickness: 1 },
);

function heldLeft(mesh: Mesh): Uint8Array {
  const held = new Uint8Array(2 * mesh.nodeCount);
  for (let node = 0; node < mesh.nodeCount; node++) {
    if (Math.abs(mesh.nodes[2 * node]!) < 1e-9) held.fill(1, 2 * node, 2 * node + 2);
  }
  return held;
}

const { stiffness } = linearProblem(plate, 'plane-stress', stVenant(REFERENCE, 'plane-stress'));
const held = heldLeft(plate);
const force = sampled(plate, (x, y) => [Math.sin(x + 2 * y), Math.cos(3 * x - y)]).map((f, i) =>
  held[i] ? 0 : f,
);

/** The matrix written out in full, rows and columns of held unknowns left out. */
function dense(): { matrix: Matrix; unknowns: number[] } {
  const unknowns = [...held.keys()].filter((i) => !held[i]);
  const place = new Map(unknowns.map((unknown, i) => [unknown, i]));
  const matrix = Matrix.zeros(unknowns.length, unknowns.length);
  for (let e = 0; e < plate.elementCount; e++) {
    const at = (k: number) => place.get(2 * plate.elements[6 * e + (k >> 1)]! + (k & 1));
    for (let i = 0; i < 12; i++) {
      for (let j = 0; j < 12; j++) {
        const [row, column] = [at(i), at(j)];
        if (row === undefined || column === undefined) continue;
        const k = stiffness[144 * e + 12 * Math.max(i, j) + Math.min(i, j)]!;
        matrix.set(row, column, matrix.get(row, column) + k);
      }
    }
  }
  return { matrix, unknowns };
}

const largest = (v: ArrayLike<number>): number => Array.from(v).reduce((m, x) => Math.max(m, Math.abs(x)), 0);

describe('multifrontal solver', () => {
  const structure = structureOf(plate, held);

  it('agrees with a dense solve by another program', () => {
    const { matrix, unknowns } = dense();
    const expected = solve(matrix, Matrix.columnVector(unknowns.map((i) => force[i]!)));
    const x = substitute(factorise(structure, stiffness), force);
    const difference = unknowns.map((unknown, i) => x[unknown]! - expected.get(i, 0));
    expect(largest(difference) / largest(x)).toBeLessThan(1e-10);
  });

  it('leaves a residual at the level of round-off', () => {
    const x = substitute(factorise(structure, stiffness), force);
    const residual = multiply(plate, stiffness, x).map((f, i) => (held[i] ? 0 : f - force[i]!));
    expect(largest(residual) / largest(force)).toBeLessThan(1e-9);
  });

  it('eliminates every free unknown exactly once', () => {
    const pivots = structure.fronts.flatMap((front) => [...front.unknowns.subarray(0, front.pivots)]);
    expect(pivots.sort((a, b) => a - b)).toEqual([...held.keys()].filter((i) => !held[i]));
  });

  it('gives the same bytes in a workspace used before', () => {
    const workspace = newWorkspace(structure);
    const first = substitute(factorise(structure, stiffness, workspace), force);
    const second = substitute(factorise(structure, stiffness, workspace), force);
    expect(second).toEqual(first);
    expect(first).toEqual(substitute(factorise(structure, stiffness), force));
  });

  it('reports pivots that are not positive when nothing holds the part', () => {
    const loose = structureOf(plate, new Uint8Array(held.length));
    const turned = stiffness.map((k, i) => (i % 13 === 0 ? k - 1 : k));
    expect(factorise(loose, turned).notPositive).toBeGreaterThan(0);
  });
});

describe('dense elimination', () => {
  it.each([5, 8, 13, 24])('leaves the Schur complement of the first %i columns', (pivots) => {
    const size = 30;
    const value = (i: number, j: number) => (i === j ? size : Math.sin(7 * i * j + i + j) / 2);
    const matrix = Matrix.zeros(size, size);
    const block = new Float64Array(size * size);
    for (let i = 0; i < size; i++) {
      for (let j = 0; j <= i; j++) {
        matrix.set(i, j, value(i, j));
        matrix.set(j, i, value(i, j));
        block[j * size + i] = value(i, j);
      }
    }
    expect(eliminate(block, size, pivots)).toBe(0);
    const [p, n] = [pivots - 1, size - 1];
    const a = matrix.subMatrix(0, p, 0, p);
    const b = matrix.subMatrix(0, p, pivots, n);
    const schur = matrix.subMatrix(pivots, n, pivots, n).sub(b.transpose().mmul(solve(a, b)));
    for (let j = pivots; j < size; j++) {
      for (let i = j; i < size; i++) {
        expect(block[j * size + i]).toBeCloseTo(schur.get(i - pivots, j - pivots), 9);
      }
    }
  });

  it('counts negative pivots as Sylvester says', () => {
    const block = Float64Array.of(1, 2, 3, 0, 1, 4, 0, 0, 2);
    // [[1 2 3][2 1 4][3 4 2]] has one positive and two negative eigenvalues
    expect(eliminate(block, 3, 3)).toBe(2);
  });
});
