'use client';

import { useState } from 'react';
import { Segmented } from '@/components/ui/segmented';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import { useStandingReport } from '../computed/standing-context';
import { CurvePlot } from './curve-plot';
import { CurveTable } from './curve-table';

/** How it feels: force or torque over travel. */
export function Curves() {
  const curves = useStandingReport().curves.filter(({ points }) => points.length > 1);
  const [chosen, setChosen] = useState<string | null>(null);
  const curve = curves.find(({ id }) => id === chosen) ?? curves[0];
  if (!curve) return null;
  return (
    <Sheet labelledBy="curves" className="grid gap-4 px-5 py-4 sm:px-7">
      <SheetTitle
        id="curves"
        aside={
          curves.length > 1 && (
            <Segmented
              legend="Curve"
              value={curve.id}
              options={curves.map(({ id, label }) => ({ value: id, label }))}
              onChange={setChosen}
            />
          )
        }
      >
        How it feels
      </SheetTitle>
      <p className="text-muted text-sm">
        {curve.label}
        {curve.band && '. The pale band is the spread of the friction.'}
      </p>
      <CurvePlot curve={curve} />
      <details>
        <summary className="min-h-8 w-fit font-semibold text-sm underline decoration-dotted underline-offset-4">
          As a table
        </summary>
        <CurveTable curve={curve} />
      </details>
    </Sheet>
  );
}
