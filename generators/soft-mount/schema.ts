import { legGap, type SSpring, springHeight, springReach } from '@/lib/mechanics/s-spring';
import { choice, count, defineParameters, length, number, type ValuesOf } from '../parameters';

const fields = {
  kind: choice({
    label: 'Soft part',
    options: [
      { value: 'columns', label: 'Columns', help: 'Square columns of TPU: stiff upright, soft sideways.' },
      {
        value: 's-spring',
        label: 'S-springs',
        help: 'A pair of strips, mirrored: soft upright, any plastic.',
      },
    ],
    default: 'columns',
    group: 'shape',
    help: 'What stands between the plates.',
  }),
  plateLength: length({
    label: 'Plate length',
    min: 20,
    max: 200,
    step: 1,
    default: 70,
    group: 'plates',
    help: 'Of both plates.',
  }),
  plateWidth: length({
    label: 'Plate width',
    min: 8,
    max: 150,
    step: 1,
    default: 24,
    group: 'plates',
    help: 'S-springs are as wide as the plates.',
  }),
  plateThickness: length({
    label: 'Plate thickness',
    min: 1.2,
    max: 10,
    step: 0.1,
    default: 3,
    group: 'plates',
    help: 'Screw both to something stiff: a soft plate bends along.',
  }),
  holeDiameter: length({
    label: 'Hole diameter',
    min: 0,
    max: 10,
    step: 0.1,
    default: 3.2,
    group: 'plates',
    help: 'One at each end of both plates. 0 for none.',
  }),
  columnSide: length({
    label: 'Column side',
    min: 2,
    max: 30,
    step: 0.1,
    default: 3.5,
    group: 'shape',
    help: 'Of the square section.',
  }),
  columnHeight: length({
    label: 'Column height',
    min: 3,
    max: 60,
    step: 0.5,
    default: 12,
    group: 'shape',
    help: 'Free height between the plates.',
  }),
  columnsAlong: count({
    label: 'Columns along',
    min: 1,
    max: 8,
    default: 2,
    group: 'shape',
    help: 'Along the length of the plates, evenly between the holes.',
  }),
  columnsAcross: count({
    label: 'Columns across',
    min: 1,
    max: 8,
    default: 2,
    group: 'shape',
    help: 'Across the plates.',
  }),
  bendRadius: length({
    label: 'Bend radius',
    min: 1.5,
    max: 15,
    step: 0.1,
    default: 3.5,
    group: 'shape',
    help: 'Of the middle of the strip. The spring is six radii and both fillets high.',
  }),
  legLength: length({
    label: 'Leg',
    min: 0,
    max: 40,
    step: 0.5,
    default: 3,
    group: 'shape',
    help: 'Straight piece between the bends. Longer is much softer.',
  }),
  stripThickness: length({
    label: 'Strip thickness',
    min: 0.8,
    max: 6,
    step: 0.1,
    default: 2.4,
    group: 'shape',
    help: 'Stiffness grows with its cube. In whole line widths.',
  }),
  fillet: length({
    label: 'Fillet',
    min: 0.3,
    max: 5,
    step: 0.1,
    default: 0.8,
    group: 'shape',
    help: 'Where column or strip meets its plate.',
  }),
  mass: number({
    label: 'Mass carried',
    unit: 'g',
    min: 1,
    max: 5000,
    step: 1,
    default: 600,
    group: 'load',
    help: 'By this mount, its own plate counted.',
  }),
  shaking: number({
    label: 'Shaking to keep away',
    unit: 'Hz',
    min: 1,
    max: 1000,
    step: 1,
    default: 150,
    group: 'load',
    help: 'Turns of motor or propeller in a second, or rpm over 60.',
  }),
  dropHeight: length({
    label: 'Knock, as a fall from',
    min: 0,
    max: 1000,
    step: 1,
    default: 3,
    group: 'load',
    help: 'The mass falls on the mount from this height. 0 is a load let go at once.',
  }),
};

export type Values = ValuesOf<typeof fields>;

export const onColumns = (p: Values): boolean => p.kind === 'columns';
const onSprings = (p: Values): boolean => !onColumns(p);

export const springOf = (p: Values): SSpring => ({
  radius: p.bendRadius,
  leg: p.legLength,
  thickness: p.stripThickness,
  foot: p.fillet,
});

