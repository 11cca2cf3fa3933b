import type { Manifold } from 'manifold-3d';
import { type BuiltBody, KernelError, type TriMesh } from './kernel';
import type { ManifoldModule } from './manifold';
import { boundsOf, describeFaults, meshFaults, meshVolume, weld } from './mesh-check';

/** Detail below this (mm) is removed: a tenth of a micrometre, far under what any printer resolves. */
const TIDY_TOLERANCE = 1e-4;

/**
 * Booleans leave triangles that collapse in float32. The mesh is taken out, put in as an original and simplified;
 * simplifying alone keeps the edges between the faces of the solids that were joined.
 */
function tidyMesh(module: ManifoldModule, solid: Manifold): TriMesh {
  const made: Manifold[] = [];
  const keep = (manifold: Manifold) => {
    made.push(manifold);
    return manifold;
  };
  try {
    const again = keep(module.Manifold.ofMesh(solid.getMesh()));
    const tidied = keep(keep(again.asOriginal()).simplify(TIDY_TOLERANCE));
    const { vertProperties, triVerts } = tidied.getMesh();
    return weld(vertProperties, triVerts);
  } finally {
    for (const one of made) one.delete();
  }
}

/** The closed, welded mesh of a solid with its volume and bounds; KernelError where it has any fault. */
export function finishBody(module: ManifoldModule, name: string, solid: Manifold): BuiltBody {
  if (solid.isEmpty()) throw new KernelError('build', `${name} is empty`);
  const mesh = tidyMesh(module, solid);
  const faults = meshFaults(mesh);
  if (faults.length > 0)
    throw new KernelError('build', `${name} is not a closed body: ${describeFaults(faults)}`);
  return { name, mesh, volume: meshVolume(mesh), bounds: boundsOf(mesh.positions) };
}
