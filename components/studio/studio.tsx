'use client';

import { type ReactNode, use, useEffect, useEffectEvent, useRef, useState } from 'react';
import { prepareSolver } from '@/components/viewport/solve-client';
import type { ViewportState } from '@/components/viewport/types';
import type { Family } from '@/generators/contract';
import type { Material } from '@/lib/materials/types';
import { dropWork, keptWork, startOf } from './autosave';
import { StrainBand } from './band/strain-band';
import { ChecksList } from './checks/checks-list';
import { Curves } from './checks/curves';
import { HowComputed } from './computed/how-computed';
import { StandingProvider } from './computed/standing-context';
import { CopyLink } from './head/copy-link';
import { Files } from './head/files';
import { HistoryButtons } from './head/history-buttons';
import { Keys } from './head/keys';
import { Faults, LinkNotes, Restored } from './head/notices';
import { StartingPoints } from './head/starting-points';
import { loadFamily } from './load-family';
import { Plastics } from './plastics';
import { PrintSheet } from './print-sheet';
import { createSession, presetTyped, type Session } from './session';
import { SessionProvider } from './session-context';
import { DimensionSheet } from './sheet/dimension-sheet';
import { Remedies } from './sheet/remedies';
import { UseStrip } from './sheet/use-strip';
import { useKeeping } from './use-keeping';
import { useUndoKeys } from './use-undo-keys';
import { ViewPanel } from './view/view-panel';
import { volumeOf } from './view/volume';

/**
 * After the page is alive: takes the design of the address where it differs from the one the page was made with
 * (coming back to a page kept by the browser), else the work kept here when the address says nothing.
 */
function useReopened(session: Session, query: string, local: boolean) {
  const [restored, setRestored] = useState(false);
  const opened = useRef<Session>(null);
  const { family } = session;
  const reopen = useEffectEvent(() => {
    if (!local || opened.current === session) return;
    opened.current = session;
    const here = window.location.search.slice(1);
    const start = startOf(family, here);
    const kept = start.linked ? null : keptWork(family, localStorage);
    const next = kept ?? (here === query ? null : start.typed);
    if (!next) return;
    session.replace(next);
    session.history.getState().clear();
    setRestored(kept !== null);
  });
  useEffect(() => reopen(), []);
  const close = () => setRestored(false);
  const fresh = () => {
    session.replace(presetTyped(family));
    dropWork(family, localStorage);
    close();
  };
  return { restored, close, fresh };
}

function Bench({ session, query, keep, local = true, title }: Given & { session: Session }) {
  const { family } = session;
  const [stance, setStance] = useState<string | null>(null);
  const [picture, setPicture] = useState<ViewportState>({ status: 'loading' });
  const { restored, close, fresh } = useReopened(session, query, local);
  const volume = volumeOf(picture);
  useKeeping(session, local);
  useUndoKeys(session);
  return (
    <main className="frame grid grid-cols-[minmax(0,1fr)] gap-4 pt-5 pb-14 print:block print:p-0 print:[&>:not([data-print])]:hidden">
      <PrintSheet title={title} />
      <div className="flex flex-wrap items-end justify-between gap-x-6 gap-y-3">
        <div className="flex flex-wrap items-baseline gap-x-6">
          <h1 className="font-bold text-4xl tracking-tight sm:text-5xl">{title ?? family.about.name}</h1>
          {local ? <StartingPoints /> : <span className="text-muted">{family.about.name}</span>}
        </div>
        <div className="flex flex-wrap items-center gap-2">
          <Keys />
          <HistoryButtons />
          <CopyLink />
          <Files bodies={(picture.bodies ?? []).map(({ name }) => name)} stance={stance} />
        </div>
      </div>
      {keep}
      {restored && <Restored instead={query !== ''} onFresh={fresh} onKeep={close} />}
      <LinkNotes {...startOf(family, query)} />
      <Faults />
      <StrainBand volume={volume} />
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-4 lg:grid-cols-[minmax(0,1fr)_27rem]">
        <div className="grid min-w-0 gap-4 lg:sticky lg:top-[4.5rem]">
          <ViewPanel stance={stance} onStance={setStance} state={picture} onState={setPicture} />
          <Remedies />
        </div>
        <div className="grid min-w-0 gap-4">
          <UseStrip />
          <DimensionSheet />
        </div>
      </div>
      <ChecksList />
      <HowComputed />
      <div className="grid grid-cols-[minmax(0,1fr)] items-start gap-4 xl:grid-cols-[repeat(2,minmax(0,1fr))]">
        <Curves />
        <Plastics />
      </div>
    </main>
  );
}

interface Given {
  /** query of the address the page was asked for, without "?" */
  readonly query: string;
  /** how the design is kept in an account */
  readonly keep?: ReactNode;
  /** whether this browser keeps the work and the address follows it; not where an account does */
  readonly local?: boolean;
  /** what the design is called; the family's name where left out */
  readonly title?: string;
}

export interface StudioProps extends Given {
  readonly family: string;
  readonly materials: readonly Material[];
}

function begin(family: Family, materials: readonly Material[], query: string): Session {
  if (family.bending) prepareSolver();
  return createSession(family, materials, startOf(family, query).typed);
}

/** The design page of a family. */
export function Studio({ family: id, materials, ...given }: StudioProps) {
  const family = use(loadFamily(id));
  const [session] = useState(() => begin(family, materials, given.query));
  return (
    <SessionProvider value={session}>
      <StandingProvider>
        <Bench session={session} {...given} />
      </StandingProvider>
    </SessionProvider>
  );
}
