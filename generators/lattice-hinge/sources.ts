import type { Source } from '@/lib/materials/types';

export const LINK: Source = {
  text: 'Saint-Venant bar (Timoshenko & Goodier, Theory of Elasticity, from memory), length corrected by solid finite elements made for this tool: moment within 2 %, strain from 3 % low to 9 % high',
  mark: 'derived',
};
export const BRIDGE: Source = {
  text: 'Beam theory, a bridge takes the torque of two links; concentration at the end of the slit not counted',
  mark: 'derived',
};
export const GEOMETRY: Source = { text: 'Geometry of rows that turn by equal steps', mark: 'derived' };
export const PULL: Source = { text: 'Beam theory, links held at both ends', mark: 'derived' };
export const LINES: Source = {
  text: 'Walls in whole line widths, 0.8 mm at least (printed-part guides, as quoted)',
  mark: 'quoted',
};
