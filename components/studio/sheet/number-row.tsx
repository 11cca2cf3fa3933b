'use client';

import type { ReactNode } from 'react';
import { NumberField } from '@/components/ui/number-field';
import type { NumberField as NumberSpec } from '@/generators/parameters';
import { formatQuantity, UNIT_SYMBOL } from '@/lib/units';
import { useEntry, useIssue, useSession } from '../session-context';
import { stepEntry, tidyEntry } from '../step-entry';
import { describedBy, FieldRow, fieldId, type RowLayout } from './field-row';

const rangeOf = ({ min, max, unit }: NumberSpec): string => `${min} to ${formatQuantity(max, unit, 6)}`;

export function NumberRow({
  name,
  field,
  valid,
  effect,
  layout,
}: {
  name: string;
  field: NumberSpec;
  /** value of the part that is shown */
  valid: number;
  effect?: ReactNode;
  layout?: RowLayout;
}) {
  const session = useSession();
  const text = useEntry(name);
  const issue = useIssue(name);
  const tidy = () => {
    const better = tidyEntry(field, text);
    if (better !== text) session.type(name, better);
    session.seal();
  };
  return (
    <FieldRow
      name={name}
      label={field.label}
      layout={layout}
      effect={effect}
      help={
        <>
          <p>{field.help}</p>
          <p className="mt-1 text-muted">From {rangeOf(field)}.</p>
        </>
      }
      error={
        issue && (
          <>
            {issue.message}. Range {rangeOf(field)}; the part shown still has{' '}
            {formatQuantity(valid, field.unit, 6)}.
          </>
        )
      }
      control={
        <NumberField
          id={fieldId(name)}
          text={text}
          now={valid}
          min={field.min}
          max={field.max}
          unit={UNIT_SYMBOL[field.unit]}
          aria-invalid={issue ? true : undefined}
          aria-describedby={describedBy(name, Boolean(issue))}
          onText={(next) => session.type(name, next)}
          onSteps={(steps) => session.type(name, stepEntry(field, text, valid, steps))}
          onBlur={tidy}
          onKeyDown={(event) => event.key === 'Enter' && tidy()}
        />
      }
    />
  );
}
