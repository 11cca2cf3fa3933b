import type { BendingModel, Factor, Width } from '@/lib/fea/model';
import { cantileverModel } from '@/lib/fea/shapes/cantilever';
import type { Root } from '@/lib/fea/shapes/root';
import type { Placement } from '@/lib/geometry/kernel';
import { secantModulus } from '@/lib/materials/secant';
import type { Material, Use } from '@/lib/materials/types';
import { narrowingAtFillet } from '@/lib/mechanics/fillet';
import { compliance, type FlexibleArm } from '@/lib/mechanics/large-deflection';
import { blockSprings, narrowingSlope, rootSection, wallSprings } from '@/lib/mechanics/root';
import { radians } from '@/lib/units';
import type { Bending, BendingPlane } from '../contract';
import { footLength, inPanel } from './dimensions';
import { armOf, flexibleArm, type HookStrain, strainOf } from './mechanics';
import type { HookValues } from './schema';

/** Plane x across the arm from its middle, y along it; the body has its straight face on x = 0 and stands along z. */
const placement = (v: HookValues): Placement => [
  ...[1, 0, 0, 0],
  ...[0, 0, 1, 0],
  ...[0, -1, 0, 0],
  ...[-v.rootThickness / 2, 0, 0, 1],
];

/** A wall much wider than the arm spreads its moment sideways, which no strip of it shows. */
const wallIsPlane = (v: HookValues): boolean => v.root === 'wall' && v.wallWidth <= 1.1 * v.rootWidth;

/** What stands under the arm in the plane: a strip of the wall where that is true to it, else a block. */
function rootOf(v: HookValues): Root {
  if (wallIsPlane(v)) return { kind: 'base', thickness: v.wallThickness, span: v.wallSpan, bottom: false };
  if (v.root === 'block')
    return { kind: 'base', thickness: v.baseThickness, span: v.baseLength, bottom: true };
  const deep = 3 * v.rootThickness;
  return { kind: 'base', thickness: deep, span: Math.max(v.wallSpan, footLength(v) + deep), bottom: true };
}

function widthOf(v: HookValues): Width {
  if (v.tipWidth === v.rootWidth) return { kind: 'even', width: v.rootWidth };
  const stations = [
    [0, v.rootWidth],
    [v.armLength, v.tipWidth],
  ] as const;
  return { kind: 'stations', along: 'y', stations };
}

/** The arm as the plane model sees it: on a base no wider than itself, free to arch across its width. */
function planeArm(v: HookValues, poisson: number): FlexibleArm {
  const section = rootSection(armOf(v), v.rootFillet, poisson);
  const springs = wallIsPlane(v)
    ? wallSprings({ thickness: v.wallThickness, span: v.wallSpan, width: v.rootWidth }, section)
    : blockSprings(v.rootWidth, section);
  return { arm: armOf(v), fillet: v.rootFillet, springs, poisson, stiffening: 1 };
}

/**
 * The root as it is against the root in the plane: a base wider than the arm turns less than the strip under it, a
 * wide wall bends where the plane has a block, and a wide arm cannot arch at its root.
 */
function widthFactor(v: HookValues, poisson: number): Factor {
  const plane = compliance(planeArm(v, poisson));
  const solid = flexibleArm(v, poisson);
  return {
    force: plane / compliance(solid),
    strain: plane / compliance({ ...solid, stiffening: 1 }),
    because:
      v.root === 'wall'
        ? 'the wall is wider than the arm, and how it gives is taken from the formula'
        : 'the base is wider than the arm, and a wide arm is held flat across its root',
  };
}

function factorsOf(v: HookValues, poisson: number): Factor[] {
  const narrowing = narrowingAtFillet(narrowingSlope(armOf(v)));
  const taper = { force: 1, strain: narrowing, because: 'an arm that narrows carries more at mid-width' };
  return narrowing > 1 ? [widthFactor(v, poisson), taper] : [widthFactor(v, poisson)];
}

/** The hook in its plane of bending, pressed back by the whole undercut. */
export function planeModel(v: HookValues, poisson: number): BendingModel {
  const model = cantileverModel({
    length: v.armLength,
    thickness: v.rootThickness,
    tipThickness: v.tipThickness,
    catch: {
      height: v.undercut,
      land: v.landLength,
      lead: radians(v.leadInAngle),
      back: radians(v.returnAngle),
    },
    root: rootOf(v),
    fillets: { front: v.rootFillet, back: v.rootFillet },
    width: widthOf(v),
    deflection: v.undercut,
  });
  return { ...model, factors: factorsOf(v, poisson) };
}

/** The wall's own strain, where the plane has a block in its place. */
function wallBeside(v: HookValues, { wall }: HookStrain): BendingPlane['beside'] {
  if (wall === null || wallIsPlane(v)) return null;
  return { strain: wall, because: `The wall of ${v.wallThickness} mm bends harder than the arm.` };
}

/** Printed standing, the layers lie across the arm; on its side they lie in the plane of bending. */
const layerNormal = (use: Use): number | null => (use.layers === 'across' ? Math.PI / 2 : null);

/** Why a hook has no plane model; null where it has one. */
function withoutPlane(v: HookValues): string | null {
  if (inPanel(v)) return 'An arm cut from a panel bends the panel as a plate, not as a plane section.';
  if (v.rootFillet === 0) return 'A sharp root has no finite strain to compute.';
  return null;
}

/** Of an arm that hardly is a beam; else the factors of the model tell. */
const STUBBY = 'an arm this stubby shears and turns in its base more than the formula follows';

export function bending(v: HookValues, material: Material, use: Use): Bending {
  const none = withoutPlane(v);
  if (none) return { none };
  const poisson = material.poisson.value;
  const strain = strainOf(v, flexibleArm(v, poisson), v.undercut);
  return {
    model: planeModel(v, poisson),
    body: 'hook',
    placements: [placement(v)],
    strainFigure: 'peak-strain',
    counts: 'tension',
    beside: wallBeside(v, strain),
    forceFigures: ['deflection-force', 'mating-force', 'mating-force-tilted', 'separation-force'],
    modulus: secantModulus(material, strain.nominal)?.value ?? null,
    layerNormal: layerNormal(use),
    ...(v.armLength < 4 * v.rootThickness && { apart: STUBBY }),
  };
}
