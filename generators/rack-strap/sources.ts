import type { Source } from '@/lib/materials/types';

export const PAWL: Source = {
  text: 'Beam theory with root, fillet, shear and large deflection, strain 8 % under to 15 % over plane finite elements; plain figure: Snap-Fit Joints for Plastics - A Design Guide (as quoted)',
  mark: 'derived',
};
export const WRAP: Source = {
  text: 'Exact geometry of a wrapped strip, t/(D + t); teeth by a factor fitted to plane finite elements, within 8 %',
  mark: 'derived',
};
export const WEDGE: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide, W = P (mu + tan a) / (1 - mu tan a) (as quoted), and the back of the band rubbing on the anvil',
  mark: 'quoted',
};
export const TAB: Source = { text: 'Arm bent by a couple at its end, theta = M l / (E I)', mark: 'derived' };
export const TOOTH: Source = {
  text: 'Mean shear over the base of a tooth, 0.577 of the tensile strength; how teeth share is common practice without a source',
  mark: 'common-practice',
};
export const PROP: Source = {
  text: "Strut pushed beside its middle and propped at its end: P/A + M/Z with half of the end moment at the root; Roark's Formulas for Stress and Strain (from memory)",
  mark: 'memory',
};
export const BAND: Source = {
  text: 'Mean tension over the core of the band, raised at the tooth roots',
  mark: 'derived',
};
export const RESERVE: Source = {
  text: 'Three times the intended pull until it breaks, common practice without a source',
  mark: 'common-practice',
};
export const GEOMETRY: Source = { text: 'Geometry of the strap', mark: 'derived' };
