import { describe, expect, it } from 'vitest';
import { MATERIALS, materialById } from '@/lib/materials/data';
import { gapReason, PROPERTY_GROUPS } from '@/lib/materials/properties';
import { materialSchema } from '@/lib/materials/schema';
import type { Source } from '@/lib/materials/types';

const PRINTED = ['pla', 'petg', 'tpu-95a', 'pp', 'abs', 'asa', 'pa-dry', 'pa-conditioned', 'pc'];
const UNITS: Readonly<Record<string, string>> = {
  flexuralModulus: 'MPa',
  tensileModulus: 'MPa',
  tensileModulusAcross: 'MPa',
  tensileStrength: 'MPa',
  tensileStrengthAcross: 'MPa',
  density: 'g/cm3',
  heatDeflection: 'degC',
  glassTransition: 'degC',
  continuousService: 'degC',
  thermalExpansion: '1/K',
  shrinkage: 'ratio',
  poisson: 'ratio',
  friction: 'ratio',
};
const properties = PROPERTY_GROUPS.flatMap((group) => group.properties);

function sourcesIn(value: unknown): Source[] {
  if (value === null || typeof value !== 'object') return [];
  if ('mark' in value && 'text' in value) return [value as Source];
  return Object.values(value).flatMap(sourcesIn);
}

describe('the plastics', () => {
  it('are the printed ones first, then the moulded set, each id once', () => {
    const ids = MATERIALS.map((material) => material.id);
    expect(ids.slice(0, PRINTED.length)).toEqual(PRINTED);
    expect(new Set(ids).size).toBe(ids.length);
    for (const { id, process } of MATERIALS) {
      expect(process, id).toBe(PRINTED.includes(id) ? 'printed' : 'moulded');
    }
  });

  it('are found by id, and only by id', () => {
    expect(materialById('petg')?.shortName).toBe('PETG');
    expect(materialById('PETG')).toBeUndefined();
  });

  it.each(MATERIALS.map((material) => [material.id, material] as const))('%s is sound', (_id, material) => {
    expect(materialSchema.parse(material)).toEqual(material);
    for (const { key } of properties) {
      const quantity = material[key];
      if (!quantity) {
        expect(gapReason(material, key).length).toBeGreaterThan(10);
        continue;
      }
      expect(quantity.unit, key).toBe(UNITS[key] ?? 'strain');
      expect(quantity.low ?? quantity.value, key).toBeLessThanOrEqual(quantity.value);
      expect(quantity.high ?? quantity.value, key).toBeGreaterThanOrEqual(quantity.value);
      if (key !== 'glassTransition') expect(quantity.value, key).toBeGreaterThan(0);
    }
  });

  it.each(MATERIALS.map((material) => [material.id, material] as const))(
    '%s names a source in full for everything',
    (_id, material) => {
      const sources = sourcesIn(material);
      expect(sources.length).toBeGreaterThan(5);
      for (const source of sources) {
        expect(source.text.length).toBeGreaterThan(5);
        expect(source.text).not.toMatch(/\bS\d+[a-f]?\b/);
      }
    },
  );

  it('allow less when opened often than once, less still across layers, and no more than the yield strain', () => {
    for (const material of MATERIALS) {
      const once = material.allowableOnce!.value;
      expect(material.allowableOften!.value, material.id).toBeLessThan(once);
      if (material.yieldStrain) expect(once, material.id).toBeLessThan(material.yieldStrain.value);
      if (material.process === 'printed') {
        expect(material.allowableAcross!.value, material.id).toBeLessThan(once);
      }
    }
  });

  it('never rely on more than 1.5 % across layers, elastomers apart', () => {
    for (const material of MATERIALS.filter((one) => one.allowableAcross && one.id !== 'tpu-95a')) {
      expect(material.allowableAcross!.value, material.id).toBeLessThanOrEqual(0.015);
    }
  });

  it('give every printed plastic a friction band of a factor two or an elastomer band, and a dated price', () => {
    for (const material of MATERIALS.filter((one) => one.process === 'printed')) {
      const { low, high } = material.friction;
      expect(high / low, material.id).toBeGreaterThanOrEqual(1.5);
      expect(material.price?.asOf, material.id).toMatch(/^\d{4}-\d{2}-\d{2}$/);
      expect(material.price?.source.mark).toBe('common-practice');
    }
  });

  it('flag the secant model as an assumption for everything but polycarbonate', () => {
    const trusted = MATERIALS.filter((material) => !material.secant.assumed).map(({ id }) => id);
    expect(trusted).toEqual(['pc', 'pc-moulded']);
  });
});
