import type { Source } from '@/lib/materials/types';
import type { ThreadProfile } from '@/lib/mechanics/thread';

export const PROFILE: Readonly<Record<ThreadProfile, Source>> = {
  'iso-metric': { text: 'ISO 68-1, ISO 724', mark: 'verified' },
  trapezoidal: { text: 'ISO 2901, ISO 2904 (DIN 103)', mark: 'verified' },
  knuckle: { text: 'DIN 405; D1 and D4 from memory', mark: 'memory' },
  printed: { text: 'Profile of this tool: depth P/3, flanks 45 and 30 degrees', mark: 'derived' },
};
export const STRIPPING: Source = {
  text: 'FED-STD-H28 stripping areas with the true diameters; 0.5 to 0.7 of the area for voids and the first turn (common practice)',
  mark: 'computed',
};
export const SECTION: Source = { text: 'Stress over the ring between thread root and bore', mark: 'derived' };
export const HAND: Source = { text: 'Closure torque guideline tables', mark: 'verified' };
export const HAND_SMALL: Source = {
  text: 'Closure torque in inch-pounds about the radius in mm, scaled from the 18 mm row of the tables',
  mark: 'common-practice',
};
export const SCREW: Source = {
  text: 'Shigley, Mechanical Engineering Design, power screws; handbook T = K F d with K = 0.3 for printed caps',
  mark: 'memory',
};
export const REMOVAL: Source = {
  text: 'Power screw let down; handbook: removal takes 40 to 60 % of the closing torque (closure torque guidelines)',
  mark: 'memory',
};
export const SEAT: Source = {
  text: 'ASME Boiler and Pressure Vessel Code VIII-1, seating stress of rubber gaskets: 1.4 MPa from 75 Shore A on, none below',
  mark: 'memory',
};
export const PRESS: Source = {
  text: 'Lame, two rings of one plastic; handbook: a rigid mate takes none of the interference (annular snap, as quoted)',
  mark: 'derived',
};
export const RING_END: Source = {
  text: 'Lame, raised by 1 + 0.17 sqrt(s/ri) at a loaded ring end (finite elements, within 3 %)',
  mark: 'derived',
};
export const SPREAD: Source = { text: 'Equilibrium of a thin ring under the flanks', mark: 'derived' };
export const HALF_OVERLAP: Source = {
  text: 'Equilibrium of a thin ring; half of the overlap kept as a rule without a source',
  mark: 'common-practice',
};
export const LINE: Source = {
  text: 'Layer / tan(flank angle); an extrusion line of a 0.4 mm nozzle is 0.42 to 0.48 mm wide (common practice)',
  mark: 'derived',
};
export const OVERLAP: Source = {
  text: 'An overlap of less than one extrusion line does not hold, common practice without a source',
  mark: 'common-practice',
};
export const FINISH: Source = {
  text: 'SPI neck finish tables: 400 series one turn, 410 one and a half, 415 two',
  mark: 'verified',
};
export const GEOMETRY: Source = { text: 'Geometry of the helix', mark: 'derived' };
