'use client';

import { useId } from 'react';
import { classNames } from '@/components/ui/class-names';
import { SelectField } from '@/components/ui/select-field';
import type { Motion, Stance } from '@/generators/contract';
import { readingAt, readingWords, stepShares } from '../computed/reading';
import { shapeOf } from '../computed/standing';
import { useStanding } from '../computed/standing-context';
import { useReading, useSession } from '../session-context';
import { FlexSlider, type SolvedSteps } from './flex-slider';
import type { ViewState } from './view-state';

function Look({ pressed, onPress, children }: { pressed: boolean; onPress: () => void; children: string }) {
  return (
    <button
      type="button"
      aria-pressed={pressed}
      onClick={onPress}
      className={classNames(
        'min-h-9 rounded-field border px-2.5 font-semibold text-sm pointer-coarse:min-h-11',
        pressed ? 'border-ink bg-ink text-paper' : 'border-edge bg-sheet hover:border-ink',
      )}
    >
      {children}
    </button>
  );
}

/** The way it lies on the bed, and what that does to the layers. */
function StanceChoice({
  stances,
  stance,
  onStance,
}: {
  stances: readonly Stance[];
  stance: Stance;
  onStance: (id: string) => void;
}) {
  const id = useId();
  const session = useSession();
  const layers = useReading((reading) => reading.design.use.layers);
  return (
    <div className="grid gap-2 border-hair border-t px-4 py-3 text-sm sm:grid-cols-[auto_1fr] sm:items-center">
      <div className="flex items-center gap-2">
        <label htmlFor={id} className="whitespace-nowrap">
          Lies
        </label>
        <SelectField
          id={id}
          value={stance.id}
          options={stances.map((one) => ({ value: one.id, label: one.label }))}
          onChange={(event) => onStance(event.target.value)}
          className="w-52"
        />
      </div>
      <p className="text-muted">
        {stance.because}{' '}
        {stance.layers !== layers && (
          <button
            type="button"
            className="min-h-6 font-semibold text-ink underline underline-offset-4"
            onClick={() => {
              session.seal();
              session.type('layers', stance.layers);
            }}
          >
            Check it with layers {stance.layers} the strain
          </button>
        )}
      </p>
    </div>
  );
}

/** The load steps of the shape shown and what they say of this moment; null while it is the formula's. */
function useSolvedSteps(flex: number): SolvedSteps | null {
  const shape = shapeOf(useStanding());
  if (!shape) return null;
  const { solution, plane } = shape;
  return { shares: stepShares(solution), words: readingWords(readingAt(solution, plane, flex), plane) };
}

/** What was solved at the moment shown, in a line that stays as long as the part can be solved. */
function SolvedLine({ solved }: { solved: SolvedSteps | null }) {
  const { basis, plane } = useStanding();
  if (!plane || plane.motion === 'family' || basis.kind === 'formula') return null;
  return (
    <p className="border-hair border-t px-4 py-1.5 text-sm tabular-nums" data-solved-line="">
      {solved ? (
        <>
          <span className="text-muted">Solved, at true scale:</span> {solved.words}
        </>
      ) : (
        <span className="text-muted">Finite elements are being solved.</span>
      )}
    </p>
  );
}

export function ViewBar({
  view,
  onView,
  motion,
  stances,
  stance,
  onStance,
}: {
  view: ViewState;
  onView: (change: Partial<ViewState>) => void;
  motion: Motion;
  stances: readonly Stance[];
  stance: Stance | null;
  onStance: (id: string) => void;
}) {
  const solved = useSolvedSteps(view.flex);
  return (
    <div className="border-hair border-t">
      <div className="flex flex-wrap items-center gap-x-5 gap-y-2 px-4 py-2">
        {!view.onBed && (
          <FlexSlider motion={motion} flex={view.flex} onFlex={(flex) => onView({ flex })} solved={solved} />
        )}
        <fieldset className="flex flex-wrap gap-1.5">
          <legend className="sr-only">Show</legend>
          {motion.peakStrain > 0 && (
            <Look
              pressed={view.paint === 'strain'}
              onPress={() => onView({ paint: view.paint === 'strain' ? 'solid' : 'strain' })}
            >
              Strain
            </Look>
          )}
          <Look pressed={view.dimensions} onPress={() => onView({ dimensions: !view.dimensions })}>
            Dimensions
          </Look>
          <Look pressed={view.cut} onPress={() => onView({ cut: !view.cut })}>
            Cut
          </Look>
          {stances.length > 0 && (
            <Look pressed={view.onBed} onPress={() => onView({ onBed: !view.onBed })}>
              On the bed
            </Look>
          )}
        </fieldset>
      </div>
      {!view.onBed && <SolvedLine solved={solved} />}
      {view.onBed && stance && <StanceChoice stances={stances} stance={stance} onStance={onStance} />}
    </div>
  );
}
