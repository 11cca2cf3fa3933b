'use client';

import { type ComponentProps, type ReactNode, useId } from 'react';
import { classNames } from '@/components/ui/class-names';
import { useForm } from './action-form';
import { FieldError } from './field-error';

export const fieldClass =
  'w-full rounded-field border border-edge bg-sheet px-3 hover:border-ink aria-invalid:border-2 aria-invalid:border-over aria-invalid:bg-over-soft pointer-coarse:text-base';

/** A labelled line of text. What was typed comes back when the form did not go through. */
export function TextField({
  name,
  label,
  hint,
  className,
  ...rest
}: Omit<ComponentProps<'input'>, 'name' | 'id'> & { name: string; label: string; hint?: ReactNode }) {
  const id = useId();
  const { state } = useForm();
  const error = state.errors[name];
  const kept = state.values[name];
  const about = [hint && `${id}-hint`, error && `${id}-error`].filter(Boolean).join(' ');
  return (
    <div className={classNames('grid gap-1.5', className)}>
      <label htmlFor={id} className="font-semibold">
        {label}
      </label>
      {hint && (
        <p id={`${id}-hint`} className="text-muted text-sm">
          {hint}
        </p>
      )}
      <input
        type="text"
        {...rest}
        id={id}
        name={name}
        defaultValue={typeof kept === 'string' ? kept : rest.defaultValue}
        aria-invalid={error ? true : undefined}
        aria-describedby={about || undefined}
        className={classNames(fieldClass, 'h-11')}
      />
      <FieldError id={`${id}-error`}>{error}</FieldError>
    </div>
  );
}

export const NewPasswordField = ({ name = 'password', label = 'New password' }) => (
  <TextField
    name={name}
    label={label}
    type="password"
    hint="At least 12 characters; a few unrelated words make a good one."
    autoComplete="new-password"
    maxLength={200}
  />
);
