import type { TriMesh } from '@/lib/geometry/kernel';

const HEADER_BYTES = 80;
const BEFORE_FACETS = HEADER_BYTES + 4;
const BYTES_PER_FACET = 50;

/** Size in bytes of the binary STL file of so many triangles. */
export const stlBytes = (triangles: number): number => BEFORE_FACETS + BYTES_PER_FACET * triangles;

/** Plain characters only; readers take a file that begins with "solid" for text. */
function writeHeader(bytes: Uint8Array, header: string): void {
  const text = header.replace(/[^ -~]/g, '?').slice(0, HEADER_BYTES);
  if (/^solid/i.test(text))
    throw new RangeError('the header of a binary STL file must not begin with "solid"');
  for (let at = 0; at < text.length; at += 1) bytes[at] = text.charCodeAt(at);
}

function writeNormal(normal: Float32Array, p: Float32Array, a: number, b: number, c: number): void {
  const [ax, ay, az] = [p[a]!, p[a + 1]!, p[a + 2]!];
  const [ux, uy, uz] = [p[b]! - ax, p[b + 1]! - ay, p[b + 2]! - az];
  const [vx, vy, vz] = [p[c]! - ax, p[c + 1]! - ay, p[c + 2]! - az];
  const x = uy * vz - uz * vy;
  const y = uz * vx - ux * vz;
  const z = ux * vy - uy * vx;
  const length = Math.sqrt(x * x + y * y + z * z);
  normal[0] = x / length + 0;
  normal[1] = y / length + 0;
  normal[2] = z / length + 0;
}

/** One body after the other from `offset` on; returns where the next would start, both in 16-bit words. */
function writeFacets(words: Uint16Array, offset: number, mesh: TriMesh): number {
  const { positions, indices } = mesh;
  const from = new Uint16Array(positions.buffer, positions.byteOffset, positions.length * 2);
  const normal = new Float32Array(3);
  const normalWords = new Uint16Array(normal.buffer);
  let to = offset;
  for (let at = 0; at < indices.length; at += 3) {
    writeNormal(normal, positions, indices[at]! * 3, indices[at + 1]! * 3, indices[at + 2]! * 3);
    for (let word = 0; word < 6; word += 1) words[to + word] = normalWords[word]!;
    for (let corner = 0; corner < 3; corner += 1) {
      const start = indices[at + corner]! * 6;
      const into = to + 6 + corner * 6;
      for (let word = 0; word < 6; word += 1) words[into + word] = from[start + word]!;
    }
    to += BYTES_PER_FACET / 2;
  }
  return to;
}

/**
 * Binary STL: an 80-byte header, the number of triangles, 50 bytes a triangle, little-endian as every machine that
 * runs this. The format knows no unit: coordinates are mm, as readers assume. Bodies follow one another.
 */
export function writeStl(meshes: readonly TriMesh[], header: string): Uint8Array<ArrayBuffer> {
  const triangles = meshes.reduce((sum, mesh) => sum + mesh.indices.length / 3, 0);
  const buffer = new ArrayBuffer(stlBytes(triangles));
  writeHeader(new Uint8Array(buffer), header);
  new DataView(buffer).setUint32(HEADER_BYTES, triangles, true);
  const words = new Uint16Array(buffer);
  meshes.reduce((offset, mesh) => writeFacets(words, offset, mesh), BEFORE_FACETS / 2);
  return new Uint8Array(buffer);
}
