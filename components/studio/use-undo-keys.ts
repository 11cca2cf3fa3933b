'use client';

import { useEffect } from 'react';
import type { Session } from './session';

type Stroke = Pick<KeyboardEvent, 'key' | 'ctrlKey' | 'metaKey' | 'shiftKey' | 'altKey'>;

/** Ctrl or Cmd with Z undoes, with Shift and Z, or with Y, redoes. */
export function undoStroke({ key, ctrlKey, metaKey, shiftKey, altKey }: Stroke): 'undo' | 'redo' | null {
  if (altKey || ctrlKey === metaKey) return null;
  const letter = key.toLowerCase();
  if (letter === 'z') return shiftKey ? 'redo' : 'undo';
  return letter === 'y' && !shiftKey ? 'redo' : null;
}

export function useUndoKeys(session: Session): void {
  useEffect(() => {
    const onKey = (event: KeyboardEvent) => {
      const stroke = undoStroke(event);
      if (!stroke) return;
      event.preventDefault();
      session[stroke]();
    };
    window.addEventListener('keydown', onKey);
    return () => window.removeEventListener('keydown', onKey);
  }, [session]);
}
