import type { Field, Fields } from '@/generators/parameters';
import { entryText, USE_FIELDS } from '@/generators/url-state';
import type { Use } from '@/lib/materials/types';
import { UNIT_SYMBOL } from '@/lib/units';

export interface Compared {
  readonly parameters: Readonly<Record<string, unknown>>;
  readonly material: string;
  readonly use: Use;
}

export interface Change {
  readonly label: string;
  readonly before: string;
  readonly after: string;
}

function shown(field: Field, value: unknown): string {
  if (field.type === 'choice')
    return field.options.find((one) => one.value === value)?.label ?? String(value);
  if (field.type === 'toggle') return value ? 'yes' : 'no';
  const unit = UNIT_SYMBOL[field.unit];
  return `${entryText(field, Number(value))}${unit ? ` ${unit}` : ''}`;
}

/** What differs between two states of a part, in the words of its fields. */
export function changesBetween(
  fields: Fields,
  before: Compared,
  after: Compared,
  nameOf: (material: string) => string,
): Change[] {
  const material =
    before.material === after.material
      ? []
      : [{ label: 'Plastic', before: nameOf(before.material), after: nameOf(after.material) }];
  const all: Fields = { ...USE_FIELDS, ...fields };
  const was: Readonly<Record<string, unknown>> = { ...before.use, ...before.parameters };
  const is: Readonly<Record<string, unknown>> = { ...after.use, ...after.parameters };
  const values = Object.entries(all).flatMap(([key, field]) => {
    const [from, to] = [was[key] ?? field.default, is[key] ?? field.default];
    return from === to ? [] : [{ label: field.label, before: shown(field, from), after: shown(field, to) }];
  });
  return [...material, ...values];
}
