import { rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import { flexLength, pitchOf, totalLength, type Values } from './schema';

const mm = (callout: Omit<Callout, 'kind' | 'unit'>): Callout => ({ kind: 'length', unit: 'mm', ...callout });

/** Dimensions to draw on the flat panel. */
export function callouts(p: Values): Callout[] {
  const [end, front, flex] = [totalLength(p) / 2, -p.panelWidth / 2, -flexLength(p) / 2];
  const top = p.thickness;
  const link = flex + p.slitWidth;
  return [
    mm({
      field: 'panelWidth',
      from: [end, front, 0],
      to: [end, -front, 0],
      offset: [8, 0, 0],
      value: p.panelWidth,
    }),
    mm({
      field: 'leafLength',
      from: [-end, front, 0],
      to: [flex, front, 0],
      offset: [0, -8, 0],
      value: p.leafLength,
    }),
    mm({
      field: 'thickness',
      from: [-end, front, 0],
      to: [-end, front, top],
      offset: [-6, 0, 0],
      value: p.thickness,
    }),
    mm({
      field: 'linkWidth',
      from: [link, -front, top],
      to: [link + p.linkWidth, -front, top],
      offset: [0, 5, 0],
      value: p.linkWidth,
    }),
    mm({
      field: 'slitWidth',
      from: [flex, -front, top],
      to: [link, -front, top],
      offset: [0, 11, 0],
      value: p.slitWidth,
    }),
    mm({
      field: 'bridge',
      from: [link + p.linkWidth, front + pitchOf(p) / 2 - p.bridge / 2, top],
      to: [link + p.linkWidth, front + pitchOf(p) / 2 + p.bridge / 2, top],
      offset: [0, 0, 6],
      value: p.bridge,
    }),
  ];
}

const STANCES: readonly Stance[] = [
  {
    id: 'flat',
    label: 'Flat on the bed',
    because: 'Strands can run along the links and no layer ends in one; slits print open without supports.',
    layers: 'along',
    orient: {},
  },
  {
    id: 'on-edge',
    label: 'Standing on an edge',
    because: 'Each link is a stack of tiny layers, twisted until they part; and every slit has a roof.',
    layers: 'across',
    orient: { panel: rotation('x', Math.PI / 2) },
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
