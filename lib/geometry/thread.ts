import type { TriMesh, Vec2 } from './kernel';

/** Radius and height of a point in a plane through the axis, mm. */
export type FormPoint = Vec2;

/**
 * A helical ridge on a wall of revolution, right-handed, axis +Z. `outline` is its section in a plane through the
 * axis: from the lower root over the crest to the upper root, heights from the middle of the ridge, both roots at the
 * wall. The crest of an outward ridge has the greater radius, that of an inward one the smaller.
 */
export interface Ridge {
  readonly outline: readonly FormPoint[];
  readonly facing: 'outward' | 'inward';
  /** travel in one turn, mm */
  readonly lead: number;
  readonly starts: number;
  /** turns between the two points where the ridge has half its height; it fades over a quarter turn at each */
  readonly turns: number;
  /** height of the middle of the ridge at its lower half-height point, mm */
  readonly base: number;
  /** angle of that point as a share of a turn */
  readonly phase: number;
}

/** Share of a turn over which a ridge rises to its full height. */
export const FADE = 0.25;
/** How far the ends of a ridge lie inside the wall, and its foot deeper still, mm. */
const END_SINK = 0.2;
const FOOT_SINK = 0.3;

const smooth = (share: number): number => {
  const t = Math.min(1, Math.max(0, share));
  return t * t * (3 - 2 * t);
};

/** Share of the full height at a position along the ridge, in turns from its lower half-height point. */
export const ridgeHeight = (ridge: Pick<Ridge, 'turns'>, position: number): number =>
  smooth((position + FADE / 2) / FADE) * smooth((ridge.turns + FADE / 2 - position) / FADE);

/** A ring closer than this share of a facet to the end of the ridge gives way to it. */
const CLOSE_TO_END = 0.25;

/** Positions of the rings of a ridge in turns: its two ends, and between them the grid of the facets. */
function ringPositions(ridge: Ridge, segments: number): number[] {
  const [start, end] = [-FADE / 2, ridge.turns + FADE / 2];
  const first = Math.ceil((start + ridge.phase) * segments + CLOSE_TO_END);
  const last = Math.floor((end + ridge.phase) * segments - CLOSE_TO_END);
  const grid = Array.from({ length: last - first + 1 }, (_, at) => (first + at) / segments - ridge.phase);
  return [start, ...grid, end];
}

/** Section at one ring, foot included, counter-clockwise for an outward ridge. */
function ringSection(ridge: Ridge, share: number, segments: number): FormPoint[] {
  const { outline, facing } = ridge;
  const sag = Math.cos(Math.PI / segments);
  const wall = outline[0]![0];
  const inward = facing === 'inward';
  // an inward ridge stands proud of its chords, so that its facets touch the true radius in their middle
  const scale = inward ? 1 / sag : 1;
  const sunk = inward ? wall + END_SINK : wall * sag - END_SINK;
  const foot = inward ? sunk + FOOT_SINK : sunk - FOOT_SINK;
  const formed = outline.map(
    ([radius, height]): FormPoint => [scale * (sunk + share * (radius - sunk)), height],
  );
  const lower = outline[0]![1];
  const upper = outline[outline.length - 1]![1];
  return [...formed, [scale * foot, upper], [scale * foot, lower]];
}

function checkRidge(ridge: Ridge): void {
  const { outline, lead, starts } = ridge;
  const width = outline[outline.length - 1]![1] - outline[0]![1];
  if (!(width < lead / starts)) {
    throw new RangeError(
      `thread: a ridge ${width} mm wide at its root does not fit a pitch of ${lead / starts} mm`,
    );
  }
}

/** Triangles of one ridge whose vertices begin at `start`: `rings` rings of `size` points. */
function ridgeFaces(start: number, rings: number, size: number, outward: boolean): number[] {
  const faces: number[] = [];
  const add = (a: number, b: number, c: number) =>
    outward ? faces.push(start + a, start + b, start + c) : faces.push(start + a, start + c, start + b);
  for (let ring = 0; ring + 1 < rings; ring += 1) {
    for (let point = 0; point < size; point += 1) {
      const here = ring * size + point;
      const beside = ring * size + ((point + 1) % size);
      // diagonals alternate: a flank is twisted, and split one way only it would lean to one side of the true surface
      const turned = (ring + point) % 2 === 0;
      add(beside, here, turned ? here + size : beside + size);
      add(turned ? beside : here, here + size, beside + size);
    }
  }
  const end = (rings - 1) * size;
  for (let point = 0; point + 2 < size; point += 1) {
    add(size - 1, point, point + 1);
    add(end + size - 1, end + point + 1, end + point);
  }
  return faces;
}

