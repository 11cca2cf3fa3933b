import 'server-only';
import { database } from '@/db/client';
import * as queries from '@/db/queries/materials';
import { NotFound } from '@/lib/errors';
import { type MaterialOverrides, withOverrides } from '@/lib/materials/overrides';
import type { Material } from '@/lib/materials/types';

/** A plastic by id, or with single properties given in place of the stored ones. */
export type MaterialChoice = string | ({ readonly id: string } & MaterialOverrides);

/** Anyone may read the plastics. */
export const listMaterials = (): Material[] => queries.listMaterials(database());

export function getMaterial(id: string): Material {
  const material = queries.findMaterial(database(), id);
  if (!material) throw new NotFound(`The material "${id}"`);
  return material;
}

export function chosenMaterial(choice: MaterialChoice): Material {
  return typeof choice === 'string' ? getMaterial(choice) : withOverrides(getMaterial(choice.id), choice);
}
