import { IDENTITY, rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import { columnAt, gapsOf, rowsOf, type Values } from './schema';

/** Dimensions to draw on the plate with pin and tongue in its widest holes. */
export function callouts(p: Values): Callout[] {
  const { round, front } = rowsOf(p);
  const [first, last] = [columnAt(p, 0), columnAt(p, p.holes - 1)];
  const radius = p.pinDiameter / 2 + gapsOf(p)[0]!;
  return [
    {
      field: 'firstGap',
      kind: 'length',
      unit: 'mm',
      from: [first - radius, round, p.depth],
      to: [first - p.pinDiameter / 2, round, p.depth],
      offset: [0, 8, 0],
      value: p.firstGap,
    },
    {
      field: 'pinDiameter',
      kind: 'diameter',
      unit: 'mm',
      from: [last - p.pinDiameter / 2, round, p.depth + p.gripHeight],
      to: [last + p.pinDiameter / 2, round, p.depth + p.gripHeight],
      offset: [0, 0, 5],
      value: p.pinDiameter,
    },
    {
      field: 'depth',
      kind: 'length',
      unit: 'mm',
      from: [0, front, 0],
      to: [0, front, p.depth],
      offset: [-5, 0, 0],
      value: p.depth,
    },
  ];
}

const OVER = rotation('x', Math.PI);

const STANCES: readonly Stance[] = [
  {
    id: 'flat',
    label: 'Plate flat, pin and tongue on their grips',
    because:
      'Holes and pin print round and standing, as in most parts; the tips come last and stay free of the squashed first layer.',
    layers: 'along',
    orient: { plate: IDENTITY, pin: OVER, tongue: OVER },
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
