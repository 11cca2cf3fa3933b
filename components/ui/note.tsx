'use client';

import { type ComponentProps, type ReactNode, useId } from 'react';
import { classNames } from './class-names';

/** A button and the note it opens. The browser closes the note on Escape and on a press elsewhere. */
export function Note({
  trigger,
  children,
  noteId,
  beside = false,
  className,
  ...button
}: Omit<ComponentProps<'button'>, 'popoverTarget'> & {
  trigger: ReactNode;
  children: ReactNode;
  noteId?: string;
  /** to the left of its button rather than under it, where there is room */
  beside?: boolean;
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
        className={classNames('note p-4 text-left font-normal text-sm', beside && 'note-beside')}
        style={{ positionAnchor: anchor } as object}
      >
        {children}
      </div>
    </>
  );
}

export function closeNote(element: Element): void {
  element.closest<HTMLElement>('[popover]')?.hidePopover?.();
}
