import { describe, expect, it } from 'vitest';
import { ArmPath, solveArm, winklerSection } from '@/lib/mechanics/curved-beam';
import {
  CASE_MODULUS,
  CASE_POISSON,
  casesOf,
  errorPercent,
  expected,
  type FiniteElementCase,
  input,
} from '@/tests/support/finite-elements';

const named = (kind: 'c_clip' | 'u_arm') => casesOf(kind).map((solved) => [solved.id, solved] as const);
const elasticOf = (solved: FiniteElementCase) => ({
  modulus: CASE_MODULUS,
  poisson: CASE_POISSON,
  width: input(solved, 'b'),
});

/** Half of an open ring from its back, at the bottom, to one lip, pulled outward there. */
function halfRing(half: number, radius: number, wall: number, elastic: Parameters<typeof solveArm>[3]) {
  const path = new ArmPath(0, 0, 0, () => wall).turn(half, radius, 400).build();
  return solveArm(path.stations, path.tip, 0, elastic);
}

describe('open rings against plane-stress finite elements', () => {
  const solve = (solved: FiniteElementCase) => {
    const half = Math.PI - (input(solved, 'opening_deg') * Math.PI) / 360;
    const ring = halfRing(half, input(solved, 'R'), input(solved, 't'), elasticOf(solved));
    const force = 0.5 / ring.compliance;
    return { force, strain: force * ring.peak.perNewton };
  };

  it.each(named('c_clip'))('gives force and strain of %s within 1.5 %%', (_, solved) => {
    const { force, strain } = solve(solved);
    expect(Math.abs(errorPercent(force, expected(solved, 'force_per_mm')))).toBeLessThan(1.5);
    expect(Math.abs(errorPercent(strain, expected(solved, 'strain_per_mm')))).toBeLessThan(1.5);
  });
});

describe('U arms against plane-stress finite elements', () => {
  const solve = (solved: FiniteElementCase) => {
    const thickness = input(solved, 'h');
    const path = new ArmPath(0, 0, Math.PI / 2, () => thickness)
      .straight(input(solved, 'L1'), 60)
      .turn(-Math.PI, input(solved, 'gap_radius') + thickness / 2, 200)
      .straight(input(solved, 'L2'), 60)
      .build();
    return solveArm(path.stations, path.tip, 0, elasticOf(solved));
  };

  it.each(named('u_arm'))('gives force and strain of %s within 2.5 %%', (_, solved) => {
    const arm = solve(solved);
    const strain = arm.peak.perNewton / arm.compliance;
    expect(Math.abs(errorPercent(1 / arm.compliance, expected(solved, 'force_per_mm')))).toBeLessThan(2.5);
    expect(Math.abs(errorPercent(strain, expected(solved, 'strain_per_mm')))).toBeLessThan(2.5);
  });

  it.each(named('u_arm'))('finds the peak of %s inside the bend', (_, solved) => {
    const arm = solve(solved);
    expect(arm.peak.side).toBe('right');
    expect(arm.peak.station).toBeGreaterThanOrEqual(60);
    expect(arm.peak.station).toBeLessThan(260);
  });
});

describe('published curved bars', () => {
  // Shigley, Mechanical Engineering Design, example 3-15 (crane hook), printed answers as quoted:
  // b 0.75 in, ri 2 in, ro 6 in, F 5000 lbf; rn 3.641 in, e 0.359 in, 16.9 and -5.63 kpsi.
  it('gives the stresses of the crane hook', () => {
    const section = winklerSection(4, 4);
    expect(section.neutralRadius).toBeCloseTo(3.641, 3);
    expect(section.eccentricity).toBeCloseTo(0.359, 3);
    const [area, force] = [0.75 * 4, 5000];
    const moment = force * 4;
    const stress = (radius: number) =>
      force / area + (moment * (section.neutralRadius - radius)) / (area * section.eccentricity * radius);
    expect(stress(2) / 1000).toBeCloseTo(16.9, 1);
    expect(stress(6) / 1000).toBeCloseTo(-5.63, 1);
  });

  // Logan, A First Course in the Finite Element Method, P5-64 (inputs); F = Delta E I / (3 pi R^3), computed.
  it('opens the slit ring by 0.1 in under 10.74 lbf', () => {
    const thickness = Math.sqrt((12 * 4.5e-4) / 0.06);
    const width = 0.06 / thickness;
    const ring = halfRing(Math.PI, 2, thickness, { modulus: 18e6, poisson: 0.3, width });
    expect(Math.abs(errorPercent(0.05 / ring.compliance, 10.74))).toBeLessThan(1);
  });

  // Castigliano, inextensional thin bar, derived: f = beta (1/2 + cos^2 beta) - 0.75 sin 2 beta.
  it.each([
    [110, 1.6666],
    [120, 2.22032],
    [150, 3.92201],
    [180, 4.71239],
  ])('tends to the thin-ring factor at a half arc of %i degrees', (degrees, factor) => {
    const [radius, wall, width, modulus] = [100, 0.5, 5, 1000];
    const ring = halfRing((degrees * Math.PI) / 180, radius, wall, { modulus, poisson: 0, width });
    const thin = (radius ** 3 * factor) / (modulus * ((width * wall ** 3) / 12));
    expect(Math.abs(errorPercent(ring.compliance, thin))).toBeLessThan(0.1);
  });

  // Exact thin-beam results for an L and a U arm (derived; handbook examples with full precision).
  it('gives the U arm of equal legs 1.831 mm and 1.264 % in the thin limit', () => {
    const [modulus, width, thickness] = [1700, 6, 1.6];
    const scale = 1000;
    const path = new ArmPath(0, 0, Math.PI / 2, () => thickness)
      .straight(8 * scale, 60)
      .turn(-Math.PI, 3 * scale, 400)
      .straight(8 * scale, 60)
      .build();
    const arm = solveArm(path.stations, path.tip, 0, { modulus, poisson: 0, width });
    expect((5 * arm.compliance) / scale ** 3).toBeCloseTo(1.831, 2);
    expect((5 * arm.peak.perNewton) / scale).toBeCloseTo(0.012638, 4);
    expect(Math.abs(arm.rootMoment)).toBeLessThan(0.01 * 8 * scale);
  });

  it('gives the straight arm its cantilever and shear deflection', () => {
    const elastic = { modulus: 1700, poisson: 0.35, width: 8 };
    const path = new ArmPath(0, 0, 0, () => 2).straight(20, 400).build();
    const { compliance, peak } = solveArm(path.stations, path.tip, Math.PI / 2, elastic);
    const inertia = (8 * 8) / 12;
    const bending = 20 ** 3 / (3 * 1700 * inertia);
    const shear = (1.2 * 2.7 * 20) / (1700 * 16);
    expect(compliance).toBeCloseTo(bending + shear, 6);
    expect(peak.perNewton).toBeCloseTo((6 * 20) / (1700 * 8 * 4), 4);
  });
});
