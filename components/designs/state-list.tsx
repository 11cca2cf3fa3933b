'use client';

import Link from 'next/link';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { send } from '@/components/forms/send';
import { VerdictMark } from '@/components/studio/verdict';
import { Button, buttonClass } from '@/components/ui/button';
import type { DesignState } from '@/lib/access/designs';
import { moment } from './when';

/** Saved states, newest first, each to be compared with the one before it or made the newest again. */
export function StateList({
  id,
  revision,
  states,
  shown,
}: {
  id: string;
  revision: number;
  states: readonly DesignState[];
  shown: number;
}) {
  const router = useRouter();
  const [fault, setFault] = useState<string | null>(null);
  const restore = async (state: number) => {
    const sent = await send('POST', `/api/v1/designs/${id}/states/${state}/restore`, { revision });
    setFault(sent.ok ? null : sent.message);
    if (sent.ok) router.push(`/designs/${id}`);
    else router.refresh();
  };
  return (
    <>
      <p role="alert" className="text-over">
        {fault}
      </p>
      <ol>
        {states.map((state, at) => (
          <li
            key={state.revision}
            aria-current={state.revision === shown ? 'true' : undefined}
            className="flex flex-wrap items-center gap-x-4 gap-y-1 border-hair border-t border-l-4 border-l-transparent py-2 pl-3 aria-[current]:border-l-marker"
          >
            <span className="min-w-44">
              <b className="font-semibold">{at === 0 ? 'Newest' : `State ${states.length - at}`}</b>
              <span className="block text-muted text-sm">
                <time dateTime={state.savedAt}>{moment(state.savedAt)} UTC</time>
              </span>
            </span>
            <VerdictMark verdict={state.verdict} />
            <span className="ml-auto flex gap-1">
              {at < states.length - 1 && (
                <Link href={`?state=${state.revision}`} scroll={false} className={buttonClass('quiet', true)}>
                  What changed
                </Link>
              )}
              {at > 0 && (
                <Button small onClick={() => restore(state.revision)}>
                  Restore
                </Button>
              )}
            </span>
          </li>
        ))}
      </ol>
    </>
  );
}
