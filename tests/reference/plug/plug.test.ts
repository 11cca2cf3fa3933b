import { describe, expect, it } from 'vitest';
import {
  bandReach,
  dimpleStrain,
  ribForceHigh,
  ribForceLow,
  squeezeCompliance,
  squeezePressure,
  squeezeStrain,
} from '@/lib/mechanics/plug';
import { decayLength } from '@/lib/mechanics/ring';
import { plugStrain } from '@/lib/mechanics/seal';

const plug = { outer: 12, inner: 10, interference: 0.12, modulus: 1000, poisson: 0.4 };

describe('Timoshenko, Strength of Materials II, thick cylinders under outer pressure (from memory)', () => {
  it('squeezes a solid disc alike everywhere: p = E i / (a (1 - nu))', () => {
    const solid = { ...plug, inner: 0 };
    expect(squeezePressure(solid)).toBeCloseTo((1000 * 0.01) / 0.6, 9);
    expect(squeezeStrain(solid)).toBeCloseTo(0.01, 12);
  });

  it('takes 1.943 MPa to close a ring of radii 10 and 12 mm by 1 % (worked by hand)', () => {
    // W = (144 + 100) / (144 - 100) = 5.54545, less 0.4 is 5.14545; 10 MPa over it is 1.94346
    expect(squeezeCompliance(12, 10, 0.4)).toBeCloseTo(5.145454545, 8);
    expect(squeezePressure(plug)).toBeCloseTo(1.943463, 5);
    // 2 * 144 / 44 * p / E = 6.545455 * 0.001943463
    expect(squeezeStrain(plug)).toBeCloseTo(0.01272085, 7);
  });

  it('becomes the thin ring p = E s i / R^2 where the wall is thin', () => {
    const thin = { ...plug, outer: 100.05, inner: 99.95 };
    const ring = (1000 * 0.1 * 0.12) / 100 ** 2;
    expect(squeezePressure(thin) / ring).toBeCloseTo(1, 2);
    expect(squeezeStrain(thin)).toBeCloseTo(0.0012, 5);
  });

  it('agrees with the press fit of two rings where the neck does not give (DuPont module I, Lame)', () => {
    const fit = { bore: 24, neckOuter: 1e9, plugInner: 20, interference: 0.24, poisson: 0.4 };
    const pair = plugStrain(fit);
    const share = -pair.plug / (pair.neck - pair.plug);
    expect(squeezePressure({ ...plug, interference: 0.12 * share }) / 1000).toBeCloseTo(
      pair.pressureShare,
      9,
    );
  });
});

describe('bounds of the radial force', () => {
  it('meet for a solid disc touched over its whole depth', () => {
    const solid = { ...plug, inner: 0 };
    const volume = Math.PI * 12 ** 2 * 5;
    expect(ribForceHigh(solid, volume)).toBeCloseTo(ribForceLow(solid, 5), 9);
  });

  it('stand apart in that order for a ring, by no more than 2 / (1 - nu) where the wall is thin', () => {
    const thin = { ...plug, outer: 100, inner: 99 };
    const volume = Math.PI * (100 ** 2 - 99 ** 2) * 5;
    const ratio = ribForceHigh(thin, volume) / ribForceLow(thin, 5);
    expect(ratio).toBeGreaterThan(1);
    expect(ratio).toBeLessThan((2 / 0.6) * 1.02);
  });
});

describe('Hetenyi, Beams on Elastic Foundation (from memory)', () => {
  it('reaches as far as the tube that was held against finite elements', () => {
    const tube = { bore: 20, wall: 2, modulus: 1000, poisson: 0.35, fromEnd: 0 };
    expect(bandReach(22, 20, 0.35)).toBeCloseTo(decayLength(tube), 9);
  });
});

describe('Timoshenko, Theory of Elastic Stability (from memory)', () => {
  it('dimples a long ring at p = E s^3 / (4 (1 - nu^2) R^3)', () => {
    const [wall, radius, poisson] = [1, 25, 0.3];
    const pressure = wall ** 3 / (4 * (1 - poisson ** 2) * radius ** 3);
    expect(dimpleStrain(wall, radius, poisson)).toBeCloseTo((pressure * radius) / wall, 12);
    expect(dimpleStrain(wall, radius, poisson)).toBeCloseTo(0.00043956, 7);
  });
});
