import { type Segment, segmentLength } from './segment';

/** A plane shape: outer loops counter-clockwise, holes clockwise, each loop a closed chain of segments. */
export interface Profile {
  readonly loops: readonly (readonly Segment[])[];
}

/** min x, min y, max x, max y */
export type Box = readonly [number, number, number, number];

export function allSegments(profile: Profile): readonly Segment[] {
  return profile.loops.flat();
}

function reach(s: Segment): Box {
  if (s.kind === 'arc') {
    return [s.cx - s.radius, s.cy - s.radius, s.cx + s.radius, s.cy + s.radius];
  }
  return [Math.min(s.x0, s.x1), Math.min(s.y0, s.y1), Math.max(s.x0, s.x1), Math.max(s.y0, s.y1)];
}

/** A box around the profile; arcs count with their whole circle, so it may be wider than need be. */
export function boxAround(profile: Profile): Box {
  return allSegments(profile)
    .map(reach)
    .reduce(([a, b, c, d], [e, f, g, h]) => [Math.min(a, e), Math.min(b, f), Math.max(c, g), Math.max(d, h)]);
}

/** Length by which tolerances of this profile scale: the larger side of its box, mm. */
export function extent(profile: Profile): number {
  const [left, bottom, right, top] = boxAround(profile);
  return Math.max(right - left, top - bottom);
}

/**
 * Area in mm2 by Green's theorem: the trapezoid under each chord plus the circular segment of each arc.
 * Exact for lines and arcs; positive for a counter-clockwise loop.
 */
export function loopArea(loop: readonly Segment[]): number {
  let area = 0;
  for (const s of loop) {
    area += (s.x0 * s.y1 - s.x1 * s.y0) / 2;
    if (s.kind === 'arc') area += (s.radius * s.radius * (s.sweep - Math.sin(s.sweep))) / 2;
  }
  return area;
}

export function profileArea(profile: Profile): number {
  return profile.loops.reduce((sum, loop) => sum + loopArea(loop), 0);
}

/** Length in mm of all segments with the tag. */
export function taggedLength(profile: Profile, tag: string): number {
  return allSegments(profile)
    .filter((s) => s.tag === tag)
    .reduce((sum, s) => sum + segmentLength(s), 0);
}
