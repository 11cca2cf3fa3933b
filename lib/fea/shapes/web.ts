import type { BendingModel } from '../model';
import { type Corner, outline } from '../profile/outline';

/** A thin web between two thick leaves. mm, rad. */
export interface Web {
  /** length of the web between the leaves' edges */
  readonly length: number;
  readonly thickness: number;
  /** thickness of the leaves */
  readonly leaf: number;
  /** length of leaf taken into the model; past twice the leaf's thickness more changes nothing */
  readonly leafLength: number;
  /** radius between web and leaf on the upper side */
  readonly fillet: number;
  /** how far the web's lower face lies above the leaves' lower face (y = 0); 0 is flush */
  readonly relief: number;
  /** positive folds the leaves up, which stretches the lower face */
  readonly angle: number;
  readonly width: number;
}

/** Lower edge of the leaf; its rounding is the fillet's, or what the recess has room for. */
function recessCorners({ length, relief, fillet }: Web): Corner[] {
  if (relief === 0) return [];
  const x = length / 2;
  return [
    { at: [x, relief], radius: Math.min(fillet, relief), tag: 'step', filletTag: 'web-fillet' },
    { at: [x, 0], tag: 'leaf' },
  ];
}

/** Half of web and leaf at x >= 0, counter-clockwise from the plane of symmetry. */
function webCorners(web: Web): Corner[] {
  const { length, thickness, leaf, leafLength, fillet, relief } = web;
  const x = length / 2;
  return [
    { at: [0, relief], tag: 'web' },
    ...recessCorners(web),
    { at: [x + leafLength, 0], tag: 'end' },
    { at: [x + leafLength, leaf], tag: 'leaf' },
    { at: [x, leaf], tag: 'step' },
    { at: [x, relief + thickness], radius: fillet, tag: 'web', filletTag: 'web-fillet' },
    { at: [0, relief + thickness], tag: 'symmetry' },
  ];
}

/**
 * Folding of a living hinge by pure bending: half of it, its leaf turned by half the angle with a couple that turns
 * along. Plane strain, as webs are far wider than thick. Limits: no contact of the leaves, no drawing of the
 * plastic (PP), so past yield the strain is nominal.
 */
export function webModel(web: Web): BendingModel {
  return {
    profile: { loops: [outline(webCorners(web))] },
    plane: 'plane-strain',
    width: { kind: 'even', width: web.width },
    mirrored: true,
    supports: [
      { tag: 'symmetry', fix: 'x' },
      { corner: [0, web.relief], fix: 'y' },
    ],
    drive: { kind: 'rotation', tag: 'end', value: web.angle },
    peakTags: ['web', 'web-fillet'],
    factors: [],
  };
}
