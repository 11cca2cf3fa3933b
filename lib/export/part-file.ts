import { TooLarge } from '@/lib/errors';
import type { FileFormat } from './file-name';
import { writeStl } from './stl';
import { type ThreeMfPart, writeThreeMf } from './three-mf';

export interface FileLimits {
  readonly triangles: number;
  readonly bytes: number;
}

/** Some 25 MB of STL: far more than any part of the families, far less than a server can hold. */
const LIMITS: FileLimits = { triangles: 500_000, bytes: 32_000_000 };

/** The file of a part; refuses one over the limits before it is written or sent. */
export function writePartFile(
  { format, ...part }: ThreeMfPart & { readonly format: FileFormat },
  limits: FileLimits = LIMITS,
): Uint8Array<ArrayBuffer> {
  const meshes = part.bodies.map((body) => body.mesh);
  const triangles = meshes.reduce((sum, mesh) => sum + mesh.indices.length / 3, 0);
  if (triangles > limits.triangles) {
    throw new TooLarge(`The part has ${triangles} triangles; a file may have at most ${limits.triangles}`);
  }
  const bytes = format === '3mf' ? writeThreeMf(part) : writeStl(meshes, `Bendwell, mm: ${part.title}`);
  if (bytes.length > limits.bytes) {
    throw new TooLarge(`The file has ${bytes.length} bytes; at most ${limits.bytes} are allowed`);
  }
  return bytes;
}
