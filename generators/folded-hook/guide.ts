import type { Guide } from '../contract';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'A folded hook is a snap arm laid back on itself. Its bending length is that of both legs and the bend, its height only that of one.',
    'The free leg makes a handle: press it towards the root leg and the catch lets go.',
  ],
  howItFails: [
    'The inside of the bend cracks: it is the highest strained place, and a small radius raises it further.',
    'Checking only the root misses that by a factor of three to five.',
    'Printed standing, legs and bend part between layers.',
  ],
  formulas: [
    {
      name: 'L arm, thin beam',
      formula: 'y = P L2^2 / (E I) (L2 / 3 + L1), eps = P L2 h / (2 E I)',
      symbols: 'L2 free leg, L1 root leg, h thickness',
      validity: 'Thin arm, sharp corner, rigid root',
      source: { text: 'Exact thin-beam sum, derived', mark: 'derived' },
    },
    {
      name: 'U arm, thin beam',
      formula:
        'y = P / (E I) [L2^3/3 + R (pi L2^2 + 4 L2 R + pi R^2/2) + (L2^3 - (L2 - L1)^3)/3], eps = P (L2 + R) h / (2 E I)',
      symbols: 'R mean radius of the bend',
      validity: 'Thin arm, rigid root; strain at the crown without curvature',
      source: { text: 'Exact thin-beam sum, derived and checked by quadrature', mark: 'derived' },
    },
    {
      name: 'Corrected',
      formula: 'thick curved bar (Winkler-Bach) with normal and shear force, base that turns, root fillet',
      symbols: 'see the note on curved bars',
      validity: `Movement of the catch up to 20 % of the developed length; U arms within 2.5 % of finite elements`,
      source: source.ARM,
    },
    {
      name: 'Push-in and pull-out',
      formula: 'W = P (mu + tan a) / (1 - mu tan a)',
      symbols: 'a lead-in or return angle, mu friction',
      validity: 'Below the self-locking angle',
      source: source.WEDGE,
    },
  ],
  printing: [
    'Lay it on its side so that the strands follow the fold.',
    'Thickness in whole line widths, three or more; the gap between the legs at least 0.4 mm more than the undercut.',
  ],
  cautions: [
    'Batteries and spinning parts need a second retention beside a hook.',
    'Not for lifting, climbing, child safety or any load that can hurt someone if it lets go.',
    'Figures are estimates for a first print: prove them by test. Local codes and licensed practice come first.',
  ],
};

export default guide;
