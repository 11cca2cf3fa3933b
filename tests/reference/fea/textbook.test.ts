import { describe, expect, it } from 'vitest';
import { addTraction, edgesWith } from '@/lib/fea/element/edge-load';
import { newKernel } from '@/lib/fea/element/kernel';
import { isotropicStiffness, stVenant } from '@/lib/fea/element/law';
import type { Plane } from '@/lib/fea/element/plane';
import { gaussPoints } from '@/lib/fea/element/points';
import type { Mesh } from '@/lib/fea/mesh/mesh';
import type { BendingModel } from '@/lib/fea/model';
import { outline } from '@/lib/fea/profile/outline';
import { arc, line, type Point, type Segment } from '@/lib/fea/profile/segment';
import { NON_LINEAR } from '@/lib/fea/solve/options';
import { solveBending } from '@/lib/fea/solve/solve-bending';
import { heldBy } from '@/lib/fea/solve/supports';
import { nodalStrain } from '@/lib/fea/strain/nodal';
import { surfaceStrain } from '@/lib/fea/strain/surface';
import { linearProblem, meshed, REFERENCE, solved } from '@/tests/support/plane-models';
import { percent, rollerArm } from './cases';

const node = (mesh: Mesh, [x, y]: Point): number => {
  const far = (n: number) => Math.hypot(mesh.nodes[2 * n]! - x, mesh.nodes[2 * n + 1]! - y);
  return Array.from({ length: mesh.nodeCount }, (_, n) => n).reduce((a, b) => (far(b) < far(a) ? b : a));
};

/** Displacement under tractions on tagged edges. */
function loaded(
  mesh: Mesh,
  plane: Plane,
  numbers: { modulus: number; poisson: number },
  supports: BendingModel['supports'],
  loads: readonly { tag: string; at: (x: number, y: number) => readonly [number, number] }[],
  width = 1,
): Float64Array {
  const force = new Float64Array(2 * mesh.nodeCount);
  for (const { tag, at } of loads) addTraction(mesh, plane, edgesWith(mesh, tag), at, force);
  const held = heldBy(mesh, supports);
  const problem = linearProblem(mesh, plane, stVenant(numbers, plane), width);
  return problem.solve(
    force.map((f) => f * width),
    held,
    new Float64Array(force.length),
  );
}

/** Quarter of an ellipse with half axes a (x) and b (y), as short chords between true points, counter-clockwise. */
function ellipse(a: number, b: number, tag: string, reverse = false): Segment[] {
  const count = 40;
  const angles = Array.from({ length: count + 1 }, (_, i) => (Math.PI / 2) * (i / count));
  const points = angles.map((t): Point => [a * Math.cos(t), b * Math.sin(t)]);
  if (reverse) points.reverse();
  return points.slice(1).map((to, i) => line(points[i]!, to, tag));
}

/*
 * NAFEMS, The Standard NAFEMS Benchmarks (1990), test LE1: elliptic membrane, plane stress, E = 210 GPa, nu = 0.3,
 * outward pressure 10 MPa on the outer ellipse; sigma_yy at D (2, 0) is 92.7 MPa. Metres scaled to mm; from memory.
 */
describe('elliptic membrane (NAFEMS LE1)', () => {
  const profile = {
    loops: [
      [
        line([2, 0], [3.25, 0], 'DC'),
        ...ellipse(3.25, 2.75, 'outer'),
        line([0, 2.75], [0, 1], 'BA'),
        ...ellipse(2, 1, 'inner', true),
      ],
    ],
  };

  it('has 92.7 MPa at D within 2 %', () => {
    const mesh = meshed(profile, { perThickness: 8, growth: 0.3 });
    const numbers = { modulus: 210_000, poisson: 0.3 };
    const pressure = (x: number, y: number): readonly [number, number] => {
      const [nx, ny] = [x / 3.25 ** 2, y / 2.75 ** 2];
      const size = 10 / Math.hypot(nx, ny);
      return [nx * size, ny * size];
    };
    const supports = [
      { tag: 'BA', fix: 'x' },
      { tag: 'DC', fix: 'y' },
    ] as const;
    const u = loaded(mesh, 'plane-stress', numbers, supports, [{ tag: 'outer', at: pressure }]);
    // D lies on the unloaded inner ellipse, so sigma_yy = E eps_yy there
    const along = surfaceStrain(mesh, 'plane-stress', ['inner'], u, false).along[node(mesh, [2, 0])]!;
    expect(Math.abs(percent(numbers.modulus * along, 92.7))).toBeLessThan(2);
  });
});

