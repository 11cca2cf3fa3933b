import { MATERIALS } from '@/lib/materials/data';
import type { Db } from '../client';
import { putShippedMaterial } from '../queries/materials';

export function seedMaterials(db: Db): void {
  db.transaction((transaction) => {
    MATERIALS.forEach((material, position) => {
      putShippedMaterial(transaction, material, position);
    });
  });
}
