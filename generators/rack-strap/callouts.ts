import { rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import { asPrinted, layoutOf } from './layout';
import type { Values } from './schema';

type Line = Pick<Callout, 'field' | 'from' | 'to' | 'offset' | 'value'>;

const lengthOf = (line: Line): Callout => ({ kind: 'length', unit: 'mm', ...line });

/** Dimensions to draw over the strap as it stands on the bed. */
export function callouts(p: Values): Callout[] {
  const { head, tip, root, headTop, pawlTop, entryTop, band, toothedFrom } = layoutOf(p);
  const crest = p.bandThickness + p.toothDepth;
  const place = (x: number, y: number, z: number): [number, number, number] => [...asPrinted(p, [x, y]), z];
  const pitch = lengthOf({
    field: 'pitch',
    from: [-toothedFrom - p.pitch, crest, p.bandWidth],
    to: [-toothedFrom, crest, p.bandWidth],
    offset: [0, 6, 0],
    value: p.pitch,
  });
  const tab = p.release === 'tab' ? p.tabHeight : 0;
  return [
    lengthOf({
      field: 'pawlLength',
      from: [tip, pawlTop, headTop],
      to: [root, pawlTop, headTop],
      offset: [0, Math.max(tab, entryTop - pawlTop) + 5, 0],
      value: p.pawlLength,
    }),
    lengthOf({
      field: 'anvil',
      from: [head, 0, headTop],
      to: [head, p.anvil, headTop],
      offset: [6, 0, 0],
      value: p.anvil,
    }),
    lengthOf({
      field: 'bandWidth',
      from: place(-band, 0, 0),
      to: place(-band, 0, p.bandWidth),
      offset: p.printedAs === 'curved' ? [6, 0, 0] : [-6, 0, 0],
      value: p.bandWidth,
    }),
    lengthOf({
      field: 'bandThickness',
      from: place(-band / 2, 0, p.bandWidth),
      to: place(-band / 2, p.bandThickness, p.bandWidth),
      offset: [0, 0, 6],
      value: p.bandThickness,
    }),
    ...(p.printedAs === 'straight' ? [pitch] : []),
    ...(p.release === 'tab'
      ? [
          lengthOf({
            field: 'tabHeight',
            from: [tip, pawlTop, headTop],
            to: [tip, pawlTop + p.tabHeight, headTop],
            offset: [-6, 0, 0],
            value: p.tabHeight,
          }),
        ]
      : []),
  ];
}

const STANCES: readonly Stance[] = [
  {
    id: 'on-edge',
    label: 'Standing on its edge',
    because:
      'Strands follow the band, the teeth and the pawl, nothing is bent across the layers, and only the top of the head bridges its passage.',
    layers: 'along',
    orient: {},
  },
  {
    id: 'flat',
    label: 'Lying on its smooth face',
    because: 'Teeth and pawl are sheared off between two layers, and the passage needs supports.',
    layers: 'across',
    orient: { strap: rotation('x', Math.PI / 2) },
  },
];

export const stances = (_p: Values): readonly Stance[] => STANCES;
