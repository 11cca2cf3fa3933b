import 'server-only';
import { z } from 'zod';
import { FAMILIES, familyEntry } from '@/generators';
import type { About, Family } from '@/generators/contract';
import { type Field, parseParameters } from '@/generators/parameters';
import { type FieldIssue, InvalidInput, NotFound } from '@/lib/errors';
import type { LayerDirection, Use } from '@/lib/materials/types';

export interface FamilyDescription extends About {
  /** JSON Schema of the parameters: title, unit, bounds, step, group and default of each */
  readonly parameters: Readonly<Record<string, unknown>>;
  readonly groups: readonly { readonly id: string; readonly label: string }[];
  /** rules between parameters; the text is written for the defaults */
  readonly relations: readonly {
    readonly id: string;
    readonly field: string;
    readonly severity: 'refuse' | 'warn';
    readonly text: string;
  }[];
  readonly presets: readonly {
    readonly id: string;
    readonly name: string;
    readonly purpose: string;
    readonly material: string;
    readonly use: Use;
    readonly values: Readonly<Record<string, unknown>>;
  }[];
  /** ways to lay the default part on the bed, best first */
  readonly stances: readonly {
    readonly id: string;
    readonly label: string;
    readonly because: string;
    readonly layers: LayerDirection;
  }[];
}

export async function loadFamily(id: string): Promise<Family> {
  const entry = familyEntry(id);
  if (!entry) throw new NotFound(`The part family "${id}"`);
  return entry.load();
}

export const parameterJsonSchema = (family: Family): Readonly<Record<string, unknown>> =>
  z.toJSONSchema(family.parameters.schema, { io: 'input' });

function descriptionOf(family: Family): FamilyDescription {
  const { about, parameters, presets } = family;
  return {
    ...about,
    parameters: parameterJsonSchema(family),
    groups: Object.entries(parameters.groups).map(([id, label]) => ({ id, label })),
    relations: parameters.relations.map(({ id, field, severity, message }) => ({
      id,
      field,
      severity,
      text: message(parameters.defaults),
    })),
    presets: presets.map(({ id, name, purpose, material, use, values }) => ({
      id,
      name,
      purpose,
      material,
      use,
      values,
    })),
    stances: family
      .stances(parameters.defaults)
      .map(({ id, label, because, layers }) => ({ id, label, because, layers })),
  };
}

const described = new Map<string, FamilyDescription>();

/** Families never change while the server runs, so each is described once. */
export async function describeFamily(id: string): Promise<FamilyDescription> {
  const description = described.get(id) ?? descriptionOf(await loadFamily(id));
  described.set(id, description);
  return description;
}

export const describeFamilies = (): Promise<FamilyDescription[]> =>
  Promise.all(FAMILIES.map(({ about }) => describeFamily(about.id)));

/** The bounds of a number next to what is wrong with it, for input that is not even a number. */
function withBounds(
  issue: FieldIssue,
  field: Field | undefined,
): FieldIssue & { min?: number; max?: number } {
  return field?.type === 'number' ? { ...issue, unit: field.unit, min: field.min, max: field.max } : issue;
}

/** What is wrong with the parameters, with the bounds of each number. */
export const boundedIssues = (family: Family, issues: readonly FieldIssue[]): FieldIssue[] =>
  issues.map((issue) => withBounds(issue, family.parameters.fields[issue.field]));

/** Parameters of a family from unknown input; left out ones take the default. */
export function readParameters(family: Family, input: unknown): Record<string, unknown> {
  const parsed = parseParameters(family.parameters, input);
  if (parsed.ok) return parsed.values;
  throw new InvalidInput(boundedIssues(family, parsed.issues));
}
