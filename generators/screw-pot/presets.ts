import type { Preset } from '../contract';
import type { Values } from './schema';

export const presets: readonly Preset<Values>[] = [
  {
    id: 'trim-shot-pot',
    name: 'Trim shot pot',
    purpose: 'Carries lead shot to the pond for trimming; a TPU disc keeps spray out.',
    material: 'petg',
    use: { opening: 'often', layers: 'along', temperature: 30 },
    values: {},
  },
  {
    id: 'rigging-bits-pot',
    name: 'Rigging bits pot',
    purpose:
      'Four rooms for hooks, rings, bowsies and crimps; quick two-start lid on a disc of foam, flush body.',
    material: 'petg',
    use: { opening: 'often', layers: 'along', temperature: 30 },
    values: {
      innerDiameter: 50,
      innerDepth: 46,
      body: 'flush',
      divider: 'four',
      thread: 'quick',
      seal: 'foam',
      clearance: 0.3,
    },
  },
  {
    id: 'filler-powder-pot',
    name: 'Filler powder pot',
    purpose:
      'Micro-balloons and cotton flock stay dry and in the pot: round thread that sheds dust, plug seal, polypropylene.',
    material: 'pp',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: {
      innerDiameter: 60,
      innerDepth: 70,
      wall: 2,
      profile: 'knuckle',
      seal: 'plug',
      plugInterference: 0.3,
      lidWall: 2.2,
      grip: 'knurl',
      layerHeight: 0.1,
    },
  },
  {
    id: 'drill-tube',
    name: 'Drill and needle tube',
    purpose: 'Slim tube for small drills and sail needles in the field box, fine thread.',
    material: 'pla',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: {
      innerDiameter: 14,
      innerDepth: 90,
      thread: 'fine',
      seal: 'land',
      clearance: 0.2,
      topThickness: 2.4,
    },
  },
];
