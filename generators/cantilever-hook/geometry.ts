import type { Kernel, NamedSolid, Placement, Solid } from '@/lib/geometry/kernel';
import { baseSolid, baseVolume, sunkDepth } from './base';
import { backSide, footWidth, inPanel } from './dimensions';
import { filletFoot } from './fillet-arc';
import { armVolume, frontOutline, sideOutline } from './outline';
import { receiver, receiverVolume } from './receiver';
import type { HookValues } from './schema';

/** Facets of a quarter-circle fillet. */
const filletFacets = (segmentsPerTurn: number) => Math.max(2, Math.round(segmentsPerTurn / 4));

/** A side view (x, z) extruded to y: turned up and centred on y = 0. */
const sideUp = (width: number): Placement => [1, 0, 0, 0, 0, 0, 1, 0, 0, -1, 0, 0, 0, width / 2, 0, 1];
/** A front view (y, z) extruded along +x from `x`. */
const frontUp = (x: number): Placement => [0, 1, 0, 0, 0, 0, 1, 0, 1, 0, 0, 0, x, 0, 0, 1];

function arm(v: HookValues, kernel: Kernel): Solid {
  const { polygon } = kernel.outlines;
  const facets = filletFacets(kernel.quality.segmentsPerTurn);
  const sunk = sunkDepth(v);
  const widest = inPanel(v) ? footWidth(v) + 1 : v.rootWidth;
  const side = kernel.extrude(polygon(sideOutline(v, facets, sunk)), widest);
  const swept = kernel.place(side, sideUp(widest));
  if (!inPanel(v) && v.tipWidth === v.rootWidth) return swept;
  const back = -filletFoot(backSide(v), v.rootFillet) - 1;
  const depth = v.rootFillet + v.undercut + 1 - back;
  const front = kernel.extrude(polygon(frontOutline(v, facets, sunk + 1)), depth);
  return kernel.intersect([swept, kernel.place(front, frontUp(back))]);
}

export function build(v: HookValues, kernel: Kernel): readonly NamedSolid[] {
  const hook = { name: 'hook', solid: kernel.union([baseSolid(v, kernel), arm(v, kernel)]) };
  return v.receiver ? [hook, { name: 'receiver', solid: receiver(v, kernel) }] : [hook];
}

export function volumes(v: HookValues, segmentsPerTurn: number): Readonly<Record<string, number>> {
  const hook = baseVolume(v) + armVolume(v, filletFacets(segmentsPerTurn));
  return v.receiver ? { hook, receiver: receiverVolume(v) } : { hook };
}
