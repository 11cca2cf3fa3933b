import { z } from 'zod';
import type { FieldIssue } from '@/lib/errors';
import { UNIT_SYMBOL, type Unit } from '@/lib/units';

// Without code made at run time, which the content security policy of the site forbids.
z.config({ jitless: true });

interface FieldBase {
  readonly label: string;
  readonly group: string;
  readonly help: string;
}

export interface NumberField extends FieldBase {
  readonly type: 'number';
  readonly unit: Unit;
  readonly min: number;
  readonly max: number;
  readonly step: number;
  readonly default: number;
  readonly whole: boolean;
}

export interface ChoiceField<V extends string = string> extends FieldBase {
  readonly type: 'choice';
  readonly options: readonly { readonly value: V; readonly label: string; readonly help?: string }[];
  readonly default: V;
}

export interface ToggleField extends FieldBase {
  readonly type: 'toggle';
  readonly default: boolean;
}

export type Field = NumberField | ChoiceField | ToggleField;
export type Fields = Readonly<Record<string, Field>>;
export type ParameterValue = number | string | boolean;

export type ValuesOf<F extends Fields> = {
  readonly [K in keyof F]: F[K] extends NumberField
    ? number
    : F[K] extends ChoiceField<infer V>
      ? V
      : F[K] extends ToggleField
        ? boolean
        : never;
};

/**
 * A rule between parameters. `refuse`: the shape is impossible, the input is not accepted. `warn`: it can be made
 * but is unwise; shown with the checks. `field` is where the message is shown.
 */
export interface Relation<P> {
  readonly id: string;
  readonly field: keyof P & string;
  readonly severity: 'refuse' | 'warn';
  readonly holds: (values: P) => boolean;
  /** names the fields, the bound as a number and the unit */
  readonly message: (values: P) => string;
}

export interface Parameters<P> {
  readonly fields: Readonly<Record<keyof P & string, Field>>;
  readonly groups: Readonly<Record<string, string>>;
  readonly relations: readonly Relation<P>[];
  /** a field is shown and used only where its rule holds; fields not named always are */
  readonly applies: Readonly<Partial<Record<keyof P & string, (values: P) => boolean>>>;
  readonly defaults: P;
  /** strict object: unknown keys refused, missing keys take the default, relations checked */
  readonly schema: z.ZodType<P>;
}

type NumberGiven = Omit<NumberField, 'type' | 'unit' | 'whole'>;

/** A length in mm. */
export const length = (given: NumberGiven): NumberField => ({
  type: 'number',
  unit: 'mm',
  whole: false,
  ...given,
});
/** An angle in degrees. */
export const angle = (given: NumberGiven): NumberField => ({
  type: 'number',
  unit: 'deg',
  whole: false,
  ...given,
});
/** A plain number with a unit of its own. */
export const number = (given: NumberGiven & { unit: Unit }): NumberField => ({
  type: 'number',
  whole: false,
  ...given,
});
/** A whole number of things. */
export const count = (given: Omit<NumberGiven, 'step'>): NumberField => ({
  type: 'number',
  unit: 'count',
  whole: true,
  step: 1,
  ...given,
});
export const choice = <const V extends string>(given: Omit<ChoiceField<V>, 'type'>): ChoiceField<V> => ({
  type: 'choice',
  ...given,
});
export const toggle = (given: Omit<ToggleField, 'type'>): ToggleField => ({ type: 'toggle', ...given });

function numberSchema(field: NumberField): z.ZodType<number> {
  const unit = UNIT_SYMBOL[field.unit];
  const bound = (word: string, value: number) =>
    `${field.label} must be ${word} ${value}${unit ? ` ${unit}` : ''}`;
  const base = field.whole
    ? z.int({ error: `${field.label} must be a whole number` })
    : z.number({ error: `${field.label} must be a number${unit ? ` in ${unit}` : ''}` });
  return base
    .min(field.min, { error: bound('at least', field.min) })
    .max(field.max, { error: bound('at most', field.max) });
}

