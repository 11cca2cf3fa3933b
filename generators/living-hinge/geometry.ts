import type { Kernel, Loop, NamedSolid, Vec2 } from '@/lib/geometry/kernel';
import { loopArea } from '@/lib/geometry/loops';
import { compose, rotation, translation } from '@/lib/geometry/placement';
import { reliefFillet } from '@/lib/mechanics/web';
import type { Values } from './schema';
import { webOf } from './web';

/** Quarter arc about a centre, from one angle to another, ends included; radius 0 gives the centre. */
function arc([cx, cy]: Vec2, radius: number, from: number, to: number, segments: number): Vec2[] {
  if (radius < 1e-9) return [[cx, cy]];
  return Array.from({ length: segments + 1 }, (_, i) => {
    const a = from + ((to - from) * i) / segments;
    return [cx + radius * Math.cos(a), cy + radius * Math.sin(a)];
  });
}

/** Right half of the section, from the flat face up to the top face: x across the fold, y up from the bed. */
function rightHalf(p: Values, segments: number): { bottom: Vec2[]; top: Vec2[] } {
  const half = p.webLength / 2;
  const outer = half + p.leafLength;
  const lower = reliefFillet(webOf(p));
  const roof = p.webRelief + p.webThickness;
  const r = p.webFillet;
  const quarter = Math.PI / 2;
  const recess = arc([half - lower, p.webRelief - lower], lower, quarter, 0, segments);
  const corner: Vec2[] = lower < p.webRelief - 1e-9 || lower === 0 ? [[half, 0]] : [];
  const bottom: Vec2[] = p.webRelief > 0 ? [...recess, ...corner] : [[half, 0]];
  const groove = arc([half - r, roof + r], r, 0, -quarter, segments);
  return {
    bottom: [...bottom, [outer, 0]],
    top: [[outer, p.leafThickness], [half, p.leafThickness], ...groove],
  };
}

const mirrored = (points: readonly Vec2[]): Vec2[] => points.map(([x, y]): Vec2 => [-x, y]).reverse();

const samePoint = (a: Vec2, b: Vec2): boolean => Math.hypot(a[0] - b[0], a[1] - b[1]) < 1e-6;

/** Section across the fold, counter-clockwise: x across the fold, y up from the bed. */
export function section(p: Values, segmentsPerTurn: number): Loop {
  const { bottom, top } = rightHalf(p, Math.max(4, Math.round(segmentsPerTurn / 4)));
  const loop = [...mirrored(bottom), ...bottom, ...top, ...mirrored(top)];
  return loop.filter((point, i) => !samePoint(point, loop[(i + loop.length - 1) % loop.length]!));
}

/** Centres of the holes in both leaves: x across the fold, y along it. */
export function holeCentres(p: Values): Vec2[] {
  const x = (p.webLength + p.leafLength) / 2;
  return Array.from(
    { length: p.holeCount },
    (_, i) => -p.leafWidth / 2 + (p.leafWidth * (i + 0.5)) / p.holeCount,
  ).flatMap((y): Vec2[] => [
    [-x, y],
    [x, y],
  ]);
}

/** Circles are drawn through their own radius at mid-facet, so that the hole is never too small. */
const boreRadius = (diameter: number, segments: number): number =>
  diameter / 2 / Math.cos(Math.PI / segments);

/** One body "hinge", flat as printed: fold line along y, flat face on z = 0. */
export function build(p: Values, kernel: Kernel): NamedSolid[] {
  const segments = kernel.quality.segmentsPerTurn;
  const upright = kernel.extrude({ loops: [section(p, segments)] }, p.leafWidth);
  const flat = kernel.place(
    upright,
    compose(translation([0, p.leafWidth / 2, 0]), rotation('x', Math.PI / 2)),
  );
  if (p.holeCount === 0) return [{ name: 'hinge', solid: flat }];
  const bore = kernel.cylinder(boreRadius(p.holeDiameter, segments), p.leafThickness + 2, { segments });
  const bores = holeCentres(p).map(([x, y]) => kernel.place(bore, translation([x, y, -1])));
  return [{ name: 'hinge', solid: kernel.subtract(flat, bores) }];
}

/** Volume of the faceted body, mm3. */
export function volumes(p: Values, segmentsPerTurn: number): Readonly<Record<string, number>> {
  const r = boreRadius(p.holeDiameter, segmentsPerTurn);
  const hole = (segmentsPerTurn / 2) * r * r * Math.sin((2 * Math.PI) / segmentsPerTurn) * p.leafThickness;
  return { hinge: loopArea(section(p, segmentsPerTurn)) * p.leafWidth - 2 * p.holeCount * hole };
}
