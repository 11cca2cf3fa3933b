import { capRidgeWidth } from '@/lib/mechanics/thread';
import { type ThreadJoint, threadJoint } from '@/lib/mechanics/thread-joint';
import { choice, count, defineParameters, length, number, type ValuesOf } from '../parameters';

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

const joints = new WeakMap<Values, ThreadJoint>();

/** The joint of these values; relations, check and shape ask for it again and again, so it is kept with them. */
export function jointOf(p: Values): ThreadJoint {
  const known = joints.get(p);
  if (known) return known;
  const joint = threadJoint(p);
  joints.set(p, joint);
  return joint;
}

/** Inner diameter of the ring plug, mm; 0 where so little would be left open that it is made solid. */
export function plugInner(p: Values): number {
  const inner = p.bore + p.plugInterference - 2 * p.plugWall;
  return inner < 1 ? 0 : inner;
}

/** 45 degree chamfers of a plug seal, mm: at the mouth of the bore, at the tip of the plug. */
export function plugChamfers(p: Values): { readonly bore: number; readonly tip: number } {
  const plugWall = (p.bore + p.plugInterference - plugInner(p)) / 2;
  return {
    bore: Math.min(jointOf(p).neckWall / 3, p.plugInterference / 2 + 0.2),
    tip: Math.min(0.4, plugWall / 2),
  };
}

/** Length over which a plug touches the bore, mm. */
export function plugContact(p: Values): number {
  const { bore, tip } = plugChamfers(p);
  return Math.max(0, p.plugLength - bore - tip);
}

/** Radial overlap left between the threads, mm. */
export const overlap = (p: Values): number => jointOf(p).thread.engagement - p.clearance;

/** Longest plug that ends inside the skirt, mm. */
const plugRoom = (p: Values): number => p.neckHeight - jointOf(p).capMouth - 0.2;

const MIN_NECK_WALL = 1.2;
const MIN_OVERLAP = 0.15;
const MIN_CREST = 0.05;
const MIN_GROOVE = 0.1;
const MIN_TURNS = 0.5;

/** Axial width of the cap ridge's crest, mm. */
function crestWidth(p: Values): number {
  const { thread, cap } = jointOf(p);
  if (p.profile === 'knuckle') return thread.pitch / 4 - p.clearance;
  return capRidgeWidth(thread, p.clearance, cap.minorDiameter / 2);
}

/** Axial width of a ridge of the neck at its root, mm. */
function rootWidth(p: Values): number {
  const { neckForm } = jointOf(p);
  return neckForm.at(-1)![1] - neckForm[0]![1];
}

const mm = (value: number): string => `${(Math.ceil(value * 100 - 1e-6) / 100).toFixed(2)} mm`;
const mmDown = (value: number): string => `${(Math.floor(value * 100 + 1e-6) / 100).toFixed(2)} mm`;

export const parameters = defineParameters({
  fields,
  groups: { thread: 'Thread', neck: 'Neck', cap: 'Cap', seal: 'Seal', print: 'Print' },
  applies: {
    plugInterference: (p) => p.seal === 'plug',
    plugLength: (p) => p.seal === 'plug',
    plugWall: (p) => p.seal === 'plug',
  },
  relations: [
    {
      id: 'bore-in-core',
      field: 'bore',
      severity: 'refuse',
      holds: (p) => jointOf(p).neckWall >= MIN_NECK_WALL - 1e-9,
      message: (p) =>
        `Bore must be at most ${mmDown(jointOf(p).thread.rootDiameter - 2 * MIN_NECK_WALL)}, which leaves ${MIN_NECK_WALL} mm of wall under the thread`,
    },
    {
      id: 'ridge-in-pitch',
      field: 'pitch',
      severity: 'refuse',
      holds: (p) => p.pitch >= rootWidth(p) + MIN_GROOVE - 1e-9,
      message: (p) =>
        `Pitch must be at least ${mm(rootWidth(p) + MIN_GROOVE)}, ${MIN_GROOVE} mm more than the root of the ridge, or its turns run together`,
    },
    {
      id: 'threads-overlap',
      field: 'clearance',
      severity: 'refuse',
      holds: (p) => overlap(p) >= MIN_OVERLAP - 1e-9,
      message: (p) =>
        `Clearance must be at most ${mmDown(jointOf(p).thread.engagement - MIN_OVERLAP)} for a pitch of ${p.pitch} mm, or neck and cap hardly touch`,
    },
    {
      id: 'crest-left',
      field: 'clearance',
      severity: 'refuse',
      holds: (p) => crestWidth(p) >= MIN_CREST - 1e-9,
      message: (p) =>
        `Clearance of ${p.clearance} mm leaves a crest of ${crestWidth(p).toFixed(2)} mm on the cap's thread; it needs at least ${MIN_CREST} mm`,
    },
    {
      id: 'thread-on-neck',
      field: 'neckHeight',
      severity: 'refuse',
      holds: (p) => p.neckHeight >= jointOf(p).neckHeightNeeded - 1e-9,
      message: (p) =>
        `Neck height must be at least ${mm(jointOf(p).neckHeightNeeded)} for ${p.turns} turns of lead ${p.pitch * p.starts} mm`,
    },
    {
      id: 'cap-reaches-rim',
      field: 'capHeight',
      severity: 'refuse',
      holds: (p) => jointOf(p).capMouth >= 0.3 - 1e-9,
      message: (p) =>
        `Cap height must be at most ${mmDown(jointOf(p).capTop - 0.3)}, or the mouth meets the flange before the top meets the rim`,
    },
    {
      id: 'cap-has-thread',
      field: 'capHeight',
      severity: 'refuse',
      holds: (p) => jointOf(p).engagedTurns >= MIN_TURNS - 1e-9,
      message: (p) => {
        const { capHeightNeeded, thread } = jointOf(p);
        return `Cap height must be at least ${mm(capHeightNeeded - (p.turns - MIN_TURNS) * thread.lead)}, or its skirt carries less than half a turn of thread`;
      },
    },
    {
      id: 'plug-in-cap',
      field: 'plugLength',
      severity: 'refuse',
      holds: (p) => p.seal !== 'plug' || p.plugLength <= plugRoom(p) + 1e-9,
      message: (p) =>
        `Plug length must be at most ${mmDown(plugRoom(p))}, so that it ends inside the skirt of the cap`,
    },
    {
      id: 'plug-interference-small',
      field: 'plugInterference',
      severity: 'refuse',
      holds: (p) => p.seal !== 'plug' || p.plugInterference <= 0.1 * p.bore,
      message: (p) => `Plug interference must be at most ${mmDown(0.1 * p.bore)}, a tenth of the bore`,
    },
    {
      id: 'full-skirt',
      field: 'capHeight',
      severity: 'warn',
      holds: (p) => jointOf(p).capFrom <= 1e-9,
      message: (p) =>
        `Cap height under ${mm(jointOf(p).capHeightNeeded)} cuts the cap's thread short of the neck's ${p.turns} turns`,
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
