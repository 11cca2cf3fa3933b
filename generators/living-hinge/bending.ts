import type { BendingModel } from '@/lib/fea/model';
import { webModel } from '@/lib/fea/shapes/web';
import type { Placement } from '@/lib/geometry/kernel';
import { secantModulus } from '@/lib/materials/secant';
import type { Material, Use } from '@/lib/materials/types';
import { stripStrain } from '@/lib/mechanics/web';
import type { Bending } from '../contract';
import type { Values } from './schema';
import { foldAngleOf, pressedShut, webOf } from './web';

/** Plane x across the fold, y up from the flat face; the body lies on z = 0 with its fold along y. */
const PLACEMENT: Placement = [1, 0, 0, 0, 0, 0, 1, 0, 0, -1, 0, 0, 0, 0, 0, 1];

/** Leaf taken into the model, in leaf thicknesses; beyond it the leaf only turns. */
const LEAF_REACH = 2;

/** Half of the hinge folded by half the angle. A fold towards the flat face stretches the groove side. */
export function planeModel(p: Values): BendingModel {
  const angle = foldAngleOf(p);
  return webModel({
    length: p.webLength,
    thickness: p.webThickness,
    leaf: p.leafThickness,
    leafLength: Math.min(p.leafLength, LEAF_REACH * p.leafThickness),
    fillet: p.webFillet,
    relief: p.webRelief,
    angle: p.foldTowards === 'flat-face' ? -angle : angle,
    width: p.leafWidth,
  });
}

/** Standing on a leaf's edge, the layers are pulled apart across the fold; flat, they run along the web. */
const layerNormal = (use: Use): number | null => (use.layers === 'across' ? 0 : null);

export function bending(p: Values, material: Material, use: Use): Bending {
  if (pressedShut(p)) {
    return { none: 'Leaves pressed face to face touch, which the plane model does not cover.' };
  }
  const web = webOf(p);
  const nominal = stripStrain(web.thickness, web.length, foldAngleOf(p));
  return {
    model: planeModel(p),
    body: 'hinge',
    placements: [PLACEMENT],
    strainFigure: 'peak-strain',
    counts: 'tension',
    beside: null,
    // the moment is capped where the web yields through, so it stays with the closed form
    forceFigures: [],
    modulus: secantModulus(material, nominal)?.value ?? null,
    layerNormal: layerNormal(use),
    apart: 'a web this short bends into its fillets and leaves, where the formula bends an even strip',
  };
}
