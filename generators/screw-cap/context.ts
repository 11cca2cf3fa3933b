import type { AllowableStrain } from '@/lib/materials/allowable';
import type { Material } from '@/lib/materials/types';
import type { CapMechanics } from './mechanics';
import type { Values } from './schema';

/** What the figures of one check are made from. */
export interface Context {
  readonly p: Values;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  readonly mechanics: CapMechanics;
}

/** Why a figure that rests on a strength is not known. */
export function strengthMissing({ material, allowable }: Context): string {
  const heat = allowable.factors.find(({ id }) => id === 'temperature')!;
  if (heat.value === null) return `Not known: ${heat.note ?? heat.label}.`;
  const gap = material.gaps?.tensileStrength;
  return `Not known: no strength of ${material.shortName} was found${gap ? ` (${gap})` : ''}.`;
}

export const MODULUS_MISSING = 'Not known: the modulus is not known.';
