import type { Source } from '@/lib/materials/types';

export const ARM: Source = {
  text: 'Beam theory with root, fillet, shear and large deflection, held against finite elements made for this tool',
  mark: 'derived',
};
export const HANDBOOK: Source = {
  text: 'Beam formula, eps = 3 t y / (2 L^2)',
  mark: 'derived',
};
export const COUNT: Source = { text: 'Counted from the strains of the arms', mark: 'computed' };
