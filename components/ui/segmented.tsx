'use client';

import { type ReactNode, useId } from 'react';
import { classNames } from './class-names';

export interface Segment<V extends string> {
  readonly value: V;
  readonly label: string;
  readonly show?: ReactNode;
}

/** One of a few, side by side: a radio group. */
export function Segmented<V extends string>({
  legend,
  value,
  options,
  onChange,
  className,
}: {
  legend: string;
  value: V;
  options: readonly Segment<V>[];
  onChange: (value: V) => void;
  className?: string;
}) {
  const name = useId();
  return (
    <fieldset
      className={classNames('inline-flex rounded-field border border-edge bg-sheet p-0.5', className)}
    >
      <legend className="sr-only">{legend}</legend>
      {options.map((option) => (
        <label
          key={option.value}
          className="relative grid min-h-7 min-w-8 cursor-pointer place-items-center rounded-[2px] px-2 text-muted text-sm hover:text-ink has-checked:bg-ink has-checked:text-paper has-focus-visible:outline-3 has-focus-visible:outline-petrol has-focus-visible:outline-offset-2 pointer-coarse:min-h-10 pointer-coarse:min-w-10"
        >
          <input
            type="radio"
            name={name}
            value={option.value}
            checked={option.value === value}
            onChange={() => onChange(option.value)}
            className="absolute inset-0 cursor-pointer appearance-none opacity-0"
          />
          {option.show ? (
            <>
              <span className="sr-only">{option.label}</span>
              <span aria-hidden="true">{option.show}</span>
            </>
          ) : (
            option.label
          )}
        </label>
      ))}
    </fieldset>
  );
}