export const freeHeight = (p: Values): number => (onColumns(p) ? p.columnHeight : springHeight(springOf(p)));

/** Between the two springs, mm. */
const BETWEEN = 1.5;
/** Middle of a spring from the middle of the plate, mm. */
export const springOffset = (p: Values): number => springReach(springOf(p)) + BETWEEN / 2;

/** Length of plate at either end that is kept for a hole. */
export const holeZone = (p: Values): number => (p.holeDiameter > 0 ? p.holeDiameter + 4 : 0);

/** Middle of columns evenly spread over a length, each with its fillets. */
function spread(count: number, over: number, taken: number): number[] {
  const step = count > 1 ? (over - taken) / (count - 1) : 0;
  return Array.from({ length: count }, (_, i) => (i - (count - 1) / 2) * step);
}

const columnBase = (p: Values): number => p.columnSide + 2 * p.fillet;
export const columnsX = (p: Values): number[] =>
  spread(p.columnsAlong, p.plateLength - 2 * holeZone(p), columnBase(p));
export const columnsY = (p: Values): number[] => spread(p.columnsAcross, p.plateWidth, p.columnSide);

/** Length of plate that the soft part needs. */
const neededLength = (p: Values): number =>
  onColumns(p) ? p.columnsAlong * (columnBase(p) + 0.5) : 2 * (springOffset(p) + springReach(springOf(p)));

export const parameters = defineParameters({
  fields,
  groups: { shape: 'Soft part', plates: 'Plates', load: 'Load' },
  applies: {
    columnSide: onColumns,
    columnHeight: onColumns,
    columnsAlong: onColumns,
    columnsAcross: onColumns,
    bendRadius: onSprings,
    legLength: onSprings,
    stripThickness: onSprings,
  },
  relations: [
    {
      id: 'soft-part-on-plate',
      field: 'plateLength',
      severity: 'refuse',
      holds: (p) => p.plateLength - 2 * holeZone(p) >= neededLength(p) - 1e-9,
      message: (p) =>
        `Plate length must be at least ${(neededLength(p) + 2 * holeZone(p)).toFixed(1)} mm for the soft part and the holes`,
    },
    {
      id: 'columns-across-plate',
      field: 'plateWidth',
      severity: 'refuse',
      holds: (p) => onSprings(p) || p.plateWidth >= p.columnsAcross * (p.columnSide + 0.5) - 1e-9,
      message: (p) =>
        `Plate width must be at least ${(p.columnsAcross * (p.columnSide + 0.5)).toFixed(1)} mm for ${p.columnsAcross} columns`,
    },
    {
      id: 'hole-in-plate',
      field: 'holeDiameter',
      severity: 'refuse',
      holds: (p) => p.holeDiameter + 3 <= p.plateWidth,
      message: (p) =>
        `Hole diameter must be at most ${(p.plateWidth - 3).toFixed(1)} mm, 3 mm less than the plate width`,
    },
    {
      id: 'fillets-in-column',
      field: 'fillet',
      severity: 'refuse',
      holds: (p) => onSprings(p) || 2 * p.fillet <= 0.6 * p.columnHeight + 1e-9,
      message: (p) =>
        `Fillet must be at most ${(0.3 * p.columnHeight).toFixed(2)} mm, 0.3 of the column height`,
    },
    {
      id: 'strip-bends',
      field: 'bendRadius',
      severity: 'refuse',
      holds: (p) => onColumns(p) || legGap(springOf(p)) >= 1 - 1e-9,
      message: (p) =>
        `Bend radius must be at least ${((p.stripThickness + 1) / 2).toFixed(2)} mm, which leaves 1 mm between the legs`,
    },
    {
      id: 'fillet-under-bend',
      field: 'fillet',
      severity: 'refuse',
      holds: (p) => onColumns(p) || p.fillet <= p.bendRadius,
      message: (p) => `Fillet must be at most ${p.bendRadius} mm, the bend radius`,
    },
    {
      id: 'plate-stiff',
      field: 'plateThickness',
      severity: 'warn',
      holds: (p) => onColumns(p) || p.plateThickness >= 1.5 * p.stripThickness,
      message: (p) =>
        `Plate thickness under ${(1.5 * p.stripThickness).toFixed(1)} mm, 1.5 strips, bends along with them`,
    },
  ],
});
