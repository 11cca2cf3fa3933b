'use client';

import { type ComponentProps, type ReactNode, useId } from 'react';
import { classNames } from './class-names';

/** A button and the note it opens. The browser closes the note on Escape and on a press elsewhere. */
export function Note({
  trigger,
  children,
  noteId,
  beside,
  className,
  ...button
}: Omit<ComponentProps<'button'>, 'popoverTarget'> & {
  trigger: ReactNode;
  children: ReactNode;
  noteId?: string;
  /** anchor of a wider element the note stands to the left of, where there is room; else it stands under its button */
  beside?: string | undefined;
}) {
  const made = useId();
  const id = noteId ?? made;
  const anchor = `--${id.replaceAll(/\W/g, '-')}`;
  return (
    <>
      <button
        type="button"
        {...button}
        className={className}
        popoverTarget={id}
        style={{ anchorName: anchor } as object}
      >
        {trigger}
      </button>
      <div
        id={id}
        popover="auto"
        className={classNames(
          'note p-4 text-left font-normal text-sm',
          beside !== undefined && 'note-beside',
        )}
        style={{ positionAnchor: beside ?? anchor } as object}
      >
        {children}
      </div>
    </>
  );
}

export function closeNote(element: Element): void {
  element.closest<HTMLElement>('[popover]')?.hidePopover?.();
}
