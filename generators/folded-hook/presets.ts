import type { Preset } from '../contract';
import type { Values } from './schema';

export const presets: readonly Preset<Values>[] = [
  {
    id: 'low-hatch-clip',
    name: 'Low hatch clip',
    purpose: 'Holds a flat deck hatch where only 15 mm of height is free.',
    material: 'pp',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: {},
  },
  {
    id: 'receiver-tray-catch',
    name: 'Receiver tray catch',
    purpose: 'PETG tray that slides in and is pressed out by the free leg.',
    material: 'petg',
    use: { opening: 'sometimes', layers: 'along', temperature: 30 },
    values: { rootLeg: 15, freeLeg: 13, bendRadius: 2.6, thickness: 1.4, undercut: 1, leadInAngle: 25 },
  },
  {
    id: 'wall-corner-clip',
    name: 'Corner clip from a side wall',
    purpose: 'Grows out of a box wall and turns up to catch the lid.',
    material: 'asa',
    use: { opening: 'sometimes', layers: 'along', temperature: 40 },
    values: { shape: 'l', rootLeg: 10, freeLeg: 14, bendRadius: 2.4, thickness: 1.4, undercut: 0.8 },
  },
];
