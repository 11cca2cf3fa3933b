import type { Guide } from '../contract';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'A plug stopper shuts a round hole by being a little too large for it. Ribs take the squeeze, a taper lets it start.',
    'Model builders use it for drains, filler holes and tube ends.',
  ],
  howItFails: [
    'Too much squeeze: a stiff plug cannot be pushed in by hand, or its hollow wall dimples.',
    'The squeeze fades over weeks because the plastic relaxes; a plug that sealed lets water by.',
    'A seam or a stair on a rib leaks whatever the pressure is.',
    'Printed lying, the flange breaks off between two layers.',
  ],
  formulas: [
    {
      name: 'Squeezed plug',
      formula: 'p = E i / (a ((a^2 + b^2)/(a^2 - b^2) - nu)); solid: p = E i / (a (1 - nu))',
      symbols: 'p pressure, i squeeze on the radius, a radius of the ribs, b of the cavity, nu Poisson ratio',
      validity: 'Rigid bore, disc free at its faces, strain up to 20 %',
      source: source.LAME,
    },
    {
      name: 'Strain of a hollow wall',
      formula: 'eps = (i/a) 2 a^2/(a^2 - b^2) / ((a^2 + b^2)/(a^2 - b^2) - nu) (1 + 0.17 sqrt(s/b))',
      symbols: 's wall thickness; the last factor is the bending at the open end',
      validity: 'As above; the end factor comes from rings loaded at their end and is used on the safe side',
      source: source.OPEN_END,
    },
    {
      name: 'Bounds of the radial force',
      formula: 'p 2 pi a n w <= N <= 2 E (i/a) V / ((1 - nu) a)',
      symbols: 'n ribs of width w, V volume of the whole plug',
      validity: 'Linear, no friction along the axis',
      source: source.RADIAL,
    },
    {
      name: 'Push-in and pull-out',
      formula: 'in: N ((mu + tan al)/(1 - mu tan al) + (n - 1) mu) / n; out: mu N',
      symbols: 'al lead-in angle, mu friction',
      validity: 'Below self-locking, mu tan al < 1; friction is that of the plastic on itself',
      source: source.WEDGE,
    },
  ],
  printing: [
    'Stand it on its flange; no supports are needed, the ribs rise at 45 degrees.',
    'Put the seam where a scar is least in the way, or scatter it; a scar along all ribs is a leak.',
    'Measure the bore. Printed bores come out small, printed plugs large.',
  ],
  cautions: [
    'Not for pressure, gas, fuel, steam or hot water: a plug under pressure is a projectile.',
    'Not for drinking water or food: printed plastics and their gaps are not made or cleaned for it.',
    'Not a bung for a hull that carries people, and not within reach of small children.',
    'Figures are estimates for a first print: prove them by test. Local codes and licensed practice come first.',
  ],
};

export default guide;
