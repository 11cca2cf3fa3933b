'use client';

import { useMemo, useState } from 'react';
import { Segmented } from '@/components/ui/segmented';
import { Sheet, SheetTitle } from '@/components/ui/sheet';
import { loadCurve } from '../computed/load-curve';
import { useStanding } from '../computed/standing-context';
import { CurvePlot } from './curve-plot';
import { CurveTable } from './curve-table';

/** The curves of the check, and that of the load steps where the part was solved. */
function useCurves() {
  const standing = useStanding();
  const load = useMemo(() => loadCurve(standing), [standing]);
  const curves = standing.report.curves.filter(({ points }) => points.length > 1);
  return { curves: load ? [...curves, load.curve] : curves, load };
}

/** How it feels: force or torque over travel. */
export function Curves() {
  const { curves, load } = useCurves();
  const [chosen, setChosen] = useState<string | null>(null);
  const curve = curves.find(({ id }) => id === chosen) ?? curves[0];
  if (!curve) return null;
  const isLoad = curve === load?.curve;
  const beside = isLoad ? load.formula : null;
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
        {isLoad &&
          `, by the load steps of the finite elements.${beside ? ' Dashed: the corrected formula.' : ''}`}
      </p>
      <CurvePlot curve={curve} {...(beside && { beside })} />
      <details>
        <summary className="min-h-8 w-fit font-semibold text-sm underline decoration-dotted underline-offset-4">
          As a table
        </summary>
        <CurveTable curve={curve} />
      </details>
    </Sheet>
  );
}
