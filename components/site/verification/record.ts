import record from '@/public/verification/finite-elements.json';

export type Case = (typeof record.cases)[number];
export type Convergence = (typeof record.convergence)[number];

export const CASES: readonly Case[] = record.cases;
export const CONVERGENCE: readonly Convergence[] = record.convergence;

export type Quantity = 'force' | 'strain';

/** Differences to the references in percent, exceptions left out. */
export function differences(cases: readonly Case[], quantity: Quantity): readonly number[] {
  return cases.filter(({ exception }) => exception === null).flatMap((one) => one[quantity]?.percent ?? []);
}

export interface Spread {
  readonly count: number;
  /** half of the cases differ by no more, percent without sign */
  readonly median: number;
  readonly largest: number;
}

export function spreadOf(cases: readonly Case[], quantity: Quantity): Spread | null {
  const sizes = differences(cases, quantity)
    .map(Math.abs)
    .sort((a, b) => a - b);
  const largest = sizes.at(-1);
  if (largest === undefined) return null;
  return { count: sizes.length, median: sizes[Math.floor((sizes.length - 1) / 2)]!, largest };
}

/** Cases by what they are about, in the order of the record. */
export function groups(cases: readonly Case[] = CASES): readonly (readonly [string, readonly Case[]])[] {
  const names = [...new Set(cases.map(({ group }) => group))];
  return names.map((name) => [name, cases.filter(({ group }) => group === name)]);
}

/** "5 block L/h=7.5 R/h=0.3" without the number of its series. */
export const caseName = ({ id }: Pick<Case, 'id'>): string => id.replace(/^\d+[ _]/, '').replaceAll('_', ' ');
