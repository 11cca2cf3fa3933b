import type { OpenRing } from '@/lib/mechanics/open-ring';
import { boreOf, halfArcOf, mouthHalf, type Values } from './schema';

/** The ring as the mechanics see it. */
export const ringOf = (p: Values): OpenRing => ({
  bore: boreOf(p),
  wall: p.wallThickness,
  tipWall: p.tipThickness,
  halfArc: halfArcOf(p),
  stemHalfWidth: p.stemWidth / 2,
});

/** How far each lip must give way for the rod, mm. */
export const spreadOf = (p: Values): number => p.rodDiameter / 2 - mouthHalf(p);

/** Height of the ring's middle above the underside of the foot, mm. */
export const centreHeight = (p: Values): number =>
  p.footThickness + p.stemHeight + boreOf(p) / 2 + p.wallThickness;

/** Middle of each ring along the row, mm. */
export const centres = (p: Values): number[] =>
  Array.from({ length: p.clipCount }, (_, i) => (i - (p.clipCount - 1) / 2) * p.spacing);
