import { jointOf } from '@/lib/mechanics/screw-sizes';
import { choice, count, defineParameters, length, number, type ValuesOf } from '../parameters';
import { leastMm, mostMm, plugRelations, threadRelations } from '../screw-relations';

const fields = {
  profile: choice({
    label: 'Thread profile',
    options: [
      {
        value: 'printed',
        label: 'Printed, 45° lower flank',
        help: 'Shallow and truncated; hangs one layer a layer, so it prints clean standing up.',
      },
      { value: 'iso-metric', label: 'ISO metric, 60°', help: 'Meets bought screws and nuts.' },
      {
        value: 'trapezoidal',
        label: 'Trapezoidal, 30°',
        help: 'Strong root; its flat flanks hang far over when printed standing.',
      },
      { value: 'knuckle', label: 'Knuckle (round)', help: 'Round crests and roots shed dust and grit.' },
    ],
    default: 'printed',
    group: 'thread',
    help: 'Section of the ridge.',
  }),
  majorDiameter: length({
    label: 'Major diameter',
    min: 6,
    max: 110,
    step: 0.5,
    default: 32,
    group: 'thread',
    help: 'Over the ridges of the neck. The neck keeps this size; the cap takes all the clearance.',
  }),
  pitch: length({
    label: 'Pitch',
    min: 1,
    max: 10,
    step: 0.25,
    default: 4,
    group: 'thread',
    help: 'From one ridge to the next along the axis. Under 1.5 mm little is left of a printed ridge.',
  }),
  starts: count({
    label: 'Starts',
    min: 1,
    max: 4,
    default: 1,
    group: 'thread',
    help: 'Ridges side by side. Two starts close in half the turns, but let go sooner.',
  }),
  turns: number({
    label: 'Turns of thread',
    unit: 'turns',
    min: 0.5,
    max: 6,
    step: 0.25,
    default: 1.25,
    group: 'thread',
    help: 'Length of each ridge on the neck, counted between its points of half height.',
  }),
  clearance: length({
    label: 'Clearance per side',
    min: 0.05,
    max: 0.6,
    step: 0.01,
    default: 0.2,
    group: 'thread',
    help: 'Gap between the threads, on the radius at crest and root and along the axis at each flank.',
  }),
  neckHeight: length({
    label: 'Neck height',
    min: 4,
    max: 80,
    step: 0.1,
    default: 14,
    group: 'neck',
    help: 'From the flange to the rim.',
  }),
  bore: length({
    label: 'Bore',
    min: 1,
    max: 105,
    step: 0.5,
    default: 23,
    group: 'neck',
    help: 'Clear opening through the neck.',
  }),
  flangeWidth: length({
    label: 'Flange width',
    min: 2,
    max: 40,
    step: 0.5,
    default: 7,
    group: 'neck',
    help: 'How far the flange stands out past the core of the neck, for glue or screws.',
  }),
  flangeThickness: length({
    label: 'Flange thickness',
    min: 0.8,
    max: 12,
    step: 0.1,
    default: 2.4,
    group: 'neck',
    help: 'Plate under the neck.',
  }),
  wall: length({
    label: 'Cap wall',
    min: 1.2,
    max: 8,
    step: 0.1,
    default: 2,
    group: 'cap',
    help: 'Outside the thread root, without the grip. It keeps the thread from spreading the cap.',
  }),
  capHeight: length({
    label: 'Cap height',
    min: 4,
    max: 90,
    step: 0.1,
    default: 15.6,
    group: 'cap',
    help: 'Overall. A short skirt carries fewer turns of thread than the neck.',
  }),
  topThickness: length({
    label: 'Top thickness',
    min: 0.8,
    max: 10,
    step: 0.1,
    default: 2.4,
    group: 'cap',
    help: 'Plate over the opening.',
  }),
  grip: choice({
    label: 'Grip',
    options: [
      { value: 'ribs', label: 'Ribs' },
      { value: 'knurl', label: 'Straight knurl' },
      { value: 'plain', label: 'Plain' },
    ],
    default: 'ribs',
    group: 'cap',
    help: 'Outside of the cap.',
  }),
  seal: choice({
    label: 'Seal',
    options: [
      { value: 'land', label: 'Land', help: 'A raised ring presses on the rim, or on a disc laid in.' },
      { value: 'plug', label: 'Plug', help: 'A ring larger than the bore is pressed into it.' },
      { value: 'none', label: 'None', help: 'The top of the cap stops on the rim.' },
    ],
    default: 'land',
    group: 'seal',
    help: 'What closes the gap between cap and rim.',
  }),
  plugInterference: length({
    label: 'Plug interference',
    min: 0,
    max: 1.2,
    step: 0.02,
    default: 0.2,
    group: 'seal',
    help: 'How much larger the plug is than the bore, on the diameter.',
  }),
  plugLength: length({
    label: 'Plug length',
    min: 1,
    max: 15,
    step: 0.1,
    default: 3,
    group: 'seal',
    help: 'How far the plug reaches into the bore.',
  }),
  plugWall: length({
    label: 'Plug wall',
    min: 0.8,
    max: 6,
    step: 0.1,
    default: 1.2,
    group: 'seal',
    help: 'A thin plug gives way itself, a thick one stretches the neck.',
  }),
  layerHeight: length({
    label: 'Layer height',
    min: 0.05,
    max: 0.4,
    step: 0.01,
    default: 0.2,
    group: 'print',
    help: 'Decides how far a flank steps out from one layer to the next.',
  }),
};

