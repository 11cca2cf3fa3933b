import { angle, choice, count, defineParameters, length, type ValuesOf } from '../parameters';

const fields = {
  boreDiameter: length({
    label: 'Bore diameter',
    min: 6,
    max: 120,
    step: 0.1,
    default: 24,
    group: 'bore',
    help: 'Of the hole to be stopped, measured.',
  }),
  interference: length({
    label: 'Squeeze of the ribs',
    min: 0.05,
    max: 4,
    step: 0.05,
    default: 0.3,
    group: 'bore',
    help: 'How much the ribs are larger than the bore, on the diameter. Strain grows in proportion to it.',
  }),
  kind: choice({
    label: 'Body',
    options: [
      { value: 'solid', label: 'Solid', help: 'Presses hardest; for soft plastics.' },
      { value: 'hollow', label: 'Hollow', help: 'A wall that gives; for stiff plastics.' },
    ],
    default: 'hollow',
    group: 'body',
    help: 'A hollow plug is open at its narrow end and gives more easily.',
  }),
  wallThickness: length({
    label: 'Wall thickness',
    min: 0.8,
    max: 10,
    step: 0.1,
    default: 1.2,
    group: 'body',
    help: 'Of the hollow body between the ribs.',
  }),
  plugLength: length({
    label: 'Plug length',
    min: 6,
    max: 80,
    step: 0.5,
    default: 20,
    group: 'body',
    help: 'From the flange to the narrow end.',
  }),
  taperAngle: angle({
    label: 'Taper',
    min: 0,
    max: 6,
    step: 0.5,
    default: 1,
    group: 'body',
    help: 'Of the body to its axis, each side. The ribs all reach the same diameter.',
  }),
  bodyPlay: length({
    label: 'Body play',
    min: 0.2,
    max: 4,
    step: 0.1,
    default: 1,
    group: 'body',
    help: 'How much the body is smaller than the bore at the flange, on the diameter.',
  }),
  ribCount: count({
    label: 'Ribs',
    min: 1,
    max: 6,
    default: 3,
    group: 'ribs',
    help: 'Each is a seal of its own; two or three forgive a scratch.',
  }),
  ribWidth: length({
    label: 'Rib width',
    min: 0.4,
    max: 5,
    step: 0.1,
    default: 0.8,
    group: 'ribs',
    help: 'Flat of a rib that touches the bore.',
  }),
  ribPitch: length({
    label: 'Rib spacing',
    min: 1.5,
    max: 20,
    step: 0.1,
    default: 5,
    group: 'ribs',
    help: 'From one rib to the next.',
  }),
  leadAngle: angle({
    label: 'Lead-in angle',
    min: 15,
    max: 60,
    step: 1,
    default: 30,
    group: 'ribs',
    help: 'Of the front of each rib to the axis. Steeper needs more force to push in.',
  }),
  flangeOverhang: length({
    label: 'Flange overhang',
    min: 1,
    max: 20,
    step: 0.5,
    default: 3,
    group: 'flange',
    help: 'How far the flange stands out past the bore all round: the stop, and the grip for pulling.',
  }),
  flangeThickness: length({
    label: 'Flange thickness',
    min: 1,
    max: 12,
    step: 0.2,
    default: 3,
    group: 'flange',
    help: 'Also the floor of a hollow plug.',
  }),
};

export type Values = ValuesOf<typeof fields>;

/** Radius of the ribs at rest, mm. */
export const ribRadius = (p: Values): number => (p.boreDiameter + p.interference) / 2;

/** Radius of the body at a height above the flange, mm. */
export const bodyRadius = (p: Values, height: number): number =>
  (p.boreDiameter - p.bodyPlay) / 2 - height * Math.tan((p.taperAngle * Math.PI) / 180);

/** Radius of the cavity at a height above the flange, mm; 0 for a solid plug. */
export const cavityRadius = (p: Values, height: number): number =>
  p.kind === 'solid' ? 0 : bodyRadius(p, height) - p.wallThickness;

