'use client';

import { X } from 'lucide-react';
import type { ReactNode } from 'react';
import { Button } from '@/components/ui/button';
import { useReading } from '../session-context';
import { ToField } from '../sheet/to-field';
import { VerdictIcon } from '../verdict';

function Strip({ children }: { children: ReactNode }) {
  return (
    <div className="flex flex-wrap items-center gap-x-4 gap-y-1 border-marker border-l-4 bg-sheet px-4 py-1.5 text-sm shadow-lift">
      {children}
    </div>
  );
}

export function Restored({ onFresh, onKeep }: { onFresh: () => void; onKeep: () => void }) {
  return (
    <Strip>
      <span>Restored: what you were working on in this browser.</span>
      <Button small look="quiet" onClick={onFresh} className="underline underline-offset-4">
        Start fresh
      </Button>
      <Button small look="quiet" onClick={onKeep} aria-label="Close the notice" className="ml-auto px-1.5!">
        <X size={16} />
      </Button>
    </Strip>
  );
}

export function UnknownWords({ words }: { words: readonly string[] }) {
  if (words.length === 0) return null;
  return (
    <Strip>
      The link says {words.slice(0, 5).join(', ')}, which this part does not know; the rest of it was used.
    </Strip>
  );
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