export type Values = ValuesOf<typeof fields>;

const MIN_NECK_WALL = 1.2;
const MIN_TURNS = 0.5;

export const parameters = defineParameters({
  fields,
  groups: { thread: 'Thread', neck: 'Neck', cap: 'Cap', seal: 'Seal', print: 'Print' },
  applies: {
    plugInterference: (p) => p.seal === 'plug',
    plugLength: (p) => p.seal === 'plug',
    plugWall: (p) => p.seal === 'plug',
  },
  relations: [
    ...threadRelations<Values>((p) => p, {
      pitch: 'pitch',
      clearance: 'clearance',
      halves: 'neck and cap',
      cap: 'cap',
    }),
    ...plugRelations<Values>((p) => p, {
      length: 'plugLength',
      interference: 'plugInterference',
      cap: 'cap',
    }),
    {
      id: 'bore-in-core',
      field: 'bore',
      severity: 'refuse',
      holds: (p) => jointOf(p).neckWall >= MIN_NECK_WALL - 1e-9,
      message: (p) =>
        `Bore must be at most ${mostMm(jointOf(p).thread.rootDiameter - 2 * MIN_NECK_WALL)}, which leaves ${MIN_NECK_WALL} mm of wall under the thread`,
    },
    {
      id: 'thread-on-neck',
      field: 'neckHeight',
      severity: 'refuse',
      holds: (p) => p.neckHeight >= jointOf(p).neckHeightNeeded - 1e-9,
      message: (p) =>
        `Neck height must be at least ${leastMm(jointOf(p).neckHeightNeeded)} for ${p.turns} turns of lead ${p.pitch * p.starts} mm`,
    },
    {
      id: 'cap-reaches-rim',
      field: 'capHeight',
      severity: 'refuse',
      holds: (p) => jointOf(p).capMouth >= 0.3 - 1e-9,
      message: (p) =>
        `Cap height must be at most ${mostMm(jointOf(p).capTop - 0.3)}, or the mouth meets the flange before the top meets the rim`,
    },
    {
      id: 'cap-has-thread',
      field: 'capHeight',
      severity: 'refuse',
      holds: (p) => jointOf(p).engagedTurns >= MIN_TURNS - 1e-9,
      message: (p) => {
        const { capHeightNeeded, thread } = jointOf(p);
        return `Cap height must be at least ${leastMm(capHeightNeeded - (p.turns - MIN_TURNS) * thread.lead)}, or its skirt carries less than half a turn of thread`;
      },
    },
    {
      id: 'full-skirt',
      field: 'capHeight',
      severity: 'warn',
      holds: (p) => jointOf(p).capFrom <= 1e-9,
      message: (p) =>
        `Cap height under ${leastMm(jointOf(p).capHeightNeeded)} cuts the cap's thread short of the neck's ${p.turns} turns`,
    },
  ],
});