function fieldSchema(field: Field): z.ZodType {
  const { label, group, help } = field;
  if (field.type === 'number') {
    const { unit, step } = field;
    return numberSchema(field)
      .default(field.default)
      .meta({ title: label, description: help, unit, step, group });
  }
  if (field.type === 'toggle') {
    return z
      .boolean({ error: `${label} must be true or false` })
      .default(field.default)
      .meta({ title: label, description: help, group });
  }
  const values = field.options.map((option) => option.value);
  return z
    .enum(values as [string, ...string[]], { error: `${label} must be one of ${values.join(', ')}` })
    .default(field.default)
    .meta({ title: label, description: help, group });
}

/** Joins fields, relations and groups to the parameters of a family. */
export function defineParameters<F extends Fields>(given: {
  fields: F;
  groups: Readonly<Record<string, string>>;
  relations?: readonly Relation<ValuesOf<F>>[];
  applies?: Readonly<Partial<Record<keyof F & string, (values: ValuesOf<F>) => boolean>>>;
}): Parameters<ValuesOf<F>> {
  type P = ValuesOf<F>;
  const relations = given.relations ?? [];
  const shape = Object.fromEntries(
    Object.entries(given.fields).map(([key, field]) => [key, fieldSchema(field)]),
  );
  const schema = z.strictObject(shape).superRefine((values, context) => {
    for (const relation of relations) {
      if (relation.severity === 'refuse' && !relation.holds(values as P)) {
        context.addIssue({ code: 'custom', path: [relation.field], message: relation.message(values as P) });
      }
    }
  });
  const defaults = Object.fromEntries(
    Object.entries(given.fields).map(([key, field]) => [key, field.default]),
  );
  return {
    fields: given.fields as Parameters<P>['fields'],
    groups: given.groups,
    relations,
    applies: (given.applies ?? {}) as Parameters<P>['applies'],
    defaults: defaults as P,
    schema: schema as unknown as z.ZodType<P>,
  };
}

export type Parsed<P> =
  | { readonly ok: true; readonly values: P }
  | { readonly ok: false; readonly issues: readonly FieldIssue[] };

function issueOf(fields: Fields, issue: z.core.$ZodIssue): FieldIssue[] {
  if (issue.code === 'unrecognized_keys') {
    return issue.keys.map((key) => ({ field: key, message: `${key} is not a parameter of this family` }));
  }
  const field = String(issue.path[0] ?? 'parameters');
  const about = fields[field];
  const unit = about?.type === 'number' ? about.unit : undefined;
  const bound =
    issue.code === 'too_big'
      ? Number(issue.maximum)
      : issue.code === 'too_small'
        ? Number(issue.minimum)
        : undefined;
  return [{ field, message: issue.message, ...(bound !== undefined && { bound }), ...(unit && { unit }) }];
}

/** Reads unknown input as the parameters of a family; lists every field at fault. */
export function parseParameters<P>(parameters: Parameters<P>, input: unknown): Parsed<P> {
  const result = parameters.schema.safeParse(input ?? {});
  if (result.success) return { ok: true, values: result.data };
  return { ok: false, issues: result.error.issues.flatMap((issue) => issueOf(parameters.fields, issue)) };
}

/** Relations that only warn and do not hold for these values. */
export function warnings<P>(
  parameters: Parameters<P>,
  values: P,
): readonly { id: string; field: string; message: string }[] {
  return parameters.relations
    .filter((relation) => relation.severity === 'warn' && !relation.holds(values))
    .map((relation) => ({ id: relation.id, field: relation.field, message: relation.message(values) }));
}

/** True where the field takes part in the shape or the check for these values. */
export function fieldApplies<P>(parameters: Parameters<P>, key: keyof P & string, values: P): boolean {
  return parameters.applies[key]?.(values) ?? true;
}
