import { describe, expect, it } from 'vitest';
import {
  annularForce,
  beadHeight,
  edgeLoadedShell,
  hoopStrain,
  remoteDistance,
  SHELL_BAND,
  tubeFactor,
} from '@/lib/mechanics/annular';
import {
  curvedBarStress,
  openRingFactor,
  openRingForce,
  openRingPeakStrain,
  openRingThinStrain,
  pinchedRing,
} from '@/lib/mechanics/curved-ring';
import { selfLockingAngle, wedgeFactor } from '@/lib/mechanics/friction';
import { tubePeakStrain, tubeRadialForce } from '@/lib/mechanics/ring';
import { radians } from '@/lib/units';
import {
  CASE_MODULUS,
  CASE_POISSON,
  casesOf,
  errorPercent,
  type FiniteElementCase,
  expected as figure,
  input,
} from '../../support/finite-elements';

const tubeOf = (of: FiniteElementCase) => ({
  bore: input(of, 'ri'),
  wall: input(of, 's'),
  modulus: CASE_MODULUS,
  poisson: CASE_POISSON,
  fromEnd: input(of, 'x_from_end'),
});

describe('a tube on a shaft against finite elements', () => {
  it.each(casesOf('annular'))('$id: force and peak strain within 5 %', (of) => {
    const growth = input(of, 'y_radial');
    const force = tubeRadialForce(tubeOf(of), growth);
    const push = force * wedgeFactor(input(of, 'mu'), input(of, 'lead_deg'));
    const strain = tubePeakStrain(tubeOf(of), growth);
    expect(Math.abs(errorPercent(force, figure(of, 'radial_force')))).toBeLessThan(5);
    expect(Math.abs(errorPercent(push, figure(of, 'push_force')))).toBeLessThan(5);
    expect(Math.abs(errorPercent(strain, figure(of, 'peak_strain')))).toBeLessThan(5);
  });
});

describe('an open ring against finite elements', () => {
  it.each(casesOf('c_clip'))('$id: force within 2 %, peak strain within 3 %', (of) => {
    const section = { radius: input(of, 'R'), thickness: input(of, 't'), width: input(of, 'b') };
    const beta = Math.PI - radians(input(of, 'opening_deg')) / 2;
    const force = openRingForce(section, beta, CASE_MODULUS, CASE_POISSON, 1);
    const strain = openRingPeakStrain(section, beta, CASE_MODULUS, force);
    expect(Math.abs(errorPercent(force, figure(of, 'force_per_mm')))).toBeLessThan(2);
    expect(Math.abs(errorPercent(strain, figure(of, 'strain_per_mm')))).toBeLessThan(3);
  });
});

describe('Snap-Fit Joints for Plastics - A Design Guide, annular snap', () => {
  it.each([
    [30, 0.15, 0.26],
    [40, 0.2, 0.34],
    [60, 0.3, 0.51],
    [80, 0.4, 0.68],
    [100, 0.5, 0.85],
  ])(
    'a bead on %s mm may stand %s mm at 1.0 %% and %s mm at 1.7 %% (technical note on printed lids)',
    (d, once, more) => {
      expect(Math.abs(beadHeight(0.01, d) - once)).toBeLessThan(0.0051);
      expect(Math.abs(beadHeight(0.017, d) - more)).toBeLessThan(0.0051);
    },
  );

  it('strains a 78 mm lid with a 0.4 mm bead by 1.0 % (technical note on printed lids)', () => {
    expect(Math.abs(hoopStrain(2 * 0.4, 78) - 0.01)).toBeLessThan(0.0003);
  });

  it('takes 338.4 N across and 512.6 N along for d 40, d0 44, y 0.4, Es 1700 (formula as quoted, number computed)', () => {
    const factor = tubeFactor(40, 44, 0.35);
    const force = annularForce(0.4, 40, 1700, factor);
    expect(factor).toBeCloseTo(0.012442, 6);
    expect(Math.abs(errorPercent(force, 338.4))).toBeLessThan(0.1);
    expect(Math.abs(errorPercent(force * wedgeFactor(0.5, 30), 512.6))).toBeLessThan(0.1);
  });

  it('has the factor 0.0017 for a 200 mm tube of 2.5 mm wall (chart value, from memory)', () => {
    expect(Math.abs(errorPercent(tubeFactor(200, 205, 0.35), 0.0017))).toBeLessThan(2);
  });

  it('lies 1.41 to 1.46 times below the edge-loaded thin shell (derived here)', () => {
    const shell = edgeLoadedShell(2, 20, 0.35);
    expect(shell).toBeCloseTo(0.617 * 0.1 ** 1.5, 4);
    const ratio = edgeLoadedShell(0.2, 20.1, 0.35) / tubeFactor(40, 40.4, 0.35);
    expect(ratio).toBeGreaterThan(1.4);
    expect(ratio).toBeLessThan(SHELL_BAND + 0.02);
  });

  it('counts a joint 16.1 mm from the end of a 40 mm tube of 2 mm wall as remote', () => {
    expect(Math.abs(errorPercent(remoteDistance(40, 2), 16.1))).toBeLessThan(0.5);
  });

  it.each([
    [0.25, 75.96],
    [0.35, 70.71],
    [0.5, 63.43],
    [0.6, 59.04],
  ])('locks itself at friction %s from %s degrees', (mu, angle) => {
    expect(Math.abs(selfLockingAngle(mu) - angle)).toBeLessThan(0.01);
  });
});

