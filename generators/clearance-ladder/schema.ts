import { gapMark, LEAST_UNDER_MARK, ladder, markFields, markRoom, markWidth } from '../coupon';
import { count, defineParameters, length, type ValuesOf } from '../parameters';

const fields = {
  pinDiameter: length({
    label: 'Pin diameter',
    min: 4,
    max: 30,
    step: 0.5,
    default: 8,
    group: 'pair',
    help: 'Also the width of the tongue, which is half as thick. Small holes print tighter than large ones: take the size of your part.',
  }),
  depth: length({
    label: 'Depth of the holes',
    min: 3,
    max: 25,
    step: 0.5,
    default: 6,
    group: 'pair',
    help: 'Thickness of the plate. Deep holes rub more.',
  }),
  wall: length({
    label: 'Wall between holes',
    min: 1.2,
    max: 10,
    step: 0.2,
    default: 3,
    group: 'pair',
    help: 'At the widest hole, and round the edge.',
  }),
  gripHeight: length({
    label: 'Grip height',
    min: 3,
    max: 25,
    step: 0.5,
    default: 8,
    group: 'pair',
    help: 'Heads of pin and tongue, to hold them by.',
  }),
  firstGap: length({
    label: 'First gap a side',
    min: 0.02,
    max: 0.5,
    step: 0.01,
    default: 0.05,
    group: 'steps',
    help: 'Between pin and hole, on each side.',
  }),
  gapStep: length({
    label: 'Step of the gap',
    min: 0.02,
    max: 0.2,
    step: 0.01,
    default: 0.05,
    group: 'steps',
    help: 'What each further hole has more, on each side.',
  }),
  holes: count({
    label: 'Holes of each shape',
    min: 3,
    max: 12,
    default: 8,
    group: 'steps',
    help: 'The first should bind and the last should rattle.',
  }),
  ...markFields,
};

export type Values = ValuesOf<typeof fields>;

/** Gap a side of each hole, mm. */
export const gapsOf = (p: Values): number[] => ladder(p.firstGap, p.gapStep, p.holes);
export const widestGap = (p: Values): number => gapsOf(p).at(-1)!;

export const tongueThickness = (p: Values): number => p.pinDiameter / 2;
/** From hole to hole along the row, mm. */
export const pitchOf = (p: Values): number => p.pinDiameter + 2 * widestGap(p) + p.wall;
export const plateLength = (p: Values): number => p.holes * pitchOf(p) + p.wall;

export const parameters = defineParameters({
  fields,
  groups: { pair: 'Pin and holes', steps: 'Steps', marks: 'Marks' },
  applies: { markHeight: (p) => p.marks !== 'none' },
  relations: [
    {
      id: 'widest',
      field: 'gapStep',
      severity: 'refuse',
      holds: (p) => widestGap(p) <= p.pinDiameter / 4 + 1e-9,
      message: (p) =>
        `Step of the gap takes the last hole to ${widestGap(p).toFixed(2)} mm a side; at most ${(p.pinDiameter / 4).toFixed(2)} mm, a quarter of the pin`,
    },
    {
      id: 'plate-on-bed',
      field: 'holes',
      severity: 'warn',
      holds: (p) => plateLength(p) <= 180,
      message: (p) => `The plate is ${plateLength(p).toFixed(0)} mm long; most beds hold 180 mm`,
    },
    {
      id: 'figures-fit',
      field: 'markHeight',
      severity: 'refuse',
      holds: (p) => markWidth(gapMark(widestGap(p)), p) <= pitchOf(p) + 1e-9,
      message: (p) =>
        `Height of the figures must be at most ${((p.markHeight * pitchOf(p)) / markWidth(gapMark(widestGap(p)), p)).toFixed(1)} mm, or they run into each other`,
    },
    {
      id: 'under-figures',
      field: 'depth',
      severity: 'refuse',
      holds: (p) => p.marks !== 'cut' || p.depth >= LEAST_UNDER_MARK + 0.6,
      message: () =>
        `Depth of the holes must be at least ${LEAST_UNDER_MARK + 0.6} mm under figures that are cut in`,
    },
  ],
});

/** Middle of the round holes and of the slots across the row, mm from the middle of the figures. */
export const rowsOf = (p: Values): { round: number; flat: number; front: number; back: number } => {
  const half = (markRoom(p) + p.wall) / 2 + p.wall / 2;
  const round = half + p.pinDiameter / 2 + widestGap(p);
  const flat = -(half + tongueThickness(p) / 2 + widestGap(p));
  return {
    round,
    flat,
    front: flat - tongueThickness(p) / 2 - widestGap(p) - p.wall,
    back: round + p.pinDiameter / 2 + widestGap(p) + p.wall,
  };
};

/** Middle of a hole along the row, mm. */
export const columnAt = (p: Values, index: number): number => p.wall / 2 + (index + 0.5) * pitchOf(p);
