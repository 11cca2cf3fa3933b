import type { Vec2 } from '@/lib/geometry/kernel';

/** One side of an arm in a plane: how far out it stands at its root and at `length` above, mm, running straight. */
export interface Side {
  readonly root: number;
  readonly tip: number;
  readonly length: number;
}

const leanOf = ({ root, tip, length }: Side) => Math.atan((root - tip) / length);

/** How far out the fillet of that side ends on the base. */
export function filletFoot(side: Side, radius: number): number {
  const lean = leanOf(side);
  return side.root - radius * Math.tan(lean) + radius / Math.cos(lean);
}

/** The fillet between the side and the base at height 0, as points [out, up] from the arm down to the base; one point where it is sharp. */
export function filletArc(side: Side, radius: number, facets: number): readonly Vec2[] {
  if (radius === 0) return [[side.root, 0]];
  const lean = leanOf(side);
  const centre = filletFoot(side, radius);
  return Array.from({ length: facets + 1 }, (_, i) => {
    const angle = Math.PI + lean + ((Math.PI / 2 - lean) * i) / facets;
    return [centre + radius * Math.cos(angle), radius + radius * Math.sin(angle)] as const;
  });
}
