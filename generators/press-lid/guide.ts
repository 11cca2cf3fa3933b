import type { Guide } from '../contract';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'A press lid snaps over a bead that runs all round a pot. A closed skirt stretches as a ring; a slotted one bends as fingers.',
    'It suits pots that are opened often and hold dry things.',
  ],
  howItFails: [
    'The lip of the lid cracks across, where it is stretched most while passing the bead.',
    'A closed ring in stiff plastic is too hard to push on by hand.',
    'Fingers break off at the plate when the lid is printed lying.',
    'Printed rings come out tight: without clearance the lid never comes home.',
  ],
  formulas: [
    {
      name: 'Radial force of a closed lid',
      formula: 'Q = u / c, c = lambda R^2/(2 E s) (1 + 2 D^2 + C^2) + 2.1/E; P = 2 pi R Q',
      symbols:
        'u give, R mean radius, s wall, lambda = (3 (1 - nu^2))^(1/4) / sqrt(R s), D and C the decay at the load',
      validity: 'Wall up to a quarter of the bore radius, tube 4/lambda long past the load',
      source: source.RING,
    },
    {
      name: 'Two rings that give',
      formula: 'y/2 = P (1/k_lid + 1/k_pot)',
      symbols: 'y undercut on the diameter, k radial stiffness of each',
      validity: 'As above, one plastic for both',
      source: source.RING,
    },
    {
      name: 'Handbook force',
      formula: 'P = y d Es X, X = 0.62 sqrt((k - 1)/(k + 1)) / ((k^2 + 1)/(k^2 - 1) + nu), k = d0/d',
      symbols: 'd bore and d0 outside of the lid',
      validity: 'Near the end, one side rigid. Too low: shell theory gives 1.4 to 1.5 times as much',
      source: source.FORCE,
    },
    {
      name: 'Fingers',
      formula: 'eps = 1.5 t y / l^2, P = E b t^3 y / (4 l^3)',
      symbols: 't wall, l length of a finger, b its width, y half the undercut',
      validity: 'Fingers nearly flat: rise of the arc at most half the wall, length at least three walls',
      source: source.FINGER,
    },
  ],
  printing: [
    'Pot standing, lid on its top; the flanks of bead and groove hang at their own angles without supports.',
    'Put the seam of pot and lid where they are not gripped.',
    'Print a short ring of each first to find the clearance.',
  ],
  cautions: [
    'Not for liquid, pressure, hot filling, food or drinking water.',
    'No child-proof closure: keep what is dangerous elsewhere.',
    'Figures are estimates for a first print: prove them by test. Local codes and licensed practice come first.',
  ],
};

export default guide;
