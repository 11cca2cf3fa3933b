import { rotation } from '@/lib/geometry/placement';
import { jointOf } from '@/lib/mechanics/screw-sizes';
import type { Callout, Stance } from '../contract';
import type { Values } from './schema';

type Line = Pick<Callout, 'field' | 'from' | 'to' | 'offset' | 'value'>;

const lengthOf = (line: Line): Callout => ({ kind: 'length', unit: 'mm', ...line });
const diameterOf = (line: Line): Callout => ({ kind: 'diameter', unit: 'mm', ...line });

/** Dimensions to draw on the assembly: the neck's on the left, the cap's on the right. */
export function callouts(p: Values): Callout[] {
  const { cap, capTop, capMouth, neckBase, thread } = jointOf(p);
  const major = p.majorDiameter / 2;
  const bore = p.bore / 2;
  const inside = cap.majorDiameter / 2;
  const outside = inside + p.wall;
  const bottom = -p.flangeThickness;
  return [
    diameterOf({
      field: 'majorDiameter',
      from: [-major, 0, p.neckHeight],
      to: [major, 0, p.neckHeight],
      offset: [0, 0, capTop - p.neckHeight + 10],
      value: p.majorDiameter,
    }),
    diameterOf({
      field: 'bore',
      from: [-bore, 0, bottom],
      to: [bore, 0, bottom],
      offset: [0, 0, -8],
      value: p.bore,
    }),
    lengthOf({
      field: 'neckHeight',
      from: [-major, 0, 0],
      to: [-major, 0, p.neckHeight],
      offset: [-(outside - major + 16), 0, 0],
      value: p.neckHeight,
    }),
    lengthOf({
      field: 'pitch',
      from: [-major, 0, neckBase],
      to: [-major, 0, neckBase + thread.pitch],
      offset: [-(outside - major + 8), 0, 0],
      value: p.pitch,
    }),
    lengthOf({
      field: 'capHeight',
      from: [outside, 0, capMouth],
      to: [outside, 0, capTop],
      offset: [16, 0, 0],
      value: p.capHeight,
    }),
    lengthOf({
      field: 'topThickness',
      from: [outside, 0, capTop - p.topThickness],
      to: [outside, 0, capTop],
      offset: [8, 0, 0],
      value: p.topThickness,
    }),
    lengthOf({
      field: 'wall',
      from: [inside, 0, capMouth],
      to: [outside, 0, capMouth],
      offset: [0, 0, -6],
      value: p.wall,
    }),
    lengthOf({
      field: 'flangeThickness',
      from: [-(thread.rootDiameter / 2 + p.flangeWidth), 0, bottom],
      to: [-(thread.rootDiameter / 2 + p.flangeWidth), 0, 0],
      offset: [-8, 0, 0],
      value: p.flangeThickness,
    }),
  ];
}

const ON_ITS_TOP = rotation('x', Math.PI);

const STANDING: Stance = {
  id: 'standing',
  label: 'Both standing, cap on its top',
  because:
    'Threads upright: round, without supports, the hoop of seal and cap along the layers. The pull in the thread shears along the layers, which the check counts.',
  layers: 'along',
  orient: { cap: ON_ITS_TOP },
};

const LYING: Stance = {
  id: 'neck-lying',
  label: 'Neck lying, cap on its top',
  because:
    'For a slender neck that is pulled or twisted hard: strands run along it and it bears about twice the torque (rough test). It needs supports, comes out less round, and a plug then pulls its layers apart.',
  layers: 'across',
  orient: { neck: rotation('x', Math.PI / 2), cap: ON_ITS_TOP },
};

export const stances = (): Stance[] => [STANDING, LYING];
