import type { Source } from '@/lib/materials/types';

export const RING: Source = {
  text: 'Open ring by Castigliano; corrected as a thick curved bar (Winkler-Bach) on a yielding stem, within 5 % of plane-stress finite elements',
  mark: 'derived',
};
export const WEDGE: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide, W = P (mu + tan a) / (1 - mu tan a) at each lip (as quoted)',
  mark: 'quoted',
};
export const GRIP: Source = {
  text: 'A permanently strained clip loses about half its force in weeks: keep the standing strain under a quarter of the allowable',
  mark: 'common-practice',
};
export const HAND: Source = {
  text: 'Hand force: 20 to 50 N comfortable, 100 N at most (snap-fit design articles)',
  mark: 'common-practice',
};
export const SPREAD: Source = {
  text: 'Finite elements with large deflection: force within 8 %, strain within 4 % up to 0.6 of the radius',
  mark: 'derived',
};
