'use client';

import { ChevronDown } from 'lucide-react';
import { useStore } from 'zustand';
import { Button } from '@/components/ui/button';
import { closeNote, Note } from '@/components/ui/note';
import { presetTyped } from '../session';
import { useSession } from '../session-context';

function changesFrom(now: Readonly<Record<string, string>>, then: Readonly<Record<string, string>>): number {
  return Object.keys(then).filter((key) => Number(now[key]) !== Number(then[key]) && now[key] !== then[key])
    .length;
}

/** The presets to start from, and the way back to the one this design started from. */
export function StartingPoints() {
  const session = useSession();
  const { family } = session;
  const { entries, from } = useStore(session.typed);
  const start = family.presets.find(({ id }) => id === from);
  const changes = start ? changesFrom(entries, presetTyped(family, start).entries) : 0;
  const nameOf = (id: string) => session.materials.find((one) => one.id === id)?.shortName ?? id;
  return (
    <div className="flex flex-wrap items-center gap-x-3 gap-y-1 text-muted">
      <span>{start ? 'Started from' : 'Opened from a link'}</span>
      <Note
        className="inline-flex min-h-8 items-center gap-1 font-semibold text-ink underline decoration-2 decoration-marker underline-offset-4 pointer-coarse:min-h-11"
        trigger={
          <>
            {start ? start.name : 'Start from a preset'}
            <ChevronDown aria-hidden="true" size={16} />
          </>
        }
      >
        <h2 className="mb-1 font-bold">Start from</h2>
        <ul className="-mx-2 grid">
          {family.presets.map((preset) => (
            <li key={preset.id}>
              <button
                type="button"
                aria-current={preset.id === from ? 'true' : undefined}
                className="w-full rounded-field border-transparent border-l-4 px-2 py-2 text-left hover:bg-petrol-soft aria-[current]:border-marker"
                onClick={(event) => {
                  session.replace(presetTyped(family, preset));
                  closeNote(event.currentTarget);
                }}
              >
                <b className="font-semibold text-base">{preset.name}</b>
                <span className="block text-muted">
                  {preset.purpose} {nameOf(preset.material)}, opened {preset.use.opening}.
                </span>
              </button>
            </li>
          ))}
        </ul>
      </Note>
      {changes > 0 && start && (
        <>
          <span>
            {changes} {changes === 1 ? 'change' : 'changes'}
          </span>
          <Button small look="quiet" onClick={() => session.replace(presetTyped(family, start))}>
            Reset
          </Button>
        </>
      )}
    </div>
  );
}
