import { choice, count, defineParameters, length, number, type ValuesOf } from '../parameters';

const fields = {
  leafLength: length({
    label: 'Leaf length',
    min: 8,
    max: 120,
    step: 0.5,
    default: 22,
    group: 'leaf',
    help: 'From the axis of the pin to the outer edge of one leaf.',
  }),
  hingeWidth: length({
    label: 'Width along the pin',
    min: 10,
    max: 250,
    step: 1,
    default: 40,
    group: 'leaf',
    help: 'Length of the whole hinge. A wide hinge wobbles less.',
  }),
  leafThickness: length({
    label: 'Leaf thickness',
    min: 1,
    max: 8,
    step: 0.1,
    default: 2.4,
    group: 'leaf',
    help: 'At most half the barrel, so that the leaves can be folded face to face.',
  }),
  barrelDiameter: length({
    label: 'Barrel diameter',
    min: 5,
    max: 24,
    step: 0.1,
    default: 8,
    group: 'barrel',
    help: 'Outside of the knuckles.',
  }),
  pinDiameter: length({
    label: 'Pin diameter',
    min: 2,
    max: 16,
    step: 0.1,
    default: 4,
    group: 'barrel',
    help: 'The pin is printed in one with the outer knuckles. Thinner than 3 mm rarely prints well.',
  }),
  knuckles: count({
    label: 'Knuckles',
    min: 3,
    max: 21,
    default: 5,
    group: 'barrel',
    help: 'An odd number: the outer ones carry the pin. More knuckles share the load and wobble less.',
  }),
  gap: length({
    label: 'Gap',
    min: 0.1,
    max: 1,
    step: 0.05,
    default: 0.3,
    group: 'fit',
    help: 'Between pin and bore, between knuckles, and round every moving edge.',
  }),
  fit: choice({
    label: 'Fit wanted',
    options: [
      { value: 'slip', label: 'Slip', help: 'Turns with little play; has to be broken loose once.' },
      { value: 'free', label: 'Free', help: 'Turns by itself; rattles.' },
    ],
    default: 'slip',
    group: 'fit',
    help: 'The gap is judged against the table of clearances for this fit and plastic.',
  }),
  stop: choice({
    label: 'Opening stop',
    options: [
      { value: 'flat', label: 'Just past flat', help: 'A lip under the other leaf holds it nearly flat.' },
      { value: 'none', label: 'None', help: 'Opens until the backs of the leaves meet.' },
    ],
    default: 'none',
    group: 'fit',
    help: 'It prints lying open, so it cannot stop before it is flat.',
  }),
  lipLength: length({
    label: 'Lip',
    min: 0.8,
    max: 8,
    step: 0.1,
    default: 2,
    group: 'fit',
    help: 'How far the stop reaches under the other leaf.',
  }),
  holeDiameter: length({
    label: 'Hole diameter',
    min: 1,
    max: 12,
    step: 0.1,
    default: 3.2,
    group: 'holes',
    help: 'Through holes for screws.',
  }),
  holeCount: count({
    label: 'Holes in each leaf',
    min: 0,
    max: 20,
    default: 2,
    group: 'holes',
    help: 'Evenly spaced along the middle of each leaf. 0 for none.',
  }),
  pull: number({
    label: 'Pull to carry',
    unit: 'N',
    min: 0,
    max: 1000,
    step: 1,
    default: 20,
    group: 'load',
    help: 'Force that pulls the leaves apart, square to the pin.',
  }),
  layerHeight: length({
    label: 'Layer height',
    min: 0.05,
    max: 0.4,
    step: 0.01,
    default: 0.2,
    group: 'load',
    help: 'A gap under the pin of less than a layer fuses.',
  }),
};

export type Values = ValuesOf<typeof fields>;

export const barrelRadius = (p: Values): number => p.barrelDiameter / 2;

/** Half the flat the barrel stands on: its lower flanks hang over by 45 degrees, no more. */
export const footHalf = (p: Values): number => barrelRadius(p) * Math.tan(Math.PI / 8);

/** Distance from the axis to the furthest corner of a knuckle, mm. */
export const sweptRadius = (p: Values): number => barrelRadius(p) / Math.cos(Math.PI / 8);

/** Distance from the axis, along the leaf, to its edge beside a knuckle of the other leaf, mm. */
export const leafEdge = (p: Values): number => sweptRadius(p) + p.gap;

/** Length of one knuckle along the pin, mm. */
export const knuckleLength = (p: Values): number => (p.hingeWidth - (p.knuckles - 1) * p.gap) / p.knuckles;

