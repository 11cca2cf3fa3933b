import type { Guide } from '../contract';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'Two arms slide into a flat housing and snap out through windows in its sides, where square faces hold them. Squeezing both pads lets go.',
    'The webbing is sewn to a slot, or drawn tight through the ladder-lock of the plug and held there by its own friction.',
    'The arms are strained only while they are pushed in or squeezed; locked, they stand straight and carry the pull.',
  ],
  howItFails: [
    'The arms crack at their roots when they are squeezed further than needed: a rail in the housing stops them first.',
    'The barbs shear off, or crush where they hold; usually the bar under the webbing bends and breaks before.',
    'Pulled hard, arms turn in and slip out of the windows where friction is low and the holding face stands far beside the arm.',
    'A housing printed on end splits between its layers.',
    'Sand in the housing stops the arms from springing out: listen for both clicks, pull to prove.',
  ],
  formulas: [
    {
      name: 'Strain of an arm',
      formula: 'eps = y h / (C l^2)',
      symbols: 'y movement of the barb, h root thickness, l arm length, C from the taper (2/3 for even arms)',
      validity: 'y up to 0.3 l; the corrected figure adds root, fillet and large movement, y up to 0.4 l',
      source: source.ARM,
    },
    {
      name: 'Push to close',
      formula: 'W = 2 P (mu + tan a)/(1 - mu tan a)',
      symbols: 'P force across one arm, a lead-in, mu friction',
      validity: 'Both arms alike',
      source: source.WEDGE,
    },
    {
      name: 'Barb',
      formula: 'F = 2 x 0.577 s t p',
      symbols: 's tensile strength, t plug thickness, p pad length',
      validity: 'Short time, solid print, layers flat',
      source: source.SHEAR,
    },
    {
      name: 'Arm under pull',
      formula: 's = F/2 (1/(h t) + 6 e/(t h^2))',
      symbols: 'e from the middle of the arm to the middle of what holds, h tip thickness',
      validity: 'Both arms alike; the prop of the window wall left out, on the safe side',
      source: source.ARM_PULL,
    },
    {
      name: 'Bar under webbing',
      formula: 'M = F w/8 on hinges, F w/12 built in',
      symbols: 'w webbing width; a ladder-lock counts twice the pull',
      validity: 'Webbing lies even over its width',
      source: source.BAR,
    },
    {
      name: 'Slipping out',
      formula: 'mu >= 3 e / (2 L)',
      symbols: 'L arm length',
      validity: 'Square holding face, at rest',
      source: source.SLIP,
    },
  ],
  printing: [
    'Print both flat, solid (all walls), without supports: the roof of the housing bridges from the rail to the side wall.',
    'The plug is one flat shape: break the sharp edge of its first layer, or the arms scrape.',
    'Try the fit without webbing first: the plug should drop out when squeezed. Change the clearance, not the scale.',
  ],
  cautions: [
    'Never for lifting, climbing, towing, fall protection, car seats, helmets, carrying or securing people or animals, or anything for child safety.',
    'Not as the only thing that holds a load which can hurt someone or block a road when it lets go. Small parts are no toys.',
    'Figures are estimates for a first print: prove it with three times the pull, well away from people, and again each season. Sun, frost and cleaning agents weaken plastics.',
    'Local codes and licensed practice come first.',
  ],
};

export default guide;
