import { formatQuantity } from '@/lib/units';
import { type Figure, judgedFigure, plainFigure } from './report';
import { MODULUS_MISSING, type ScrewContext } from './screw-context';
import * as source from './screw-sources';

function peakFigure({ mechanics, allowable, words }: ScrewContext): Figure {
  const { plug, spread } = mechanics;
  const common = {
    id: 'peak-strain',
    label: 'Peak strain',
    unit: 'strain',
    limit: allowable.value,
  } as const;
  const hoop = spread?.hoopStrain ?? null;
  if (plug && (hoop === null || plug.peak >= hoop)) {
    const because = `The plug in its bore: the interference shared by both rings, raised where the ${words.neck} ends at its rim. Handbook: one part takes it all.`;
    return judgedFigure({
      ...common,
      value: plug.peak,
      handbook: plug.rigid,
      because,
      source: source.RING_END,
    });
  }
  if (hoop === null) return judgedFigure({ ...common, because: MODULUS_MISSING, source: source.SPREAD });
  const because = `Hoop strain of the ${words.cap}'s wall: the flanks wedge it apart when a firm hand closes it.`;
  return judgedFigure({ ...common, value: hoop, because, source: source.SPREAD });
}

function sealFigure({ p, mechanics, words }: ScrewContext): Figure[] {
  const { plug } = mechanics;
  if (!plug) return [];
  const { neck, plugInside } = plug.rings;
  const because = `${p.plugInterference} mm over ${p.bore} mm: the ${words.neck} stretches by ${formatQuantity(neck, 'strain')}, the plug gives by ${formatQuantity(Math.abs(plugInside), 'strain')} inside. A plug left in relaxes: it seals less after weeks.`;
  return [
    plainFigure({
      id: 'seal-strain',
      label: 'Hoop strain of the plug seal',
      unit: 'strain',
      value: plug.hoop,
      handbook: plug.rigid,
      because,
      source: source.PRESS,
    }),
  ];
}

function spreadFigure({ p, mechanics, words }: ScrewContext): Figure {
  const { spread, joint } = mechanics;
  const common = {
    id: 'cap-spread',
    label: `Growth of the ${words.cap}, closed by a firm hand`,
    unit: 'mm',
    limit: (joint.thread.engagement - p.clearance) / 2,
    source: source.HALF_OVERLAP,
  } as const;
  if (!spread) return judgedFigure({ ...common, because: MODULUS_MISSING });
  const because = `On the radius. A ${words.cap} that grows by its whole overlap jumps its thread without breaking; soft plastics do. Thicker wall, longer skirt.`;
  return judgedFigure({ ...common, value: spread.growth, because });
}

export function screwStrainFigures(context: ScrewContext): Figure[] {
  const { allowable } = context;
  return [
    peakFigure(context),
    plainFigure({
      id: 'allowable-strain',
      label: 'Allowable strain',
      unit: 'strain',
      value: allowable.value,
      because: allowable.because,
      source: allowable.factors[0]!.source,
    }),
    ...sealFigure(context),
    spreadFigure(context),
  ];
}
