'use client';

import { Box } from 'lucide-react';
import { lazy, Suspense, useState } from 'react';
import { Button } from '@/components/ui/button';
import type { Design as Part } from '@/generators/url-state';
import type { Material } from '@/lib/materials/types';
import { Drawing } from './drawing';

const LivePart3d = lazy(() => import('./live-part-3d'));

export interface LivePartProps {
  readonly family: string;
  readonly values: Part['values'];
  readonly material: Material;
  readonly picture: string;
  readonly title: string;
}

/** The drawn picture first; the part to turn and bend once it is asked for, which brings the builder and the viewer. */
export function LivePart({ picture, title, ...part }: LivePartProps) {
  const [live, setLive] = useState(false);
  const still = (
    <Drawing
      src={picture}
      alt={`${title}, drawn from its own mesh`}
      eager
      className="aspect-4/3 object-contain"
    />
  );
  return (
    <div className="relative overflow-hidden rounded-sheet border border-hair bg-sheet shadow-lift">
      {live ? (
        <Suspense fallback={still}>
          <LivePart3d {...part} />
        </Suspense>
      ) : (
        <>
          {still}
          <Button className="absolute right-3 bottom-3" onClick={() => setLive(true)}>
            <Box aria-hidden="true" size={18} />
            Turn and bend it
          </Button>
        </>
      )}
    </div>
  );
}