/* Kirsch 1898, as in Timoshenko and Goodier, Theory of Elasticity: wide plate with a hole, concentration 3.0. */
describe('plate with a round hole (Kirsch)', () => {
  it('has three times the far strain at the edge of the hole', () => {
    const [radius, half] = [1, 60];
    const profile = {
      loops: [
        [
          line([radius, 0], [half, 0], 'low'),
          line([half, 0], [half, half], 'pull'),
          line([half, half], [0, half], 'top'),
          line([0, half], [0, radius], 'left'),
          arc([0, 0], radius, Math.PI / 2, -Math.PI / 2, 'hole'),
        ],
      ],
    };
    const mesh = meshed(profile, { longest: 10 });
    const supports = [
      { tag: 'left', fix: 'x' },
      { tag: 'low', fix: 'y' },
    ] as const;
    const u = loaded(mesh, 'plane-stress', REFERENCE, supports, [{ tag: 'pull', at: () => [1, 0] }]);
    const { along } = surfaceStrain(mesh, 'plane-stress', ['hole'], u, false);
    const top = along[node(mesh, [0, radius])]! * REFERENCE.modulus;
    const side = along[node(mesh, [radius, 0])]! * REFERENCE.modulus;
    expect(Math.abs(percent(top, 3))).toBeLessThan(1);
    expect(Math.abs(percent(side, -1))).toBeLessThan(2);
  });
});

/* Lame 1852, as in Timoshenko and Goodier: thick cylinder under inner pressure, long (plane strain) or free ends. */
describe('thick cylinder (Lame)', () => {
  const [a, b, pressure] = [4, 9, 2];
  const { modulus, poisson } = REFERENCE;
  const hoop = (pressure * (b * b + a * a)) / (b * b - a * a);

  it('grows at the bore as the closed form says, free to shorten', () => {
    const profile = {
      loops: [
        outline([
          { at: [a, 0], tag: 'low' },
          { at: [b, 0], tag: 'outside' },
          { at: [b, 6], tag: 'high' },
          { at: [a, 6], tag: 'bore' },
        ]),
      ],
    };
    const mesh = meshed(profile, { perThickness: 6 });
    const load = { tag: 'bore', at: () => [pressure, 0] as const };
    const u = loaded(mesh, 'axisymmetric', REFERENCE, [{ tag: 'low', fix: 'y' }], [load]);
    const expected = (a / modulus) * (hoop + poisson * pressure);
    expect(Math.abs(percent(u[2 * node(mesh, [a, 3])]!, expected))).toBeLessThan(0.2);
  });

  it('agrees between a slice of it in the plane and the closed form of plane strain', () => {
    const profile = {
      loops: [
        [
          line([a, 0], [b, 0], 'low'),
          arc([0, 0], b, 0, Math.PI / 2, 'outside'),
          line([0, b], [0, a], 'left'),
          arc([0, 0], a, Math.PI / 2, -Math.PI / 2, 'bore'),
        ],
      ],
    };
    const mesh = meshed(profile);
    const radial = (x: number, y: number): readonly [number, number] => {
      const r = Math.hypot(x, y);
      return [(pressure * x) / r, (pressure * y) / r];
    };
    const supports = [
      { tag: 'left', fix: 'x' },
      { tag: 'low', fix: 'y' },
    ] as const;
    const u = loaded(mesh, 'plane-strain', REFERENCE, supports, [{ tag: 'bore', at: radial }]);
    const stiff = modulus / (1 - poisson * poisson);
    const expected = (a / stiff) * (hoop + (poisson / (1 - poisson)) * pressure);
    expect(percent(u[2 * node(mesh, [a, 0])]!, expected)).toBeCloseTo(0, 1);
    const { along } = surfaceStrain(mesh, 'plane-strain', ['bore'], u, false);
    expect(percent(along[node(mesh, [a, 0])]!, expected / a)).toBeCloseTo(0, 0);
  });

  it('has the hoop stress of the closed form at the bore', () => {
    const mesh = meshed(
      {
        loops: [
          outline([{ at: [a, 0], tag: 'low' }, { at: [b, 0] }, { at: [b, 6] }, { at: [a, 6], tag: 'bore' }]),
        ],
      },
      { perThickness: 8 },
    );
    const load = { tag: 'bore', at: () => [pressure, 0] as const };
    const u = loaded(mesh, 'axisymmetric', REFERENCE, [{ tag: 'low', fix: 'y' }], [load]);
    const law = stVenant(REFERENCE, 'axisymmetric');
    const strain = nodalStrain(newKernel(mesh, gaussPoints(mesh, 'axisymmetric', () => 1)!, law), u, false);
    const d = isotropicStiffness(REFERENCE);
    const at = 4 * node(mesh, [a, 3]);
    const stress = [0, 1, 2, 3].reduce((sum, c) => sum + d[12 + c]! * strain[at + c]!, 0);
    expect(Math.abs(percent(stress, hoop))).toBeLessThan(1);
  });
});

/*
 * Elastica: cantilever with a dead transverse load, Bisshopp and Drucker, Quart. Appl. Math. 3 (1945) 272, read as
 * P L^2 / EI against tip deflection by integrating the pendulum equation here. A slender arm, so that shear and the
 * stretch of the middle line are small.
 */
