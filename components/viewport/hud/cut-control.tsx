'use client';
import { significant } from '@/lib/units';
import { AXES, type Axis } from '../mesh/slice';

export interface CutChoice {
  readonly axis: Axis;
  /** 0 to 1 through the part */
  readonly share: number;
}

interface CutProps {
  readonly choice: CutChoice;
  /** place of the cut in mm */
  readonly at: number;
  readonly onChoice: (choice: CutChoice) => void;
}

export function CutControl({ choice, at, onChoice }: CutProps) {
  return (
    <fieldset className="flex items-center gap-2 rounded-sheet border border-hair bg-sheet/90 py-0.5 pr-2 pl-0.5 text-[13px] text-ink">
      <legend className="sr-only">Cut</legend>
      {AXES.map((axis) => (
        <button
          key={axis}
          type="button"
          aria-pressed={axis === choice.axis}
          aria-label={`Cut across ${axis}`}
          className="min-h-8 min-w-8 rounded-field font-mono hover:bg-petrol-soft aria-pressed:bg-ink aria-pressed:text-sheet"
          onClick={() => onChoice({ ...choice, axis })}
        >
          {axis}
        </button>
      ))}
      <input
        type="range"
        min={0.01}
        max={0.99}
        step={0.005}
        value={choice.share}
        aria-label={`Place of the cut along ${choice.axis}`}
        aria-valuetext={`${significant(at)} mm`}
        className="h-8 w-24 accent-petrol"
        onChange={(event) => onChoice({ ...choice, share: Number(event.target.value) })}
      />
      <output className="w-16 text-right font-mono tabular-nums">{significant(at)} mm</output>
    </fieldset>
  );
}
