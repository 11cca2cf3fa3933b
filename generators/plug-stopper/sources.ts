import type { Source } from '@/lib/materials/types';

export const LAME: Source = {
  text: 'Lame, plane stress, bore taken as rigid: Timoshenko, Strength of Materials II, thick cylinders (from memory)',
  mark: 'memory',
};
export const OPEN_END: Source = {
  text: 'Lame at the cavity, times 1 + 0.17 sqrt(s/ri) of finite-element rings loaded at their end (made for this tool)',
  mark: 'derived',
};
export const RADIAL: Source = {
  text: 'Lame over the length that bears, reach 1/lambda of Hetenyi, Beams on Elastic Foundation (from memory); bounds by least strain energy',
  mark: 'derived',
};
export const WEDGE: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide, W = P (mu + tan a) / (1 - mu tan a) for the rib that enters, mu P for the seated ones (as quoted)',
  mark: 'quoted',
};
export const DIMPLE: Source = {
  text: 'Timoshenko, Theory of Elastic Stability: ring under even pressure (from memory)',
  mark: 'memory',
};
export const HAND: Source = {
  text: 'Hand force: 20 to 50 N comfortable, 100 N at most (snap-fit design articles)',
  mark: 'common-practice',
};
export const EQUILIBRIUM: Source = { text: 'Pull-out force over the area of the bore', mark: 'computed' };
