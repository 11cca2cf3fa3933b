import type { FileFormat } from '@/lib/export/file-name';
import type { QualityName } from '@/lib/geometry/kernel';

export interface ExportRequest {
  /** id of the part family */
  readonly family: string;
  /** values of its parameters; those left out take the defaults */
  readonly parameters: unknown;
  readonly format: FileFormat;
  readonly quality: QualityName;
  /** names of the bodies wanted; all where left out */
  readonly bodies?: readonly string[] | undefined;
  /** id of the stance on the bed; the family's best where left out */
  readonly stance?: string | undefined;
  readonly title: string;
  /** name of the plastic, or null where none is chosen */
  readonly materialName: string | null;
}

export interface ExportedPart {
  readonly bytes: Uint8Array<ArrayBuffer>;
  /** volume in mm3 */
  readonly bodies: readonly { readonly name: string; readonly triangles: number; readonly volume: number }[];
}

export interface ToExporter {
  readonly job: number;
  readonly request: ExportRequest;
}

/** An error with its own fields, as it passes between threads. */
export interface PackedError {
  readonly name: string;
  readonly message: string;
  readonly [field: string]: unknown;
}

export type FromExporter =
  | { readonly job: number; readonly part: ExportedPart }
  | { readonly job: number; readonly error: PackedError };
