'use client';

import { useId } from 'react';
import { type Option, SelectField } from '@/components/ui/select-field';
import { useForm } from './action-form';
import { FieldError } from './field-error';

/** A labelled choice of one. What was chosen comes back when the form did not go through. */
export function ChooseField({
  name,
  label,
  options,
  first,
}: {
  name: string;
  label: string;
  options: readonly Option[];
  first?: string | undefined;
}) {
  const id = useId();
  const { state } = useForm();
  const error = state.errors[name];
  const kept = state.values[name];
  const chosen = typeof kept === 'string' ? kept : first;
  return (
    <div className="grid gap-1.5">
      <label htmlFor={id} className="font-semibold">
        {label}
      </label>
      <SelectField
        key={chosen}
        id={id}
        name={name}
        options={options}
        defaultValue={chosen}
        aria-invalid={error ? true : undefined}
        aria-describedby={error ? `${id}-error` : undefined}
      />
      <FieldError id={`${id}-error`}>{error}</FieldError>
    </div>
  );
}
