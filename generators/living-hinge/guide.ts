import { DRAWN_RANGE } from '@/lib/mechanics/web-fold';
import type { Guide } from '../contract';
import * as source from '../web-sources';

const percent = (value: number): string => `${value * 100} %`;

const guide: Guide = {
  purpose: [
    'A living hinge joins two stiff leaves by a web thin enough to fold. It needs no pin, does not rattle and prints flat in one piece.',
    'Model builders use it for lids, hatch flaps and, long and thin, for control surfaces.',
  ],
  howItFails: [
    'The web cracks at the end of its fillet, on the stretched side, where the strain is highest.',
    'A web printed standing up parts between two layers at the first folds.',
    'Leaves pressed face to face over a flush web bend it up to three and a half times as sharply as an open fold: recess the web.',
    'In PLA, PETG, ABS and nylon a short web yields at once and lasts fewer than a thousand folds.',
  ],
  formulas: [
    {
      name: 'Strain of an even bend',
      formula: 'eps = t theta / (2 L)',
      symbols: 't web thickness, L web length, theta fold angle in radians',
      validity: 'Thin web, stiff leaves, leaves free to stand apart',
      source: {
        text: 'Articles on hinge geometry; plastics design compilations (as quoted)',
        mark: 'quoted',
      },
    },
    {
      name: 'Corrected peak strain',
      formula: 'eps_peak = Kt t theta / (2 Leff) (1 + 0.08 t theta / (2 L))',
      symbols:
        'Leff = L plus what the leaf edges give less what the fillets stiffen; Kt concentration of the fillet',
      validity:
        'Fillet 0.25 to 1 web thickness, leaf at least 2.5 web thicknesses; within 4 % of 22 finite-element cases',
      source: source.STRIP,
    },
    {
      name: 'Web length that stays elastic',
      formula: 'L = t theta / (2 eps_allow), or L = theta E t / (2 sigma_y)',
      symbols: 'eps_allow allowable strain, E modulus, sigma_y yield stress',
      validity: 'Elastic plastics; moulded polypropylene at 0.3 mm and 180 degrees needs 20 mm',
      source: source.ELASTIC_LENGTH,
    },
    {
      name: 'Moment to hold the fold',
      formula: 'M = E b t^3 theta / (12 L), at most sigma_y b t^2 / 4',
      symbols: 'b width along the fold',
      validity: 'Before drawing; a drawn web is thinner and softer',
      source: source.MOMENT,
    },
    {
      name: 'Drawn polypropylene web',
      formula: `${percent(DRAWN_RANGE.low)} <= t theta / (2 L) <= ${percent(DRAWN_RANGE.high)}`,
      symbols: 'nominal strain of the web as printed',
      validity: 'Polypropylene folded warm, strands across the fold; an elastic limit does not apply',
      source: source.DRAWN,
    },
    {
      name: 'Leaves pressed shut',
      formula: 'L = integral d theta / kappa, s = integral sin(theta) d theta / kappa',
      symbols: 's distance of the web exits at mid-thickness, kappa curvature',
      validity: 'Thin web that does not touch itself; s = 0.637 L bends evenly',
      source: source.ELASTICA,
    },
  ],
  printing: [
    'Print flat, web in two or more whole layers, strands across the fold line.',
    'Fold polypropylene a few times while it is still warm from the bed; it whitens and lasts longer.',
    'A recessed web is a bridge: keep it under 5 mm.',
    'Hinges longer than 150 mm fold more evenly in two or more sections.',
  ],
  cautions: [
    'Do not use a living hinge where its failure can hurt someone; give spinning parts and batteries a second retention.',
    'A control-surface hinge must be proved on the bench: pull it, fold it a thousand times, look at it before every flight. Local rules for model flying come first.',
  ],
};

export default guide;
