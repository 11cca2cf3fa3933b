import type { Preset } from '../contract';
import type { Values } from './schema';

export const presets: readonly Preset<Values>[] = [
  {
    id: 'everyday',
    name: 'Everyday thread',
    purpose: 'The printed profile at the size of a ballast plug; one for each plastic.',
    material: 'petg',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: {},
  },
  {
    id: 'bought-screws',
    name: 'Against bought screws',
    purpose: 'Metric M12 x 1.75: try the holes with a steel screw as well.',
    material: 'pla',
    use: { opening: 'sometimes', layers: 'along', temperature: 23 },
    values: {
      profile: 'iso-metric',
      majorDiameter: 12,
      pitch: 1.75,
      plateThickness: 8,
      clearanceStep: 0.05,
      firstClearance: 0.05,
      holes: 6,
    },
  },
  {
    id: 'pot-thread',
    name: 'Pot thread, two starts',
    purpose: 'Coarse thread of quick lids on the pots of the club bench.',
    material: 'pp',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: { majorDiameter: 30, pitch: 4, starts: 2, plateThickness: 18, holes: 4, clearanceStep: 0.1 },
  },
];
