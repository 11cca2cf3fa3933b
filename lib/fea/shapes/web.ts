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
  readonly fillet: number;
  /** web in the middle of the leaves' thickness, or flush with their lower face (y = 0) */
  readonly layout: 'centre' | 'flush';
  /** positive folds the leaves up, which stretches the lower face */
  readonly angle: number;
  readonly width: number;
}

function stepCorners({ length, leaf, fillet }: Web, low: number): Corner[] {
  if (low === 0) return [];
  const x = length / 2;
  const inner: Corner = { at: [x, low], radius: fillet, tag: 'step', filletTag: 'web-fillet' };
  return leaf > 0 ? [inner, { at: [x, 0], tag: 'leaf' }] : [];
}

/** Half of web and leaf at x >= 0, counter-clockwise from the plane of symmetry. */
function webCorners(web: Web): Corner[] {
  const { length, thickness, leaf, leafLength, fillet, layout } = web;
  const low = layout === 'centre' ? (leaf - thickness) / 2 : 0;
  const x = length / 2;
  return [
    { at: [0, low], tag: 'web' },
    ...stepCorners(web, low),
    { at: [x + leafLength, 0], tag: 'end' },
    { at: [x + leafLength, leaf], tag: 'leaf' },
    { at: [x, leaf], tag: 'step' },
    { at: [x, low + thickness], radius: fillet, tag: 'web', filletTag: 'web-fillet' },
    { at: [0, low + thickness], tag: 'symmetry' },
  ];
}

/**
 * Folding of a living hinge by pure bending: half of it, its leaf turned by half the angle with a couple that turns
 * along. Plane strain, as webs are far wider than thick. Limits: no contact of the leaves, no drawing of the
 * plastic (PP), so past yield the strain is nominal.
 */
export function webModel(web: Web): BendingModel {
  const low = web.layout === 'centre' ? (web.leaf - web.thickness) / 2 : 0;
  return {
    profile: { loops: [outline(webCorners(web))] },
    plane: 'plane-strain',
    width: { kind: 'even', width: web.width },
    mirrored: true,
    supports: [
      { tag: 'symmetry', fix: 'x' },
      { corner: [0, low], fix: 'y' },
    ],
    drive: { kind: 'rotation', tag: 'end', value: web.angle },
    peakTags: ['web', 'web-fillet'],
    factors: [],
  };
}
