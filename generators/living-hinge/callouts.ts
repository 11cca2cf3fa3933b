import type { Callout, Stance } from '../contract';
import type { Values } from './schema';

const mm = (callout: Omit<Callout, 'kind' | 'unit'>): Callout => ({ kind: 'length', unit: 'mm', ...callout });

/** Dimensions to draw on the hinge lying flat. */
export function callouts(p: Values): Callout[] {
  const half = p.webLength / 2;
  const edge = half + p.leafLength;
  const front = -p.leafWidth / 2;
  const roof = p.webRelief + p.webThickness;
  return [
    mm({
      field: 'leafLength',
      from: [half, front, 0],
      to: [edge, front, 0],
      offset: [0, -8, 0],
      value: p.leafLength,
    }),
    mm({
      field: 'webLength',
      from: [-half, front, 0],
      to: [half, front, 0],
      offset: [0, -14, 0],
      value: p.webLength,
    }),
    mm({
      field: 'leafWidth',
      from: [edge, front, 0],
      to: [edge, -front, 0],
      offset: [8, 0, 0],
      value: p.leafWidth,
    }),
    mm({
      field: 'leafThickness',
      from: [-edge, front, 0],
      to: [-edge, front, p.leafThickness],
      offset: [-6, 0, 0],
      value: p.leafThickness,
    }),
    mm({
      field: 'webThickness',
      from: [0, front, p.webRelief],
      to: [0, front, roof],
      offset: [0, -4, 0],
      value: p.webThickness,
    }),
  ];
}

const FLAT: Stance = {
  id: 'flat',
  label: 'Flat on the bed',
  because:
    'Layers lie along the web and the strands can run across the fold, so that nothing pulls layers apart.',
  layers: 'along',
  orient: {},
};

const upright = (p: Values): Stance => ({
  id: 'upright',
  label: 'Standing on a leaf edge',
  because: `The web is built up layer by layer${p.webThickness < 0.8 ? ' from less than two lines' : ''} and folding pulls the layers apart: it will crack.`,
  layers: 'across',
  orient: { hinge: [0, 0, 1, 0, 0, 1, 0, 0, -1, 0, 0, 0, 0, 0, 0, 1] },
});

export const stances = (p: Values): Stance[] => [FLAT, upright(p)];
