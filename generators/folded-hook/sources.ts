import type { Source } from '@/lib/materials/types';

export const ARM: Source = {
  text: 'Exact thin-beam sums for L and U arms (derived); corrected as a thick curved bar on a yielding base, within 2.5 % of finite elements',
  mark: 'derived',
};
export const STRAIGHT: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide, eps = 1.5 h y / l^2 (as quoted)',
  mark: 'quoted',
};
export const WEDGE: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide, W = P (mu + tan a) / (1 - mu tan a) (as quoted)',
  mark: 'quoted',
};
