import { formatQuantity } from '@/lib/units';
import { type Figure, judgedFigure, plainFigure } from '../report';
import { heldHeight, slipReserve } from './mechanics';
import * as source from './sources';
import type { Subject } from './subject';

/** Times the intended pull that the buckle must stand until it breaks. */
const RESERVE = 3;

function strengthMissing({ material, allowable }: Subject): string {
  const heat = allowable.factors.find(({ id }) => id === 'temperature')!;
  if (heat.value === null) return `Not known: ${heat.note ?? heat.label}.`;
  const gap = material.gaps?.tensileStrength;
  return `Not known: no tensile strength of ${material.shortName} was found${gap ? ` (${gap})` : ''}.`;
}

const WEAKEST = {
  barb: 'the barbs shear off: a longer pad',
  bearing: 'the holding faces give way: a higher barb with a thicker side wall',
  arm: 'the arms tear beside the barbs: a thicker tip',
  bar: 'the bar under the webbing breaks: a wider bar',
} as const;

function breakFigure(subject: Subject): Figure {
  const { p, hold } = subject;
  const common = {
    id: 'break-load',
    label: 'Pull that breaks it',
    unit: 'N',
    limit: RESERVE * p.pull,
    limitKind: 'min',
    source: source.RESERVE,
  } as const;
  if (!hold) return judgedFigure({ ...common, because: strengthMissing(subject) });
  return judgedFigure({
    ...common,
    value: hold.least,
    because: `First ${WEAKEST[hold.weakest]} helps. Short-time, printed flat and solid; it should be ${RESERVE} times the intended ${formatQuantity(p.pull, 'N')}. Held for weeks, plastics break at much less.`,
  });
}

function partFigures(subject: Subject): Figure[] {
  const { p, hold } = subject;
  const reason = (known: string) => (hold ? known : strengthMissing(subject));
  const part = (
    id: string,
    label: string,
    value: number | undefined,
    from: Figure['source'],
    known: string,
  ) => plainFigure({ id, label, unit: 'N', value: value ?? null, because: reason(known), source: from });
  return [
    part(
      'barb-shear-load',
      'Pull that shears the barbs',
      hold?.barb,
      source.SHEAR,
      'Both, along their pads.',
    ),
    part(
      'bearing-load',
      'Pull that crushes the holding faces',
      hold?.bearing,
      source.BEARING,
      `${formatQuantity(heldHeight(p), 'mm')} of each barb hold behind the wall.`,
    ),
    part(
      'arm-load',
      'Pull that tears the arms',
      hold?.arm,
      source.ARM_PULL,
      'At the thin end; the wall pulls beside their middle and bends them.',
    ),
    {
      ...part(
        'bar-load',
        'Pull that breaks a bar of the plug',
        hold?.bar.value,
        source.BAR,
        p.ladderLock
          ? 'As if on hinges; built in, the higher end. A ladder-lock bears with both ends of the webbing, so with up to twice the pull.'
          : 'As if on hinges; built in, the higher end.',
      ),
      low: hold?.bar.value ?? null,
      high: hold?.bar.builtIn ?? null,
    },
  ];
}

function barFigure({ p, bar, allowable }: Subject): Figure {
  return judgedFigure({
    id: 'bar-strain',
    label: 'Strain of the bar at the intended pull',
    unit: 'strain',
    value: bar,
    limit: allowable.value,
    because:
      bar === null
        ? 'Not known: the modulus is not known.'
        : `${formatQuantity(p.pull, 'N')} spread over ${p.webbingWidth} mm of webbing, the bar as if on hinges.`,
    source: source.BAR,
  });
}

function slipFigure({ p, material }: Subject): Figure {
  const { low, value, high } = material.friction;
  return judgedFigure({
    id: 'slip-reserve',
    label: 'Hold against slipping out under pull',
    unit: 'ratio',
    value: slipReserve(p, low),
    low: slipReserve(p, low),
    high: slipReserve(p, high),
    handbook: slipReserve(p, value),
    limit: 1,
    limitKind: 'min',
    because:
      'Pulled beside their middle, the arms want to turn in; friction on the square holding faces stops them. Judged at the lowest friction; longer arms and thinner side walls help.',
    source: source.SLIP,
  });
}

export const holdFigures = (subject: Subject): Figure[] => [
  breakFigure(subject),
  ...partFigures(subject),
  barFigure(subject),
  slipFigure(subject),
];
