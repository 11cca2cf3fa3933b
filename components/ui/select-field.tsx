'use client';

import { ChevronDown } from 'lucide-react';
import type { ComponentProps } from 'react';
import { classNames } from './class-names';

export interface Option {
  readonly value: string;
  readonly label: string;
}

export interface OptionGroup {
  readonly label: string;
  readonly options: readonly Option[];
}

const isGroup = (one: Option | OptionGroup): one is OptionGroup => 'options' in one;

export function SelectField({
  options,
  className,
  ...rest
}: Omit<ComponentProps<'select'>, 'children'> & { options: readonly (Option | OptionGroup)[] }) {
  return (
    <span className={classNames('relative block', className)}>
      <select
        {...rest}
        className="h-10 w-full appearance-none truncate rounded-field border border-edge bg-sheet pr-8 pl-2.5 aria-invalid:border-over pointer-coarse:h-11"
      >
        {options.map((one) =>
          isGroup(one) ? (
            <optgroup key={one.label} label={one.label}>
              {one.options.map((option) => (
                <option key={option.value} value={option.value}>
                  {option.label}
                </option>
              ))}
            </optgroup>
          ) : (
            <option key={one.value} value={one.value}>
              {one.label}
            </option>
          ),
        )}
      </select>
      <ChevronDown
        aria-hidden="true"
        size={16}
        className="pointer-events-none absolute top-1/2 right-2.5 -translate-y-1/2 text-muted"
      />
    </span>
  );
}
