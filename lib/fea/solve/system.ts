import { STIFFNESS_SIZE } from '../element/kernel';
import { type GaussPoints, gaussPoints } from '../element/points';
import type { Mesh } from '../mesh/mesh';
import { type BendingModel, widthAt } from '../model';
import { newWorkspace, type Workspace } from '../solver/factor';
import { type Structure, structureOf } from '../solver/structure';
import { type Driver, driverOf } from './driver';
import { heldBy } from './supports';

/** A meshed model ready to be solved, with the arrays that every factorisation writes again. */
export interface System {
  readonly mesh: Mesh;
  readonly points: GaussPoints;
  readonly held: Uint8Array;
  readonly driver: Driver;
  readonly structure: Structure;
  readonly stiffness: Float64Array;
  readonly workspace: Workspace;
  /** value of the drive that this system is taken to: half of the model's where the part is mirrored */
  readonly target: number;
}

/** Null when an element is folded at rest. */
export function systemOf(model: BendingModel, mesh: Mesh): System | null {
  const points = gaussPoints(mesh, model.plane, widthAt(model.width));
  if (!points) return null;
  const held = heldBy(mesh, model.supports);
  const structure = structureOf(mesh, held);
  return {
    mesh,
    points,
    held,
    driver: driverOf(mesh, model.plane, model.drive),
    structure,
    stiffness: new Float64Array(STIFFNESS_SIZE * mesh.elementCount),
    workspace: newWorkspace(structure),
    target: model.mirrored ? model.drive.value / 2 : model.drive.value,
  };
}

/** Zeroes the entries that are held. */
export function onlyFree(vector: Float64Array, held: Uint8Array): Float64Array {
  return vector.map((value, i) => (held[i] ? 0 : value));
}
