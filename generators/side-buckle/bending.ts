import type { BendingModel } from '@/lib/fea/model';
import { type Corner, outline } from '@/lib/fea/profile/outline';
import type { Placement } from '@/lib/geometry/kernel';
import { secantModulus } from '@/lib/materials/secant';
import type { Material, Use } from '@/lib/materials/types';
import type { Bending } from '../contract';
import { layoutOf, squeezeTravel } from './layout';
import { buckleStrain, fingerTravel } from './mechanics';
import type { Values } from './schema';

/** Reach of the sharp corner under the holding face, in tip thicknesses: strain there says nothing on so sharp a corner. */
const SHADOW = 0.5;

/** Plane x across the buckle, y along the pull from the shoulder; the body has them as y and x. */
const PLACEMENT: Placement = [0, 1, 0, 0, 1, 0, 0, 0, 0, 0, -1, 0, 0, 0, 0, 1];

/** Half of the plug: the block between the webbing and the arm, and the arm with its barb. Counter-clockwise. */
function corners(p: Values): Corner[] {
  const { arm, root, edge, nose } = layoutOf(p);
  const pad = arm + p.barbHeight;
  const inner = arm - p.tipThickness;
  return [
    { at: [0, -p.barWidth], tag: 'bar' },
    { at: [arm, -p.barWidth], tag: 'side' },
    { at: [arm, root], tag: 'outside' },
    { at: [arm, edge - SHADOW * p.tipThickness], tag: 'under-barb' },
    { at: [arm, edge], tag: 'holding' },
    { at: [pad, edge], tag: 'pad' },
    { at: [pad, edge + p.padLength], tag: 'lead' },
    { at: [arm, nose], tag: 'nose' },
    { at: [inner, nose], tag: 'inside' },
    { at: [inner, edge], tag: 'inside' },
    { at: [arm - p.rootThickness, root], radius: p.rootFillet, tag: 'between', filletTag: 'root-fillet' },
    { at: [0, root], tag: 'middle' },
  ];
}

/** Both arms squeezed in by a finger in the middle of each pad. */
export function planeModel(p: Values): BendingModel {
  return {
    profile: { loops: [outline(corners(p))] },
    plane: 'plane-stress',
    width: { kind: 'even', width: p.plugThickness },
    mirrored: true,
    supports: [
      { tag: 'middle', fix: 'x' },
      { tag: 'bar', fix: 'both' },
    ],
    drive: {
      kind: 'displacement',
      lands: [{ tag: 'pad', direction: [-1, 0] }],
      value: 2 * fingerTravel(p, squeezeTravel(p)),
    },
    peakTags: ['side', 'outside', 'inside', 'root-fillet'],
    factors: [],
  };
}

/** Printed standing, the layers lie across the arms; flat, they lie in the plane. */
const layerNormal = (use: Use): number | null => (use.layers === 'across' ? Math.PI / 2 : null);

export function bending(p: Values, material: Material, use: Use): Bending {
  const { squeeze } = buckleStrain(p, material.poisson.value);
  return {
    model: planeModel(p),
    body: 'plug',
    placements: [PLACEMENT],
    strainFigure: 'peak-strain',
    // the inside of the root is pressed together
    counts: 'either',
    beside: null,
    forceFigures: ['squeeze-force', 'mating-force'],
    modulus: secantModulus(material, squeeze.nominal)?.value ?? null,
    layerNormal: layerNormal(use),
  };
}
