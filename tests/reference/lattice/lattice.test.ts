import { describe, expect, it } from 'vitest';
import { latticeFault, linkLength, pullGive, pullStrain, twistLink } from '@/lib/mechanics/lattice';
import { shearModulus } from '@/lib/mechanics/torsion';
import solved from './cells.json';

const shear = shearModulus(solved.modulus, solved.poisson);
const cells = solved.cells.map((cell) => [Object.values(cell).slice(0, 5).join(' x '), cell] as const);

const latticeOf = (cell: (typeof solved.cells)[number]) => ({
  ...cell,
  overlap: cell.pitch / 2 - cell.bridge,
});

describe('slit panels against solid finite elements', () => {
  it.each(cells)('are within the range of the fit: %s', (_, cell) => {
    expect(latticeFault(latticeOf(cell))).toBeNull();
  });

  it.each(cells)('need the moment of cell %s within two percent', (_, cell) => {
    const lattice = latticeOf(cell);
    const moment = shear * twistLink(lattice, solved.angle, linkLength(lattice)).torque;
    expect(Math.abs(moment / cell.moment - 1)).toBeLessThan(0.02);
  });

  it.each(cells)(
    'strain the link of cell %s between three percent more and nine percent less than told',
    (_, cell) => {
      const lattice = latticeOf(cell);
      const told = twistLink(lattice, solved.angle, linkLength(lattice)).shear;
      const computed = Math.max(cell.shear_face, cell.shear_side);
      expect(told / computed).toBeGreaterThan(0.97);
      expect(told / computed).toBeLessThan(1.09);
    },
  );

  it.each(cells)('had a mesh fine enough in cell %s: a coarser one hardly changes the moment', (_, cell) => {
    expect(Math.abs(cell.moment_coarse / cell.moment - 1)).toBeLessThan(0.005);
  });
});

describe('links', () => {
  // Torsion of prisms, tau = T/(alpha b t^2), theta/l = T/(beta G b t^3); table from memory.
  it.each([
    [1, 0.208, 0.141],
    [2, 0.246, 0.229],
    [4, 0.282, 0.281],
  ])('of sides %f to 1 follow the table of rectangular bars', (ratio, alpha, beta) => {
    const link = { width: 1, thickness: ratio, slit: 0.5, bridge: 2, overlap: 10 };
    const { torque, shear: strain } = twistLink(link, 0.1, 10);
    expect(torque / (0.01 * ratio)).toBeCloseTo(beta, 3);
    expect(torque / strain / ratio).toBeCloseTo(alpha, 3);
  });

  // Beam tables: both ends held and one pushed sideways, F = 12 E I v / L^3, end moment 6 E I v / L^2 (from memory).
  it('pulled sideways bend as beams held at both ends', () => {
    const link = { width: 1.5, thickness: 2, slit: 0.5, bridge: 3, overlap: 12 };
    const inertia = (2 * 1.5 ** 3) / 12;
    expect(1 / pullGive(link)).toBeCloseTo((12 * inertia) / 12 ** 3, 12);
    expect(pullStrain(link, 0.2)).toBeCloseTo((((6 * inertia * 0.2) / 144) * 0.75) / inertia, 12);
  });
});
