import type { Vec3 } from '@/lib/geometry/kernel';
import { rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import { headOf, stripLayout } from './layout';
import type { PegStrap } from './schema';

type Given = Omit<Callout, 'unit' | 'field'> & { readonly unit?: Callout['unit'] };

/** Dimensions of the flat strap: eyes and width from above, peg and thickness from the front. */
export function callouts(values: PegStrap): readonly Callout[] {
  const { from, to, eyes } = stripLayout(values);
  const { strapThickness: t, strapWidth, eyeDiameter, pegDiameter, headDiameter } = values;
  const head = headOf(values);
  const half = strapWidth / 2;
  const dimension = (field: string, given: Given): Callout => ({ unit: 'mm', field, ...given });
  const across = (field: string, x: number, diameter: number, z: number, offset: Vec3): Callout =>
    dimension(field, {
      kind: 'diameter',
      from: [x - diameter / 2, 0, z],
      to: [x + diameter / 2, 0, z],
      offset,
      value: diameter,
    });
  const first = eyes[0]!;
  return [
    across('eyeDiameter', first, eyeDiameter, t, [0, half + 4, 0]),
    ...(eyes.length > 1
      ? [
          dimension('eyePitch', {
            kind: 'length',
            from: [first, 0, t],
            to: [eyes[1]!, 0, t],
            offset: [0, -half - 4, 0],
            value: values.eyePitch,
          }),
        ]
      : []),
    dimension('strapWidth', {
      kind: 'length',
      from: [to, -half, t],
      to: [to, half, t],
      offset: [6, 0, 0],
      value: strapWidth,
    }),
    dimension('strapThickness', {
      kind: 'length',
      from: [from, -half, 0],
      to: [from, -half, t],
      offset: [-5, 0, 0],
      value: t,
    }),
    across('headDiameter', 0, headDiameter, t + head.rimTo, [0, -half - 4, 0]),
    across('pegDiameter', 0, pegDiameter, t + head.neck, [0, half + 4, 0]),
    dimension('headLength', {
      kind: 'length',
      from: [0, 0, t + head.neck],
      to: [0, 0, t + head.top],
      offset: [-headDiameter / 2 - 5, 0, 0],
      value: values.headLength,
    }),
  ];
}

const STANCES: readonly Stance[] = [
  {
    id: 'flat',
    label: 'Flat, peg up',
    because:
      'Every strand lies in the plane that bends and stretches, and nothing needs support. The peg alone is pulled across its layers.',
    layers: 'along',
    orient: {},
  },
  {
    id: 'on-edge',
    label: 'On its edge',
    because:
      'The layers run along strip and peg alike, so the peg is stronger; but eyes and head hang over and a tall thin strip sways while it prints.',
    layers: 'along',
    orient: { strap: rotation('x', Math.PI / 2) },
  },
];

export const stances = (_values: PegStrap): readonly Stance[] => STANCES;
