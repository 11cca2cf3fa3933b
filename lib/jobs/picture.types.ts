import type { PackedError } from './export.types';

export interface PictureRequest {
  /** id of the part family */
  readonly family: string;
  /** values of its parameters; those left out take the defaults */
  readonly parameters: unknown;
  readonly width: number;
  readonly height: number;
}

export interface PartPicture {
  readonly width: number;
  readonly height: number;
  /** RGBA, background clear */
  readonly pixels: Uint8ClampedArray<ArrayBuffer>;
  /** edges of the bounding box of all bodies laid on the bed, mm */
  readonly size: readonly [number, number, number];
  /** of all bodies, mm3 */
  readonly volume: number;
}

export interface ToPainter {
  readonly job: number;
  readonly request: PictureRequest;
}

export type FromPainter =
  | { readonly job: number; readonly picture: PartPicture }
  | { readonly job: number; readonly error: PackedError };
