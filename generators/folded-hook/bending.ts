import type { BendingModel, Factor, Support } from '@/lib/fea/model';
import { type Corner, outline } from '@/lib/fea/profile/outline';
import { arc, type Segment } from '@/lib/fea/profile/segment';
import type { Placement } from '@/lib/geometry/kernel';
import { secantModulus } from '@/lib/materials/secant';
import type { Material, Use } from '@/lib/materials/types';
import type { Bending } from '../contract';
import { foldedStrain, solveFolded } from './mechanics';
import { leadRun, meanBend, returnRun, type Values } from './schema';

const QUARTER = Math.PI / 2;
/** Straight edges that stand for a bend until it is put in. */
const INNER = 'bend-inside';
const OUTER = 'bend-outside';

const PLACEMENT: Placement = [1, 0, 0, 0, 0, 0, 1, 0, 0, -1, 0, 0, 0, 0, 0, 1];

/** Catch of a U on the outer face x = `face`, from the free end at y = `end` up. */
function catchOfU(p: Values, face: number, end: number): Corner[] {
  const foot = end + returnRun(p);
  return [
    { at: [face, end], tag: 'return' },
    { at: [face + p.undercut, foot], tag: 'land' },
    { at: [face + p.undercut, foot + p.landLength], tag: 'lead' },
    { at: [face, foot + p.landLength + leadRun(p)], tag: 'outside' },
  ];
}

/** U: base under y = 0, root leg up at x = 0, free leg down at +x. Counter-clockwise from the back of the root. */
function cornersOfU(p: Values): Corner[] {
  const h = p.thickness / 2;
  const far = 2 * meanBend(p);
  const reach = p.baseLength / 2;
  const end = p.rootLeg - p.freeLeg;
  return [
    { at: [-h, 0], radius: p.rootFillet, tag: 'deck', filletTag: 'root-fillet' },
    { at: [-reach, 0], tag: 'side' },
    { at: [-reach, -p.baseThickness], tag: 'side' },
    { at: [reach, -p.baseThickness], tag: 'side' },
    { at: [reach, 0], tag: 'deck' },
    { at: [h, 0], radius: p.rootFillet, tag: 'front', filletTag: 'root-fillet' },
    { at: [h, p.rootLeg], tag: INNER },
    { at: [far - h, p.rootLeg], tag: 'inside' },
    { at: [far - h, end], tag: 'end' },
    ...catchOfU(p, far + h, end),
    { at: [far + h, p.rootLeg], tag: OUTER },
    { at: [-h, p.rootLeg], tag: 'back' },
  ];
}

/** Catch of an L on the outer face x = `face`, up to the free end at y = `end`. */
function catchOfL(p: Values, face: number, end: number): Corner[] {
  const low = end - leadRun(p) - p.landLength;
  return [
    { at: [face, low - returnRun(p)], tag: 'return' },
    { at: [face + p.undercut, low], tag: 'land' },
    { at: [face + p.undercut, low + p.landLength], tag: 'lead' },
    { at: [face, end], tag: 'end' },
  ];
}

/** L: wall behind x = 0, root leg along +x, free leg up. Counter-clockwise from under the root. */
function cornersOfL(p: Values): Corner[] {
  const h = p.thickness / 2;
  const reach = p.baseLength / 2;
  const face = p.rootLeg + meanBend(p) + h;
  const end = meanBend(p) + p.freeLeg;
  return [
    { at: [0, -h], radius: p.rootFillet, tag: 'back', filletTag: 'root-fillet' },
    { at: [p.rootLeg, -h], tag: OUTER },
    { at: [face, meanBend(p)], tag: 'outside' },
    ...catchOfL(p, face, end),
    { at: [face - p.thickness, end], tag: 'inside' },
    { at: [face - p.thickness, meanBend(p)], tag: INNER },
    { at: [p.rootLeg, h], tag: 'front' },
    { at: [0, h], radius: p.rootFillet, tag: 'deck', filletTag: 'root-fillet' },
    { at: [0, reach], tag: 'side' },
    { at: [-p.baseThickness, reach], tag: 'side' },
    { at: [-p.baseThickness, -reach], tag: 'side' },
    { at: [0, -reach], tag: 'deck' },
  ];
}

/** The bends in place of the straight edges that stand for them. */
function bends(p: Values): Readonly<Record<string, Segment>> {
  const outer = p.bendRadius + p.thickness;
  if (p.shape === 'u') {
    const middle = [meanBend(p), p.rootLeg] as const;
    return {
      [INNER]: arc(middle, p.bendRadius, Math.PI, -Math.PI, INNER),
      [OUTER]: arc(middle, outer, 0, Math.PI, OUTER),
    };
  }
  const middle = [p.rootLeg, meanBend(p)] as const;
  return {
    [INNER]: arc(middle, p.bendRadius, 0, -QUARTER, INNER),
    [OUTER]: arc(middle, outer, -QUARTER, QUARTER, OUTER),
  };
}

/** A base wider than the arm turns less than a strip no wider. */
function widthFactor(p: Values, poisson: number): Factor {
  const elastic = { modulus: 1, poisson, width: p.armWidth };
  const strip = solveFolded({ ...p, baseWidth: p.armWidth }, elastic).compliance;
  const ratio = strip / solveFolded(p, elastic).compliance;
  return { force: ratio, strain: ratio, because: 'the base is wider than the arm' };
}

const HELD: readonly Support[] = [{ tag: 'side', fix: 'both' }];

/** The arm in its plane, its catch pressed in by the whole undercut. */
export function planeModel(p: Values, poisson: number): BendingModel {
  const straight = outline(p.shape === 'u' ? cornersOfU(p) : cornersOfL(p));
  const curved = bends(p);
  return {
    profile: { loops: [straight.map((segment) => curved[segment.tag] ?? segment)] },
    plane: 'plane-stress',
    width: { kind: 'even', width: p.armWidth },
    mirrored: false,
    supports: HELD,
    drive: { kind: 'displacement', lands: [{ tag: 'land', direction: [-1, 0] }], value: p.undercut },
    peakTags: [INNER, OUTER, 'root-fillet', 'front', 'back'],
    factors: [widthFactor(p, poisson)],
  };
}

/** Layers across the legs of a hook printed standing; on its side they lie in the plane of bending. */
const layerNormal = (use: Use): number | null => (use.layers === 'across' ? QUARTER : null);

/** What the chain of bars leaves out. */
const APART = {
  u: 'the legs turn so far that the push no longer acts at the arm the formula takes',
  l: 'legs this stubby are mostly bend, fillet and catch, where the formula bends slender bars',
} as const;

export function bending(p: Values, material: Material, use: Use): Bending {
  return {
    model: planeModel(p, material.poisson.value),
    body: 'hook',
    placements: [PLACEMENT],
    strainFigure: 'peak-strain',
    // pressed in, the inside of the bend is in compression
    counts: 'either',
    beside: null,
    forceFigures: ['deflection-force', 'mating-force', 'separation-force'],
    modulus: secantModulus(material, foldedStrain(p).peak)?.value ?? null,
    layerNormal: layerNormal(use),
    apart: APART[p.shape],
  };
}
