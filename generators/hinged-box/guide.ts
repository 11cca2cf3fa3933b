import { DRAWN_RANGE } from '@/lib/mechanics/web-fold';
import type { Guide } from '../contract';
import * as web from '../web-sources';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'Box and lid are printed open, side by side, joined by a web at the back. Folded over, a catch at the front snaps under a keeper.',
    'Nothing to assemble and nothing to lose: for receivers, bits and leads.',
  ],
  howItFails: [
    'In PLA, PETG or ABS the web cracks at the first folds; polypropylene and TPU last.',
    'The catch arm stands on the bed: bent too far it parts between two layers at its foot.',
    'A web with too little recess is folded sharply when the rims meet; one with too much is torn.',
  ],
  formulas: [
    {
      name: 'Web',
      formula: `eps = t theta / (2 L); drawn polypropylene ${DRAWN_RANGE.low * 100} to ${DRAWN_RANGE.high * 100} %`,
      symbols: 't web thickness, L web length, theta half a turn; corrected as the living hinge',
      validity: 'Walls stiff against the web',
      source: web.STRIP,
    },
    {
      name: 'Web ends apart when closed',
      formula: 's / L = (2 (recess + t/2) + rim gap) / L, even at 0.637',
      symbols: 's distance of the web ends at mid-thickness',
      validity: 'Thin web that does not touch itself',
      source: web.ELASTICA,
    },
    {
      name: 'Catch arm',
      formula: 'eps = 1.5 h y / l^2',
      symbols: 'h arm thickness, y undercut, l arm length; corrected for root, fillet and width',
      validity: 'y up to half of l, l at least 2 h; limit across the layers',
      source: source.ARM,
    },
    {
      name: 'Closing and opening force',
      formula: "W = P (mu + tan(a + psi)) / (1 - mu tan(a + psi)), opening with a' - psi",
      symbols: 'psi lean of the arc: drop of the keeper below the axis over its distance from it',
      validity: 'Below self-locking',
      source: source.WEDGE,
    },
  ],
  printing: [
    'Print it open, floors down. The web is a bridge: strands across the fold, cooling on, 5 mm at most.',
    'Fold it at once while warm, several times; polypropylene whitens and lasts.',
    'Polypropylene warps: a wide brim, a sheet of polypropylene on the bed.',
  ],
  cautions: [
    'Not watertight and not for food without checking resin, additives and local rules.',
    'Batteries need a second retention and a case that does not burn; small parts keep away from children.',
  ],
};

export default guide;