/**
 * Closed mesh of all the ridges of a thread, one shell a start, made without booleans. Ring vertices between the
 * ends lie on the facet grid of `segments` a turn; the wall it is joined to should be turned by half a facet against it. Throws RangeError
 * where the ridge is as wide as the pitch: its turns would run through each other.
 */
export function ridgeMesh(ridge: Ridge, segments: number): TriMesh {
  checkRidge(ridge);
  const rings = ringPositions(ridge, segments);
  const size = ridge.outline.length + 2;
  const positions: number[] = [];
  const indices: number[] = [];
  for (let start = 0; start < ridge.starts; start += 1) {
    indices.push(...ridgeFaces(positions.length / 3, rings.length, size, ridge.facing === 'outward'));
    for (const position of rings) {
      const angle = 2 * Math.PI * (position + ridge.phase + start / ridge.starts);
      const rise = ridge.base + ridge.lead * position;
      for (const [radius, height] of ringSection(ridge, ridgeHeight(ridge, position), segments)) {
        positions.push(radius * Math.cos(angle), radius * Math.sin(angle), rise + height);
      }
    }
  }
  return { positions: Float32Array.from(positions), indices: Uint32Array.from(indices) };
}

/** Integral of width times radius from the wall out (or in) to the crest, of an outline whose root is cut at the wall. */
function sectionMoment(outline: readonly FormPoint[], wall: number, outward: boolean): number {
  const sign = outward ? 1 : -1;
  const loop = clipBeyond(outline, wall, sign);
  let moment = 0;
  for (let at = 0; at < loop.length; at += 1) {
    const [r0, z0] = loop[at]!;
    const [r1, z1] = loop[(at + 1) % loop.length]!;
    moment += ((r0 * r0 + r0 * r1 + r1 * r1) / 6) * (z1 - z0);
  }
  return sign * moment;
}

/** The part of an outline that stands out of the wall: radius beyond it in the direction of `sign`. */
function clipBeyond(outline: readonly FormPoint[], wall: number, sign: number): FormPoint[] {
  const kept: FormPoint[] = [];
  for (let at = 0; at < outline.length; at += 1) {
    const here = outline[at]!;
    const next = outline[(at + 1) % outline.length]!;
    const [a, b] = [sign * (here[0] - wall), sign * (next[0] - wall)];
    if (a >= 0) kept.push(here);
    if (a * b < 0) {
      const share = a / (a - b);
      kept.push([wall, here[1] + share * (next[1] - here[1])]);
    }
  }
  return kept;
}

/**
 * Volume in mm3 that the faceted ridges add to a wall with as many facets. A step between two rings adds
 * the sine of its angle times the integral of width x radius, by Simpson's rule over the step; the error is of second order in
 * the sagitta.
 */
export function ridgeVolume(ridge: Ridge, segments: number): number {
  const outward = ridge.facing === 'outward';
  const wall = outward ? ridge.outline[0]![0] : ridge.outline[0]![0] / Math.cos(Math.PI / segments);
  const positions = ringPositions(ridge, segments);
  const sections = positions.map((position) =>
    ringSection(ridge, ridgeHeight(ridge, position), segments).slice(0, -2),
  );
  const moment = (section: readonly FormPoint[]) => sectionMoment(section, wall, outward);
  let sum = 0;
  for (let at = 0; at + 1 < sections.length; at += 1) {
    const [here, next] = [sections[at]!, sections[at + 1]!];
    const between = here.map(([radius, height], k): FormPoint => [(radius + next[k]![0]) / 2, height]);
    const step = Math.sin(2 * Math.PI * (positions[at + 1]! - positions[at]!));
    sum += (step * (moment(here) + 4 * moment(between) + moment(next))) / 6;
  }
  return ridge.starts * sum;
}
