'use client';

import { useCallback, useMemo } from 'react';
import { Button } from '@/components/ui/button';
import { Sheet } from '@/components/ui/sheet';
import type { NumberField } from '@/generators/parameters';
import { byEase, ease, type Remedy, remedyOf } from '@/generators/remedies';
import { figureOf, numbersOf } from '@/generators/sensitivity';
import { entryText } from '@/generators/url-state';
import { formatQuantity, UNIT_SYMBOL } from '@/lib/units';
import { useReading, useSession, useSubject } from '../session-context';
import { useIdleMap } from '../use-idle-map';

const MOST = 6;

/** Room so far off that it is another design is not told. */
const FAR = 1;

/** Null until they are worked out for the first time. */
function useRemedies(over: boolean): readonly Remedy[] | null {
  const subject = useSubject();
  const keys = useMemo(() => numbersOf(subject), [subject]);
  const make = useCallback((key: string) => remedyOf(subject, key), [subject]);
  const found = useIdleMap(keys, make);
  return (
    found &&
    [...found.values()]
      .filter((one) => one !== null)
      .filter((one) => over || ease(one) <= FAR)
      .sort(byEase)
      .slice(0, MOST)
  );
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

/** Dimensions that would just meet the limit, each alone, to apply with one press. */
export function Remedies() {
  const report = useReading((reading) => reading.report);
  const verdict = figureOf(report, report.governing)?.verdict;
  const over = verdict === 'over-limit';
  const list = useRemedies(over);
  if (!list || !verdict || verdict === 'not-known') return null;
  return (
    <Sheet labelledBy="remedies" className="px-4 py-3 sm:px-5">
      <div className="flex flex-wrap items-baseline justify-between gap-x-4">
        <h2 id="remedies" className="font-bold text-petrol">
          {over ? 'To make it gentler' : 'Room before the limit'}
        </h2>
        <span className="text-muted text-xs">each alone would just meet the limit</span>
      </div>
      {list.length > 0 ? (
        <ul className="mt-1 grid gap-x-10 xl:grid-cols-2">
          {list.map((remedy) => (
            <RemedyLine key={remedy.field} remedy={remedy} />
          ))}
        </ul>
      ) : (
        <p className="mt-1 text-muted text-sm">
          {over
            ? 'No single dimension within its range brings it under the limit. Try another plastic, or change two together.'
            : 'No single dimension within its range reaches the limit.'}
        </p>
      )}
    </Sheet>
  );
}
