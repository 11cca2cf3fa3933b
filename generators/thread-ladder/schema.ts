import {
  capRidgeWidth,
  neckRidgeWidth,
  type ThreadBasics,
  type ThreadProfile,
  threadBasics,
} from '@/lib/mechanics/thread';
import { gapMark, LEAST_UNDER_MARK, ladder, markFields, markWidth } from '../coupon';
import { choice, count, defineParameters, length, type ValuesOf } from '../parameters';
import { leastMm, mostMm } from '../screw-relations';

const fields = {
  profile: choice<ThreadProfile>({
    label: 'Thread profile',
    options: [
      { value: 'printed', label: 'Printed, 45° lower flank' },
      { value: 'iso-metric', label: 'ISO metric, 60°' },
      { value: 'trapezoidal', label: 'Trapezoidal, 30°' },
      { value: 'knuckle', label: 'Knuckle (round)' },
    ],
    default: 'printed',
    group: 'thread',
    help: 'Section of the ridge. Take that of the part you want to fit.',
  }),
  majorDiameter: length({
    label: 'Major diameter',
    min: 6,
    max: 40,
    step: 0.5,
    default: 14,
    group: 'thread',
    help: 'Over the ridges of the stud, which keeps this size; the holes take all the clearance.',
  }),
  pitch: length({
    label: 'Pitch',
    min: 1,
    max: 6,
    step: 0.25,
    default: 3,
    group: 'thread',
    help: 'From one ridge to the next along the axis.',
  }),
  starts: count({
    label: 'Starts',
    min: 1,
    max: 3,
    default: 1,
    group: 'thread',
    help: 'Ridges side by side.',
  }),
  plateThickness: length({
    label: 'Plate thickness',
    min: 4,
    max: 30,
    step: 0.5,
    default: 9,
    group: 'plate',
    help: 'Length of thread that is tried at once: two turns tell more than one.',
  }),
  wall: length({
    label: 'Wall between holes',
    min: 1.2,
    max: 10,
    step: 0.2,
    default: 3,
    group: 'plate',
    help: 'At the widest hole, and round the edge.',
  }),
  gripHeight: length({
    label: 'Head height',
    min: 4,
    max: 25,
    step: 0.5,
    default: 8,
    group: 'plate',
    help: 'Six-sided head of the stud, to turn it by.',
  }),
  firstClearance: length({
    label: 'First clearance a side',
    min: 0.05,
    max: 0.5,
    step: 0.01,
    default: 0.1,
    group: 'steps',
    help: 'On the radius at crest and root, along the axis at the flanks.',
  }),
  clearanceStep: length({
    label: 'Step of the clearance',
    min: 0.02,
    max: 0.2,
    step: 0.01,
    default: 0.08,
    group: 'steps',
    help: 'What each further hole has more, on each side.',
  }),
  holes: count({
    label: 'Holes',
    min: 3,
    max: 8,
    default: 5,
    group: 'steps',
    help: 'The first should bind and the last should wobble.',
  }),
  ...markFields,
};

export type Values = ValuesOf<typeof fields>;

export const threadOf = (p: Values): ThreadBasics => threadBasics(p);
export const clearancesOf = (p: Values): number[] => ladder(p.firstClearance, p.clearanceStep, p.holes);
export const widest = (p: Values): number => clearancesOf(p).at(-1)!;

const holeDiameter = (p: Values): number => threadOf(p).internalMajor + 2 * widest(p);

/** From hole to hole along the row, mm. */
export const pitchOfHoles = (p: Values): number => holeDiameter(p) + p.wall;
export const plateLength = (p: Values): number => p.holes * pitchOfHoles(p) + p.wall;
export const columnAt = (p: Values, index: number): number => p.wall / 2 + (index + 0.5) * pitchOfHoles(p);

/** Front of the plate, where the figures are, and its back, mm from the row of axes. */
export const edgesOf = (p: Values): { front: number; back: number; figures: number } => {
  const hole = holeDiameter(p) / 2;
  const room = p.marks === 'none' ? 0 : p.markHeight + 2;
  return { front: -(hole + p.wall + room), back: hole + p.wall, figures: -(hole + 1 + (room + p.wall) / 2) };
};

