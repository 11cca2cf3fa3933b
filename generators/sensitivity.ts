import type { Material, Use } from '@/lib/materials/types';
import type { Family } from './contract';
import { fieldApplies, type NumberField, type ParameterValue, parseParameters } from './parameters';
import type { Figure, Report } from './report';
import { decimalsOf } from './url-state';

/** A part as it stands: family, parameters, plastic, use. */
export interface Subject {
  readonly family: Family;
  readonly values: Readonly<Record<string, ParameterValue>>;
  readonly material: Material;
  readonly use: Use;
}

/** What a small change of one dimension does. */
export interface Effect {
  readonly field: string;
  /** change tried, signed, in the unit of the field */
  readonly step: number;
  /** change of the governing figure in its own unit; null where it is not known */
  readonly change: number | null;
  /** ids of the other headline figures that move */
  readonly moves: readonly string[];
}

/** Changes smaller than this share of the figure are none. */
const NEGLIGIBLE = 1e-6;

export const figureOf = (report: Report, id: string): Figure | undefined =>
  report.figures.find((figure) => figure.id === id);

/** The values with one of them changed, parsed; null where the family refuses them. */
export function changed(subject: Subject, key: string, value: number): Subject | null {
  const parsed = parseParameters(subject.family.parameters, { ...subject.values, [key]: value });
  return parsed.ok ? { ...subject, values: parsed.values } : null;
}

export const checkOf = ({ family, values, material, use }: Subject): Report =>
  family.check(values, material, use);

/** A round step of about a twentieth of the value: 1, 2 or 5 times a power of ten, no finer than the field's step. */
export function trialStep(field: NumberField, value: number): number {
  const rough = Math.max(Math.abs(value) / 20, field.step);
  const power = 10 ** Math.floor(Math.log10(rough));
  const nice = [1, 2, 5, 10].map((n) => n * power).find((n) => n >= rough * 0.99) ?? power * 10;
  const steps = Math.max(1, Math.round(nice / field.step));
  return Number((steps * field.step).toFixed(decimalsOf(field.step)));
}

const moved = (before: number | null, after: number | null): boolean =>
  before !== null &&
  after !== null &&
  Math.abs(after - before) > NEGLIGIBLE * Math.max(Math.abs(before), 1e-9);

function compare(before: Report, after: Report, field: string, step: number): Effect {
  const from = figureOf(before, before.governing)?.value ?? null;
  const to = figureOf(after, before.governing)?.value ?? null;
  const change = from === null || to === null ? null : moved(from, to) ? to - from : 0;
  const moves = before.headline
    .filter((id) => id !== before.governing)
    .filter((id) => moved(figureOf(before, id)?.value ?? null, figureOf(after, id)?.value ?? null));
  return { field, step, change, moves };
}

/**
 * Effect of one number on the governing figure, by checking the part again with that number a step larger, or a
 * step smaller where larger is not possible. Null for fields that are not numbers or do not apply.
 */
export function effectOf(subject: Subject, key: string, before: Report = checkOf(subject)): Effect | null {
  const { parameters } = subject.family;
  const field = parameters.fields[key];
  const value = subject.values[key];
  if (field?.type !== 'number' || typeof value !== 'number') return null;
  if (!fieldApplies(parameters, key, subject.values)) return null;
  const size = trialStep(field, value);
  for (const step of [size, -size]) {
    const after = changed(subject, key, value + step);
    if (after) return compare(before, checkOf(after), key, step);
  }
  return null;
}

/** Keys of the numbers that take part, in the order of the sheet. */
export function numbersOf({ family, values }: Subject): string[] {
  const { fields } = family.parameters;
  return Object.keys(fields).filter(
    (key) => fields[key]!.type === 'number' && fieldApplies(family.parameters, key, values),
  );
}
