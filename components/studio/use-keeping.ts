'use client';

import { useEffect } from 'react';
import { writeLink } from '@/generators/url-state';
import { keepWork, startOf } from './autosave';
import type { Session } from './session';
import { throttle } from './throttle';

const ADDRESS_EVERY = 400;
const SAVE_EVERY = 800;
const UNDO_PAUSE = 900;

/** True where the address as it is would bring back what stands in the fields. */
function isInAddress({ family, typed }: Session): boolean {
  const { entries } = startOf(family, window.location.search.slice(1)).typed;
  const shown = typed.getState().entries;
  return Object.keys(shown).every((key) => shown[key] === entries[key]);
}

/** Keeps the design in the address, so that a reload or a copied link brings it back; no new history entries. */
export function keepAddress(session: Session) {
  const { family, reading } = session;
  const path = window.location.pathname;
  const address = throttle(() => {
    if (window.location.pathname !== path) return;
    const query = `?${writeLink(family, reading.getState().design)}`;
    if (query !== window.location.search) window.history.replaceState(null, '', `${path}${query}`);
  }, ADDRESS_EVERY);
  const stop = reading.subscribe((now, was) => {
    if (now.design !== was.design) address.call();
  });
  if (!isInAddress(session)) address.call();
  return () => {
    stop();
    address.cancel();
  };
}

/** Keeps what is typed in this browser. Written only after an edit, and never read while the page is open. */
function keepTyped({ family, typed }: Session) {
  const save = throttle(() => keepWork(family, typed.getState(), localStorage), SAVE_EVERY);
  const stop = typed.subscribe(save.call);
  window.addEventListener('pagehide', save.flush);
  return () => {
    stop();
    window.removeEventListener('pagehide', save.flush);
    save.flush();
    save.cancel();
  };
}

/** A pause in typing ends the run of edits that undo takes back as one. */
function sealOnPause({ typed, seal }: Session) {
  let timer: ReturnType<typeof setTimeout> | undefined;
  const stop = typed.subscribe(() => {
    clearTimeout(timer);
    timer = setTimeout(seal, UNDO_PAUSE);
  });
  return () => {
    stop();
    clearTimeout(timer);
  };
}

/** `local`: in the address and in this browser. */
export function useKeeping(session: Session, local: boolean): void {
  useEffect(() => {
    const kept = local ? [keepAddress(session), keepTyped(session)] : [];
    const stops = [...kept, sealOnPause(session)];
    return () => {
      for (const stop of stops) stop();
    };
  }, [session, local]);
}
