import type { Family } from '@/generators/contract';
import type { Field, ParameterValue } from '@/generators/parameters';
import { randomNumbers } from './random-shapes';

/** Share of the fields that keep their default, so that extremes meet ordinary companions. */
const KEPT = 0.35;

function draw(field: Field, next: () => number): ParameterValue {
  if (field.type === 'toggle') return next() < 0.5;
  if (field.type === 'choice') return field.options[Math.floor(next() * field.options.length)]!.value;
  if (next() < KEPT) return field.default;
  const near = field.default * Math.exp((next() - 0.5) * 1.6);
  const anywhere = field.min + (field.max - field.min) * next() ** 2;
  const value = Math.min(field.max, Math.max(field.min, next() < 0.6 ? near : anywhere));
  return field.whole ? Math.round(value) : value;
}

/** Valid parameters of a family in a fixed random order: half near the defaults, half anywhere in the bounds. */
export function* randomValues<P>(family: Family<P>, count: number, seed = 1): Generator<P> {
  const next = randomNumbers(seed);
  const { fields, relations } = family.parameters;
  const refusals = relations.filter(({ severity }) => severity === 'refuse');
  for (let made = 0; made < count; ) {
    const entries = Object.entries(fields).map(([key, field]) => [key, draw(field as Field, next)]);
    const values = Object.fromEntries(entries) as P;
    if (!refusals.every(({ holds }) => holds(values))) continue;
    made++;
    yield values;
  }
}
