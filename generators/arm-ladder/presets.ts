import type { Preset } from '../contract';
import type { Values } from './schema';

export const presets: readonly Preset<Values>[] = [
  {
    id: 'stiff-plastics',
    name: 'Stiff plastics',
    purpose: 'Finds where PLA or ASA of an unknown spool stays bent or breaks; one push for each arm.',
    material: 'petg',
    use: { opening: 'once', layers: 'along', temperature: 23 },
    values: {},
  },
  {
    id: 'tough-plastics',
    name: 'Tough plastics',
    purpose: 'Wider steps for nylon or polypropylene that bend far before they yield.',
    material: 'pa-conditioned',
    use: { opening: 'once', layers: 'along', temperature: 23 },
    values: { firstStrain: 0.02, strainStep: 0.02, armThickness: 3, armLength: 20 },
  },
  {
    id: 'winter-hatch',
    name: 'Hatch hook before the season',
    purpose: 'Arms as thick as those of the battery hatch; pushed a hundred times each on the club bench.',
    material: 'asa',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: {
      armThickness: 1.6,
      armLength: 22,
      rootFillet: 0.6,
      firstStrain: 0.008,
      strainStep: 0.004,
      arms: 6,
    },
  },
];
