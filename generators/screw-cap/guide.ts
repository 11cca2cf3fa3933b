import type { Guide } from '../contract';
import * as source from '../screw-sources';

const guide: Guide = {
  purpose: [
    'A neck with a thread outside and a cap with a thread inside close an opening that is used again and again: ballast and glue pots, a filler, a port in a deck.',
    'Both are printed standing. The profile called printed is made for that: its hanging flanks lean by 45 degrees, so each layer steps out no further than it is high.',
  ],
  howItFails: [
    'The thread is sheared along its layers, neck ridges at the crest of the cap or cap ridges at the crest of the neck, whichever is weaker. Hands rarely reach that load above 20 mm; small threads and screws that carry a load do.',
    'A slender neck parts between two layers under the thread.',
    'A soft cap is wedged apart by its own flanks and jumps the thread without breaking.',
    'Flat flanks printed standing sag: the thread binds, or grinds itself to dust. Steep profiles, thin layers and clearance help.',
    'A plug with too much interference splits the neck along its height, or creeps until it no longer seals.',
    'A steep thread of several starts and little friction lets go by itself when shaken.',
  ],
  formulas: [
    {
      name: 'Metric profile',
      formula: 'd2 = d - 0.649519 P,  D1 = d - 1.082532 P,  d3 = d - 1.226869 P',
      symbols:
        'd major diameter, P pitch, d2 pitch diameter, D1 minor diameter of the cap, d3 root of the neck',
      validity: 'Basic sizes; the roots are drawn flat at d3 where the standard has a small radius',
      source: source.PROFILE['iso-metric'],
    },
    {
      name: 'Trapezoidal profile',
      formula: 'd2 = d - P/2,  D1 = d - P,  d3 = d - P - 2 ac,  D4 = d + 2 ac',
      symbols: 'ac crest clearance: 0.15 mm below P = 2, 0.25 below 6, 0.5 below 14, 1 above',
      validity: 'Basic sizes, flanks 15 degrees',
      source: source.PROFILE.trapezoidal,
    },
    {
      name: 'Knuckle profile',
      formula: 'd2 = d - P/2,  d3 = d - P,  D1 = d - 0.9 P,  D4 = d + 0.1 P',
      symbols: 'crests and roots are arcs that touch the 15 degree flanks',
      validity: 'The root of the ridge is cut 0.02 P above the standard so that turns do not run together',
      source: source.PROFILE.knuckle,
    },
    {
      name: 'Printed profile',
      formula: 'depth P/3,  d2 = d - P/3,  D1 = d3 = d - 2P/3',
      symbols: 'load flank 45 degrees, free flank 30, crests 0.237 P wide',
      validity: 'Ours; a 28-400 bottle finish is met with P = 4.233',
      source: source.PROFILE.printed,
    },
    {
      name: 'Stripping',
      formula: 'A = pi (Le/P) D (P/2 + t (d2 - D)),  F = c tau A',
      symbols:
        'Le engaged length, D the crest of the mate with its clearance, t = (tan b1 + tan b2)/2, tau = 0.577 of the strength across the layers, c = 0.6 (0.5 to 0.7)',
      validity:
        'Axis upright in the print; basic sizes give 0.750 pi D1 Le and 0.875 pi d Le for the metric profile',
      source: source.STRIPPING,
    },
    {
      name: 'Torque and pull',
      formula: 'T = F (d2/2) (l + pi mu d2 / cos b)/(pi d2 - mu l / cos b) + mu F rc',
      symbols:
        'l lead, b load flank, mu friction, rc radius where cap and rim rub; handbook T = K F d, K = 0.3',
      validity: 'Dry plastic on itself, friction +- 50 %',
      source: source.SCREW,
    },
    {
      name: 'Self-locking',
      formula: 'mu / cos b > l / (pi d2)',
      symbols: 'judged at the lowest friction of the band',
      validity: 'At rest; shaking lowers friction',
      source: source.SCREW,
    },
    {
      name: 'Plug seal',
      formula: 'p/E = (i/d)/(Wh + Ws),  eps = p/E (Wh + nu)',
      symbols:
        'i interference on the diameter d, Wh = (D^2 + d^2)/(D^2 - d^2) of the neck, Ws = (d^2 + di^2)/(d^2 - di^2) of the plug',
      validity: 'Equal plastics, contact longer than a wall; raised at the rim by 1 + 0.17 sqrt(s/ri)',
      source: source.RING_END,
    },
    {
      name: 'Step of a hanging flank',
      formula: 'step = layer / tan b, at most the depth of the ridge',
      symbols: 'b angle of the flank from the plane square to the axis',
      validity: 'Axis upright; 0.2 mm layers: 0.346 mm at 30 degrees, 0.746 at 15, 0.2 at 45',
      source: source.LINE,
    },
  ],
  printing: [
    'Print both with the thread axis upright: the neck on its flange, the cap on its top. Slow outer walls and full cooling on the threads.',
    'Use three or more walls, so that the ridges are solid; put the seam where the thread begins.',
    'Start with 0.2 mm of clearance per side and print a short ring of both threads before the whole part. Free turning wants 0.3 to 0.4 mm with PETG.',
    'Prefer a pitch of 2 mm or more with a 0.4 mm nozzle. Never mend a tight thread by scaling the part: change the clearance.',
    'Two printed faces do not seal liquids. Lay in a disc or ring of TPU, rubber or foam, or use the plug.',
  ],
  cautions: [
    'Food and drinking water: whether a printed closure may touch them depends on the exact resin, its additives, the nozzle and local rules, and layers hold germs. Do not use it for either unless you know all of them.',
    'Not for pressure: no boilers, fizzy drinks, gas or vacuum vessels. A printed cap can burst off; nothing here checks it for pressure.',
    'Not for hot liquids, fuels or solvents unless the plastic is known to stand them; not a child-resistant closure.',
    'A port below the waterline needs a second barrier: a cap can back off or crack. Local codes and licensed practice come first.',
  ],
};

export default guide;
