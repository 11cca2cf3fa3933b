import { angle, choice, count, defineParameters, length, type ValuesOf } from '../parameters';

const fields = {
  tubeDiameter: length({
    label: 'Pot diameter',
    min: 16,
    max: 120,
    step: 0.5,
    default: 50,
    group: 'pot',
    help: 'Outside of the pot, without the bead.',
  }),
  tubeWall: length({
    label: 'Pot wall',
    min: 0.8,
    max: 4,
    step: 0.1,
    default: 1.2,
    group: 'pot',
    help: 'A thin wall gives way itself and spares the lid.',
  }),
  potHeight: length({
    label: 'Pot height',
    min: 15,
    max: 150,
    step: 0.5,
    default: 45,
    group: 'pot',
    help: 'From the bed to the rim.',
  }),
  floor: length({
    label: 'Floor',
    min: 0.8,
    max: 6,
    step: 0.1,
    default: 1.6,
    group: 'pot',
    help: 'Thickness of the bottom of the pot.',
  }),
  undercut: length({
    label: 'Undercut',
    min: 0.05,
    max: 2,
    step: 0.05,
    default: 0.2,
    group: 'bead',
    help: 'How much the lid has to stretch over the bead, on the diameter.',
  }),
  fromRim: length({
    label: 'Bead below the rim',
    min: 2,
    max: 60,
    step: 0.5,
    default: 5,
    group: 'bead',
    help: 'From the rim to the middle of the bead. Near the rim the pot gives way most easily.',
  }),
  leadAngle: angle({
    label: 'Lead-in angle',
    min: 10,
    max: 60,
    step: 1,
    default: 30,
    group: 'bead',
    help: 'Of the upper flank of the bead to the axis: how hard the lid is to push on.',
  }),
  returnAngle: angle({
    label: 'Return angle',
    min: 20,
    max: 60,
    step: 1,
    default: 45,
    group: 'bead',
    help: 'Of the lower flank to the axis: how hard it is to pull off.',
  }),
  lidWall: length({
    label: 'Lid wall',
    min: 1,
    max: 5,
    step: 0.1,
    default: 1.6,
    group: 'lid',
    help: 'Of the skirt, without the groove.',
  }),
  lip: length({
    label: 'Lip below the groove',
    min: 0.8,
    max: 10,
    step: 0.1,
    default: 1.6,
    group: 'lid',
    help: 'What grips under the bead.',
  }),
  top: length({
    label: 'Lid top',
    min: 0.8,
    max: 6,
    step: 0.1,
    default: 1.6,
    group: 'lid',
    help: 'Thickness of the plate.',
  }),
  clearance: length({
    label: 'Clearance per side',
    min: 0.05,
    max: 0.6,
    step: 0.05,
    default: 0.2,
    group: 'lid',
    help: 'Gap between pot and lid, on the radius.',
  }),
  skirt: choice({
    label: 'Skirt',
    options: [
      { value: 'closed', label: 'Closed', help: 'A ring that stretches: stiff, keeps dust out.' },
      { value: 'slotted', label: 'Slotted', help: 'Fingers that bend: easy to open, lets air in.' },
    ],
    default: 'closed',
    group: 'lid',
    help: 'Slots turn the ring into cantilevers.',
  }),
  slots: count({
    label: 'Slots',
    min: 4,
    max: 36,
    default: 16,
    group: 'lid',
    help: 'Evenly round the skirt, from the mouth up to the plate.',
  }),
  slotWidth: length({
    label: 'Slot width',
    min: 0.6,
    max: 4,
    step: 0.1,
    default: 1,
    group: 'lid',
    help: 'Between two fingers.',
  }),
};

export type Values = ValuesOf<typeof fields>;

/** Flat of the bead's crest, mm. */
const CREST = 0.4;
const LEAST_GROOVE_WALL = 0.6;
const ABOVE_BEAD = 0.4;

const run = (p: Values, degrees: number): number => beadHeight(p) / Math.tan((degrees * Math.PI) / 180);

/** Height of the bead on the pot, mm: it bridges the gap and then stretches the lid. */
export const beadHeight = (p: Values): number => p.clearance + p.undercut / 2;

/** Heights of the bead's feet and crest over the bed, from below, mm. */
export function beadHeights(p: Values): readonly [number, number, number, number] {
  const middle = p.potHeight - p.fromRim;
  const [low, high] = [middle - CREST / 2, middle + CREST / 2];
  return [low - run(p, p.returnAngle), low, high, high + run(p, p.leadAngle)];
}

/** Height of the mouth of the lid over the bed, lid home, mm. */
export const mouthHeight = (p: Values): number => beadHeights(p)[0] - p.clearance - p.lip;

/** Length of the skirt from the mouth to the plate, mm. */
export const skirtLength = (p: Values): number => p.potHeight - mouthHeight(p);

export const lidBore = (p: Values): number => p.tubeDiameter / 2 + p.clearance;

const fingerArc = (p: Values): number => (2 * Math.PI * lidBore(p)) / p.slots - p.slotWidth;
const up = (value: number): string => (Math.ceil(value * 10 - 1e-6) / 10).toFixed(1);

const leastFromRim = (p: Values): number => CREST / 2 + run(p, p.leadAngle) + p.clearance + ABOVE_BEAD;
const leastLidWall = (p: Values): number => beadHeight(p) + LEAST_GROOVE_WALL;
const leastPot = (p: Values): number => skirtLength(p) + p.floor + 1;

export const parameters = defineParameters({
  fields,
  groups: { pot: 'Pot', bead: 'Bead', lid: 'Lid' },
  applies: { slots: (p) => p.skirt === 'slotted', slotWidth: (p) => p.skirt === 'slotted' },
  relations: [
    {
      id: 'bead-below-rim',
      field: 'fromRim',
      severity: 'refuse',
      holds: (p) => p.fromRim >= leastFromRim(p) - 1e-9,
      message: (p) => `Bead below the rim must be at least ${up(leastFromRim(p))} mm for this lead-in`,
    },
    {
      id: 'groove-in-wall',
      field: 'lidWall',
      severity: 'refuse',
      holds: (p) => p.lidWall >= leastLidWall(p) - 1e-9,
      message: (p) =>
        `Lid wall must be at least ${up(leastLidWall(p))} mm, which leaves ${LEAST_GROOVE_WALL} mm behind the groove`,
    },
    {
      id: 'lid-over-bed',
      field: 'potHeight',
      severity: 'refuse',
      holds: (p) => p.potHeight >= leastPot(p) - 1e-9,
      message: (p) => `Pot height must be at least ${up(leastPot(p))} mm, 1 mm more than floor and skirt`,
    },
    {
      id: 'fingers-left',
      field: 'slots',
      severity: 'refuse',
      holds: (p) => p.skirt === 'closed' || fingerArc(p) >= 2,
      message: (p) =>
        `Slots must be at most ${Math.floor((2 * Math.PI * lidBore(p)) / (p.slotWidth + 2))} of ${p.slotWidth} mm, which leaves fingers of 2 mm`,
    },
    {
      id: 'undercut-small',
      field: 'undercut',
      severity: 'warn',
      holds: (p) => p.undercut >= 0.2,
      message: () => 'Undercut under 0.2 mm is lost in the scatter of printed rings',
    },
  ],
});
