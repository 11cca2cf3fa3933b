import type { FieldIssue } from '@/lib/errors';
import { DEFAULT_USE, type Use } from '@/lib/materials/types';
import { parseQuantity } from '@/lib/units/quantity';
import type { Family, Preset } from './contract';
import {
  choice,
  type Field,
  type Fields,
  number,
  type ParameterValue,
  type Parsed,
  parseParameters,
} from './parameters';

/** Everything the check needs besides the family: parameters, plastic, use. */
export interface Design {
  readonly values: Readonly<Record<string, ParameterValue>>;
  readonly material: string;
  readonly use: Use;
}

/** A design as it is typed: one text per field. Toggles are "true" or "false". */
export type Entries = Readonly<Record<string, string>>;

/** How a part is used, as fields beside the parameters. */
export const USE_FIELDS = {
  opening: choice({
    label: 'Opened',
    group: 'use',
    help: 'How often the part is bent in its life. Repeated bending allows less strain.',
    options: [
      { value: 'once', label: 'once' },
      { value: 'sometimes', label: 'sometimes' },
      { value: 'often', label: 'often' },
    ],
    default: DEFAULT_USE.opening,
  }),
  layers: choice({
    label: 'Printed layers',
    group: 'use',
    help: 'How the layers run against the strain. Strain across them pulls the layers apart and allows far less.',
    options: [
      { value: 'along', label: 'along the strain' },
      { value: 'across', label: 'across the strain' },
    ],
    default: DEFAULT_USE.layers,
  }),
  temperature: number({
    label: 'Temperature',
    group: 'use',
    unit: 'degC',
    help: 'The warmest the part gets while it is bent or held bent.',
    min: -40,
    max: 150,
    step: 1,
    default: DEFAULT_USE.temperature,
  }),
} satisfies Fields;

/** Words of a link that are not parameters; no family may name a parameter so. */
export const LINK_WORDS: readonly string[] = ['material', ...Object.keys(USE_FIELDS)];

/** Longest link that is read, in characters. */
export const LINK_LIMIT = 2000;

const MATERIAL_ID = /^[a-z0-9][a-z0-9-]{0,59}$/;

export function presetDesign(family: Family, preset: Preset<unknown> = family.presets[0]!): Design {
  const values = { ...family.parameters.defaults, ...(preset.values as object) };
  return { values, material: preset.material, use: preset.use };
}

export const decimalsOf = (step: number): number => {
  const [, decimals = ''] = String(step).split('.');
  return decimals.length;
};

/** A number as a link writes it: no exponent, exact to a millionth. */
const linkNumber = (value: number): string => String(Number(value.toFixed(6)) || 0);

/** A value as its field shows it: lengths of step 0.1 as "18.0"; finer values keep their digits. */
export function entryText(field: Field, value: ParameterValue): string {
  if (typeof value !== 'number' || field.type !== 'number') return String(value);
  const padded = value.toFixed(decimalsOf(field.step));
  return Number(padded) === value ? padded : linkNumber(value);
}

const allFields = (family: Family): Fields => ({ ...family.parameters.fields, ...USE_FIELDS });

export function designEntries(family: Family, design: Design): Entries {
  const given: Record<string, ParameterValue> = { ...design.values, ...design.use };
  const entries = Object.entries(allFields(family)).map(([key, field]) => [
    key,
    entryText(field, given[key] ?? field.default),
  ]);
  return { material: design.material, ...Object.fromEntries(entries) };
}

function typedValue(field: Field | undefined, text: string): ParameterValue {
  if (field?.type === 'number') return parseQuantity(text, field.unit) ?? text;
  if (field?.type === 'toggle' && (text === 'true' || text === 'false')) return text === 'true';
  return text;
}

function readUse(entries: Entries): { use: Use; issues: FieldIssue[] } {
  const { opening, layers, temperature } = USE_FIELDS;
  const issues: FieldIssue[] = [];
  for (const [key, field] of Object.entries({ opening, layers })) {
    const words = field.options.map((option) => option.value);
    if (!words.some((word) => word === entries[key])) {
      issues.push({ field: key, message: `${field.label} must be one of ${words.join(', ')}` });
    }
  }
  const degrees = parseQuantity(entries.temperature ?? '', temperature.unit);
  if (degrees === null || degrees < temperature.min || degrees > temperature.max) {
    const message = `Temperature must be a number from ${temperature.min} to ${temperature.max} °C`;
    const bound =
      degrees === null ? undefined : degrees < temperature.min ? temperature.min : temperature.max;
    issues.push({ field: 'temperature', message, unit: 'degC', ...(bound !== undefined && { bound }) });
  }
  return { use: { ...entries, temperature: degrees } as unknown as Use, issues };
}

