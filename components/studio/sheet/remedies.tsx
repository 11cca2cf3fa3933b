'use client';

import { useCallback, useMemo } from 'react';
import { Button } from '@/components/ui/button';
import { classNames } from '@/components/ui/class-names';
import { Sheet } from '@/components/ui/sheet';
import type { NumberField } from '@/generators/parameters';
import { byEase, ease, type Remedy, remedyOf } from '@/generators/remedies';
import type { Figure } from '@/generators/report';
import { figureOf, numbersOf } from '@/generators/sensitivity';
import { entryText } from '@/generators/url-state';
import { formatQuantity, UNIT_SYMBOL } from '@/lib/units';
import { useCalibrated, useStanding } from '../computed/standing-context';
import { useSession } from '../session-context';
import { useIdleMap } from '../use-idle-map';

const MOST = 6;

/** Kept of a computed limit: the ratio of computed to formula moves by 1 to 4 % over such changes. */
const SPARE = 0.04;

/** Room so far off that it is another design is not told. */
const FAR = 1;

interface Found {
  readonly list: readonly Remedy[];
  readonly current: boolean;
}

/** Null until there are some of this kind; `current` is false while those of the part as it stands are worked out. */
function useRemedies(over: boolean): Found | null {
  const subject = useCalibrated(SPARE);
  const keys = useMemo(() => numbersOf(subject), [subject]);
  const make = useCallback((key: string) => ({ over, remedy: remedyOf(subject, key) }), [subject, over]);
  const answers = useIdleMap(keys, make);
  const all = [...(answers?.found.values() ?? [])];
  if (!answers || all.some((one) => one.over !== over)) return null;
  const list = all
    .flatMap(({ remedy }) => remedy ?? [])
    .filter((remedy) => over || ease(remedy) <= FAR)
    .sort(byEase);
  return { list: list.slice(0, MOST), current: answers.current };
}

/** "Wall left, at least 0.8 mm" */
export function limitWords({ label, limit, limitKind, unit }: Figure): string {
  return limit === null
    ? label
    : `${label}, ${limitKind === 'max' ? 'at most' : 'at least'} ${formatQuantity(limit, unit)}`;
}

function RemedyLine({ remedy }: { remedy: Remedy }) {
  const session = useSession();
  const field = session.family.parameters.fields[remedy.field] as NumberField;
  const unit = UNIT_SYMBOL[field.unit];
  const text = entryText(field, remedy.to);
  const apply = () => {
    session.seal();
    session.type(remedy.field, text);
    session.seal();
  };
  return (
    <li className="flex min-h-10 items-center gap-3">
      <span className="flex-1 leading-tight">
        {field.label} {remedy.to > remedy.from ? 'up' : 'down'} to{' '}
        <b className="whitespace-nowrap font-mono">
          {text} {unit}
        </b>
        {remedy.stoppedBy && (
          <span className="block text-muted text-xs">stopped by {limitWords(remedy.stoppedBy)}</span>
        )}
      </span>
      <span className="font-mono text-muted text-xs">
        {formatQuantity(remedy.figure.value, remedy.figure.unit)}
      </span>
      <Button small onClick={apply} aria-label={`Use ${field.label} ${text} ${unit}`}>
        Use
      </Button>
    </li>
  );
}

function RemedyList({ list, over }: { list: readonly Remedy[]; over: boolean }) {
  if (list.length === 0) {
    return (
      <p className="text-muted text-sm">
        {over
          ? 'No single dimension within its range brings it under the limit. Try another plastic, or change two together.'
          : 'No single dimension near its present value reaches the limit.'}
      </p>
    );
  }
  return (
    <ul className="grid gap-x-10 xl:grid-cols-2">
      {list.map((remedy) => (
        <RemedyLine key={remedy.field} remedy={remedy} />
      ))}
    </ul>
  );
}

/** Dimensions that would just meet the limit, each alone, to apply with one press. */
export function Remedies() {
  const { report, basis } = useStanding();
  const computed = basis.kind !== 'formula';
  const verdict = figureOf(report, report.governing)?.verdict;
  const over = verdict === 'over-limit';
  const found = useRemedies(over);
  if (!verdict || verdict === 'not-known') return null;
  return (
    <Sheet labelledBy="remedies" className="px-4 py-3 sm:px-5">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h2 id="remedies" className="font-bold text-petrol">
          {over ? 'To make it gentler' : 'Room before the limit'}
        </h2>
        <span className="text-muted text-xs">
          {over ? 'each alone would just meet the limit' : 'each alone, as far as the limits allow'}
          {computed && ', by the formula drawn to the computed figure'}
        </span>
      </div>
      <div
        className={classNames('mt-1 min-h-20 transition-opacity', !found?.current && 'opacity-50 delay-150')}
      >
        {found && <RemedyList list={found.list} over={over} />}
      </div>
    </Sheet>
  );
}
