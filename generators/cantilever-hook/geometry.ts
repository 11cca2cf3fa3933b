import type { Kernel, NamedSolid, Placement, Solid } from '@/lib/geometry/kernel';
import { backFilletFoot } from './dimensions';
import { armVolume, frontOutline, sideOutline } from './outline';
import { plateVolume, windowPlate } from './receiver';
import type { HookValues } from './schema';

/** Facets of a quarter-circle fillet. */
const filletFacets = (segmentsPerTurn: number) => Math.max(2, Math.round(segmentsPerTurn / 4));

/** A side view (x, z) extruded to y: turned up and centred on y = 0. */
const sideUp = (width: number): Placement => [1, 0, 0, 0, 0, 0, 1, 0, 0, -1, 0, 0, 0, width / 2, 0, 1];
/** A front view (y, z) extruded along +x from `x`. */
const frontUp = (x: number): Placement => [0, 1, 0, 0, 0, 0, 1, 0, 1, 0, 0, 0, x, 0, 0, 1];

interface Base {
  readonly length: number;
  readonly width: number;
  readonly thickness: number;
}

const baseOf = (v: HookValues): Base =>
  v.root === 'block'
    ? { length: v.baseLength, width: v.baseWidth, thickness: v.baseThickness }
    : { length: v.wallSpan, width: v.wallWidth, thickness: v.wallThickness };

function arm(v: HookValues, kernel: Kernel, sunk: number): Solid {
  const side = sideOutline(v, filletFacets(kernel.quality.segmentsPerTurn), sunk);
  const swept = kernel.place(kernel.extrude(kernel.outlines.polygon(side), v.rootWidth), sideUp(v.rootWidth));
  if (v.tipWidth === v.rootWidth) return swept;
  const back = -backFilletFoot(v) - 1;
  const depth = v.rootFillet + v.undercut + 1 - back;
  const front = kernel.extrude(kernel.outlines.polygon(frontOutline(v, sunk + 1)), depth);
  return kernel.intersect([swept, kernel.place(front, frontUp(back))]);
}

function hook(v: HookValues, kernel: Kernel): Solid {
  const base = baseOf(v);
  const body = kernel.box(
    [base.length, base.width, base.thickness],
    [-v.rootThickness / 2, 0, -base.thickness / 2],
  );
  return kernel.union([body, arm(v, kernel, Math.min(0.5, base.thickness / 2))]);
}

export function build(v: HookValues, kernel: Kernel): readonly NamedSolid[] {
  const bodies = [{ name: 'hook', solid: hook(v, kernel) }];
  return v.receiver ? [...bodies, { name: 'receiver', solid: windowPlate(v, kernel) }] : bodies;
}

export function volumes(v: HookValues, segmentsPerTurn: number): Readonly<Record<string, number>> {
  const base = baseOf(v);
  const hookVolume = base.length * base.width * base.thickness + armVolume(v, filletFacets(segmentsPerTurn));
  return v.receiver ? { hook: hookVolume, receiver: plateVolume(v) } : { hook: hookVolume };
}
