import { rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import { cellsOf } from './layout';
import type { Values } from './schema';

/** Dimensions to draw on the ladder lying on the bed. */
export function callouts(p: Values): Callout[] {
  const [first, last] = [cellsOf(p)[0]!, cellsOf(p).at(-1)!];
  const z = p.armWidth;
  const common = { kind: 'length', unit: 'mm' } as const;
  return [
    {
      ...common,
      field: 'armLength',
      from: [first.arm[0], 0, z],
      to: [first.arm[0], p.armLength, z],
      offset: [-5, 0, 0],
      value: p.armLength,
    },
    {
      ...common,
      field: 'armThickness',
      from: [first.arm[0], p.armLength, z],
      to: [first.arm[1], p.armLength, z],
      offset: [0, 5, 0],
      value: p.armThickness,
    },
    {
      ...common,
      field: 'armWidth',
      from: [last.post[1], p.armLength, 0],
      to: [last.post[1], p.armLength, z],
      offset: [5, 0, 0],
      value: p.armWidth,
    },
  ];
}

const STANCES: readonly Stance[] = [
  {
    id: 'flat',
    label: 'Flat on the bed',
    because: 'Strands run along the arms, as they should in a part that bends.',
    layers: 'along',
    orient: {},
  },
  {
    id: 'standing',
    label: 'Standing on its base',
    because: 'The bending pulls the layers apart: print this one to know how much weaker that is.',
    layers: 'across',
    orient: { ladder: rotation('x', Math.PI / 2) },
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
