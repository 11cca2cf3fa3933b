import type { Guide } from '../contract';
import * as source from './sources';

const guide: Guide = {
  purpose: [
    'Every printer leaves its own gap, and every plastic another. This plate has holes with stepped gaps, a pin and a tongue to try them with.',
    'What it tells, hinges, caps, buckles and plugs need to know before they fit at the first print.',
  ],
  howItFails: [
    'The pin goes into none of the holes: the flow is too high, or the first layer is squashed. Mend the printer first.',
    'It goes in from one side only: the first layer spreads. Try from the top.',
    'Round and flat tell different gaps: corners bulge, small circles shrink. Keep both figures.',
  ],
  formulas: [
    {
      name: 'Gap a side',
      formula: 'gap = (hole - pin) / 2',
      symbols: 'the figure beside a hole is its gap in hundredths of a millimetre',
      validity: 'As drawn; what the print makes of it is what you find out',
      source: source.GEOMETRY,
    },
  ],
  printing: [
    'Print with the nozzle, layers and speed of the part you want to fit, all three bodies at once.',
    'Let it cool. Start at the widest hole and go down.',
    'Read: the narrowest hole that the pin enters with a firm push is a snug fit, the narrowest in which it slides by its own weight when turned over is a slip fit, the first that rattles is a free fit.',
    'Write down all three for round and for flat, with printer, plastic and layer height.',
  ],
  cautions: ['Do not hammer a pin home: it splits along its layers and the splinters are sharp.'],
};

export default guide;
