import type { Plane } from './element/plane';
import type { Profile } from './profile/profile';
import type { Point } from './profile/segment';

/**
 * Width of the part out of the plane, mm: the same everywhere, or given at stations along an axis of the plane and
 * straight between them, for parts whose width tapers. Not used where the part is axisymmetric.
 */
export type Width =
  | { readonly kind: 'even'; readonly width: number }
  | {
      readonly kind: 'stations';
      readonly along: 'x' | 'y';
      /** coordinate and width, in rising order of the coordinate */
      readonly stations: readonly (readonly [number, number])[];
    };

/** Edges, or the one node at a corner of the profile, that cannot move along x, y or both. */
export type Support =
  | { readonly tag: string; readonly fix: 'x' | 'y' | 'both' }
  | { readonly corner: Point; readonly fix: 'x' | 'y' | 'both' };

/** Edges that are pushed, the direction counted as positive, and how the force spreads over them. */
export interface Land {
  readonly tag: string;
  readonly direction: Point;
  /** `parabolic`: as shear over a cut face, zero at its ends */
  readonly spread?: 'even' | 'parabolic';
}

/**
 * What moves the part. displacement: the mean movement of the lands, in mm, summed over lands; the answer is the
 * force in N on each land. rotation: the turn of the tagged edges, rad, counter-clockwise positive, by a pure couple
 * that turns with them; the answer is the moment in N mm.
 */
export type Drive =
  | { readonly kind: 'displacement'; readonly lands: readonly Land[]; readonly value: number }
  | { readonly kind: 'rotation'; readonly tag: string; readonly value: number };

/** By how much a figure of the plane model is multiplied because the part is not plane. */
export interface Factor {
  readonly force: number;
  readonly strain: number;
  readonly because: string;
}

/** How a part bends as a plane shape, given by its family as plain data. */
export interface BendingModel {
  readonly profile: Profile;
  readonly plane: Plane;
  readonly width: Width;
  /**
   * True where the profile is only the half at x >= 0 of a part that is its own mirror image; the edges on x = 0
   * are then held in x by a support, and `drive.value` counts both halves together.
   */
  readonly mirrored: boolean;
  readonly supports: readonly Support[];
  readonly drive: Drive;
  /** where the largest strain is looked for: not at clamped ends, loaded lands or sharp inner corners */
  readonly peakTags: readonly string[];
  readonly factors: readonly Factor[];
}

/** Elastic constants for a solve, MPa. */
export interface ElasticNumbers {
  readonly modulus: number;
  readonly poisson: number;
  /** printed layers whose normal lies in the plane, rad from x; null where they lie in the plane or do not matter */
  readonly layers: {
    readonly normal: number;
    readonly across: number;
    readonly shearBetween: number | null;
  } | null;
}

/** Width at a point of the profile. */
export function widthAt(width: Width): (x: number, y: number) => number {
  if (width.kind === 'even') return () => width.width;
  const { along, stations } = width;
  return (x, y) => interpolate(stations, along === 'x' ? x : y);
}

function interpolate(stations: readonly (readonly [number, number])[], at: number): number {
  const next = stations.findIndex(([place]) => place >= at);
  if (next === 0) return stations[0]![1];
  if (next < 0) return stations.at(-1)![1];
  const [low, from] = stations[next - 1]!;
  const [high, to] = stations[next]!;
  return from + ((to - from) * (at - low)) / (high - low);
}
