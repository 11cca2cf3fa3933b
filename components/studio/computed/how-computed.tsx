'use client';

import Link from 'next/link';
import { useState } from 'react';
import { Button } from '@/components/ui/button';
import { Segmented } from '@/components/ui/segmented';
import type { BendingPlane } from '@/generators/contract';
import { figureOf } from '@/generators/sensitivity';
import type { Solved } from '@/lib/fea/solve/solution';
import { HOW_ID } from './basis-line';
import { MeshPicture } from './mesh-picture';
import { Print } from './print';
import { Refine } from './refine';
import { useSolving } from './standing-context';

const SHAPES = [
  { value: 'bent', label: 'Bent' },
  { value: 'rest', label: 'At rest' },
] as const;

function Solution({ solution, plane }: { solution: Solved; plane: BendingPlane }) {
  const { standing, refinement } = useSolving();
  const [shape, setShape] = useState<(typeof SHAPES)[number]['value']>('bent');
  const [finer, setFiner] = useState(false);
  const fine = refinement?.status === 'solved' ? refinement.solution : null;
  const limit = figureOf(standing.report, plane.strainFigure)?.limit ?? null;
  return (
    <div className="grid items-start gap-x-10 gap-y-6 lg:grid-cols-[minmax(0,1fr)_minmax(0,1.1fr)]">
      <div className="grid gap-4">
        <Print solution={solution} plane={plane} />
        <Refine solution={solution} plane={plane} />
      </div>
      <div className="grid gap-3">
        <div className="flex flex-wrap gap-3">
          <Segmented legend="Shape" value={shape} options={SHAPES} onChange={setShape} />
          {fine && (
            <Button small onClick={() => setFiner(!finer)}>
              {finer ? 'Show the mesh in use' : 'Show the finer mesh'}
            </Button>
          )}
        </div>
        <MeshPicture
          solution={finer && fine ? fine : solution}
          plane={plane}
          allowable={limit}
          bent={shape === 'bent'}
        />
      </div>
    </div>
  );
}

function Body() {
  const { plane, solution, basis } = useSolving().standing;
  return (
    <div className="grid gap-4 border-hair border-t pt-4 pb-3">
      <p className="max-w-prose text-sm">
        {basis.kind === 'formula'
          ? basis.because
          : 'The outline of the part is cut into triangles, held and pushed as in use, and brought to balance step by step.'}{' '}
        <Link href="/guide/verification" className="font-semibold underline underline-offset-4">
          How far this can be trusted
        </Link>
      </p>
      {plane && solution && <Solution solution={solution} plane={plane} />}
      {basis.kind === 'solving' && <p className="text-muted text-sm">Being solved.</p>}
    </div>
  );
}

/** Print of the finite elements: mesh, size, time, estimated error. Drawn only while it is open. */
export function HowComputed() {
  const [open, setOpen] = useState(false);
  return (
    <details
      id={HOW_ID}
      onToggle={(event) => setOpen(event.currentTarget.open)}
      className="scroll-mt-16 rounded-sheet border border-hair bg-sheet px-5 py-3 shadow-lift sm:px-7"
    >
      <summary className="min-h-8 font-bold text-lg">How this was computed</summary>
      {open && <Body />}
    </details>
  );
}
