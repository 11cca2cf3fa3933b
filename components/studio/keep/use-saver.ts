'use client';

import { useEffect, useState } from 'react';
import { send } from '@/components/forms/send';
import { designEntries, type Design as Part } from '@/generators/url-state';
import type { Design } from '@/lib/access/designs';
import type { Session } from '../session';
import { throttle } from '../throttle';
import { createSaver, type Saver, type Saving } from './saver';

const SAVE_EVERY = 1500;

const bodyOf = (session: Session, revision: number, { values, material, use }: Part, apart: boolean) => ({
  revision,
  apart,
  family: session.family.about.id,
  material,
  use,
  parameters: values,
});

/** A kept design as the session's fields show it. */
const typedOf = ({ family }: Session, { parameters, material, use }: Design) => ({
  entries: designEntries(family, { values: parameters as Part['values'], material, use }),
  from: null,
});

function start(session: Session, kept: Design, tell: (saving: Saving) => void) {
  const address = `/api/v1/designs/${kept.id}`;
  let leaving = false;
  let taking = false;
  const saver: Saver = createSaver<Design>(kept, {
    save: (revision, part, apart) =>
      send('PUT', address, bodyOf(session, revision, part, apart), { leaving }),
    load: () => send('GET', address),
    tell,
  });
  const later = throttle(() => void saver.flush(), SAVE_EVERY);
  const stop = session.reading.subscribe((now, was) => {
    if (taking || now.design === was.design) return;
    saver.note(now.design);
    later.call();
  });
  const leave = () => {
    leaving = true;
    later.cancel();
    void saver.flush();
  };
  window.addEventListener('pagehide', leave);
  return {
    saver,
    /** Shows what was saved elsewhere, without saving it once more. */
    show: (theirs: Design) => {
      taking = true;
      session.replace(typedOf(session, theirs));
      taking = false;
    },
    end: () => {
      stop();
      window.removeEventListener('pagehide', leave);
      leave();
    },
  };
}

/** Keeps a design saved while the page is open. */
export function useSaver(session: Session, kept: Design) {
  const [saving, setSaving] = useState<Saving>({ status: 'saved', at: kept.changedAt });
  const [running, setRunning] = useState<ReturnType<typeof start> | null>(null);
  // biome-ignore lint/correctness/useExhaustiveDependencies: the design's later revisions are the saver's own business
  useEffect(() => {
    const started = start(session, kept, setSaving);
    setRunning(started);
    return started.end;
  }, [session, kept.id]);
  const takeTheirs = async () => {
    const theirs = await running?.saver.takeTheirs();
    if (theirs) running?.show(theirs);
  };
  const { saver } = running ?? {};
  return { saving, retry: () => saver?.flush(), keepMine: () => saver?.keepMine(), takeTheirs };
}
