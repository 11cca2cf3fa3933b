import type { Preset } from '../contract';
import type { Values } from './schema';

export const presets: readonly Preset<Values>[] = [
  {
    id: 'drawn-pp',
    name: 'Polypropylene hinges',
    purpose: 'Which web draws evenly and lasts; for box lids of the club.',
    material: 'pp',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: { webLength: 2, hinges: 4 },
  },
  {
    id: 'tpu-flaps',
    name: 'Flexible flaps',
    purpose: 'Webs of TPU for control-surface hinges of foam gliders.',
    material: 'tpu-95a',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: { webLength: 3, firstLayers: 2, hinges: 5, foldAngle: 90 },
  },
  {
    id: 'long-webs',
    name: 'Long webs of stiff plastic',
    purpose: 'How thick a long web of PETG may be before it cracks at a quarter turn.',
    material: 'petg',
    use: { opening: 'sometimes', layers: 'along', temperature: 23 },
    values: { webLength: 14, firstLayers: 2, hinges: 4, foldAngle: 90, leafLength: 12 },
  },
];
