import type { Preset } from '../contract';
import type { Values } from './schema';

export const presets: readonly Preset<Values>[] = [
  {
    id: 'engine-cowl-wrap',
    name: 'Engine cowl wrap',
    purpose: 'One sheet of PETG that wraps round the bench model engine of the Millrace Model Club.',
    material: 'petg',
    use: { opening: 'sometimes', layers: 'along', temperature: 30 },
    values: {},
  },
  {
    id: 'log-book-cover',
    name: 'Flight log cover',
    purpose: 'Spine of a log book cover: folds by half a turn at every flight day.',
    material: 'pp',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: {
      panelWidth: 120,
      columns: 4,
      leafLength: 60,
      thickness: 2,
      rows: 31,
      linkWidth: 1.2,
      bendAngle: 180,
    },
  },
  {
    id: 'cabin-roof',
    name: 'Cabin roof of a launch',
    purpose: 'Rounded roof in PLA, bent once by 60 degrees and glued to its ends.',
    material: 'pla',
    use: { opening: 'once', layers: 'along', temperature: 23 },
    values: { panelWidth: 80, columns: 2, leafLength: 18, rows: 17, thickness: 2, bendAngle: 60 },
  },
  {
    id: 'cable-guide',
    name: 'Cable guide strap',
    purpose: 'Narrow soft strap of TPU round a boom; slits keep it light.',
    material: 'tpu-95a',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: {
      panelWidth: 24,
      columns: 1,
      leafLength: 12,
      rows: 12,
      linkWidth: 2,
      thickness: 3,
      bridge: 3,
      slitWidth: 1,
      bendAngle: 180,
    },
  },
];