const MIN_OVERLAP = 0.15;
const MIN_CREST = 0.05;
const MIN_GROOVE = 0.1;
const rootWidth = (p: Values): number => neckRidgeWidth(threadOf(p), threadOf(p).rootDiameter / 2);
const crestWidth = (p: Values): number => {
  const thread = threadOf(p);
  return capRidgeWidth(thread, widest(p), thread.minorDiameter / 2 + widest(p));
};
const MIN_TURNS = 0.75;
/** Chamfer at both mouths of a hole, mm. */
export const mouthChamfer = (p: Values): number => Math.min(1, p.pitch / 3);
const leastThickness = (p: Values): number =>
  2 * mouthChamfer(p) + p.pitch + (MIN_TURNS + 0.25) * p.pitch * p.starts;

export const parameters = defineParameters({
  fields,
  groups: { thread: 'Thread', plate: 'Plate and stud', steps: 'Steps', marks: 'Marks' },
  applies: { markHeight: (p) => p.marks !== 'none' },
  relations: [
    {
      id: 'ridge-in-pitch',
      field: 'pitch',
      severity: 'refuse',
      holds: (p) => p.pitch >= rootWidth(p) + MIN_GROOVE - 1e-9,
      message: (p) =>
        `Pitch must be at least ${leastMm(rootWidth(p) + MIN_GROOVE)}, ${MIN_GROOVE} mm more than the root of the ridge`,
    },
    {
      id: 'core-left',
      field: 'majorDiameter',
      severity: 'refuse',
      holds: (p) => threadOf(p).rootDiameter >= 3 && p.pitch * p.starts <= p.majorDiameter,
      message: (p) =>
        `Major diameter must leave a core of 3 mm and be at least ${(p.pitch * p.starts).toFixed(2)} mm, the travel of one turn`,
    },
    {
      id: 'threads-overlap',
      field: 'clearanceStep',
      severity: 'refuse',
      holds: (p) => widest(p) <= threadOf(p).engagement - MIN_OVERLAP + 1e-9,
      message: (p) =>
        `Step of the clearance takes the last hole to ${widest(p).toFixed(2)} mm; at most ${mostMm(threadOf(p).engagement - MIN_OVERLAP)} a side, or stud and hole hardly touch`,
    },
    {
      id: 'crest-left',
      field: 'clearanceStep',
      severity: 'refuse',
      holds: (p) => crestWidth(p) >= MIN_CREST - 1e-9,
      message: (p) =>
        `Step of the clearance leaves a crest of ${crestWidth(p).toFixed(2)} mm in the last hole; it needs at least ${MIN_CREST} mm`,
    },
    {
      id: 'turns-in-plate',
      field: 'plateThickness',
      severity: 'refuse',
      holds: (p) => p.plateThickness >= leastThickness(p) - 1e-9,
      message: (p) =>
        `Plate thickness must be at least ${leastMm(leastThickness(p))}, for three quarters of a turn between its chamfers`,
    },
    {
      id: 'figures-fit',
      field: 'markHeight',
      severity: 'refuse',
      holds: (p) => markWidth(gapMark(widest(p)), p) <= pitchOfHoles(p) + 1e-9,
      message: (p) =>
        `Height of the figures must be at most ${((p.markHeight * pitchOfHoles(p)) / markWidth(gapMark(widest(p)), p)).toFixed(1)} mm, or they run into each other`,
    },
    {
      id: 'under-figures',
      field: 'plateThickness',
      severity: 'refuse',
      holds: (p) => p.marks !== 'cut' || p.plateThickness >= LEAST_UNDER_MARK + 0.6,
      message: () =>
        `Plate thickness must be at least ${LEAST_UNDER_MARK + 0.6} mm under figures that are cut in`,
    },
    {
      id: 'printable-pitch',
      field: 'pitch',
      severity: 'warn',
      holds: (p) => p.pitch >= 1.5,
      message: () => 'Pitch under 1.5 mm prints poorly with a 0.4 mm nozzle; 2 mm and more is safe',
    },
  ],
});
