import type { Guide } from '../contract';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'A knuckle hinge turns on a pin. Printed in one another, leaves and pin leave the bed as a hinge that already turns.',
    'It works in any plastic and turns as often as you like, where a folding web would crack.',
  ],
  howItFails: [
    'Too small a gap fuses pin and knuckles in the print; forcing it then breaks a knuckle off.',
    'The pin shears or bends where it leaves its fixed knuckles, sooner when printed standing.',
    'A narrow hinge with a wide gap wobbles, and its lid misses its catch.',
  ],
  formulas: [
    {
      name: 'Gap a side',
      formula: 'gap >= table(plastic, fit)',
      symbols: 'slip 0.20 mm, PETG 0.30 mm; free 0.40 mm',
      validity: 'A desktop printer in order; replace it by what your own fit coupon measured',
      source: { text: 'Clearance notes for desktop printers (as quoted)', mark: 'quoted' },
    },
    {
      name: 'Shear of the pin',
      formula: 'tau = (4/3) F / (2 n A)',
      symbols: 'F pull, n bored knuckles, A section of the pin',
      validity: 'Load shared evenly; limit half of 0.577 of the strength',
      source: source.PIN,
    },
    {
      name: 'Bending of the pin',
      formula: 'sigma = (F / n) L / 12 / (pi d^3 / 32)',
      symbols: 'L bored knuckle with its gaps, d pin diameter',
      validity: 'Pin held fast on both sides; on the safe side, since contact gathers near the ends',
      source: source.PIN,
    },
    {
      name: 'Play at the outer corner',
      formula: 'gap + leaf 2 gap / span',
      symbols: 'span from the first to the last bored knuckle',
      validity: 'Stiff leaves',
      source: source.GEOMETRY,
    },
    {
      name: 'Opening past flat, no stop',
      formula: '2 atan(edge / radius)',
      symbols: 'edge of a leaf from the axis, barrel radius',
      validity: 'Until the backs of the leaves meet',
      source: source.GEOMETRY,
    },
  ],
  printing: [
    'Print it open and flat. Slow the first layers under the pin, and keep the seam away from the bore.',
    'Break it loose once while still warm; a drop of oil or candle wax helps afterwards.',
    'It prints open, so a stop can only hold it flat or past flat.',
  ],
  cautions: [
    'Not for doors, seats, ladders or anything that hurts someone when it lets go.',
    'A control-surface hinge must be proved on the bench before every flight; local rules for model flying come first.',
  ],
};

export default guide;
