import type { Guide } from '../contract';
import { PROFILE } from '../screw-sources';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'A printed thread needs air, and how much depends on printer, plastic and layer height. The holes of this plate have more and more of it; one stud tries them all.',
    'The figure beside a hole is its clearance a side in hundredths of a millimetre: the number to type into caps and pots.',
  ],
  howItFails: [
    'The stud does not enter: the first layer of the hole is squashed, or the ridges are too thick. Try from the other side.',
    'It turns hard and squeals: ridges rub all along. One step wider is right.',
    'It wobbles and can be pulled over the ridges: too little overlap is left.',
  ],
  formulas: [
    {
      name: 'Sizes of the hole',
      formula: 'diameters of the profile + 2 c on the radius, c along the axis at each flank',
      symbols: 'c clearance a side',
      validity: 'The stud keeps the basic size',
      source: PROFILE['iso-metric'],
    },
    {
      name: 'Overlap',
      formula: '(H - c) / H',
      symbols: 'H depth of engagement',
      validity: 'Straight in the hole; a stud that leans has less on one side',
      source: source.OVERLAP,
    },
  ],
  printing: [
    'Print plate and stud at once, standing as they lie here, with the layer height of your caps.',
    'Start at the widest hole and go down. Turn the stud in by hand, never with pliers.',
    'Read: the narrowest hole in which it runs freely from end to end is your clearance for threads that are opened often; one step narrower for those that stay shut.',
  ],
  cautions: [
    'Nothing here tells that a thread holds pressure, heat or a load that can hurt someone.',
    'Printed threads are not for food or drinking water unless resin, additives, nozzle and local rules allow it.',
  ],
};

export default guide;
