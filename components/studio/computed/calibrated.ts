import type { Family } from '@/generators/contract';
import { type Figure, judge, type Report, report } from '@/generators/report';
import type { Subject } from '@/generators/sensitivity';
import type { Standing } from './standing';

/** What was computed against what the formula says of one figure. */
interface Measure {
  readonly ratio: number;
  readonly limit: number | null;
}

/** A limit moved to the safe side, but not past the figure as it stands. */
function inside({ value, limit, limitKind, verdict }: Figure, share: number): number | null {
  if (limit === null || value === null) return limit;
  const aim = limitKind === 'max' ? limit * (1 - share) : limit / (1 - share);
  if (verdict === 'over-limit') return aim;
  return limitKind === 'max' ? Math.max(aim, value) : Math.min(aim, value);
}

function measuresOf({ report: shown, formula }: Standing, spare: number): ReadonlyMap<string, Measure> {
  const measures = new Map<string, Measure>();
  shown.figures.forEach((figure, at) => {
    const own = formula.figures[at]!;
    if (figure === own || !figure.value || !own.value) return;
    measures.set(figure.id, { ratio: figure.value / own.value, limit: inside(figure, spare) });
  });
  return measures;
}

function measured(figure: Figure, { ratio, limit }: Measure): Figure {
  if (figure.value === null) return figure;
  const value = figure.value * ratio;
  const verdict = figure.verdict && judge(value, limit, figure.limitKind);
  return { ...figure, value, limit, verdict };
}

function calibratedCheck(check: Family['check'], measures: ReadonlyMap<string, Measure>): Family['check'] {
  return (...given): Report => {
    const was = check(...given);
    const figures = was.figures.map((figure) => {
      const measure = measures.get(figure.id);
      return measure ? measured(figure, measure) : figure;
    });
    return report({ ...was, figures });
  };
}

/**
 * The part with its formulas drawn to what was computed for it, to try small changes without solving each. Exact for
 * the part as it stands; as far off elsewhere as the ratio of computed to formula changes on the way, for which
 * `spare`, a share of the limit, is kept.
 */
export function calibrated(subject: Subject, standing: Standing, spare = 0): Subject {
  if (standing.basis.kind !== 'computed') return subject;
  const { family } = subject;
  const check = calibratedCheck(family.check, measuresOf(standing, spare));
  return { ...subject, family: { ...family, check } };
}
