import type { Source } from '@/lib/materials/types';

export const GUIDE: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide (as quoted)',
  mark: 'quoted',
};
export const CORRECTED: Source = {
  text: 'Beam theory with root, fillet, shear and large deflection, held against finite elements (README of this family)',
  mark: 'derived',
};
export const PRACTICE: Source = { text: 'common practice, no source', mark: 'common-practice' };
