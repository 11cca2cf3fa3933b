'use client';

import { useRouter } from 'next/navigation';
import { useEffect, useState } from 'react';
import { send } from '@/components/forms/send';
import { dropWork, keptWork } from '@/components/studio/autosave';
import { loadFamily } from '@/components/studio/load-family';
import { Button } from '@/components/ui/button';
import { readEntries } from '@/generators/url-state';

interface Named {
  readonly id: string;
  readonly name: string;
}

const held = (families: readonly Named[]): readonly Named[] =>
  families.filter(({ id }) => {
    try {
      return localStorage.getItem(`bendwell:design:${id}`) !== null;
    } catch {
      return false;
    }
  });

/** Takes one piece of work into the account; what went wrong, or null. Work that is not valid stays where it is. */
async function moveIn({ id, name }: Named): Promise<string | null> {
  const family = await loadFamily(id);
  const work = keptWork(family, localStorage);
  const read = work && readEntries(family, work.entries);
  if (!read?.ok) return `${name}: what was typed is not a valid part. Open it and mend it first.`;
  const { values, material, use } = read.values;
  const preset = family.presets.find((one) => one.id === work?.from);
  const sent = await send('POST', '/api/v1/designs', {
    name: preset?.name ?? name,
    family: id,
    material,
    use,
    parameters: values,
  });
  if (!sent.ok) return `${name}: ${sent.message}`;
  dropWork(family, localStorage);
  return null;
}

/** Offers what was designed in this browser without an account. Nothing is moved unasked: the browser may be shared. */
export function MoveIn({ families }: { families: readonly Named[] }) {
  const router = useRouter();
  const [found, setFound] = useState<readonly Named[]>([]);
  const [faults, setFaults] = useState<readonly string[]>([]);
  useEffect(() => setFound(held(families)), [families]);
  const move = async () => {
    const answers: (string | null)[] = [];
    for (const one of found) answers.push(await moveIn(one));
    setFaults(answers.filter((one) => one !== null));
    setFound(held(families));
    router.refresh();
  };
  const leave = async () => {
    for (const { id } of found) dropWork(await loadFamily(id), localStorage);
    setFound([]);
  };
  if (found.length === 0) return null;
  return (
    <section
      aria-label="Work in this browser"
      className="mt-6 border-marker border-l-4 bg-sheet px-4 py-3 shadow-lift"
    >
      <p className="max-w-prose">
        This browser holds work that is in no account: {found.map(({ name }) => name).join(', ')}.
      </p>
      <ul role="alert" className="text-over text-sm">
        {faults.map((fault) => (
          <li key={fault}>{fault}</li>
        ))}
      </ul>
      <p className="mt-2 flex flex-wrap gap-2">
        <Button small look="ink" onClick={move}>
          Keep it in my account
        </Button>
        <Button small look="quiet" onClick={leave}>
          Forget it
        </Button>
      </p>
    </section>
  );
}
