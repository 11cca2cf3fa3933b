import type { Guide } from '../contract';
import * as source from '../web-sources';

const guide: Guide = {
  purpose: [
    'Whether a folding web lasts hangs on the plastic, on how the layers hold and on the first folds. This ladder folds several webs of the same length, each a layer thicker.',
    'Each hinge is marked with the layers in its web.',
  ],
  howItFails: [
    'A web cracks at the edge of a leaf within a few folds: too thick, or too brittle a plastic.',
    'It whitens and thins evenly: polypropylene draws, and such a hinge lasts.',
    'It peels layer from layer: too cold a print, or strands that run along the fold.',
  ],
  formulas: [
    {
      name: 'Strain of an evenly bent web',
      formula: 'eps = t theta / (2 L)',
      symbols: 't thickness, theta fold angle in rad, L web length',
      validity: 'Leaves stiff; the fillets concentrate it, see the living hinge',
      source: source.STRIP,
    },
  ],
  printing: [
    'Print it flat with whole layers in every web, strands across the fold line.',
    'Fold every hinge fully three times while it is still warm from the bed, then count folds by hand, one a second.',
    'Read: the thickest web that still holds after the folds you need is the one to build. Note layers, plastic and count.',
  ],
  cautions: ['Counts by hand are few; a hinge that must not let go needs a second fastening.'],
};

export default guide;
