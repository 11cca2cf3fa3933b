'use client';

import { use, useId, useMemo, useState } from 'react';
import { loadFamily } from '@/components/studio/load-family';
import Viewport from '@/components/viewport/viewport';
import type { Design as Part } from '@/generators/url-state';
import type { Material } from '@/lib/materials/types';

interface Props {
  readonly family: string;
  readonly values: Part['values'];
  readonly material: Material;
}

/** A preset's part in 3-D, with the slider that moves it as it moves in use. */
export default function LivePart3d({ family: id, values, material }: Props) {
  const family = use(loadFamily(id));
  const slider = useId();
  const [flex, setFlex] = useState(0);
  const motion = useMemo(() => family.motion(values, material), [family, values, material]);
  const callouts = useMemo(() => family.callouts(values), [family, values]);
  return (
    <>
      <div className="aspect-4/3">
        <Viewport
          family={id}
          values={values}
          motion={motion}
          flex={flex}
          paint="solid"
          strainScale={null}
          showDimensions={false}
          cut={false}
          onBed={false}
          callouts={callouts}
          stance={null}
        />
      </div>
      <div className="flex items-center gap-3 border-hair border-t px-4">
        <label htmlFor={slider} className="font-semibold">
          {motion.label}
        </label>
        <span className="text-muted text-sm">{motion.from}</span>
        <input
          id={slider}
          type="range"
          min={0}
          max={1}
          step={0.01}
          value={flex}
          onChange={(event) => setFlex(Number(event.target.value))}
          className="slide min-w-0 flex-1"
          style={{ '--at': `${flex * 100}%` } as object}
        />
        <span className="text-muted text-sm">{motion.to}</span>
      </div>
    </>
  );
}
