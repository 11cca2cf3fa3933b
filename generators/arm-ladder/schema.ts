import { ladder, markFields, markRoom, markWidth } from '../coupon';
import { count, defineParameters, length, number, type ValuesOf } from '../parameters';
import { stopsOf } from './stops';

const fields = {
  armLength: length({
    label: 'Arm length',
    min: 10,
    max: 80,
    step: 0.5,
    default: 25,
    group: 'arm',
    help: 'From the base to the tip. Long arms bend far and are easy to read.',
  }),
  armThickness: length({
    label: 'Arm thickness',
    min: 0.8,
    max: 5,
    step: 0.1,
    default: 2,
    group: 'arm',
    help: 'In the direction of bending. Take that of the part you want to know about.',
  }),
  armWidth: length({
    label: 'Arm width',
    min: 2,
    max: 20,
    step: 0.5,
    default: 6,
    group: 'arm',
    help: 'Square to the bending; lying flat it is the height of the print.',
  }),
  rootFillet: length({
    label: 'Root fillet',
    min: 0.2,
    max: 4,
    step: 0.1,
    default: 0.8,
    group: 'arm',
    help: 'Rounding where the arm leaves the base; the strain peaks there.',
  }),
  firstStrain: number({
    label: 'First strain',
    unit: 'strain',
    min: 0.002,
    max: 0.1,
    step: 0.001,
    default: 0.01,
    group: 'steps',
    help: 'Peak strain of the first arm when it is pushed to its stop.',
  }),
  strainStep: number({
    label: 'Step of strain',
    unit: 'strain',
    min: 0.001,
    max: 0.05,
    step: 0.001,
    default: 0.01,
    group: 'steps',
    help: 'What each further arm is strained more.',
  }),
  arms: count({
    label: 'Arms',
    min: 2,
    max: 10,
    default: 5,
    group: 'steps',
    help: 'The first should hold and the last should break or stay bent.',
  }),
  ...markFields,
};

export type Values = ValuesOf<typeof fields>;

/** Peak strain of each arm at its stop. */
export const strainsOf = (p: Values): number[] => ladder(p.firstStrain, p.strainStep, p.arms);

export const markOf = (strain: number): string => String(Number((100 * strain).toFixed(1)));

/** Finger's room before an arm, and width of its stop, mm. */
export const FINGER = 7;
export const postWidth = (p: Values): number => Math.max(4, 2.5 * p.armThickness);
/** Depth of the base: deep against an arm, and room for the figures. */
export const baseDepth = (p: Values): number => Math.max(3 * p.armThickness, markRoom(p) + 4);

const LEAST_GAP = 0.4;
const MOST_SHARE = 0.5;
const percent = (strain: number): string => `${markOf(strain)} %`;
const longest = (p: Values): string =>
  strainsOf(p)
    .map(markOf)
    .reduce((a, b) => (b.length > a.length ? b : a));
const cell = (p: Values): number => FINGER + p.armThickness + (stopsOf(p)[0] ?? 0) + postWidth(p);

export const parameters = defineParameters({
  fields,
  groups: { arm: 'Arm', steps: 'Steps', marks: 'Marks' },
  applies: { markHeight: (p) => p.marks !== 'none' },
  relations: [
    {
      id: 'slender',
      field: 'armLength',
      severity: 'refuse',
      holds: (p) => p.armLength >= 5 * p.armThickness - 1e-9,
      message: (p) =>
        `Arm length must be at least ${(5 * p.armThickness).toFixed(1)} mm, 5 times its thickness`,
    },
    {
      id: 'fillet-on-arm',
      field: 'rootFillet',
      severity: 'refuse',
      holds: (p) => p.rootFillet <= p.armThickness + 1e-9 && p.rootFillet >= 0.1 * p.armThickness - 1e-9,
      message: (p) =>
        `Root fillet must be between ${(0.1 * p.armThickness).toFixed(1)} and ${p.armThickness.toFixed(1)} mm, a tenth of the arm thickness and all of it`,
    },
    {
      id: 'reaches-last',
      field: 'strainStep',
      severity: 'refuse',
      holds: (p) => stopsOf(p).every((stop) => stop !== null && stop <= MOST_SHARE * p.armLength),
      message: (p) =>
        `Step of strain takes the last arm to ${percent(strainsOf(p).at(-1)!)}, further than ${(MOST_SHARE * p.armLength).toFixed(1)} mm, half its length: make it smaller or the arm thicker`,
    },
    {
      id: 'first-gap',
      field: 'firstStrain',
      severity: 'refuse',
      holds: (p) => (stopsOf(p)[0] ?? 1) >= Math.max(LEAST_GAP, p.rootFillet + 0.1),
      message: (p) =>
        `First strain leaves the arm less than ${Math.max(LEAST_GAP, p.rootFillet + 0.1).toFixed(1)} mm to its stop, which root fillet and print need: make it larger or the arm longer`,
    },
    {
      id: 'figures-fit',
      field: 'markHeight',
      severity: 'refuse',
      holds: (p) => markWidth(longest(p), p) <= cell(p),
      message: (p) =>
        `Height of the figures must be at most ${((p.markHeight * cell(p)) / markWidth(longest(p), p)).toFixed(1)} mm, or they run into each other`,
    },
    {
      id: 'under-figures',
      field: 'armWidth',
      severity: 'refuse',
      holds: (p) => p.marks !== 'cut' || p.armWidth >= 2,
      message: () => 'Arm width must be at least 2 mm for figures that are cut in',
    },
  ],
});
