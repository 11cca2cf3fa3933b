import type { Preset } from '../contract';
import type { Values } from './schema';

/** A rib that one hand can push in: narrow, with a long lead-in. */
const EASY: Partial<Values> = {
  plugLength: 14,
  ribWidth: 0.6,
  ribPitch: 4.5,
  leadAngle: 20,
  bodyPlay: 0.6,
  ribCount: 2,
};

export const presets: readonly Preset<Values>[] = [
  {
    id: 'boat-drain-plug',
    name: 'Boat drain plug',
    purpose: 'Soft hollow plug for the 12 mm drain of a Millrace Model Club boat, pulled after every run.',
    material: 'tpu-95a',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: { ...EASY, boreDiameter: 12, interference: 0.2, wallThickness: 0.8, flangeOverhang: 4 },
  },
  {
    id: 'storage-tube-end',
    name: 'Storage tube end',
    purpose: 'Soft stopper for the end of a 50 mm tube that keeps wing skins dry over the winter.',
    material: 'tpu-95a',
    use: { opening: 'sometimes', layers: 'along', temperature: 23 },
    values: { ...EASY, boreDiameter: 50, interference: 0.4, wallThickness: 1.2, plugLength: 18 },
  },
  {
    id: 'ballast-filler',
    name: 'Ballast filler stopper',
    purpose: 'Thin polypropylene stopper for the filler hole of a ballast tank; stiff to push in, it stays.',
    material: 'pp',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: { ...EASY, boreDiameter: 50, interference: 0.2, wallThickness: 0.8 },
  },
];
