import type { Kernel, Profile, Solid, Vec2 } from '@/lib/geometry/kernel';
import { moved } from '@/lib/geometry/outline';
import { translation } from '@/lib/geometry/placement';
import type { Source } from '@/lib/materials/types';
import { choice, length } from './parameters';
import { type Figure, judgedFigure, type Verdict } from './report';

/** How the steps of a coupon are marked. */
export interface Marking {
  readonly marks: 'raised' | 'cut' | 'none';
  readonly markHeight: number;
}

/** A number on a face that looks up, by its middle. */
export interface Mark {
  readonly text: string;
  readonly at: Vec2;
}

/** Height or depth of a mark, mm: three layers of 0.2 mm. */
const RELIEF = 0.6;
/** Widest figure over its height, with the space after it. */
const PER_FIGURE = 0.8;
const SUNK = 0.2;
const LEGIBLE = 4;

const LEGIBILITY: Source = {
  text: 'Figures of 4 mm and strokes of two lines print legibly from a 0.4 mm nozzle (common practice, no source)',
  mark: 'common-practice',
};

export const markFields = {
  marks: choice({
    label: 'Marks',
    options: [
      { value: 'raised', label: 'Raised' },
      { value: 'cut', label: 'Cut in' },
      { value: 'none', label: 'None' },
    ],
    default: 'raised',
    group: 'marks',
    help: 'Figures that tell the steps apart once the coupon is off the bed.',
  }),
  markHeight: length({
    label: 'Height of the figures',
    min: 3,
    max: 8,
    step: 0.5,
    default: 5,
    group: 'marks',
    help: 'Under 4 mm a 0.4 mm nozzle blots them.',
  }),
} as const;

/** Room along the row that a text takes, mm; 0 where nothing is marked. */
export const markWidth = (text: string, { marks, markHeight }: Marking): number =>
  marks === 'none' ? 0 : PER_FIGURE * text.length * markHeight;

/** Room across the row, mm. */
export const markRoom = ({ marks, markHeight }: Marking): number => (marks === 'none' ? 0 : markHeight);

function centred({ loops }: Profile, [x, y]: Vec2, height: number): Profile {
  const along = loops.flat().map(([at]) => at);
  const middle = (Math.min(...along) + Math.max(...along)) / 2;
  return { loops: loops.map((loop) => moved(loop, [x - middle, y - height / 2])) };
}

/** The solid with marks on its face at z = top; cut ones leave the floor under them. */
export function withMarks(
  kernel: Kernel,
  solid: Solid,
  top: number,
  list: readonly Mark[],
  { marks, markHeight }: Marking,
): Solid {
  if (marks === 'none') return solid;
  const stroke = Math.min(1, Math.max(0.8, markHeight / 6));
  const figures = list.map(({ text, at }) =>
    centred(kernel.outlines.text(text, { height: markHeight, stroke }), at, markHeight),
  );
  const ink = kernel.extrude({ loops: figures.flatMap(({ loops }) => loops) }, RELIEF + SUNK);
  return marks === 'raised'
    ? kernel.union([solid, kernel.place(ink, translation([0, 0, top - SUNK]))])
    : kernel.subtract(solid, [kernel.place(ink, translation([0, 0, top - RELIEF]))]);
}

/** Least thickness under a mark that is cut in, mm. */
export const LEAST_UNDER_MARK = 1.4;

export const markFigure = ({ marks, markHeight }: Marking): Figure[] =>
  marks === 'none'
    ? []
    : [
        judgedFigure({
          id: 'mark-height',
          label: 'Height of the figures',
          unit: 'mm',
          value: markHeight,
          limit: LEGIBLE,
          limitKind: 'min',
          verdict: markHeight >= LEGIBLE ? 'within-limit' : 'close-to-limit',
          because:
            markHeight >= LEGIBLE
              ? 'Legible: the strokes are two lines wide.'
              : 'Small figures blot: take 4 mm or more.',
          source: LEGIBILITY,
        }),
      ];

/** Steps of a ladder: the first, then one step more each. */
export const ladder = (first: number, step: number, count: number): number[] =>
  Array.from({ length: count }, (_, at) => Number((first + at * step).toFixed(6)));

/** A gap in hundredths of a millimetre, two figures at least. */
export const gapMark = (gap: number): string => String(Math.round(100 * gap)).padStart(2, '0');

/** Where an expected gap lies among the gaps of a ladder, mm. */
export function placeInLadder(gaps: readonly number[], gap: number): { verdict: Verdict; because: string } {
  const [first, last] = [gaps[0]!, gaps.at(-1)!];
  if (gap < first - 1e-9) {
    return { verdict: 'over-limit', because: 'Tighter than the first step: begin with a smaller one.' };
  }
  if (gap > last + 1e-9) {
    return { verdict: 'over-limit', because: 'Wider than the last step: add steps, or make them larger.' };
  }
  const nearest = gaps.reduce((a, b) => (Math.abs(b - gap) < Math.abs(a - gap) ? b : a));
  return nearest === first || nearest === last
    ? {
        verdict: 'close-to-limit',
        because: `At the end of the ladder, marked ${gapMark(nearest)}: what lies past it is not tried.`,
      }
    : { verdict: 'within-limit', because: `Nearest to the step marked ${gapMark(nearest)}.` };
}
