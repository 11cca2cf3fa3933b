'use client';

import type { KeyboardEvent, ReactNode } from 'react';
import { Note } from '@/components/ui/note';
import { useSession } from '../session-context';
import { VerdictIcon } from '../verdict';

export const fieldId = (key: string): string => `field-${key}`;
const helpId = (key: string): string => `help-${key}`;
const errorId = (key: string): string => `error-${key}`;

/** "?" is no part of a number or a choice, so it asks for the field's help. */
function askHelp(event: KeyboardEvent, key: string): void {
  if (event.key !== '?') return;
  event.preventDefault();
  document.getElementById(helpId(key))?.showPopover?.();
}

export const describedBy = (key: string, faulty: boolean): string =>
  faulty ? `${errorId(key)} ${helpId(key)}` : helpId(key);

/** One line of the sheet: name and help, the control, what a change does, and a fault beneath. */
export function FieldRow({
  name,
  label,
  help,
  control,
  effect,
  wide,
  error,
}: {
  name: string;
  label: string;
  help: ReactNode;
  control: ReactNode;
  effect?: ReactNode;
  wide?: boolean;
  error?: ReactNode;
}) {
  const { focused } = useSession();
  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: listens to the control inside, which has the role
    <div
      className="border-transparent border-l-4 py-1 pr-4 pl-3 focus-within:border-marker focus-within:bg-tint sm:pr-5 sm:pl-4"
      onFocus={() => focused.setState({ field: name })}
      onBlur={() => focused.setState({ field: null })}
      onKeyDown={(event) => askHelp(event, name)}
    >
      <div
        className={
          wide
            ? 'grid grid-cols-[1fr_12.5rem] items-center gap-3'
            : 'grid grid-cols-[1fr_7.25rem_4.25rem] items-center gap-2.5 sm:grid-cols-[1fr_7.25rem_5.5rem] sm:gap-3'
        }
      >
        <div className="flex items-center gap-1 leading-tight">
          <label htmlFor={fieldId(name)}>{label}</label>
          <Note
            noteId={helpId(name)}
            aria-label={`About ${label}`}
            className="grid size-6 shrink-0 place-items-center rounded-full text-edge text-sm hover:bg-petrol-soft hover:text-ink"
            trigger="?"
          >
            {help}
          </Note>
        </div>
        {control}
        {effect}
      </div>
      {error && (
        <p id={errorId(name)} className="mt-1 flex items-start gap-1.5 text-over text-sm">
          <VerdictIcon verdict="over-limit" size={18} />
          <span>{error}</span>
        </p>
      )}
    </div>
  );
}
