import { rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import { lidBore, mouthHeight, type Values } from './schema';

/** Dimensions to draw, in the plane through the axis. */
export function callouts(p: Values): Callout[] {
  const pot = p.tubeDiameter / 2;
  const bore = lidBore(p);
  const out = bore + p.lidWall;
  const mm = (callout: Omit<Callout, 'unit' | 'kind'> & { kind?: Callout['kind'] }): Callout => ({
    kind: 'length',
    unit: 'mm',
    ...callout,
  });
  return [
    mm({
      field: 'tubeDiameter',
      kind: 'diameter',
      from: [-pot, 0, 0],
      to: [pot, 0, 0],
      offset: [0, 0, -6],
      value: p.tubeDiameter,
    }),
    mm({
      field: 'potHeight',
      from: [-pot, 0, 0],
      to: [-pot, 0, p.potHeight],
      offset: [-12, 0, 0],
      value: p.potHeight,
    }),
    mm({
      field: 'fromRim',
      from: [out, 0, p.potHeight - p.fromRim],
      to: [out, 0, p.potHeight],
      offset: [6, 0, 0],
      value: p.fromRim,
    }),
    mm({
      field: 'lidWall',
      from: [bore, 0, mouthHeight(p)],
      to: [out, 0, mouthHeight(p)],
      offset: [0, 0, -4],
      value: p.lidWall,
    }),
    mm({
      field: 'top',
      from: [out, 0, p.potHeight],
      to: [out, 0, p.potHeight + p.top],
      offset: [12, 0, 0],
      value: p.top,
    }),
  ];
}

const ON_ITS_TOP = rotation('x', Math.PI);

const STANCES: readonly Stance[] = [
  {
    id: 'standing',
    label: 'Pot standing, lid on its top',
    because: 'The hoop that stretches lies along the layers, and neither part needs supports.',
    layers: 'along',
    orient: { lid: ON_ITS_TOP },
  },
  {
    id: 'lying',
    label: 'Lying on the side',
    because: 'The hoop pulls the layers apart twice round, and bead and groove become stairs.',
    layers: 'across',
    orient: { pot: rotation('y', Math.PI / 2), lid: rotation('y', Math.PI / 2) },
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
