/**
 * The geometry kernel as part families see it. Lengths mm, angles rad, right-handed, +Z up.
 * Outer loops counter-clockwise, holes clockwise; loops simple and disjoint.
 */
export type Vec2 = readonly [number, number];
export type Vec3 = readonly [number, number, number];
export type Loop = readonly Vec2[];

/** First loop is an outline (counter-clockwise), the others are its holes (clockwise) or further outlines. */
export interface Profile {
  readonly loops: readonly Loop[];
}

/** Welded triangles: no two vertices share a float32 position; counter-clockwise triangles look outward. */
export interface TriMesh {
  readonly positions: Float32Array;
  readonly indices: Uint32Array;
}

/** Column-major 4x4, rigid (rotation and translation only). */
export type Placement = readonly number[];

declare const solidBrand: unique symbol;
/** Opaque handle, only valid inside the build that made it. */
export interface Solid {
  readonly [solidBrand]: true;
}

export type QualityName = 'preview' | 'export';

export interface Quality {
  readonly name: QualityName;
  readonly segmentsPerTurn: number;
  readonly segmentsPerFillet: number;
}

export const QUALITY: Readonly<Record<QualityName, Quality>> = {
  preview: { name: 'preview', segmentsPerTurn: 32, segmentsPerFillet: 8 },
  export: { name: 'export', segmentsPerTurn: 96, segmentsPerFillet: 16 },
};

/** Plane work: offsets, hulls, text and booleans on profiles. */
export interface Outlines {
  rectangle(width: number, height: number, options?: { cornerRadius?: number; center?: Vec2 }): Profile;
  circle(radius: number, options?: { center?: Vec2; segments?: number }): Profile;
  polygon(points: Loop): Profile;
  union(profiles: readonly Profile[]): Profile;
  subtract(from: Profile, cutters: readonly Profile[]): Profile;
  /** round corners on growth; negative shrinks */
  offset(profile: Profile, delta: number): Profile;
  hull(profiles: readonly Profile[]): Profile;
  /** single-line letters drawn with a round `stroke`; ink from x = 0, standing on y = 0, capitals `height` high */
  text(text: string, options: { height: number; stroke: number }): Profile;
}

/**
 * Everything a family may do to make solids. A failed operation throws KernelError; nothing is accepted silently.
 */
export interface Kernel {
  readonly quality: Quality;
  readonly outlines: Outlines;
  /** z from 0 to height */
  extrude(profile: Profile, height: number): Solid;
  /** about +Z; profile x is the radius (>= 0), profile y becomes z */
  revolve(profile: Profile, segments?: number): Solid;
  /** throws unless the mesh is closed, oriented outward and of positive volume */
  fromMesh(mesh: TriMesh): Solid;
  box(size: Vec3, center?: Vec3): Solid;
  cylinder(radius: number, height: number, options?: { topRadius?: number; segments?: number }): Solid;
  place(solid: Solid, at: Placement): Solid;
  union(solids: readonly Solid[]): Solid;
  subtract(from: Solid, cutters: readonly Solid[]): Solid;
  /** may be empty, of volume 0; an empty body is refused when the build ends */
  intersect(solids: readonly Solid[]): Solid;
  /** mm3 */
  volume(solid: Solid): number;
  bounds(solid: Solid): Bounds;
}

export interface NamedSolid {
  /** stable body name, e.g. "hook", "receiver", "neck", "cap" */
  readonly name: string;
  readonly solid: Solid;
}

export type MeshFaultKind = 'open-edge' | 'overused-edge' | 'flipped' | 'non-finite' | 'empty' | 'degenerate';

export interface MeshFault {
  readonly kind: MeshFaultKind;
  readonly count: number;
}

/** Least x, y, z, then greatest x, y, z, mm. */
export type Bounds = readonly [number, number, number, number, number, number];

export interface BuiltBody {
  readonly name: string;
  readonly mesh: TriMesh;
  readonly volume: number;
  readonly bounds: Bounds;
}

export class KernelError extends Error {
  constructor(
    readonly operation: string,
    readonly status: string,
  ) {
    super(`${operation}: ${status}`);
    this.name = 'KernelError';
  }
}
