'use client';

import type { KeyboardEvent, ReactNode } from 'react';
import { classNames } from '@/components/ui/class-names';
import { Note } from '@/components/ui/note';
import { useSession } from '../session-context';
import { VerdictIcon } from '../verdict';

export const fieldId = (key: string): string => `field-${key}`;
const rowAnchor = (key: string): string => `--row-${key}`;
const helpId = (key: string): string => `help-${key}`;
const errorId = (key: string): string => `error-${key}`;

/** With room for an effect, with a wide control instead, or the control under its name. */
export type RowLayout = 'line' | 'wide' | 'stack';

const ROW: Readonly<Record<RowLayout, string>> = {
  line: 'border-l-4 py-1 pr-4 pl-3 sm:pr-5 sm:pl-4',
  wide: 'border-l-4 py-1 pr-4 pl-3 sm:pr-5 sm:pl-4',
  stack: 'min-w-0 border-t-4 px-2 pt-0.5 pb-2',
};

const CELLS: Readonly<Record<RowLayout, string>> = {
  line: 'grid grid-cols-[1fr_7.25rem_4.25rem] items-center gap-2.5 sm:grid-cols-[1fr_7rem_6.25rem] sm:gap-2.5',
  wide: 'grid grid-cols-[1fr_12.5rem] items-center gap-3',
  stack: 'grid grid-cols-[minmax(0,1fr)] gap-0.5',
};

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
  layout = 'line',
  error,
}: {
  name: string;
  label: string;
  help: ReactNode;
  control: ReactNode;
  effect?: ReactNode;
  layout?: RowLayout;
  error?: ReactNode;
}) {
  const { focused } = useSession();
  return (
    // biome-ignore lint/a11y/noStaticElementInteractions: listens to the control inside, which has the role
    <div
      className={classNames(
        'border-transparent focus-within:border-marker focus-within:bg-tint',
        ROW[layout],
      )}
      style={{ anchorName: rowAnchor(name) } as object}
      onFocus={() => focused.setState({ field: name })}
      onBlur={() => focused.setState({ field: null })}
      onKeyDown={(event) => askHelp(event, name)}
    >
      <div className={CELLS[layout]}>
        <div
          className={classNames(
            'flex items-center gap-1 leading-tight',
            layout === 'stack' && 'text-muted text-sm',
          )}
        >
          <label htmlFor={fieldId(name)}>{label}</label>
          <Note
            noteId={helpId(name)}
            beside={layout === 'stack' ? undefined : rowAnchor(name)}
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
