import type { Callout, Stance } from '../contract';
import { plateFrom } from './layout';
import { columnAt, edgesOf, type Values } from './schema';

/** Dimensions to draw on the plate with the stud in its widest hole. */
export function callouts(p: Values): Callout[] {
  const axis = columnAt(p, p.holes - 1);
  const low = -plateFrom(p);
  const radius = p.majorDiameter / 2;
  return [
    {
      field: 'majorDiameter',
      kind: 'diameter',
      unit: 'mm',
      from: [axis - radius, 0, p.plateThickness],
      to: [axis + radius, 0, p.plateThickness],
      offset: [0, 0, 12],
      value: p.majorDiameter,
    },
    {
      field: 'plateThickness',
      kind: 'length',
      unit: 'mm',
      from: [0, edgesOf(p).front, 0],
      to: [0, edgesOf(p).front, p.plateThickness],
      offset: [-5, 0, 0],
      value: p.plateThickness,
    },
    {
      field: 'gripHeight',
      kind: 'length',
      unit: 'mm',
      from: [axis + radius + 2, 0, low - p.gripHeight],
      to: [axis + radius + 2, 0, low],
      offset: [6, 0, 0],
      value: p.gripHeight,
    },
  ];
}

const STANCES: readonly Stance[] = [
  {
    id: 'flat',
    label: 'Plate flat, stud on its head',
    because: 'Threads print standing, as they do in caps and pots.',
    layers: 'along',
    orient: {},
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
