import type { Source } from '@/lib/materials/types';

export const RING: Source = {
  text: 'Hetenyi, Beams on Elastic Foundation: tube loaded round its bore, with the local give of the wall; within 5 % of finite elements. Both rings share the undercut',
  mark: 'derived',
};
export const FORCE: Source = {
  text: 'Elastic-foundation ring as above, over W = P (mu + tan a) / (1 - mu tan a); handbook: Snap-Fit Joints for Plastics - A Design Guide, P = y d Es X (as quoted)',
  mark: 'derived',
};
export const FINGER: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide: slotted rings as cantilevers, eps = 1.5 t y / l^2, P = E b t^3 y / (4 l^3) (as quoted)',
  mark: 'quoted',
};
export const GEOMETRY: Source = { text: 'Geometry of the pot', mark: 'derived' };
