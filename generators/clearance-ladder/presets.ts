import type { Preset } from '../contract';
import type { Values } from './schema';

export const presets: readonly Preset<Values>[] = [
  {
    id: 'new-spool',
    name: 'New spool',
    purpose: 'The everyday ladder of the club bench: one for each plastic and printer.',
    material: 'petg',
    use: { opening: 'sometimes', layers: 'along', temperature: 23 },
    values: {},
  },
  {
    id: 'fine-fits',
    name: 'Fine fits',
    purpose: 'Small steps for pins of 5 mm in hinges and rudder horns.',
    material: 'pla',
    use: { opening: 'sometimes', layers: 'along', temperature: 23 },
    values: { pinDiameter: 5, depth: 4, firstGap: 0.02, gapStep: 0.03, holes: 9, wall: 4 },
  },
  {
    id: 'pot-lids',
    name: 'Wide holes',
    purpose: 'For lids and pots: large circles come out closer to size than small ones.',
    material: 'asa',
    use: { opening: 'sometimes', layers: 'along', temperature: 23 },
    values: { pinDiameter: 20, depth: 8, gapStep: 0.1, holes: 5, wall: 3, markHeight: 6 },
  },
];
