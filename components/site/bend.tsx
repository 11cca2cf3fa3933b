'use client';
import { type ReactNode, useCallback, useState } from 'react';
import type { BendPicture } from './bend-picture';
import { BendStage } from './bend-stage';
import type { PlainBody } from './plain-body';
import { PlasticBands } from './plastic-bands';
import { FIRST_PULL, MOST_PULL, type Reading } from './sample';
import { useBend } from './use-bend';
import { useSweep } from './use-sweep';

export interface BendProps {
  readonly body: PlainBody;
  /** picture and readings at the first pull, as the page came with them */
  readonly picture: BendPicture;
  readonly rows: readonly Reading[];
  readonly rest: string;
  readonly travel: { readonly x: number; readonly y: number };
  /** what stands beside the part */
  readonly children: ReactNode;
}

/** A part to bend by hand, with the family's own motion and check. */
export function Bend({ body, picture, rows, rest, travel, children }: BendProps) {
  const [pull, setPull] = useState<number>(FIRST_PULL);
  const [touched, setTouched] = useState(false);
  const live = useBend(body, pull);
  useSweep(live !== null, touched, setPull);
  const take = useCallback((next: number) => {
    setTouched(true);
    setPull(next);
  }, []);
  return (
    <>
      <div className="grid items-center lg:grid-cols-[minmax(24rem,0.85fr)_1fr]">
        {children}
        <BendStage
          picture={live?.picture ?? picture}
          rest={rest}
          travel={travel}
          pull={pull}
          onPull={take}
          label={`A snap hook, its catch pulled back by ${pull.toFixed(1)} mm, painted by strain`}
        />
      </div>
      <PlasticBands rows={live?.rows ?? rows} pull={pull}>
        <label className="flex w-full items-center gap-3 sm:w-80">
          <span className="font-semibold">Pull</span>
          <input
            type="range"
            min={0}
            max={MOST_PULL}
            step={0.1}
            value={pull}
            className="slide min-w-0 flex-1"
            style={{ '--at': `${(100 * pull) / MOST_PULL}%` } as object}
            aria-valuetext={`${pull.toFixed(1)} mm`}
            onChange={(event) => take(Number(event.target.value))}
          />
          <output className="w-16 text-right font-mono tabular-nums">{pull.toFixed(1)} mm</output>
        </label>
      </PlasticBands>
    </>
  );
}
