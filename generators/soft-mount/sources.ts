import type { Source } from '@/lib/materials/types';

export const COLUMN: Source = {
  text: 'Gent & Lindley, Proc. Instn. Mech. Engrs. 173 (1959), shape factor of bonded blocks (from memory); corrected by solid finite elements made for this tool, within 2 %',
  mark: 'derived',
};
export const SWAY: Source = {
  text: 'Beam held at both ends with shear (Timoshenko, from memory); corrected by solid finite elements, within 2 %',
  mark: 'derived',
};
export const SPRING: Source = {
  text: 'Thick curved bar, Castigliano and Winkler-Bach; against plane finite elements, stiffness within 5 %, strain within 3 %',
  mark: 'derived',
};
export const VIBRATION: Source = {
  text: 'Den Hartog, Mechanical Vibrations (from memory): one mass on one spring',
  mark: 'memory',
};
export const DAMPING: Source = {
  text: 'Damping ratio 0.05 to 0.15 for TPU, 0.02 to 0.05 for stiffer plastics; stiffer by up to half when shaken',
  mark: 'common-practice',
};
export const KNOCK: Source = {
  text: 'Energy of a fall into a linear spring, x = d + sqrt(d^2 + 2 d h)',
  mark: 'derived',
};
export const BUCKLING: Source = {
  text: 'Euler with the give in shear after Engesser (from memory), ends held, plate free to shift',
  mark: 'memory',
};
export const BRIDGE: Source = {
  text: 'Bridges under 5 mm print without sag, 10 mm at most (printed-part guides, as quoted)',
  mark: 'quoted',
};
