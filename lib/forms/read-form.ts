import { z } from 'zod';
import type { FormState } from './state';

const MOST_FIELDS = 200;
const MOST_CHARACTERS = 20_000;

type Values = FormState['values'];

const isList = (type: unknown): boolean =>
  type instanceof z.ZodArray || (type instanceof z.ZodDefault && isList(type.unwrap()));

const textOf = (value: FormDataEntryValue): string => (typeof value === 'string' ? value : '');

/** The fields of a schema as they were sent; nothing else is looked at. */
export function valuesOf(schema: z.ZodObject, data: FormData): Values {
  const values: Record<string, string | string[]> = {};
  for (const [name, type] of Object.entries(schema.shape)) {
    const value = data.get(name);
    if (isList(type)) values[name] = data.getAll(name).map(textOf);
    else if (value !== null) values[name] = textOf(value);
  }
  return values;
}

/** Too many fields or characters to be a form of this site. */
export function isOversize(data: FormData): boolean {
  let fields = 0;
  let characters = 0;
  for (const [, value] of data) {
    fields += 1;
    if (typeof value === 'string') characters += value.length;
  }
  return fields > MOST_FIELDS || characters > MOST_CHARACTERS;
}

export function withoutSecrets(values: Values, secrets: readonly string[]): Values {
  return Object.fromEntries(Object.entries(values).filter(([name]) => !secrets.includes(name)));
}

/** The first fault of each field. */
export function errorsOf(
  issues: readonly { readonly path: readonly PropertyKey[]; readonly message: string }[],
) {
  const errors: Record<string, string> = {};
  for (const { path, message } of issues) errors[String(path[0] ?? 'form')] ??= message;
  return errors;
}
