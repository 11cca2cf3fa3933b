import { rotation } from '@/lib/geometry/placement';
import { jointOf } from '@/lib/mechanics/screw-sizes';
import type { Callout, Stance } from '../contract';
import { discOf, hasDisc, layoutOf, screwOf } from './layout';
import type { Values } from './schema';

type Line = Pick<Callout, 'field' | 'from' | 'to' | 'offset' | 'value'>;

const lengthOf = (line: Line): Callout => ({ kind: 'length', unit: 'mm', ...line });

/** Dimensions to draw: the pot's on the left, the lid's on the right. */
export function callouts(p: Values): Callout[] {
  const { body, room, rim, floor, bottom } = layoutOf(p);
  const { cap, capTop } = jointOf(screwOf(p));
  const lid = cap.majorDiameter / 2;
  const out = Math.max(body, lid + p.lidWall) + 8;
  const disc = lengthOf({
    field: 'sealThickness',
    from: [lid, 0, rim],
    to: [lid, 0, rim + discOf(p)],
    offset: [out - lid, 0, 0],
    value: p.sealThickness,
  });
  return [
    {
      ...lengthOf({
        field: 'innerDiameter',
        from: [-room, 0, floor],
        to: [room, 0, floor],
        offset: [0, 0, bottom - floor - 8],
        value: p.innerDiameter,
      }),
      kind: 'diameter',
    },
    lengthOf({
      field: 'innerDepth',
      from: [-room, 0, floor],
      to: [-room, 0, rim],
      offset: [room - out, 0, 0],
      value: p.innerDepth,
    }),
    lengthOf({
      field: 'floor',
      from: [room, 0, bottom],
      to: [room, 0, floor],
      offset: [out - room, 0, 0],
      value: p.floor,
    }),
    lengthOf({
      field: 'lidWall',
      from: [lid, 0, capTop],
      to: [lid + p.lidWall, 0, capTop],
      offset: [0, 0, 6],
      value: p.lidWall,
    }),
    lengthOf({
      field: 'topThickness',
      from: [lid, 0, capTop - p.topThickness],
      to: [lid, 0, capTop],
      offset: [out - lid + 8, 0, 0],
      value: p.topThickness,
    }),
    ...(hasDisc(p) ? [disc] : []),
  ];
}

const STANCES: readonly Stance[] = [
  {
    id: 'standing',
    label: 'Pot standing, lid on its top',
    because:
      'Threads upright: round and without supports, shoulder and ridges lean by 45 degrees at most. The pull in the thread shears along the layers, which the check counts.',
    layers: 'along',
    orient: { lid: rotation('x', Math.PI) },
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
