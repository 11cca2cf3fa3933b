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
import { selfLockingAngle, wedgeFactor } from '@/lib/mechanics/friction';
import { pinchedRing, tubePeakStrain, tubeRadialForce } from '@/lib/mechanics/ring';
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

describe('a pinched thin ring', () => {
  it('shortens half the diameter of a pinched ring by 35.7 micrometres (Timoshenko & Young; Roark)', () => {
    const { along } = pinchedRing({ radius: 100, thickness: 5, width: 10 }, 200_000, 10);
    expect(Math.abs(errorPercent(-along / 2, 3.5707e-2))).toBeLessThan(0.1);
  });
});
