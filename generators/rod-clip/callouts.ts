import { rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import { footHalf } from './geometry';
import { centreHeight, centres } from './ring';
import { boreOf, type Values } from './schema';

/** Dimensions to draw, on the front face of the rightmost ring. */
export function callouts(p: Values): Callout[] {
  const front = -p.clipWidth / 2;
  const x = centres(p).at(-1)!;
  const z = centreHeight(p);
  const bore = boreOf(p) / 2;
  const end = footHalf(p);
  const mm = (callout: Omit<Callout, 'unit'>): Callout => ({ unit: 'mm', ...callout });
  return [
    mm({
      field: 'rodDiameter',
      kind: 'diameter',
      from: [x - bore, front, z],
      to: [x + bore, front, z],
      offset: [0, -4, 0],
      value: p.rodDiameter,
    }),
    mm({
      field: 'wallThickness',
      kind: 'length',
      from: [x + bore, front, z],
      to: [x + bore + p.wallThickness, front, z],
      offset: [0, -2, 0],
      value: p.wallThickness,
    }),
    mm({
      field: 'stemHeight',
      kind: 'length',
      from: [x, front, p.footThickness],
      to: [x, front, p.footThickness + p.stemHeight],
      offset: [-p.stemWidth / 2 - 5, 0, 0],
      value: p.stemHeight,
    }),
    mm({
      field: 'footThickness',
      kind: 'length',
      from: [end, front, 0],
      to: [end, front, p.footThickness],
      offset: [5, 0, 0],
      value: p.footThickness,
    }),
    mm({
      field: 'clipWidth',
      kind: 'length',
      from: [end, front, 0],
      to: [end, -front, 0],
      offset: [8, 0, 0],
      value: p.clipWidth,
    }),
  ];
}

const STANCES: readonly Stance[] = [
  {
    id: 'on-side',
    label: 'Lying on its side',
    because: 'The layers follow the ring all the way round, so that opening it never pulls them apart.',
    layers: 'along',
    orient: { clip: rotation('x', Math.PI / 2) },
  },
  {
    id: 'on-foot',
    label: 'Standing on its foot',
    because:
      'Opening the ring pulls the layers at its sides apart, where the strain is highest: it snaps early.',
    layers: 'across',
    orient: {},
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
