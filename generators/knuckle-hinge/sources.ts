import type { Source } from '@/lib/materials/types';

export const GEOMETRY: Source = { text: 'Geometry of leaves, lip and barrel', mark: 'derived' };
export const PIN: Source = {
  text: 'Timoshenko, Strength of Materials I (from memory): round pin, peak shear 4/3 of the mean, bending between fixed knuckles',
  mark: 'memory',
};
export const STRENGTH: Source = {
  text: 'Strength of the plastic, shear at 0.577 of it; half of that is trusted for the scatter of prints',
  mark: 'common-practice',
};
export const LAYERS: Source = {
  text: 'A gap under a pin of less than a layer is closed by the sag of the first strands',
  mark: 'common-practice',
};
export const PIN_RULE: Source = {
  text: 'Printed-part guides (as quoted): pins of 3 mm and more',
  mark: 'quoted',
};
export const NO_TABLE: Source = { text: 'Clearance notes are for printed parts', mark: 'common-practice' };
