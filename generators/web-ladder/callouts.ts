import type { Callout, Stance } from '../contract';
import { middleAt, type Values } from './schema';

/** Dimensions to draw on the ladder lying flat. */
export function callouts(p: Values): Callout[] {
  const [half, top] = [p.webLength / 2, p.leafThickness];
  const front = middleAt(p, 0) - p.leafWidth / 2;
  const back = middleAt(p, p.hinges - 1) + p.leafWidth / 2;
  const common = { kind: 'length', unit: 'mm' } as const;
  return [
    {
      ...common,
      field: 'webLength',
      from: [-half, front, top],
      to: [half, front, top],
      offset: [0, -5, 0],
      value: p.webLength,
    },
    {
      ...common,
      field: 'leafLength',
      from: [half, back, top],
      to: [half + p.leafLength, back, top],
      offset: [0, 5, 0],
      value: p.leafLength,
    },
    {
      ...common,
      field: 'leafWidth',
      from: [half + p.leafLength, front, top],
      to: [half + p.leafLength, front + p.leafWidth, top],
      offset: [5, 0, 0],
      value: p.leafWidth,
    },
    {
      ...common,
      field: 'leafThickness',
      from: [half + p.leafLength, front, 0],
      to: [half + p.leafLength, front, top],
      offset: [3, -3, 0],
      value: p.leafThickness,
    },
  ];
}

const STANCES: readonly Stance[] = [
  {
    id: 'flat',
    label: 'Flat on the bed',
    because: 'Webs lie in the layers, in whole layers; run the strands across the fold line.',
    layers: 'along',
    orient: {},
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
