import type { Guide } from '../contract';
import * as source from '../screw-sources';

const guide: Guide = {
  purpose: [
    'A pot with its own screw lid for shot, powder, drills or rigging bits. You name the room inside; thread, neck and lid follow from it.',
    'Straight, the mouth is as wide as the room. Flush, the neck is drawn in under the lid and both are one cylinder that packs well.',
  ],
  howItFails: [
    'The thread is sheared along its layers, or a soft lid is wedged apart and jumps its thread.',
    'The pot parts between two layers under the thread when it is dropped on its lid.',
    'Flat flanks printed standing sag and bind; the printed profile, thin layers and clearance help.',
    'A disc that is too hard or a rim that is too wide wants more torque than a hand gives, and never seals.',
    'A two-start lid with little friction turns back when it is shaken.',
  ],
  formulas: [
    {
      name: 'Thread on the wall',
      formula: 'd = D + 2 w + depth of the profile; flush: d = D + 2 w - 2 wl - 2 c',
      symbols: 'D inside diameter, w pot wall, wl lid wall, c clearance per side',
      validity:
        'Pitch by size: 2.5 mm up to 20 mm outside, 3 to 34, 4 to 50, 5 to 75, then 6; common practice',
      source: source.GEOMETRY,
    },
    {
      name: 'Room',
      formula: 'V = pi r^2 h, flush: + pi/3 (r - rm)(r^2 + r rm + rm^2) + pi rm^2 hn',
      symbols: 'r room, rm mouth, h straight height, hn height of the neck; dividers taken off',
      validity: 'True circles, to the rim',
      source: source.GEOMETRY,
    },
    {
      name: 'Bedding the disc',
      formula: 'F = 1.4 MPa pi (ro^2 - ri^2),  T from the power screw, K F d beside it',
      symbols: 'ro, ri the flat of the rim between its chamfers',
      validity: 'Rubber of 75 Shore A and harder; foam and softer rubber need none',
      source: source.SEAT,
    },
    {
      name: 'Stripping',
      formula: 'A = pi (Le/P) D (P/2 + t (d2 - D)),  F = c tau A',
      symbols:
        'Le engaged length, t mean tan of the flanks, tau 0.577 of the strength across layers, c 0.5 to 0.7',
      validity: 'Axis upright in the print',
      source: source.STRIPPING,
    },
    {
      name: 'Self-locking',
      formula: 'mu / cos b > l / (pi d2)',
      symbols: 'l lead, b load flank; judged at the lowest friction of the band',
      validity: 'At rest; shaking lowers friction',
      source: source.SCREW,
    },
  ],
  printing: [
    'Print the pot standing and the lid on its top, threads upright, three walls or more, seam at the start of the thread.',
    'Print the hard disc in TPU, or cut it from rubber or closed-cell foam; it drops past the thread of the lid.',
    'Start with 0.25 mm of clearance per side and turn a short ring of both threads before the whole pot is printed.',
    'Dust the thread with a little candle wax if it squeaks. Never mend a tight thread by scaling the part.',
  ],
  cautions: [
    'Food, drinking water and medicine: not for them. Whether a printed pot may touch them depends on the exact resin, its additives, the nozzle and local rules, and layers hold germs.',
    'Not for pressure, hot liquids, fuel, solvents or batteries that may vent; not a child-resistant closure. Small parts and lead shot are no toys.',
    'Printed walls seep: prove the pot with water on paper before you trust it. Local codes and licensed practice come first.',
  ],
};

export default guide;
