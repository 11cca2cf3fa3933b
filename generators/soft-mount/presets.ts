import type { Preset } from '../contract';
import type { Values } from './schema';

export const presets: readonly Preset<Values>[] = [
  {
    id: 'bench-camera',
    name: 'Bench camera mount',
    purpose: 'Keeps a camera off the shaking of the Millrace Model Club engine bench.',
    material: 'tpu-95a',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: {},
  },
  {
    id: 'receiver-tray',
    name: 'Receiver tray on S-springs',
    purpose: 'Carries receiver and gyro of a glider, away from motor and landings.',
    material: 'tpu-95a',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: { kind: 's-spring', mass: 60, dropHeight: 10 },
  },
  {
    id: 'boat-motor-foot',
    name: 'Motor foot of a sailing boat',
    purpose: 'Four stout columns under an auxiliary motor: less hum in the hull.',
    material: 'tpu-95a',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: {
      columnSide: 6,
      columnHeight: 16,
      plateWidth: 40,
      plateThickness: 4,
      holeDiameter: 4.2,
      fillet: 1.2,
      mass: 1500,
      shaking: 200,
      dropHeight: 2,
    },
  },
  {
    id: 'timer-shelf',
    name: 'Race timer shelf',
    purpose: 'Stiffer S-springs in polypropylene for a timer on the committee boat.',
    material: 'pp',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: {
      kind: 's-spring',
      plateLength: 76,
      plateWidth: 20,
      legLength: 4,
      stripThickness: 1.6,
      mass: 250,
      shaking: 60,
      dropHeight: 2,
    },
  },
];
