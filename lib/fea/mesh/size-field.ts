import { allSegments, extent, type Profile } from '../profile/profile';
import { distanceTo, inwardNormal, pointAt, rayHit, type Segment, segmentLength } from '../profile/segment';
import type { MeshOptions } from './options';

/** Wanted element edge, mm, at a point. */
export type SizeField = (x: number, y: number) => number;

interface Fine {
  readonly segment: Segment;
  readonly size: number;
}

/** Where along a segment the wall is measured; near the ends as well, where walls taper. */
const PROBES = [0.03, 0.25, 0.5, 0.75, 0.97];

/** Smallest clear distance through the material, measured square to the segment. */
function wallBehind(segment: Segment, all: readonly Segment[], beyond: number): number {
  let wall = Infinity;
  for (const t of PROBES) {
    const from = pointAt(segment, t);
    const inward = inwardNormal(segment, t);
    for (const other of all) wall = Math.min(wall, rayHit(other, from, inward, beyond));
  }
  return wall;
}

function sizeOn(segment: Segment, all: readonly Segment[], options: MeshOptions, beyond: number): number {
  const byCurvature = segment.kind === 'arc' ? segment.radius / options.perRadius : Infinity;
  const byWall = wallBehind(segment, all, beyond) / options.perThickness;
  return Math.min(options.longest, segment.size, segmentLength(segment), byCurvature, byWall);
}

/**
 * Edge length over the plane: on each segment the least of the cap, its own wish and length, radius / perRadius and local wall
 * / perThickness; away from it growing linearly with distance. Method: distance-based size function after Persson,
 * Mesh size functions for implicit geometries (2006), from memory. Lipschitz with constant `growth`, so neighbouring
 * elements differ little. Limit: walls are probed at five places a segment, a narrower neck between them is missed.
 */
export function sizeField(profile: Profile, options: MeshOptions): SizeField {
  const all = allSegments(profile);
  const beyond = 1e-6 * extent(profile);
  const { longest, growth } = options;
  const fine: Fine[] = all
    .map((segment) => ({ segment, size: sizeOn(segment, all, options, beyond) }))
    .filter(({ size }) => size < longest * 0.999)
    .sort((a, b) => a.size - b.size);
  return (x, y) => {
    let wanted = longest;
    for (const { segment, size } of fine) {
      if (size >= wanted) break;
      wanted = Math.min(wanted, size + growth * distanceTo(segment, x, y));
    }
    return wanted;
  };
}
