import { formatQuantity } from '@/lib/units';
import { type Figure, judgedFigure, plainFigure } from '../report';
import { entryTravel, padProud, squeezeTravel } from './layout';
import * as source from './sources';
import { inGuideRange, type Subject } from './subject';

const mm = (value: number): string => formatQuantity(value, 'mm');

function armFigures({ p, strain, allowable, trouble }: Subject): Figure[] {
  const figure = (id: string, label: string, which: Subject['strain']['entry'], because: string) =>
    judgedFigure({
      id,
      label,
      unit: 'strain',
      value: trouble ? null : which.peak,
      handbook: inGuideRange(p) ? which.handbook : null,
      limit: allowable.value,
      because: trouble ? `Not known: ${trouble}.` : because,
      source: source.ARM,
    });
  return [
    figure(
      'peak-strain',
      'Peak strain, squeezed to the stop',
      strain.squeeze,
      `At the root fillet of an arm whose barb is squeezed in by ${mm(squeezeTravel(p))}, where the rail in the housing stops it. Less squeeze past the edge, a longer or thinner arm help.`,
    ),
    figure(
      'entry-strain',
      'Peak strain while pushing in',
      strain.entry,
      `The barbs pass the wall by ${mm(entryTravel(p))}: their height less the clearance.`,
    ),
  ];
}

export function strainFigures(subject: Subject): Figure[] {
  const { p, allowable } = subject;
  return [
    ...armFigures(subject),
    plainFigure({
      id: 'allowable-strain',
      label: 'Allowable strain',
      unit: 'strain',
      value: allowable.value,
      because: allowable.because,
      source: allowable.factors[0]!.source,
    }),
    plainFigure({
      id: 'strain-at-rest',
      label: 'Strain of the arms when locked',
      unit: 'strain',
      value: 0,
      because: 'Locked, the arms stand straight, so they do not creep.',
      source: source.GEOMETRY,
    }),
    plainFigure({
      id: 'pad-proud',
      label: 'Pads stand out of the housing',
      unit: 'mm',
      value: padProud(p),
      because:
        padProud(p) >= 0
          ? 'What a finger finds beside the housing; the skins are waisted there so that it can press further in.'
          : 'Under the side of the housing: the finger has to reach into the waist.',
      source: source.GEOMETRY,
    }),
  ];
}
