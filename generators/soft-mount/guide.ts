import type { Guide } from '../contract';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'A soft mount carries a mass on a spring so soft that fast shaking from below hardly arrives: a camera above an engine, a receiver beside a motor.',
    'Columns of TPU are stiff upright and soft sideways. S-springs are soft upright and print in any plastic without supports.',
  ],
  howItFails: [
    'Too stiff for its mass: below root two times its natural frequency a mount makes shaking worse.',
    'Slim columns give way sideways under a knock.',
    'Held for weeks the plastic creeps, the mount sags and at last stands on its stops.',
    'The strip of an S tears on the inside of a bend.',
  ],
  formulas: [
    {
      name: 'Bonded block, handbook',
      formula: 'k = E A (1 + 2 S^2) / h, S = a / (4 h)',
      symbols: 'a side, A section, h height, S shape factor: loaded over free area',
      validity: 'Short blocks between stiff plates',
      source: {
        text: 'Gent & Lindley, Proc. Instn. Mech. Engrs. 173 (1959) (from memory)',
        mark: 'memory',
      },
    },
    {
      name: 'Column, corrected',
      formula: 'k = E A / (h - 0.163 a)',
      symbols: 'held ends take part of the height',
      validity: "h 0.5 to 6 a, Poisson's ratio 0.44 to 0.49, small strain",
      source: source.COLUMN,
    },
    {
      name: 'Column sideways',
      formula: 'k = 1 / (h1^3 / (12 E I) + 1.2 h2 / (G A)), h1 = h - 0.119 a, h2 = h - 0.045 a',
      symbols: 'upper plate kept from turning',
      validity: 'As above',
      source: source.SWAY,
    },
    {
      name: 'S-spring',
      formula: 'd = int (M m / (E A e R) + N n / (E A) + ...) ds, stress M y / (A e (rn - y)) + N / A',
      symbols: 'half of the S as a thick curved arm, its middle free of moment',
      validity: 'Two strips, mirrored; radius at least the thickness; travel to a fifth of the height',
      source: source.SPRING,
    },
    {
      name: 'Natural frequency, isolation',
      formula: 'f = sqrt(k / m) / (2 pi), isolates from 1.414 f',
      symbols: 'k stiffness, m mass',
      validity: 'One mass, one direction; plates and what they stand on stiff',
      source: source.VIBRATION,
    },
    {
      name: 'Knock',
      formula: 'x = d + sqrt(d^2 + 2 d h), eps = x times the strain for each mm',
      symbols: 'd sag at rest, h height of the fall',
      validity: 'Travel to a fifth of the free height; past it not known',
      source: source.KNOCK,
    },
    {
      name: 'Columns give way',
      formula: '1 / P = h1^2 / (pi^2 E I) + 1.2 / (G A)',
      symbols: 'P load of one column',
      validity: 'Plate free to shift; on the safe side',
      source: source.BUCKLING,
    },
  ],
  printing: [
    'Print it lying on its long side; TPU slowly, dry and without retraction storms.',
    'Strips in whole line widths: two lines at least, solid.',
    'Screw both plates to something stiff. A soft plate bends along and adds its own spring.',
  ],
  cautions: [
    'Give what it carries a second retention, a loose cord for instance: creep, heat and knocks loosen soft mounts.',
    'Not for loads over people, for vehicles on roads or for anything that hurts someone when it comes off.',
    'Spinning parts need a guard. The numbers are for a first print: shake it, look at it again after a month.',
  ],
};

export default guide;
