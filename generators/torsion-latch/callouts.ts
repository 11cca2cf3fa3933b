import { rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import type { Values } from './schema';

/** Dimensions to draw on the latch lying flat. */
export function callouts(p: Values): Callout[] {
  const side = p.rockerWidth / 2;
  const top = p.panelThickness;
  const rail = side + p.barLength;
  const line = (callout: Omit<Callout, 'kind' | 'unit'>): Callout => ({
    kind: 'length',
    unit: 'mm',
    ...callout,
  });
  return [
    line({
      field: 'catchArm',
      from: [0, -side, top],
      to: [p.catchArm, -side, top],
      offset: [0, -3, 6],
      value: p.catchArm,
    }),
    line({
      field: 'tailArm',
      from: [-p.tailArm, -side, top],
      to: [0, -side, top],
      offset: [0, -3, 6],
      value: p.tailArm,
    }),
    line({ field: 'barLength', from: [0, side, 0], to: [0, rail, 0], offset: [6, 0, 0], value: p.barLength }),
    line({
      field: 'rockerWidth',
      from: [p.catchArm, -side, 0],
      to: [p.catchArm, side, 0],
      offset: [8, 0, 0],
      value: p.rockerWidth,
    }),
    line({
      field: 'undercut',
      from: [p.catchArm, side, top],
      to: [p.catchArm, side, top + p.undercut],
      offset: [0, 5, 0],
      value: p.undercut,
    }),
    line({
      field: 'panelThickness',
      from: [-p.tailArm, -side, 0],
      to: [-p.tailArm, -side, top],
      offset: [0, -4, 0],
      value: p.panelThickness,
    }),
  ];
}

const STANCES: readonly Stance[] = [
  {
    id: 'flat',
    label: 'Flat on the bed',
    because:
      'Strands run along the bars and the layers lie in the panel, the best a twisted bar can have; twist still shears between layers, so prove it.',
    layers: 'along',
    orient: {},
  },
  {
    id: 'upright',
    label: 'Standing on the tail end',
    because: 'The bars lie across the layers and the rocker bends by pulling them apart.',
    layers: 'across',
    orient: { latch: rotation('y', -Math.PI / 2) },
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
