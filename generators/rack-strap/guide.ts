import type { Guide } from '../contract';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'A strap with teeth goes round the bundle and through its own head; a pawl clicks over the teeth and does not let them back.',
    'With a tab the pawl is lifted by a finger and the strap is used again; without, a guard covers it and the strap is cut.',
    'It is printed standing on its edge, so that band, teeth and pawl are drawn by strands and not stacked from layers.',
  ],
  howItFails: [
    'The band cracks at the root of a tooth: teeth hardly bend, the band between them takes their turn. Round a small bundle that is two to three times the strain of a plain strip.',
    'The pawl cracks at its root from many clicks, or stays lifted because it crept under a half-seated tooth.',
    'The teeth shear off, or the pawl crumples, when the strap is pulled harder than it was made for.',
    'The bundle eases by up to one click after the last pull; soft bundles ease more.',
  ],
  formulas: [
    {
      name: 'Band on the bundle',
      formula: 'eps = K t/2 (1/R - 1/R0),  R = (U - l)/(2 pi);  plain band t/(D + t)',
      symbols:
        't band under the teeth, U one turn round the bundle, l length of the straight head, K from the teeth',
      validity: 'Mean over the band; beside the head it is bent more than that',
      source: source.WRAP,
    },
    {
      name: 'Teeth',
      formula: 'K = (1 + 0.252 (r/t)^-0.71) / (v/p + (1 - v/p)/(1 + 0.28 (w/t)^1.6))',
      symbols: 'r root radius, p pitch, v flat between teeth (0.4 p), w = p - v',
      validity: 'r/t 0.1 to 0.45, w/t 1.1 to 3; fitted to plane finite elements, within 8 %',
      source: source.WRAP,
    },
    {
      name: 'Pawl',
      formula: 'eps = 1.5 h y / l^2',
      symbols: 'h pawl thickness, l its length, y overlap of the teeth',
      validity: 'y up to 0.3 l; the corrected figure adds root and fillet',
      source: source.PAWL,
    },
    {
      name: 'Drawing tighter',
      formula: 'F = P ((mu + tan a)/(1 - mu tan a) + mu)',
      symbols: 'P force that lifts the pawl, a angle of the ramps, mu friction',
      validity: 'Without the tension of the bundle',
      source: source.WEDGE,
    },
    {
      name: 'Teeth under pull',
      formula: 'F = 0.577 s b w (1 + (n - 1)/2)',
      symbols: 's tensile strength, b band width, n teeth on the pawl; from the first alone to all alike',
      validity: 'Short time, printed on edge',
      source: source.TOOTH,
    },
    {
      name: 'Pawl under pull',
      formula: 's = F (1/(B h) + 3 e/(B h^2))',
      symbols: 'B width of the head, e from the middle of the pawl to the middle of what holds',
      validity: 'Its end held down by the band',
      source: source.PROP,
    },
  ],
  printing: [
    'Print it standing on its edge with a brim; the band as two or three full lines, no infill, slow. Curved, it takes less of the bed and is bent less.',
    'Wipe strings out of the passage and work the pawl by hand a few times before the band goes in.',
    'TPU, polypropylene and nylon take the bend; stiff plastics only round wide bundles. Let nylon take up moisture first.',
    'Print a short head and ten teeth to try the click before the whole strap.',
  ],
  cautions: [
    'Never for lifting, climbing, towing, securing people or animals, restraint, or anything for child safety; keep away from necks.',
    'Not the only thing that holds a load, a battery or a spinning part: give it a second retention.',
    'A strap under pull creeps and may let go after weeks; sun and frost make it brittle. Cut permanent ones with the eyes protected.',
    'Figures are estimates for a first print: prove it with three times the pull. Local codes and licensed practice come first.',
  ],
};

export default guide;
