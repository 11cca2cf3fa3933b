'use client';

import { CloudAlert, CloudCheck, History, Send } from 'lucide-react';
import Link from 'next/link';
import { Button, buttonClass } from '@/components/ui/button';
import type { Design } from '@/lib/access/designs';
import { useSession } from '../session-context';
import { Rename } from './rename';
import type { Saving } from './saver';
import { Strip } from './strip';
import { useSaver } from './use-saver';

const clock = (at: string): string =>
  new Date(at).toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' });

const WORDS: Readonly<Record<Saving['status'], (at: string) => string>> = {
  saved: (at) => `Saved ${clock(at)}`,
  unsaved: () => 'Not saved yet',
  saving: () => 'Saving',
  conflict: () => 'Not saved: changed elsewhere',
  failed: () => 'Not saved',
};

function Status({ saving }: { saving: Saving }) {
  const Icon = saving.status === 'conflict' || saving.status === 'failed' ? CloudAlert : CloudCheck;
  return (
    <span
      role="status"
      suppressHydrationWarning
      className="inline-flex min-w-28 items-center gap-1.5 text-muted"
    >
      <Icon aria-hidden="true" size={17} />
      {WORDS[saving.status](saving.at)}
    </span>
  );
}

interface Choice {
  readonly keepMine: () => void;
  readonly takeTheirs: () => void;
}

function ConflictNote({ keepMine, takeTheirs }: Choice) {
  return (
    <div
      role="alert"
      className="flex flex-wrap items-center gap-x-4 gap-y-2 border-near border-l-4 bg-near-soft px-4 py-2 text-sm"
    >
      <span className="max-w-prose">
        This design was saved in another tab or on another device after you opened it here. Keep yours, and
        the other stays in the history; take the other, and undo brings yours back.
      </span>
      <Button small onClick={keepMine}>
        Keep mine
      </Button>
      <Button small onClick={takeTheirs}>
        Take the other
      </Button>
    </div>
  );
}

/** Beside a kept design: whether it is saved, its name, its history, and the way into the library. */
export function KeepSaved({ kept }: { kept: Design }) {
  const session = useSession();
  const { saving, retry, keepMine, takeTheirs } = useSaver(session, kept);
  return (
    <>
      <Strip>
        <Status saving={saving} />
        <Rename id={kept.id} name={kept.name} />
        <Link href={`/designs/${kept.id}/history`} className={buttonClass('quiet', true)} prefetch={false}>
          <History aria-hidden="true" size={16} />
          History
        </Link>
        <Link href={`/designs/${kept.id}/publish`} className={buttonClass('line', true)} prefetch={false}>
          <Send aria-hidden="true" size={16} />
          Publish to the library
        </Link>
      </Strip>
      {saving.status === 'conflict' && <ConflictNote keepMine={keepMine} takeTheirs={takeTheirs} />}
      {saving.status === 'failed' && (
        <div
          role="alert"
          className="flex flex-wrap items-center gap-4 border-over border-l-4 bg-over-soft px-4 py-2 text-sm"
        >
          {saving.message}
          <Button small onClick={retry}>
            Try again
          </Button>
        </div>
      )}
    </>
  );
}
