'use client';

import type { ReactNode } from 'react';
import { SelectField } from '@/components/ui/select-field';
import { SwitchField } from '@/components/ui/switch-field';
import type { ChoiceField, ToggleField } from '@/generators/parameters';
import { useEntry, useIssue, useSession } from '../session-context';
import { describedBy, FieldRow, fieldId, type RowLayout } from './field-row';

function ChoiceHelp({ field, more }: { field: ChoiceField; more: ReactNode }) {
  const explained = field.options.filter((option) => option.help);
  return (
    <>
      <p>{field.help}</p>
      {explained.map((option) => (
        <p key={option.value} className="mt-2">
          <b>{option.label}</b>: {option.help}
        </p>
      ))}
      {more}
    </>
  );
}

export function ChoiceRow({
  name,
  field,
  layout = 'wide',
  more,
}: {
  name: string;
  field: ChoiceField;
  layout?: RowLayout;
  /** told after the help of the field */
  more?: ReactNode;
}) {
  const session = useSession();
  const value = useEntry(name);
  const issue = useIssue(name);
  const stray = field.options.some((option) => option.value === value) ? [] : [{ value, label: value }];
  return (
    <FieldRow
      name={name}
      label={field.label}
      layout={layout}
      help={<ChoiceHelp field={field} more={more} />}
      error={issue?.message}
      control={
        <SelectField
          id={fieldId(name)}
          value={value}
          options={[...stray, ...field.options]}
          aria-invalid={issue ? true : undefined}
          aria-describedby={describedBy(name, Boolean(issue))}
          onChange={(event) => {
            session.seal();
            session.type(name, event.target.value);
          }}
        />
      }
    />
  );
}

export function ToggleRow({ name, field }: { name: string; field: ToggleField }) {
  const session = useSession();
  const value = useEntry(name);
  const issue = useIssue(name);
  return (
    <FieldRow
      name={name}
      label={field.label}
      layout="wide"
      help={<p>{field.help}</p>}
      error={issue?.message}
      control={
        <SwitchField
          id={fieldId(name)}
          checked={value === 'true'}
          aria-describedby={describedBy(name, Boolean(issue))}
          onChange={(event) => {
            session.seal();
            session.type(name, String(event.target.checked));
          }}
        />
      }
    />
  );
}
