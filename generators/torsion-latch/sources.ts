import type { Source } from '@/lib/materials/types';

export const TWIST: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide, torsion (as quoted); bars after Saint-Venant with held ends, torque within 1 % of finite elements',
  mark: 'derived',
};
export const BENDING: Source = {
  text: 'Beam theory: bars held at both ends, rocker as a cantilever',
  mark: 'derived',
};
export const WEDGE: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide, W = P (mu + tan a) / (1 - mu tan a) (as quoted)',
  mark: 'quoted',
};
export const FINGER: Source = {
  text: 'One finger presses 5 to 20 N without effort, 40 N at most',
  mark: 'common-practice',
};
