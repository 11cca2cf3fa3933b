import type { NumberField } from '@/generators/parameters';
import { decimalsOf, entryText } from '@/generators/url-state';
import { parseQuantity } from '@/lib/units/quantity';

/** The text of a number field after some steps, within its range; from the last valid value where it is not a number. */
export function stepEntry(field: NumberField, text: string, valid: number, steps: number): string {
  const value = (parseQuantity(text, field.unit) ?? valid) + steps * field.step;
  const rounded = Number((Math.round(value / field.step) * field.step).toFixed(decimalsOf(field.step)));
  return entryText(field, Math.min(field.max, Math.max(field.min, rounded)));
}

/** The text as the field writes it ("1,5 mm" as "1.5"); what is not a number stays as it was typed. */
export function tidyEntry(field: NumberField, text: string): string {
  const value = parseQuantity(text, field.unit);
  return value === null ? text : entryText(field, value);
}
