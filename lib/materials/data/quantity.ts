import type { Unit } from '@/lib/units';
import type { Band, FoldClass, Judgement, Price, Quantity, Range, Rating, Source } from '../types';
import { FOLDING_STUDY, PRACTICE } from './sources';

type Spread = readonly [low: number, high: number];

const of =
  (unit: Unit) =>
  (value: number, source: Source, spread?: Spread): Quantity => ({
    value,
    unit,
    ...(spread && { low: spread[0], high: spread[1] }),
    source,
  });

export const strain = of('strain');
export const modulus = of('MPa');
export const strength = of('MPa');
export const density = of('g/cm3');
export const temperature = of('degC');
export const expansion = of('1/K');
export const fraction = of('ratio');

/** The middle of a published band. */
export const middle = (
  make: (value: number, source: Source, spread?: Spread) => Quantity,
  [low, high]: Spread,
  source: Source,
): Quantity => make(Number(((low + high) / 2).toPrecision(6)), source, [low, high]);

export const friction = (low: number, value: number, high: number, source: Source): Band => ({
  value,
  low,
  high,
  unit: 'ratio',
  source,
});

export const range = (low: number, high: number, unit: Unit, source: Source): Range => ({
  low,
  high,
  unit,
  source,
});
export const celsius = (low: number, high: number, source: Source): Range => range(low, high, 'degC', source);
export const hours = (low: number, high: number, source: Source): Range => range(low, high, 'h', source);

export const rated = (rating: Rating, because: string, source: Source = PRACTICE): Judgement => ({
  rating,
  because,
  source,
});

export const folds = (
  foldClass: FoldClass,
  because: string,
  source: Source = FOLDING_STUDY,
): { class: FoldClass; because: string; source: Source } => ({ class: foldClass, because, source });

/** Street price of a 1 kg spool; the club keeps its own in the database. */
export const price = (perKg: number): Price => ({
  perKg,
  currency: 'EUR',
  asOf: '2026-06-01',
  source: { text: 'Usual price of a 1 kg spool', mark: 'common-practice' },
});
