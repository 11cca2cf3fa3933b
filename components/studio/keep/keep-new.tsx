'use client';

import { Bookmark } from 'lucide-react';
import { useRouter } from 'next/navigation';
import { useState } from 'react';
import { send } from '@/components/forms/send';
import { Button, buttonClass } from '@/components/ui/button';
import { writeLink } from '@/generators/url-state';
import type { Design } from '@/lib/access/designs';
import { dropWork } from '../autosave';
import { useReading, useSession } from '../session-context';
import { Strip } from './strip';

function nameOf(session: ReturnType<typeof useSession>): string {
  const { from } = session.typed.getState();
  const preset = session.family.presets.find(({ id }) => id === from);
  return preset?.name ?? session.family.about.name;
}

function SignInFirst() {
  const { family } = useSession();
  const design = useReading((reading) => reading.design);
  const here = `/design/${family.about.id}?${writeLink(family, design)}`;
  return (
    <Strip>
      <span className="text-muted">
        Nothing of this is stored on the server. This browser holds your work.
      </span>
      <a href={`/sign-in?next=${encodeURIComponent(here)}`} className={buttonClass('quiet', true)}>
        <Bookmark aria-hidden="true" size={17} />
        Sign in to keep it
      </a>
    </Strip>
  );
}

function KeepIt({ startedFrom }: { startedFrom: string | null }) {
  const session = useSession();
  const router = useRouter();
  const [fault, setFault] = useState<string | null>(null);
  const [busy, setBusy] = useState(false);
  const keep = async () => {
    setBusy(true);
    const { values, material, use } = session.reading.getState().design;
    const { about } = session.family;
    const sent = await send<Design>('POST', '/api/v1/designs', {
      name: nameOf(session),
      family: about.id,
      parameters: values,
      material,
      use,
      ...(startedFrom !== null && { startedFrom }),
    });
    if (!sent.ok) {
      setFault(sent.message);
      setBusy(false);
      return;
    }
    dropWork(session.family, localStorage);
    router.push(`/designs/${sent.value.id}`);
  };
  return (
    <Strip>
      <span className="text-muted" role="status">
        {fault ?? 'Not kept in your account yet.'}
      </span>
      <Button look="line" small aria-disabled={busy} onClick={busy ? undefined : keep}>
        <Bookmark aria-hidden="true" size={17} />
        Keep this design
      </Button>
    </Strip>
  );
}

/** Beside a design that is in no account: the way to keep it. `startedFrom`: version of a preset it began with. */
export function KeepNew({ signedIn, startedFrom }: { signedIn: boolean; startedFrom: string | null }) {
  return signedIn ? <KeepIt startedFrom={startedFrom} /> : <SignInFirst />;
}
