'use client';

import type { ComponentProps, KeyboardEvent } from 'react';
import { classNames } from './class-names';

const STEPS: Readonly<Record<string, number>> = { ArrowUp: 1, ArrowDown: -1, PageUp: 10, PageDown: -10 };

/** Steps asked for by a key: arrows one, with Shift or by page ten; 0 for any other key. */
export function stepsOf(
  event: Pick<KeyboardEvent, 'key' | 'shiftKey' | 'altKey' | 'metaKey' | 'ctrlKey'>,
): number {
  if (event.altKey || event.metaKey || event.ctrlKey) return 0;
  const steps = STEPS[event.key] ?? 0;
  return event.shiftKey && Math.abs(steps) === 1 ? steps * 10 : steps;
}

/** A decimal typed as text, so that nothing typed is ever changed under the hand; steps by keys. */
export function NumberField({
  text,
  now,
  min,
  max,
  unit,
  onText,
  onSteps,
  onKeyDown,
  className,
  ...rest
}: Omit<ComponentProps<'input'>, 'type' | 'role' | 'value' | 'onChange' | 'min' | 'max'> & {
  text: string;
  /** last valid value, for readers of the screen */
  now: number;
  min: number;
  max: number;
  unit: string;
  onText: (text: string) => void;
  onSteps: (steps: number) => void;
}) {
  return (
    <span className={classNames('relative block', className)}>
      <input
        {...rest}
        type="text"
        inputMode="decimal"
        autoComplete="off"
        spellCheck={false}
        maxLength={24}
        role="spinbutton"
        aria-valuenow={now}
        aria-valuemin={min}
        aria-valuemax={max}
        aria-valuetext={unit && /^[\d\s.,+−-]*$/.test(text) ? `${text} ${unit}` : text}
        value={text}
        onChange={(event) => onText(event.target.value)}
        onKeyDown={(event) => {
          const steps = stepsOf(event);
          if (steps !== 0) {
            event.preventDefault();
            onSteps(steps);
          }
          onKeyDown?.(event);
        }}
        className={classNames(
          'h-10 w-full rounded-field border border-edge bg-sheet pl-2 text-right font-mono text-[0.95rem] tabular-nums hover:border-ink aria-invalid:border-2 aria-invalid:border-over aria-invalid:bg-over-soft pointer-coarse:h-11 pointer-coarse:text-base',
          unit.length > 2 ? 'pr-14' : unit ? 'pr-11' : 'pr-2.5',
        )}
      />
      <span
        aria-hidden="true"
        className="pointer-events-none absolute inset-y-0 right-2.5 grid place-items-center text-muted text-sm"
      >
        {unit}
      </span>
    </span>
  );
}
