'use client';

import { Pause, Play } from 'lucide-react';
import { useEffect, useEffectEvent, useId, useState } from 'react';
import { Button } from '@/components/ui/button';
import type { Motion } from '@/generators/contract';

const PERIOD = 3200;

/** Runs the motion to and fro while playing, from where it stands. */
function usePlay(flex: number, onFlex: (flex: number) => void) {
  const [playing, setPlaying] = useState(false);
  const phaseNow = useEffectEvent(() => Math.acos(1 - 2 * flex) / (2 * Math.PI));
  const move = useEffectEvent(onFlex);
  useEffect(() => {
    if (!playing) return;
    const phase = phaseNow();
    let start: number | undefined;
    let frame = requestAnimationFrame(function step(now) {
      start ??= now - phase * PERIOD;
      move((1 - Math.cos(((now - start) / PERIOD) * 2 * Math.PI)) / 2);
      frame = requestAnimationFrame(step);
    });
    return () => cancelAnimationFrame(frame);
  }, [playing]);
  return [playing, setPlaying] as const;
}

/** Marks under the slide, where the thumb stands at each share. */
function Ticks({ shares }: { shares: readonly number[] }) {
  return (
    <span aria-hidden="true" className="pointer-events-none absolute inset-x-3 bottom-1 h-1.5">
      {shares.map((share) => (
        <i key={share} className="absolute h-full w-px bg-muted" style={{ left: `${share * 100}%` }} />
      ))}
    </span>
  );
}

export interface SolvedSteps {
  readonly shares: readonly number[];
  /** what was solved at the moment shown */
  readonly words: string;
}

export function FlexSlider({
  motion,
  flex,
  onFlex,
  solved,
}: {
  motion: Motion;
  flex: number;
  onFlex: (flex: number) => void;
  solved: SolvedSteps | null;
}) {
  const id = useId();
  const [playing, setPlaying] = usePlay(flex, onFlex);
  const way = `${Math.round(flex * 100)} % of the way from ${motion.from} to ${motion.to}`;
  return (
    <div className="flex min-w-0 flex-1 basis-80 items-center gap-3">
      <Button
        small
        look="quiet"
        aria-label={playing ? 'Stop the motion' : 'Run the motion'}
        aria-pressed={playing}
        onClick={() => setPlaying(!playing)}
        className="min-w-8 px-0!"
      >
        {playing ? <Pause size={18} /> : <Play size={18} />}
      </Button>
      <label htmlFor={id} className="font-semibold">
        {motion.label}
      </label>
      <span className="hidden whitespace-nowrap text-muted text-sm sm:inline">{motion.from}</span>
      <span className="relative flex min-w-0 flex-1">
        <input
          id={id}
          type="range"
          min={0}
          max={1}
          step={0.01}
          value={flex}
          aria-valuetext={[way, solved?.words].filter(Boolean).join(': ')}
          onChange={(event) => {
            setPlaying(false);
            onFlex(Number(event.target.value));
          }}
          className="slide min-w-0 flex-1"
          style={{ '--at': `${flex * 100}%` } as object}
        />
        {solved && <Ticks shares={solved.shares} />}
      </span>
      <span className="whitespace-nowrap text-muted text-sm">{motion.to}</span>
    </div>
  );
}
