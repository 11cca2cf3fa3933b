import type { AllowableStrain } from '@/lib/materials/allowable';
import type { Material } from '@/lib/materials/types';
import type { ScrewMechanics } from '@/lib/mechanics/screw-closure';
import type { ScrewSizes } from '@/lib/mechanics/screw-sizes';

/** What a family calls the two halves. */
export interface ScrewWords {
  readonly neck: string;
  readonly cap: string;
}

/** The ring on which a seal beds, radii in mm, and how it is told. */
export interface Seat {
  readonly inner: number;
  readonly outer: number;
  /** what lies there, after "Beds the ..." */
  readonly of: string;
  readonly advice: string;
  /** pressure that beds it, MPa; 0 for what gives way by itself */
  readonly pressure: number;
}

/** What the figures of one screwed closure are made from. */
export interface ScrewContext {
  readonly p: ScrewSizes;
  /** height of a printed layer, mm */
  readonly layerHeight: number;
  readonly words: ScrewWords;
  /** null where nothing has to be bedded */
  readonly seat: Seat | null;
  readonly material: Material;
  readonly allowable: AllowableStrain;
  readonly mechanics: ScrewMechanics;
}

/** Why a figure that rests on a strength is not known. */
export function strengthMissing({ material, allowable }: ScrewContext): string {
  const heat = allowable.factors.find(({ id }) => id === 'temperature')!;
  if (heat.value === null) return `Not known: ${heat.note ?? heat.label}.`;
  const gap = material.gaps?.tensileStrength;
  return `Not known: no strength of ${material.shortName} was found${gap ? ` (${gap})` : ''}.`;
}

export const MODULUS_MISSING = 'Not known: the modulus is not known.';
