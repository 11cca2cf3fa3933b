import { screwContact, seatLoad } from '@/lib/mechanics/screw-closure';
import {
  lockingRatio,
  nutFactorTorque,
  PRINTED_NUT_FACTOR,
  type TorqueRange,
  torquePerLoad,
} from '@/lib/mechanics/thread-torque';
import { formatQuantity } from '@/lib/units';
import { type Figure, type GivenFigure, judgedFigure, plainFigure } from './report';
import { MODULUS_MISSING, type ScrewContext, type Seat, strengthMissing } from './screw-context';
import * as source from './screw-sources';

const torqueText = (value: number): string => formatQuantity(value, 'Nmm');
const newton = (value: number): string => formatQuantity(value, 'N');

function strengthFigures(context: ScrewContext): Figure[] {
  const { stripping, neck, closing } = context.mechanics;
  const limit = closing?.load.value ?? null;
  const strip = {
    id: 'stripping-load',
    label: 'Load that strips the thread',
    unit: 'N',
    limit,
    limitKind: 'min',
    source: source.STRIPPING,
  } as const;
  const part = {
    id: 'neck-load',
    label: `Load that parts the ${context.words.neck}`,
    unit: 'N',
    limit,
    limitKind: 'min',
    source: source.SECTION,
  } as const;
  const missing = strengthMissing(context);
  return [
    stripping
      ? judgedFigure({
          ...strip,
          ...stripping,
          because:
            'The weaker of both threads, sheared along the layers, with the clearance taken off the flanks; handbook: basic sizes. It must stay over the load of a firm hand.',
        })
      : judgedFigure({ ...strip, because: missing }),
    neck
      ? judgedFigure({
          ...part,
          ...neck,
          because: 'The wall between thread root and bore, pulled apart between two layers.',
        })
      : judgedFigure({ ...part, because: missing }),
  ];
}

function loadFigure(context: ScrewContext): Figure {
  const { closing, stripping, neck } = context.mechanics;
  const common = {
    id: 'closing-load',
    label: 'Pull in the thread, closed by a firm hand',
    unit: 'N',
    limit: stripping && neck ? Math.min(stripping.value, neck.value) : null,
    source: source.SCREW,
  } as const;
  if (!closing) return judgedFigure({ ...common, because: MODULUS_MISSING });
  const weak =
    stripping && neck && neck.value < stripping.value
      ? `the ${context.words.neck} parts`
      : 'the thread strips';
  return judgedFigure({
    ...common,
    ...closing.load,
    because: `The upper end of the usual hand torque turned into pull by the friction of thread and rim; the limit is where ${weak}. Less friction, more pull: see the band.`,
  });
}

function handFigure({ p, mechanics }: ScrewContext): Figure {
  const { closing } = mechanics;
  const common = { id: 'hand-torque', label: 'Usual hand torque to close', unit: 'Nmm' } as const;
  if (!closing) {
    return plainFigure({ ...common, because: MODULUS_MISSING, source: source.HAND });
  }
  const { low, high, tabled } = closing.hand;
  const because = tabled
    ? `What hands put on a closure of ${formatQuantity(p.majorDiameter, 'mm')}, interpolated from the table.`
    : `Under the table's 18 mm: taken in proportion to the diameter.`;
  const from = tabled ? source.HAND : source.HAND_SMALL;
  return plainFigure({ ...common, value: (low + high) / 2, low, high, because, source: from });
}

function seatTorque(
  { p, material, mechanics }: ScrewContext,
  seat: Seat,
): Partial<Figure> & { because: string } {
  const load = seatLoad(seat);
  const torque = (friction: number) =>
    load * torquePerLoad(screwContact(mechanics.joint, friction), 'closing');
  const { low, value, high } = material.friction;
  return {
    value: torque(value),
    low: torque(low),
    high: torque(high),
    handbook: nutFactorTorque(PRINTED_NUT_FACTOR, load, p.majorDiameter),
    because: `Beds the ${seat.of} with ${newton(load)}, ${seat.pressure} MPa. ${seat.advice}`,
  };
}

/** A torque is close to the limit where a light hand does not reach it, and over it where a firm one does not. */
function judgedByHand(figure: GivenFigure, hand: TorqueRange | undefined): Figure {
  const judged = judgedFigure(figure);
  if (!hand || judged.value === null) return judged;
  const because = `${judged.because} A light hand gives ${torqueText(hand.low)}, a firm one ${torqueText(hand.high)}.`;
  const light = judged.verdict === 'within-limit' && judged.value > hand.low;
  return { ...judged, because, ...(light && { verdict: 'close-to-limit' }) };
}

function closingFigure(context: ScrewContext): Figure {
  const { p, seat, mechanics, words } = context;
  const common = {
    id: 'closing-torque',
    label: 'Torque to close onto the seal',
    unit: 'Nmm',
    limit: mechanics.closing?.hand.high ?? null,
  } as const;
  if (seat?.pressure === 0) {
    return plainFigure({ ...common, limit: null, because: seat.advice, source: source.SEAT });
  }
  if (seat) {
    const figure = { ...common, ...seatTorque(context, seat), source: source.SEAT };
    return judgedByHand(figure, mechanics.closing?.hand);
  }
  if (p.seal === 'none') {
    const because = `Without a seal there is nothing to bed: turn until the ${words.cap} stops on the rim.`;
    return plainFigure({ ...common, limit: null, because, source: source.SCREW });
  }
  if (!mechanics.closing) return judgedFigure({ ...common, because: MODULUS_MISSING, source: source.PRESS });
  const { drag } = mechanics.closing;
  const because = `The plug rubs round in the bore. It must stay under what a firm hand gives, or the ${words.cap} never comes home.`;
  return judgedByHand({ ...common, value: drag, because, source: source.PRESS }, mechanics.closing.hand);
}

function openingFigure({ material, mechanics, words }: ScrewContext): Figure {
  const common = {
    id: 'opening-torque',
    label: 'Torque to open again',
    unit: 'Nmm',
    source: source.REMOVAL,
  } as const;
  const { closing, joint } = mechanics;
  if (!closing) return plainFigure({ ...common, because: MODULUS_MISSING });
  const shut = (closing.hand.low + closing.hand.high) / 2;
  const contact = screwContact(joint, material.friction.value);
  const load = Math.max(0, shut - closing.drag) / torquePerLoad(contact, 'closing');
  const value = closing.drag + Math.max(0, load * torquePerLoad(contact, 'opening'));
  const because = `Just after closing with the middle of the hand range; a ${words.cap} left closed creeps and then takes 40 to 60 % of what closed it.`;
  return plainFigure({ ...common, value, handbook: shut / 2, low: 0.4 * shut, high: value, because });
}

function lockingFigure({ material, mechanics, words }: ScrewContext): Figure {
  const ratio = (friction: number) => lockingRatio(screwContact(mechanics.joint, friction));
  const { low, value, high } = material.friction;
  return judgedFigure({
    id: 'self-locking',
    label: 'Hold against unscrewing by itself',
    unit: 'ratio',
    value: ratio(low),
    handbook: ratio(value),
    low: ratio(low),
    high: ratio(high),
    limit: 1,
    limitKind: 'min',
    because: `Friction on the flanks over the slope of the lead, at the lowest friction of the band; under 1 the load turns the ${words.cap} back. More starts mean less.`,
    source: source.SCREW,
  });
}

export const screwLoadFigures = (context: ScrewContext): Figure[] => [
  loadFigure(context),
  ...strengthFigures(context),
  handFigure(context),
  closingFigure(context),
  openingFigure(context),
  lockingFigure(context),
];
