import type { Lattice } from '@/lib/mechanics/lattice';
import { angle, count, defineParameters, length, type ValuesOf } from '../parameters';

const fields = {
  panelWidth: length({
    label: 'Width along the bend',
    min: 10,
    max: 250,
    step: 1,
    default: 60,
    group: 'panel',
    help: 'Length of the line the panel bends about.',
  }),
  thickness: length({
    label: 'Panel thickness',
    min: 0.8,
    max: 6,
    step: 0.1,
    default: 2.4,
    group: 'panel',
    help: 'A thicker panel strains its links more and closes its slits sooner.',
  }),
  leafLength: length({
    label: 'Plain panel at each side',
    min: 3,
    max: 200,
    step: 1,
    default: 25,
    group: 'panel',
    help: 'From the last row of slits to the edge.',
  }),
  rows: count({
    label: 'Rows of slits',
    min: 3,
    max: 60,
    default: 21,
    group: 'slits',
    help: 'The bend is shared by one link less than there are rows.',
  }),
  columns: count({
    label: 'Slits in a row',
    min: 1,
    max: 12,
    default: 2,
    group: 'slits',
    help: 'Fewer and longer slits are softer and strain less.',
  }),
  bridge: length({
    label: 'Bridge',
    min: 0.8,
    max: 20,
    step: 0.1,
    default: 3,
    group: 'slits',
    help: 'Left between two slits of a row. Every other row is shifted by half a slit.',
  }),
  linkWidth: length({
    label: 'Link width',
    min: 0.8,
    max: 8,
    step: 0.1,
    default: 1.6,
    group: 'slits',
    help: 'Between two rows of slits, in whole line widths: two at least.',
  }),
  slitWidth: length({
    label: 'Slit width',
    min: 0.3,
    max: 4,
    step: 0.05,
    default: 0.6,
    group: 'slits',
    help: 'Room for the links to turn in. Its ends are rounded.',
  }),
  bendAngle: angle({
    label: 'Bend angle',
    min: 5,
    max: 180,
    step: 5,
    default: 90,
    group: 'bend',
    help: 'Between the two plain panels, from flat.',
  }),
};

export type Values = ValuesOf<typeof fields>;

/** From one bridge to the next in a row, mm. */
export const pitchOf = (p: Values): number => p.panelWidth / p.columns;
export const overlapOf = (p: Values): number => pitchOf(p) / 2 - p.bridge;
/** From one row to the next, mm. */
export const rowPitch = (p: Values): number => p.linkWidth + p.slitWidth;
/** Links in line across the bend. */
export const linksInLine = (p: Values): number => p.rows - 1;
export const flexLength = (p: Values): number => p.rows * p.slitWidth + linksInLine(p) * p.linkWidth;
export const totalLength = (p: Values): number => 2 * p.leafLength + flexLength(p);

export const latticeOf = (p: Values): Lattice => ({
  width: p.linkWidth,
  thickness: p.thickness,
  slit: p.slitWidth,
  bridge: p.bridge,
  overlap: overlapOf(p),
});

const MOST_SLITS = 240;

export const parameters = defineParameters({
  fields,
  groups: { panel: 'Panel', slits: 'Slits', bend: 'Bend' },
  relations: [
    {
      id: 'slits-overlap',
      field: 'bridge',
      severity: 'refuse',
      holds: (p) => overlapOf(p) >= p.slitWidth + 0.5 - 1e-9,
      message: (p) =>
        `Bridge must be at most ${(pitchOf(p) / 2 - p.slitWidth - 0.5).toFixed(1)} mm with slits ${pitchOf(p).toFixed(1)} mm apart, or the rows do not overlap`,
    },
    {
      id: 'not-too-many',
      field: 'rows',
      severity: 'refuse',
      holds: (p) => p.rows * p.columns <= MOST_SLITS,
      message: (p) =>
        `Rows of slits must be at most ${Math.floor(MOST_SLITS / p.columns)} with ${p.columns} slits in a row, ${MOST_SLITS} slits in all`,
    },
    {
      id: 'slit-prints-open',
      field: 'slitWidth',
      severity: 'warn',
      holds: (p) => p.slitWidth >= 0.4,
      message: () => 'Slit width under 0.4 mm closes in places when printed',
    },
    {
      id: 'panel-longer-than-links',
      field: 'leafLength',
      severity: 'warn',
      holds: (p) => p.leafLength >= 2 * p.thickness,
      message: (p) =>
        `Plain panel at each side under ${(2 * p.thickness).toFixed(1)} mm, twice the thickness, bends along with the links`,
    },
  ],
});
