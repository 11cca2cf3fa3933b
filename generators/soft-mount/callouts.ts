import { rotation } from '@/lib/geometry/placement';
import type { Callout, Stance } from '../contract';
import { columnsX, columnsY, freeHeight, onColumns, springOffset, type Values } from './schema';

const mm = (callout: Omit<Callout, 'kind' | 'unit'> & { kind?: Callout['kind'] }): Callout => ({
  kind: 'length',
  unit: 'mm',
  ...callout,
});

function columnCallouts(p: Values): Callout[] {
  const [x, y] = [columnsX(p).at(-1)!, columnsY(p)[0]! - p.columnSide / 2];
  const middle = p.columnHeight / 2;
  return [
    mm({
      field: 'columnHeight',
      from: [x + p.columnSide / 2, y, 0],
      to: [x + p.columnSide / 2, y, p.columnHeight],
      offset: [8, 0, 0],
      value: p.columnHeight,
    }),
    mm({
      field: 'columnSide',
      from: [x - p.columnSide / 2, y, middle],
      to: [x + p.columnSide / 2, y, middle],
      offset: [0, -6, 0],
      value: p.columnSide,
    }),
  ];
}

function springCallouts(p: Values): Callout[] {
  const front = -p.plateWidth / 2;
  const x = springOffset(p) + p.bendRadius;
  const leg = p.fillet + p.bendRadius;
  const half = p.stripThickness / 2;
  const centre = leg + p.bendRadius;
  return [
    mm({
      field: 'legLength',
      from: [x, front, leg - half],
      to: [x + p.legLength, front, leg - half],
      offset: [0, -6, 0],
      value: p.legLength,
    }),
    mm({
      field: 'stripThickness',
      from: [x, front, leg - half],
      to: [x, front, leg + half],
      offset: [0, -10, 0],
      value: p.stripThickness,
    }),
    mm({
      field: 'bendRadius',
      kind: 'radius',
      from: [x + p.legLength, front, centre],
      to: [x + p.legLength + p.bendRadius, front, centre],
      offset: [0, -6, 0],
      value: p.bendRadius,
    }),
  ];
}

/** Dimensions to draw on the unloaded mount. */
export function callouts(p: Values): Callout[] {
  const [end, front, h] = [p.plateLength / 2, -p.plateWidth / 2, freeHeight(p)];
  const plates = [
    mm({
      field: 'plateLength',
      from: [-end, front, h + p.plateThickness],
      to: [end, front, h + p.plateThickness],
      offset: [0, 0, 8],
      value: p.plateLength,
    }),
    mm({
      field: 'plateWidth',
      from: [-end, front, -p.plateThickness],
      to: [-end, -front, -p.plateThickness],
      offset: [-8, 0, 0],
      value: p.plateWidth,
    }),
    mm({
      field: 'plateThickness',
      from: [-end, front, -p.plateThickness],
      to: [-end, front, 0],
      offset: [-6, 0, 0],
      value: p.plateThickness,
    }),
  ];
  return [...plates, ...(onColumns(p) ? columnCallouts(p) : springCallouts(p))];
}

const onSide = (p: Values): Stance => ({
  id: 'on-side',
  label: 'Lying on its long side',
  because: onColumns(p)
    ? 'Layers run along the columns, and each column is a short bridge between the plates: no supports inside.'
    : 'The S is drawn by every layer in one stroke: no supports, and bending never pulls layers apart.',
  layers: 'along',
  orient: { mount: rotation('x', Math.PI / 2) },
});

const upright = (p: Values): Stance => ({
  id: 'upright',
  label: 'Standing on its plate',
  because: onColumns(p)
    ? 'Columns print cleanly, but the upper plate is one large bridge, and swaying pulls the layers apart.'
    : 'Every bend needs supports, and bending pulls the layers apart.',
  layers: 'across',
  orient: {},
});

export const stances = (p: Values): readonly Stance[] => [onSide(p), upright(p)];
