import type { Manifold } from 'manifold-3d';
import { finishBody } from './finish-body';
import {
  type BuiltBody,
  type Kernel,
  KernelError,
  type NamedSolid,
  type Placement,
  type Profile,
  QUALITY,
  type Quality,
  type Solid,
} from './kernel';
import { profileFault } from './loops';
import { loadManifold, type ManifoldModule } from './manifold';
import { describeFaults, meshFaults } from './mesh-check';
import { createOutlines } from './outlines';
import { isRigid } from './placement';

export interface KernelHost {
  /**
   * Runs `make` and returns its bodies as closed, welded meshes. Everything made inside is freed before this returns
   * or throws; a body that is open, degenerate, inside out or empty throws KernelError.
   */
  build(make: (kernel: Kernel) => readonly NamedSolid[], quality: Quality): BuiltBody[];
}

/** mm3 that faces lying on each other may leave of a common volume of nothing. */
const ROUND_OFF = 1e-6;

/** The solids of one build: hands out opaque handles, frees all of them at the end. */
class Shelf {
  private readonly held = new Map<Solid, Manifold>();

  /** Takes over a new manifold; throws where the operation failed or, unless allowed, left nothing. */
  keep(operation: string, manifold: Manifold, mayBeEmpty = false): Solid {
    const solid = Object.freeze({}) as Solid;
    this.held.set(solid, manifold);
    const status = manifold.status();
    if (status !== 'NoError') throw new KernelError(operation, status);
    if (!mayBeEmpty && manifold.isEmpty()) throw new KernelError(operation, 'nothing is left');
    if (manifold.volume() < -ROUND_OFF) throw new KernelError(operation, 'the solid is inside out');
    return solid;
  }

  get(operation: string, solid: Solid): Manifold {
    const manifold = this.held.get(solid);
    if (!manifold) throw new KernelError(operation, 'the solid belongs to another build');
    return manifold;
  }

  free(): void {
    for (const manifold of this.held.values()) manifold.delete();
    this.held.clear();
  }
}

function checkProfile(operation: string, profile: Profile): void {
  const fault = profileFault(profile);
  if (fault) throw new KernelError(operation, fault);
}

function checkPositive(operation: string, sizes: Readonly<Record<string, number>>): void {
  for (const [name, value] of Object.entries(sizes)) {
    if (!(value > 0 && Number.isFinite(value))) {
      throw new KernelError(operation, `${name} must be a positive number of mm, not ${value}`);
    }
  }
}

type Mat4 = Parameters<Manifold['transform']>[0];

function createKernel(module: ManifoldModule, shelf: Shelf, quality: Quality): Kernel {
  const several = (operation: string, solids: readonly Solid[]) => {
    if (solids.length === 0) throw new KernelError(operation, 'no solid given');
    return solids.map((solid) => shelf.get(operation, solid));
  };
  return {
    quality,
    outlines: createOutlines(module, quality),
    extrude(profile, height) {
      checkProfile('extrude', profile);
      checkPositive('extrude', { height });
      return shelf.keep('extrude', module.extrude(profile.loops, height));
    },
    revolve(profile, segments = quality.segmentsPerTurn) {
      checkProfile('revolve', profile);
      if (profile.loops.some((loop) => loop.some(([radius]) => radius < 0))) {
        throw new KernelError('revolve', 'the profile crosses the axis');
      }
      return shelf.keep('revolve', module.revolve(profile.loops, segments));
    },
    fromMesh(mesh) {
      const faults = meshFaults(mesh);
      if (faults.length > 0) throw new KernelError('fromMesh', describeFaults(faults));
      const given = new module.Mesh({ numProp: 3, vertProperties: mesh.positions, triVerts: mesh.indices });
      return shelf.keep('fromMesh', module.Manifold.ofMesh(given));
    },
    box([x, y, z], center = [0, 0, 0]) {
      checkPositive('box', { x, y, z });
      const corner = module.Manifold.cube([x, y, z], true);
      shelf.keep('box', corner);
      return shelf.keep('box', corner.translate([...center]));
    },
    cylinder(radius, height, { topRadius = radius, segments = quality.segmentsPerTurn } = {}) {
      checkPositive('cylinder', { radius, height, topRadius });
      return shelf.keep('cylinder', module.Manifold.cylinder(height, radius, topRadius, segments));
    },
    place(solid, at: Placement) {
      if (!isRigid(at)) throw new KernelError('place', 'the placement is not a rotation and translation');
      return shelf.keep('place', shelf.get('place', solid).transform([...at] as Mat4), true);
    },
    union: (solids) => shelf.keep('union', module.Manifold.union(several('union', solids))),
    subtract: (from, cutters) =>
      shelf.keep('subtract', module.Manifold.difference(several('subtract', [from, ...cutters]))),
    intersect: (solids) =>
      shelf.keep('intersect', module.Manifold.intersection(several('intersect', solids)), true),
    volume: (solid) => shelf.get('volume', solid).volume(),
    bounds(solid) {
      const { min, max } = shelf.get('bounds', solid).boundingBox();
      return [...min, ...max];
    },
  };
}

function checkNames(solids: readonly NamedSolid[]): void {
  if (solids.length === 0) throw new KernelError('build', 'no body was made');
  const names = new Set(solids.map((solid) => solid.name));
  if (names.size < solids.length) throw new KernelError('build', 'two bodies have one name');
}

/** Loads the kernel, once a thread, and runs a throwaway build, which compiles what the first part needs. */
export async function createKernelHost(): Promise<KernelHost> {
  const module = await loadManifold();
  const host: KernelHost = {
    build(make, quality) {
      const shelf = new Shelf();
      try {
        const solids = make(createKernel(module, shelf, quality));
        checkNames(solids);
        return solids.map(({ name, solid }) => finishBody(module, name, shelf.get('build', solid)));
      } finally {
        shelf.free();
      }
    },
  };
  host.build(throwaway, QUALITY.preview);
  return host;
}

function throwaway(kernel: Kernel): NamedSolid[] {
  const plate = kernel.extrude(kernel.outlines.rectangle(4, 4, { cornerRadius: 1 }), 2);
  return [{ name: 'throwaway', solid: kernel.subtract(plate, [kernel.cylinder(1, 3)]) }];
}
