import type { Source } from '@/lib/materials/types';

export const STRIP: Source = {
  text: 'Articles on hinge geometry, eps = t theta / (2 L); corrected for fillets and leaf edges by finite elements made for this tool (within 4 % of 22 neo-Hookean cases)',
  mark: 'derived',
};
export const DRAWN: Source = {
  text: 'Polypropylene hinge practice: drawn webs work at 10 to 35 % nominal strain',
  mark: 'common-practice',
};
export const ELASTIC_LENGTH: Source = {
  text: 'Article on elastic hinge length, R = E t / (2 sigma_y); with the allowable strain of this use',
  mark: 'computed',
};
export const MOMENT: Source = {
  text: 'Beam theory, M = E b t^3 theta / (12 L), capped at the plastic moment sigma_y b t^2 / 4',
  mark: 'derived',
};
export const ENDURANCE: Source = {
  text: 'Balderrama-Armendariz et al., Int J Adv Manuf Technol 2019, printed folding test; web and angle not stated',
  mark: 'verified',
};
export const CLASSES: Source = {
  text: 'Penn State plastics design notes: elastic hinges last several thousand folds, plastic ones few',
  mark: 'verified',
};
export const LAYERS: Source = {
  text: 'Web in whole layers, at least two (printed-part guides, as quoted)',
  mark: 'quoted',
};
export const BRIDGE: Source = {
  text: 'Bridges under 5 mm print without sag, 10 mm at most (printed-part guides, as quoted)',
  mark: 'quoted',
};
export const GEOMETRY: Source = { text: 'Geometry of an evenly bent web', mark: 'derived' };
export const ELASTICA: Source = {
  text: "Euler's elastica, solved for this separation; web taken as thin and not touching itself",
  mark: 'derived',
};
