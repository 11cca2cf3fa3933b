'use client';

import { type ComponentProps, type ReactNode, useId } from 'react';
import { classNames } from '@/components/ui/class-names';
import { useForm } from './action-form';
import { FieldError } from './field-error';
import { fieldClass } from './text-field';

/** A labelled text of several lines. What was typed comes back when the form did not go through. */
export function TextArea({
  name,
  label,
  hint,
  ...rest
}: Omit<ComponentProps<'textarea'>, 'name' | 'id'> & { name: string; label: string; hint?: ReactNode }) {
  const id = useId();
  const { state } = useForm();
  const error = state.errors[name];
  const kept = state.values[name];
  const about = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ');
  return (
    <div className="grid gap-1.5">
      <label htmlFor={id} className="font-semibold">
        {label}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="text-muted text-sm">
          {hint}
        </p>
      )}
      <textarea
        rows={4}
        {...rest}
        id={id}
        name={name}
        defaultValue={typeof kept === 'string' ? kept : rest.defaultValue}
        aria-invalid={error ? true : undefined}
        aria-describedby={about || undefined}
        className={classNames(fieldClass, 'py-2')}
      />
      <FieldError id={`${id}-error`}>{error}</FieldError>
    </div>
  );
}
