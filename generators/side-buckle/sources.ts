import type { Source } from '@/lib/materials/types';

export const ARM: Source = {
  text: 'Beam theory with root, fillet, shear and large deflection, strain within 8 % of plane finite elements; plain figure: Snap-Fit Joints for Plastics - A Design Guide (as quoted)',
  mark: 'derived',
};
export const WEDGE: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide, W = P (mu + tan a) / (1 - mu tan a), both arms (as quoted)',
  mark: 'quoted',
};
export const SHEAR: Source = {
  text: 'Mean shear over the foot of the barb, 0.577 of the tensile strength (distortion energy)',
  mark: 'derived',
};
export const BEARING: Source = {
  text: 'Mean pressure on the face that holds, at the tensile strength',
  mark: 'derived',
};
export const ARM_PULL: Source = {
  text: 'Tension and the bending of a pull beside the middle of the arm, P/A + M/Z',
  mark: 'derived',
};
export const BAR: Source = {
  text: "Roark's Formulas for Stress and Strain, beam under even load: q l^2/8 on hinges, q l^2/12 built in (from memory)",
  mark: 'memory',
};
export const SLIP: Source = {
  text: 'Prop force 3 M / (2 L) of a cantilever turned at its end, against friction on the holding face',
  mark: 'derived',
};
export const RESERVE: Source = {
  text: 'Three times the intended pull until it breaks, common practice without a source',
  mark: 'common-practice',
};
export const GEOMETRY: Source = { text: 'Geometry of the buckle', mark: 'derived' };
