import type { Preset } from '../contract';
import type { PegStrap } from './schema';

const BENCH = 23;

export const presets: readonly Preset<PegStrap>[] = [
  {
    id: 'antenna-strap',
    name: 'Rigging antenna strap',
    purpose: 'Ties the receiver aerial to a mast of 20 mm; undone at every rigging.',
    material: 'tpu-95a',
    use: { opening: 'often', layers: 'along', temperature: BENCH },
    values: {
      bundleDiameter: 20,
      strapWidth: 10,
      strapThickness: 1.2,
      cornerRadius: 5,
      eyeDiameter: 4,
      eyeCount: 4,
      eyePitch: 7,
      pegDiameter: 3,
      pegFillet: 0.4,
      headDiameter: 4.25,
      headLength: 2.2,
    },
  },
  {
    id: 'cable-tidy',
    name: 'Bench cable tidy',
    purpose: 'Bundles charging leads from 30 to 43 mm thick at the Millrace club bench.',
    material: 'tpu-95a',
    use: { opening: 'often', layers: 'along', temperature: BENCH },
    values: {},
  },
  {
    id: 'battery-strap',
    name: 'Battery strap',
    purpose:
      'Holds a pack of 45 mm girth diameter to its tray; beside it the tray needs a lip or a second strap.',
    material: 'tpu-95a',
    use: { opening: 'sometimes', layers: 'along', temperature: 30 },
    values: {
      bundleDiameter: 45,
      strapWidth: 20,
      strapThickness: 2,
      cornerRadius: 8,
      eyeDiameter: 8,
      eyeCount: 5,
      eyePitch: 12,
      pegDiameter: 6,
      pegFillet: 0.8,
      headDiameter: 8.4,
      headLength: 3.8,
    },
  },
  {
    id: 'spar-spacer',
    name: 'Spar spacer strap',
    purpose: 'Half a turn: the strip stands on edge between two spars and keeps them from rubbing.',
    material: 'tpu-95a',
    use: { opening: 'sometimes', layers: 'along', temperature: BENCH },
    values: {
      bundleDiameter: 40,
      strapWidth: 10,
      strapThickness: 1.2,
      cornerRadius: 5,
      halfTurn: true,
      eyeDiameter: 4,
      eyeCount: 3,
      eyePitch: 7,
      pegDiameter: 3,
      pegFillet: 0.4,
      headDiameter: 4.25,
      headLength: 2.2,
    },
  },
];
