import type { Source } from '@/lib/materials/types';

export const GEOMETRY: Source = {
  text: 'Exact geometry of a strip wrapped on a round body',
  mark: 'derived',
};
export const SPIRAL: Source = {
  text: 'The closed strip as one turn of a spiral that ends a thickness higher than it starts',
  mark: 'derived',
};
export const BENT_HOLE: Source = {
  text: "Roark's Formulas for Stress and Strain, plate with a hole in simple bending; limits of Goodier",
  mark: 'memory',
};
export const EYE: Source = {
  text: 'Flat thick ring (Lame), corrected to an eye in a strip by plane-stress finite elements within 2.5 %',
  mark: 'derived',
};
export const SQUEEZE: Source = {
  text: 'Plane-stress finite elements of an eye in a squeezed strip, force within 1.5 %, strain within 3 %; folding as an Euler column',
  mark: 'derived',
};
export const HALF_TURN: Source = {
  text: 'Narrow strip of least energy closed with half a turn; twist by Saint-Venant, edges by Timoshenko & Goodier',
  mark: 'derived',
};
export const WEDGE: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide, W = P (mu + tan a) / (1 - mu tan a) (as quoted); radial force from the eye',
  mark: 'quoted',
};
export const LOCK: Source = {
  text: 'Snap-Fit Joints for Plastics - A Design Guide, self-locking from atan(1 / mu) (as quoted)',
  mark: 'quoted',
};
export const NET_SECTION: Source = {
  text: 'Net section (b - d) t; edge of the eye 2 + (1 - d/b)^3 times the mean, Heywood, Designing by Photoelasticity',
  mark: 'memory',
};
export const PEG: Source = {
  text: "Norton, Machine Design, fillets of stepped shafts fitted to Peterson's charts; pulled across the layers",
  mark: 'memory',
};
export const HAND: Source = {
  text: 'Hand force: 20 to 50 N comfortable, 100 N at most',
  mark: 'common-practice',
};
