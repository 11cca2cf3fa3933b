import type { Guide } from '../contract';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'Data sheets tell of moulded bars or of another printer. This ladder tells of yours: the same arm, each with a stop that lets it bend a little further.',
    'Each arm is marked with the peak strain in percent that it reaches at its stop.',
  ],
  howItFails: [
    'An arm whitens or stays bent: it has yielded. Once is bad for a catch that is opened often.',
    'An arm cracks at its root fillet, on the side that is pulled.',
    'Standing on its base the arm parts between layers, at a fraction of the strain.',
  ],
  formulas: [
    {
      name: 'Strain at the stop',
      formula: 'eps = 3 t y / (2 L^2), with root, fillet, shear and large deflection',
      symbols: 't thickness, L length, y way to the stop',
      validity: 'L at least 5 t, y up to half of L, fillet 0.1 to 1 t',
      source: source.ARM,
    },
  ],
  printing: [
    'Print it from the spool, with the settings and in the direction of the part you want to know about.',
    'Push each arm at its tip with a finger, slowly, until it meets its stop; start with the mildest.',
    'Read: the last mark whose arm springs back fully is the strain this print takes once. Push the arms below it a hundred times: the last that neither whitens nor loosens is what it takes often.',
    'Note plastic, spool, temperature and direction with the result, and set your allowable strain by it.',
  ],
  cautions: [
    'Wear glasses: a brittle arm flies off.',
    'A coupon tells of one print on one day; damp, sun and age take from it.',
  ],
};

export default guide;
