import type { BendingModel, Support } from '../model';
import { arc, line, type Segment } from '../profile/segment';

/** A ring open at +y, of even thickness, on a foot at -y or held at its back. mm, rad. */
export interface OpenRing {
  /** inner radius */
  readonly radius: number;
  readonly thickness: number;
  /** full angle of the mouth */
  readonly opening: number;
  /** round: half circles beyond the mouth's edges; cut: square ends */
  readonly lips: 'round' | 'cut';
  /** half width and depth below the ring of a foot, and the rounding between; null: held at the back */
  readonly foot: { readonly width: number; readonly depth: number; readonly fillet: number } | null;
  readonly width: number;
  /** how far the lips move apart, both together */
  readonly spread: number;
}

/** Half of the foot and its rounding into the outer circle. Returns the segments and where the circle starts. */
function footHalf(ring: OpenRing, foot: NonNullable<OpenRing['foot']>): { from: Segment[]; start: number } {
  const outer = ring.radius + ring.thickness;
  const half = foot.width / 2;
  const bottom = -outer - foot.depth;
  const x = half + foot.fillet;
  const y = -Math.sqrt((outer + foot.fillet) ** 2 - x * x);
  if (!(y > bottom)) throw new RangeError('the foot is too wide or too shallow for its rounding');
  const start = Math.atan2(y, x);
  const from = [
    line([0, bottom], [half, bottom], 'bottom'),
    line([half, bottom], [half, y], 'foot'),
    arc([x, y], foot.fillet, Math.PI, start, 'foot-fillet'),
  ];
  return { from, start };
}

function lipOf({ radius, thickness, lips }: OpenRing, angle: number): Segment {
  const [x, y] = [Math.cos(angle), Math.sin(angle)];
  const [inner, middle, outer] = [radius, radius + thickness / 2, radius + thickness];
  if (lips === 'cut') return line([outer * x, outer * y], [inner * x, inner * y], 'lip');
  return arc([middle * x, middle * y], thickness / 2, angle, Math.PI, 'lip');
}

/** Half ring at x >= 0, counter-clockwise from the plane of symmetry. */
function halfRing(ring: OpenRing): Segment[] {
  const { radius, thickness, opening, foot } = ring;
  const lip = Math.PI / 2 - opening / 2;
  const { from, start } = foot ? footHalf(ring, foot) : { from: [], start: -Math.PI / 2 };
  const lowest = foot ? -radius - thickness - foot.depth : -radius - thickness;
  return [
    ...from,
    arc([0, 0], radius + thickness, start, lip - start, 'outer'),
    lipOf(ring, lip),
    arc([0, 0], radius, lip, -(lip + Math.PI / 2), 'bore'),
    line([0, -radius], [0, lowest], 'symmetry'),
  ];
}

/**
 * Bending of an open ring whose lips are spread apart. The half at x >= 0 is meshed. Throws a RangeError where the
 * foot's rounding does not fit between ring and foot.
 */
export function openRingModel(ring: OpenRing): BendingModel {
  const { foot, radius, thickness } = ring;
  const supports: Support[] = [
    { tag: 'symmetry', fix: 'x' },
    foot ? { tag: 'bottom', fix: 'both' } : { corner: [0, -radius - thickness], fix: 'y' },
  ];
  return {
    profile: { loops: [halfRing(ring)] },
    plane: 'plane-stress',
    width: { kind: 'even', width: ring.width },
    mirrored: true,
    supports,
    drive: { kind: 'displacement', lands: [{ tag: 'lip', direction: [1, 0] }], value: ring.spread },
    peakTags: foot ? ['bore', 'outer', 'foot-fillet'] : ['bore', 'outer'],
    factors: [],
  };
}
