import type { Preset } from '../contract';
import type { Values } from './schema';

export const presets: readonly Preset<Values>[] = [
  {
    id: 'lead-shot-pot',
    name: 'Lead-shot pot',
    purpose: 'Keeps trim shot in the Millrace Model Club workshop; soft lid, opened at every trim.',
    material: 'tpu-95a',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: { fromRim: 24, undercut: 0.4 },
  },
  {
    id: 'bits-pot-fingers',
    name: 'Bits pot with a fingered lid',
    purpose: 'Screws and clevises on the field table: slotted lid in PETG that opens with two fingers.',
    material: 'petg',
    use: { opening: 'often', layers: 'along', temperature: 30 },
    values: { skirt: 'slotted', slots: 20, fromRim: 16, lidWall: 1.2, undercut: 0.3 },
  },
  {
    id: 'seed-bead-pot',
    name: 'Rigging bead pot',
    purpose: 'Small pot for rigging beads and crimps, fingered lid in polypropylene.',
    material: 'pp',
    use: { opening: 'often', layers: 'along', temperature: 23 },
    values: { tubeDiameter: 30, potHeight: 32, skirt: 'slotted', slots: 14, fromRim: 14, lidWall: 1.2 },
  },
];
