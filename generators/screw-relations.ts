import {
  crestWidth,
  jointOf,
  overlap,
  plugRoom,
  ridgeRootWidth,
  type ScrewSizes,
} from '@/lib/mechanics/screw-sizes';
import type { Relation } from './parameters';

const MIN_OVERLAP = 0.15;
const MIN_CREST = 0.05;
const MIN_GROOVE = 0.1;
/** Below this pitch, mm, little of a ridge is left by a 0.4 mm nozzle. */
const FINE_PITCH = 1.5;

/** Lengths rounded to what still holds: a least value up, a greatest one down. */
export const leastMm = (value: number): string => `${(Math.ceil(value * 100 - 1e-6) / 100).toFixed(2)} mm`;
export const mostMm = (value: number): string => `${(Math.floor(value * 100 + 1e-6) / 100).toFixed(2)} mm`;

interface ThreadNames<P> {
  readonly pitch: keyof P & string;
  readonly clearance: keyof P & string;
  /** the two halves, in the family's words */
  readonly halves: string;
  readonly cap: string;
}

/** Rules of the thread itself; `sizesOf` gives the screwed closure of a family's values. */
export function threadRelations<P>(sizesOf: (p: P) => ScrewSizes, names: ThreadNames<P>): Relation<P>[] {
  return [
    {
      id: 'ridge-in-pitch',
      field: names.pitch,
      severity: 'refuse',
      holds: (p) => sizesOf(p).pitch >= ridgeRootWidth(sizesOf(p)) + MIN_GROOVE - 1e-9,
      message: (p) =>
        `Pitch must be at least ${leastMm(ridgeRootWidth(sizesOf(p)) + MIN_GROOVE)}, ${MIN_GROOVE} mm more than the root of the ridge, or its turns run together`,
    },
    {
      id: 'threads-overlap',
      field: names.clearance,
      severity: 'refuse',
      holds: (p) => overlap(sizesOf(p)) >= MIN_OVERLAP - 1e-9,
      message: (p) =>
        `Clearance must be at most ${mostMm(jointOf(sizesOf(p)).thread.engagement - MIN_OVERLAP)} for a pitch of ${sizesOf(p).pitch} mm, or ${names.halves} hardly touch`,
    },
    {
      id: 'crest-left',
      field: names.clearance,
      severity: 'refuse',
      holds: (p) => crestWidth(sizesOf(p)) >= MIN_CREST - 1e-9,
      message: (p) =>
        `Clearance of ${sizesOf(p).clearance} mm leaves a crest of ${crestWidth(sizesOf(p)).toFixed(2)} mm on the ${names.cap}'s thread; it needs at least ${MIN_CREST} mm`,
    },
    {
      id: 'printable-pitch',
      field: names.pitch,
      severity: 'warn',
      holds: (p) => sizesOf(p).pitch >= FINE_PITCH,
      message: () => 'Pitch under 1.5 mm prints poorly with a 0.4 mm nozzle; 2 mm and more is safe',
    },
  ];
}

interface PlugNames<P> {
  readonly length: keyof P & string;
  readonly interference: keyof P & string;
  readonly cap: string;
}

/** Rules of a plug seal. */
export function plugRelations<P>(sizesOf: (p: P) => ScrewSizes, names: PlugNames<P>): Relation<P>[] {
  const plugged = (p: P) => sizesOf(p).seal === 'plug';
  return [
    {
      id: 'plug-in-cap',
      field: names.length,
      severity: 'refuse',
      holds: (p) => !plugged(p) || sizesOf(p).plugLength <= plugRoom(sizesOf(p)) + 1e-9,
      message: (p) =>
        `Plug length must be at most ${mostMm(plugRoom(sizesOf(p)))}, so that it ends inside the skirt of the ${names.cap}`,
    },
    {
      id: 'plug-interference-small',
      field: names.interference,
      severity: 'refuse',
      holds: (p) => !plugged(p) || sizesOf(p).plugInterference <= 0.1 * sizesOf(p).bore,
      message: (p) =>
        `Plug interference must be at most ${mostMm(0.1 * sizesOf(p).bore)}, a tenth of the bore`,
    },
  ];
}
