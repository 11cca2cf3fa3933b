import { describe, expect, it } from 'vitest';
import { newKernel } from '@/lib/fea/element/kernel';
import { stVenant } from '@/lib/fea/element/law';
import { gaussPoints } from '@/lib/fea/element/points';
import { shapeSlopes, shapeValues } from '@/lib/fea/element/shape';
import type { Mesh } from '@/lib/fea/mesh/mesh';
import { outline } from '@/lib/fea/profile/outline';
import { nodalStrain } from '@/lib/fea/strain/nodal';
import { heldBoundary, linearProblem, meshed, REFERENCE, sampled } from '@/tests/support/plane-models';

/*
 * Method of manufactured solutions (Roache, Verification and Validation in Computational Science and Engineering):
 * u = (sin(ax) cos(by), cos(bx) sin(ay)) with the body force that balances it in plane stress.
 */
const [A, B] = [0.9, 0.6];
const { modulus, poisson: nu } = REFERENCE;
const C = modulus / (1 - nu * nu);
const G = modulus / (2 * (1 + nu));

const exact = (x: number, y: number): readonly [number, number] => [
  1e-3 * Math.sin(A * x) * Math.cos(B * y),
  1e-3 * Math.cos(B * x) * Math.sin(A * y),
];

const exactStrain = (x: number, y: number): readonly [number, number, number] => [
  1e-3 * A * Math.cos(A * x) * Math.cos(B * y),
  1e-3 * A * Math.cos(B * x) * Math.cos(A * y),
  -1e-3 * B * (Math.sin(A * x) * Math.sin(B * y) + Math.sin(B * x) * Math.sin(A * y)),
];

/** Body force: minus the divergence of the stress. */
function bodyForce(x: number, y: number): readonly [number, number] {
  const pull = C * A * A + G * B * B;
  const share = A * B * (C * nu + G);
  return [
    1e-3 * (pull * Math.sin(A * x) * Math.cos(B * y) + share * Math.sin(B * x) * Math.cos(A * y)),
    1e-3 * (pull * Math.cos(B * x) * Math.sin(A * y) + share * Math.cos(A * x) * Math.sin(B * y)),
  ];
}

/** Six-point rule of degree 4 on the reference triangle (Dunavant 1985): coordinates and weight for area 1/2. */
const RULE = [0.445948490915965, 0.091576213509771].flatMap((p, i) => {
  const weight = [0.223381589678011, 0.109951743655322][i]! / 2;
  const q = 1 - 2 * p;
  return [
    [p, p, weight],
    [p, q, weight],
    [q, p, weight],
  ] as const;
});

interface Sample {
  readonly x: number;
  readonly y: number;
  readonly values: readonly number[];
  readonly area: number;
}

function samplesOf(mesh: Mesh, element: number): Sample[] {
  const nodes = [...mesh.elements.subarray(6 * element, 6 * element + 6)];
  const sum = (weights: readonly number[], axis: number) =>
    weights.reduce((total, w, k) => total + w * mesh.nodes[2 * nodes[k]! + axis]!, 0);
  return RULE.map(([a, b, weight]) => {
    const values = shapeValues(a, b);
    const slopes = shapeSlopes(a, b);
    const [sa, sb] = [slopes.slice(0, 6), slopes.slice(6)];
    const jacobian = sum(sa, 0) * sum(sb, 1) - sum(sa, 1) * sum(sb, 0);
    return { x: sum(values, 0), y: sum(values, 1), values, area: jacobian * weight };
  });
}

function forceOf(mesh: Mesh): Float64Array {
  const force = new Float64Array(2 * mesh.nodeCount);
  for (let e = 0; e < mesh.elementCount; e++) {
    for (const { x, y, values, area } of samplesOf(mesh, e)) {
      const [fx, fy] = bodyForce(x, y);
      for (let k = 0; k < 6; k++) {
        const node = mesh.elements[6 * e + k]!;
        force[2 * node]! += values[k]! * fx * area;
        force[2 * node + 1]! += values[k]! * fy * area;
      }
    }
  }
  return force;
}

/** Root mean square errors over the area of displacement and of strain recovered at the nodes. */
function errors(mesh: Mesh): { displacement: number; strain: number } {
  const law = stVenant(REFERENCE, 'plane-stress');
  const u = linearProblem(mesh, 'plane-stress', law).solve(
    forceOf(mesh),
    heldBoundary(mesh),
    sampled(mesh, exact),
  );
  const strain = nodalStrain(newKernel(mesh, gaussPoints(mesh, 'plane-stress', () => 1)!, law), u, false);
  let [ofU, ofStrain] = [0, 0];
  for (let e = 0; e < mesh.elementCount; e++) {
    for (const { x, y, values, area } of samplesOf(mesh, e)) {
      const at = (field: Float64Array, stride: number, c: number) =>
        values.reduce((total, v, k) => total + v * field[stride * mesh.elements[6 * e + k]! + c]!, 0);
      const [ux, uy] = exact(x, y);
      ofU += area * ((at(u, 2, 0) - ux) ** 2 + (at(u, 2, 1) - uy) ** 2);
      exactStrain(x, y).forEach((value, c) => {
        ofStrain += area * (at(strain, 4, c) - value) ** 2;
      });
    }
  }
  return { displacement: Math.sqrt(ofU), strain: Math.sqrt(ofStrain) };
}

describe('manufactured solution', () => {
  const sizes = [1, 0.5, 0.25];
  const found = sizes.map((longest) =>
    errors(
      meshed(
        {
          loops: [
            outline([
              { at: [0, 0], tag: 'a' },
              { at: [5, 0], tag: 'b' },
              { at: [5, 4], tag: 'c' },
              { at: [0, 4], tag: 'd' },
            ]),
          ],
        },
        { longest, perThickness: 1 },
      ),
    ),
  );
  const order = (of: 'displacement' | 'strain') => Math.log2(found[1]![of] / found[2]![of]);

  it('converges with order 3 in displacement', () => {
    expect(order('displacement')).toBeGreaterThan(2.8);
    expect(found[2]!.displacement).toBeLessThan(1e-5);
  });

  it('converges with order 2 in strain', () => {
    expect(order('strain')).toBeGreaterThan(1.9);
  });
});
