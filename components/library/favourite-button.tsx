'use client';

import { Heart } from 'lucide-react';
import { useState } from 'react';
import { send } from '@/components/forms/send';
import { Button } from '@/components/ui/button';

/** Marks a preset as a favourite of the member, or takes the mark away. */
export function FavouriteButton({ slug, marked }: { slug: string; marked: boolean }) {
  const [on, setOn] = useState(marked);
  const [fault, setFault] = useState<string | null>(null);
  const turn = async () => {
    setOn(!on);
    const sent = await send(on ? 'DELETE' : 'PUT', `/api/v1/presets/${slug}/favourite`);
    setFault(sent.ok ? null : sent.message);
    if (!sent.ok) setOn(on);
  };
  return (
    <>
      <Button aria-pressed={on} onClick={turn}>
        <Heart aria-hidden="true" size={18} fill={on ? 'currentColor' : 'none'} />
        Favourite
      </Button>
      <span role="status" className="text-over text-sm">
        {fault}
      </span>
    </>
  );
}
