import type { Guide } from '../contract';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'Rows of slits, each shifted by half against the last, leave a panel hanging together by slim links. Bent, every link twists a little.',
    'So a stiff plastic goes round a corner: covers, boxes, cowls and roofs from one flat print.',
  ],
  howItFails: [
    'Links crack at mid-length, or tear at a slit end where a bridge is too short.',
    'Bent too far, the strips meet on the inner face and wedge each other apart.',
    'Pulled or sheared flat, the panel stretches and skews: it is no longer a panel in its own plane.',
  ],
  formulas: [
    {
      name: 'Twist of a link',
      formula: 'phi = theta / (n - 1)',
      symbols: 'theta bend angle, n rows of slits',
      validity: 'Rows alike; phi up to 20 degrees',
      source: source.GEOMETRY,
    },
    {
      name: 'Shear strain, handbook',
      formula: 'gamma = phi b (1 - (8/pi^2) sum 1/(n^2 cosh(n pi a / 2b))) / L',
      symbols: 'a, b longer and shorter side of the link, L overlap of the slits = pitch / 2 - bridge',
      validity: 'Saint-Venant bar with free ends',
      source: {
        text: 'Timoshenko & Goodier, Theory of Elasticity (from memory, agrees with the usual table)',
        mark: 'memory',
      },
    },
    {
      name: 'Corrected length',
      formula: "L' = L + w (1.10 + 0.97 ln(w/t) - 0.26 ln^2(w/t) + 0.23 s/w)",
      symbols: 'w link width, t panel thickness, s slit width',
      validity: 'w/t 0.25 to 2, bridge 1.2 to 5 w, s 0.25 to 1.25 w, L at least 2 w',
      source: source.LINK,
    },
    {
      name: 'Moment',
      formula: "M = 2 c G J phi / L'",
      symbols: 'c slits in a row, J torsion constant of a link, G modulus of shear',
      validity: 'As above',
      source: source.LINK,
    },
    {
      name: 'Slits close',
      formula: 'theta = (n - 1) s / t',
      symbols: 's slit width, t panel thickness',
      validity: 'Neighbouring strips turn against one another by twice the twist',
      source: source.GEOMETRY,
    },
    {
      name: 'Pull across the slits',
      formula: 'F = 2 c E t w^3 v / L^3, eps = 3 w v / L^2',
      symbols: 'v stretch of one row',
      validity: 'Flat panel, slim links; short links give more',
      source: source.PULL,
    },
  ],
  printing: [
    'Print flat, strands along the slits, links two or more whole lines wide.',
    'A slit under 0.4 mm strings shut: cut it free with a blade or widen it.',
    'Bend it for the first time slowly and warm; hold both ends, since it springs back.',
  ],
  cautions: [
    'A slit panel is no guard: it lets sparks, fingers and water through, and tears under a pull.',
    'Do not rely on it where its failure can hurt someone; batteries and spinning parts need a second retention.',
  ],
};

export default guide;
