'use client';

import dynamic from 'next/dynamic';
import { useMemo, useState } from 'react';
import { useStore } from 'zustand';
import { Sheet } from '@/components/ui/sheet';
import type { ViewportState } from '@/components/viewport/types';
import { Waiting } from '@/components/viewport/waiting';
import type { Motion } from '@/generators/contract';
import type { Report } from '@/generators/report';
import { figureOf } from '@/generators/sensitivity';
import { solvedMotion } from '@/generators/solved-motion';
import { shapeOf } from '../computed/standing';
import { useStanding, useStandingReport } from '../computed/standing-context';
import { useReading, useSession, useSubject } from '../session-context';
import { InWords } from './in-words';
import { ViewBar } from './view-bar';
import { FIRST_VIEW } from './view-state';

function SettingUp() {
  return <Waiting family={useSession().family.about.id} words="Setting up the view…" />;
}

const Viewport = dynamic(() => import('@/components/viewport/viewport'), {
  ssr: false,
  loading: SettingUp,
});

/** The limit the picture's scale is marked with: that of the verdict where it is about strain. */
function strainLimit(report: Report): number | null {
  const governing = figureOf(report, report.governing);
  return governing?.unit === 'strain' ? governing.limit : report.allowable.value;
}

/** The solved motion of the part where there is one, else the formula's. */
function useShownMotion(formula: Motion): Motion {
  const { plane, solution } = shapeOf(useStanding()) ?? {};
  return useMemo(
    () => (plane && solution ? solvedMotion(formula, plane, solution) : formula),
    [formula, plane, solution],
  );
}

/** What the picture needs of the part; the same objects as long as the part is the same. */
function useScene() {
  const { family, values, material } = useSubject();
  const formula = useMemo(() => family.motion(values, material), [family, values, material]);
  const motion = useShownMotion(formula);
  const callouts = useMemo(() => family.callouts(values), [family, values]);
  const stances = useMemo(() => family.stances(values), [family, values]);
  return { motion, callouts, stances };
}

/** The part, how it is looked at, and the same in words. */
export function ViewPanel({
  stance: chosen,
  onStance,
  state,
  onState,
}: {
  /** id of the way it lies on the bed; the family's best where null */
  stance: string | null;
  onStance: (id: string) => void;
  state: ViewportState;
  /** stable */
  onState: (state: ViewportState) => void;
}) {
  const session = useSession();
  const { design, material } = useReading((reading) => reading);
  const report = useStandingReport();
  const highlight = useStore(session.focused, ({ field }) => field);
  const [view, setView] = useState(FIRST_VIEW);
  const { motion, callouts, stances } = useScene();
  const stance = stances.find((one) => one.id === chosen) ?? stances[0] ?? null;
  return (
    <Sheet labelledBy="picture" className="overflow-hidden">
      <h2 id="picture" className="sr-only">
        The part
      </h2>
      <div className="relative h-[20rem] sm:h-[27rem] lg:h-[clamp(20rem,100dvh-25rem,36rem)]">
        <Viewport
          family={session.family.about.id}
          values={design.values}
          motion={motion}
          flex={view.onBed ? 0 : view.flex}
          paint={view.onBed || motion.peakStrain === 0 ? 'solid' : view.paint}
          strainScale={strainLimit(report)}
          showDimensions={view.dimensions}
          cut={view.cut}
          onBed={view.onBed}
          callouts={callouts}
          stance={stance}
          highlightField={highlight}
          onState={onState}
        />
      </div>
      <ViewBar
        view={view}
        onView={(change) => setView((was) => ({ ...was, ...change }))}
        motion={motion}
        stances={stances}
        stance={stance}
        onStance={onStance}
      />
      <InWords state={state} material={material} />
    </Sheet>
  );
}
