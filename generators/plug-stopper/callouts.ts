import { rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import { bodyRadius, ribRadius, ribStarts, type Values } from './schema';

/** Dimensions to draw, in the plane through the axis. */
export function callouts(p: Values): Callout[] {
  const flange = p.boreDiameter / 2 + p.flangeOverhang;
  const top = p.flangeThickness + p.plugLength;
  const at = p.flangeThickness + ribStarts(p)[0]!;
  const rib = ribRadius(p);
  const bore = p.boreDiameter / 2;
  const end = bodyRadius(p, p.plugLength);
  const mm = (callout: Omit<Callout, 'unit' | 'kind'> & { kind?: Callout['kind'] }): Callout => ({
    kind: 'length',
    unit: 'mm',
    ...callout,
  });
  const wall = mm({
    field: 'wallThickness',
    from: [0, end - p.wallThickness, top],
    to: [0, end, top],
    offset: [0, 0, 4],
    value: p.wallThickness,
  });
  return [
    mm({
      field: 'boreDiameter',
      kind: 'diameter',
      from: [-bore, 0, at],
      to: [bore, 0, at],
      offset: [0, -rib - 4, 0],
      value: p.boreDiameter,
    }),
    mm({
      field: 'plugLength',
      from: [flange, 0, p.flangeThickness],
      to: [flange, 0, top],
      offset: [6, 0, 0],
      value: p.plugLength,
    }),
    mm({
      field: 'flangeThickness',
      from: [flange, 0, 0],
      to: [flange, 0, p.flangeThickness],
      offset: [10, 0, 0],
      value: p.flangeThickness,
    }),
    mm({
      field: 'flangeOverhang',
      from: [-flange, 0, 0],
      to: [-bore, 0, 0],
      offset: [0, 0, -4],
      value: p.flangeOverhang,
    }),
    ...(p.kind === 'hollow' ? [wall] : []),
  ];
}

const STANCES: readonly Stance[] = [
  {
    id: 'on-flange',
    label: 'Standing on its flange',
    because: 'Every rib is one closed line round the plug: it seals, and the squeeze runs along the layers.',
    layers: 'along',
    orient: {},
  },
  {
    id: 'on-side',
    label: 'Lying on its side',
    because: 'The ribs become stairs that leak, and the squeeze works across the layers.',
    layers: 'across',
    orient: { plug: rotation('y', Math.PI / 2) },
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