describe('cantilever at large deflection (elastica)', () => {
  /** P L^2/EI that gives the tip angle, and deflection and shortening over L, by quadrature. */
  function elastica(tipAngle: number): { load: number; deflection: number; reach: number } {
    // sin(psi) = sin(tipAngle) sin^2(t) removes the singular end
    const count = 4000;
    const top = Math.sin(tipAngle);
    let [arcLength, height] = [0, 0];
    for (let i = 0; i < count; i++) {
      const t = ((i + 0.5) / count) * (Math.PI / 2);
      const sine = top * Math.sin(t) ** 2;
      const cosine = Math.sqrt(1 - sine * sine);
      const step = (2 * top * Math.sin(t) * Math.cos(t)) / cosine / Math.sqrt(2 * top * Math.cos(t) ** 2);
      arcLength += (step * Math.PI) / 2 / count;
      height += (sine * step * Math.PI) / 2 / count;
    }
    const reach = (Math.sqrt(2 * top) * 1) / arcLength;
    return { load: arcLength ** 2, deflection: height / arcLength, reach };
  }

  it.each([0.3, 0.7, 1.1])(
    'has the force and tip position of the closed form at a tip angle of %f rad',
    (angle) => {
      const [length, thickness, width] = [60, 1, 4];
      const { load, deflection, reach } = elastica(angle);
      const arm = rollerArm({
        length,
        thickness,
        width: { kind: 'even', width },
        deflection: deflection * length,
      });
      const solution = solved(solveBending(arm, REFERENCE, NON_LINEAR));
      const last = solution.steps.at(-1)!;
      const bending = (REFERENCE.modulus * width * thickness ** 3) / 12;
      expect(Math.abs(percent(last.force, (load * bending) / length ** 2))).toBeLessThan(0.5);
      const tip = node(solution.mesh, [0, length]);
      expect(Math.abs(percent(length + last.displacement[2 * tip + 1]!, reach * length))).toBeLessThan(0.5);
    },
  );
});

/*
 * Shigley, Mechanical Engineering Design, example 3-15: crane hook, printed sigma_i = 16.9 and sigma_o = -5.63 kpsi by
 * Winkler-Bach theory. Section 0.75 in wide from ri = 2 in to ro = 6 in, 5000 lbf through the centre of curvature.
 * The exact plane solution of the same bar is in Timoshenko and Goodier, Theory of Elasticity, section 33 (from
 * memory): sigma = P/N (3 r - a^2 b^2/r^3 - (a^2 + b^2)/r), N = a^2 - b^2 + (a^2 + b^2) ln(b/a). Winkler-Bach is
 * 5.4 % under it at the inner face of so thick a bar.
 */
describe('curved beam (crane hook)', () => {
  it('has the exact stresses at both faces, and the printed ones within the error of Winkler-Bach theory', () => {
    const [inner, outer, width, pull] = [2, 6, 0.75, 5];
    const model: BendingModel = {
      profile: {
        loops: [
          [
            line([inner, 0], [outer, 0], 'section'),
            arc([0, 0], outer, 0, Math.PI / 2, 'outer'),
            line([0, outer], [0, inner], 'pulled'),
            arc([0, 0], inner, Math.PI / 2, -Math.PI / 2, 'inner'),
          ],
        ],
      },
      plane: 'plane-stress',
      width: { kind: 'even', width },
      mirrored: false,
      supports: [
        { tag: 'section', fix: 'y' },
        { corner: [inner, 0], fix: 'x' },
      ],
      // at a quarter turn from the section the hook carries the pull as shear alone
      drive: {
        kind: 'displacement',
        lands: [{ tag: 'pulled', direction: [0, 1], spread: 'parabolic' }],
        value: 0.01,
      },
      peakTags: ['inner', 'outer'],
      factors: [],
    };
    const numbers = { modulus: 30_000, poisson: 0.3, layers: null };
    const { mesh, steps } = solved(solveBending(model, numbers));
    const { displacement, force } = steps.at(-1)!;
    const { along } = surfaceStrain(mesh, 'plane-stress', ['inner', 'outer'], displacement, false);
    const stress = (x: number) => (numbers.modulus * along[node(mesh, [x, 0])]! * pull) / force;
    const squares = inner ** 2 + outer ** 2;
    const scale = pull / width / (inner ** 2 - outer ** 2 + squares * Math.log(outer / inner));
    const exact = (r: number) => -scale * (3 * r - (inner * outer) ** 2 / r ** 3 - squares / r);
    expect(Math.abs(percent(stress(inner), exact(inner)))).toBeLessThan(0.5);
    expect(Math.abs(percent(stress(outer), exact(outer)))).toBeLessThan(0.5);
    expect(Math.abs(percent(stress(inner), 16.9))).toBeLessThan(6);
    expect(Math.abs(percent(stress(outer), -5.63))).toBeLessThan(6);
  });
});
