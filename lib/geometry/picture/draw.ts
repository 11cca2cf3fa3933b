import type { TriMesh } from '../kernel';
import { cameraOf, type Direction, fitTo, type Size, seen } from './camera';
import { rasterise } from './raster';
import { type Rgb, shade } from './shade';

/** What bends is yellow, what it works with petrol; the picture knows no palette and stands on any. */
export const PART_COLOURS: readonly Rgb[] = [
  [0.965, 0.8, 0.36],
  [0.42, 0.66, 0.68],
];

export const USUAL_VIEW: Direction = { turn: (32 * Math.PI) / 180, rise: (28 * Math.PI) / 180 };

export interface Drawn extends Size {
  /** RGBA, row by row from the top, background clear */
  readonly pixels: Uint8ClampedArray<ArrayBuffer>;
}

/** A shaded picture of bodies in parallel projection, drawn to scale and filling the frame. */
export function drawMeshes(
  meshes: readonly TriMesh[],
  size: Size,
  view: Direction = USUAL_VIEW,
  margin = 0.06,
): Drawn {
  const camera = cameraOf(view);
  const parts = meshes.map((mesh) => seen(mesh, camera));
  fitTo(parts, size, margin);
  const projected = meshes.map(({ indices }, at) => ({ points: parts[at]!, indices }));
  return { ...size, pixels: shade(rasterise(projected, size), PART_COLOURS) };
}
