import { IDENTITY, rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import { barrelRadius, knuckleLength, type Values } from './schema';

const mm = (callout: Omit<Callout, 'kind' | 'unit'> & { kind?: Callout['kind'] }): Callout => ({
  kind: 'length',
  unit: 'mm',
  ...callout,
});

/** Dimensions to draw on the hinge lying open. */
export function callouts(p: Values): Callout[] {
  const [front, r] = [-p.hingeWidth / 2, barrelRadius(p)];
  const first = front + knuckleLength(p);
  const lengths = [
    mm({
      field: 'leafLength',
      from: [0, front, 0],
      to: [p.leafLength, front, 0],
      offset: [0, -8, 0],
      value: p.leafLength,
    }),
    mm({
      field: 'hingeWidth',
      from: [p.leafLength, front, 0],
      to: [p.leafLength, -front, 0],
      offset: [8, 0, 0],
      value: p.hingeWidth,
    }),
    mm({
      field: 'leafThickness',
      from: [-p.leafLength, front, 0],
      to: [-p.leafLength, front, p.leafThickness],
      offset: [-6, 0, 0],
      value: p.leafThickness,
    }),
    mm({
      field: 'gap',
      from: [0, first, 2 * r],
      to: [0, first + p.gap, 2 * r],
      offset: [0, 0, 5],
      value: p.gap,
    }),
  ];
  const across = (field: string, radius: number, drop: number): Callout =>
    mm({
      field,
      kind: 'diameter',
      from: [-radius, front, r],
      to: [radius, front, r],
      offset: [0, drop, 0],
      value: 2 * radius,
    });
  return [...lengths, across('barrelDiameter', r, -14), across('pinDiameter', p.pinDiameter / 2, -4)];
}

const STANCES: readonly Stance[] = [
  {
    id: 'flat',
    label: 'Open, flat on the bed',
    because:
      'Strands run along the pin and the layers lie along it, so it is hard to shear; the barrel stands on a flat between 45 degree flanks and needs no supports.',
    layers: 'along',
    orient: {},
    together: IDENTITY,
  },
  {
    id: 'upright',
    label: 'Standing on the ends of the barrel',
    because:
      'Bores print round, but every knuckle starts in the air over a gap, and the pin is sheared between layers.',
    layers: 'across',
    orient: {},
    together: rotation('x', Math.PI / 2),
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