/** Reads what is typed; lists every field at fault. Missing entries take the family's default. */
export function readEntries(family: Family, entries: Entries): Parsed<Design> {
  const complete = { ...emptyEntries(family), ...entries };
  const parameters = Object.entries(complete).filter(([key]) => !LINK_WORDS.includes(key));
  const typed = parameters.map(([key, text]) => [key, typedValue(family.parameters.fields[key], text)]);
  const parsed = parseParameters(family.parameters, Object.fromEntries(typed));
  const { use, issues } = readUse(complete);
  const { material } = complete;
  if (!MATERIAL_ID.test(material!)) {
    issues.push({ field: 'material', message: 'Material must be the id of a material' });
  }
  if (!parsed.ok) return { ok: false, issues: [...parsed.issues, ...issues] };
  if (issues.length > 0) return { ok: false, issues };
  const { opening, layers, temperature } = use;
  const values = parsed.values as Design['values'];
  return { ok: true, values: { values, material: material!, use: { opening, layers, temperature } } };
}

/** The family's defaults in its first preset's plastic: what a link means where it says nothing. */
const emptyDesign = (family: Family): Design => ({
  values: family.parameters.defaults,
  material: family.presets[0]!.material,
  use: DEFAULT_USE,
});

const emptyEntries = (family: Family): Entries => designEntries(family, emptyDesign(family));

/**
 * A design as the query of a link, without "?": the plastic always, the rest where it differs from the defaults,
 * numbers with up to six decimals.
 */
export function writeLink(family: Family, design: Design): string {
  const query = new Map([['material', design.material]]);
  const given: Record<string, ParameterValue> = { ...design.use, ...design.values };
  for (const [key, field] of Object.entries({ ...USE_FIELDS, ...family.parameters.fields } as Fields)) {
    const value = given[key];
    if (value === undefined || value === field.default) continue;
    query.set(key, typeof value === 'number' ? linkNumber(value) : String(value));
  }
  return [...query].map(([key, value]) => `${key}=${encodeURIComponent(value)}`).join('&');
}

function pairsOf(query: string): readonly (readonly [string, string])[] {
  return query
    .replace(/^\?/, '')
    .split('&')
    .filter((pair) => pair !== '')
    .map((pair) => {
      const at = pair.indexOf('=');
      return at < 0 ? [pair, ''] : [plain(pair.slice(0, at)), plain(pair.slice(at + 1))];
    });
}

function plain(text: string): string {
  try {
    return decodeURIComponent(text.replaceAll('+', ' '));
  } catch {
    return text;
  }
}

/** A link too long is read up to its last whole word; gives what is read and what is not. */
function parted(query: string): readonly [string, string] {
  if (query.length <= LINK_LIMIT) return [query, ''];
  const end = query.lastIndexOf('&', LINK_LIMIT) + 1;
  return [query.slice(0, end), query.slice(end)];
}

/** What a link sets, and the names in it that could not be used. */
export interface LinkEntries {
  readonly entries: Entries;
  /** words this family does not know */
  readonly unknown: readonly string[];
  /** known words given more than once; the last one counts */
  readonly repeated: readonly string[];
  /** words past the longest link that is read */
  readonly unread: readonly string[];
}

const unique = (words: readonly string[]): string[] => [...new Set(words)];

/** The words that stand more than once in a list, each told once. */
export const repeatedIn = (words: readonly string[]): string[] =>
  unique(words.filter((word, at) => words.indexOf(word) < at));

/** Reads a link as far as it goes. A later word wins. */
export function linkEntries(family: Family, query: string): LinkEntries {
  const [read, left] = parted(query);
  const pairs = pairsOf(read);
  const isKnown = (key: string) => LINK_WORDS.includes(key) || Object.hasOwn(family.parameters.fields, key);
  const known = pairs.filter(([key]) => isKnown(key));
  const given = Object.fromEntries(known);
  return {
    entries: known.length === 0 ? given : { ...emptyEntries(family), ...given },
    unknown: unique(pairs.map(([key]) => key).filter((key) => !isKnown(key))),
    repeated: repeatedIn(known.map(([key]) => key)),
    unread: unique(pairsOf(left).map(([key]) => key)),
  };
}
