import type { Unit } from '@/lib/units';

export interface Scale {
  /** end of the scale, in shown units */
  readonly end: number;
  readonly major: number;
  readonly minor: number;
  readonly majors: readonly number[];
  readonly minors: readonly number[];
}

/** A figure as it is shown: strain in percent, the rest as it is. */
export const shown = (value: number, unit: Unit): number => (unit === 'strain' ? value * 100 : value);

/** 1, 2 or 5 times a power of ten, the smallest that is not under the rough size. */
export function niceStep(rough: number): number {
  const power = 10 ** Math.floor(Math.log10(rough));
  const factor = [1, 2, 5, 10].find((n) => n * power >= rough * (1 - 1e-9)) ?? 10;
  return factor * power;
}

function steps(step: number, end: number): number[] {
  const count = Math.floor(end / step + 1e-9);
  return Array.from({ length: count + 1 }, (_, n) => Number((n * step).toPrecision(12)));
}

/** A scale from zero that shows the largest of the marks with room past it; zero marks give a scale to one. */
export function scaleOver(marks: readonly (number | null)[], divisions = 6): Scale {
  const known = marks.filter((mark): mark is number => mark !== null && Number.isFinite(mark) && mark > 0);
  const reach = known.length > 0 ? Math.max(...known) : 1;
  const major = niceStep(reach / divisions);
  const minor = major / 5;
  const end = Math.ceil(reach / minor - 1e-9) * minor;
  const majors = steps(major, end);
  return {
    end: Number(end.toPrecision(12)),
    major,
    minor,
    majors,
    minors: steps(minor, end).filter((tick) => !majors.includes(tick)),
  };
}

/** Place of a value on the scale in percent of its length, kept on the scale. */
export const placeOn = (scale: Scale, value: number): number =>
  Math.min(100, Math.max(0, (100 * value) / scale.end));

/** A tick with as many decimals as its step needs. */
export function tickText(value: number, step: number): string {
  return value.toFixed(Math.max(0, -Math.floor(Math.log10(step) + 1e-9)));
}
