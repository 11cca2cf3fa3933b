import { describe, expect, it } from 'vitest';
import { allowableStrain } from '@/lib/materials/allowable';
import { materialById } from '@/lib/materials/data';
import { fatigueStress } from '@/lib/materials/fatigue';
import { layerStrengthRatio, shareLost } from '@/lib/materials/properties';
import { secantModulus } from '@/lib/materials/secant';
import type { Material } from '@/lib/materials/types';

const plastic = (id: string): Material => materialById(id)!;
const ROOM = { layers: 'along', temperature: 23 } as const;

describe('allowable strain of printed plastics (printed-part guide: a third of yield, 0.6 of it repeated)', () => {
  it.each([
    ['pla', 0.029, 0.01, 0.006],
    ['petg', 0.051, 0.017, 0.01],
    ['asa', 0.034, 0.011, 0.007],
  ])('gives the published values for %s', (id, yieldStrain, once, often) => {
    const material = plastic(id);
    expect(material.yieldStrain?.value).toBe(yieldStrain);
    expect(Math.abs(yieldStrain / 3 - once)).toBeLessThanOrEqual(0.0005);
    expect(Math.abs(0.6 * (yieldStrain / 3) - often)).toBeLessThanOrEqual(0.0005);
    expect(allowableStrain(material, { opening: 'once', ...ROOM }).value).toBeCloseTo(once, 10);
    expect(allowableStrain(material, { opening: 'often', ...ROOM }).value).toBeCloseTo(often, 10);
  });

  it('halves PLA across the layers, once and often (0.5 and 0.3 %)', () => {
    const across = { layers: 'across', temperature: 23 } as const;
    expect(allowableStrain(plastic('pla'), { opening: 'once', ...across }).value).toBeCloseTo(0.005, 10);
    expect(allowableStrain(plastic('pla'), { opening: 'often', ...across }).value).toBeCloseTo(0.003, 10);
  });
});

describe('fatigue of printed PLA (Ezeh & Susmel 2019)', () => {
  it('allows 13.70 MPa for 1e4 cycles at a tensile strength of 52.3 MPa', () => {
    expect(fatigueStress(plastic('pla').tensileStrength!.value, 1e4)).toBeCloseTo(13.7, 1);
  });

  it('allows 20.8 MPa at 1e3, 5.23 at 2e6 and 2.62 times as much at 1e4 as at 2e6', () => {
    expect(fatigueStress(52.3, 1e3)).toBeCloseTo(20.83, 2);
    expect(fatigueStress(52.3, 2e6)).toBeCloseTo(5.23, 6);
    expect(fatigueStress(52.3, 1e4)! / fatigueStress(52.3, 2e6)!).toBeCloseTo(2.6204, 3);
  });

  it('does not speak outside the tested lives', () => {
    expect(fatigueStress(52.3, 10)).toBeNull();
    expect(fatigueStress(52.3, 1e7)).toBeNull();
    expect(fatigueStress(52.3, Number.NaN)).toBeNull();
  });
});

describe('layers (filament makers data sheets)', () => {
  it.each([
    ['pla', 0.77],
    ['petg', 0.84],
    ['asa', 0.73],
    ['pc', 0.78],
    ['pa-dry', 0.59],
  ])('gives %s its share of strength across the layers', (id, share) => {
    expect(Math.abs(layerStrengthRatio(plastic(id))! - share)).toBeLessThanOrEqual(0.005);
  });

  it('loses 56 % of strength and 73 % of stiffness when nylon takes up water', () => {
    const [dry, wet] = [plastic('pa-dry'), plastic('pa-conditioned')];
    expect(shareLost(dry.tensileStrength!.value, wet.tensileStrength!.value)).toBeCloseTo(0.56, 2);
    expect(shareLost(dry.tensileModulus!.value, wet.tensileModulus!.value)).toBeCloseTo(0.73, 2);
  });
});

describe('secant modulus', () => {
  it('meets the 1815 MPa of the design guide for moulded PC at 2 % within 1 %', () => {
    const modulus = secantModulus(plastic('pc-moulded'), 0.02)!;
    expect(Math.abs(modulus.value / 1815 - 1)).toBeLessThan(0.01);
    expect(modulus.inRange).toBe(true);
  });

  it.each([
    [0.01, 0.88],
    [0.02, 0.76],
    [0.04, 0.52],
  ])('falls to the published share of the initial modulus at a strain of %f', (strain, share) => {
    const modulus = secantModulus(plastic('pc-moulded'), strain)!;
    expect(modulus.value / 2400).toBeCloseTo(share, 10);
  });

  it('meets the stress of 11.1 MPa at 100 % strain of the TPU data sheet', () => {
    expect(secantModulus(plastic('tpu-95a'), 1)!.value).toBeCloseTo(11.1, 6);
  });
});

describe('friction on itself (plastic on steel times the factor of the design guide)', () => {
  it.each([
    ['pp-moulded', 0.375, 0.45],
    ['pom-moulded', 0.3, 0.525],
    ['pa66-dry-moulded', 0.45, 0.6],
    ['pc-moulded', 0.54, 0.66],
    ['abs-moulded', 0.6, 0.78],
  ])('gives %s the published band', (id, low, high) => {
    expect(plastic(id).friction).toMatchObject({ low, high });
  });
});

describe('folding (Balderrama-Armendariz et al. 2019)', () => {
  it.each([
    ['tpu-95a', 'long-life'],
    ['pp', 'long-life'],
    ['pla', 'few'],
    ['petg', 'few'],
    ['pa-dry', 'few'],
    ['abs', 'unknown'],
  ])('puts %s in the class that the study found', (id, expected) => {
    expect(plastic(id).foldEndurance.class).toBe(expected);
  });
});

it('has 100e-6/K inside the range of PP, so that 100 mm grow 0.30 mm in 30 K', () => {
  const { low, high } = plastic('pp').thermalExpansion!;
  expect(100e-6).toBeGreaterThanOrEqual(low!);
  expect(100e-6).toBeLessThanOrEqual(high!);
  expect(100 * 100e-6 * 30).toBeCloseTo(0.3, 12);
});
