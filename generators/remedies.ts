import { fieldApplies, type NumberField } from './parameters';
import type { Figure, Report } from './report';
import { changed, checkOf, figureOf, numbersOf, type Subject } from './sensitivity';
import { decimalsOf } from './url-state';

/** One dimension changed alone so that the governing figure just meets its limit. */
export interface Remedy {
  readonly field: string;
  readonly from: number;
  readonly to: number;
  /** the governing figure after the change */
  readonly figure: Figure;
  /** another figure that one more step would push over its limit, which is why it goes no further; else null */
  readonly stoppedBy: Figure | null;
}

/** `worse`: another figure is pushed over its limit. `refused`: the family does not take the value. */
type State = 'meets' | 'fails' | 'worse' | 'refused';

interface Trial {
  readonly value: number;
  readonly state: State;
  readonly figure: Figure | undefined;
  /** the first other figure pushed over its limit */
  readonly pushed: Figure | undefined;
}

/** Most grid steps a search goes to either side; past it the dimension is no longer the same design. */
const REACH = 1 << 14;

function stateOf(figure: Figure | undefined): State {
  if (!figure?.verdict || figure.verdict === 'not-known') return 'refused';
  return figure.verdict === 'over-limit' ? 'fails' : 'meets';
}

const overLimit = (report: Report): string[] =>
  report.figures.filter(({ verdict }) => verdict === 'over-limit').map(({ id }) => id);

function tryValue(subject: Subject, before: Report, key: string, value: number): Trial {
  const after = changed(subject, key, value);
  if (!after) return { value, state: 'refused', figure: undefined, pushed: undefined };
  const report = checkOf(after);
  const figure = figureOf(report, before.governing);
  const was = overLimit(before);
  const pushed = overLimit(report).find((id) => id !== before.governing && !was.includes(id));
  const state = pushed === undefined ? stateOf(figure) : 'worse';
  return { value, state, figure, pushed: pushed === undefined ? undefined : figureOf(report, pushed) };
}

interface Edge {
  /** last trial in the present state, where there is one besides the present value */
  readonly last?: Trial;
  /** first trial in another state; none where the range ends first */
  readonly next?: Trial;
}

/** Walks grid steps 1..reach with doubling stride until the state changes, then halves the last stride. */
function edge(trial: (offset: number) => Trial, reach: number, present: State): Edge {
  let near = 0;
  let far = 1;
  while (far <= reach && trial(far).state === present) {
    near = far;
    far = near === reach ? reach + 1 : Math.min(far * 2, reach);
  }
  while (far - near > 1) {
    const middle = Math.floor((near + far) / 2);
    if (trial(middle).state === present) near = middle;
    else far = middle;
  }
  return { ...(near > 0 && { last: trial(near) }), ...(far <= reach && { next: trial(far) }) };
}

/** Grid steps of a field from a value towards its bound, and the value at each. */
function grid({ step, min, max }: NumberField, value: number, direction: 1 | -1) {
  const slack = direction * 1e-9;
  const round = direction > 0 ? Math.floor : Math.ceil;
  const start = round(value / step + slack);
  const end = round((direction > 0 ? max : min) / step + slack);
  const at = (offset: number) => Number(((start + direction * offset) * step).toFixed(decimalsOf(step)));
  return { reach: Math.min(direction * (end - start), REACH), at };
}

interface Found {
  readonly trial: Trial;
  readonly stoppedBy: Figure | null;
}

function search(subject: Subject, before: Report, key: string, direction: 1 | -1): Found | undefined {
  const field = subject.family.parameters.fields[key] as NumberField;
  const { reach, at } = grid(field, subject.values[key] as number, direction);
  const present = stateOf(figureOf(before, before.governing));
  const { last, next } = edge((offset) => tryValue(subject, before, key, at(offset)), reach, present);
  if (present === 'fails') return next?.state === 'meets' ? { trial: next, stoppedBy: null } : undefined;
  if (!last || (next?.state !== 'fails' && next?.state !== 'worse')) return undefined;
  const alsoOver = stateOf(next.figure) === 'fails';
  return { trial: last, stoppedBy: alsoOver ? null : (next.pushed ?? null) };
}

/**
 * The value of one dimension at which the governing figure just meets its limit, all else as it is: the nearest such
 * value when the figure is over; when there is room, the last one before it or another figure fails. On the field's
 * step, on the safe side, inside range and relations, no other figure pushed over its limit. Null where there is none.
 */
export function remedyOf(subject: Subject, key: string, before: Report = checkOf(subject)): Remedy | null {
  if (!fieldApplies(subject.family.parameters, key, subject.values)) return null;
  const from = subject.values[key];
  if (typeof from !== 'number') return null;
  if (stateOf(figureOf(before, before.governing)) === 'refused') return null;
  const found = ([1, -1] as const)
    .flatMap((direction) => search(subject, before, key, direction) ?? [])
    .sort((a, b) => Math.abs(a.trial.value - from) - Math.abs(b.trial.value - from))[0];
  if (!found?.trial.figure) return null;
  const { value, figure } = found.trial;
  return { field: key, from, to: value, figure, stoppedBy: found.stoppedBy };
}

/** Smallest relative change first. */
export const byEase = (a: Remedy, b: Remedy): number => ease(a) - ease(b);

/** Change as a share of the present value. */
export const ease = ({ from, to }: Remedy): number => Math.abs(to - from) / Math.max(Math.abs(from), 1e-9);

/** Remedies over all dimensions that take part, the smallest relative change first. */
export function remedies(subject: Subject, before: Report = checkOf(subject)): Remedy[] {
  return numbersOf(subject)
    .flatMap((key) => remedyOf(subject, key, before) ?? [])
    .sort(byEase);
}
