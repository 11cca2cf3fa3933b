import type { BendingModel } from '@/lib/fea/model';
import { type Corner, outline } from '@/lib/fea/profile/outline';
import { IDENTITY } from '@/lib/geometry/placement';
import { secantModulus } from '@/lib/materials/secant';
import type { Material, Use } from '@/lib/materials/types';
import type { Bending } from '../contract';
import { engagement, layoutOf, pawlFlat, rampRun } from './layout';
import { pawlLifted } from './mechanics';
import type { Values } from './schema';

/** Reach of the corner where the last tooth meets the pawl, in pawl thicknesses: strain there says nothing. */
const SHADOW = 0.5;

/** Underside of the pawl from its end: the first tooth's flat is what the band lifts. */
function teeth(p: Values): Corner[] {
  const { tip, roof } = layoutOf(p);
  const low = roof - p.toothDepth;
  return Array.from({ length: p.pawlTeeth }, (_, i): Corner[] => {
    const x = tip + i * p.pitch;
    const foot = x + pawlFlat(p) + rampRun(p);
    return [
      { at: [x, low], tag: i === 0 ? 'land' : 'tooth' },
      { at: [x + pawlFlat(p), low], tag: 'tooth' },
      { at: [foot, roof], tag: 'tooth' },
      ...(i + 1 < p.pawlTeeth ? [{ at: [x + p.pitch, roof] as const, tag: 'tooth' }] : []),
    ];
  }).flat();
}

/** Pawl without its tab, and the block it grows from, seated where the skins hold it. Counter-clockwise. */
function corners(p: Values): Corner[] {
  const { tip, root, head, roof, pawlTop, entryTop } = layoutOf(p);
  const lastFoot = tip + (p.pawlTeeth - 1) * p.pitch + pawlFlat(p) + rampRun(p);
  const shadow = Math.min(SHADOW * p.pawlThickness, (root - lastFoot) / 2);
  return [
    { at: [root + p.pawlThickness, roof], tag: 'seat' },
    { at: [head, roof], tag: 'seat' },
    { at: [head, entryTop], tag: 'deck' },
    { at: [root, entryTop], tag: 'deck' },
    { at: [root, pawlTop], radius: p.pawlFillet, tag: 'outside', filletTag: 'root-fillet' },
    { at: [tip, pawlTop], tag: 'end' },
    ...teeth(p).slice(0, -1),
    { at: [lastFoot, roof], tag: 'shadow' },
    { at: [lastFoot + shadow, roof], tag: 'inside' },
  ];
}

/** The pawl lifted at its first tooth by the whole overlap. */
export function planeModel(p: Values): BendingModel {
  return {
    profile: { loops: [outline(corners(p))] },
    plane: 'plane-stress',
    width: { kind: 'even', width: layoutOf(p).headTop },
    mirrored: false,
    supports: [{ tag: 'seat', fix: 'both' }],
    drive: { kind: 'displacement', lands: [{ tag: 'land', direction: [0, 1] }], value: engagement(p) },
    peakTags: ['outside', 'inside', 'root-fillet'],
    factors: [],
  };
}

/** Printed flat on its face, the layers lie across the pawl; on edge, they lie in the plane. */
const layerNormal = (use: Use): number | null => (use.layers === 'across' ? Math.PI / 2 : null);

export function bending(p: Values, material: Material, use: Use): Bending {
  return {
    model: planeModel(p),
    body: 'strap',
    placements: [IDENTITY],
    strainFigure: 'pawl-strain',
    // lifted, the outer side of the root is pressed together
    counts: 'either',
    beside: null,
    forceFigures: ['lift-force', 'draw-force', 'release-force'],
    modulus: secantModulus(material, pawlLifted(p, material.poisson.value).nominal)?.value ?? null,
    layerNormal: layerNormal(use),
    motion: 'family',
  };
}
