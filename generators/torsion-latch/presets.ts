import type { Preset } from '../contract';
import type { Values } from './schema';

export const presets: readonly Preset<Values>[] = [
  {
    id: 'hatch-latch',
    name: 'Deck hatch latch',
    purpose: 'Closes the hatch over the rudder servo; opened with one finger before every sail.',
    material: 'pp',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: { barLength: 9, barWidth: 2, barThickness: 2 },
  },
  {
    id: 'battery-door',
    name: 'Battery door latch',
    purpose: 'Holds a glider battery door of PETG; opened now and then.',
    material: 'petg',
    use: { opening: 'sometimes', layers: 'along', temperature: 30 },
    values: { catchArm: 18, tailArm: 16, barLength: 10, barWidth: 1.6, barThickness: 1.6, undercut: 0.8 },
  },
  {
    id: 'field-box-catch',
    name: 'Field box catch',
    purpose: 'Stronger catch with round bars for a tool box lid.',
    material: 'pa-conditioned',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: {
      barShape: 'round',
      barDiameter: 2.6,
      barLength: 14,
      catchArm: 20,
      tailArm: 20,
      rockerWidth: 14,
      undercut: 1.2,
    },
  },
];
