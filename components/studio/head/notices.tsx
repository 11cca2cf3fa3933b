'use client';

import { X } from 'lucide-react';
import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { LINK_LIMIT } from '@/generators/url-state';
import type { Start } from '../autosave';
import { useReading, useSession } from '../session-context';
import { ToField } from '../sheet/to-field';
import { VerdictIcon } from '../verdict';

function Strip({ children }: { children: ReactNode }) {
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-1 border-marker border-l-4 bg-sheet px-4 py-1.5 text-sm shadow-lift">
      {children}
    </div>
  );
}

/** `instead` of a link that says nothing this part can use. */
export function Restored({
  instead,
  onFresh,
  onKeep,
}: {
  instead: boolean;
  onFresh: () => void;
  onKeep: () => void;
}) {
  return (
    <Strip>
      <span>
        {instead
          ? 'Restored: your own earlier work in this browser, not what the link says.'
          : 'Restored: what you were working on in this browser.'}
      </span>
      <Button small look="quiet" onClick={onFresh} className="underline underline-offset-4">
        Start fresh
      </Button>
      <Button small look="quiet" onClick={onKeep} aria-label="Close the notice" className="ml-auto px-1.5!">
        <X size={16} />
      </Button>
    </Strip>
  );
}

const MOST_NAMES = 5;
const LONGEST_NAME = 40;

function listed(words: readonly string[]): string {
  const names = words.slice(0, MOST_NAMES).map((word) => {
    if (word === '') return 'a word without a name';
    return word.length > LONGEST_NAME ? `${word.slice(0, LONGEST_NAME)}…` : word;
  });
  const more = words.length - names.length;
  return more > 0 ? `${names.join(', ')} and ${more} more` : names.join(', ');
}

/** Names what in the link could not be used. */
export function LinkNotes({ unused, linked }: Pick<Start, 'unused' | 'linked'>) {
  const { fields } = useSession().family.parameters;
  const { unknown, repeated, unread } = unused;
  const rest = linked ? 'the rest of it was used' : 'nothing of it was used';
  const notes = [
    unknown.length > 0 && `The link says ${listed(unknown)}, which this part does not know; ${rest}.`,
    repeated.length > 0 &&
      `The link gives ${listed(repeated.map((word) => fields[word]?.label ?? word))} more than once; the last one was used.`,
    unread.length > 0 &&
      `The link is longer than ${LINK_LIMIT} characters; ${listed(unread)} past that was not read.`,
  ].filter((note) => note !== false);
  return notes.map((note) => <Strip key={note}>{note}</Strip>);
}

/** Says at the head that the figures are of the last valid part, and leads to the entries at fault. */
export function Faults() {
  const issues = useReading((reading) => reading.issues);
  return (
    <div role="alert">
      {issues.length > 0 && (
        <ul className="grid gap-1 border-over border-l-4 bg-over-soft px-4 py-2 text-sm">
          {issues.map(({ field, message }) => (
            <li key={`${field} ${message}`} className="flex items-start gap-2">
              <VerdictIcon verdict="over-limit" size={18} />
              <span>
                {message}. Figures and picture are of the last valid part. <ToField name={field} />
              </span>
            </li>
          ))}
        </ul>
      )}
    </div>
  );
}