describe('thin rings and curved bars against textbooks', () => {
  it('shortens half the diameter of a pinched ring by 35.7 micrometres (Timoshenko & Young; Roark)', () => {
    const { along } = pinchedRing({ radius: 100, thickness: 5, width: 10 }, 200_000, 10);
    expect(Math.abs(errorPercent(-along / 2, 3.5707e-2))).toBeLessThan(0.1);
  });

  it('opens a slit ring by 0.1 in with 10.74 lbf and 14.3 ksi (inputs of Logan, A First Course in the Finite Element Method, P5-64)', () => {
    const thickness = Math.sqrt((12 * 4.5e-4) / 0.06);
    const section = { radius: 2, thickness, width: 0.06 / thickness };
    const force = (0.05 * 18e6 * 4.5e-4) / (2 ** 3 * openRingFactor(Math.PI));
    const stress = (2 * force * 2 * (thickness / 2)) / 4.5e-4;
    expect(Math.abs(errorPercent(force, 10.74))).toBeLessThan(0.5);
    expect(Math.abs(errorPercent(stress, 14_300))).toBeLessThan(0.5);
    expect(Math.abs(errorPercent(openRingThinStrain(section, Math.PI, 0.1) * 18e6, 14_300))).toBeLessThan(
      0.5,
    );
  });

  it('stresses the crane hook to 16.9 and -5.63 kpsi (Shigley, Mechanical Engineering Design, example 3-15)', () => {
    const hook = curvedBarStress({ radius: 4, thickness: 4, width: 0.75 }, 5000 * 4, 5000);
    expect(Math.abs(errorPercent(hook.neutral, 3.641))).toBeLessThan(0.3);
    expect(Math.abs(errorPercent(hook.inner, 16_900))).toBeLessThan(0.3);
    expect(Math.abs(errorPercent(hook.outer, -5630))).toBeLessThan(0.3);
  });

  it.each([
    [110, 1.6666],
    [120, 2.22032],
    [135, 3.10619],
    [150, 3.92201],
    [180, 1.5 * Math.PI],
  ])('has the open-ring factor at %s degrees (derived here, checked by quadrature)', (beta, factor) => {
    expect(Math.abs(openRingFactor(radians(beta)) - factor)).toBeLessThan(1e-5);
  });

  it('opens a 12 mm clip of 120 degrees on its rod with 11.96 N and 1.108 % (derived here)', () => {
    const section = { radius: 7, thickness: 2, width: 10 };
    const beta = radians(120);
    const opening = 12 - 12 * Math.sin(beta);
    const inertia = (10 * 2 ** 3) / 12;
    const force = ((opening / 2) * 1700 * inertia) / (7 ** 3 * openRingFactor(beta));
    expect(Math.abs(errorPercent(opening, 1.608))).toBeLessThan(0.1);
    expect(Math.abs(errorPercent(force, 11.96))).toBeLessThan(0.1);
    expect(Math.abs(errorPercent(openRingThinStrain(section, beta, opening), 0.01108))).toBeLessThan(0.1);
    const bent = curvedBarStress(section, force * 7 * 1.5, 0).inner / 1700;
    expect(Math.abs(errorPercent(bent, 0.01224))).toBeLessThan(0.1);
    expect(Math.abs(openRingPeakStrain(section, beta, 1700, force) - bent - 0.00035)).toBeLessThan(1e-5);
  });
});
