/** How fine a mesh is. */
export interface MeshOptions {
  /** longest element edge, mm */
  readonly longest: number;
  /** element edges per radius on arcs: edge <= radius / perRadius */
  readonly perRadius: number;
  /** element edges through a wall: edge <= local thickness / perThickness */
  readonly perThickness: number;
  /** growth of the edge length with distance from a fine place, mm per mm */
  readonly growth: number;
  /** passes of smoothing */
  readonly smoothing: number;
}

/**
 * The mesh every check uses: 1,500 to 3,500 degrees of freedom on a usual part, within 3 % of the reference cases
 * of tests/reference/finite-elements in peak strain and 1 % in force.
 */
export const RECOMMENDED_MESH: MeshOptions = {
  longest: 5,
  perRadius: 8,
  perThickness: 3,
  growth: 0.4,
  smoothing: 4,
};

/** The same mesh with edges about half as long, for the error shown on request. */
export function refined(options: MeshOptions): MeshOptions {
  return {
    ...options,
    longest: options.longest / 2,
    perRadius: options.perRadius * 2,
    perThickness: options.perThickness * 2,
    growth: options.growth * 0.7,
  };
}

/** Most points (corner nodes) a mesh may have; past it meshing is given up: no input may hold the thread for long. */
export const MOST_POINTS = 10_000;