/** Free body between the flange, the ribs and the end, mm. */
const SPARE = 0.4;

/** Greatest rib height over the body, mm. */
const deepest = (p: Values): number => ribRadius(p) - bodyRadius(p, p.plugLength);

const leadRun = (p: Values): number => deepest(p) / Math.tan((p.leadAngle * Math.PI) / 180);

/** Heights above the flange where the flats of the ribs begin, mm. */
export const ribStarts = (p: Values): number[] =>
  Array.from({ length: p.ribCount }, (_, i) => ribRadius(p) - bodyRadius(p, 0) + SPARE + i * p.ribPitch);

const leastPitch = (p: Values): number => p.ribWidth + deepest(p) + leadRun(p) + SPARE;
const leastLength = (p: Values): number => ribStarts(p).at(-1)! + p.ribWidth + leadRun(p) + SPARE;
const up = (value: number): string => (Math.ceil(value * 10 - 1e-6) / 10).toFixed(1);
const down = (value: number): string => Math.max(0, Math.floor(value * 10 + 1e-6) / 10).toFixed(1);

const LEAST_TIP = 1;

export const parameters = defineParameters({
  fields,
  groups: { bore: 'Bore', body: 'Body', ribs: 'Sealing ribs', flange: 'Flange' },
  applies: { wallThickness: (p) => p.kind === 'hollow' },
  relations: [
    {
      id: 'tip-left',
      field: 'plugLength',
      severity: 'refuse',
      holds: (p) => bodyRadius(p, p.plugLength) >= LEAST_TIP,
      message: (p) =>
        `Plug length of ${p.plugLength} mm at a taper of ${p.taperAngle}° leaves a narrow end under ${2 * LEAST_TIP} mm across`,
    },
    {
      id: 'cavity-open',
      field: 'wallThickness',
      severity: 'refuse',
      holds: (p) => p.kind === 'solid' || cavityRadius(p, p.plugLength) >= 0.8,
      message: (p) =>
        `Wall thickness must be at most ${down(bodyRadius(p, p.plugLength) - 0.8)} mm, so that the cavity stays 1.6 mm wide at the narrow end`,
    },
    {
      id: 'ribs-apart',
      field: 'ribPitch',
      severity: 'refuse',
      holds: (p) => p.ribCount === 1 || p.ribPitch >= leastPitch(p) - 1e-9,
      message: (p) =>
        `Rib spacing must be at least ${up(leastPitch(p))} mm for ribs of this height and lead-in`,
    },
    {
      id: 'ribs-on-plug',
      field: 'plugLength',
      severity: 'refuse',
      holds: (p) => p.plugLength >= leastLength(p) - 1e-9,
      message: (p) => `Plug length must be at least ${up(leastLength(p))} mm to bear ${p.ribCount} ribs`,
    },
    {
      id: 'flange-past-ribs',
      field: 'flangeOverhang',
      severity: 'refuse',
      holds: (p) => p.flangeOverhang >= p.interference / 2 + 0.5 - 1e-9,
      message: (p) =>
        `Flange overhang must be at least ${up(p.interference / 2 + 0.5)} mm, half a millimetre past the ribs`,
    },
    {
      id: 'squeeze-small',
      field: 'interference',
      severity: 'warn',
      holds: (p) => p.interference >= 0.2,
      message: () => 'Squeeze of the ribs under 0.2 mm is lost in the scatter of a printed bore',
    },
    {
      id: 'floor-stiff',
      field: 'flangeThickness',
      severity: 'warn',
      holds: (p) => p.flangeThickness >= 0.05 * p.boreDiameter,
      message: (p) =>
        `Flange thickness under ${(0.05 * p.boreDiameter).toFixed(1)} mm, a twentieth of the bore, bends when pushed on`,
    },
  ],
});
