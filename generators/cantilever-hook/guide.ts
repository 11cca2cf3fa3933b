import type { Guide } from '../contract';
import { CORRECTED, GUIDE } from './sources';

const guide: Guide = {
  purpose: [
    'A straight arm carries a catch. Pushed into a window the arm bends, the catch passes the edge and the arm springs back: closed, nothing is bent any more.',
    'For hatches, lids and panels that go on in a straight line and have room for an arm at least five times as long as it is thick.',
  ],
  howItFails: [
    'The root cracks: the strain is highest where the arm meets its base, and a sharp corner makes it much higher.',
    'A thin wall under the arm cracks first, where the fillet runs out into it.',
    'Printed standing up, the layers of the arm part at a fraction of the strain.',
    'Held bent for weeks, the arm creeps and the catch no longer comes out far enough.',
    'It opens by itself: a shallow return angle and a slippery plastic let go under a small pull.',
  ],
  formulas: [
    {
      name: 'Strain at the root',
      formula: 'eps = y h / (C l²)',
      symbols:
        'y undercut, h thickness at the root, l length of the arm; C = 0.67 for an even arm, 1.09 for a tip of half the thickness, 0.86 for a tip of a quarter of the width, other tapers by integration',
      validity: 'Rigid root, no fillet, y up to l/8; not used past 0.3 l',
      source: GUIDE,
    },
    {
      name: 'Deflection force',
      formula: 'P = (b h² / 6) Es eps / l',
      symbols: 'b, h width and thickness at the root, Es secant modulus at the working strain',
      validity: 'As above',
      source: GUIDE,
    },
    {
      name: 'Mating and separation force',
      formula: 'W = P (mu + tan a) / (1 - mu tan a)',
      symbols: 'mu friction, a lead-in or return angle; locks where mu tan a reaches 1',
      validity:
        'One hook on a rigid mate; friction is known to half of its value at best, so a band is shown',
      source: GUIDE,
    },
    {
      name: 'Corrected force',
      formula: 'E b y / P = 4 λ³ + 2.4 (1 + nu) λ + phi (λ + beta)²',
      symbols:
        'λ = (l - 0.65 R)/h with R the root fillet; phi and beta say how far the base turns; written for an even arm, integrated along tapers and with the lever that shortens as the arm turns',
      validity:
        'l/h from 2, y up to l/2; elastic plastic, no layers; within 5 % of finite elements, exceptions in the README of the family',
      source: CORRECTED,
    },
    {
      name: 'Corrected peak strain',
      formula: 'eps = Kt · 6 P (l - R) / (E b h²), Kt = 1 + 0.173 (R/h)^-0.766',
      symbols:
        'taken where the fillet ends; a thin wall under the arm or a thin tip is checked too and the largest counts',
      validity: 'R/h from 0.1 to 1',
      source: CORRECTED,
    },
  ],
  printing: [
    'Lay the hook on its side so that the strands run along the arm.',
    'Make the root at least 1.2 mm thick and 5 mm wide, in whole line widths.',
    'Leave 0.2 to 0.4 mm of clearance on each side of the window; measure your printer with a coupon.',
    'Chamfer or round the mouth of the window: the first layer spreads outwards.',
  ],
  cautions: [
    'Not for lifting, climbing, life support, child safety or any load that can hurt someone if it lets go.',
    'Batteries and spinning parts need a second retention besides the hook.',
    'Numbers are estimates for a first print: prove them by test, in the plastic and the printer that will make the part.',
    'Local codes and licensed practice come first.',
  ],
};

export default guide;
