import { rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import {
  armFace,
  backInner,
  backOuter,
  backRim,
  boxRim,
  frontInner,
  frontOuter,
  halfWidth,
  lidRim,
  webTop,
} from './layout';
import type { Values } from './schema';

const mm = (callout: Omit<Callout, 'kind' | 'unit'>): Callout => ({ kind: 'length', unit: 'mm', ...callout });

/** Dimensions to draw on the open box. */
export function callouts(p: Values): Callout[] {
  const front = -halfWidth(p);
  const inside = p.innerLength / 2;
  const [arm, rim] = [armFace(p), boxRim(p)];
  const middle = -(backInner(p) + frontInner(p)) / 2;
  return [
    mm({
      field: 'innerLength',
      from: [middle, -inside, rim],
      to: [middle, inside, rim],
      offset: [0, 0, 8],
      value: p.innerLength,
    }),
    mm({
      field: 'innerDepth',
      from: [-frontInner(p), front, rim],
      to: [-backInner(p), front, rim],
      offset: [0, -8, 0],
      value: p.innerDepth,
    }),
    mm({
      field: 'boxHeight',
      from: [-frontOuter(p), front, p.floor],
      to: [-frontOuter(p), front, rim],
      offset: [-8, 0, 0],
      value: p.boxHeight,
    }),
    mm({
      field: 'lidHeight',
      from: [frontOuter(p), front, p.floor],
      to: [frontOuter(p), front, lidRim(p)],
      offset: [8, 0, 0],
      value: p.lidHeight,
    }),
    mm({
      field: 'webLength',
      from: [-backOuter(p), front, webTop(p)],
      to: [backOuter(p), front, webTop(p)],
      offset: [0, -4, 0],
      value: p.webLength,
    }),
    mm({
      field: 'webRecess',
      from: [backOuter(p), -front, webTop(p)],
      to: [backOuter(p), -front, backRim(p)],
      offset: [0, 5, 0],
      value: p.webRecess,
    }),
    mm({
      field: 'armLength',
      from: [arm + p.armThickness, p.armWidth / 2, p.floor],
      to: [arm + p.armThickness, p.armWidth / 2, p.floor + p.armLength],
      offset: [8, 0, 0],
      value: p.armLength,
    }),
    mm({
      field: 'armWidth',
      from: [arm + p.armThickness, -p.armWidth / 2, p.floor + p.armLength],
      to: [arm + p.armThickness, p.armWidth / 2, p.floor + p.armLength],
      offset: [0, 0, 8],
      value: p.armWidth,
    }),
  ];
}

const STANCES: readonly Stance[] = [
  {
    id: 'open',
    label: 'Open, both floors on the bed',
    because:
      'No supports: the web is a short bridge whose strands run across the fold. The catch arm stands, so its own limit is that across the layers.',
    layers: 'along',
    orient: {},
  },
  {
    id: 'on-side',
    label: 'Standing on one side',
    because:
      'Layers run along the catch arm, but the web is built up of short strands that folding pulls apart, and the side walls need supports.',
    layers: 'across',
    orient: { box: rotation('x', Math.PI / 2) },
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
