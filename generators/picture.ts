import type { KernelHost } from '@/lib/geometry/host';
import type { BuiltBody, TriMesh } from '@/lib/geometry/kernel';
import { boundsOf } from '@/lib/geometry/mesh-check';
import type { Direction, Size } from '@/lib/geometry/picture/camera';
import { type Drawn, drawMeshes } from '@/lib/geometry/picture/draw';
import { movePositions } from '@/lib/geometry/placement';
import { buildPart } from './build-part';
import type { Family } from './contract';
import { bedPlacements } from './lay-on-bed';

/** The bodies in the family's best stance, as they are printed. */
function laidOut(family: Family, values: unknown, bodies: readonly BuiltBody[]): TriMesh[] {
  const placements = bedPlacements(bodies, family.stances(values)[0]!);
  return bodies.map(({ name, mesh }) => ({
    positions: movePositions(placements[name]!, mesh.positions),
    indices: mesh.indices,
  }));
}

export interface PartInFigures {
  /** edges of the bounding box of all bodies laid on the bed, mm */
  readonly size: readonly [number, number, number];
  /** of all bodies, mm3 */
  readonly volume: number;
}

function sizeOf(meshes: readonly TriMesh[]): PartInFigures['size'] {
  const boxes = meshes.map(({ positions }) => boundsOf(positions));
  const edge = (at: number) =>
    Math.max(...boxes.map((box) => box[at + 3]!)) - Math.min(...boxes.map((box) => box[at]!));
  return [edge(0), edge(1), edge(2)];
}

const completed = (family: Family, parameters: unknown) => ({
  ...family.parameters.defaults,
  ...(parameters as object),
});

function figuresOf(family: Family, parameters: unknown, bodies: readonly BuiltBody[]): PartInFigures {
  const volume = bodies.reduce((sum, body) => sum + body.volume, 0);
  return { size: sizeOf(laidOut(family, completed(family, parameters), bodies)), volume };
}

/** Size on the bed and volume of a part. */
export function measurePart(host: KernelHost, family: Family, parameters: unknown): PartInFigures {
  return figuresOf(family, parameters, buildPart(host, family, { parameters, quality: 'preview' }));
}

/** A picture of a part as designed, two-body families assembled, with its size on the bed. */
export function drawPart(
  host: KernelHost,
  family: Family,
  request: { readonly parameters: unknown; readonly size: Size; readonly view?: Direction },
): Drawn & PartInFigures {
  const { parameters, size, view } = request;
  const bodies = buildPart(host, family, { parameters, quality: 'preview' });
  const meshes = bodies.map(({ mesh }) => mesh);
  return { ...drawMeshes(meshes, size, view), ...figuresOf(family, parameters, bodies) };
}
