import type { Preset } from '../contract';
import type { Values } from './schema';

export const presets: readonly Preset<Values>[] = [
  {
    id: 'glider-bag-strap',
    name: 'Glider bag strap',
    purpose: 'Closes the padded wing bag of a glider; 20 mm webbing, opened at every outing.',
    material: 'petg',
    use: { opening: 'often', layers: 'along', temperature: 40 },
    values: {},
  },
  {
    id: 'battery-box-strap',
    name: 'Battery box strap',
    purpose:
      'Holds the lid of a charging box down with 15 mm webbing, in polypropylene that stands acid and knocks.',
    material: 'pp',
    use: { opening: 'often', layers: 'along', temperature: 30 },
    values: {
      webbingWidth: 15,
      webbingThickness: 1.2,
      barWidth: 5,
      armLength: 28,
      rootThickness: 2.6,
      rootFillet: 1.3,
      barbHeight: 2.6,
      padLength: 8,
      pull: 15,
    },
  },
  {
    id: 'launch-trolley-strap',
    name: 'Launch trolley strap',
    purpose: 'Ties a model yacht to its trolley on the way to the water; 40 mm webbing, stands the sun.',
    material: 'asa',
    use: { opening: 'often', layers: 'along', temperature: 40 },
    values: {
      webbingWidth: 40,
      webbingThickness: 2,
      barWidth: 9,
      armLength: 56,
      rootThickness: 4,
      tipThickness: 3,
      rootFillet: 2.2,
      plugThickness: 8,
      barbHeight: 3.4,
      sideWall: 2,
      padLength: 14,
      skin: 2,
      clearance: 0.35,
      pull: 80,
    },
  },
  {
    id: 'cover-cord-strap',
    name: 'Cover strap without adjuster',
    purpose: 'Sewn to the dust cover of the workbench lathe: webbing fixed at both ends.',
    material: 'petg',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: { webbingWidth: 25, ladderLock: false, armLength: 40, pull: 40 },
  },
];