/** The knuckles turning on the pin. */
export const boredKnuckles = (p: Values): number => (p.knuckles - 1) / 2;

/** Wall of a bored knuckle, mm. */
export const boreWall = (p: Values): number => barrelRadius(p) - p.pinDiameter / 2 - p.gap;

/** The lip is two fifths of the leaf, the leaf over it what the gap leaves. */
export const lipHeight = (p: Values): number => 0.4 * p.leafThickness;
export const lipEnd = (p: Values): number => leafEdge(p) + p.lipLength;

/** Where the plain plate of a leaf begins behind all that the pin side needs, mm from the axis. */
export const plainFrom = (p: Values): number => (p.stop === 'flat' ? lipEnd(p) + p.gap : leafEdge(p));

const LEAST_WALL = 1;
const LEAST_OVER_LIP = 0.6;
const LEAST_KNUCKLE = 2;
const plate = (p: Values): number => p.leafLength - plainFrom(p);
const mostKnuckles = (p: Values): number => {
  const most = Math.floor((p.hingeWidth + p.gap) / (LEAST_KNUCKLE + p.gap));
  return most % 2 === 1 ? most : most - 1;
};

export const parameters = defineParameters({
  fields,
  groups: { leaf: 'Leaves', barrel: 'Barrel', fit: 'Fit', holes: 'Holes', load: 'Load and print' },
  applies: { lipLength: (p) => p.stop === 'flat', holeDiameter: (p) => p.holeCount > 0 },
  relations: [
    {
      id: 'odd-knuckles',
      field: 'knuckles',
      severity: 'refuse',
      holds: (p) => p.knuckles % 2 === 1,
      message: () => 'Knuckles must be an odd number, at least 3: the pin is held at both ends',
    },
    {
      id: 'knuckles-in-width',
      field: 'knuckles',
      severity: 'refuse',
      holds: (p) => knuckleLength(p) >= LEAST_KNUCKLE,
      message: (p) =>
        `Knuckles must be at most ${mostKnuckles(p)} in ${p.hingeWidth} mm, each ${LEAST_KNUCKLE} mm long`,
    },
    {
      id: 'wall-round-bore',
      field: 'barrelDiameter',
      severity: 'refuse',
      holds: (p) => boreWall(p) >= LEAST_WALL - 1e-9,
      message: (p) =>
        `Barrel diameter must be at least ${(p.pinDiameter + 2 * p.gap + 2 * LEAST_WALL).toFixed(1)} mm, which leaves ${LEAST_WALL} mm round the bore`,
    },
    {
      id: 'leaf-below-axis',
      field: 'leafThickness',
      severity: 'refuse',
      holds: (p) => p.leafThickness <= barrelRadius(p) - 0.1 + 1e-9,
      message: (p) =>
        `Leaf thickness must be at most ${(barrelRadius(p) - 0.1).toFixed(1)} mm, 0.1 mm less than half the barrel`,
    },
    {
      id: 'lip-in-leaf',
      field: 'leafThickness',
      severity: 'refuse',
      holds: (p) => p.stop === 'none' || 0.6 * p.leafThickness - p.gap >= LEAST_OVER_LIP - 1e-9,
      message: (p) =>
        `Leaf thickness must be at least ${((LEAST_OVER_LIP + p.gap) / 0.6).toFixed(1)} mm, which leaves ${LEAST_OVER_LIP} mm over the lip`,
    },
    {
      id: 'plate-left',
      field: 'leafLength',
      severity: 'refuse',
      holds: (p) => plate(p) >= 2 && (p.holeCount === 0 || plate(p) >= p.holeDiameter + 2 - 1e-9),
      message: (p) =>
        `Leaf length must be at least ${(plainFrom(p) + Math.max(2, p.holeCount > 0 ? p.holeDiameter + 2 : 0)).toFixed(1)} mm for barrel, lip and holes`,
    },
    {
      id: 'holes-in-row',
      field: 'holeCount',
      severity: 'refuse',
      holds: (p) => p.holeCount === 0 || p.holeCount * (p.holeDiameter + 2) <= p.hingeWidth,
      message: (p) =>
        `Holes in each leaf must be at most ${Math.floor(p.hingeWidth / (p.holeDiameter + 2))} for a width of ${p.hingeWidth} mm, 2 mm between them`,
    },
    {
      id: 'pin-prints',
      field: 'pinDiameter',
      severity: 'warn',
      holds: (p) => p.pinDiameter >= 3,
      message: () => 'Pin diameter under 3 mm prints out of round and shears easily',
    },
  ],
});
