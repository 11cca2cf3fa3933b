import { rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import { layoutOf } from './layout';
import type { Values } from './schema';

type Line = Pick<Callout, 'field' | 'from' | 'to' | 'offset' | 'value'>;

const lengthOf = (line: Line): Callout => ({ kind: 'length', unit: 'mm', ...line });

/** Dimensions to draw over the buckle from above. */
export function callouts(p: Values): Callout[] {
  const { half, arm, cavity, root, edge, windowEnd, housingTop, plugTop, plugEnd } = layoutOf(p);
  const top = housingTop;
  const webbing = p.webbingWidth / 2;
  const bar = plugEnd + p.barWidth;
  return [
    lengthOf({
      field: 'webbingWidth',
      from: [plugEnd, -webbing, plugTop],
      to: [plugEnd, webbing, plugTop],
      offset: [-8, 0, 0],
      value: p.webbingWidth,
    }),
    lengthOf({
      field: 'barWidth',
      from: [plugEnd, -half, plugTop],
      to: [bar, -half, plugTop],
      offset: [0, -6, 0],
      value: p.barWidth,
    }),
    lengthOf({
      field: 'armLength',
      from: [root, arm, top],
      to: [edge, arm, top],
      offset: [0, half - arm + 12, 0],
      value: p.armLength,
    }),
    lengthOf({
      field: 'padLength',
      from: [edge, arm + p.barbHeight, top],
      to: [edge + p.padLength, arm + p.barbHeight, top],
      offset: [0, half - arm - p.barbHeight + 6, 0],
      value: p.padLength,
    }),
    lengthOf({
      field: 'barbHeight',
      from: [edge, -arm - p.barbHeight, plugTop],
      to: [edge, -arm, plugTop],
      offset: [windowEnd - edge + 4, 0, 0],
      value: p.barbHeight,
    }),
    lengthOf({
      field: 'sideWall',
      from: [0, -half, top],
      to: [0, -cavity, top],
      offset: [-6, 0, 0],
      value: p.sideWall,
    }),
    lengthOf({
      field: 'plugThickness',
      from: [plugEnd, -half, -plugTop],
      to: [plugEnd, -half, plugTop],
      offset: [-8, 0, 0],
      value: p.plugThickness,
    }),
  ];
}

const STANCES: readonly Stance[] = [
  {
    id: 'flat',
    label: 'Both lying flat',
    because:
      'Strands follow the arms and the pull, no layer is pulled apart, and the roof of the housing only bridges from rail to side wall.',
    layers: 'along',
    orient: {},
  },
  {
    id: 'on-end',
    label: 'Standing on the webbing end',
    because: 'The squeeze and the pull part the layers: for a trial of the fit at most.',
    layers: 'across',
    orient: { plug: rotation('y', -Math.PI / 2), housing: rotation('y', Math.PI / 2) },
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
