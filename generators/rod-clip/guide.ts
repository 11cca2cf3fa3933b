import type { Guide } from '../contract';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'A rod clip is an open ring that a rod snaps into from the side and that holds it by going more than half way round.',
    'Model builders use it for spars, rigging, booms, cables and tools on the bench.',
  ],
  howItFails: [
    'The bore cracks just above the stem, where the strain is highest while the rod passes the lips.',
    'Printed standing, the ring parts between two layers at its sides.',
    'An undersized bore grips at first and lets go after weeks, because the plastic relaxes.',
    'Pulled towards the mouth it lets go: a clip is a holder, not a lock.',
  ],
  formulas: [
    {
      name: 'Thin open ring',
      formula: 'delta = P R^3 f(beta) / (E I), f = beta (1/2 + cos^2 beta) - 0.75 sin 2 beta',
      symbols:
        'delta give of each lip, P force at each lip, R mean radius, beta half the wrap angle, I = b h^3 / 12',
      validity: 'Thin wall, clamped at its back, small opening',
      source: { text: 'Castigliano theorem, derived and checked by quadrature', mark: 'derived' },
    },
    {
      name: 'Strain of the thin ring',
      formula: 'eps = delta h (1 - cos beta) / (2 R^2 f)',
      symbols: 'h wall thickness',
      validity: 'As above; 5 to 16 % low for thick walls',
      source: { text: 'Castigliano theorem, derived and checked by quadrature', mark: 'derived' },
    },
    {
      name: 'Corrected ring',
      formula:
        'thick curved bar from the edge of the stem, root turning by 10.5 M / (E b h^2), stress of Winkler-Bach',
      symbols: 'M moment at the stem, rn = h / ln(ro / ri) neutral radius',
      validity: 'Give of each lip up to 0.6 of the mean radius; within 5 % of 16 finite-element clips',
      source: source.RING,
    },
    {
      name: 'Push-on and pull-off',
      formula: 'W = 2 P (mu + tan a) / (1 - mu tan a)',
      symbols: 'a flare angle when pushing on, wrap angle / 2 - 90 degrees when pulling off, mu friction',
      validity: 'Below the self-locking angle atan(1 / mu)',
      source: source.WEDGE,
    },
  ],
  printing: [
    'Lay the clip on its side: the layers then run round the ring.',
    'Use walls in whole line widths, at least three; the seam belongs on the foot, away from the bore.',
    'Holes and bores come out small: measure one and adjust the play.',
  ],
  cautions: [
    'Not for lifting, climbing, child safety or any load that can hurt someone if it lets go.',
    'Batteries and spinning parts need a second retention beside a clip.',
    'Figures are estimates for a first print: prove them by test. Local codes and licensed practice come first.',
  ],
};

export default guide;
