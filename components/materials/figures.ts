import { gapReason, type QuantityKey } from '@/lib/materials/properties';
import type { Material, Quantity } from '@/lib/materials/types';
import { formatQuantity, significant } from '@/lib/units';

/** Enough to show a data sheet's figure as it is printed. */
const DIGITS = 4;

type Write = (value: number) => string;

const perKelvin: Write = (value) => `${significant(value * 1e6)} × 10⁻⁶ per K`;
const percent: Write = (value) => formatQuantity(value, 'strain', DIGITS);

const writerOf = (key: QuantityKey, { unit }: Quantity): Write => {
  if (unit === '1/K') return perKelvin;
  return key === 'shrinkage' ? percent : (value) => formatQuantity(value, unit, DIGITS);
};

export interface Written {
  readonly value: string;
  /** "1.7 % to 2 %", or nothing where no range is known */
  readonly range: string | null;
}

/** A figure of a plastic in words; null where it is not known. */
export function written(key: QuantityKey, quantity: Quantity | null | undefined): Written | null {
  if (!quantity) return null;
  const write = writerOf(key, quantity);
  const { value, low, high } = quantity;
  const range =
    low === undefined && high === undefined ? null : `${write(low ?? value)} to ${write(high ?? value)}`;
  return { value: write(value), range };
}

/** Why a figure is missing, as a sentence that follows "not known". */
export const whyMissing = (material: Material, key: QuantityKey): string => gapReason(material, key);
