'use client';

import { Link2 } from 'lucide-react';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { writeLink } from '@/generators/url-state';
import { useReading, useSession } from '../session-context';

type Copied = { state: 'no' | 'yes' } | { state: 'by-hand'; link: string };

/** Copies the link of this design; where the browser refuses, shows it to be copied by hand. */
export function CopyLink() {
  const { family, reading } = useSession();
  const [copied, setCopied] = useState<Copied>({ state: 'no' });
  const faulty = useReading(({ issues }) => issues.length > 0);
  const copy = async () => {
    const link = `${window.location.origin}/design/${family.about.id}?${writeLink(family, reading.getState().design)}`;
    try {
      await navigator.clipboard.writeText(link);
      setCopied({ state: 'yes' });
      setTimeout(() => setCopied({ state: 'no' }), 2500);
    } catch {
      setCopied({ state: 'by-hand', link });
    }
  };
  if (copied.state === 'by-hand') {
    return (
      <label className="flex items-center gap-2 text-sm">
        Link
        <input
          readOnly
          ref={(input) => input?.focus()}
          value={copied.link}
          onFocus={(event) => event.target.select()}
          onBlur={() => setCopied({ state: 'no' })}
          className="h-10 w-56 rounded-field border border-edge bg-sheet px-2 font-mono text-xs"
        />
      </label>
    );
  }
  const done = copied.state === 'yes';
  return (
    <>
      <Button onClick={copy}>
        <Link2 aria-hidden="true" size={18} />
        {done ? 'Link copied' : 'Copy link'}
      </Button>
      <span role="status" className="sr-only">
        {done && (faulty ? 'Link of the last valid part copied' : 'Link copied')}
      </span>
    </>
  );
}
