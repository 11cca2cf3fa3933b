import { describe, expect, it } from 'vitest';
import { openRing, ringShape, thinRing, thinRingFactor } from '@/lib/mechanics/open-ring';
import { CASE_MODULUS, CASE_POISSON, errorPercent } from '@/tests/support/finite-elements';
import clips from './clips.json';

const DEGREE = Math.PI / 180;

describe('open rings on a stem against plane-stress finite elements', () => {
  it.each(
    clips.map((solved) => [`bore ${solved.bore}, wall ${solved.wall}, stem ${solved.stem}`, solved] as const),
  )('gives force and bore tension within 5 %%: %s', (_, solved) => {
    const ring = {
      bore: 2 * solved.bore,
      wall: solved.wall,
      tipWall: solved.wall,
      halfArc: Math.PI - (solved.mouth / 2) * DEGREE,
      stemHalfWidth: solved.stem / 2,
    };
    const opened = openRing(ring, 0.5, { modulus: CASE_MODULUS, poisson: CASE_POISSON, width: 6 });
    expect(Math.abs(errorPercent(opened.force, solved.force))).toBeLessThan(5);
    expect(Math.abs(errorPercent(opened.strain, solved.strain))).toBeLessThan(5);
  });
});

describe('thin open ring', () => {
  // Castigliano, derived; checked by quadrature.
  it.each([
    [110, 1.6666],
    [120, 2.22032],
    [135, 3.10619],
    [150, 3.92201],
    [180, 4.71239],
  ])('has the factor f(%i degrees) = %f', (angle, factor) => {
    expect(thinRingFactor(angle * DEGREE)).toBeCloseTo(factor, 4);
  });

  it('gives the clip of 12 mm bore 11.96 N and 1.108 %', () => {
    const ring = { bore: 12, wall: 2, tipWall: 2, halfArc: 120 * DEGREE, stemHalfWidth: 0 };
    const spread = (12 - 12 * Math.sin(120 * DEGREE)) / 2;
    const thin = thinRing(ring, spread, { modulus: 1700, poisson: 0.35, width: 10 });
    expect(thin.force).toBeCloseTo(11.96, 2);
    expect(thin.strain).toBeCloseTo(0.01108, 5);
    // Winkler-Bach inner fibre 1.224 % and 0.035 points of axial tension, derived.
    const thick = openRing(ring, spread, { modulus: 1700, poisson: 0.35, width: 10 });
    expect(thick.strain).toBeCloseTo(0.01259, 4);
  });
});

describe('shape of the opened ring', () => {
  it('moves the lip by the spread it was solved for', () => {
    const shape = ringShape({ bore: 12, wall: 2, tipWall: 1.4, halfArc: 118 * DEGREE, stemHalfWidth: 3 });
    expect(shape.x.at(-1)).toBeCloseTo(1, 1);
    expect(Math.min(...shape.inner)).toBeGreaterThanOrEqual(-2e-4);
  });
});
