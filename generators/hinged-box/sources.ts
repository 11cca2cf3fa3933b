import type { Source } from '@/lib/materials/types';

export const ARM: Source = {
  text: 'Beam theory with root, fillet and large deflection, held against finite elements of arms on blocks; the lid plate gives more, so strain is on the safe side',
  mark: 'derived',
};
export const WEDGE: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide, W = P (mu + tan a) / (1 - mu tan a) (as quoted); angle of the arc the lid swings on added here',
  mark: 'derived',
};
export const GEOMETRY: Source = { text: 'Geometry of box and lid', mark: 'derived' };
export const NO_TABLE: Source = { text: 'Clearance notes are for printed parts', mark: 'common-practice' };
