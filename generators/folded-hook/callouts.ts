import { rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import { meanBend, type Values } from './schema';

/** Dimensions to draw on the front face of the arm. */
export function callouts(p: Values): Callout[] {
  const front = -p.armWidth / 2;
  const r = meanBend(p);
  const line = (callout: Omit<Callout, 'kind' | 'unit'>): Callout => ({
    kind: 'length',
    unit: 'mm',
    ...callout,
  });
  const h = p.thickness / 2;
  if (p.shape === 'l') {
    const x = p.rootLeg + r;
    return [
      line({
        field: 'rootLeg',
        from: [0, front, h],
        to: [p.rootLeg, front, h],
        offset: [0, 0, 5],
        value: p.rootLeg,
      }),
      line({
        field: 'freeLeg',
        from: [x, front, r],
        to: [x, front, r + p.freeLeg],
        offset: [-5, 0, 0],
        value: p.freeLeg,
      }),
      line({
        field: 'thickness',
        from: [p.rootLeg / 2, front, -h],
        to: [p.rootLeg / 2, front, h],
        offset: [0, -4, 0],
        value: p.thickness,
      }),
    ];
  }
  const free = 2 * r + h;
  return [
    line({
      field: 'rootLeg',
      from: [-h, front, 0],
      to: [-h, front, p.rootLeg],
      offset: [-5, 0, 0],
      value: p.rootLeg,
    }),
    line({
      field: 'freeLeg',
      from: [free, front, p.rootLeg - p.freeLeg],
      to: [free, front, p.rootLeg],
      offset: [p.undercut + 5, 0, 0],
      value: p.freeLeg,
    }),
    line({
      field: 'thickness',
      from: [-h, front, p.rootLeg / 2],
      to: [h, front, p.rootLeg / 2],
      offset: [0, -4, 0],
      value: p.thickness,
    }),
    {
      field: 'bendRadius',
      kind: 'radius',
      unit: 'mm',
      from: [r, front, p.rootLeg],
      to: [r, front, p.rootLeg + p.bendRadius],
      offset: [0, -3, 0],
      value: p.bendRadius,
    },
  ];
}

const STANCES: readonly Stance[] = [
  {
    id: 'on-side',
    label: 'Lying on its side',
    because: 'The strands follow the fold; bending never pulls layers apart.',
    layers: 'along',
    orient: { hook: rotation('x', Math.PI / 2), receiver: rotation('x', Math.PI / 2) },
  },
  {
    id: 'standing',
    label: 'Standing on its base',
    because: 'Bending pulls the layers of the legs apart, and the bend hangs in the air.',
    layers: 'across',
    orient: {},
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
